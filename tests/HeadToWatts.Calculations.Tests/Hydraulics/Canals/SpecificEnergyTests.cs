using CsCheck;
using HeadToWatts.Hydraulics.Canals;

namespace HeadToWatts.Calculations.Tests.Hydraulics.Canals;

public class SpecificEnergyTests
{
    private static readonly Gen<double> Flow = Gen.Double[0.02, 30];

    [Fact]
    public void Energies_from_outside_are_met()
    {
        foreach (var row in CheckRows.With(SpecificEnergy.Method.Id, "shape"))
        {
            var section = TestCanals.Section(row);
            var (flow, gravity) = (row["flowM3PerS"], row["gravityMPerS2"]);
            row.Check(row.Text("quantity") switch
            {
                "at normal depth" => new CanalFlow(section, row["manningCoefficient"], row["bedSlopeRatio"]).At(flow, gravity).SpecificEnergyM!.Value,
                "least energy" => SpecificEnergy.M(section, SpecificEnergy.CriticalDepthM(section, flow, gravity)!.Value, flow, gravity),
                "energy at depth" => SpecificEnergy.M(section, row["depthM"], flow, gravity),
                var other => throw new InvalidOperationException(other),
            });
        }
    }

    [Fact]
    public void Froude_numbers_from_outside_are_met()
    {
        foreach (var row in CheckRows.With(SpecificEnergy.Froude.Id, "shape"))
        {
            var section = TestCanals.Section(row);
            row.Check(row.Text("quantity") == "at depth"
                ? SpecificEnergy.FroudeNumber(section, row["depthM"], row["flowM3PerS"], row["gravityMPerS2"])
                : new CanalFlow(section, row["manningCoefficient"], row["bedSlopeRatio"]).At(row["flowM3PerS"], row["gravityMPerS2"]).FroudeNumber!.Value);
        }
    }

    [Fact]
    public void Critical_depths_from_outside_are_met()
    {
        foreach (var row in CheckRows.With(SpecificEnergy.Critical.Id, "shape"))
        {
            var section = TestCanals.Section(row);
            row.Check(row.Text("quantity") == "critical flow"
                ? SpecificEnergy.CriticalFlowM3PerS(section, row["depthM"], row["gravityMPerS2"])
                : SpecificEnergy.CriticalDepthM(section, row["flowM3PerS"], row["gravityMPerS2"])!.Value);
        }
    }

    [Fact]
    public void At_the_critical_depth_the_energy_is_least_and_the_Froude_number_one() =>
        Gen.Select(TestCanals.Open, Flow, Gen.Double[1, 1.5]).Sample((section, flow, alpha) =>
        {
            var criticalM = SpecificEnergy.CriticalDepthM(section, flow, TestCanals.GravityMPerS2, alpha)!.Value;
            double Energy(double y) => SpecificEnergy.M(section, y, flow, TestCanals.GravityMPerS2, alpha);
            Assert.Equal(1, SpecificEnergy.FroudeNumber(section, criticalM, flow, TestCanals.GravityMPerS2, alpha), 1e-10);
            Assert.True(Energy(criticalM) < Energy(criticalM * 1.01));
            Assert.True(Energy(criticalM) < Energy(criticalM * 0.99));
        });

    [Fact]
    public void Alternate_depths_have_the_energy_asked_for_on_both_sides_of_the_critical_depth() =>
        Gen.Select(TestCanals.Open, Flow, Gen.Double[1.01, 5]).Sample((section, flow, factor) =>
        {
            var criticalM = SpecificEnergy.CriticalDepthM(section, flow, TestCanals.GravityMPerS2)!.Value;
            var energyM = factor * SpecificEnergy.M(section, criticalM, flow, TestCanals.GravityMPerS2);
            var depths = SpecificEnergy.Alternate(section, energyM, flow, TestCanals.GravityMPerS2)!.Value;
            Assert.True(depths.FastM < criticalM && depths.SlowM > criticalM);
            Assert.Equal(energyM, SpecificEnergy.M(section, depths.FastM, flow, TestCanals.GravityMPerS2), 1e-10 * energyM);
            Assert.Equal(energyM, SpecificEnergy.M(section, depths.SlowM!.Value, flow, TestCanals.GravityMPerS2), 1e-10 * energyM);
            Assert.Null(SpecificEnergy.Alternate(section, energyM / factor * 0.99, flow, TestCanals.GravityMPerS2));
        });

    [Fact]
    public void Alpha_below_one_is_refused() =>
        Assert.Throws<ArgumentOutOfRangeException>(() => SpecificEnergy.CriticalDepthM(TestCanals.Surveyed, 1, 9.81, 0.9));
}
