using System.Text.RegularExpressions;
using HeadToWatts.Basis.Problems;
using HeadToWatts.Basis.Units;
using HeadToWatts.Files.FlowFiles.Reading;

namespace HeadToWatts.Files.FlowFiles.UsgsRdb;

/// <summary>
/// The tab-separated RDB files of the US Geological Survey, discharge (parameter 00060, ft3/s) as daily means (statistic 00003) or
/// as instantaneous values with their time-zone code. Lines of "#" come first, then a header, a row of widths ("5s 15s 20d 14n
/// 10s"), then the values; a file may hold several such blocks.
/// </summary>
public sealed partial class UsgsRdbFormat : IFlowFileFormat
{
    private const string DailyMeanFlow = "_00060_00003";
    private const string InstantFlow = "_00060";

    /// <inheritdoc/>
    public string Id => "usgs-rdb";

    /// <inheritdoc/>
    public string Name => "US Geological Survey daily or instantaneous flows (RDB)";

    /// <inheritdoc/>
    public bool Recognises(FlowFileHead head)
    {
        ArgumentNullException.ThrowIfNull(head);
        return head.Lines.Any(l => l.StartsWith("agency_cd\t", StringComparison.Ordinal));
    }

    /// <inheritdoc/>
    public Checked<FlowFile> Read(FlowFileSource source, FlowFileOptions options, CancellationToken cancellation)
    {
        ArgumentNullException.ThrowIfNull(source);
        ArgumentNullException.ThrowIfNull(options);
        var problems = new ProblemList(source.Name);
        var rows = new RecordRows(source, options, problems);
        Header? header = null;
        string? site = null;
        var otherSites = new List<string>();
        var wantedSite = options.Column is { } wanted && SiteNumber().IsMatch(wanted) ? wanted : null;

        using var text = new DelimitedText(source, '\t', quotes: false);
        while (text.Read())
        {
            cancellation.ThrowIfCancellationRequested();
            if (text.Cell(0) is "agency_cd")
            {
                if (FindHeader(text.Cells(), wantedSite is null ? options.Column : null, text.Row, problems) is not { } found)
                    return problems.Refuse();
                header = found;
                continue;
            }

            if (header is null || IsWidths(text))
                continue;
            if (text.Count <= header.Date || text.Count <= header.Site)
            {
                rows.Wrong(text.Row, text.RowText(), "the row has too few cells", "agency, site, date, flow, code");
                continue;
            }

            var here = text.Cell(header.Site);
            if (wantedSite is not null && !here.SequenceEqual(wantedSite))
                continue;
            site ??= here.ToString();
            if (!here.SequenceEqual(site))
            {
                if (otherSites.Count < 20 && !otherSites.Contains(here.ToString()))
                    otherSites.Add(here.ToString());
                continue;
            }

            Take(text, header, rows);
        }

        if (otherSites.Count > 0)
        {
            problems.File(string.Join(", ", otherSites.Prepend(site!)), "the file holds several sites", "name the site to be read");
            return problems.Refuse();
        }

        var column = header?.Column ?? "";
        if (FlowColumn.Agreed(UnitTable.CubicFootPerSecond, options.Unit, column, problems) is not { } unit)
            return problems.Refuse();
        rows.Assume("the flows are cubic feet per second, as parameter 00060 is defined");
        return rows.Build(new RecordAbout(Id, Name, DateOrder.MonthFirst, unit, column, Description(source, site), header is { Zone: >= 0 }));
    }

