using CsCheck;
using HeadToWatts.FlowRecords;
using HeadToWatts.FlowRecords.Reserved;

namespace HeadToWatts.Calculations.Tests.FlowRecords.Reserved;

public sealed class ReservedTests
{
    private static readonly Gen<ReservedRule> Rules = Gen.OneOf(
        Gen.Const((ReservedRule)new NothingReserved()),
        Gen.Double[0, 3].Select(q => (ReservedRule)new ConstantReserved(q)),
        Gen.Select(Gen.Double[0, 1], Gen.Double[0, 2]).Select((r, f) => (ReservedRule)new ProportionalReserved(r, f)),
        Gen.Double[0, 3].Array[12, 12].Select(q => (ReservedRule)new MonthlyReserved(q)),
        Gen.Select(Gen.Double[0.1, 9], Gen.Int[0, TennantLevels.All.Count - 1].Select(i => TennantLevels.All[i])).Select((q, l) => (ReservedRule)new TennantReserved(q, l)),
        Gen.Double[0, 2].Select(q => (ReservedRule)new LowFlowReserved("7Q10", q)));

    private static readonly Gen<WaterAllocation> Allocations = Gen.Select(Rules, Gen.Int[1, 12], Gen.Double[0, 4], Gen.Double[0, 6], Gen.Bool)
        .Select((rule, month, prior, rate, hasRight) => new WaterAllocation(rule.ReservedIn(month), prior) { RightRateM3PerS = hasRight ? rate : null });

    [Fact]
    public void Tennants_shares_are_those_of_his_table()
    {
        foreach (var row in CheckText.Rows("tennant"))
            row.Check(new TennantReserved(1, TennantLevels.Find(row.Text("level"))!).ReservedIn((int)row["month"]).FlowM3PerS);
    }

    [Fact]
    public void A_split_sums_to_the_flow_and_the_plant_never_gets_less_from_more() =>
        Gen.Select(Allocations, Gen.Double[0, 30], Gen.Double[0, 5]).Sample((allocation, flow, more) =>
        {
            var split = allocation.Split(flow);
            Assert.Equal(flow, split.PriorM3PerS + split.ReservedM3PerS + split.UsableM3PerS, 1e-13 * Math.Max(1, flow));
            Assert.True(split.UsableM3PerS >= 0 && split.ReservedM3PerS >= -1e-14 && split.PriorM3PerS >= 0);
            Assert.True(split.UsableM3PerS <= (allocation.RightRateM3PerS ?? double.PositiveInfinity));
            Assert.True(allocation.Split(flow + more).UsableM3PerS >= split.UsableM3PerS - 1e-13);
        });

    [Fact]
    public void Between_the_bends_every_part_is_straight() =>
        Gen.Select(Allocations, Gen.Double[0, 1]).Sample((allocation, t) =>
        {
            // A share near nothing or near everything has a bend far beyond any flow.
            double[] bends = [0, .. allocation.FlowBreakpointsM3PerS.Where(q => q < 1e3), 1e3];
            Assert.Equal(bends.Order(), bends);
            for (var i = 1; i < bends.Length; i++)
            {
                var flow = bends[i - 1] + (t * (bends[i] - bends[i - 1]));
                var (a, b, at) = (allocation.Split(bends[i - 1]), allocation.Split(bends[i]), allocation.Split(flow));
                Assert.Equal(a.UsableM3PerS + (t * (b.UsableM3PerS - a.UsableM3PerS)), at.UsableM3PerS, 1e-8 * Math.Max(1, bends[i]));
                Assert.Equal(a.ReservedM3PerS + (t * (b.ReservedM3PerS - a.ReservedM3PerS)), at.ReservedM3PerS, 1e-8 * Math.Max(1, bends[i]));
            }
        });

    [Fact]
    public void A_floor_holds_at_low_flow_and_the_share_at_high_flow()
    {
        var allocation = new ProportionalReserved(0.2, 1).ForMonth(5);
        Assert.Equal(new WaterSplit(0, 0.6, 0), allocation.Split(0.6));
        Assert.Equal(new WaterSplit(0, 1, 2), allocation.Split(3));
        Assert.Equal(new WaterSplit(0, 2, 8), allocation.Split(10));
        Assert.Contains(5, allocation.FlowBreakpointsM3PerS);
        Assert.Equal(ReservedFlowKind.PercentOfFlow, new ProportionalReserved(0.2).ReservedIn(1).Kind);
    }

    [Fact]
    public void A_right_caps_what_the_plant_takes_and_the_rest_stays_in_the_stream()
    {
        var rules = new WaterRules(new ConstantReserved(1), [new Delivery("Upper ditch", 2)], new WaterRight(4, OperatingSeason.WholeYear), ReachLoss.None);
        Assert.Equal(new WaterSplit(2, 1, 2), rules.ForMonth(6).Split(5));
        Assert.Equal(new WaterSplit(2, 4, 4), rules.ForMonth(6).Split(10));
        Assert.True(rules.IsSameAllYear);
        Assert.Contains(rules.Notes, n => n.StartsWith("water right of 4 m3/s", StringComparison.Ordinal));
        Assert.Contains(WaterRules.None.Notes, n => n.Contains("no reserved flow is given", StringComparison.Ordinal));
        Assert.Contains(WaterRules.None.Notes, n => n.Contains("no water right is given", StringComparison.Ordinal));
        Assert.True(WaterRules.None.ForMonth(3).IsNone);
    }

