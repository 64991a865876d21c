using HeadToWatts.Basis.Units;
using HeadToWatts.Drawings.Canvas;
using HeadToWatts.Studies;
using HeadToWatts.Turbines;

namespace HeadToWatts.Drawings;

public static partial class EnvelopeChart
{
    private const int RangePoints = 40;

    /// <summary>Draws the chart of a study.</summary>
    public static Drawing Draw(StudyResult result, UnitDisplay show, DrawingSize size) => Draw(InputOf(result), show, size);

    /// <summary>What the chart of a study shows.</summary>
    public static EnvelopeInput InputOf(StudyResult result)
    {
        ArgumentNullException.ThrowIfNull(result);
        var chosen = result.Turbine.Chosen.Type;
        var plant = result.Energy.Plant;
        var units = result.Turbine.Units.UnitCount;
        var range = new List<HeadAndFlow>();
        for (var i = 0; i <= RangePoints; i++)
        {
            var point = plant.At(result.Flow.Supply.UsableAtM3PerS((double)i / RangePoints));
            if (point.IsRunning)
                range.Add(new HeadAndFlow(point.TurbineFlowM3PerS / point.UnitsRunning, point.NetHeadM));
        }

        return new EnvelopeInput(
            [.. result.Turbine.Ranking.Select(c => new EnvelopeShape(
                c.Type.Name, [.. c.Type.Envelope.Vertices.Select(v => new HeadAndFlow(v.FlowM3PerS, v.HeadM))], Family(c.Type), c.Type.Id == chosen.Id))],
            new HeadAndFlow(result.Flow.DesignFlowM3PerS / units, Math.Max(result.Head.NetHeadAtDesignM, 0)),
            range);
    }

    private static MachineFamily Family(TurbineType type) => type switch
    {
        { OwnSpeedRule: not null } => MachineFamily.Gravity,
        { UsesDraftTube: true } => MachineFamily.Reaction,
        _ => MachineFamily.Impulse,
    };
}
