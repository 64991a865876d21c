using HeadToWatts.Basis.Units;
using HeadToWatts.Studies.Worth;

namespace HeadToWatts.Studies.Cautions;

/// <summary>The loan leaves little room.</summary>
internal sealed class DebtCoverThin() : CautionRule("debt-cover-thin", StudyStage.Money, Severity.Weigh, "Thin debt cover", MoneySources.Practice)
{
    public override string? Say(StudyResult result, UnitDisplay show) =>
        result.Money is { } money
        && money.Measures.LowestDebtCover is { } cover && cover < 1.3
            ? $"In its worst year of the loan the cash is {UnitDisplay.Number(cover)} times the debt service{(cover < 1 ? ", which it does not meet" : "")}. Lenders commonly ask for 1.3 or more, in a dry year."
            : null;
}
