using System.Globalization;
using HeadToWatts.Basis.Problems;
using HeadToWatts.Basis.Units;
using HeadToWatts.FlowRecords;

namespace HeadToWatts.Files.FlowFiles.Reading;

/// <summary>
/// Gathers dated rows and makes the daily record: settles the order of day and month, sorts, finds repeats, lays absent days
/// open as missing, and counts all of it.
/// </summary>
internal sealed class DailyRows(ProblemList problems)
{
    // 4,000 years of days; more rows than that are not daily means.
    private const int MostRows = 1_500_000;
    private readonly List<Row> _rows = [];
    private readonly List<string> _assumptions = [];
    private bool _tooMany;

    public Tally Missing { get; } = new();

    public Tally Codes { get; } = new();

    public int DryMarks { get; private set; }

    public void Assume(string text) => _assumptions.Add(text);

    /// <summary>Takes one row; a date or value that cannot be read becomes a problem.</summary>
    public void Add(int row, string dateText, string cell, NumberSigns signs = NumberSigns.Point)
    {
        if (_rows.Count >= MostRows)
        {
            if (!_tooMany)
                problems.File($"more than {MostRows.ToString("N0", CultureInfo.InvariantCulture)} rows", "this is too much to be daily flows", "one row a day");
            _tooMany = true;
            return;
        }

        var goodDate = WrittenDate.TryRead(dateText, out var date, out var why);
        if (!goodDate)
            problems.Row(row, dateText, why, WrittenDate.Accepted);
        switch (WrittenValue.Read(cell, signs, out var value, out var note))
        {
            case CellKind.Wrong:
                problems.Row(row, cell, note, "a number, or a blank where the value is missing");
                return;
            case CellKind.Missing:
                Missing.Add(note);
                break;
            case CellKind.Value when note == "Dry":
                DryMarks++;
                break;
        }

        if (goodDate)
            _rows.Add(new Row(date, row, value));
    }

    /// <summary>Makes the record, or the list of problems.</summary>
    public Checked<FlowFile> Build(IFlowFileFormat format, FlowFileOptions options, DateOrder? usualOrder, UnitOfMeasure unit, string column, string description)
    {
        if (_rows.Count == 0)
        {
            if (!problems.Any)
                problems.File("no rows", "there is no row with a date and a flow", WrittenDate.Accepted + ", and a flow");
            return problems.Refuse();
        }

        if (_tooMany || SettleOrder(options.Order, usualOrder) is not { } order)
            return problems.Refuse();
        var days = Place(order);
        if (days is null)
            return problems.Refuse();
        if (SeveralADay(days))
            return problems.Refuse();
        var outOfOrder = Sort(ref days);
        var duplicates = Repeats(days);

        var valid = days.Where(d => !double.IsNaN(d.Value)).ToList();
        if (valid.Count == 0)
        {
            problems.File($"{Number(_rows.Count)} rows", "no row has a flow", "at least one day with a flow");
            return problems.Refuse();
        }

        foreach (var day in valid)
        {
            if (day.Value < 0 && !options.AcceptNegatives)
                problems.Row(day.FileRow, Text(day), "the flow is negative", "zero or more; a computed inflow only with negatives accepted, which then count as no flow");
        }

        if (problems.Any)
            return problems.Refuse();

        var (first, last) = (valid[0].DayNumber, valid[^1].DayNumber);
        var flows = new double[last - first + 1];
        Array.Fill(flows, double.NaN);
        var within = 0;
        var outside = 0;
        foreach (var day in days)
        {
            if (day.DayNumber < first || day.DayNumber > last)
            {
                outside++;
                continue;
            }

            within++;
            flows[day.DayNumber - first] = double.IsNaN(day.Value) ? double.NaN : unit.ToHeld(day.Value);
        }

        var record = new DailyRecord(DateOnly.FromDayNumber(first), flows, description);
        State(record, outOfOrder, duplicates, outside);
        return Checked.Of(new FlowFile(format.Id, null, record, new FlowFileReport
        {
            FormatName = format.Name,
            Description = description,
            Column = column,
            Unit = unit,
            FirstDay = record.FirstDay,
            LastDay = record.LastDay,
            Rows = _rows.Count,
            Days = record.DayCount,
            Valid = record.ValidCount,
            MissingValueRows = within - record.ValidCount,
            AbsentDays = record.DayCount - within,
            RowsOutsidePeriod = outside,
            Duplicates = duplicates,
            OutOfOrder = outOfOrder,
            Negatives = record.NegativeCount,
            Zeros = record.ZeroCount,
            MissingMarks = Missing.Counts(),
            Codes = Codes.Counts(),
            Assumptions = _assumptions,
        }));
    }

    private static string Number(int count) => count.ToString("N0", CultureInfo.InvariantCulture);

