using CsCheck;
using HeadToWatts.Basis.Quantities;
using HeadToWatts.Economics.CashFlows;
using HeadToWatts.Economics.Costs;

namespace HeadToWatts.Calculations.Tests.Economics.CashFlows;

/// <summary>What must hold of every cash flow.</summary>
public class CashFlowTests
{
    private static readonly Gen<CashFlowPlan> AnyPlan =
        from rate in Gen.Double[0.005, 0.15]
        from life in Gen.Int[2, 60]
        from capital in Gen.Double[1e3, 1e7]
        from energy in Gen.Double[1e3, 1e7]
        from price in Gen.Double[0.01, 0.3]
        from growth in Gen.Double[-0.02, 0.04]
        from wear in Gen.Double[0, 0.01]
        from running in Gen.Double[0, 2e5]
        from every in Gen.Int[3, 25]
        select Plans.Rich with
        {
            Tax = null, LifeYears = life, DiscountRate = rate, CapitalAmount = capital, AnnualEnergyKwh = energy, PriceAmountPerKwh = price, PriceEscalationRate = growth, DegradationRate = wear,
            RunningCosts = [new RunningCost("O&M", running, 0.003, growth / 2)], Replacements = [new Replacement("runner", capital / 10, every, 0)],
        };

    [Fact]
    public void The_cash_flow_worked_by_hand_on_the_page_about_economics_holds()
    {
        // docs/economics.md: factors of four decimals, so the sums agree to some tens.
        var cost = CostBuildUp.Of(Plans.Dollars, [new CostLine("works", CostClasses.Civil, 1, "", Money.Of(300_000, Plans.Dollars), 0.2)], 0.1, new Construction(1, 0.04));
        Assert.Equal(403_842, cost.TotalAmount, 1.0);
        var measures = CashFlowMeasures.Of(CashFlow.Of(new CashFlowPlan(Plans.Dollars, PriceTerms.Real, 15, 0.05)
        {
            CapitalAmount = cost.TotalAmount, AnnualEnergyKwh = 500_000, PriceAmountPerKwh = 0.1,
            RunningCosts = [new RunningCost("O&M", 8_000, 0.002, 0)], Replacements = [new Replacement("part", 20_000, 10, 0)],
        }));
        Assert.Equal(9_448, measures.NetPresentValueAmount, 10.0);
        Assert.Equal(10.3, measures.PaybackYears!.Value, 0.05);
        Assert.Equal(0.0982, measures.LevelisedCostAmountPerKwh!.Value, 5e-5);
        Assert.Equal(measures.LevelisedCostAmountPerKwh.Value, measures.BreakEvenPriceAmountPerKwh!.Value, 1e-9);
    }

    [Fact]
    public void A_plain_plan_is_the_closed_form()
    {
        // 700 000 kWh at 0.08 less 0.002, less 9000 a year, over 30 years at 6 % (P/A 13.76483, standard factor table, five decimals).
        var measures = CashFlowMeasures.Of(CashFlow.Of(Plans.Plain));
        Assert.Equal(((700_000 * 0.078) - 9_000) * 13.76483 - 500_000, measures.NetPresentValueAmount, 1.0);
        Assert.Equal(500_000 / 45_600.0, measures.PaybackYears!.Value, 1e-9);
    }

    [Fact]
    public void The_quick_worth_equals_the_table_and_the_straight_line_equals_both() => AnyPlan.Sample(plan =>
    {
        var table = CashFlowMeasures.Of(CashFlow.Of(plan)).NetPresentValueAmount;
        var scale = Math.Abs(table) + plan.CapitalAmount;
        Assert.Equal(table, CashFlow.NetPresentValueAmount(plan, PlanChange.None), scale * 1e-12);
        Assert.Equal(table, LinearWorth.Of(plan)!.Value.NetPresentValueAmount(plan.AnnualEnergyKwh, plan.CapitalAmount), scale * 1e-11);
    });

    [Fact]
    public void The_plain_line_equals_the_walk() => AnyPlan.Sample(plan =>
    {
        var cost = plan.RunningCosts[0];
        var plain = plan with { Credits = [], Replacements = [], GrantAmount = 0, SalvageAmount = 0 };
        var line = LinearWorth.Plain(plan.PriceAmountPerKwh, cost.YearlyAmount, cost.AmountPerKwh, plan.DiscountRate, plan.LifeYears, plan.PriceEscalationRate, cost.EscalationRate, plan.DegradationRate);
        Assert.Equal(CashFlow.NetPresentValueAmount(plain, PlanChange.None), line.NetPresentValueAmount(plan.AnnualEnergyKwh, plan.CapitalAmount), (plan.CapitalAmount + plan.AnnualEnergyKwh) * 1e-9);
    });

    [Fact]
    public void At_the_break_even_price_nothing_is_gained_with_or_without_tax() => AnyPlan.Sample(plan =>
    {
        foreach (var one in new[] { plan, plan with { Tax = Plans.Rich.Tax } })
        {
            var price = CashFlowMeasures.Of(CashFlow.Of(one)).BreakEvenPriceAmountPerKwh!.Value;
            Assert.Equal(0, CashFlow.NetPresentValueAmount(one with { PriceAmountPerKwh = price }, PlanChange.None), (one.CapitalAmount + one.AnnualEnergyKwh) * 1e-7);
        }
    });

