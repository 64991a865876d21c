using HeadToWatts.Basis.Units;
using HeadToWatts.Studies.Worth;

namespace HeadToWatts.Studies.Cautions;

/// <summary>Income without a cost.</summary>
internal sealed class NoCostGiven() : CautionRule("no-cost-given", StudyStage.Money, Severity.SettleFirst, "No cost of the works", MoneySources.Practice)
{
    public override string? Say(StudyResult result, UnitDisplay show) =>
        result.Money is { } money
        && !money.HasCosts
            ? $"Income is given but no cost of the works; {MoneyText.WithYear(money.Measures.NetPresentValueAmount, money.Basis)} is what they may cost at the most, not a gain."
            : null;
}
