using System.Globalization;
using HeadToWatts.Basis.Sources;
using HeadToWatts.Memos.Content;

namespace HeadToWatts.Memos.Sections;

/// <summary>The sources, numbered in the order of first use.</summary>
internal static class SourcesAppendix
{
    public static void Write(MemoContext memo)
    {
        var body = memo.Body;
        body.Appendix("Sources", "sources");
        body.Say("In the order in which they are first named. Judgements of this project and figures from memory are marked as such, so that they can be told from published ones.");
        var sources = body.Sources;
        body.Add(new ListBlock(
            [.. sources.Select(Entry)],
            [.. sources.Select((_, i) => "[" + (i + 1).ToString(CultureInfo.InvariantCulture) + "]")],
            [.. sources.Select((_, i) => MemoBuilder.SourceAnchor(i + 1))]));
    }

    private static RichText Entry(Source source)
    {
        var before = string.Concat(new[] { source.Authors, source.Year }.Where(p => p.Length > 0).Select(p => p.TrimEnd('.') + ". "));
        var after = source.Place.Length > 0 ? " " + source.Place.TrimEnd('.') + "." : "";
        var mark = source.Kind switch
        {
            SourceKind.Memory => " (Typical, from memory.)",
            SourceKind.CommonPractice => " (Common practice, no source.)",
            SourceKind.Decision => " (A judgement of this project.)",
            SourceKind.User => " (Given by the author.)",
            _ => "",
        };
        return RichText.Of(before) + RichText.Italic(source.Title.TrimEnd('.') + ".") + after + mark;
    }
}
