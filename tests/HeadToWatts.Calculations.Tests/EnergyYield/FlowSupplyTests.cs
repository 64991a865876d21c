using CsCheck;
using HeadToWatts.EnergyYield;
using HeadToWatts.FlowRecords;

namespace HeadToWatts.Calculations.Tests.EnergyYield;

public class FlowSupplyTests
{
    [Fact]
    public void The_share_of_the_year_at_a_usable_flow_is_worked_by_hand()
    {
        // 10 to 0 m3/s straight, 1 delivered first and 2 reserved: 7 to 0 usable, reached down to Q = 3 at 70 % of the year.
        var supply = new FlowSupply(Plants.Linear(10), new WaterAllocation(ReservedFlow.Constant(2), 1));
        Assert.Equal(7, supply.UsableAtM3PerS(0), 1e-12);
        Assert.Equal(2, supply.UsableAtM3PerS(0.5), 1e-12);
        Assert.Equal(0.5, supply.ShareAtLeast(2), 1e-12);
        Assert.Equal(0.7, supply.ShareAtLeast(1e-9), 1e-9);
        Assert.Equal(0, supply.ShareAtLeast(7.01));
    }

    [Fact]
    public void Usable_flow_never_rises_and_the_curve_bends_where_the_allocation_does()
    {
        Plants.AnyCase.Sample(c =>
        {
            var supply = new FlowSupply(c.Curve, c.Allocation);
            for (var i = 1; i < supply.UsableM3PerS.Length; i++)
            {
                Assert.True(supply.UsableM3PerS[i] <= supply.UsableM3PerS[i - 1] + 1e-12);
                Assert.True(supply.Exceedance[i] >= supply.Exceedance[i - 1]);

                // Straight between two points: the usable flow at the middle is the mean of the two.
                var middle = (supply.ArrivingM3PerS[i] + supply.ArrivingM3PerS[i - 1]) / 2;
                Assert.Equal((supply.UsableM3PerS[i] + supply.UsableM3PerS[i - 1]) / 2, c.Allocation.Split(middle).UsableM3PerS, 1e-9 * Math.Max(1, middle));
            }
        }, iter: 200);
    }

    [Fact]
    public void Share_and_flow_are_each_others_inverse()
    {
        Gen.Select(Plants.AnyCase, Gen.Double[0.001, 0.999]).Sample((c, p) =>
        {
            var supply = new FlowSupply(c.Curve, c.Allocation);
            var usable = supply.UsableAtM3PerS(p);
            if (usable > 0)
            {
                Assert.True(supply.ShareAtLeast(usable * (1 - 1e-9)) >= p - 1e-6);
                Assert.True(supply.ShareAtLeast(usable * (1 + 1e-6)) <= p + 1e-3 || supply.UsableAtM3PerS(Math.Min(1, p + 1e-6)) >= usable * (1 - 1e-3));
            }
        }, iter: 200);
    }

    [Fact]
    public void Middles_of_equal_shares_follow_the_curve()
    {
        var middles = new FlowSupply(Plants.Linear(10), WaterAllocation.None).MiddlesM3PerS(4);
        Assert.Equal([8.75, 6.25, 3.75, 1.25], middles.Select(m => Math.Round(m, 12)));
    }
}
