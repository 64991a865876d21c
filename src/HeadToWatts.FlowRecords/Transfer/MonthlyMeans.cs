using System.Globalization;
using HeadToWatts.Basis.Problems;

namespace HeadToWatts.FlowRecords.Transfer;

/// <summary>The mean flow of a month of a year.</summary>
/// <param name="Year">The year.</param>
/// <param name="Month">1 to 12.</param>
/// <param name="FlowM3PerS">Mean flow, m3/s; NaN where missing.</param>
public readonly record struct MonthMean(int Year, int Month, double FlowM3PerS);

/// <summary>Monthly means as a record of steps: every day of a month has the month's mean.</summary>
public static class MonthlyMeans
{
    // A year without 29 February, for means of no year in particular.
    private const int TypicalYear = 2001;

    /// <summary>A record of the months of several years; months between that are not given are missing.</summary>
    /// <param name="means">The means in any order.</param>
    /// <param name="description">Where they come from.</param>
    /// <param name="where">Field they come from.</param>
    public static Checked<TransferredRecord> OfYears(IReadOnlyList<MonthMean> means, string description, string where)
    {
        ArgumentNullException.ThrowIfNull(means);
        ArgumentNullException.ThrowIfNull(description);
        ArgumentNullException.ThrowIfNull(where);
        var problems = new List<Problem>();
        if (means.Count == 0)
            problems.Add(new Problem(where, "", "nothing is entered", "one or more months with their mean flow"));
        var seen = new HashSet<(int, int)>();
        foreach (var mean in means)
        {
            var read = $"{Text(mean.Year)}-{mean.Month.ToString("00", CultureInfo.InvariantCulture)}: {mean.FlowM3PerS.ToString("0.####", CultureInfo.InvariantCulture)} m3/s";
            if (mean.Month is < 1 or > 12 || mean.Year is < 1 or > 9998)
                problems.Add(new Problem(where, read, "there is no such month", "a year and a month from 1 to 12"));
            else if (!seen.Add((mean.Year, mean.Month)))
                problems.Add(new Problem(where, read, "the month is given twice", "one mean for each month"));
            if (double.IsInfinity(mean.FlowM3PerS) || mean.FlowM3PerS < 0)
                problems.Add(new Problem(where, read, "the flow is negative or not a number", "a flow of zero or more"));
        }

        return problems.Count > 0
            ? Checked.Refused<TransferredRecord>(problems)
            : Checked.Of(Record(means, description, "daily flow within a month is not known; floods and dry spells within it do not show"));
    }

    /// <summary>A record of one typical year from twelve means.</summary>
    /// <param name="flowsM3PerS">Twelve means from January on, m3/s.</param>
    /// <param name="description">Where they come from.</param>
    /// <param name="where">Field they come from.</param>
    public static Checked<TransferredRecord> OfTypicalYear(IReadOnlyList<double> flowsM3PerS, string description, string where)
    {
        ArgumentNullException.ThrowIfNull(flowsM3PerS);
        ArgumentNullException.ThrowIfNull(where);
        return flowsM3PerS.Count == 12
            ? OfYears([.. flowsM3PerS.Select((q, i) => new MonthMean(TypicalYear, i + 1, q))], description, where)
            : Checked.Refused<TransferredRecord>(new Problem(where, $"{Text(flowsM3PerS.Count)} means", "a typical year has twelve months", "twelve means from January to December"));
    }

    private static TransferredRecord Record(IReadOnlyList<MonthMean> means, string description, string note)
    {
        var first = means.Min(m => new DateOnly(m.Year, m.Month, 1));
        var end = means.Max(m => new DateOnly(m.Year, m.Month, 1)).AddMonths(1);
        var flows = new double[end.DayNumber - first.DayNumber];
        Array.Fill(flows, double.NaN);
        foreach (var mean in means)
        {
            var start = new DateOnly(mean.Year, mean.Month, 1).DayNumber - first.DayNumber;
            Array.Fill(flows, mean.FlowM3PerS, start, DateTime.DaysInMonth(mean.Year, mean.Month));
        }

        return new TransferredRecord(
            new DailyRecord(first, flows, $"{description}; monthly means as steps"), FlowConfidence.Low, "made of monthly means", [$"{Text(means.Count)} monthly means", note], []);
    }

    private static string Text(int count) => count.ToString(CultureInfo.InvariantCulture);
}
