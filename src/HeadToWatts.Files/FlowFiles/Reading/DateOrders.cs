using System.Globalization;

namespace HeadToWatts.Files.FlowFiles.Reading;

/// <summary>Settles whether day or month comes first: told, or plain from a number above 12, or the agency's custom; otherwise asked for.</summary>
internal static class DateOrders
{
    public static string Name(DateOrder order) => order == DateOrder.MonthFirst ? "month/day/year" : "day/month/year";

    public static DateOrder? Settle(IReadOnlyList<RecordRow> rows, DateOrder? told, DateOrder? usual, ProblemList problems, List<string> assumptions)
    {
        RecordRow? dayFirst = null, monthFirst = null, open = null;
        foreach (var row in rows)
        {
            if (row.Date.OrderKnown)
                continue;
            open ??= row;
            if (row.Date.First > 12)
                dayFirst ??= row;
            if (row.Date.Second > 12)
                monthFirst ??= row;
        }

        if (open is null)
            return DateOrder.MonthFirst;
        if (dayFirst is { } d && monthFirst is { } m)
        {
            problems.Row(Math.Max(d.FileRow, m.FileRow), $"{d.Date} and {m.Date}",
                $"rows {Number(d.FileRow)} and {Number(m.FileRow)} cannot both be right: one has the day first, the other the month", WrittenDate.Accepted);
            return null;
        }

        var seen = dayFirst is not null ? DateOrder.DayFirst : monthFirst is not null ? DateOrder.MonthFirst : (DateOrder?)null;
        if (told is { } order)
        {
            if (seen is { } other && other != order)
            {
                var row = (dayFirst ?? monthFirst)!.Value;
                problems.Row(row.FileRow, row.Date.ToString(), $"the date does not fit the order that was chosen, {Name(order)}", Name(other));
                return null;
            }

            return order;
        }

        if (seen is { } plain)
        {
            var row = (dayFirst ?? monthFirst)!.Value;
            assumptions.Add($"dates are {Name(plain)}, as row {Number(row.FileRow)} shows ({row.Date})");
            return plain;
        }

        if (usual is { } custom)
        {
            assumptions.Add($"dates are {Name(custom)}, as is usual in this format; no date in the file shows it");
            return custom;
        }

        problems.Row(open.Value.FileRow, open.Value.Date.ToString(), "no date in the file shows whether the day or the month comes first", "choose month first or day first, or write yyyy-mm-dd");
        return null;
    }

    private static string Number(int row) => row.ToString(CultureInfo.InvariantCulture);
}
