using HeadToWatts.Basis.Problems;
using HeadToWatts.Files.FlowFiles.Reading;

namespace HeadToWatts.Files.FlowFiles.DailyCsv;

/// <summary>
/// A table of dates and daily mean flows, delimited by commas, semicolons or tabs: "date,flow_cfs". Dates are yyyy-mm-dd, or
/// m/d/yyyy or d/m/yyyy when the file shows which or it is told. Blanks and marks such as -999, NA, Ice are missing; zeros are data.
/// </summary>
public sealed class DailyCsvFormat : IFlowFileFormat
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
        var column = FlowColumn.Choose(layout, dateColumn, options.Column, problems, out var evidence);
        var unit = column is { } c ? FlowColumn.Unit(layout, c, options.Unit, problems) : null;
        if (column is not { } flowColumn || unit is null)
            return problems.Refuse();

        var rows = new DailyRows(problems);
        if (evidence.Length > 0)
            rows.Assume(evidence);
        var signs = NumberSigns.Point;
        if (layout.Delimiter != ',' || HasQuotes(source))
        {
            signs = WrittenValue.Detect(Rows(source, layout, cancellation).Select(r => flowColumn < r.Cells.Length ? r.Cells[flowColumn] : ""), out var sign);
            if (sign.Length > 0)
                rows.Assume(sign);
        }

        foreach (var (row, cells) in Rows(source, layout, cancellation))
        {
            if (dateColumn >= cells.Length)
                problems.Row(row, string.Join(layout.Delimiter, cells), "the row has too few cells", WrittenDate.Accepted + ", and a flow");
            else if (layout.Delimiter == ',' && cells.Length > Math.Max(layout.ColumnCount, flowColumn + 1) && cells.Skip(layout.ColumnCount).Any(x => x.Length > 0))
                problems.Row(row, string.Join(',', cells), "the row has more cells than the table has columns; a comma may stand inside a number", "a decimal point, and no comma inside a number");
            else
                rows.Add(row, cells[dateColumn], flowColumn < cells.Length ? cells[flowColumn] : "", signs);
        }

        return rows.Build(this, options, null, unit, layout.ColumnName(flowColumn), "");
    }

    private static bool HasQuotes(FlowFileSource source) => FlowFileHead.Of(source).Lines.Any(l => l.Contains('"', StringComparison.Ordinal));

    private static IEnumerable<(int Row, string[] Cells)> Rows(FlowFileSource source, TableLayout layout, CancellationToken cancellation)
    {
        using var text = new DelimitedText(source.OpenText(), layout.Delimiter, quotes: true);
        while (text.Next(out var cells, out var row))
        {
            cancellation.ThrowIfCancellationRequested();
            if (row >= layout.FirstRow)
                yield return (row, cells);
        }
    }
}
