using System.Text.RegularExpressions;
using HeadToWatts.Memos.Content;
using HeadToWatts.Studies.Workings;

namespace HeadToWatts.Memos.Sections;

/// <summary>How each number came about: the same text as on the screen.</summary>
internal static partial class WorkingsAppendix
{
    private static readonly string[] Operators = [" × ", " / ", " + ", " − "];

    public static void Write(MemoContext memo)
    {
        var body = memo.Body;
        body.Appendix("Workings", "workings");
        body.Say("Each number with its formula in symbols, the same with this study's numbers, the result, and where the formula comes from. Numbers are shown rounded; they were reckoned in full.");
        foreach (var stage in WorkingsList.For(memo.Result, memo.Show).GroupBy(w => w.Stage))
        {
            body.Part(stage.Key.ToString(), "workings-" + stage.Key);
            foreach (var working in stage)
                One(memo, working);
        }
    }

    // Some workings are words, not sums; an equals sign before words is wrong.
    private static RichText Equals(string text)
    {
        var runs = new List<TextRun> { new(Sign(text)) };
        var from = 0;
        foreach (Match power in Power().Matches(text))
        {
            runs.Add(new TextRun(text[from..power.Index]));
            runs.Add(new TextRun(power.Groups[1].Value, Standing: Standing.Above));
            from = power.Index + power.Length;
        }

        runs.Add(new TextRun(text[from..]));
        return RichText.From(runs.Where(r => r.Text.Length > 0));
    }

    [GeneratedRegex(@"\^\(([^)]+)\)")]
    private static partial Regex Power();

    private static string Sign(string text) => text.Length > 0 && (char.IsDigit(text[0]) || text[0] is '(' or '−') && (IsSum(text) || !text.Contains(", ", StringComparison.Ordinal) && text.Count(c => c == ' ') < 5) ? "= " : "";

    private static bool IsSum(string text) => Operators.Any(o => text.Contains(o, StringComparison.Ordinal));

    private static void One(MemoContext memo, Working working)
    {
        var body = memo.Body;
        body.Say(RichText.Bold(working.Title), ParagraphKind.Title, keepWithNext: true);
        var cites = working.Methods.DistinctBy(m => m.Id).Select(m => body.Cite(m.Source, m.Locator)).DistinctBy(c => c.Plain).ToArray();
        body.Add(new FormulaBlock(RichText.Formula(working.Formula), cites.Length == 0 ? RichText.Empty : cites[0], KeepWithNext: true));
        body.Add(new FormulaBlock(Equals(working.Numbers), RichText.Empty, ContinuesAbove: true, KeepWithNext: true));
        var ends = working.Note.Length == 0 && cites.Length < 2;
        body.Add(new FormulaBlock(RichText.Of(Sign(working.Result)) + RichText.Bold(working.Result), RichText.Empty, ContinuesAbove: true, KeepWithNext: !ends));
        var note = RichText.Of(working.Note);
        if (cites.Length > 1)
            note += (working.Note.Length > 0 ? " Also " : "Also ") + RichText.Join("; ", cites.Skip(1)) + ".";
        if (!note.IsEmpty)
            body.Say(note, ParagraphKind.Note);
    }
}
