using HeadToWatts.Basis.Units;
using HeadToWatts.Economics.Costs;
using HeadToWatts.Studies.Worth;

namespace HeadToWatts.Studies.Cautions;

/// <summary>The grid is missing from the estimate.</summary>
internal sealed class NoInterconnectionCost() : CautionRule("no-interconnection-cost", StudyStage.Money, Severity.SettleFirst, "No cost of the interconnection", MoneySources.Practice)
{
    public override string? Say(StudyResult result, UnitDisplay show) =>
        result.Money is { } money
        && money.HasCosts && money.Input.CostLines.All(l => l.Class != CostClasses.Grid || l.Direct.Amount == 0)
            ? "No line of the estimate is for the interconnection: line, metering, protection, the utility's study and upgrades. For small plants it has cost as much as the machine; ask the utility before relying on the payback."
            : null;
}
