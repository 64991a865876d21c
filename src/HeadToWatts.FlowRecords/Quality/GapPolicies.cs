using System.Globalization;
using HeadToWatts.Basis.Problems;

namespace HeadToWatts.FlowRecords.Quality;

/// <summary>A record after the policy about its gaps.</summary>
/// <param name="Record">The record.</param>
/// <param name="FilledDays">Days filled by a straight line.</param>
/// <param name="Done">What was done, in sentences; empty when nothing was.</param>
public sealed record GapsDone(DailyRecord Record, int FilledDays, IReadOnlyList<string> Done);

/// <summary>Applies the policy about days without a flow.</summary>
public static class GapPolicies
{
    /// <summary>The record as the policy wants it.</summary>
    /// <param name="record">The record as read.</param>
    /// <param name="policies">The user's choices.</param>
    /// <param name="where">What to call the record in a problem.</param>
    public static Checked<GapsDone> Apply(DailyRecord record, RecordPolicies policies, string where)
    {
        ArgumentNullException.ThrowIfNull(record);
        ArgumentNullException.ThrowIfNull(policies);
        return policies.Gaps switch
        {
            GapPolicy.Interpolated => Checked.Of(Fill(record, policies.LongestGapDays)),
            GapPolicy.WholeYearsOnly => WholeYears(record, policies.YearStartMonth, where),
            _ => Checked.Of(new GapsDone(record, 0, [])),
        };
    }

    private static GapsDone Fill(DailyRecord record, int longest)
    {
        var flows = record.Flows.ToArray();
        var filled = 0;
        var gaps = 0;
        var left = 0;
        for (var i = 0; i < flows.Length;)
        {
            if (!double.IsNaN(flows[i]))
            {
                i++;
                continue;
            }

            var end = i;
            while (end < flows.Length && double.IsNaN(flows[end]))
                end++;
            if (i > 0 && end < flows.Length && end - i <= longest)
            {
                var (before, after) = (flows[i - 1], flows[end]);
                for (var k = i; k < end; k++)
                    flows[k] = before + ((after - before) * (k - i + 1) / (end - i + 1));
                filled += end - i;
                gaps++;
            }
            else
            {
                left += end - i;
            }

            i = end;
        }

        var done = $"{Number(filled)} days in {Number(gaps)} gaps of up to {Number(longest)} days were filled by a straight line; {Number(left)} days in longer gaps were left out.";
        return new GapsDone(new DailyRecord(record.FirstDay, flows, record.Description), filled, [done]);
    }

    private static Checked<GapsDone> WholeYears(DailyRecord record, int startMonth, string where)
    {
        if (startMonth is < 1 or > 12)
            return Checked.Refused<GapsDone>(new Problem(where, startMonth.ToString(CultureInfo.InvariantCulture), "there is no such month for a year to begin in", "1 to 12"));
        var flows = record.Flows.ToArray();
        var keep = new bool[flows.Length];
        var years = 0;
        for (var start = FirstStart(record.FirstDay, startMonth); start <= record.LastDay && start.Year < 9999; start = start.AddYears(1))
        {
            var first = start.DayNumber - record.FirstDay.DayNumber;
            var end = start.AddYears(1).DayNumber - record.FirstDay.DayNumber;
            if (end > flows.Length || flows.AsSpan(first, end - first).ContainsAnyNaN())
                continue;
            years++;
            keep.AsSpan(first, end - first).Fill(true);
        }

        if (years == 0)
        {
            return Checked.Refused<GapsDone>(new Problem(where, $"{record.FirstDay.ToString("yyyy-MM-dd", CultureInfo.InvariantCulture)} to {record.LastDay.ToString("yyyy-MM-dd", CultureInfo.InvariantCulture)}",
                "whole years only are wanted, and no year of the record is without a gap", "gaps left out, or interpolated"));
        }

        var from = Array.IndexOf(keep, true);
        var to = Array.LastIndexOf(keep, true);
        var left = 0;
        for (var i = 0; i < flows.Length; i++)
        {
            if (keep[i])
                continue;
            if (!double.IsNaN(flows[i]))
                left++;
            flows[i] = double.NaN;
        }

        var done = $"{Number(years)} whole years were used; {Number(left)} days with a flow lie in years with a gap and were left out.";
        return Checked.Of(new GapsDone(new DailyRecord(record.DateOf(from), flows[from..(to + 1)], record.Description), 0, [done]));
    }

    private static DateOnly FirstStart(DateOnly day, int month)
    {
        var start = new DateOnly(day.Year, month, 1);
        return start < day ? start.AddYears(1) : start;
    }

    private static bool ContainsAnyNaN(this Span<double> flows)
    {
        foreach (var flow in flows)
        {
            if (double.IsNaN(flow))
                return true;
        }

        return false;
    }

    private static string Number(int count) => count.ToString("N0", CultureInfo.InvariantCulture);
}
