using HeadToWatts.Hydraulics.Water;

namespace HeadToWatts.Calculations.Tests.Hydraulics.Water;

public class WaterPropertiesTests
{
    private const double SquareMetresPerSquareFoot = 0.3048 * 0.3048;

    [Fact]
    public void Density_equals_the_independent_and_printed_values()
    {
        foreach (var row in CheckRows.With(IapwsIf97.Density.Id, "pressurePa"))
            row.Check(IapwsIf97.DensityKgPerM3(row["temperatureDegC"], row["pressurePa"]));
    }

    [Fact]
    public void Viscosity_equals_the_independent_and_printed_values()
    {
        foreach (var row in CheckRows.With(IapwsViscosity.Method.Id, "quantity"))
        {
            var water = WaterProperties.At(row["temperatureDegC"]);
            row.Check(row.Text("quantity") switch
            {
                "dynamicPaS" => water.DynamicViscosityPaS,
                "kinematicM2PerS" => water.KinematicViscosityM2PerS,
                "kinematicFt2PerS" => water.KinematicViscosityM2PerS / SquareMetresPerSquareFoot,
                var other => throw new ArgumentException(other),
            });
        }
    }

    [Fact]
    public void Vapour_pressure_equals_the_independent_and_printed_values()
    {
        foreach (var row in CheckRows.With(IapwsIf97.SaturationPressure.Id, "temperatureDegC"))
            row.Check(WaterProperties.At(row["temperatureDegC"]).VapourPressurePa);
    }

    [Fact]
    public void Speed_of_sound_and_bulk_modulus_equal_the_independent_values()
    {
        foreach (var row in CheckRows.With(IapwsIf97.SpeedOfSound.Id, "quantity"))
        {
            var water = WaterProperties.At(row["temperatureDegC"]);
            row.Check(row.Text("quantity") == "bulkModulusPa" ? water.BulkModulusPa : water.SpeedOfSoundMPerS);
        }
    }

    [Fact]
    public void Water_gets_thinner_and_its_vapour_pressure_rises_as_it_warms()
    {
        var all = Enumerable.Range(0, 401).Select(i => WaterProperties.At(i / 10.0)).ToArray();
        Assert.All(all.Zip(all.Skip(1)), p =>
        {
            Assert.True(p.Second.KinematicViscosityM2PerS < p.First.KinematicViscosityM2PerS);
            Assert.True(p.Second.VapourPressurePa > p.First.VapourPressurePa);
        });
    }

    [Fact]
    public void Water_is_densest_near_four_degrees() =>
        Assert.InRange(Enumerable.Range(0, 401).Select(i => WaterProperties.At(i / 10.0)).MaxBy(w => w.DensityKgPerM3)!.TemperatureDegC, 3.9, 4.1);

    [Theory]
    [InlineData(-0.01)]
    [InlineData(40.01)]
    [InlineData(double.NaN)]
    [InlineData(double.PositiveInfinity)]
    public void Temperatures_outside_0_to_40_degC_are_refused(double temperatureDegC) =>
        Assert.Throws<ArgumentOutOfRangeException>(() => WaterProperties.At(temperatureDegC));

    [Theory]
    [InlineData(10, 100)]
    [InlineData(10, 2e8)]
    [InlineData(10, double.NaN)]
    [InlineData(101, 1e7)]
    public void Steam_extreme_pressure_and_no_number_are_refused(double temperatureDegC, double pressurePa) =>
        Assert.Throws<ArgumentOutOfRangeException>(() => IapwsIf97.DensityKgPerM3(temperatureDegC, pressurePa));
}
