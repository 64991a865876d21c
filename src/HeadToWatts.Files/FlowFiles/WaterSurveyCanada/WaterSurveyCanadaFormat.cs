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
        var rows = new RecordRows(source, options, problems);
        var stations = new List<string>();
        var begun = false;
        var columns = 5;
        var others = 0;
        using var text = new DelimitedText(source, ',', quotes: true);
        while (text.Read())
        {
            cancellation.ThrowIfCancellationRequested();
            if (text.Cell(0).Equals("ID", StringComparison.OrdinalIgnoreCase) && IsHeader(text.Cells()))
            {
                begun = true;
                columns = text.Count;
                continue;
            }

            if (!begun)
                continue;
            if (text.Count < 4 || text.Count < columns)
            {
                rows.Wrong(text.Row, text.RowText(), "the row has too few cells, so that its value may be cut short", "ID,PARAM,Date,Value,SYM");
                continue;
            }

            var station = text.Cell(0);
            if (options.Column is { } wanted && !station.Equals(wanted, StringComparison.OrdinalIgnoreCase))
                continue;
            if (text.Cell(1) is not "1")
            {
                if (text.Cell(1) is "2")
                    others++;
                else
                    rows.Wrong(text.Row, text.Cell(1).ToString(), "this is neither flow (1) nor level (2)", "PARAM 1");
                continue;
            }

            if (stations.Count == 0 || !station.SequenceEqual(stations[^1]))
            {
                if (!stations.Contains(station.ToString()) && stations.Count < 20)
                    stations.Add(station.ToString());
            }

            if (stations.Count > 1)
                continue;
            var code = text.Cell(4);
            if (code.Length > 0)
                rows.Codes.Add(code);
            rows.Add(text.Row, text.Cell(2), text.Cell(3), marks: QualityCodes.Canada(code));
            rows.LastRowIsProven = columns > 4;
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
        return rows.Build(new RecordAbout(Id, Name, null, unit, "PARAM 1", "Water Survey of Canada " + stations[0]));
    }

    private static bool IsHeader(string[] cells) => cells.Length >= 4
        && cells[0].Equals("ID", StringComparison.OrdinalIgnoreCase)
        && cells[1].Equals("PARAM", StringComparison.OrdinalIgnoreCase)
        && cells[2].Equals("Date", StringComparison.OrdinalIgnoreCase)
        && cells[3].Equals("Value", StringComparison.OrdinalIgnoreCase);
}
