using HeadToWatts.Calculations.Tests.Hydraulics.Waterways;
using HeadToWatts.Hydraulics.Friction;
using HeadToWatts.Hydraulics.Pipes;
using HeadToWatts.Hydraulics.Surge;
using HeadToWatts.Hydraulics.Water;
using HeadToWatts.Hydraulics.Waterways;

namespace HeadToWatts.Calculations.Tests.Hydraulics.Surge;

public class SurgeTests
{
    [Fact]
    public void Wave_speeds_equal_independent_and_printed_values()
    {
        foreach (var row in CheckRows.With(WaveSpeed.Method.Id, "bulkModulusPa"))
        {
            var restraint = Enum.Parse<PipeRestraint>(row.Text("restraint"));
            row.Check(WaveSpeed.MPerS(
                row["bulkModulusPa"],
                row["densityKgPerM3"],
                row["elasticModulusPa"],
                row["diameterM"] / row["wallThicknessM"],
                WaveSpeed.RestraintCoefficient(restraint, row["poissonRatio"])));
        }
    }

    [Fact]
    public void Wave_speed_in_steel_with_water_under_pressure_equals_the_independent_value()
    {
        foreach (var row in CheckRows.With(WaveSpeed.Method.Id, "temperatureDegC"))
        {
            // The reference rows hold for water under 0.5 MPa.
            double densityKgPerM3 = IapwsIf97.DensityKgPerM3(row["temperatureDegC"], 0.5e6), soundMPerS = IapwsIf97.SpeedOfSoundMPerS(row["temperatureDegC"], 0.5e6);
            row.Check(WaveSpeed.MPerS(densityKgPerM3 * soundMPerS * soundMPerS, densityKgPerM3, 207e9, 100, 1));
        }
    }

    [Fact]
    public void Rapid_closure_equals_independent_and_printed_values()
    {
        foreach (var row in CheckRows.With(Joukowsky.Method.Id, "waveSpeedMPerS"))
            row.Check(Joukowsky.RiseM(row["waveSpeedMPerS"], row["velocityMPerS"], row["gravityMPerS2"]));
    }

    [Fact]
    public void Slow_closure_equals_independent_and_printed_values()
    {
        foreach (var row in CheckRows.With(Michaud.Method.Id, "closureTimeS"))
            row.Check(Michaud.RiseM(row["lengthM"], row["closureTimeS"], row["waveSpeedMPerS"], row["velocityMPerS"], row["gravityMPerS2"]));
    }

    [Fact]
    public void Closing_faster_than_the_wave_returns_gives_Joukowsky_and_the_two_meet_there()
    {
        var criticalS = Michaud.CriticalTimeS(500, 1000);
        Assert.Equal(1, criticalS, 1e-12);
        Assert.Equal(Joukowsky.RiseM(1000, 2, 9.81), Michaud.RiseM(500, criticalS / 2, 1000, 2, 9.81));
        Assert.Equal(Joukowsky.RiseM(1000, 2, 9.81), Michaud.RiseM(500, criticalS, 1000, 2, 9.81), 1e-9);
        Assert.True(Michaud.RiseM(500, criticalS * 2, 1000, 2, 9.81) < Joukowsky.RiseM(1000, 2, 9.81));
    }

    [Fact]
    public void The_three_restraints_give_their_own_coefficients()
    {
        Assert.Equal(1, WaveSpeed.RestraintCoefficient(PipeRestraint.ExpansionJoints, 0.3));
        Assert.Equal(0.85, WaveSpeed.RestraintCoefficient(PipeRestraint.AnchoredUpstream, 0.3), 1e-12);
        Assert.Equal(0.91, WaveSpeed.RestraintCoefficient(PipeRestraint.AnchoredThroughout, 0.3), 1e-12);
        Assert.Throws<ArgumentOutOfRangeException>(() => WaveSpeed.RestraintCoefficient(PipeRestraint.ExpansionJoints, double.NaN));
        Assert.Throws<ArgumentOutOfRangeException>(() => WaveSpeed.RestraintCoefficient((PipeRestraint)9, 0.3));
        Assert.Throws<ArgumentOutOfRangeException>(() => WaveSpeed.MPerS(2.1e9, 1000, 0, 100, 1));
        Assert.Throws<ArgumentOutOfRangeException>(() => Michaud.RiseM(500, 0, 1000, 2, 9.81));
    }

