using HeadToWatts.Basis.Units;
using HeadToWatts.Studies.Worth;

namespace HeadToWatts.Studies.Cautions;

/// <summary>Costs without an income.</summary>
internal sealed class NoPriceGiven() : CautionRule("no-price-given", StudyStage.Money, Severity.SettleFirst, "No price of energy", MoneySources.Practice)
{
    public override string? Say(StudyResult result, UnitDisplay show) =>
        result.Money is { } money
        && !money.HasPrice
            ? $"Costs are given but no income. The price that breaks even is {(money.Measures.BreakEvenPriceAmountPerKwh is { } even ? MoneyText.PerKwh(even, money.Basis) : "not to be had without energy")}; whether anyone pays it must be asked."
            : null;
}
