using HeadToWatts.Basis.Units;
using HeadToWatts.Studies.Worth;

namespace HeadToWatts.Studies.Cautions;

/// <summary>None or more than one internal rate.</summary>
internal sealed class SeveralRates() : CautionRule("several-rates", StudyStage.Money, Severity.Weigh, "No single rate of return", MoneySources.Practice)
{
    public override string? Say(StudyResult result, UnitDisplay show) =>
        result.Money is { } money
        && money.HasCosts && money.HasPrice && money.Measures.Rate.Rate is null
            ? $"The flows have {money.Measures.Rate.Statement}{(money.Measures.Rate.Rates.Count > 1 ? ": " + MoneyText.Rate(money.Measures.Rate) : "")}. Judge by the net present value{(money.Measures.ModifiedRate is { } modified ? $" or the modified rate, {UnitDisplay.Percent(modified)}" : "")}."
            : null;
}
