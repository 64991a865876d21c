namespace HeadToWatts.FlowRecords.Statistics;

/// <summary>Flow of a day of the year over the years of a record.</summary>
/// <param name="Month">Month, 1 to 12.</param>
/// <param name="Day">Day of the month; 29 February is left out.</param>
/// <param name="Years">Years with a flow on it.</param>
/// <param name="LowFlowM3PerS">Flow exceeded in 90 percent of years, m3/s.</param>
/// <param name="MedianFlowM3PerS">Flow exceeded in half of the years, m3/s.</param>
/// <param name="HighFlowM3PerS">Flow exceeded in 10 percent of years, m3/s.</param>
public sealed record DayOfYearBand(int Month, int Day, int Years, double LowFlowM3PerS, double MedianFlowM3PerS, double HighFlowM3PerS);

/// <summary>Flow at an exceedance over the whole years of a record.</summary>
/// <param name="Exceedance">Share of the year's time.</param>
/// <param name="LowFlowM3PerS">Flow reached by the curves of 90 percent of years, m3/s.</param>
/// <param name="MedianFlowM3PerS">Flow reached by half of the years, m3/s.</param>
/// <param name="HighFlowM3PerS">Flow reached by 10 percent of years, m3/s.</param>
public sealed record ExceedanceBand(double Exceedance, double LowFlowM3PerS, double MedianFlowM3PerS, double HighFlowM3PerS);

/// <summary>How far flows differ from year to year. Quantiles by the Weibull position among the years; with few years the ends are the extremes.</summary>
public static class BetweenYears
{
    private const double LowNonExceedance = 0.1;
    private const double HighNonExceedance = 0.9;

    /// <summary>The band by day of the year, from 1 January; days on which no year has a flow are left out.</summary>
    /// <param name="record">The record.</param>
    public static IReadOnlyList<DayOfYearBand> ByDayOfYear(DailyRecord record)
    {
        ArgumentNullException.ThrowIfNull(record);
        var days = new List<double>[12, 31];
        var flows = record.Flows;
        for (var i = 0; i < flows.Length; i++)
        {
            var (month, day) = (record.MonthOf(i), record.DayOfMonthOf(i));
            if (!double.IsNaN(flows[i]) && !(month == 2 && day == 29))
                (days[month - 1, day - 1] ??= []).Add(flows[i]);
        }

        var bands = new List<DayOfYearBand>(365);
        for (var month = 1; month <= 12; month++)
        {
            for (var day = 1; day <= 31; day++)
            {
                if (days[month - 1, day - 1] is not { } values)
                    continue;
                double[] ascending = [.. values.Order()];
                bands.Add(new DayOfYearBand(
                    month, day, ascending.Length, Quantile.Of(ascending, LowNonExceedance), Quantile.Of(ascending, 0.5), Quantile.Of(ascending, HighNonExceedance)));
            }
        }

        return bands;
    }

    /// <summary>The band by exceedance; empty when there is no whole year.</summary>
    /// <param name="record">The record.</param>
    /// <param name="position">The plotting position.</param>
    /// <param name="years">The record's years.</param>
    /// <param name="exceedances">Exceedances at which it is wanted, 0 to 1.</param>
    public static IReadOnlyList<ExceedanceBand> ByExceedance(DailyRecord record, PlottingPosition position, RecordYears years, IReadOnlyList<double> exceedances)
    {
        ArgumentNullException.ThrowIfNull(years);
        ArgumentNullException.ThrowIfNull(exceedances);
        FlowDurationCurve[] curves = [.. years.Whole.Select(y => DurationCurves.OfYear(record, position, y)!)];
        if (curves.Length == 0)
            return [];
        var ascending = new double[curves.Length];
        var bands = new ExceedanceBand[exceedances.Count];
        for (var i = 0; i < bands.Length; i++)
        {
            for (var y = 0; y < curves.Length; y++)
                ascending[y] = curves[y].FlowAt(exceedances[i]);
            Array.Sort(ascending);
            bands[i] = new ExceedanceBand(exceedances[i], Quantile.Of(ascending, LowNonExceedance), Quantile.Of(ascending, 0.5), Quantile.Of(ascending, HighNonExceedance));
        }

        return bands;
    }
}
