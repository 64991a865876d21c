using HeadToWatts.Basis.Units;
using HeadToWatts.Drawings.Canvas;
using HeadToWatts.EnergyYield;
using HeadToWatts.Studies;

namespace HeadToWatts.Drawings;

public static partial class PowerChart
{
    /// <summary>Draws the chart of a study.</summary>
    public static Drawing Draw(StudyResult result, UnitDisplay show, DrawingSize size) => Draw(InputOf(result), show, size);

    /// <summary>What the chart of a study shows: the plant from no flow to a little beyond its design flow.</summary>
    public static PowerInput InputOf(StudyResult result)
    {
        ArgumentNullException.ThrowIfNull(result);
        var limit = result.Flow.DesignFlowM3PerS * 1.15;
        return new PowerInput(
            [.. result.Energy.Curve.Where(p => p.UsableFlowM3PerS <= limit * (1 + 1e-9)).Select(Point)],
            Point(result.Energy.Plant.At(result.Flow.DesignFlowM3PerS)) with { FlowM3PerS = result.Flow.DesignFlowM3PerS },
            result.Turbine.Units.UnitCount);

        static PowerPoint Point(PlantPoint p) => new(p.UsableFlowM3PerS, p.MeterPowerKw, p.NetHeadM);
    }
}
