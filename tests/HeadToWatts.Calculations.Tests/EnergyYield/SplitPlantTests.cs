using CsCheck;
using HeadToWatts.EnergyYield;
using HeadToWatts.EnergyYield.Electrical;
using HeadToWatts.FlowRecords;
using HeadToWatts.Hydraulics.Levels;
using HeadToWatts.Turbines.Units;

namespace HeadToWatts.Calculations.Tests.EnergyYield;

/// <summary>Plants of unequal units, with the best split, and away from their rated head.</summary>
public class SplitPlantTests
{
    [Fact]
    public void The_best_split_never_gives_less_power_than_one_after_another()
    {
        Gen.Select(Plants.AnyDesign, Gen.Double[0.15, 1].Array[2, 4], Gen.Bool, Gen.Double[0, 1.1].Array[30]).Sample((design, weights, detailed, shares) =>
        {
            var units = Units(design, weights);
            var train = detailed ? design.Train with { Generator = new GeneratorMachine(GeneratorKind.Synchronous, null, null) } : design.Train;
            var simple = new PlantCurve(design with { Units = units, Train = train });
            var best = new PlantCurve(design with { Units = units.With(LoadSplit.Best), Train = train });
            foreach (var share in shares)
            {
                var flow = share * units.DesignFlowM3PerS;
                var (a, b) = (simple.At(flow).MeterPowerKw, best.At(flow).MeterPowerKw);
                Assert.True(b >= a - (1e-6 * Math.Max(simple.BestPowerKw, 1e-9)), $"{design.Units.Type.Id} at {share}: {b} below {a}");
            }
        }, iter: 150);
    }

    [Fact]
    public void The_staircase_and_the_water_balance_of_unequal_units_add_up()
    {
        Gen.Select(Plants.AnyCase, Gen.Double[0.15, 1].Array[2, 4], Gen.Bool).Sample((c, weights, best) =>
        {
            var units = Units(c.Design, weights).With(best ? LoadSplit.Best : LoadSplit.InTurn);
            var year = AnnualEnergy.Of(new PlantCurve(c.Design with { Units = units }), new FlowSupply(c.Curve, c.Allocation));
            Assert.Equal(0, year.Water.ClosureError, 1e-9);
            var left = year.Staircase.GrossKwh;
            foreach (var step in year.Staircase.Steps)
            {
                Assert.Equal(left - step.LossKwh, step.LeftKwh, 1e-9 * Math.Max(year.Staircase.GrossKwh, 1));
                left = step.LeftKwh;
            }

            Assert.Equal(year.AnnualEnergyKwh, left, 1e-9 * Math.Max(year.Staircase.GrossKwh, 1));
        }, iter: 60);
    }

    [Fact]
    public void At_its_rated_head_a_plant_that_follows_the_head_is_the_plant_that_is_held()
    {
        var design = Plants.FlatDesign(20, 3, 0.9, 0.2, units: 2);
        var held = new PlantCurve(design);
        var follows = new PlantCurve(design with { HeadBehaviour = new HeldSpeed(20, 2, 13) });
        for (var q = 0.1; q < 4; q += 0.1)
            Assert.Equal(held.At(q).MeterPowerKw, follows.At(q).MeterPowerKw, 1e-9 * held.BestPowerKw);
    }

    [Fact]
    public void When_the_tailwater_rises_the_plant_passes_less_is_less_efficient_and_stops_at_its_least_head()
    {
        // Worked by hand: 20 m rated; at 5 m3/s the tailwater stands 7.2 m up, so 12.8 m are left, 0.64 of the rated head: capacity 0.8 × 3, efficiency 0.9 × 0.9375 for a runaway of twice the speed.
        var design = Plants.FlatDesign(20, 3, 0.9, 0.1) with
        {
            MovingHead = new MovingHead(new ConstantLevel(20), new RatedLevel([new(3, 0), new(5, 7.2), new(6, 10)]), WaterAllocation.None, 7),
        };
        var plant = new PlantCurve(design with { HeadBehaviour = new HeldSpeed(20, 2, 11) });
        var point = plant.At(5);
        Assert.Equal(2.4, point.TurbineFlowM3PerS, 1e-6);
        Assert.Equal(0.9 * 0.9375, point.TurbineEfficiency, 1e-6);
        Assert.Equal(1000 * Plants.Gravity / 1000 * 2.4 * 12.8 * 0.9 * 0.9375, point.MeterPowerKw, 1e-3);
        Assert.False(plant.At(6).IsRunning);
        Assert.Equal(3, new PlantCurve(design).At(5).TurbineFlowM3PerS, 1e-6);
    }

    [Fact]
    public void Outside_the_heads_of_a_chart_the_plant_stands()
    {
        var chart = HillChart.From([new(15, [new(0.3, 0.8), new(1, 0.9)]), new(25, [new(0.3, 0.8), new(1, 0.9)])], "chart").Value;
        var design = Plants.FlatDesign(20, 3, 0.9, 0.3) with
        {
            HeadBehaviour = chart,
            MovingHead = new MovingHead(new ConstantLevel(20), new RatedLevel([new(3, 0), new(5, 7.2)]), WaterAllocation.None, 7),
        };
        var plant = new PlantCurve(design);
        Assert.True(plant.At(3).IsRunning);
        Assert.False(plant.At(5).IsRunning);
    }

    [Fact]
    public void Starts_are_counted_from_day_to_day()
    {
        // Worked by hand: two units of 1 m3/s on a week 0, 1, 2, 2, 0, 2, 1 start 1 + 1 + 2 times in seven days.
        var design = Plants.FlatDesign(20, 2, 0.9, 0.1, units: 2);
        var record = new DailyRecord(new DateOnly(2001, 1, 1), [0, 1, 2, 2, 0, 2, 1], "week");
        var run = DailyRun.Over(new PlantCurve(design), record, OperatingSeason.WholeYear, WaterAllocation.None);
        Assert.Equal(4 * 365.0 / 7, run.UnitStartsPerYear, 1e-9);
    }

    private static UnitSet Units(PlantDesign design, double[] weights)
    {
        var sum = weights.Sum();
        var type = design.Units.Type;
        return new UnitSet(type, type.Efficiency, [.. weights.Select(w => new UnitSize(w / sum, type.LeastFlowRatio))], design.Units.DesignFlowM3PerS, LoadSplit.InTurn);
    }
}
