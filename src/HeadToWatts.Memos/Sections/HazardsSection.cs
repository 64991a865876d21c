using HeadToWatts.Memos.Content;
using HeadToWatts.Studies.Cautions;

namespace HeadToWatts.Memos.Sections;

/// <summary>What can hurt, and whom to ask.</summary>
internal static class HazardsSection
{
    public static void Write(MemoContext memo)
    {
        var body = memo.Body;
        body.Section("Hazards and permits", "hazards");
        body.Say("Every scheme of this kind has these, whatever its numbers. The authorities named are those of the United States; elsewhere the national code governs. Local codes and the judgement of licensed engineers and electricians come before anything written here.");
        body.Table("tab-hazards", "Hazards.", [new("Hazard", Share: 1), new("What to do", Share: 3), new("Authority", Share: 1)], Rows(StandingCautions.Hazards));
        body.Say(RichText.Bold("Permits. ") + "The list is a start for questions, not legal advice. Law changes: check current law with the offices named and with counsel.", keepWithNext: true);
        body.Table("tab-permits", "Permits and consents commonly met; check current law.", [new("Subject", Share: 1), new("What to ask", Share: 3), new("Where it stands", Share: 1)], Rows(StandingCautions.Permits));
    }

    private static IReadOnlyList<TableRow> Rows(IReadOnlyList<StandingCaution> entries) => [.. entries.Select(e => new TableRow([RichText.Bold(e.Title), e.Text, e.Authority]))];
}
