using System.Globalization;
using System.Text.RegularExpressions;
using HeadToWatts.Basis.Problems;
using HeadToWatts.Basis.Units;
using HeadToWatts.Files.FlowFiles.Reading;
using HeadToWatts.FlowRecords;

namespace HeadToWatts.Files.FlowFiles.CurveCsv;

/// <summary>
/// A flow-duration series: rows of percent of time exceeded and flow, delimited by commas, semicolons, tabs or blanks, as in a
/// CSV file or a paste from a spreadsheet. The unit stands in the header ("flow_cfs"), beside every flow ("12 cfs"), or is told.
/// </summary>
public sealed partial class CurveCsvFormat : IFlowFileFormat
{
    private const int MostRows = 10_000;

    /// <inheritdoc/>
    public string Id => "curve-csv";

    /// <inheritdoc/>
    public string Name => "flow-duration series: percent of time exceeded, flow";

    /// <inheritdoc/>
    public bool Recognises(FlowFileHead head)
    {
        ArgumentNullException.ThrowIfNull(head);
        if (TableLayout.FindDaily(head) is not null || TableLayout.FindNumbers(head) is not { } layout)
            return false;
        // Without a header only bare numbers are taken for a curve: a rating table has lines of text above it.
        return layout.Names.Length > 0
            ? Array.Exists(layout.Names, n => ShareName().IsMatch(n))
            : head.Content().First().Row == layout.FirstRow && layout.FirstCells.Length == 2;
    }

    /// <inheritdoc/>
    public Checked<FlowFile> Read(FlowFileSource source, FlowFileOptions options, CancellationToken cancellation)
    {
        ArgumentNullException.ThrowIfNull(source);
        ArgumentNullException.ThrowIfNull(options);
        var problems = new ProblemList(source.Name);
        var assumptions = new List<string>();
        if (TableLayout.FindNumbers(FlowFileHead.Of(source)) is not { } layout)
        {
            problems.File("no numbers", "no row of the opening lines has two numbers", "percent of time exceeded, flow");
            return problems.Refuse();
        }

        var shareColumn = Array.FindIndex(layout.Names, n => ShareName().IsMatch(n));
        if (shareColumn < 0)
        {
            shareColumn = 0;
            assumptions.Add("the first column is the percent of time exceeded, since no column is named so");
        }

        if (FlowColumn.Choose(layout, [shareColumn], options.Column, false, problems, out var evidence) is not { } flowColumn)
            return problems.Refuse();
        if (evidence.Length > 0)
            assumptions.Add(evidence);

        var rows = Rows(source, layout, shareColumn, flowColumn, problems, cancellation);
        var signs = WrittenValue.Detect(rows.Select(r => NumberPart().Match(r.Flow).Value).Concat(rows.Select(r => r.Share.TrimEnd('%', ' '))), out var sign);
        if (sign.Length > 0)
            assumptions.Add(sign);

        var unit = UnitOf(layout, flowColumn, rows, options.Unit, problems);
        var points = new List<CurvePoint>();
        var origins = new List<CurveRowOrigin>();
        var percent = ShareUnit(layout, shareColumn, rows, signs, problems, assumptions);
        foreach (var row in rows)
        {
            var goodShare = WrittenValue.Read(row.Share.TrimEnd('%', ' '), signs, out var share, out _) == CellKind.Value;
            var goodFlow = WrittenValue.Read(NumberPart().Match(row.Flow).Value, signs, out var flow, out _) == CellKind.Value;
            if (!goodShare)
                problems.Row(row.FileRow, row.Share, row.Share.Length == 0 ? "the percent is missing" : "the percent of time exceeded is not a number", "0 to 100");
            if (!goodFlow)
                problems.Row(row.FileRow, row.Flow, row.Flow.Length == 0 ? "the flow is missing" : "the flow is not a number", "a flow of zero or more");
            if (goodShare && goodFlow)
            {
                // Dividing keeps 95 at the double nearest to 0.95.
                points.Add(new CurvePoint(percent ? share / 100 : share, unit?.ToHeld(flow) ?? flow));
                origins.Add(new CurveRowOrigin($"{source.Name} row {row.FileRow.ToString(CultureInfo.InvariantCulture)}", $"{row.Share}, {row.Flow}"));
            }
        }

        if (source.EndsInsideRow && rows.Count > 0)
            assumptions.Add($"row {rows[^1].FileRow.ToString(CultureInfo.InvariantCulture)}, with which the file ends, is whole, though no line end stands after it: {rows[^1].Share}, {rows[^1].Flow}");
        if (points.Count > 0 || !problems.Any)
        {
            var built = FlowDurationCurve.FromRows(points, options.Beyond, source.Name, origins);
            foreach (var problem in built.Problems)
                problems.Add(problem);
            if (built.TryGet(out var curve) && !problems.Any && unit is not null)
                return Checked.Of(new FlowFile(Id, curve, null, Report(layout.ColumnName(flowColumn), unit, points, curve, assumptions)));
        }

        return problems.Refuse();
    }

