using HeadToWatts.Basis.Units;
using HeadToWatts.Studies.Worth;

namespace HeadToWatts.Studies.Cautions;

/// <summary>The money never comes back.</summary>
internal sealed class PaybackBeyondLife() : CautionRule("payback-beyond-life", StudyStage.Money, Severity.SettleFirst, "Not paid back within its life", MoneySources.Practice)
{
    public override string? Say(StudyResult result, UnitDisplay show) =>
        result.Money is { } money
        && money.HasCosts && money.HasPrice && money.Measures.PaybackYears is null
            ? $"Even without interest the income of {money.Input.LifeYears} years does not return {MoneyText.WithYear(money.Costs.TotalAmount, money.Basis)}."
            : null;
}
