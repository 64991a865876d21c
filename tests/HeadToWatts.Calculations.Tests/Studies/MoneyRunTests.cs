using HeadToWatts.Basis.Quantities;
using HeadToWatts.Economics.CashFlows;
using HeadToWatts.Economics.Costs;
using HeadToWatts.Studies.Inputs;
using HeadToWatts.Studies.Worth;

namespace HeadToWatts.Calculations.Tests.Studies;

/// <summary>The study's energy and the user's money together.</summary>
public class MoneyRunTests
{
    private static readonly MoneyBasis Dollars = MoneyBasis.Of("USD", 2026);

    /// <summary>Nothing is missing: 2 300 000 of works, 25 % contingency, a tenth of engineering, running costs, replacements.</summary>
    internal static MoneyInput Whole { get; } = new(Dollars, PriceTerms.Real, 30, 0.06)
    {
        PriceAmountPerKwh = 0.09,
        CostLines = [Line("intake", CostClasses.Civil, 700_000), Line("pipe", CostClasses.Pipe, 300_000), Line("machine", CostClasses.Machine, 1_000_000), Line("line", CostClasses.Grid, 300_000)],
        EngineeringRatio = 0.1,
        RunningCosts = [new RunningCost("O&M", 40_000, 0.002, 0)],
        Replacements = [new Replacement("runner", 100_000, 15, 0)],
    };

    [Fact]
    public void The_money_of_a_study_rests_on_its_own_energy()
    {
        var result = (TestStudies.Quiet with { Money = Whole }).Run();
        var money = result.Money!;
        Assert.Equal(2_300_000 * 1.25 * 1.1, money.Costs.TotalAmount, 1e-6);
        Assert.Equal(result.Energy.Annual.AnnualEnergyKwh * 0.09, money.Flow.Years[1].IncomeAmount, 1e-6);
        Assert.Contains(result.MethodsUsed, u => u.Method.Id == CashFlowMethods.InternalRate.Id);
        Assert.Null(TestStudies.Quiet.Run().Money);
    }

    [Fact]
    public void A_bar_is_the_study_with_that_one_thing_changed()
    {
        var money = (TestStudies.Quiet with { Money = Whole }).Run().Money!;
        var dearer = (TestStudies.Quiet with { Money = Whole with { CostLines = [.. Whole.CostLines.Select(l => l with { UnitPrice = l.UnitPrice.Times(1.2) })] } }).Run().Money!;
        Assert.Equal(dearer.Measures.NetPresentValueAmount, Bar("capital").WorseAmount, 1);
        var cheaper = (TestStudies.Quiet with { Money = Whole with { PriceAmountPerKwh = 0.09 * 0.8 } }).Run().Money!;
        Assert.Equal(cheaper.Measures.NetPresentValueAmount, Bar("price").WorseAmount, 1);
        var rate = (TestStudies.Quiet with { Money = Whole with { DiscountRate = 0.08 } }).Run().Money!;
        Assert.Equal(rate.Measures.NetPresentValueAmount, Bar("discount").WorseAmount, 1);
        var life = (TestStudies.Quiet with { Money = Whole with { LifeYears = 40 } }).Run().Money!;
        Assert.Equal(life.Measures.NetPresentValueAmount, Bar("life").BetterAmount, 1);
        var idle = (TestStudies.Quiet with { Money = Whole, Train = TestStudies.Quiet.Train with { Availability = 0.92 } }).Run().Money!;
        Assert.Equal(idle.Measures.NetPresentValueAmount, Bar("availability").WorseAmount, 1);

        // A tenth less head with the same pipe and the same units costs more than a tenth of the power but not of the loss: between 3 % and 4 % for 3 % of head.
        var head = Bar("head");
        var perShare = Bar("energy").SwingAmount / (2 * MoneyRun.EnergySwingRatio);
        Assert.InRange((money.Measures.NetPresentValueAmount - head.WorseAmount) / perShare, 0.03, 0.05);
        Assert.Equal(money.Bars.OrderByDescending(b => Math.Abs(b.SwingAmount)).Select(b => b.Id), money.Bars.Select(b => b.Id));

        SensitivityBar Bar(string id) => money.Bars.Single(b => b.Id == id);
    }

    [Theory]
    [InlineData(0.09, Verdict.WorthStudy, "Worth a feasibility study")]
    [InlineData(0.055, Verdict.MeasureFirst, "price of energy (−20 %)")]
    [InlineData(0.045, Verdict.MeasureFirst, "would make it pay")]
    [InlineData(0.02, Verdict.NotWorth, "It would take")]
    public void The_plain_answer_follows_the_numbers(double price, Verdict verdict, string words)
    {
        var money = (TestStudies.Quiet with { Money = Whole with { PriceAmountPerKwh = price } }).Run().Money!;
        Assert.Equal(verdict, money.Answer.Verdict);
        Assert.Contains(words, money.Answer.Headline + ". " + money.Answer.Text, StringComparison.Ordinal);
        Assert.Equal(money.Measures.NetPresentValueAmount < 0, money.Answer.Text.Contains("falls short", StringComparison.Ordinal));
    }

    [Fact]
    public void Without_a_cost_or_a_price_the_answer_says_what_is_missing_and_what_it_may_be()
    {
        var free = (TestStudies.Quiet with { Money = Whole with { CostLines = [] } }).Run().Money!;
        Assert.Equal(Verdict.NotYet, free.Answer.Verdict);
        Assert.Contains("may cost no more than that", free.Answer.Text, StringComparison.Ordinal);
        Assert.Empty(free.Bars);

        var unpaid = (TestStudies.Quiet with { Money = Whole with { PriceAmountPerKwh = null } }).Run().Money!;
        Assert.Equal(Verdict.NotYet, unpaid.Answer.Verdict);
        var even = unpaid.Measures.BreakEvenPriceAmountPerKwh!.Value;
        Assert.Equal(0, (TestStudies.Quiet with { Money = Whole with { PriceAmountPerKwh = even } }).Run().Money!.Measures.NetPresentValueAmount, 1);
    }

    [Fact]
    public void A_short_record_with_a_thin_margin_asks_for_measurements_first()
    {
        var thin = MoneyRun.Of(Whole with { PriceAmountPerKwh = 0.052, CostLines = [.. Whole.CostLines] }, 5_500_000, 0.95, null, null, new FlowEvidence(0));
        Assert.Equal(Verdict.MeasureFirst, thin.Answer.Verdict);
        var sure = MoneyRun.Of(Whole, 5_500_000, 0.95, null, null, new FlowEvidence(12));
        Assert.Equal(Verdict.WorthStudy, sure.Answer.Verdict);
        Assert.Equal(0, CashFlow.NetPresentValueAmount(sure.Flow.Plan, PlanChange.None with { EnergyRatio = 1 - sure.EnergyMargin!.Value }), 1);
    }

    [Fact]
    public void An_account_takes_the_place_of_the_flat_price_and_must_be_of_the_same_currency_and_year()
    {
        var account = MoneyRun.Of(Whole, 1_000_000, 0.95, Money.Of(123_000, Dollars), null, new FlowEvidence(0));
        Assert.Equal(123_000, account.Flow.Years[1].IncomeAmount, 1e-6);
        Assert.Throws<ArgumentException>(() => MoneyRun.Of(Whole, 1_000_000, 0.95, Money.Of(123_000, MoneyBasis.Of("EUR", 2026)), null, new FlowEvidence(0)));
    }

    private static CostLine Line(string name, CostClass kind, double price) => new(name, kind, 1, "", Money.Of(price, Dollars), 0.25);
}
