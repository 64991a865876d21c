using System.Text.Encodings.Web;
using System.Text.Json;
using System.Text.Json.Serialization;

namespace HeadToWatts.Files.StudyFiles;

/// <summary>Writes a study document as a study file; reading it again gives the same document.</summary>
public static class StudyFileWriter
{
    private static readonly JsonSerializerOptions Options = new()
    {
        PropertyNamingPolicy = JsonNamingPolicy.CamelCase,
        DefaultIgnoreCondition = JsonIgnoreCondition.WhenWritingNull,
        Encoder = JavaScriptEncoder.UnsafeRelaxedJsonEscaping,
        WriteIndented = true,
        NewLine = "\n",
    };

    /// <summary>The text of the study file.</summary>
    /// <param name="document">The document.</param>
    public static string Write(StudyDocument document) => JsonSerializer.Serialize(document, Options) + "\n";
}
