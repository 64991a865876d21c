using CsCheck;
using HeadToWatts.Turbines;
using HeadToWatts.Turbines.Units;

namespace HeadToWatts.Calculations.Tests.Turbines.Units;

/// <summary>Units of unequal size, and the split that gives most power.</summary>
public class SplitTests
{
    private static readonly Gen<UnitSet> AnySet = Gen.Select(
        Gen.OneOf([.. TurbineTypes.All]), Gen.Double[0.1, 1].Array[1, 5], Gen.Double[0, 0.6], Gen.Double[-1, 1.5],
        (type, weights, least, logFlow) =>
        {
            var sum = weights.Sum();
            return new UnitSet(type, type.Efficiency, [.. weights.Select(w => new UnitSize(w / sum, least))], Math.Pow(10, logFlow), LoadSplit.Best);
        });

    [Fact]
    public void The_best_split_is_never_below_one_after_another()
    {
        Gen.Select(AnySet, Gen.Double[0.01, 1.1]).Sample((set, share) =>
        {
            var flow = set.DesignFlowM3PerS * share;
            Assert.True(Worth(set.LoadAt(flow)) >= Worth(set.InTurnAt(flow)) * (1 - 1e-12), $"{set.Type.Id} with {set.UnitCount} units at {share}");
        }, iter: 1000);
    }

    [Fact]
    public void Each_split_keeps_every_unit_between_its_least_and_full_flow_and_spills_nothing_it_could_take()
    {
        Gen.Select(AnySet, Gen.Double[0.01, 1.2]).Sample((set, share) =>
        {
            var flow = share * set.DesignFlowM3PerS;
            foreach (var split in Enum.GetValues<LoadSplit>())
            {
                var flows = set.UnitFlowsM3PerS(flow, split);
                for (var i = 0; i < flows.Count; i++)
                {
                    var full = set.Sizes[i].ShareRatio * set.DesignFlowM3PerS;
                    Assert.True(flows[i] == 0 || (flows[i] >= set.Sizes[i].LeastFlowRatio * full * (1 - 1e-9) && flows[i] <= full * (1 + 1e-9)), $"unit {i}: {flows[i]} of {full}");
                }

                Assert.True(flows.Sum() <= Math.Min(flow, set.DesignFlowM3PerS) * (1 + 1e-9));
            }

            var load = set.LoadAt(flow);
            Assert.Equal(set.UnitFlowsM3PerS(flow, LoadSplit.Best).Sum(), load.TurbineFlowM3PerS, 1e-9 * set.DesignFlowM3PerS);
            Assert.True(load.Running == 0 || (load.LoadSpread >= 1 - 1e-9 && load.RunningShare is > 0 and <= 1));
        }, iter: 400);
    }

    [Fact]
    public void The_search_finds_what_trying_every_split_finds()
    {
        // Every split of two units in thousandths, tried one by one, against the search.
        foreach (var type in new[] { "francis", "kaplan", "propeller", "pelton" }.Select(t => TurbineTypes.Find(t)!))
        {
            var set = new UnitSet(type, type.Efficiency, [new(0.35, type.LeastFlowRatio), new(0.65, type.LeastFlowRatio)], 1, LoadSplit.Best);
            foreach (var flow in new[] { 0.2, 0.35, 0.5, 0.6, 0.75, 0.9, 1.0 })
            {
                var best = 0.0;
                for (var i = 0; i <= 1000; i++)
                {
                    var a = 0.35 * i / 1000;
                    var b = flow - a;
                    if (b < -1e-12 || b > 0.65 + 1e-12 || (a > 0 && a < 0.35 * type.LeastFlowRatio) || (b > 1e-12 && b < 0.65 * type.LeastFlowRatio))
                        continue;
                    best = Math.Max(best, (a * type.Efficiency.At(a / 0.35)) + (Math.Max(b, 0) * type.Efficiency.At(b / 0.65)));
                }

                Assert.True(Worth(set.LoadAt(flow)) >= best * (1 - 2e-3), $"{type.Id} at {flow}: {Worth(set.LoadAt(flow))} against {best}");
            }
        }
    }

    [Fact]
    public void Equal_units_given_one_by_one_do_what_a_number_of_units_does()
    {
        var type = TurbineTypes.Find("kaplan")!;
        var counted = new UnitSet(type, type.Efficiency, 0.2, 3, 6);
        var listed = new UnitSet(type, type.Efficiency, [.. Enumerable.Repeat(new UnitSize(1.0 / 3, 0.2), 3)], 6, LoadSplit.InTurn);
        Assert.True(listed.IsPlain);
        for (var q = 0.05; q < 7; q += 0.05)
            Assert.Equal(counted.LoadAt(q), listed.LoadAt(q));
    }

    [Fact]
    public void Unequal_units_come_in_in_the_order_given()
    {
        // Worked by hand: 2 and 4 m3/s, least 40 %. At 1 m3/s the small one runs at half; at 3 both run at half; at 2.2 both would be below 40 %, so the small one runs full.
        var type = TurbineTypes.Find("francis")!;
        var set = new UnitSet(type, type.Efficiency, [new(1.0 / 3, 0.4), new(2.0 / 3, 0.4)], 6, LoadSplit.InTurn);
        Assert.Equal([1, 0], set.UnitFlowsM3PerS(1, LoadSplit.InTurn).Select(f => Math.Round(f, 9)));
        Assert.Equal([1, 2], set.UnitFlowsM3PerS(3, LoadSplit.InTurn).Select(f => Math.Round(f, 9)));
        Assert.Equal([2, 0], set.UnitFlowsM3PerS(2.2, LoadSplit.InTurn).Select(f => Math.Round(f, 9)));
        Assert.Equal(0, set.LoadAt(0.7).Running);
    }

    [Fact]
    public void Sizes_that_do_not_make_a_whole_are_refused()
    {
        var type = TurbineTypes.All[0];
        Assert.Throws<ArgumentException>(() => new UnitSet(type, type.Efficiency, [new(0.5, 0.1), new(0.4, 0.1)], 1, LoadSplit.Best));
        Assert.Throws<ArgumentException>(() => new UnitSet(type, type.Efficiency, [], 1, LoadSplit.Best));
        Assert.Throws<ArgumentOutOfRangeException>(() => new UnitSet(type, type.Efficiency, [new(double.NaN, 0.1)], 1, LoadSplit.Best));
    }

    private static double Worth(UnitLoad load) => load.TurbineFlowM3PerS * load.Efficiency;
}
