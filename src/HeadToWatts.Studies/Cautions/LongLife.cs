using HeadToWatts.Basis.Units;
using HeadToWatts.Studies.Worth;

namespace HeadToWatts.Studies.Cautions;

/// <summary>More years than anyone can promise.</summary>
internal sealed class LongLife() : CautionRule("long-life", StudyStage.Money, Severity.Weigh, "A long life is counted on", MoneySources.Practice)
{
    public override string? Say(StudyResult result, UnitDisplay show) =>
        result.Money is { } money
        && money.Input.LifeYears > 50
            ? $"{money.Input.LifeYears} years of operation are counted. Water right, lease, contract and machine seldom all last beyond 50."
            : null;
}
