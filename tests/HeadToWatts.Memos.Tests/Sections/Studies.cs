using System.Collections.Concurrent;
using HeadToWatts.Basis.Units;
using HeadToWatts.Files.Demonstrations;
using HeadToWatts.Files.StudyFiles;
using HeadToWatts.Studies;

namespace HeadToWatts.Memos.Tests.Sections;

/// <summary>Studies to write memos of: the invented sites, and small ones at the edge of what can be asked.</summary>
internal static class Studies
{
    private static readonly ConcurrentDictionary<string, StudyResult> Results = new();

    public static IEnumerable<string> Sites => DemoSites.All.Select(s => s.Id);

    public static StudyResult Of(string site) => Results.GetOrAdd(site, id => Study.RunAll(StudyBuilder.Build(DemoSites.All.Single(s => s.Id == id).Load(), NoFlowFiles.Instance).Value)[0]);

    /// <summary>The first site with its study file changed.</summary>
    public static StudyResult Changed(string site, Action<StudyDocument> change)
    {
        var document = DemoSites.All.Single(s => s.Id == site).Load();
        change(document);
        var built = StudyBuilder.Build(document, NoFlowFiles.Instance);
        Assert.True(built.IsGood, string.Join("\n", built.Problems));
        return Study.RunAll(built.Value)[0];
    }

    public static UnitDisplay Show(StudyResult result, string units) => result.Show(Enum.Parse<UnitSystem>(units));
}
