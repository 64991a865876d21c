using HeadToWatts.Memos.Content;
using HeadToWatts.Studies.Cautions;

namespace HeadToWatts.Memos.Sections;

/// <summary>What to know before relying on a figure.</summary>
internal static class CautionsSection
{
    public static void Write(MemoContext memo)
    {
        var body = memo.Body;
        body.Section("Cautions", "cautions");
        if (memo.Cautions.Count == 0)
        {
            body.Say("None of this project's rules found anything to caution against. What no rule can see stands in " + RichText.See("hazards") + " and " + RichText.See("limits") + ".");
            return;
        }

        body.Say($"{MemoContext.Count(memo.Cautions.Count, "caution", "cautions")} on this study, the gravest first. Each names its authority.");
        Group(memo, Severity.SettleFirst, "Settle first", "The result cannot be relied on until these are settled.", CalloutKind.Serious);
        Group(memo, Severity.Weigh, "Weigh before going on", "", CalloutKind.Caution);
        Group(memo, Severity.Note, "Good to know", "", CalloutKind.Note);
    }

    private static void Group(MemoContext memo, Severity severity, string title, string lead, CalloutKind kind)
    {
        var cautions = memo.Cautions.Where(c => c.Severity == severity).ToArray();
        if (cautions.Length == 0)
            return;
        memo.Body.Part(title, "cautions-" + severity);
        if (lead.Length > 0)
            memo.Body.Say(lead, keepWithNext: true);
        foreach (var caution in cautions)
            memo.Body.Add(new CalloutBlock(kind, caution.Title, caution.Text, RichText.Of("Authority: ") + memo.Body.Cite(caution.Authority)));
    }
}
