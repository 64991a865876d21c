using HeadToWatts.Basis.Units;
using HeadToWatts.Studies.Worth;

namespace HeadToWatts.Studies.Cautions;

/// <summary>An estimate without room for what is not known.</summary>
internal sealed class NoContingency() : CautionRule("no-contingency", StudyStage.Money, Severity.Weigh, "Hardly any contingency", MoneySources.Practice)
{
    public override string? Say(StudyResult result, UnitDisplay show) =>
        result.Money is { } money
        && money.HasCosts && money.Costs.ContingencyAmount < 0.1 * money.Costs.DirectAmount
            ? $"Contingency is {UnitDisplay.Percent(money.Costs.ContingencyAmount / money.Costs.DirectAmount)} of the works. Before a survey and quotations, estimates are commonly raised by 15 to 30 %."
            : null;
}
