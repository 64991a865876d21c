using System.Text.Json;
using HeadToWatts.Basis.Problems;

namespace HeadToWatts.Files.StudyFiles;

/// <summary>How water levels become flows: a table, an equation, or a weir or flume; every quantity a text.</summary>
public sealed class RatingDocument
{
    /// <summary>"table", "equation", or the key of a device, as "parshall-flume".</summary>
    public string? Kind { get; set; }

    /// <summary>Rows of a table.</summary>
    public List<RatingRowDocument>? Rows { get; set; }

    /// <summary>"linear" or "log-log": how a table is read between its rows.</summary>
    public string? Between { get; set; }

    /// <summary>Level taken off before the logarithm.</summary>
    public string? Offset { get; set; }

    /// <summary>C of Q = C (h - h0)^n: the flow at one metre above the level of no flow, m3/s.</summary>
    public string? Coefficient { get; set; }

    /// <summary>n of Q = C (h - h0)^n.</summary>
    public string? Exponent { get; set; }

    /// <summary>Level of no flow h0.</summary>
    public string? ZeroFlow { get; set; }

    /// <summary>Lowest level measured.</summary>
    public string? Lowest { get; set; }

    /// <summary>Highest level measured.</summary>
    public string? Highest { get; set; }

    /// <summary>Level of the crest or flume floor on the gauge; 0 when left out.</summary>
    public string? CrestLevel { get; set; }

    /// <summary>Width of the channel, length of the crest across the flow, or width of the throat.</summary>
    public string? Width { get; set; }

    /// <summary>Height of the crest over the floor upstream.</summary>
    public string? CrestHeight { get; set; }

    /// <summary>Length of a broad crest along the flow.</summary>
    public string? CrestBreadth { get; set; }

    /// <summary>Width of the channel upstream of a broad crest.</summary>
    public string? ApproachWidth { get; set; }

    /// <summary>Angle of a notch.</summary>
    public string? Angle { get; set; }

    /// <summary>How many ends are contracted: 0, 1 or 2.</summary>
    public string? Contractions { get; set; }

    /// <summary>Discharge coefficient.</summary>
    public string? DischargeCoefficient { get; set; }

    /// <summary>"left out", "held" or "carried on": a level the rating does not cover.</summary>
    public string? Outside { get; set; }

    /// <summary>Shifts of the rating from a day on.</summary>
    public List<ShiftDocument>? Shifts { get; set; }

    /// <summary>Reads a rating that stands in a file of its own, or lists every problem.</summary>
    /// <param name="name">Name of the file, for problems.</param>
    /// <param name="text">Its text.</param>
    public static Checked<RatingDocument> Parse(string name, string text)
    {
        ArgumentNullException.ThrowIfNull(text);
        try
        {
            using var json = JsonDocument.Parse(text.TrimStart('\ufeff'), new JsonDocumentOptions { CommentHandling = JsonCommentHandling.Skip, AllowTrailingCommas = true, MaxDepth = 8 });
            var problems = new List<Problem>();
            var reader = new JsonObjectReader(json.RootElement, "", problems);
            var document = Fields(reader);
            reader.Done();
            return problems.Count == 0 ? Checked.Of(document) : Checked.Refused<RatingDocument>(problems.Select(p => p with { Where = $"{name} {p.Where}" }));
        }
        catch (JsonException e)
        {
            return Checked.Refused<RatingDocument>(new Problem(name, $"line {((e.LineNumber ?? 0) + 1).ToString(System.Globalization.CultureInfo.InvariantCulture)}", "this is not JSON", "a rating, as flow.record.rating of a study file"));
        }
    }

    internal static RatingDocument Fields(JsonObjectReader r) => new()
    {
        Kind = r.Text("kind"),
        Rows = r.Array("rows", row => new RatingRowDocument { Level = row.Text("level"), Flow = row.Text("flow") }),
        Between = r.Text("between"),
        Offset = r.Text("offset"),
        Coefficient = r.NumberText("coefficient"),
        Exponent = r.NumberText("exponent"),
        ZeroFlow = r.Text("zeroFlow"),
        Lowest = r.Text("lowest"),
        Highest = r.Text("highest"),
        CrestLevel = r.Text("crestLevel"),
        Width = r.Text("width"),
        CrestHeight = r.Text("crestHeight"),
        CrestBreadth = r.Text("crestBreadth"),
        ApproachWidth = r.Text("approachWidth"),
        Angle = r.Text("angle"),
        Contractions = r.NumberText("contractions"),
        DischargeCoefficient = r.NumberText("dischargeCoefficient"),
        Outside = r.Text("outside"),
        Shifts = r.Array("shifts", s => new ShiftDocument { From = s.Text("from"), Shift = s.Text("shift") }),
    };
}

/// <summary>A row of a rating table.</summary>
public sealed class RatingRowDocument
{
    /// <summary>Water level.</summary>
    public string? Level { get; set; }

    /// <summary>Flow at that level.</summary>
    public string? Flow { get; set; }
}

/// <summary>A shift of a rating.</summary>
public sealed class ShiftDocument
{
    /// <summary>First day, yyyy-mm-dd.</summary>
    public string? From { get; set; }

    /// <summary>Length added to the level before the rating is read.</summary>
    public string? Shift { get; set; }
}
