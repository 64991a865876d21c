using HeadToWatts.Basis.Units;
using HeadToWatts.Drawings.Canvas;
using HeadToWatts.EnergyYield;
using HeadToWatts.Studies;

namespace HeadToWatts.Drawings;

public static partial class LevelsChart
{
    private const int Points = 90;

    /// <summary>Levels of a study against the flow; null where no level moves.</summary>
    public static Drawing? Draw(StudyResult result, UnitDisplay show, DrawingSize size)
    {
        ArgumentNullException.ThrowIfNull(result);
        return result.Input.Head.Moves ? Draw(InputOf(result), show, size) : null;
    }

    /// <summary>What the chart of a study shows.</summary>
    public static LevelsInput InputOf(StudyResult result)
    {
        ArgumentNullException.ThrowIfNull(result);
        var plant = result.Energy.Plant;
        var moving = plant.Design.MovingHead ?? new MovingHead(result.Input.Head.Headwater, result.Input.Head.Tailwater, result.Input.Flow.Allocation, 7);
        var most = Math.Max(result.Flow.Supply.UsableM3PerS[0], result.Flow.DesignFlowM3PerS * 1.2);
        var points = new List<LevelsAtFlow>(Points + 1);
        for (var i = 1; i <= Points; i++)
        {
            var usable = most * i / Points;
            var at = plant.At(usable);
            points.Add(new LevelsAtFlow(moving.PassingM3PerS(usable), moving.HeadwaterM(usable), moving.TailwaterM(usable), at.MeterPowerKw > 0 ? at.NetHeadM : 0));
        }

        return new LevelsInput(points, moving.PassingM3PerS(result.Flow.DesignFlowM3PerS));
    }
}
