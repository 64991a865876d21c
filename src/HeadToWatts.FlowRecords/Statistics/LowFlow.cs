using HeadToWatts.Basis.Sources;

namespace HeadToWatts.FlowRecords.Statistics;

/// <summary>The lowest mean of some days in a year.</summary>
/// <param name="Year">The year.</param>
/// <param name="FlowM3PerS">The lowest mean, m3/s.</param>
/// <param name="FirstDay">First of the days.</param>
public sealed record AnnualMinimum(int Year, double FlowM3PerS, DateOnly FirstDay);

/// <summary>A low flow of a number of days and a return period, such as 7Q10.</summary>
/// <param name="Days">Days of the mean.</param>
/// <param name="ReturnPeriodYears">Return period, years.</param>
/// <param name="FlowM3PerS">The flow, m3/s.</param>
/// <param name="Fit">The fitted distribution.</param>
/// <param name="Minima">The yearly minima behind it.</param>
/// <param name="YearsLeftOut">Years without enough days.</param>
/// <param name="Uses">The methods used.</param>
public sealed record LowFlowResult(
    int Days, double ReturnPeriodYears, double FlowM3PerS, LogPearsonThree Fit, IReadOnlyList<AnnualMinimum> Minima, int YearsLeftOut, IReadOnlyList<MethodUse> Uses);

/// <summary>Low-flow statistics of a record.</summary>
public static class LowFlow
{
    /// <summary>Yearly minimum of a mean of days.</summary>
    internal static readonly Method Minimum = new(
        "annual-minimum-mean", "Lowest mean flow of d days in each year", "Q_{min} = min of (Q_i + ... + Q_{i+d-1})/d", FlowRecordSources.Riggs, "", []);

    /// <summary>The yearly minima of the mean of some days, whole years only. The days lie within one year and all have a flow.</summary>
    /// <param name="record">The record.</param>
    /// <param name="days">Days of the mean; 1 or more.</param>
    /// <param name="years">The record's years; climate years keep a season of low flow together.</param>
    public static IReadOnlyList<AnnualMinimum> Minima(DailyRecord record, int days, RecordYears years)
    {
        ArgumentNullException.ThrowIfNull(record);
        ArgumentNullException.ThrowIfNull(years);
        ArgumentOutOfRangeException.ThrowIfLessThan(days, 1);
        var flows = record.Flows;
        var minima = new List<AnnualMinimum>();
        foreach (var year in years.Whole)
        {
            var lowest = double.PositiveInfinity;
            var at = -1;
            for (var first = year.FirstIndex; first + days <= year.FirstIndex + year.Days; first++)
            {
                // Summed anew for each window: a running sum keeps the rounding of floods long gone.
                var sum = 0.0;
                for (var i = first; i < first + days; i++)
                    sum += flows[i];
                if (sum < lowest)
                    (lowest, at) = (sum, first);
            }

            if (at >= 0)
                minima.Add(new AnnualMinimum(year.Year, lowest / days, record.DateOf(at)));
        }

        return minima;
    }

    /// <summary>The low flow of a number of days and a return period by log-Pearson III; null with fewer than three years of flow.</summary>
    /// <param name="record">The record.</param>
    /// <param name="days">Days of the mean; 7 for 7Q10.</param>
    /// <param name="returnPeriodYears">Return period, years, above 1; 10 for 7Q10.</param>
    /// <param name="years">The record's years; climate years keep a season of low flow together.</param>
    public static LowFlowResult? Of(DailyRecord record, int days, double returnPeriodYears, RecordYears years)
    {
        if (!(returnPeriodYears > 1 && double.IsFinite(returnPeriodYears)))
            throw new ArgumentOutOfRangeException(nameof(returnPeriodYears), returnPeriodYears, "A return period is longer than a year.");
        var minima = Minima(record, days, years);
        return LogPearsonThree.Fit([.. minima.Select(m => m.FlowM3PerS)]) is { } fit
            ? new LowFlowResult(days, returnPeriodYears, fit.FlowM3PerS(1 / returnPeriodYears), fit, minima, years.All.Count - minima.Count, [Minimum.Used(), .. fit.Uses])
            : null;
    }

    /// <summary>7Q10: the lowest mean flow of seven days that returns once in ten years, by climate years; null with fewer than three years of flow.</summary>
    /// <param name="record">The record.</param>
    public static LowFlowResult? SevenQTen(DailyRecord record) => Of(record, 7, 10, RecordYears.Of(record, YearKind.Climate));

    /// <summary>Q95: the flow reached or exceeded in 95 percent of the time, m3/s; null without a day of flow.</summary>
    /// <param name="record">The record.</param>
    /// <param name="position">The plotting position.</param>
    public static double? Q95M3PerS(DailyRecord record, PlottingPosition position) => DurationCurves.OfAllDays(record, position)?.FlowAt(0.95);

    /// <summary>Mean annual flow, m3/s: the mean of the whole years' means; of all days when no year is whole; null without a day of flow.</summary>
    /// <param name="record">The record.</param>
    /// <param name="years">The record's years.</param>
    public static double? MeanAnnualM3PerS(DailyRecord record, RecordYears years)
    {
        ArgumentNullException.ThrowIfNull(record);
        ArgumentNullException.ThrowIfNull(years);
        var whole = years.Whole;
        if (whole.Count > 0)
            return whole.Average(y => y.MeanFlowM3PerS);
        return record.ValidCount > 0 ? record.MeanM3PerS : null;
    }
}
