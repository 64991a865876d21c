using System.Globalization;
using System.Text.RegularExpressions;
using HeadToWatts.Basis.Problems;
using HeadToWatts.FlowRecords.Quality;

namespace HeadToWatts.Files.FlowFiles.Reading;

/// <summary>
/// Gathers dated rows of any format and makes the daily record of them: a row a day as it stands, more rows a day by time
/// weighting. A wrong row is a problem, but a last row that the end of the file cuts off is left out and told.
/// </summary>
internal sealed partial class RecordRows(FlowFileSource source, FlowFileOptions options, ProblemList problems)
{
    // A file of 64 MB cannot hold more rows that mean something.
    private const int MostRows = 8_000_000;
    private readonly List<RecordRow> _rows = [];
    private readonly List<string> _assumptions = [];
    private (int Row, Problem Problem)? _pending;
    private bool _tooMany;

    public Tally Missing { get; } = new();

    public Tally Codes { get; } = new();

    public Findings Findings { get; } = new();

    public int DryMarks { get; private set; }

    public IReadOnlyList<RecordRow> Rows => _rows;

    public FlowFileOptions Options => options;

    public ProblemList Problems => problems;

    public IReadOnlyList<string> Assumptions => _assumptions;

    /// <summary>True when a cell after the value shows that the last row is whole.</summary>
    public bool LastRowIsProven { get; set; }

    public void Assume(string text) => _assumptions.Add(text);

    /// <summary>A row that is wrong; told as a problem unless it is the last and the file ends inside it.</summary>
    public void Wrong(int row, string read, string why, string accepted = "")
    {
        Settle();
        _pending = (row, problems.RowProblem(row, read, why, accepted));
    }

    /// <summary>Takes one row; a date or value that cannot be read makes it wrong.</summary>
    public void Add(
        int row,
        ReadOnlySpan<char> dateText,
        ReadOnlySpan<char> cell,
        NumberSigns signs = NumberSigns.Point,
        DayMarks marks = DayMarks.None,
        ReadOnlySpan<char> timeText = default,
        short offsetMin = WrittenDate.NoOffset)
    {
        if (!WrittenDate.TryRead(dateText, out var date, out var why))
        {
            if (IsTotal(dateText))
                Total(row, dateText, cell);
            else
                Wrong(row, dateText.ToString(), why, WrittenDate.Accepted);
            return;
        }

        if (timeText.Length > 0)
        {
            if (!WrittenTime.TryRead(timeText, compact: false, out var time, out var offset))
            {
                Wrong(row, timeText.ToString(), "the time of day is not understood", "hh:mm");
                return;
            }

            date = date with { TimeMs = time, OffsetMin = offset };
        }

        if (offsetMin != WrittenDate.NoOffset)
            date = date with { OffsetMin = offsetMin };
        var kind = WrittenValue.Read(cell, signs, out var value, out var note);
        if (kind == CellKind.Wrong)
        {
            Wrong(row, cell.ToString(), note, "a number, or a blank where the value is missing");
            return;
        }

        if (kind == CellKind.Missing)
        {
            Missing.Add(note);
            if (note.Equals("ice", StringComparison.OrdinalIgnoreCase))
                marks |= DayMarks.Ice;
        }
        else if (note.Length > 0)
        {
            DryMarks++;
        }

        Keep(new RecordRow(date, row, value, marks));
    }

    /// <summary>Takes one row that is read already.</summary>
    public void Keep(RecordRow row)
    {
        if (_pending is not null)
            Settle();
        if (_rows.Count >= MostRows)
        {
            if (!_tooMany)
                problems.File($"more than {MostRows.ToString("N0", CultureInfo.InvariantCulture)} rows", "this is too much to be a record of flows", "a row a day, or some a day");
            _tooMany = true;
            return;
        }

        _rows.Add(row);
        LastRowIsProven = false;
    }

    public void Dry() => DryMarks++;

    /// <summary>A row of totals or means is left out and told.</summary>
    public void Total(int row, ReadOnlySpan<char> words, ReadOnlySpan<char> cell)
    {
        Settle();
        Findings.Add(QualityKind.TotalsRow, row, $"{words}, {cell}", "left out");
    }

    public static bool IsTotal(ReadOnlySpan<char> text) => text.Length is >= 3 and < 40 && TotalWord().IsMatch(text);

    /// <summary>Makes the record, or the list of problems.</summary>
    public Checked<FlowFile> Build(RecordAbout about)
    {
        EndOfFile();
        if (_rows.Count == 0)
        {
            if (!problems.Any)
                problems.File("no rows", "there is no row with a date and a flow", WrittenDate.Accepted + ", and a flow");
            return problems.Refuse();
        }

        if (options.Stage is not null && about.Unit.Dimension != Basis.Units.Dimension.Length)
        {
            problems.File(about.Column, $"the file holds flows in {about.Unit.Symbol}; a rating is for water levels", "a file of water levels, or no rating");
            return problems.Refuse();
        }

        if (_tooMany || DateOrders.Settle(_rows, options.Order, about.UsualOrder, problems, _assumptions) is not { } order)
            return problems.Refuse();
        if (source.IsWestern)
            Assume("the text is not UTF-8 and was read as Western European (ISO 8859-1)");
        var placed = Place(order, out var hasTimes);
        if (placed is null)
            return problems.Refuse();
        return about.WithinDays || (hasTimes && SeveralADay(placed))
            ? new SubDailyBuild(this, about).Build(placed)
            : new DailyBuild(this, about).Build(placed);
    }

    private void Settle()
    {
        if (_pending is { } pending)
            problems.Add(pending.Problem);
        _pending = null;
    }

    private void EndOfFile()
    {
        if (_pending is { } pending && source.EndsInsideRow && _rows.Count > 0)
        {
            Findings.Add(QualityKind.CutRow, pending.Row, pending.Problem.Read, "left out, since the file ends inside it: " + pending.Problem.Why);
            _pending = null;
        }
        else if (source.EndsInsideRow && !LastRowIsProven && _rows.Count > 0 && _pending is null)
        {
            var last = _rows[^1];
            Findings.Add(QualityKind.OpenEnd, last.FileRow, $"{last.Date}, {last.Value.ToString("R", CultureInfo.InvariantCulture)}", "kept; see whether its last value is whole");
        }

        Settle();
    }

    private PlacedRow[]? Place(DateOrder order, out bool hasTimes)
    {
        hasTimes = false;
        var placed = new PlacedRow[_rows.Count];
        var count = 0;
        foreach (var row in _rows)
        {
            if (row.Date.Day(order) is { } day)
                placed[count++] = new PlacedRow(day.DayNumber, row.FileRow, row.Value, row.Marks);
            else
                problems.Row(row.FileRow, row.Date.ToString(), "there is no such day", WrittenDate.Accepted);
            hasTimes |= row.Date.HasTime;
        }

        // With a bad day the rows and the list would no longer go together.
        return count < placed.Length ? null : placed;
    }

    private static bool SeveralADay(PlacedRow[] rows)
    {
        var distinct = new HashSet<long>();
        var last = long.MinValue;
        foreach (var row in rows)
        {
            if (row.At == last)
                continue;
            last = row.At;
            distinct.Add(last);
        }

        return rows.Length >= 1.5 * distinct.Count && rows.Length > 1;
    }

    [GeneratedRegex(@"^\W*(grand |sub)?(total|sum|mean|average|avg|max(imum)?|min(imum)?|count|median|summe|mittel|moyenne)\b", RegexOptions.IgnoreCase)]
    private static partial Regex TotalWord();
}
