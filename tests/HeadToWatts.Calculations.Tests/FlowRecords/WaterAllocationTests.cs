using CsCheck;
using HeadToWatts.FlowRecords;

namespace HeadToWatts.Calculations.Tests.FlowRecords;

public sealed class WaterAllocationTests
{
    private static readonly Gen<WaterAllocation> Allocations = Gen.Select(
        Gen.OneOf(
            Gen.Const(ReservedFlow.None),
            Gen.Double[0, 5].Select(ReservedFlow.Constant),
            Gen.Double[0, 1].Select(ReservedFlow.PercentOfFlow),
            Gen.Const(ReservedFlow.PercentOfFlow(1))),
        Gen.OneOf(Gen.Const(0.0), Gen.Double[0, 5])).Select((r, p) => new WaterAllocation(r, p));

    [Fact]
    public void Prior_deliveries_come_first_and_the_reserve_out_of_what_is_left()
    {
        var constant = new WaterAllocation(ReservedFlow.Constant(2), 3);
        Assert.Equal(new WaterSplit(3, 2, 5), constant.Split(10));
        Assert.Equal(new WaterSplit(3, 1, 0), constant.Split(4));
        Assert.Equal(new WaterSplit(1, 0, 0), constant.Split(1));
        Assert.Equal([3, 5], constant.FlowBreakpointsM3PerS);

        // The percent is of the flow that arrives: 20 % of 10, not of 7.
        var percent = new WaterAllocation(ReservedFlow.PercentOfFlow(0.2), 3);
        Assert.Equal(new WaterSplit(3, 2, 5), percent.Split(10));
        Assert.Equal([3, 3.75], percent.FlowBreakpointsM3PerS);
        Assert.Equal(0, percent.Split(3.75).UsableM3PerS, 1e-12);
        Assert.True(WaterAllocation.None.IsNone);
        Assert.Equal(new WaterSplit(0, 0, 7), WaterAllocation.None.Split(7));
    }

    [Fact]
    public void The_split_sums_to_the_flow_is_never_negative_and_never_falls()
    {
        Gen.Select(Allocations, Gen.Double[0, 20], Gen.Double[0, 5]).Sample((allocation, flow, more) =>
        {
            var split = allocation.Split(flow);
            Assert.Equal(flow, split.PriorM3PerS + split.ReservedM3PerS + split.UsableM3PerS, 1e-14 * Math.Max(1, flow));
            Assert.True(split.PriorM3PerS >= 0 && split.ReservedM3PerS >= 0 && split.UsableM3PerS >= 0);
            Assert.True(allocation.Split(flow + more).UsableM3PerS >= split.UsableM3PerS - 1e-14);
        });
    }

    [Fact]
    public void Between_its_bends_the_usable_flow_is_straight()
    {
        Gen.Select(Allocations, Gen.Double[0, 1]).Sample((allocation, t) =>
        {
            double[] bends = [0, .. allocation.FlowBreakpointsM3PerS, 1e4];
            for (var i = 1; i < bends.Length; i++)
            {
                var flow = bends[i - 1] + (t * (bends[i] - bends[i - 1]));
                double a = allocation.Split(bends[i - 1]).UsableM3PerS, b = allocation.Split(bends[i]).UsableM3PerS;
                Assert.Equal(a + (t * (b - a)), allocation.Split(flow).UsableM3PerS, 1e-8 * Math.Max(1, bends[i]));
            }
        });
    }

    [Fact]
    public void Values_that_mean_nothing_are_refused()
    {
        Assert.Throws<ArgumentOutOfRangeException>(() => ReservedFlow.Constant(double.NaN));
        Assert.Throws<ArgumentOutOfRangeException>(() => ReservedFlow.Constant(-1));
        Assert.Throws<ArgumentOutOfRangeException>(() => ReservedFlow.PercentOfFlow(1.5));
        Assert.Throws<ArgumentOutOfRangeException>(() => new WaterAllocation(ReservedFlow.None, double.PositiveInfinity));
        Assert.Throws<ArgumentOutOfRangeException>(() => WaterAllocation.None.Split(double.NaN));
    }
}
