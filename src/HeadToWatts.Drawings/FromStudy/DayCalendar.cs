using HeadToWatts.Drawings.Canvas;
using HeadToWatts.FlowRecords.Statistics;
using HeadToWatts.Studies;

namespace HeadToWatts.Drawings;

public static partial class DayCalendar
{
    /// <summary>The days' flows over the design flow; null without a daily record.</summary>
    public static Drawing? DrawFlow(StudyResult result, DrawingSize size)
    {
        ArgumentNullException.ThrowIfNull(result);
        if (result.Input.Flow.Record is not { } record || !(result.Flow.DesignFlowM3PerS > 0))
            return null;
        var shares = new double[record.DayCount];
        for (var i = 0; i < shares.Length; i++)
            shares[i] = record.Flows[i] / result.Flow.DesignFlowM3PerS;
        return Draw(new DayCalendarInput(record.FirstDay, shares, FirstMonth(result), "Daily flow", "the design flow", "the design flow or more"), size);
    }

    /// <summary>The days' energy over that of the best day; null without a daily record or without energy.</summary>
    public static Drawing? DrawEnergy(StudyResult result, DrawingSize size)
    {
        ArgumentNullException.ThrowIfNull(result);
        if (result.Energy.Days is not { } days || result.Input.Flow.Record is not { } record)
            return null;
        var most = days.EnergyOfDaysKwh.Where(e => !double.IsNaN(e)).DefaultIfEmpty(0).Max();
        return most > 0
            ? Draw(new DayCalendarInput(record.FirstDay, [.. days.EnergyOfDaysKwh.Select(e => e / most)], FirstMonth(result), "Daily energy", "the best day's energy", "the best day's"), size)
            : null;
    }

    private static int FirstMonth(StudyResult result) => result.Input.Flow.YearKind == YearKind.Water ? 10 : 1;
}
