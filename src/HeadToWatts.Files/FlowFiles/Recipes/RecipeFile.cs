using System.Text.Encodings.Web;
using System.Text.Json;
using System.Text.Json.Serialization;
using HeadToWatts.Basis.Problems;
using HeadToWatts.Files.StudyFiles;

namespace HeadToWatts.Files.FlowFiles.Recipes;

/// <summary>Reads and writes recipes as JSON, alone or within a study.</summary>
public static class RecipeFile
{
    private const int LargestChars = 64 * 1024;

    private static readonly JsonSerializerOptions Options = new()
    {
        PropertyNamingPolicy = JsonNamingPolicy.CamelCase,
        DefaultIgnoreCondition = JsonIgnoreCondition.WhenWritingNull,
        Encoder = JavaScriptEncoder.UnsafeRelaxedJsonEscaping,
        WriteIndented = true,
        NewLine = "\n",
    };

    /// <summary>The recipe as text.</summary>
    /// <param name="document">The recipe.</param>
    public static string Write(RecipeDocument document) => JsonSerializer.Serialize(document, Options) + "\n";

    /// <summary>Reads a recipe, or lists every problem.</summary>
    /// <param name="name">Name of the file, for problems.</param>
    /// <param name="text">Its text.</param>
    public static Checked<RecipeDocument> Parse(string name, string text)
    {
        ArgumentNullException.ThrowIfNull(text);
        if (text.Length > LargestChars)
            return Checked.Refused<RecipeDocument>(new Problem(name, "more than 64 kB", "this is too long for a recipe"));
        try
        {
            using var json = JsonDocument.Parse(text.TrimStart('\ufeff'), new JsonDocumentOptions { CommentHandling = JsonCommentHandling.Skip, AllowTrailingCommas = true, MaxDepth = 8 });
            var problems = new List<Problem>();
            var reader = new JsonObjectReader(json.RootElement, "", problems);
            var document = Fields(reader);
            reader.Done();
            return problems.Count == 0 ? Checked.Of(document) : Checked.Refused<RecipeDocument>(problems.Select(p => p with { Where = $"{name} {p.Where}" }));
        }
        catch (JsonException e)
        {
            return Checked.Refused<RecipeDocument>(new Problem(name, $"line {RecipeWords.Number((int)(e.LineNumber ?? 0) + 1)}", "this is not JSON", "a reading recipe, as record --propose writes it"));
        }
    }

    internal static RecipeDocument Fields(JsonObjectReader r) => new()
    {
        Separator = r.Text("separator"),
        Widths = r.Text("widths"),
        SkipRows = r.NumberText("skipRows"),
        HeaderRows = r.NumberText("headerRows"),
        UnitsRows = r.NumberText("unitsRows"),
        DateColumn = r.NumberText("dateColumn"),
        DateOrder = r.Text("dateOrder"),
        TwoDigitYearsFrom = r.NumberText("twoDigitYearsFrom"),
        TimeColumn = r.NumberText("timeColumn"),
        DecimalSign = r.Text("decimalSign"),
        ThousandsSign = r.Text("thousandsSign"),
        Missing = r.TextsOrNumbers("missing"),
        Unit = r.Text("unit"),
        ValueColumn = r.NumberText("valueColumn"),
        QualityColumn = r.NumberText("qualityColumn"),
        TimeZone = r.Text("timeZone"),
        OnlyColumn = r.NumberText("onlyColumn"),
        OnlyText = r.NumberText("onlyText"),
    };
}
