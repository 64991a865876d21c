using HeadToWatts.Basis.Units;
using HeadToWatts.Drawings.Canvas;
using HeadToWatts.Studies;

namespace HeadToWatts.Drawings;

public static partial class DesignFlowChart
{
    /// <summary>Draws the chart of a study; null when no design flow could be tried, because there is no usable flow.</summary>
    public static Drawing? Draw(StudyResult result, UnitDisplay show, DrawingSize size)
    {
        ArgumentNullException.ThrowIfNull(result);
        return result.Flow.Scan.Points.Count < 2 ? null : Draw(InputOf(result), show, size);
    }

    /// <summary>What the chart of a study shows.</summary>
    public static DesignFlowInput InputOf(StudyResult result)
    {
        ArgumentNullException.ThrowIfNull(result);
        var scan = result.Flow.Scan;
        List<DesignFlowPoint> points = [.. scan.Points.Select(p => new DesignFlowPoint(p.DesignFlowM3PerS, p.AnnualEnergyKwh, p.PlantFactor))];
        DesignFlowPoint? suggested = points.Exists(IsSuggested) ? points.Find(IsSuggested) : null;
        return new DesignFlowInput(
            points,
            suggested,
            new DesignFlowPoint(result.Flow.DesignFlowM3PerS, result.Energy.Annual.AnnualEnergyKwh, result.Energy.Annual.PlantFactor));

        bool IsSuggested(DesignFlowPoint p) => Math.Abs(p.DesignFlowM3PerS - scan.SuggestedM3PerS) <= 1e-9 * scan.SuggestedM3PerS;
    }
}
