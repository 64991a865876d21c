using CsCheck;
using HeadToWatts.Turbines;
using HeadToWatts.Turbines.Units;

namespace HeadToWatts.Calculations.Tests.Turbines.Units;

public class HeadBehaviourTests
{
    private static readonly HillChart Chart = HillChart.From(
        [new(20, [new(0.4, 0.6), new(1, 0.8)]), new(10, [new(1, 0.9), new(0.4, 0.7)])], "chart").Value;

    [Fact]
    public void Efficiency_and_capacity_away_from_the_rated_head_follow_theory()
    {
        foreach (var row in CheckValueFile.OfMethod(HeldSpeed.Method.Id).SelectMany(f => f.Rows))
        {
            var held = new HeldSpeed(10, row.Has("runaway_ratio") ? row["runaway_ratio"] : 2, 0);
            if (row.Has("expected_factor"))
                row.Check(held.EfficiencyFactor(10 * row["head_ratio"]), "expected_factor");
            else
                row.Check(held.CapacityRatio(10 * row["head_ratio"]), "expected_capacity");
        }
    }

    [Fact]
    public void A_held_unit_is_whole_at_its_rated_head_and_shut_off_below_its_least()
    {
        foreach (var type in TurbineTypes.All)
        {
            var held = new HeldSpeed(12, (type.Runaway.Lowest + type.Runaway.Highest) / 2, 8);
            Assert.Equal(1, held.EfficiencyFactor(12), 1e-12);
            Assert.Equal(1, held.CapacityRatio(15), 1e-12);
            Assert.Equal(0, held.Efficiency(1, 0.9, 7.99));
            Assert.True(held.Efficiency(1, 0.9, 8.01) > 0 || type.Runaway.Highest < 2);
            for (var h = 8.1; h < 11.9; h += 0.1)
                Assert.True(held.EfficiencyFactor(h) <= held.EfficiencyFactor(h + 0.1));
        }

        Assert.Throws<ArgumentOutOfRangeException>(() => new HeldSpeed(10, 1, 0));
        Assert.Throws<ArgumentOutOfRangeException>(() => new HeldSpeed(double.NaN, 2, 0));
    }

    [Fact]
    public void A_chart_is_interpolated_inside()
    {
        foreach (var row in CheckValueFile.OfMethod(HillChart.Method.Id).SelectMany(f => f.Rows))
            row.Check(Chart.At(row["flow_ratio"], row["head_m"])!.Value);
    }

    [Fact]
    public void A_chart_says_nothing_outside()
    {
        Assert.Null(Chart.At(0.7, 9.9));
        Assert.Null(Chart.At(0.7, 20.1));
        Assert.Null(Chart.At(0.39, 15));
        Assert.Null(Chart.At(1.01, 15));
        Assert.Null(Chart.CurveAt(21));
        Assert.Equal(0, Chart.CapacityRatio(9));
        Assert.Equal(0, Chart.Efficiency(0.8, 0.9, 9));
    }

    [Fact]
    public void Inside_a_chart_no_efficiency_lies_beyond_its_points()
    {
        var chart = HillChart.From(
            [
                new(8, [new(0.3, 0.5), new(0.6, 0.8), new(0.85, 0.84)]),
                new(10, [new(0.35, 0.6), new(0.7, 0.91), new(1, 0.88)]),
                new(13, [new(0.4, 0.55), new(0.8, 0.87), new(1.1, 0.82)]),
            ],
            "chart").Value;
        Gen.Select(Gen.Double[8, 13], Gen.Double[0.2, 1.2]).Sample((head, ratio) =>
        {
            if (chart.At(ratio, head) is not { } efficiency)
                return;
            Assert.InRange(efficiency, 0.5, 0.91);
            if (ratio <= 1 && chart.CurveAt(head) is { } curve)
                Assert.Equal(efficiency, curve.At(ratio), 1e-9);
        });
    }

    [Fact]
    public void Every_mistake_in_a_chart_is_told()
    {
        var problems = HillChart.From([new(10, [new(0.4, 0.7)]), new(10, [new(0.4, 1.2), new(0.4, 0.8)]), new(-1, [new(2, 0.5), new(1, 0.5)])], "turbine.hillChart").Problems;
        Assert.Equal(
            ["turbine.hillChart[0].rows", "turbine.hillChart[1].head", "turbine.hillChart[1].rows[0].efficiency", "turbine.hillChart[1].rows[1].flow", "turbine.hillChart[2].head", "turbine.hillChart[2].rows[0].flow"],
            problems.Select(p => p.Where).Order(StringComparer.Ordinal));
        Assert.False(HillChart.From([], "chart").IsGood);
    }

    [Fact]
    public void Three_points_less_lower_every_point_of_a_chart_by_three()
    {
        var lower = (HillChart)Chart.Lowered(0.03);
        Assert.Equal(Chart.At(0.7, 14)!.Value - 0.03, lower.At(0.7, 14)!.Value, 1e-12);
    }
}
