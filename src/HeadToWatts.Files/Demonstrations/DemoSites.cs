using System.Reflection;
using HeadToWatts.Basis.Units;
using HeadToWatts.Files.StudyFiles;

namespace HeadToWatts.Files.Demonstrations;

/// <summary>One of the invented sites that come with the program.</summary>
/// <param name="Id">Folder name under sitedata.</param>
/// <param name="Title">A few words.</param>
/// <param name="Summary">What it shows.</param>
public sealed record DemoSite(string Id, string Title, string Summary)
{
    private static readonly Assembly Here = typeof(DemoSite).Assembly;

    /// <summary>The study file's text.</summary>
    public string StudyText()
    {
        using var reader = new StreamReader(Open("study.json")!);
        return reader.ReadToEnd();
    }

    /// <summary>The study, its flow record taken into the document so that it stands alone.</summary>
    public StudyDocument Load()
    {
        var document = StudyFileReader.Parse(Id + "/study.json", StudyText()).Value;
        foreach (var alternative in document.Alternatives)
        {
            if (alternative.Flow.Record is { File: not null } record)
            {
                var days = new FolderFlowFiles(Open).Read(record, "record.file").Value;
                alternative.Flow.Record = RecordText.Write(days, UnitTable.CubicFootPerSecond);
            }
        }

        return document;
    }

    private Stream? Open(string name) => Here.GetManifestResourceStream($"sitedata/{Id}/{name}");
}

/// <summary>The invented sites.</summary>
public static class DemoSites
{
    /// <summary>The sites, the default first.</summary>
    public static IReadOnlyList<DemoSite> All { get; } =
    [
        new("larkspur-drop", "A canal drop", "An irrigation canal that runs April to October, twelve years of daily flows, 18.5 ft of fall."),
        new("sorrel-creek", "A farm creek", "A small creek, a long small pipe, 196 ft of fall."),
        new("tamarack-pipeline", "A district pipeline", "A piped lateral with pressure to spare at its reducing station."),
    ];
}
