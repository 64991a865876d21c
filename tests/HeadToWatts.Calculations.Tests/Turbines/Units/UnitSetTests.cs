using CsCheck;
using HeadToWatts.Turbines;
using HeadToWatts.Turbines.Units;

namespace HeadToWatts.Calculations.Tests.Turbines.Units;

public class UnitSetTests
{
    private static readonly TurbineType Kaplan = TurbineTypes.Find("kaplan")!;

    private static readonly Gen<UnitSet> AnySet =
        Gen.Select(EfficiencyCurveTests.AnyCurve, Gen.Double[0, 1], Gen.Int[1, 6], Gen.Double[-2, 2])
            .Select((curve, least, count, logFlow) => new UnitSet(Kaplan, curve, least, count, Math.Pow(10, logFlow)));

    [Fact]
    public void Units_come_in_one_after_another_and_share_the_flow()
    {
        // Worked by hand: three units of 2 m3/s, least flow 0.5 m3/s each.
        var curve = EfficiencyCurve.FromTable([(0.25, 0.5), (1, 0.8)], "hand").Value;
        var set = new UnitSet(Kaplan, curve, 0.25, 3, 6);
        Assert.Equal(default, set.LoadAt(0.49));
        Assert.Equal(new UnitLoad(1, 0.5, 0.5, 0.5) { RunningShare = 1.0 / 3, LoadSpread = 3 }, set.LoadAt(0.5));
        Assert.Equal(new UnitLoad(1, 2, 2, 0.8) { RunningShare = 1.0 / 3, LoadSpread = 3 }, set.LoadAt(2));
        var two = set.LoadAt(3);
        Assert.Equal(2, two.Running);
        Assert.Equal(1.5, two.FlowPerUnitM3PerS, 1e-14);
        Assert.Equal(0.7, two.Efficiency, 1e-14);
        Assert.Equal(2, set.LoadAt(4).Running);
        Assert.Equal(3, set.LoadAt(4.001).Running);
        Assert.Equal(new UnitLoad(3, 2, 6, 0.8) { RunningShare = 1, LoadSpread = 1 }, set.LoadAt(6));
        Assert.Equal(set.LoadAt(6), set.LoadAt(60));
    }

    [Fact]
    public void A_share_below_the_least_flow_leaves_one_fewer_running_full()
    {
        // Worked by hand: two units of 4 m3/s that run from 3 m3/s up. At 5 m3/s two would have 2.5 each, so one runs full.
        var set = new UnitSet(TurbineTypes.Find("propeller")!, TurbineTypes.Find("propeller")!.Efficiency, 0.75, 2, 8);
        var load = set.LoadAt(5);
        Assert.Equal(1, load.Running);
        Assert.Equal(4, load.TurbineFlowM3PerS);
        Assert.Equal(2, set.LoadAt(6).Running);
        Assert.Equal(6, set.LoadAt(6).TurbineFlowM3PerS, 1e-14);
    }

    [Fact]
    public void No_more_water_goes_through_the_turbines_than_there_is_or_they_can_take()
    {
        Gen.Select(AnySet, Gen.Double[-0.2, 3]).Sample((set, times) =>
        {
            var usable = times * set.DesignFlowM3PerS;
            var load = set.LoadAt(usable);
            Assert.True(load.TurbineFlowM3PerS >= 0);
            Assert.True(load.TurbineFlowM3PerS <= Math.Max(usable, 0));
            Assert.True(load.TurbineFlowM3PerS <= set.DesignFlowM3PerS);
            Assert.InRange(load.Running, 0, set.UnitCount);
            Assert.Equal(load.Running * load.FlowPerUnitM3PerS, load.TurbineFlowM3PerS, 1e-12 * set.DesignFlowM3PerS);
        });
    }

