using HeadToWatts.Drawings.Canvas;
using HeadToWatts.Studies;

namespace HeadToWatts.Drawings;

public static partial class MonthsChart
{
    /// <summary>Draws the chart of a study; null without a daily record, since a duration curve knows no months.</summary>
    public static Drawing? Draw(StudyResult result, DrawingSize size)
    {
        ArgumentNullException.ThrowIfNull(result);
        return result.Energy.Days is { } days
            ? Draw(new MonthsInput([.. days.Months.Select(m => new MonthEnergy(m.Month, m.MeanEnergyKwh))]), size)
            : null;
    }
}
