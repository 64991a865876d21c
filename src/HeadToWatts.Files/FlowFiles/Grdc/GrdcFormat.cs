using System.Globalization;
using System.Text.RegularExpressions;
using HeadToWatts.Basis.Problems;
using HeadToWatts.Basis.Units;
using HeadToWatts.Files.FlowFiles.Reading;
using HeadToWatts.FlowRecords.Quality;

namespace HeadToWatts.Files.FlowFiles.Grdc;

/// <summary>
/// Daily text files of the Global Runoff Data Centre: lines of "#" with the station, then "YYYY-MM-DD;hh:mm; Value", apart by
/// semicolons, m3/s, missing values -999.000. Older files give an original and a calculated value and a flag.
/// </summary>
public sealed partial class GrdcFormat : IFlowFileFormat
{
    /// <inheritdoc/>
    public string Id => "grdc-daily";

    /// <inheritdoc/>
    public string Name => "Global Runoff Data Centre daily flows";

    /// <inheritdoc/>
    public bool Recognises(FlowFileHead head)
    {
        ArgumentNullException.ThrowIfNull(head);
        return head.Lines.Any(l => l.StartsWith("# GRDC-No", StringComparison.OrdinalIgnoreCase))
            || head.Lines.Any(l => l.StartsWith("YYYY-MM-DD;hh:mm", StringComparison.OrdinalIgnoreCase));
    }

    /// <inheritdoc/>
    public Checked<FlowFile> Read(FlowFileSource source, FlowFileOptions options, CancellationToken cancellation)
    {
        ArgumentNullException.ThrowIfNull(source);
        ArgumentNullException.ThrowIfNull(options);
        var problems = new ProblemList(source.Name);
        var keys = Keys(FlowFileHead.Of(source));
        var rows = new RecordRows(source, options, problems);
        string[]? header = null;
        var column = -1;
        var data = 0;
        using var text = new DelimitedText(source, ';', quotes: false);
        while (text.Read())
        {
            cancellation.ThrowIfCancellationRequested();
            if (text.Cell(0).StartsWith("YYYY", StringComparison.OrdinalIgnoreCase))
            {
                header = text.Cells();
                column = Column(header, options.Column, problems);
                if (column < 0)
                    return problems.Refuse();
                continue;
            }

            if (header is null)
                continue;
            data++;
            if (text.Cell(0).EndsWith("-00"))
            {
                problems.Row(text.Row, text.RowText(), "these are monthly means; a day of the month is missing", "the daily file of the station");
                return problems.Refuse();
            }

            if (text.Count < header.Length)
            {
                rows.Wrong(text.Row, text.RowText(), "the row has too few cells", string.Join(';', header));
                continue;
            }

            var time = text.Cell(1);
            rows.Add(text.Row, text.Cell(0), text.Cell(column), timeText: time is "--:--" ? default : time);
            rows.LastRowIsProven = column < header.Length - 1;
        }

        if (header is null)
        {
            problems.File("no header", "the header of the rows is not there", "YYYY-MM-DD;hh:mm; Value");
            return problems.Refuse();
        }

        if (FlowColumn.Agreed(UnitTable.CubicMetrePerSecond, options.Unit, header[column], problems) is not { } unit)
            return problems.Refuse();
        rows.Assume("the flows are cubic metres per second, as this format is defined");
        if (keys.GetValueOrDefault("Data lines") is { } lines && int.TryParse(lines, NumberStyles.None, CultureInfo.InvariantCulture, out var told) && told != data)
            rows.Findings.Add(QualityKind.OtherExtent, 0, $"the file says it has {told.ToString("N0", CultureInfo.InvariantCulture)} rows; it has {data.ToString("N0", CultureInfo.InvariantCulture)}", "read as far as the rows go; the file may be cut");
        var name = $"GRDC {keys.GetValueOrDefault("GRDC-No.")} {keys.GetValueOrDefault("River")} at {keys.GetValueOrDefault("Station")}";
        return rows.Build(new RecordAbout(Id, Name, null, unit, header[column], keys.ContainsKey("River") ? name : ""));
    }

    private static int Column(string[] header, string? wanted, ProblemList problems)
    {
        if (wanted is not null)
            return FlowColumn.Named(header, wanted, problems) ?? -1;
        var column = Array.FindIndex(header, 2 <= header.Length ? 2 : 0, c => c.Equals("Value", StringComparison.OrdinalIgnoreCase) || c.Equals("Original", StringComparison.OrdinalIgnoreCase));
        if (column < 0)
            problems.File(string.Join(';', header), "no column is named Value or Original", "YYYY-MM-DD;hh:mm; Value");
        return column;
    }

    private static Dictionary<string, string> Keys(FlowFileHead head)
    {
        var keys = new Dictionary<string, string>(StringComparer.OrdinalIgnoreCase);
        foreach (var line in head.Lines)
        {
            if (KeyLine().Match(line) is { Success: true } match)
                keys.TryAdd(match.Groups[1].Value.Trim(), match.Groups[2].Value.Trim());
        }

        return keys;
    }

    [GeneratedRegex(@"^#\s*([^:#]{2,40}):\s+(.+)$")]
    private static partial Regex KeyLine();
}