    [Fact]
    public void A_screening_adds_the_rise_to_the_standing_water_and_compares_with_the_rating()
    {
        var site = TestWaterways.Site;
        var pipe = PipeElement.Of("Penstock", 500, 0.6, PipeMaterials.Find("pvc")!) with { WallThicknessM = 0.024, PressureRatingPa = 1.0e6, EndElevationM = 600 };
        var waterway = new Waterway([pipe], FrictionFormulas.Default);
        var result = SurgeScreening.Of(waterway, 0.6, 640, 599, site);
        var element = Assert.Single(result.Elements);

        // PVC at D/e 25, anchored: the closed form with the site's water, velocity 0.6/(π 0.3^2).
        var speed = WaveSpeed.MPerS(site.Water.BulkModulusPa, site.Water.DensityKgPerM3, 3e9, 25, 1 - 0.16);
        Assert.Equal(speed, element.WaveSpeedMPerS, 1e-9);
        Assert.Equal(speed * 0.6 / (Math.PI * 0.09) / site.GravityMPerS2, element.RapidRiseM, 1e-9);
        Assert.Equal(element.RapidRiseM, element.RiseM);
        Assert.Equal(40, element.StaticHeadM, 1e-12);
        Assert.Equal(site.SpecificWeightNPerM3 * (40 + element.RiseM), element.TotalPressurePa, 1e-6);
        Assert.Equal(element.TotalPressurePa / 1.0e6, element.RatingRatio!.Value, 1e-12);
        Assert.False(element.ThicknessAssumed);
        Assert.Equal(1000 / speed, result.CriticalTimeS, 1e-9);
        Assert.Contains(result.Uses, u => u.Method == Joukowsky.Method);
        Assert.DoesNotContain(result.Uses, u => u.Method == Michaud.Method);
    }

    [Fact]
    public void Without_a_wall_thickness_the_usual_one_is_taken_and_said_so()
    {
        var waterway = new Waterway([PipeElement.Of("Penstock", 500, 0.6, PipeMaterials.Find("hdpe")!)], FrictionFormulas.Default);
        var element = Assert.Single(SurgeScreening.Of(waterway, 0.6, 640, 599, TestWaterways.Site).Elements);
        Assert.True(element.ThicknessAssumed);
        Assert.Equal(17, element.DiameterThicknessRatio);
        Assert.Null(element.RatingRatio);
    }

    [Fact]
    public void A_slow_closure_follows_the_summed_momentum_of_pipes_in_series_and_never_exceeds_the_rapid_one()
    {
        var waterway = new Waterway(
            [PipeElement.Of("Upper", 400, 0.8, TestWaterways.Steel), PipeElement.Of("Lower", 200, 0.6, TestWaterways.Steel)],
            FrictionFormulas.Default);
        var site = TestWaterways.Site;
        var slow = SurgeScreening.Of(waterway, 0.9, 640, 600, site, closureTimeS: 20);
        double upperMPerS = 0.9 / (Math.PI * 0.16), lowerMPerS = 0.9 / (Math.PI * 0.09);
        Assert.Equal(2 * 400 * upperMPerS / (site.GravityMPerS2 * 20), slow.Elements[0].RiseM, 1e-9);
        Assert.Equal(2 * ((400 * upperMPerS) + (200 * lowerMPerS)) / (site.GravityMPerS2 * 20), slow.Elements[1].RiseM, 1e-9);
        var instant = SurgeScreening.Of(waterway, 0.9, 640, 600, site, closureTimeS: 1e-6);
        Assert.All(instant.Elements, e => Assert.Equal(e.RapidRiseM, e.RiseM));
    }

    [Fact]
    public void Still_water_and_no_pipe_give_no_surge()
    {
        var waterway = new Waterway([PipeElement.Of("Penstock", 500, 0.6, TestWaterways.Steel)], FrictionFormulas.Default);
        Assert.Equal(0, SurgeScreening.Of(waterway, 0, 640, 600, TestWaterways.Site).Elements[0].RiseM);
        var none = SurgeScreening.Of(new Waterway([], FrictionFormulas.Default), 1, 640, 600, TestWaterways.Site);
        Assert.Empty(none.Elements);
        Assert.Empty(none.Uses);
        Assert.Throws<ArgumentOutOfRangeException>(() => SurgeScreening.Of(waterway, double.NaN, 640, 600, TestWaterways.Site));
        Assert.Throws<ArgumentOutOfRangeException>(() => SurgeScreening.Of(waterway, 1, 640, 600, TestWaterways.Site, closureTimeS: 0));
    }
}