    [Fact]
    public void The_days_of_a_right_cut_the_season()
    {
        var season = OperatingSeason.Span(new MonthDay(3, 1), new MonthDay(10, 31));
        var rules = WaterRules.None with { Right = new WaterRight(null, OperatingSeason.Span(new MonthDay(4, 15), new MonthDay(12, 31))) };
        Assert.Equal("15 Apr to 31 Oct", rules.SeasonWithin(season)!.Describe());
        Assert.Same(season, WaterRules.None.SeasonWithin(season));
        Assert.Null((rules with { Right = new WaterRight(1, OperatingSeason.Months([1])) }).SeasonWithin(season));
    }

    [Fact]
    public void Seepage_takes_a_share_and_a_constant_and_never_more_than_there_is()
    {
        var loss = new ReachLoss(0.1, 0.5);
        var record = new DailyRecord(new DateOnly(2020, 1, 1), [10, 0.4, double.NaN, 0, 5], "gauge");
        var site = loss.At(record);
        Assert.Equal([8.5, 0, double.NaN, 0, 4], site.Flows.ToArray());
        Assert.Equal(1, site.MissingCount);
        Assert.Same(record, ReachLoss.None.At(record));
    }

    // Independent: the mean of a straight curve 10 (1 - p) less a constant 2.5, closed form (Q0 - c)^2/(2 Q0).
    [Fact]
    public void The_curve_at_the_site_has_the_closed_form_mean()
    {
        var gauge = FlowDurationCurve.FromRows([new(0, 10), new(1, 0)], BeyondLastRow.Hold, "curve").Value;
        Assert.Equal(7.5 * 7.5 / 20, new ReachLoss(0, 2.5).At(gauge).MeanFlowM3PerS, 1e-12);
        Assert.Equal(4, new ReachLoss(0.2).At(gauge).MeanFlowM3PerS, 1e-12);
    }

    [Fact]
    public void Each_month_has_its_own_days_and_its_own_rule()
    {
        var first = new DateOnly(2001, 1, 1);
        var record = new DailyRecord(first, [.. Enumerable.Range(0, 730).Select(i => 3 + (2 * Math.Sin(i * 0.03)))], "gauge");
        var rules = new WaterRules(
            new MonthlyReserved([.. Enumerable.Range(1, 12).Select(m => 0.1 * m)]), [new Delivery("Turnout", [0, 0, 0, 0.5, 0.5, 1, 1, 1, 0.5, 0, 0, 0])], new WaterRight(2.5, OperatingSeason.WholeYear), new ReachLoss(0.05));
        var season = OperatingSeason.Span(new MonthDay(4, 10), new MonthDay(9, 20));
        var months = MonthlySupply.Of(record, season, rules);
        Assert.Equal([4, 5, 6, 7, 8, 9], months.Select(m => m.Month));
        Assert.Equal(season.ShareOfYear, months.Sum(m => m.ShareOfYear), 1e-12);
        Assert.False(rules.IsSameAllYear);
        Assert.Equal(0.7, months[3].Allocation.Reserved.FlowM3PerS, 1e-12);
        Assert.Equal(1, months[3].Allocation.PriorDeliveriesM3PerS);

        // Summed over the months the water of the curves is the water of the days.
        var site = rules.Seepage.At(record);
        double days = 0, curves = months.Sum(m => m.EnergyCurve.MeanFlowM3PerS);
        for (var i = 0; i < site.DayCount; i++)
            days += season.Runs(site.DateOf(i)) ? site.Flows[i] / 730 : 0;
        Assert.Equal(days, curves, 1e-12);
    }

    [Fact]
    public void Rules_that_change_by_month_say_so_and_impossible_ones_are_refused()
    {
        Assert.False(new TennantReserved(5, TennantLevels.Find("good")!).IsSameAllYear);
        Assert.True(new TennantReserved(5, TennantLevels.Find("poor")!).IsSameAllYear);
        Assert.True(new LowFlowReserved("Q95", 0.8, 0.5).IsSameAllYear);
        Assert.Equal(0.4, new LowFlowReserved("Q95", 0.8, 0.5).ForMonth(2).Reserved.FlowM3PerS, 1e-12);
        Assert.Throws<ArgumentException>(() => new MonthlyReserved([1, 2]));
        Assert.Throws<ArgumentOutOfRangeException>(() => new ConstantReserved(double.NaN));
        Assert.Throws<ArgumentOutOfRangeException>(() => new ProportionalReserved(1.1, 1));
        Assert.Throws<ArgumentOutOfRangeException>(() => new ReachLoss(1));
        Assert.Throws<ArgumentOutOfRangeException>(() => new Delivery("x", -1));
        Assert.Throws<ArgumentOutOfRangeException>(() => new ConstantReserved(1).ForMonth(0));
        Assert.Throws<ArgumentOutOfRangeException>(() => new WaterAllocation(ReservedFlow.None, 0) { RightRateM3PerS = double.NaN });
        Assert.Equal(ReservedRules.All.Count, ReservedRules.All.Select(r => r.Id).Distinct().Count());
        Assert.All(new ReservedRule[] { new NothingReserved(), new ConstantReserved(1), new ProportionalReserved(0.1), new MonthlyReserved(new double[12]), new TennantReserved(1, TennantLevels.All[0]), new LowFlowReserved("Q95", 1) },
            r => Assert.NotNull(ReservedRules.Find(r.KindId)));
    }
}
