using System.Globalization;
using HeadToWatts.Files.FlowFiles.Reading;

namespace HeadToWatts.Files.FlowFiles.Recipes;

/// <summary>Where the rows of a table begin and how the first one is split.</summary>
internal sealed record RecipeLayout(char Separator, int At, string[] Cells, int DateColumn, int TimeColumn, int Rows)
{
    /// <summary>Dates of six digits without signs.</summary>
    public bool IsCompact { get; init; }
}

/// <summary>What stands in one column.</summary>
internal sealed class ColumnFacts
{
    private const int MostTexts = 12;
    private readonly Dictionary<string, int> _marks = new(StringComparer.OrdinalIgnoreCase);
    private readonly List<string> _texts = [];
    private int _numbers;
    private int _words;
    private int _longest;
    private bool _manyTexts;

    public string? DecimalComma { get; private set; }

    public string? ThousandsComma { get; private set; }

    public string? OpenComma { get; private set; }

    public bool HasPointAndComma { get; private set; }

    public IReadOnlyList<(string Mark, int Count)> Marks => [.. _marks.Select(m => (m.Key, m.Value))];

    public IReadOnlyList<string> Texts => _texts;

    public bool IsNumeric => _numbers > 0 && _words <= _numbers / 10;

    public bool IsCodes => _words > 0 && _numbers == 0 && !_manyTexts && _longest <= 12;

    public void See(ReadOnlySpan<char> cell)
    {
        if (cell.Length == 0)
            return;
        switch (WrittenValue.Read(cell, NumberSigns.Point, out _, out var note))
        {
            case CellKind.Value:
                _numbers++;
                return;
            case CellKind.Missing:
                _marks[note] = _marks.GetValueOrDefault(note) + 1;
                Word(cell);
                _words--;
                return;
        }

        if (cell.Contains(',') && WrittenValue.TryNumber(cell.ToString().Replace(",", "", StringComparison.Ordinal).Replace(".", "", StringComparison.Ordinal), NumberSigns.Point, out _))
        {
            Comma(cell.ToString());
            _numbers++;
            return;
        }

        Word(cell);
    }

    private void Word(ReadOnlySpan<char> cell)
    {
        _words++;
        _longest = Math.Max(_longest, cell.Length);
        foreach (var known in _texts)
        {
            if (cell.SequenceEqual(known))
                return;
        }

        if (_texts.Count < MostTexts)
            _texts.Add(cell.ToString());
        else
            _manyTexts = true;
    }

    private void Comma(string text)
    {
        HasPointAndComma |= text.Contains('.', StringComparison.Ordinal);
        switch (WrittenValue.Detect([text], out _))
        {
            case NumberSigns.Comma:
                DecimalComma ??= text;
                break;
            case NumberSigns.PointAndThousands:
                ThousandsComma ??= text;
                break;
            default:
                OpenComma ??= text;
                break;
        }
    }
}

/// <summary>What stands in the columns of all rows.</summary>
internal sealed class ColumnSurvey
{
    private readonly List<(int First, int Second, int Year)> _open = [];

    private ColumnSurvey(int columns) => Columns = [.. Enumerable.Range(0, columns).Select(_ => new ColumnFacts())];

    public IReadOnlyList<ColumnFacts> Columns { get; }

    /// <summary>A date that does not show its order.</summary>
    public string? OpenDate { get; private set; }

    public (int Row, string Text)? DayFirst { get; private set; }

    public (int Row, string Text)? MonthFirst { get; private set; }

    public bool TwoDigitYears { get; private set; }

    public static ColumnSurvey Of(FlowFileSource source, ReadingRecipe recipe, RecipeLayout layout, int twoDigitYearsFrom, CancellationToken cancellation)
    {
        var survey = new ColumnSurvey(layout.Cells.Length);
        var table = new RecipeTable(recipe);
        using var text = RecipeReader.Open(source, recipe);
        while (text.Read())
        {
            cancellation.ThrowIfCancellationRequested();
            if (!table.IsData(text))
                continue;
            for (var i = 0; i < survey.Columns.Count && i < text.Count; i++)
            {
                if (i == layout.DateColumn)
                    survey.Date(text.Row, text.Cell(i), twoDigitYearsFrom);
                else
                    survey.Columns[i].See(text.Cell(i));
            }
        }

        return survey;
    }

    /// <summary>What the steps between rows suggest where no number above 12 decides; a hint, no decision.</summary>
    public string StepHint()
    {
        if (_open.Count < 3)
            return "";
        var dayFirst = Steps(o => (o.Year, o.Second, o.First));
        var monthFirst = Steps(o => (o.Year, o.First, o.Second));
        return dayFirst == monthFirst ? ""
            : string.Create(CultureInfo.InvariantCulture, $" With the day first {dayFirst} of {_open.Count - 1} steps are a day or less; with the month first {monthFirst}.");
    }

    private int Steps(Func<(int First, int Second, int Year), (int Year, int Month, int Day)> order)
    {
        var count = 0;
        for (var i = 1; i < _open.Count; i++)
        {
            var (y0, m0, d0) = order(_open[i - 1]);
            var (y1, m1, d1) = order(_open[i]);
            if (new DateOnly(y1, m1, d1).DayNumber - new DateOnly(y0, m0, d0).DayNumber is >= 0 and <= 1)
                count++;
        }

        return count;
    }

    private void Date(int row, ReadOnlySpan<char> cell, int twoDigitYearsFrom)
    {
        if (!WrittenDate.TryRead(cell, out var date, out _))
        {
            if (!WrittenDate.TryRead(cell, out date, out _, twoDigitYearsFrom))
                return;
            TwoDigitYears = true;
        }

        if (date.OrderKnown)
            return;
        OpenDate ??= cell.ToString();
        if (date.First > 12)
            DayFirst ??= (row, cell.ToString());
        else if (date.Second > 12)
            MonthFirst ??= (row, cell.ToString());
        else if (_open.Count < 500)
            _open.Add((date.First, date.Second, date.Year));
    }
}
