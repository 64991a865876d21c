using System.Globalization;
using HeadToWatts.Economics.CashFlows;

namespace HeadToWatts.Calculations.Tests.Economics.CashFlows;

/// <summary>The methods of a cash flow against values from outside.</summary>
public class CashFlowMethodTests
{
    [Fact]
    public void Net_present_values_are_those_of_the_textbook()
    {
        foreach (var row in Rows(CashFlowMethods.NetPresentValue.Id))
            row.Check(PresentWorth.OfFlows(Flows(row.Text("flows")), row["rate"]));
    }

    [Fact]
    public void Factors_are_those_of_the_tables()
    {
        foreach (var row in Rows(CashFlowMethods.UniformSeries.Id))
        {
            var (rate, years) = (row["rate"], (int)row["years"]);
            var factor = row.Text("factor") switch
            {
                "pa" => PresentWorth.OfUniform(rate, years),
                "ap" => PresentWorth.CapitalRecovery(rate, years),
                "pg" => PresentWorth.OfGradient(rate, years),
                "pf" => PresentWorth.OfOne(rate, years),
                "fp" => 1 / PresentWorth.OfOne(rate, years),
                "fa" => PresentWorth.FutureOfUniform(rate, years),
                "af" => 1 / PresentWorth.FutureOfUniform(rate, years),
                var other => throw new ArgumentException(other),
            };
            row.Check(factor * (row.Has("amount") ? row["amount"] : 1));
        }
    }

    [Fact]
    public void Growing_series_are_those_of_the_direct_sum()
    {
        foreach (var row in Rows(CashFlowMethods.GrowingSeries.Id))
            row.Check(PresentWorth.OfGrowing(row["growth"], row["rate"], (int)row["years"]));
    }

    [Fact]
    public void Rates_of_return_are_the_exact_roots_and_the_printed_ones_lie_a_little_higher()
    {
        foreach (var row in Rows(CashFlowMethods.InternalRate.Id).Where(r => r.Has("expected")))
        {
            var rate = RateOfReturn.Of(Flows(row.Text("flows"))).Rate;
            Assert.NotNull(rate);
            row.Check(rate.Value);
            if (row.Has("printed"))
                Assert.InRange(row["printed"] - rate.Value, 0, 3e-4);
        }
    }

    [Fact]
    public void Every_rate_of_return_is_found_where_there_are_several_and_none_where_there_is_none()
    {
        var file = CheckValueFile.OfMethod(CashFlowMethods.InternalRate.Id).Single(f => f.Path.EndsWith("several-roots.csv", StringComparison.Ordinal));
        foreach (var row in file.Rows)
        {
            var expected = Flows(row.Text("expected_all"));
            var found = RateOfReturn.Of(Flows(row.Text("flows")));
            Assert.Equal(expected.Length, found.Rates.Count);
            for (var i = 0; i < expected.Length; i++)
                Assert.Equal(expected[i], found.Rates[i], 1e-6);
            Assert.Equal(expected.Length == 1, found.Rate is not null);
        }
    }

    [Fact]
    public void Modified_rates_follow_the_factors()
    {
        foreach (var row in Rows(CashFlowMethods.ModifiedRate.Id))
            row.Check(RateOfReturn.Modified(Flows(row.Text("flows")), row["finance_rate"], row["reinvestment_rate"]) ?? double.NaN);
    }

    [Fact]
    public void The_levelised_cost_is_the_definition()
    {
        foreach (var row in Rows(CashFlowMethods.LevelisedCost.Id))
        {
            var plan = Plans.Plain with
            {
                LifeYears = (int)row["years"], DiscountRate = row["rate"], CapitalAmount = row["capital"], AnnualEnergyKwh = row["energy_kwh"], DegradationRate = row["degradation"],
                RunningCosts = [new RunningCost("O&M", row["yearly_cost"], 0, 0)],
            };
            row.Check(CashFlowMeasures.Of(CashFlow.Of(plan)).LevelisedCostAmountPerKwh ?? double.NaN);
        }
    }

    [Fact]
    public void A_level_loan_is_paid_back_as_the_amortisation_formula_says()
    {
        var loan = new Loan(1_000_000, 0.06, 20);
        foreach (var row in Rows(CashFlowMethods.LevelLoan.Id))
        {
            row.Check(row.Text("what") switch
            {
                "payment" => loan.PaymentAmount,
                "first_principal" => loan.RepaidAmount(1),
                "balance_10" => loan.BalanceAmount(10),
                _ => Enumerable.Range(1, 20).Sum(loan.InterestAmount),
            });
        }

        Assert.Equal(1_000_000, Enumerable.Range(1, 25).Sum(loan.RepaidAmount), 1e-6);
    }

    [Fact]
    public void The_real_rate_is_not_the_difference()
    {
        foreach (var row in Rows(CashFlowMethods.RealRate.Id))
            row.Check(PresentWorth.RealRate(row["nominal"], row["inflation"]));
    }

    [Fact]
    public void Declining_balance_is_that_of_the_printed_tables()
    {
        foreach (var row in Rows(CashFlowMethods.DecliningBalance.Id))
        {
            var schedule = Depreciation.DecliningBalance((int)row["class_years"], row["factor"]);
            row.Check(schedule.ShareOf((int)row["year"]));
            Assert.Equal(1, schedule.Shares.Sum(), 1e-12);
        }

        // R. Panneerselvam, example 9.1: 100000 with 20000 left after 8 years.
        Assert.Equal(10_000, (100_000 - 20_000) * Depreciation.StraightLine(8).ShareOf(3), 1e-9);
    }

    internal static double[] Flows(string text) => [.. text.Split(' ', StringSplitOptions.RemoveEmptyEntries).Select(t => double.Parse(t, CultureInfo.InvariantCulture))];

    private static IEnumerable<CheckRow> Rows(string method) => CheckValueFile.OfMethod(method).SelectMany(f => f.Rows);
}
