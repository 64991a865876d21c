using System.Text;
using System.Text.Json;
using HeadToWatts.Basis.Problems;

namespace HeadToWatts.Files.StudyFiles;

/// <summary>Reads a study file into a document, or lists every problem.</summary>
public static class StudyFileReader
{
    /// <summary>Largest study file read, bytes.</summary>
    public const int LargestBytes = 1024 * 1024;

    /// <summary>Reads a study file.</summary>
    /// <param name="name">Name of the file, for messages.</param>
    /// <param name="stream">Its bytes, UTF-8.</param>
    public static Checked<StudyDocument> Read(string name, Stream stream)
    {
        ArgumentNullException.ThrowIfNull(stream);
        using var buffer = new MemoryStream();
        var chunk = new byte[64 * 1024];
        int got;
        while ((got = stream.Read(chunk)) > 0)
        {
            buffer.Write(chunk, 0, got);
            if (buffer.Length > LargestBytes)
                return Checked.Refused<StudyDocument>(new Problem(name, "more than 1 MB", "a study file is at most 1 MB", "long flow records as a file of their own beside the study"));
        }

        return Parse(name, Encoding.UTF8.GetString(buffer.GetBuffer().AsSpan(0, (int)buffer.Length)));
    }

    /// <summary>Reads the text of a study file.</summary>
    /// <param name="name">Name of the file, for messages.</param>
    /// <param name="text">Its text.</param>
    public static Checked<StudyDocument> Parse(string name, string text)
    {
        ArgumentNullException.ThrowIfNull(text);
        var trimmed = text.TrimStart('\ufeff');
        if (string.IsNullOrWhiteSpace(trimmed))
            return Checked.Refused<StudyDocument>(new Problem(name, "", "the file is empty", "a study file in JSON"));
        JsonDocument json;
        try
        {
            json = JsonDocument.Parse(trimmed, new JsonDocumentOptions { CommentHandling = JsonCommentHandling.Skip, AllowTrailingCommas = true, MaxDepth = 32 });
        }
        catch (JsonException e)
        {
            var line = (e.LineNumber ?? 0) + 1;
            var read = trimmed.Split('\n').ElementAtOrDefault((int)line - 1)?.Trim() ?? "";
            return Checked.Refused<StudyDocument>(new Problem($"line {line}", read.Length > 60 ? read[..60] + "..." : read, "this is not JSON: " + Reason(e.Message), "a study file in JSON"));
        }

        using (json)
        {
            var problems = new List<Problem>();
            var reader = new JsonObjectReader(json.RootElement, "", problems);
            var format = reader.Integer("format");
            if (problems.Count == 0 && format is null)
                problems.Add(new Problem("format", "", "the format number is missing", "1"));
            else if (format is < 1 or > StudyDocument.CurrentFormat)
                return Checked.Refused<StudyDocument>(new Problem("format", format.Value.ToString(System.Globalization.CultureInfo.InvariantCulture), $"this program reads formats 1 to {StudyDocument.CurrentFormat}", "a newer program, or format 1"));
            var document = StudyDocumentFields.Read(reader);
            reader.Done();
            return problems.Count == 0 ? Checked.Of(document) : Checked.Refused<StudyDocument>(problems);
        }
    }

    // The parser's words up to the first full stop; what follows repeats the line number.
    private static string Reason(string message) => message.Split(". ")[0].TrimEnd('.');
}
