using System.Globalization;
using HeadToWatts.Basis.Problems;
using HeadToWatts.Basis.Units;
using HeadToWatts.Files.FlowFiles.Reading;
using HeadToWatts.FlowRecords.Quality;

namespace HeadToWatts.Files.FlowFiles.Nrfa;

/// <summary>
/// Daily CSV files of the UK National River Flow Archive: lines of keys ("station,name,...", "dataType,units,m3/s",
/// "data,first,1883-01-01"), then a row a day: date, flow, and a flag where there is one.
/// </summary>
public sealed class NrfaFormat : IFlowFileFormat
{
    private static readonly string[] Groups = ["file", "database", "station", "dataType", "data"];

    /// <inheritdoc/>
    public string Id => "nrfa-daily";

    /// <inheritdoc/>
    public string Name => "UK National River Flow Archive daily flows";

    /// <inheritdoc/>
    public bool Recognises(FlowFileHead head)
    {
        ArgumentNullException.ThrowIfNull(head);
        var lines = head.Content().Take(40).Select(l => l.Text).ToList();
        return lines.Exists(l => l.StartsWith("station,", StringComparison.Ordinal)) && lines.Exists(l => l.StartsWith("data,first,", StringComparison.Ordinal));
    }

    /// <inheritdoc/>
    public Checked<FlowFile> Read(FlowFileSource source, FlowFileOptions options, CancellationToken cancellation)
    {
        ArgumentNullException.ThrowIfNull(source);
        ArgumentNullException.ThrowIfNull(options);
        var problems = new ProblemList(source.Name);
        var rows = new RecordRows(source, options, problems);
        var keys = new Dictionary<string, string>(StringComparer.OrdinalIgnoreCase);
        var begun = false;
        var lastDate = "";
        using var text = new DelimitedText(source, ',', quotes: true);
        while (text.Read())
        {
            cancellation.ThrowIfCancellationRequested();
            if (!begun && IsKey(text))
            {
                keys[$"{text.Cell(0)},{text.Cell(1)}"] = string.Join(", ", text.Cells().Skip(2)).Trim();
                continue;
            }

            begun = true;
            if (text.Count < 2 || text.HoldsMoreThan(3))
            {
                rows.Wrong(text.Row, text.RowText(), text.Count < 2 ? "the row has too few cells" : "the row has too many cells", "date, flow, flag");
                continue;
            }

            var code = text.Cell(2);
            if (code.Length > 0)
                rows.Codes.Add(code);
            lastDate = text.Cell(0).ToString();
            rows.Add(text.Row, text.Cell(0), text.Cell(1), marks: QualityCodes.Common(code));
        }

        if (Unit(keys, options.Unit, problems) is not { } unit)
            return problems.Refuse();
        rows.Assume($"the flows are {unit.Symbol}, as the file says");
        if (Key("dataType,period") is { Length: > 0 } period)
            rows.Assume($"each value stands for the period the file gives: {period}");
        if (Key("data,last") is { Length: > 0 } last && lastDate != last)
            rows.Findings.Add(QualityKind.OtherExtent, 0, $"the file says its data go to {last}; its last row is of {lastDate}", "read as far as the rows go; the file may be cut");
        return rows.Build(new RecordAbout(Id, Name, null, unit, "flow", $"NRFA {Key("station,id")} {Key("station,name")}".Trim()));

        string? Key(string name) => keys.GetValueOrDefault(name);
    }

    private static bool IsKey(DelimitedText text)
    {
        foreach (var group in Groups)
        {
            if (text.Cell(0).Equals(group, StringComparison.OrdinalIgnoreCase))
                return true;
        }

        return false;
    }

    private static UnitOfMeasure? Unit(Dictionary<string, string> keys, UnitOfMeasure? told, ProblemList problems)
    {
        var kind = keys.GetValueOrDefault("dataType,id") ?? "";
        var name = keys.GetValueOrDefault("dataType,name") ?? kind;
        var written = keys.GetValueOrDefault("dataType,units") ?? "";
        var unit = written.Length == 0 ? UnitTable.CubicMetrePerSecond : HeaderUnit.FindFlow(written);
        if (unit is null || (kind.Length > 0 && !kind.Contains("df", StringComparison.OrdinalIgnoreCase) && !name.Contains("flow", StringComparison.OrdinalIgnoreCase)))
        {
            problems.File(string.Create(CultureInfo.InvariantCulture, $"{name} {written}").Trim(), "this series is not a flow", "the gauged daily flow of the station, in m3/s");
            return null;
        }

        return FlowColumn.Agreed(unit, told, "dataType,units", problems);
    }
}
