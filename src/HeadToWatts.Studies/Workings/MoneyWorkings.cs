using System.Globalization;
using HeadToWatts.Basis.Units;
using HeadToWatts.Economics.CashFlows;
using HeadToWatts.Economics.Costs;
using HeadToWatts.Studies.Worth;

namespace HeadToWatts.Studies.Workings;

/// <summary>How the figures of money came about.</summary>
internal static class MoneyWorkings
{
    internal static IEnumerable<Working> Of(StudyResult result)
    {
        if (result.Money is not { } money)
            yield break;
        var basis = money.Basis;
        var m = money.Measures;
        var plan = money.Flow.Plan;
        var costs = money.Costs;
        string A(double amount) => MoneyText.Amount(amount, basis);
        yield return new Working(
            "capital-cost", StudyStage.Money, "Capital cost", "K = (Σ q p + Σ c q p)(1 + e)(1 + I)",
            $"({A(costs.DirectAmount)} + {A(costs.ContingencyAmount)}) × (1 + {UnitDisplay.Number(costs.EngineeringRatio)}) × (1 + {UnitDisplay.Number(costs.Construction.InterestRatio)})",
            A(costs.TotalAmount),
            $"Engineering {A(costs.EngineeringAmount)}; interest during {costs.Construction.ConstructionYears} years of construction {A(costs.InterestAmount)}. {Capital(MoneyText.Terms(plan))}.",
            costs.InterestAmount > 0 ? [CostMethods.InterestDuringConstruction] : []);
        var year = money.Flow.Years[1];
        yield return new Working(
            "first-year", StudyStage.Money, "Cash of the first year", "C_1 = E p + credits − running − replacements − tax",
            $"{UnitDisplay.Energy(year.EnergyKwh)} × {MoneyText.PerKwh(year.EnergyKwh > 0 ? year.IncomeAmount / year.EnergyKwh : 0, basis)} + {A(year.CreditAmount)} − {A(year.RunningAmount)} − {A(year.ReplacementAmount)} − {A(year.TaxAmount)}",
            A(year.ProjectAmount), "Before any loan.", [CashFlowMethods.NetPresentValue]);
        yield return new Working(
            "npv", StudyStage.Money, "Net present value", CashFlowMethods.NetPresentValue.Formula,
            $"{A(money.Flow.Years[0].ProjectAmount)} today and the present worth of {plan.LifeYears} years' cash, {A(m.NetPresentValueAmount - money.Flow.Years[0].ProjectAmount)}, at {UnitDisplay.Percent(plan.DiscountRate)}",
            A(m.NetPresentValueAmount),
            $"After tax, before the loan. Spread evenly over the years it is {A(m.YearlyWorthAmount)} a year.{(plan.Loan is null ? "" : $" To the owner, with the loan: {A(m.OwnerNetPresentValueAmount)}.")}", [CashFlowMethods.NetPresentValue, CashFlowMethods.UniformSeries]);
        yield return new Working(
            "irr", StudyStage.Money, "Internal rate of return", CashFlowMethods.InternalRate.Formula,
            $"{m.Rate.SignChanges.ToString(CultureInfo.InvariantCulture)} change{(m.Rate.SignChanges == 1 ? "" : "s")} of sign in the flows; every root from −99 % to 1000 % is looked for", MoneyText.Rate(m.Rate),
            Capital(m.Rate.Statement) + ". " + (m.ModifiedRate is { } modified ? $"With costs financed and income put by at the discount rate, the modified rate is {UnitDisplay.Percent(modified)}." : ""),
            [CashFlowMethods.InternalRate, CashFlowMethods.ModifiedRate]);
        yield return new Working(
            "payback", StudyStage.Money, "Payback", "Σ C_t = 0",
            "the year in which the running sum of the cash reaches zero, its cash counted evenly over it", m.PaybackYears is { } simple ? MoneyText.Years(simple) : "never within the life",
            m.DiscountedPaybackYears is { } discounted ? $"With every year discounted: {MoneyText.Years(discounted)}." : "With every year discounted: never within the life.", [CashFlowMethods.NetPresentValue]);
        if (m.LevelisedCostAmountPerKwh is { } levelised)
        {
            yield return new Working(
                "lcoe", StudyStage.Money, "Levelised cost of energy", CashFlowMethods.LevelisedCost.Formula,
                $"present worth of capital, running costs and replacements over that of the energy, at {UnitDisplay.Percent(plan.DiscountRate)}", MoneyText.PerKwh(levelised, basis),
                $"{Capital(MoneyText.Terms(plan))}. Grants, credits, taxes and the loan are left out of it." + (m.BreakEvenPriceAmountPerKwh is { } even ? $" With them, a price of {MoneyText.PerKwh(even, basis)} breaks even." : ""), [CashFlowMethods.LevelisedCost]);
        }

        if (m.LowestDebtCover is { } cover)
        {
            yield return new Working(
                "debt-cover", StudyStage.Money, "Debt cover", "DSCR = (income − running − replacements − tax)/(interest + repayment)",
                $"lowest of the {plan.Loan!.TermYears} years of the loan; {A(plan.Loan.PaymentAmount)} a year as the bank counts it", UnitDisplay.Number(cover), $"On average {UnitDisplay.Number(m.MeanDebtCover ?? 0)}.", [CashFlowMethods.LevelLoan]);
        }
    }

    private static string Capital(string text) => char.ToUpperInvariant(text[0]) + text[1..];
}