    [Fact]
    public void At_a_rate_of_return_the_worth_is_zero_and_at_no_other() => AnyPlan.Sample(plan =>
    {
        var flows = CashFlow.Of(plan).ProjectAmounts.ToArray();
        var found = RateOfReturn.Of(flows);
        Assert.True(found.Rates.Count <= found.SignChanges);
        foreach (var rate in found.Rates.Where(r => r is > -0.3 and < 2))
            Assert.Equal(0, PresentWorth.OfFlows(flows, rate), flows.Sum(Math.Abs) * Math.Pow(1 + Math.Max(0, -rate), flows.Length) * 1e-7);

        // A fine walk over the rates meets no change of sign that was not found.
        var last = Math.Sign(PresentWorth.OfFlows(flows, -0.5));
        for (var rate = -0.5; rate < 1; rate += 0.0037)
        {
            var sign = Math.Sign(PresentWorth.OfFlows(flows, rate));
            if (sign != last && sign != 0 && last != 0)
                Assert.Contains(found.Rates, r => r >= rate - 0.0038 && r <= rate + 1e-9);
            last = sign;
        }
    });

    [Fact]
    public void Real_and_nominal_terms_give_the_same_worth_when_each_is_carried_through()
    {
        // The Fisher relation: every item grown by inflation and discounted at the nominal rate is the real plan. Tax and loan are fixed nominal sums in both.
        const double f = 0.025;
        var real = Plans.Rich;
        double Nominal(double r) => ((1 + r) * (1 + f)) - 1;
        var nominal = real with
        {
            Terms = PriceTerms.Nominal, DiscountRate = Nominal(real.DiscountRate), PriceEscalationRate = Nominal(real.PriceEscalationRate),
            RunningCosts = [.. real.RunningCosts.Select(c => c with { EscalationRate = Nominal(c.EscalationRate) })],
            Replacements = [.. real.Replacements.Select(r => r with { EscalationRate = f })],
            Credits = [.. real.Credits.Select(c => c with { EscalationRate = f })],
            Tax = null,
        };
        var a = CashFlowMeasures.Of(CashFlow.Of(real with { Tax = null }));
        var b = CashFlowMeasures.Of(CashFlow.Of(nominal));
        Assert.Equal(a.NetPresentValueAmount, b.NetPresentValueAmount, 1e-6);
        Assert.Equal(a.OwnerNetPresentValueAmount, b.OwnerNetPresentValueAmount, 1e-6);
        Assert.Equal(Nominal(a.Rate.Rate!.Value), b.Rate.Rate!.Value, 1e-9);
        Assert.Equal(a.LowestDebtCover!.Value, b.LowestDebtCover!.Value, 1e-9);
    }

    [Fact]
    public void Every_unit_of_money_is_somewhere()
    {
        var flow = CashFlow.Of(Plans.Rich);
        foreach (var y in flow.Years)
        {
            Assert.Equal(y.IncomeAmount + y.CreditAmount + y.GrantAmount + y.SalvageAmount - y.RunningAmount - y.ReplacementAmount - y.CapitalAmount - y.TaxAmount, y.ProjectAmount, 1e-9);
            Assert.Equal(y.ProjectAmount + y.TaxAmount - y.OwnerTaxAmount + y.LoanAmount - y.InterestAmount - y.RepaidAmount, y.OwnerAmount, 1e-9);
        }

        // A part falls due every 12 years and not in the last.
        Assert.Equal([12, 24], flow.Years.Where(y => y.ReplacementAmount > 0).Select(y => y.Year));
        Assert.Equal(10, flow.Years.Count(y => y.CreditAmount > 0));
    }

    [Fact]
    public void A_loss_is_carried_forward_until_income_uses_it_up()
    {
        // Straight line over 2 years writes off 100 a year against an income of 60: no tax in years 1 and 2 (losses 40 and 80), none in year 3 (60 of 80), then on 40 and on all.
        var plan = new CashFlowPlan(Plans.Dollars, PriceTerms.Nominal, 5, 0.05)
        {
            CapitalAmount = 200, AnnualEnergyKwh = 60, PriceAmountPerKwh = 1, Tax = new IncomeTax(0.5, 200, Depreciation.StraightLine(2)),
        };
        Assert.Equal([0, 0, 0, 0, 20, 30], CashFlow.Of(plan).Years.Select(y => Math.Round(y.TaxAmount, 9)));
    }

    [Fact]
    public void A_loan_at_the_discount_rate_changes_nothing_for_the_owner()
    {
        // A fact of the trade (common practice, no source): borrowing at the discount rate is worth nothing.
        var plan = Plans.Plain with { Terms = PriceTerms.Nominal, Loan = new Loan(300_000, 0.06, 20) };
        var measures = CashFlowMeasures.Of(CashFlow.Of(plan));
        Assert.Equal(measures.NetPresentValueAmount, measures.OwnerNetPresentValueAmount, 1e-6);
    }

    [Fact]
    public void What_cannot_be_a_plan_is_refused()
    {
        Assert.Throws<ArgumentOutOfRangeException>(() => CashFlow.Of(Plans.Plain with { LifeYears = 0 }));
        Assert.Throws<ArgumentOutOfRangeException>(() => CashFlow.Of(Plans.Plain with { DiscountRate = double.NaN }));
        Assert.Throws<ArgumentOutOfRangeException>(() => CashFlow.Of(Plans.Plain with { CapitalAmount = double.NaN }));
        Assert.Throws<ArgumentException>(() => Depreciation.Given([0.7, 0.7]));
        Assert.Null(CashFlowMeasures.Payback([-100, 10, 10], 0));
        Assert.Empty(RateOfReturn.Of([-1.0, -2, -3]).Rates);
    }
}
