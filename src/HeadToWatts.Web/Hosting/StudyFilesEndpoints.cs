using System.IO.Compression;
using System.Net.Mime;
using System.Text;
using HeadToWatts.Basis.Problems;
using HeadToWatts.Files.Exports;
using HeadToWatts.Files.StudyFiles;
using HeadToWatts.Memos;
using HeadToWatts.Storage;
using HeadToWatts.Studies;

namespace HeadToWatts.Web.Hosting;

/// <summary>The files a visitor takes away. Each is made from the study as stored, which is the study as last entered.</summary>
internal static class StudyFilesEndpoints
{
    public static void Map(IEndpointRouteBuilder app)
    {
        app.MapGet("/study/{id:guid}/files/study.json", (Guid id, StudyStore store) =>
            store.Find(id) is { } study ? Download(Encoding.UTF8.GetBytes(study.StudyJson), MediaTypeNames.Application.Json, FileName(study.Name) + ".json") : Results.NotFound());

        app.MapGet("/study/{id:guid}/versions/{number:int}/study.json", (Guid id, int number, StudyStore store) =>
            store.VersionJson(id, number) is { } json ? Download(Encoding.UTF8.GetBytes(json), MediaTypeNames.Application.Json, $"study-version-{number}.json") : Results.NotFound());

        app.MapGet("/study/{id:guid}/files/memo.pdf", (Guid id, int? alternative, StudyStore store) =>
            Make(id, store, (study, results) => Download(Memo.Make(Chosen(results, alternative), Chosen(results, alternative).Show()), MediaTypeNames.Application.Pdf, FileName(study.Name) + ".pdf")));

        app.MapGet("/study/{id:guid}/files/results.json", (Guid id, StudyStore store) =>
            Make(id, store, (study, results) => Download(Encoding.UTF8.GetBytes(ResultsJson.Write(results)), MediaTypeNames.Application.Json, FileName(study.Name) + "-results.json")));

        app.MapGet("/study/{id:guid}/files/tables.zip", (Guid id, int? alternative, StudyStore store) =>
            Make(id, store, (study, results) => Download(Zip(ResultTables.Of(Chosen(results, alternative))), MediaTypeNames.Application.Zip, FileName(study.Name) + "-tables.zip")));
    }

    private static IResult Make(Guid id, StudyStore store, Func<StoredStudy, IReadOnlyList<StudyResult>, IResult> make)
    {
        if (store.Find(id) is not { } study)
            return Results.NotFound();
        var reading = StudyFileReader.Parse(study.Name, study.StudyJson);
        if (!reading.TryGet(out var document))
            return Refused(reading.Problems);
        var built = StudyBuilder.Build(document, NoFlowFiles.Instance);
        return built.TryGet(out var input) ? make(study, Study.RunAll(input)) : Refused(built.Problems);
    }

    private static StudyResult Chosen(IReadOnlyList<StudyResult> results, int? alternative) => results[Math.Clamp(alternative ?? 0, 0, results.Count - 1)];

    private static IResult Refused(IReadOnlyList<Problem> problems) =>
        Results.Text(string.Join('\n', problems.Select(Sessions.FieldNames.Sentence)) + "\n", "text/plain; charset=utf-8", Encoding.UTF8, StatusCodes.Status422UnprocessableEntity);

    private static IResult Download(byte[] content, string type, string name) => Results.File(content, type, name);

    private static byte[] Zip(IReadOnlyList<ResultTable> tables)
    {
        using var bytes = new MemoryStream();
        using (var zip = new ZipArchive(bytes, ZipArchiveMode.Create, leaveOpen: true))
        {
            foreach (var table in tables)
            {
                var entry = zip.CreateEntry(table.FileName);
                // The same study gives the same bytes on every day.
                entry.LastWriteTime = new DateTimeOffset(1980, 1, 1, 0, 0, 0, TimeSpan.Zero);
                using var writer = new StreamWriter(entry.Open(), new UTF8Encoding(false));
                writer.Write(table.Text);
            }
        }

        return bytes.ToArray();
    }

    /// <summary>A file name that every system takes: letters, digits and hyphens.</summary>
    internal static string FileName(string name)
    {
        var text = new StringBuilder();
        foreach (var c in name.Normalize(NormalizationForm.FormD))
        {
            if (char.IsAsciiLetterOrDigit(c))
                text.Append(char.ToLowerInvariant(c));
            else if (c is ' ' or '-' or '_' or ',' or '.' && text.Length > 0 && text[^1] != '-')
                text.Append('-');
        }

        var made = text.ToString().Trim('-');
        return made.Length == 0 ? "study" : made.Length > 60 ? made[..60].Trim('-') : made;
    }
}
