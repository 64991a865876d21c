using HeadToWatts.Basis.Units;
using HeadToWatts.Drawings.Canvas;
using HeadToWatts.FlowRecords.Statistics;
using HeadToWatts.Studies;

namespace HeadToWatts.Drawings;

public static partial class HydrographChart
{
    /// <summary>Draws the chart of a study; null without a daily record of two days or more.</summary>
    public static Drawing? Draw(StudyResult result, UnitDisplay show, DrawingSize size)
    {
        ArgumentNullException.ThrowIfNull(result);
        return result.Summary is { DayOfYear.Count: > 1 } summary
            ? Draw(new HydrographInput(summary.DayOfYear, result.Input.Flow.YearKind == YearKind.Water ? 10 : 1, result.Flow.DesignFlowM3PerS), show, size)
            : null;
    }
}
