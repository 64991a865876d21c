using System.Globalization;
using HeadToWatts.Basis.Problems;

namespace HeadToWatts.FlowRecords.Transfer;

/// <summary>A line of a delivery schedule.</summary>
/// <param name="From">First day.</param>
/// <param name="To">Last day; before the first when the span runs over the new year.</param>
/// <param name="FlowM3PerS">Flow on these days, m3/s.</param>
public readonly record struct DeliverySpan(MonthDay From, MonthDay To, double FlowM3PerS);

/// <summary>A canal company's plan as the record of one year: the planned flow on the days of each span, none on the others.</summary>
public static class DeliverySchedule
{
    private const int Year = 2001;

    /// <summary>Makes the record, or lists what is wrong with the plan.</summary>
    /// <param name="spans">Its lines; no day may lie in two of them.</param>
    /// <param name="description">Whose plan, of which year.</param>
    /// <param name="where">Field they come from.</param>
    public static Checked<TransferredRecord> ToRecord(IReadOnlyList<DeliverySpan> spans, string description, string where)
    {
        ArgumentNullException.ThrowIfNull(spans);
        ArgumentNullException.ThrowIfNull(description);
        ArgumentNullException.ThrowIfNull(where);
        var problems = new List<Problem>();
        if (spans.Count == 0)
            problems.Add(new Problem(where, "", "nothing is entered", "one or more spans with first day, last day and flow"));
        var flows = new double[365];
        var owner = new int[365];
        var first = new DateOnly(Year, 1, 1);
        for (var line = 0; line < spans.Count; line++)
        {
            var span = spans[line];
            var at = $"{where} line {Text(line + 1)}";
            if (!IsDay(span.From) || !IsDay(span.To))
            {
                problems.Add(new Problem(at, Read(span), "there is no such day", "a month and a day"));
                continue;
            }

            if (!(span.FlowM3PerS >= 0 && double.IsFinite(span.FlowM3PerS)))
            {
                problems.Add(new Problem(at, Read(span), "the flow is negative or not a number", "a flow of zero or more"));
                continue;
            }

            var clash = 0;
            var last = IndexOf(span.To);
            for (var i = IndexOf(span.From); ; i = (i + 1) % 365)
            {
                if (owner[i] != 0 && clash == 0)
                    clash = owner[i];
                owner[i] = line + 1;
                flows[i] = span.FlowM3PerS;
                if (i == last)
                    break;
            }

            if (clash != 0)
                problems.Add(new Problem(at, Read(span), $"some of its days are also in line {Text(clash)}", "spans that do not overlap"));
        }

        if (problems.Count > 0)
            return Checked.Refused<TransferredRecord>(problems);
        var planned = owner.Count(o => o != 0);
        return Checked.Of(new TransferredRecord(
            new DailyRecord(first, flows, $"{description}; delivery schedule"),
            FlowConfidence.Plan,
            "made of a delivery schedule: what is planned, not what came",
            [$"{Text(spans.Count)} spans over {Text(planned)} days of the year; no flow on the other {Text(365 - planned)}"],
            []));
    }

    private static bool IsDay(MonthDay day) => day.Month is >= 1 and <= 12 && day.Day >= 1 && day.Day <= DateTime.DaysInMonth(2000, day.Month);

    // 29 February falls on the 28th of this year.
    private static int IndexOf(MonthDay day) => new DateOnly(Year, day.Month, Math.Min(day.Day, DateTime.DaysInMonth(Year, day.Month))).DayOfYear - 1;

    private static string Read(DeliverySpan span) =>
        $"{Text(span.From.Month)}-{Text(span.From.Day)} to {Text(span.To.Month)}-{Text(span.To.Day)}: {span.FlowM3PerS.ToString("0.####", CultureInfo.InvariantCulture)} m3/s";

    private static string Text(int count) => count.ToString(CultureInfo.InvariantCulture);
}
