using System.Text.RegularExpressions;
using HeadToWatts.Basis.Problems;
using HeadToWatts.Files.FlowFiles.Reading;
using HeadToWatts.FlowRecords.Quality;

namespace HeadToWatts.Files.FlowFiles.DailyCsv;

/// <summary>
/// A table of dates and flows, delimited by commas, semicolons or tabs: "date,flow_cfs". Dates are yyyy-mm-dd, or m/d/yyyy or
/// d/m/yyyy when the file shows which or it is told; a time of day may stand with the date or in a column of its own, and several
/// values a day become daily means. Blanks and marks such as -999, NA, Ice are missing; zeros are data.
/// </summary>
public sealed partial class DailyCsvFormat : IFlowFileFormat
{
    /// <inheritdoc/>
    public string Id => "daily-csv";

    /// <inheritdoc/>
    public string Name => "daily flows: date, flow";

    /// <inheritdoc/>
    public bool Recognises(FlowFileHead head) => TableLayout.FindDaily(head) is not null;

    /// <inheritdoc/>
    public Checked<FlowFile> Read(FlowFileSource source, FlowFileOptions options, CancellationToken cancellation)
    {
        ArgumentNullException.ThrowIfNull(source);
        ArgumentNullException.ThrowIfNull(options);
        var problems = new ProblemList(source.Name);
        if (TableLayout.FindDaily(FlowFileHead.Of(source)) is not { } layout)
        {
            problems.File("no dates", "no row of the opening lines has a date", WrittenDate.Accepted + ", and a flow");
            return problems.Refuse();
        }

        var dateColumn = TableLayout.DateColumn(layout.FirstCells);
        var timeColumn = TableLayout.TimeColumn(layout.FirstCells, dateColumn);
        var column = FlowColumn.Choose(layout, [dateColumn, timeColumn], options.Column, options.Stage is not null, problems, out var evidence);
        var unit = column is not { } c ? null
            : options.Stage is null ? FlowColumn.Unit(layout, c, options.Unit, problems)
            : FlowColumn.LevelUnit(layout.NameForUnit(c), options.Unit, problems);
        if (column is not { } flowColumn || unit is null)
            return problems.Refuse();

        var codeColumn = CodeColumn(layout, flowColumn);
        var rows = new RecordRows(source, options, problems);
        if (evidence.Length > 0)
            rows.Assume(evidence);
        if (timeColumn >= 0)
            rows.Assume($"the times of day stand in '{layout.ColumnName(timeColumn)}'");
        var signs = Signs(source, layout, flowColumn, rows, cancellation);

        // One more cell than columns may be a comma inside a number, or a row that lost its end and the next one's beginning.
        var most = Math.Max(layout.ColumnCount, flowColumn + 1);
        using var text = new DelimitedText(source, layout.Delimiter, quotes: true);
        while (text.Read())
        {
            cancellation.ThrowIfCancellationRequested();
            if (text.Row < layout.FirstRow)
                continue;
            if (dateColumn >= text.Count)
            {
                rows.Wrong(text.Row, text.RowText(), "the row has too few cells", WrittenDate.Accepted + ", and a flow");
                continue;
            }

            if (text.Count > most && text.HoldsMoreThan(most))
            {
                rows.Wrong(text.Row, text.RowText(), layout.Delimiter == ',' ? "the row has more cells than the table has columns; a comma may stand inside a number" : "the row has more cells than the table has columns",
                    layout.Delimiter == ',' ? "a decimal point, and no comma inside a number" : "a cell for each column");
                continue;
            }

            var date = text.Cell(dateColumn);
            if (text.Count < layout.ColumnCount && !RecordRows.IsTotal(date))
                rows.Findings.Add(QualityKind.ShortRow, text.Row, text.RowText(), "read as far as they go; what is not there is missing");
            var code = text.Cell(codeColumn);
            if (code.Length is > 0 and < 40)
                rows.Codes.Add(code);
            rows.Add(text.Row, date, text.Cell(flowColumn), signs, QualityCodes.Common(code), text.Cell(timeColumn));
            rows.LastRowIsProven = flowColumn < layout.ColumnCount - 1 && text.Count >= layout.ColumnCount;
        }

        return rows.Build(new RecordAbout(Id, Name, null, unit, layout.ColumnName(flowColumn), ""));
    }

    // Only a file that holds a comma can have one in a number, and where commas delimit it must stand in quotes.
    private static NumberSigns Signs(FlowFileSource source, TableLayout layout, int flowColumn, RecordRows rows, CancellationToken cancellation)
    {
        if (layout.Delimiter == ',' ? !FlowFileHead.Of(source).Lines.Any(l => l.Contains('"', StringComparison.Ordinal)) : !source.IsWide && !source.Holds((byte)','))
            return NumberSigns.Point;
        var signs = WrittenValue.Detect(Cells(source, layout, flowColumn, cancellation), out var sign);
        if (sign.Length > 0)
            rows.Assume(sign);
        return signs;
    }

    private static IEnumerable<string> Cells(FlowFileSource source, TableLayout layout, int column, CancellationToken cancellation)
    {
        using var text = new DelimitedText(source, layout.Delimiter, quotes: true);
        while (text.Read())
        {
            cancellation.ThrowIfCancellationRequested();
            if (text.Row >= layout.FirstRow && text.Cell(column).Contains(','))
                yield return text.Cell(column).ToString();
        }
    }

    private static int CodeColumn(TableLayout layout, int flowColumn)
    {
        for (var i = 0; i < layout.ColumnCount; i++)
        {
            if (i != flowColumn && CodeName().IsMatch(layout.ColumnName(i)))
                return i;
        }

        return -1;
    }

    [GeneratedRegex(@"^(flag|code|quality|qual|qualifier|grade|sym|symbol|status|qa|qc)s?\b|_(cd|flag|code)$", RegexOptions.IgnoreCase)]
    private static partial Regex CodeName();
}