    [Fact]
    public void A_running_unit_has_at_least_its_least_flow_and_at_most_its_full_flow()
    {
        Gen.Select(AnySet, Gen.Double[0, 1.5]).Sample((set, times) =>
        {
            var usable = times * set.DesignFlowM3PerS;
            var load = set.LoadAt(usable);
            if (load.Running == 0)
            {
                Assert.True(usable < set.LeastFlowM3PerS || usable <= 0);
                return;
            }

            Assert.True(load.FlowPerUnitM3PerS >= set.LeastFlowM3PerS * (1 - 1e-12));
            Assert.True(load.FlowPerUnitM3PerS <= set.UnitDesignFlowM3PerS);
            Assert.Equal(set.Efficiency.At(load.FlowPerUnitM3PerS / set.UnitDesignFlowM3PerS), load.Efficiency);
            // Water is passed by only when every unit is full, or when one more unit would be below its least flow.
            if (load.TurbineFlowM3PerS < Math.Min(usable, set.DesignFlowM3PerS) * (1 - 1e-12))
            {
                Assert.Equal(set.UnitDesignFlowM3PerS, load.FlowPerUnitM3PerS, 1e-12 * set.UnitDesignFlowM3PerS);
                Assert.True(usable / (load.Running + 1) < set.LeastFlowM3PerS);
            }
        });
    }

    [Fact]
    public void More_usable_water_never_puts_less_through_the_turbines()
    {
        Gen.Select(AnySet, Gen.Double[0, 1.5], Gen.Double[0, 1.5]).Sample((set, a, b) =>
        {
            var low = set.LoadAt(Math.Min(a, b) * set.DesignFlowM3PerS).TurbineFlowM3PerS;
            var high = set.LoadAt(Math.Max(a, b) * set.DesignFlowM3PerS).TurbineFlowM3PerS;
            Assert.True(high >= low - (1e-12 * set.DesignFlowM3PerS));
        });
    }

    [Fact]
    public void Between_breakpoints_flow_and_efficiency_are_straight_lines()
    {
        AnySet.Sample(set =>
        {
            var ends = set.FlowBreakpointsM3PerS.Prepend(0).Append(2 * set.DesignFlowM3PerS).ToList();
            for (var i = 0; i + 1 < ends.Count; i++)
            {
                // Well inside the piece, so that what happens exactly on its ends does not matter.
                UnitLoad At(double t) => set.LoadAt(ends[i] + (t * (ends[i + 1] - ends[i])));
                var (a, b, c) = (At(0.1), At(0.5), At(0.9));
                Assert.Equal(a.Running, b.Running);
                Assert.Equal(a.Running, c.Running);
                Assert.Equal((a.TurbineFlowM3PerS + c.TurbineFlowM3PerS) / 2, b.TurbineFlowM3PerS, 1e-9 * set.DesignFlowM3PerS);
                Assert.Equal((a.Efficiency + c.Efficiency) / 2, b.Efficiency, 1e-9);
            }
        });
    }

    [Fact]
    public void Breakpoints_rise_and_end_at_the_design_flow()
    {
        AnySet.Sample(set =>
        {
            var flows = set.FlowBreakpointsM3PerS;
            Assert.True(flows[0] > 0);
            for (var i = 0; i + 1 < flows.Count; i++)
                Assert.True(flows[i] < flows[i + 1]);
            Assert.Equal(set.DesignFlowM3PerS, flows[^1], 1e-12 * set.DesignFlowM3PerS);
        });
    }

    [Fact]
    public void Loading_takes_no_memory()
    {
        var set = new UnitSet(Kaplan, Kaplan.Efficiency, Kaplan.LeastFlowRatio, 3, 6);
        var sum = set.LoadAt(3).Efficiency;
        var before = GC.GetAllocatedBytesForCurrentThread();
        for (var i = 0; i <= 1000; i++)
            sum += set.LoadAt(i / 150.0).Efficiency;
        Assert.Equal(before, GC.GetAllocatedBytesForCurrentThread());
        Assert.True(sum > 0);
    }

    [Fact]
    public void Senseless_sets_are_refused()
    {
        Assert.Throws<ArgumentOutOfRangeException>(() => new UnitSet(Kaplan, Kaplan.Efficiency, 0.2, 0, 5));
        Assert.Throws<ArgumentOutOfRangeException>(() => new UnitSet(Kaplan, Kaplan.Efficiency, 1.2, 1, 5));
        Assert.Throws<ArgumentOutOfRangeException>(() => new UnitSet(Kaplan, Kaplan.Efficiency, double.NaN, 1, 5));
        Assert.Throws<ArgumentOutOfRangeException>(() => new UnitSet(Kaplan, Kaplan.Efficiency, 0.2, 1, 0));
        Assert.Throws<ArgumentOutOfRangeException>(() => new UnitSet(Kaplan, Kaplan.Efficiency, 0.2, 1, double.NaN));
    }
}
