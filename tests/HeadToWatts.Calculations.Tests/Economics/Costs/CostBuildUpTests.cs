using HeadToWatts.Basis.Quantities;
using HeadToWatts.Calculations.Tests.Economics.CashFlows;
using HeadToWatts.Economics.Costs;

namespace HeadToWatts.Calculations.Tests.Economics.Costs;

/// <summary>The cost build-up.</summary>
public class CostBuildUpTests
{
    [Fact]
    public void Interest_during_construction_is_compound_interest_worked_by_hand()
    {
        foreach (var row in CheckValueFile.OfMethod(CostMethods.InterestDuringConstruction.Id).SelectMany(f => f.Rows))
            row.Check(new Construction((int)row["years"], row["rate"]).InterestRatio * 100, "expected_percent");
    }

    [Fact]
    public void The_parts_add_up_to_the_total_worked_by_hand()
    {
        // 120 ft at 500 is 60 000, with a fifth more 72 000; a machine at 300 000 with a tenth more 330 000; engineering an eighth of 402 000 is 50 250; no interest.
        var cost = CostBuildUp.Of(Plans.Dollars, [Line("pipe", CostClasses.Pipe, 120, 500, 0.2), Line("machine", CostClasses.Machine, 1, 300_000, 0.1)], 0.125, new Construction(0, 0.06));
        Assert.Equal(360_000, cost.DirectAmount, 1e-9);
        Assert.Equal(42_000, cost.ContingencyAmount, 1e-9);
        Assert.Equal(50_250, cost.EngineeringAmount, 1e-9);
        Assert.Equal(452_250, cost.Total.Amount, 1e-9);
        Assert.Equal([CostClasses.Pipe, CostClasses.Machine], cost.Classes.Select(c => c.Class));
    }

    [Fact]
    public void Currencies_and_price_years_are_never_mixed()
    {
        var other = new CostLine("machine", CostClasses.Machine, 1, "", Money.Of(1000, MoneyBasis.Of("EUR", 2026)), 0);
        var older = other with { UnitPrice = Money.Of(1000, MoneyBasis.Of("USD", 2019)) };
        Assert.Throws<ArgumentException>(() => CostBuildUp.Of(Plans.Dollars, [other], 0, new Construction(0, 0)));
        Assert.Throws<ArgumentException>(() => CostBuildUp.Of(Plans.Dollars, [older], 0, new Construction(0, 0)));
        var brought = older with { UnitPrice = older.UnitPrice.AtPricesOf(2026, 1.3) };
        Assert.Equal(1300, CostBuildUp.Of(Plans.Dollars, [brought], 0, new Construction(0, 0)).TotalAmount, 1e-9);
        Assert.Throws<ArgumentOutOfRangeException>(() => Money.Of(double.NaN, Plans.Dollars));
        Assert.Throws<ArgumentException>(() => MoneyBasis.Of("dollars", 2026));
    }

    private static CostLine Line(string name, CostClass kind, double quantity, double price, double contingency) =>
        new(name, kind, quantity, "", Money.Of(price, Plans.Dollars), contingency);
}
