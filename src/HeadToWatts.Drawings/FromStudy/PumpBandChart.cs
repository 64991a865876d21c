using HeadToWatts.Basis.Units;
using HeadToWatts.Drawings.Canvas;
using HeadToWatts.Studies;
using HeadToWatts.Turbines.Sizing;

namespace HeadToWatts.Drawings;

public static partial class PumpBandChart
{
    /// <summary>Draws the chart of a study that runs on a pump as turbine, or names a pump; null for any other.</summary>
    public static Drawing? Draw(StudyResult result, UnitDisplay show, DrawingSize size)
    {
        ArgumentNullException.ThrowIfNull(result);
        if (result.Turbine.Pump is not { } band || (band.Pump is null && result.Turbine.Chosen.Type.Id != "pump-as-turbine"))
            return null;
        return Draw(
            new PumpBandInput(
                [.. band.Estimates.Select(e => new PumpBandPoint(e.Correlation.Name, e.FlowM3PerS, e.HeadM))],
                PumpCorrelations.ScatterRatio,
                new PumpBandPoint("this site, one unit", band.SiteFlowM3PerS, band.SiteHeadM),
                band.Pump is null),
            show,
            size);
    }
}