    private static void Take(DelimitedText text, Header header, RecordRows rows)
    {
        var value = text.Cell(header.Value);
        var code = text.Cell(header.Code);

        // The code stands after the flow: a flow without its place for a code may have lost its last digits.
        if (header.Code >= 0 && text.Count <= header.Code)
        {
            if (WrittenValue.TryNumber(value, NumberSigns.Point, out _))
            {
                rows.Wrong(text.Row, text.RowText(), "the row ends before its code, so that the flow may be cut short", "agency, site, date, flow, code");
                return;
            }

            rows.Findings.Add(FlowRecords.Quality.QualityKind.ShortRow, text.Row, text.RowText(), "taken as missing");
        }

        var offset = WrittenDate.NoOffset;
        if (header.Zone >= 0 && !ZoneCodes.TryFind(text.Cell(header.Zone), out offset))
        {
            rows.Wrong(text.Row, text.Cell(header.Zone).ToString(), "this time-zone code is not known", ZoneCodes.Accepted);
            return;
        }

        if (code.Length > 0)
            rows.Codes.Add(code);
        rows.Add(text.Row, text.Cell(header.Date), value.Equals("ZFl", StringComparison.OrdinalIgnoreCase) ? WrittenValue.Dry : value, marks: QualityCodes.Usgs(code), offsetMin: offset);
        rows.LastRowIsProven = header.Code >= 0 && text.Count > header.Code;
    }

    private static bool IsWidths(DelimitedText text)
    {
        var any = false;
        for (var i = 0; i < text.Count; i++)
        {
            var cell = text.Cell(i);
            if (cell.Length == 0)
                continue;
            if (cell.Length > 5 || !WidthCell().IsMatch(cell))
                return false;
            any = true;
        }

        return any;
    }

    private static Header? FindHeader(string[] cells, string? wanted, int row, ProblemList problems)
    {
        var site = Array.IndexOf(cells, "site_no");
        var date = Array.IndexOf(cells, "datetime");
        var zone = Array.IndexOf(cells, "tz_cd");
        var daily = Ending(cells, DailyMeanFlow);
        var instant = Ending(cells, InstantFlow);
        var flows = daily.Count > 0 ? daily : zone >= 0 ? instant : [];
        var value = -1;
        if (wanted is not null)
        {
            if (FlowColumn.Named(cells, wanted, problems) is not { } named)
                return null;
            value = named;
        }
        else if (flows.Count == 1)
        {
            value = flows[0];
        }

        if (site < 0 || date < 0)
        {
            problems.Row(row, string.Join(' ', cells), "the header lacks site_no or datetime", "agency_cd, site_no, datetime, flow, code");
            return null;
        }

        if (value < 0)
        {
            var why = flows.Count > 1 ? daily.Count > 0 ? "several columns are daily mean flow" : "several columns are instantaneous flow"
                : instant.Count > 0 ? "these are instantaneous flows without their time-zone codes (tz_cd)"
                : Array.Exists(cells, c => c.Contains("_00065", StringComparison.Ordinal)) ? "this is stage; a rating is needed to make it a flow"
                : "no column is daily mean or instantaneous flow";
            problems.Row(row, string.Join(' ', cells.Where(c => FlowCode().IsMatch(c)).DefaultIfEmpty(cells[^1])), why, flows.Count > 1 ? "name the column to be read" : $"a column that ends in {DailyMeanFlow}, or in {InstantFlow} beside tz_cd");
            return null;
        }

        return new Header(site, date, value, Array.IndexOf(cells, cells[value] + "_cd"), zone, cells[value]);
    }

    private static List<int> Ending(string[] cells, string end) =>
        [.. Enumerable.Range(0, cells.Length).Where(i => cells[i].EndsWith(end, StringComparison.Ordinal))];

    private sealed record Header(int Site, int Date, int Value, int Code, int Zone, string Column);

    private static string Description(FlowFileSource source, string? site)
    {
        foreach (var line in FlowFileHead.Of(source).Lines)
        {
            var match = StationLine().Match(line);
            if (match.Success && (site is null || match.Groups[1].Value == site))
                return $"USGS {match.Groups[1].Value} {match.Groups[2].Value.Trim()}";
        }

        return site is null ? "" : "USGS " + site;
    }

    [GeneratedRegex(@"^\d+[sdn]$")]
    private static partial Regex WidthCell();

    [GeneratedRegex(@"^\d{8,15}$")]
    private static partial Regex SiteNumber();

    [GeneratedRegex(@"_\d{5}")]
    private static partial Regex FlowCode();

    [GeneratedRegex(@"^#\s+USGS\s+(\d{8,15})\s+(.+)$")]
    private static partial Regex StationLine();
}
