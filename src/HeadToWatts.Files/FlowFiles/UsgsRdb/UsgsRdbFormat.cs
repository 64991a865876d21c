using System.Text.RegularExpressions;
using HeadToWatts.Basis.Problems;
using HeadToWatts.Basis.Units;
using HeadToWatts.Files.FlowFiles.Reading;

namespace HeadToWatts.Files.FlowFiles.UsgsRdb;

/// <summary>
/// The tab-separated RDB files of the US Geological Survey, daily mean discharge (parameter 00060, statistic 00003, ft3/s).
/// Lines of "#" come first, then a header, a row of widths ("5s 15s 20d 14n 10s"), then the days; a file may hold several such blocks.
/// </summary>
public sealed partial class UsgsRdbFormat : IFlowFileFormat
{
    private const string DailyMeanFlow = "_00060_00003";

    /// <inheritdoc/>
    public string Id => "usgs-rdb";

    /// <inheritdoc/>
    public string Name => "US Geological Survey daily flows (RDB)";

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
        var rows = new DailyRows(problems);
        var header = (Site: -1, Date: -1, Value: -1, Code: -1);
        var column = "";
        string? site = null;
        var otherSites = new List<string>();
        var wantedSite = options.Column is { } wanted && SiteNumber().IsMatch(wanted) ? wanted : null;

        using var text = new DelimitedText(source.OpenText(), '\t', quotes: false);
        while (text.Next(out var cells, out var row))
        {
            cancellation.ThrowIfCancellationRequested();
            if (cells[0] == "agency_cd")
            {
                if (Header(cells, wantedSite is null ? options.Column : null, row, problems) is not { } found)
                    return problems.Refuse();
                header = found;
                column = cells[header.Value];
                continue;
            }

            if (header.Value < 0 || Array.TrueForAll(cells, c => c.Length == 0 || WidthCell().IsMatch(c)))
                continue;
            if (cells.Length <= header.Date || cells.Length <= header.Site)
            {
                problems.Row(row, string.Join(' ', cells), "the row has too few cells", "agency, site, date, flow, code");
                continue;
            }

            var here = cells[header.Site];
            if (wantedSite is not null && here != wantedSite)
                continue;
            site ??= here;
            if (here != site)
            {
                if (!otherSites.Contains(here) && otherSites.Count < 20)
                    otherSites.Add(here);
                continue;
            }

            var value = header.Value < cells.Length ? cells[header.Value] : "";
            rows.Add(row, cells[header.Date], value.Equals("ZFl", StringComparison.OrdinalIgnoreCase) ? "Dry" : value);
            if (header.Code >= 0 && header.Code < cells.Length && cells[header.Code].Length > 0)
                rows.Codes.Add(cells[header.Code]);
        }

        if (otherSites.Count > 0)
        {
            problems.File(string.Join(", ", otherSites.Prepend(site!)), "the file holds several sites", "name the site to be read");
            return problems.Refuse();
        }

        if (FlowColumn.Agreed(UnitTable.CubicFootPerSecond, options.Unit, column, problems) is not { } unit)
            return problems.Refuse();
        rows.Assume("the flows are cubic feet per second, as parameter 00060 is defined");
        return rows.Build(this, options, DateOrder.MonthFirst, unit, column, Description(source, site));
    }

    private static (int Site, int Date, int Value, int Code)? Header(string[] cells, string? wanted, int row, ProblemList problems)
    {
        var site = Array.IndexOf(cells, "site_no");
        var date = Array.IndexOf(cells, "datetime");
        var flows = Enumerable.Range(0, cells.Length).Where(i => cells[i].EndsWith(DailyMeanFlow, StringComparison.Ordinal)).ToList();
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
            var why = flows.Count > 1 ? "several columns are daily mean flow"
                : Array.Exists(cells, c => c.EndsWith("_00060", StringComparison.Ordinal)) ? "these are instantaneous flows; daily mean flows are read"
                : Array.Exists(cells, c => c.Contains("_00065", StringComparison.Ordinal)) ? "this is stage; a flow is needed"
                : "no column is daily mean flow";
            problems.Row(row, string.Join(' ', cells.Where(c => FlowCode().IsMatch(c)).DefaultIfEmpty(cells[^1])), why, flows.Count > 1 ? "name the column to be read" : "a column that ends in " + DailyMeanFlow);
            return null;
        }

        return (site, date, value, Array.IndexOf(cells, cells[value] + "_cd"));
    }

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
