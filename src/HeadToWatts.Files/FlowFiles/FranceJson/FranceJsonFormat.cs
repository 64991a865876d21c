using System.Globalization;
using System.Text.Json;
using HeadToWatts.Basis.Problems;
using HeadToWatts.Basis.Units;
using HeadToWatts.Files.FlowFiles.Reading;
using HeadToWatts.FlowRecords.Quality;

namespace HeadToWatts.Files.FlowFiles.FranceJson;

/// <summary>
/// The JSON of France's national hydrometric data: objects in "data" with a station, a date ("date_obs_elab" for daily means,
/// "date_obs" for instants) and a result in litres per second ("resultat_obs_elab", "resultat_obs").
/// </summary>
public sealed class FranceJsonFormat : IFlowFileFormat
{
    /// <inheritdoc/>
    public string Id => "france-json";

    /// <inheritdoc/>
    public string Name => "France's hydrometric data as JSON, litres per second";

    /// <inheritdoc/>
    public bool Recognises(FlowFileHead head)
    {
        ArgumentNullException.ThrowIfNull(head);
        return head.Content().FirstOrDefault().Text is { } first && first.TrimStart() is ['{' or '[', ..]
            && head.Lines.Any(l => l.Contains("\"resultat_obs", StringComparison.Ordinal));
    }

    /// <inheritdoc/>
    public Checked<FlowFile> Read(FlowFileSource source, FlowFileOptions options, CancellationToken cancellation)
    {
        ArgumentNullException.ThrowIfNull(source);
        ArgumentNullException.ThrowIfNull(options);
        var problems = new ProblemList(source.Name);
        JsonDocument json;
        try
        {
            json = Parse(source);
        }
        catch (JsonException e)
        {
            var row = (int)Math.Min(int.MaxValue, (e.LineNumber ?? 0) + 1);
            problems.Row(row, "the text from here on", source.EndsInsideRow ? "this is no whole JSON; the file may be cut off" : "this is not JSON", "the answer of the service, whole");
            return problems.Refuse();
        }

        using (json)
            return Read(json.RootElement, source, options, problems, cancellation);
    }

    private Checked<FlowFile> Read(JsonElement root, FlowFileSource source, FlowFileOptions options, ProblemList problems, CancellationToken cancellation)
    {
        var data = root;
        if (root.ValueKind == JsonValueKind.Object && !root.TryGetProperty("data", out data))
            data = default;
        if (data.ValueKind != JsonValueKind.Array)
        {
            problems.File("no list", "there is no list of values under \"data\"", "the answer of the service, whole");
            return problems.Refuse();
        }

        var rows = new RecordRows(source, options, problems) { LastRowIsProven = true };
        var stations = new List<string>();
        var kinds = new HashSet<string>(StringComparer.Ordinal);
        var number = 0;
        foreach (var item in data.EnumerateArray())
        {
            cancellation.ThrowIfCancellationRequested();
            number++;
            if (item.ValueKind != JsonValueKind.Object)
            {
                problems.Row(number, item.ValueKind.ToString(), "this value is no object", "date_obs_elab and resultat_obs_elab");
                continue;
            }

            var station = Text(item, "code_station") is { Length: > 0 } code ? code : Text(item, "code_site");
            if (options.Column is { } wanted && !station.Equals(wanted, StringComparison.OrdinalIgnoreCase))
                continue;
            if (!stations.Contains(station) && stations.Count < 20)
                stations.Add(station);
            kinds.Add(Text(item, "grandeur_hydro_elab") is { Length: > 0 } kind ? kind : Text(item, "grandeur_hydro"));
            Take(item, number, rows);
        }

        if (stations.Count > 1)
            problems.File(string.Join(", ", stations), "the file holds several stations", "name the station to be read");
        if (kinds.FirstOrDefault(k => k.Length > 0 && !(k[0] == 'Q' && !k.EndsWith('M'))) is { } other)
            problems.File(other, other[0] == 'Q' ? "these are monthly means" : "this is not a flow", "QmJ or QmnJ, the mean flow of each day, or Q");
        else if (kinds.Count > 1)
            problems.File(string.Join(", ", kinds), "the file mixes kinds of value", "one kind");
        if (FlowColumn.Agreed(UnitTable.LitrePerSecond, options.Unit, "resultat", problems) is not { } unit || problems.Any)
            return problems.Refuse();
        rows.Assume("the flows are litres per second, as this service gives them");
        if (root.ValueKind == JsonValueKind.Object && root.TryGetProperty("count", out var count) && count.TryGetInt64(out var told) && told > number && options.Column is null)
        {
            rows.Findings.Add(QualityKind.OtherExtent, 0, $"the service counts {told.ToString("N0", CultureInfo.InvariantCulture)} values; the file has {number.ToString("N0", CultureInfo.InvariantCulture)}",
                "read as far as it goes; further pages of the answer are not in it");
        }

        rows.LastRowIsProven = true;
        return rows.Build(new RecordAbout(Id, Name, null, unit, kinds.FirstOrDefault() ?? "", stations.Count > 0 ? "station " + stations[0] : ""));
    }

    private static void Take(JsonElement item, int number, RecordRows rows)
    {
        var date = Text(item, "date_obs_elab") is { Length: > 0 } day ? day : Text(item, "date_obs");
        var value = Text(item, "resultat_obs_elab") is { Length: > 0 } mean ? mean : Text(item, "resultat_obs");
        var status = Text(item, "libelle_statut");
        var quality = Text(item, "libelle_qualification");
        if (status.Length > 0)
            rows.Codes.Add(status);
        if (quality.Length > 0)
            rows.Codes.Add(quality);
        var marks = DayMarks.None;
        if (status.Contains("brute", StringComparison.OrdinalIgnoreCase) || status.Contains("pré", StringComparison.OrdinalIgnoreCase))
            marks |= DayMarks.Provisional;
        if (Text(item, "libelle_methode").Contains("estim", StringComparison.OrdinalIgnoreCase) || quality.Contains("estim", StringComparison.OrdinalIgnoreCase))
            marks |= DayMarks.Estimated;
        rows.Add(number, date, value, marks: marks);
    }

    // The parser wants the bytes as they are, or as UTF-8 where they are not.
    private static JsonDocument Parse(FlowFileSource source)
    {
        if (source.OpenUtf8() is { } bytes)
        {
            using (bytes)
                return JsonDocument.Parse(bytes);
        }

        using var reader = source.OpenText();
        return JsonDocument.Parse(reader.ReadToEnd());
    }

    private static string Text(JsonElement item, string name) =>
        !item.TryGetProperty(name, out var value) ? ""
        : value.ValueKind switch
        {
            JsonValueKind.String => value.GetString() ?? "",
            JsonValueKind.Number => value.GetRawText(),
            _ => "",
        };
}
