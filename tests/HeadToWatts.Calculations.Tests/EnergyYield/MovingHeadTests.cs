using HeadToWatts.Basis.Quantities;
using HeadToWatts.EnergyYield;
using HeadToWatts.FlowRecords;
using HeadToWatts.Hydraulics.Friction;
using HeadToWatts.Hydraulics.Levels;
using HeadToWatts.Hydraulics.Water;
using HeadToWatts.Hydraulics.Waterways;
using HeadToWatts.Turbines;
using HeadToWatts.Turbines.Units;

namespace HeadToWatts.Calculations.Tests.EnergyYield;

public class MovingHeadTests
{
    private const double LargestM3PerS = 8;
    private static readonly SiteConditions Site = SiteConditions.At(45 * Math.PI / 180, 200, 10);
    private static readonly PowerTrain Lossless = new(1, 1, 1, 1, 0, 0, 1);
    private static readonly EfficiencyCurve Flat = EfficiencyCurve.FromTable([(0, 0.8), (1, 0.8)], "test").Value;
    private static readonly FlowDurationCurve Linear = FlowDurationCurve.FromRows([new CurvePoint(0, LargestM3PerS), new CurvePoint(1, 0)], BeyondLastRow.Hold, "test").Value;

    private static PlantDesign Design(int units = 1, double efficiencyHeadM = 5) =>
        new(Site, GrossHead.FromMetres(efficiencyHeadM), new Waterway([], FrictionFormulas.Default), new UnitSet(TurbineTypes.Find("kaplan")!, Flat, 0, units, LargestM3PerS), Lossless);

    [Fact]
    public void A_tailwater_rising_with_the_flow_matches_the_closed_form()
    {
        // Mean of gamma eta q (H0 - a q) over q = Q0 (1 - p): gamma eta (H0 Q0/2 - a Q0^2/3), by elementary integration.
        const double h0 = 5, a = 0.25;
        var tail = new RatedLevel([new LevelPoint(0, 0), new LevelPoint(10, 10 * a)]);
        var plant = new PlantCurve(Design() with { MovingHead = new MovingHead(new ConstantLevel(h0), tail, WaterAllocation.None, 7) });
        var year = YearIntegral.Over(plant, new FlowSupply(Linear, WaterAllocation.None));
        var expectedKw = Site.SpecificWeightNPerM3 / 1000 * 0.8 * ((h0 * LargestM3PerS / 2) - (a * LargestM3PerS * LargestM3PerS / 3));
        Assert.Equal(1, year.MeterPowerKw / expectedKw, 6);
    }

    [Fact]
    public void Levels_that_do_not_move_give_the_constant_head_answer()
    {
        var supply = new FlowSupply(Linear, WaterAllocation.None);
        var constant = YearIntegral.Over(new PlantCurve(Design(3)), supply);
        var moving = YearIntegral.Over(new PlantCurve(Design(3) with { MovingHead = new MovingHead(new ConstantLevel(105), new ConstantLevel(100), WaterAllocation.None, 1) }), supply);
        Assert.Equal(1, moving.MeterPowerKw / constant.MeterPowerKw, 9);
        Assert.Equal(1, moving.TurbineFlowM3PerS / constant.TurbineFlowM3PerS, 9);
        Assert.Equal(1, moving.GrossPowerKw / constant.GrossPowerKw, 9);
    }

    [Fact]
    public void A_drowned_fall_stands_at_high_water_and_runs_at_low()
    {
        var tail = new RatedLevel([new LevelPoint(0, 100), new LevelPoint(4, 100.5), new LevelPoint(8, 106)]);
        var plant = new PlantCurve(Design() with { MovingHead = new MovingHead(new ConstantLevel(105), tail, WaterAllocation.None, 7) });
        Assert.True(plant.At(3).IsRunning);
        Assert.False(plant.At(7.9).IsRunning);
        Assert.True(plant.At(7.9).GrossHeadM < 0);
        var year = YearIntegral.Over(plant, new FlowSupply(Linear, WaterAllocation.None));
        Assert.InRange(year.RunningShare, 0.01, 0.95);
    }

    [Fact]
    public void The_passing_flow_undoes_the_allocation()
    {
        foreach (var allocation in new[] { new WaterAllocation(ReservedFlow.Constant(0.7), 0.4), new WaterAllocation(ReservedFlow.PercentOfFlow(0.2), 0.4) })
        {
            var moving = new MovingHead(new ConstantLevel(1), new ConstantLevel(0), allocation, 1);
            foreach (var arriving in new[] { 2.0, 3.7, 9.1 })
            {
                var usable = allocation.Split(arriving).UsableM3PerS;
                Assert.Equal(arriving - allocation.PriorDeliveriesM3PerS, moving.PassingM3PerS(usable), 12);
            }
        }
    }

    [Fact]
    public void Months_by_themselves_add_up_to_the_year()
    {
        var flows = Enumerable.Range(0, 3653).Select(i => 4 + (3 * Math.Sin(i * 2 * Math.PI / 365.25)) + (0.3 * Math.Sin(i * 1.7))).ToList();
        var record = new DailyRecord(new DateOnly(2001, 1, 1), flows, "");
        var plant = new PlantCurve(Design(2));
        var whole = YearIntegral.Over(plant, new FlowSupply(FlowDurationCurve.FromRecord(record, PlottingPositions.Default, OperatingSeason.WholeYear), WaterAllocation.None));
        var parts = Enumerable.Range(1, 12).Select(m => YearIntegral.Over(plant, new FlowSupply(FlowDurationCurve.FromRecord(record, PlottingPositions.Default, OperatingSeason.Months([m])), WaterAllocation.None))).ToList();
        // Both are means over the same days; they differ by the ends of the plotting position and by leap days.
        Assert.Equal(1, YearIntegral.Sum(parts).MeterPowerKw / whole.MeterPowerKw, 3);
    }

    [Fact]
    public void A_weir_crest_rises_with_the_two_thirds_power_of_the_flow()
    {
        // Q = C L h^(3/2): 1.84 x 5 m x 1 m gives 9.2 m3/s at one metre of head (hand calculation).
        var crest = new WeirCrestLevel(100, 5, 1.84);
        Assert.Equal(101, crest.LevelM(9.2, 1), 12);
        Assert.Equal(100, crest.LevelM(0, 1), 12);
    }

    [Fact]
    public void A_rating_is_straight_between_its_points_and_held_outside_with_a_word()
    {
        var rating = new RatedLevel([new LevelPoint(1, 10), new LevelPoint(3, 11)]);
        Assert.Equal(10.5, rating.LevelM(2, 1), 12);
        Assert.Equal(11, rating.LevelM(9, 1), 12);
        Assert.True(rating.IsOutside(9));
        Assert.True(rating.IsOutside(0.5));
        Assert.False(rating.IsOutside(2));
        Assert.Throws<ArgumentException>(() => new RatedLevel([new LevelPoint(1, 10), new LevelPoint(1, 11)]));
    }

    [Fact]
    public void A_gauge_on_a_pipe_gives_the_energy_grade()
    {
        // Elevation 100 m, 50 m of pressure head, 0.5 m3/s in 0.5 m: V = 2.546 m/s, V^2/2g = 0.3306 m with g = 9.80665 (hand calculation).
        var level = new PressureLevel(100, new ConstantLevel(50), 0.5, 9.80665);
        Assert.Equal(150.3306, level.LevelM(0.5, 1), 4);
        Assert.Equal(150, level.LevelM(0, 1), 12);
        Assert.True(level.FollowsFlow);
    }
}
