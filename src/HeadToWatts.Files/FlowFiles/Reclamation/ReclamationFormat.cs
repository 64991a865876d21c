using System.Text.RegularExpressions;
using HeadToWatts.Basis.Problems;
using HeadToWatts.Basis.Units;
using HeadToWatts.Files.FlowFiles.Reading;
using HeadToWatts.FlowRecords.Quality;

namespace HeadToWatts.Files.FlowFiles.Reclamation;

/// <summary>
/// Daily exports of the US Bureau of Reclamation: "DateTime,mili_qd,..." with m/d/yyyy, one or more columns of a station and a
/// two-letter code, commas or tabs; -999 and blanks are missing. Codes that begin with q are flows, in cfs.
/// </summary>
public sealed partial class ReclamationFormat : IFlowFileFormat
{
    /// <inheritdoc/>
    public string Id => "reclamation-daily";

    /// <inheritdoc/>
    public string Name => "US Bureau of Reclamation daily flows";

    /// <inheritdoc/>
    public bool Recognises(FlowFileHead head)
    {
        ArgumentNullException.ThrowIfNull(head);
        var first = head.Content().Select(l => l.Text).FirstOrDefault() ?? "";
        return IsHeader(DelimitedText.Split(first, Delimiter(first)));
    }

    /// <inheritdoc/>
    public Checked<FlowFile> Read(FlowFileSource source, FlowFileOptions options, CancellationToken cancellation)
    {
        ArgumentNullException.ThrowIfNull(source);
        ArgumentNullException.ThrowIfNull(options);
        var problems = new ProblemList(source.Name);
        var rows = new RecordRows(source, options, problems);
        var delimiter = Delimiter(FlowFileHead.Of(source).Content().Select(l => l.Text).FirstOrDefault() ?? "");
        using var text = new DelimitedText(source, delimiter, quotes: true);
        if (!text.Next(out var names, out var headerRow) || !IsHeader(names))
        {
            problems.Row(Math.Max(1, headerRow), string.Join(delimiter, names), "the header is not one of this format", "DateTime and columns such as mili_qd");
            return problems.Refuse();
        }

        if (Column(names, options.Column, problems) is not { } column)
            return problems.Refuse();
        if (FlowColumn.Agreed(null, options.Unit ?? UnitTable.CubicFootPerSecond, names[column], problems) is not { } unit)
            return problems.Refuse();
        if (options.Unit is null)
            rows.Assume("the flows are cfs, as is usual for these codes; the file names no unit");

        while (text.Read())
        {
            cancellation.ThrowIfCancellationRequested();
            if (text.HoldsMoreThan(names.Length))
            {
                rows.Wrong(text.Row, text.RowText(), "the row has more cells than the header", "one cell for each column");
                continue;
            }

            if (text.Count < names.Length)
                rows.Findings.Add(QualityKind.ShortRow, text.Row, text.RowText(), "read as far as they go; what is not there is missing");
            rows.Add(text.Row, text.Cell(0), text.Cell(column));
            rows.LastRowIsProven = column < names.Length - 1 && text.Count == names.Length;
        }

        return rows.Build(new RecordAbout(Id, Name, DateOrder.MonthFirst, unit, names[column], "Reclamation " + names[column]));
    }

    private static int? Column(string[] names, string? wanted, ProblemList problems)
    {
        if (wanted is not null)
        {
            if (FlowColumn.Named(names, wanted, problems) is not { } named)
                return null;
            if (named > 0 && FlowCode().IsMatch(names[named]))
                return named;
            problems.File(names[named], "this column is not a flow", string.Join(", ", names.Where(n => FlowCode().IsMatch(n))));
            return null;
        }

        var flows = Enumerable.Range(1, names.Length - 1).Where(i => FlowCode().IsMatch(names[i])).ToList();
        if (flows.Count == 1)
            return flows[0];
        problems.File(string.Join(", ", flows.Select(i => names[i])), "several columns are flows", "name the column to be read");
        return null;
    }

    private static char Delimiter(string line) => line.Contains('\t', StringComparison.Ordinal) ? '\t' : ',';

    private static bool IsHeader(string[] cells) => cells.Length >= 2
        && (cells[0].Equals("DateTime", StringComparison.OrdinalIgnoreCase) || cells[0].Equals("Date", StringComparison.OrdinalIgnoreCase))
        && cells.Skip(1).All(c => StationCode().IsMatch(c))
        && cells.Skip(1).Any(c => FlowCode().IsMatch(c));

    [GeneratedRegex(@"^[a-z0-9]{2,12}[_ ][a-z]{2}[a-z0-9]?$", RegexOptions.IgnoreCase)]
    private static partial Regex StationCode();

    [GeneratedRegex(@"^[a-z0-9]{2,12}[_ ]q[a-z][a-z0-9]?$", RegexOptions.IgnoreCase)]
    private static partial Regex FlowCode();
}