    private FlowFileReport Report(string column, UnitOfMeasure unit, List<CurvePoint> points, FlowDurationCurve curve, List<string> assumptions)
    {
        var lowest = points.Min(p => p.Exceedance);
        var highest = points.Max(p => p.Exceedance);
        if (lowest > 0)
            assumptions.Add($"below {Percent(lowest)} of the time the first flow holds");
        if (highest < 1)
            assumptions.Add(curve.EndRule == BeyondLastRow.Dry ? $"beyond {Percent(highest)} of the time there is no flow" : $"beyond {Percent(highest)} of the time the last flow holds");
        return new FlowFileReport
        {
            FormatName = Name,
            Column = column,
            Unit = unit,
            Rows = points.Count,
            Valid = points.Count,
            Zeros = points.Count(p => p.FlowM3PerS == 0),
            Assumptions = assumptions,
        };

        static string Percent(double ratio) => (ratio * 100).ToString("0.###", CultureInfo.InvariantCulture) + " %";
    }

    private static List<CurveRow> Rows(FlowFileSource source, TableLayout layout, int shareColumn, int flowColumn, ProblemList problems, CancellationToken cancellation)
    {
        var rows = new List<CurveRow>();
        using var text = new DelimitedText(source, layout.Delimiter, quotes: true);
        while (text.Next(out var cells, out var row))
        {
            cancellation.ThrowIfCancellationRequested();
            if (row < layout.FirstRow)
                continue;
            if (rows.Count == MostRows)
            {
                problems.File($"more than {MostRows.ToString("N0", CultureInfo.InvariantCulture)} rows", "this is too much to be a flow-duration series", "a row for each percent, or a daily record with dates");
                break;
            }

            if (cells.Length > layout.ColumnCount && cells.Skip(layout.ColumnCount).Any(x => x.Length > 0))
                problems.Row(row, string.Join(layout.Delimiter, cells), "the row has more cells than the table has columns; a comma may stand inside a number", "a decimal point, and no comma inside a number");
            else
                rows.Add(new CurveRow(row, shareColumn < cells.Length ? cells[shareColumn] : "", flowColumn < cells.Length ? cells[flowColumn] : ""));
        }

        return rows;
    }

    // One unit for all rows: from the header, or beside each flow, or told.
    private static UnitOfMeasure? UnitOf(TableLayout layout, int flowColumn, List<CurveRow> rows, UnitOfMeasure? told, ProblemList problems)
    {
        UnitOfMeasure? beside = null;
        var first = 0;
        var withUnit = 0;
        foreach (var row in rows)
        {
            var text = row.Flow[NumberPart().Match(row.Flow).Length..].Trim();
            if (text.Length == 0 || !TableLayout.BeginsWithNumber(row.Flow))
                continue;
            withUnit++;
            var unit = HeaderUnit.FindFlow(text);
            if (unit is null)
                problems.Row(row.FileRow, row.Flow, $"the unit '{text}' is not known", QuantityText.Accepted(Dimension.Flow));
            else if (beside is null)
                (beside, first) = (unit, row.FileRow);
            else if (beside.Symbol != unit.Symbol)
                problems.Row(row.FileRow, row.Flow, $"units are mixed: row {first.ToString(CultureInfo.InvariantCulture)} is in {beside.Symbol}", "one unit for all flows");
        }

        if (beside is null)
            return FlowColumn.Unit(layout, flowColumn, told, problems);
        var header = HeaderUnit.Find(layout.NameForUnit(flowColumn), out _);
        if (header is null && told is null && withUnit < rows.Count)
            problems.File($"{withUnit.ToString(CultureInfo.InvariantCulture)} of {rows.Count.ToString(CultureInfo.InvariantCulture)} rows", "only some flows have a unit beside them", "one unit for all flows");
        if (header is not null && header.Symbol != beside.Symbol)
            problems.File(layout.ColumnName(flowColumn), $"units are mixed: the header says {header.Symbol} and the rows {beside.Symbol}", "one unit for all flows");
        return FlowColumn.Agreed(beside, told, layout.ColumnName(flowColumn), problems);
    }

    // True for percent, false for ratios. A series that never goes above 1 is one or the other, and its header must say which.
    private static bool ShareUnit(TableLayout layout, int shareColumn, List<CurveRow> rows, NumberSigns signs, ProblemList problems, List<string> assumptions)
    {
        var largest = 0.0;
        foreach (var row in rows)
        {
            if (row.Share.Contains('%', StringComparison.Ordinal))
                return true;
            if (WrittenValue.Read(row.Share, signs, out var share, out _) == CellKind.Value)
                largest = Math.Max(largest, share);
        }

        if (largest > 1 || largest == 0)
            return true;
        var name = layout.NameForUnit(shareColumn);
        if (!PercentName().IsMatch(name) && RatioName().IsMatch(name))
        {
            assumptions.Add($"'{name}' is a ratio from 0 to 1, since no value is above 1");
            return false;
        }

        problems.File(name, "every share of the time is 1 or less, so they may be ratios or small percents", "percents from 0 to 100, or a header that says exceedance probability");
        return true;
    }

    private readonly record struct CurveRow(int FileRow, string Share, string Flow);

    [GeneratedRegex(@"exceed|percent|pct|%|probab", RegexOptions.IgnoreCase)]
    private static partial Regex ShareName();

    [GeneratedRegex(@"percent|pct|%", RegexOptions.IgnoreCase)]
    private static partial Regex PercentName();

    [GeneratedRegex(@"exceedance|probab|ratio|fraction|share", RegexOptions.IgnoreCase)]
    private static partial Regex RatioName();

    [GeneratedRegex(@"^[-+]?[\d.,]+(?:[eE][-+]?\d+)?")]
    private static partial Regex NumberPart();
}