    private static string Rows(int count) => count == 1 ? "1 row" : Number(count) + " rows";

    private static string Text(Day day) =>
        string.Create(CultureInfo.InvariantCulture, $"{DateOnly.FromDayNumber(day.DayNumber):yyyy-MM-dd}, {day.Value:R}");

    private void State(DailyRecord record, int outOfOrder, int duplicates, int outside)
    {
        foreach (var mark in Missing.Counts())
            _assumptions.Add($"{mark.Mark} means a missing value ({Rows(mark.Count)})");
        if (DryMarks > 0)
            _assumptions.Add($"Dry means no flow ({Rows(DryMarks)})");
        if (outOfOrder > 0)
            _assumptions.Add($"{Rows(outOfOrder)} out of order put in the order of their dates");
        if (duplicates > 0)
            _assumptions.Add($"{Rows(duplicates)} that repeat a day with the same flow, or without one, counted once");
        if (outside > 0)
            _assumptions.Add($"{Rows(outside)} without a value before the first or after the last flow left out of the period");
        if (record.NegativeCount > 0)
            _assumptions.Add($"{Number(record.NegativeCount)} negative flows were accepted; the flow-duration curve counts them as no flow");
    }

    // Told, or plain from a number above 12, or the agency's custom; otherwise asked for.
    private DateOrder? SettleOrder(DateOrder? told, DateOrder? usual)
    {
        Row? dayFirst = null, monthFirst = null, open = null;
        foreach (var row in _rows)
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
                $"rows {d.FileRow.ToString(CultureInfo.InvariantCulture)} and {m.FileRow.ToString(CultureInfo.InvariantCulture)} cannot both be right: one has the day first, the other the month", WrittenDate.Accepted);
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
            Assume($"dates are {Name(plain)}, as row {row.FileRow.ToString(CultureInfo.InvariantCulture)} shows ({row.Date})");
            return plain;
        }

        if (usual is { } custom)
        {
            Assume($"dates are {Name(custom)}, as is usual in this format; no date in the file shows it");
            return custom;
        }

        problems.Row(open.Value.FileRow, open.Value.Date.ToString(), "no date in the file shows whether the day or the month comes first", "choose month first or day first, or write yyyy-mm-dd");
        return null;

        static string Name(DateOrder o) => o == DateOrder.MonthFirst ? "month/day/year" : "day/month/year";
    }

    private List<Day>? Place(DateOrder order)
    {
        var days = new List<Day>(_rows.Count);
        foreach (var row in _rows)
        {
            if (row.Date.Day(order) is { } day)
                days.Add(new Day(day.DayNumber, row.FileRow, row.Value));
            else
                problems.Row(row.FileRow, row.Date.ToString(), "there is no such day", WrittenDate.Accepted);
        }

        return days.Count == 0 ? null : days;
    }

    private bool SeveralADay(List<Day> days)
    {
        var distinct = days.Select(d => d.DayNumber).Distinct().Count();
        if (days.Count < 1.5 * distinct || !_rows.Exists(r => r.Date.HasTime))
            return false;
        problems.File($"{Number(days.Count)} rows in {Number(distinct)} days", "there is more than one value a day; daily mean flows are read", "one row a day");
        return true;
    }

    private static int Sort(ref List<Day> days)
    {
        var late = 0;
        var latest = int.MinValue;
        foreach (var day in days)
        {
            if (day.DayNumber < latest)
                late++;
            latest = Math.Max(latest, day.DayNumber);
        }

        if (late > 0)
            days = [.. days.OrderBy(d => d.DayNumber)];
        return late;
    }

    // Leaves one row a day. Two flows for one day are a problem; the same flow twice, or a flow and a blank, are not.
    private int Repeats(List<Day> days)
    {
        var kept = 0;
        var repeats = 0;
        for (var i = 0; i < days.Count; i++)
        {
            if (kept > 0 && days[kept - 1].DayNumber == days[i].DayNumber)
            {
                repeats++;
                var before = days[kept - 1];
                if (double.IsNaN(before.Value))
                    days[kept - 1] = days[i];
                else if (!double.IsNaN(days[i].Value) && days[i].Value != before.Value)
                    problems.Row(days[i].FileRow, Text(days[i]), $"row {before.FileRow.ToString(CultureInfo.InvariantCulture)} gives another flow for the same day, {before.Value.ToString("R", CultureInfo.InvariantCulture)}", "one flow a day");
                continue;
            }

            days[kept++] = days[i];
        }

        days.RemoveRange(kept, days.Count - kept);
        return repeats;
    }

    private readonly record struct Row(WrittenDate Date, int FileRow, double Value);

    private readonly record struct Day(int DayNumber, int FileRow, double Value);
}
