using HeadToWatts.Basis.Units;
using HeadToWatts.Drawings.Canvas;
using HeadToWatts.Studies;

namespace HeadToWatts.Drawings;

public static partial class EfficiencyChart
{
    private const double Less = 0.03;

    /// <summary>Draws the chart of a study's units.</summary>
    public static Drawing Draw(StudyResult result, UnitDisplay show, DrawingSize size)
    {
        ArgumentNullException.ThrowIfNull(result);
        ArgumentNullException.ThrowIfNull(show);
        var turbine = result.Turbine;
        var heads = result.Input.Turbine.HillChart?.Heads ?? [];
        var name = heads.Count > 0 ? "at the rated head" : turbine.EfficiencyIsMakers ? "the maker's" : $"typical {turbine.Chosen.Type.Name}";
        return Draw(
            new EfficiencyInput(
                new EfficiencyLine(name, turbine.Efficiency.Points),
                Less,
                [.. heads.Select(h => new EfficiencyLine("at " + show.Length(h.HeadM), h.Points))],
                turbine.Units.LeastFlowRatio),
            size);
    }
}
