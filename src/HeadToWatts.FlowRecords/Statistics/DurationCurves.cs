using HeadToWatts.Basis.Sources;

namespace HeadToWatts.FlowRecords.Statistics;

/// <summary>The curve of one month's days, over the time of that month.</summary>
/// <param name="Month">1 to 12.</param>
/// <param name="Days">Days of the record behind it.</param>
/// <param name="Curve">Flow against share of the month's time.</param>
public sealed record MonthCurve(int Month, int Days, FlowDurationCurve Curve);

/// <summary>
/// Flow-duration curves of parts of a record, each over its own time: exceedance counts the days of the month, the season or
/// the year chosen, not of the whole year. The curve on which the plant is run is <see cref="FlowDurationCurve.FromRecord"/>.
/// </summary>
public static class DurationCurves
{
    private const int DaysOfAnnualCurve = 365;

    /// <summary>Median-annual curve.</summary>
    internal static readonly Method MedianAnnual = new(
        "median-annual-curve", "Median annual flow-duration curve", "Q(p) = median of Q_{year}(p) over the years",
        FlowRecordSources.Vogel, "annual interpretation", [new InputRange("n", "whole years", "1", 10, double.PositiveInfinity)]);

    /// <summary>The curve of the days of a season over the season's time; null when it has no day with a flow.</summary>
    /// <param name="record">The record.</param>
    /// <param name="position">The plotting position.</param>
    /// <param name="season">The days that count.</param>
    public static FlowDurationCurve? OfSeason(DailyRecord record, PlottingPosition position, OperatingSeason season)
    {
        ArgumentNullException.ThrowIfNull(record);
        ArgumentNullException.ThrowIfNull(position);
        ArgumentNullException.ThrowIfNull(season);
        return OfDays(record, position, i => season.Runs(record.MonthOf(i), record.DayOfMonthOf(i)));
    }

    /// <summary>The curve of all days: the period of record.</summary>
    /// <param name="record">The record.</param>
    /// <param name="position">The plotting position.</param>
    public static FlowDurationCurve? OfAllDays(DailyRecord record, PlottingPosition position) => OfSeason(record, position, OperatingSeason.WholeYear);

    /// <summary>The curves of the months that have a day with a flow.</summary>
    /// <param name="record">The record.</param>
    /// <param name="position">The plotting position.</param>
    public static IReadOnlyList<MonthCurve> OfMonths(DailyRecord record, PlottingPosition position)
    {
        ArgumentNullException.ThrowIfNull(record);
        ArgumentNullException.ThrowIfNull(position);
        var curves = new List<MonthCurve>();
        for (var month = 1; month <= 12; month++)
        {
            var flows = FlowsWhere(record, i => record.MonthOf(i) == month);
            if (flows.Length > 0)
                curves.Add(new MonthCurve(month, flows.Length, RecordCurve.OfFlows(flows, position)));
        }

        return curves;
    }

    /// <summary>The curve of one year of the record; null when it has no day with a flow.</summary>
    /// <param name="record">The record.</param>
    /// <param name="position">The plotting position.</param>
    /// <param name="year">The year.</param>
    public static FlowDurationCurve? OfYear(DailyRecord record, PlottingPosition position, RecordYear year)
    {
        ArgumentNullException.ThrowIfNull(year);
        ArgumentNullException.ThrowIfNull(record);
        ArgumentNullException.ThrowIfNull(position);
        return OfDays(record, position, i => i >= year.FirstIndex && i < year.FirstIndex + year.Days);
    }

    /// <summary>
    /// The median of the whole years' curves at every exceedance: a usual year, in which the rarest floods and droughts of the
    /// record do not show. Null when there is no whole year.
    /// </summary>
    /// <param name="record">The record.</param>
    /// <param name="position">The plotting position.</param>
    /// <param name="years">The record's years.</param>
    public static FlowDurationCurve? OfMedianYear(DailyRecord record, PlottingPosition position, RecordYears years)
    {
        ArgumentNullException.ThrowIfNull(years);
        var band = BetweenYears.ByExceedance(record, position, years, [.. Enumerable.Range(1, DaysOfAnnualCurve).Select(i => i / (DaysOfAnnualCurve + 1.0))]);
        return band.Count == 0
            ? null
            : FlowDurationCurve.FromRows([.. band.Select(b => new CurvePoint(b.Exceedance, b.MedianFlowM3PerS))], BeyondLastRow.Hold, "median annual curve").Value;
    }

    /// <summary>States the use of the median annual curve.</summary>
    /// <param name="years">The record's years.</param>
    public static MethodUse MedianYearUse(RecordYears years)
    {
        ArgumentNullException.ThrowIfNull(years);
        var count = years.Whole.Count;
        return MedianAnnual.Used(new InputSpan("n", count, count));
    }

    internal static double[] FlowsWhere(DailyRecord record, Func<int, bool> counts)
    {
        var flows = record.Flows;
        var chosen = new List<double>();
        for (var i = 0; i < flows.Length; i++)
        {
            if (!double.IsNaN(flows[i]) && counts(i))
                chosen.Add(Math.Max(0, flows[i]));
        }

        return [.. chosen];
    }

    private static FlowDurationCurve? OfDays(DailyRecord record, PlottingPosition position, Func<int, bool> counts)
    {
        var flows = FlowsWhere(record, counts);
        return flows.Length == 0 ? null : RecordCurve.OfFlows(flows, position);
    }
}
