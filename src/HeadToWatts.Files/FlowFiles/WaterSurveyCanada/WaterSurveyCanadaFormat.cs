using HeadToWatts.Basis.Problems;
using HeadToWatts.Basis.Units;
using HeadToWatts.Files.FlowFiles.Reading;

namespace HeadToWatts.Files.FlowFiles.WaterSurveyCanada;

/// <summary>
/// Daily exports of the Water Survey of Canada: a title line, then "ID,PARAM,Date,Value,SYM" with flow (PARAM 1, m3/s) and level
/// (PARAM 2, m) stacked. Only the flow is read.
/// </summary>
public sealed class WaterSurveyCanadaFormat : IFlowFileFormat
{
    /// <inheritdoc/>
    public string Id => "wsc-daily";

    /// <inheritdoc/>
    public string Name => "Water Survey of Canada daily flows";

    /// <inheritdoc/>
    public bool Recognises(FlowFileHead head)
    {
        ArgumentNullException.ThrowIfNull(head);
        return head.Content().Take(5).Any(l => IsHeader(DelimitedText.Split(l.Text, ',')));
    }

    /// <inheritdoc/>
    public Checked<FlowFile> Read(FlowFileSource source, FlowFileOptions options, CancellationToken cancellation)
    {
        ArgumentNullException.ThrowIfNull(source);
        ArgumentNullException.ThrowIfNull(options);
        var problems = new ProblemList(source.Name);
        var rows = new DailyRows(problems);
        var stations = new List<string>();
        var begun = false;
        var others = 0;
        using var text = new DelimitedText(source.OpenText(), ',', quotes: true);
        while (text.Next(out var cells, out var row))
        {
            cancellation.ThrowIfCancellationRequested();
            if (IsHeader(cells))
            {
                begun = true;
                continue;
            }

            if (!begun)
                continue;
            if (cells.Length < 4)
            {
                problems.Row(row, string.Join(',', cells), "the row has too few cells", "ID,PARAM,Date,Value,SYM");
                continue;
            }

            if (options.Column is { } wanted && !string.Equals(cells[0], wanted, StringComparison.OrdinalIgnoreCase))
                continue;
            if (cells[1] != "1")
            {
                if (cells[1] == "2")
                    others++;
                else
                    problems.Row(row, cells[1], "this is neither flow (1) nor level (2)", "PARAM 1");
                continue;
            }

            if (!stations.Contains(cells[0]) && stations.Count < 20)
                stations.Add(cells[0]);
            if (stations.Count > 1)
                continue;
            rows.Add(row, cells[2], cells[3]);
            if (cells.Length > 4 && cells[4].Length > 0)
                rows.Codes.Add(cells[4]);
        }

        if (stations.Count > 1)
            problems.File(string.Join(", ", stations), "the file holds several stations", "name the station to be read");
        else if (stations.Count == 0 && !problems.Any)
            problems.File(options.Column ?? (others > 0 ? "level only (PARAM 2)" : "no rows"), "there is no row of flow", "rows of PARAM 1");
        if (problems.Any)
            return problems.Refuse();
        if (FlowColumn.Agreed(UnitTable.CubicMetrePerSecond, options.Unit, "PARAM 1", problems) is not { } unit)
            return problems.Refuse();
        rows.Assume("the flows are cubic metres per second, as PARAM 1 is defined");
        return rows.Build(this, options, null, unit, "PARAM 1", "Water Survey of Canada " + stations[0]);
    }

    private static bool IsHeader(string[] cells) => cells.Length >= 4
        && cells[0].Equals("ID", StringComparison.OrdinalIgnoreCase)
        && cells[1].Equals("PARAM", StringComparison.OrdinalIgnoreCase)
        && cells[2].Equals("Date", StringComparison.OrdinalIgnoreCase)
        && cells[3].Equals("Value", StringComparison.OrdinalIgnoreCase);
}
