using HeadToWatts.Basis.Quantities;
using HeadToWatts.Economics.CashFlows;

namespace HeadToWatts.Calculations.Tests.Economics.CashFlows;

internal static class Plans
{
    internal static MoneyBasis Dollars { get; } = MoneyBasis.Of("USD", 2026);

    internal static CashFlowPlan Plain { get; } = new(Dollars, PriceTerms.Real, 30, 0.06)
    {
        CapitalAmount = 500_000, AnnualEnergyKwh = 700_000, PriceAmountPerKwh = 0.08, RunningCosts = [new RunningCost("O&M", 9_000, 0.002, 0)],
    };

    internal static CashFlowPlan Rich { get; } = Plain with
    {
        InflationRate = 0.025, DegradationRate = 0.003, PriceEscalationRate = 0.01, GrantAmount = 40_000, SalvageAmount = -15_000,
        RunningCosts = [new RunningCost("O&M", 9_000, 0.002, 0.005), new RunningCost("lease", 1_200, 0, 0)],
        Replacements = [new Replacement("runner", 30_000, 12, 0)],
        Credits = [new Credit("certificates", 500, 0.004, 10, 0)],
        Loan = new Loan(250_000, 0.07, 15),
        Tax = new IncomeTax(0.21, 450_000, Depreciation.DecliningBalance(15, 1.5)),
    };
}
