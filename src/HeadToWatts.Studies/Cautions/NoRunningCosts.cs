using HeadToWatts.Basis.Units;
using HeadToWatts.Studies.Worth;

namespace HeadToWatts.Studies.Cautions;

/// <summary>Nobody is paid to run it.</summary>
internal sealed class NoRunningCosts() : CautionRule("no-running-costs", StudyStage.Money, Severity.SettleFirst, "No cost of running the plant", MoneySources.Practice)
{
    public override string? Say(StudyResult result, UnitDisplay show) =>
        result.Money is { } money
        && money.HasCosts && money.Input.RunningCosts.All(c => c.YearlyAmount == 0 && c.AmountPerKwh == 0)
            ? "No operation, maintenance, insurance or lease is counted. A plant that nobody pays to run does not run."
            : null;
}
