using CsCheck;
using HeadToWatts.Hydraulics.Canals;
using HeadToWatts.Hydraulics.Canals.Sections;

namespace HeadToWatts.Calculations.Tests.Hydraulics.Canals;

public class CanalReachTests
{
    [Fact]
    public void The_water_line_equals_the_integral_of_its_differential_equation()
    {
        foreach (var row in CheckRows.Of(CanalReach.Method.Id, "scipy-ode"))
        {
            var end = new CanalStation(
                new TrapezoidalSection(row["bedWidthM"], row["sideSlopeRatio"]), 1000, 50, row["manningCoefficient"], row["kineticEnergyCoefficient"]);
            var line = CanalReach.ProfileUpstream(end, row["endDepthM"], row["bedSlopeRatio"], row["lengthM"], 2000, row["flowM3PerS"], TestCanals.GravityMPerS2);
            Assert.Equal(2001, line.Count);
            row.Check(line[^1].DepthM);
        }
    }

    [Fact]
    public void A_hump_without_loss_takes_the_printed_height_of_the_energy()
    {
        foreach (var row in CheckRows.Of(CanalReach.Method.Id, "vennard"))
        {
            var section = new RectangularSection(row["widthM"]);
            var before = new CanalStation(section, 0, 0, 0.013);
            var depths = SpecificEnergy.Alternate(section, row["energyM"], row["flowM3PerS"], row["gravityMPerS2"])!.Value;
            var energyM = CanalReach.EnergyAt(before, depths.SlowM!.Value, row["flowM3PerS"], row["gravityMPerS2"]).EnergyElevationM;
            row.Check(energyM - CanalReach.EnergyAt(before, row["criticalDepthM"], row["flowM3PerS"], row["gravityMPerS2"]).EnergyElevationM);
        }
    }

    [Fact]
    public void Energy_upstream_is_energy_downstream_and_the_loss() =>
        Gen.Select(TestCanals.Open, TestCanals.Open, Gen.Double[0.1, 10], Gen.Double[1.1, 3], Gen.Double[0, 0.3]).Sample((above, below, flow, factor, k) =>
        {
            var upstream = new CanalStation(above, 0, 10.05, 0.025, 1.1);
            var downstream = new CanalStation(below, 100, 10, 0.02, 1.05);
            var depthM = factor * SpecificEnergy.CriticalDepthM(below, flow, TestCanals.GravityMPerS2, 1.05)!.Value;
            if (CanalReach.UpstreamDepthM(upstream, downstream, depthM, flow, TestCanals.GravityMPerS2, k) is not { } upstreamM)
                return;
            var loss = CanalReach.LossM(upstream, upstreamM, downstream, depthM, flow, TestCanals.GravityMPerS2, k);
            var (a, b) = (CanalReach.EnergyAt(upstream, upstreamM, flow, TestCanals.GravityMPerS2), CanalReach.EnergyAt(downstream, depthM, flow, TestCanals.GravityMPerS2));
            Assert.Equal(a.EnergyElevationM, b.EnergyElevationM + loss, 1e-9);
            Assert.True(loss > 0);
            Assert.True(a.FroudeNumber <= 1 + 1e-9);
        });

    [Fact]
    public void Above_a_free_drop_the_water_rises_from_the_critical_to_the_normal_depth()
    {
        var section = new TrapezoidalSection(4, 1.5);
        var canal = new CanalFlow(section, 0.02, 0.0005).At(5, 9.81);
        var line = CanalReach.ProfileUpstream(new CanalStation(section, 0, 0, 0.02), canal.CriticalDepthM!.Value, 0.0005, 20_000, 4000, 5, 9.81);
        // Once the normal depth is reached only the last digit moves.
        Assert.All(line.Zip(line.Skip(1)), pair => Assert.True(pair.Second.DepthM >= pair.First.DepthM - 1e-12));
        Assert.Equal(canal.NormalDepthM!.Value, line[^1].DepthM, 1e-3);
        Assert.Equal(line.Select(p => p.EnergyElevationM).Order(), line.Select(p => p.EnergyElevationM));
    }

    [Fact]
    public void Drops_in_series_never_count_the_same_fall_twice()
    {
        CanalDrop upper = new("Upper", 110, 105), lower = new("Lower", 105, 101), whole = new("Whole", 110, 101);
        var series = DropSeries.Of([lower, upper], "drops").Value;
        Assert.Equal(["Upper", "Lower"], series.Drops.Select(d => d.Name));
        Assert.Equal(9, series.TotalHeadM);
        var twice = DropSeries.Of([upper, lower, whole], "drops");
        Assert.Equal(2, twice.Problems.Count);
        Assert.All(twice.Problems, p => Assert.Contains("never the head", p.Accepted, StringComparison.Ordinal));
        Assert.Equal(2, DropSeries.Of([new("A", 1, 2), new("B", double.NaN, 2)], "drops").Problems.Count);
    }
}
