using HeadToWatts.Hydraulics.Water;

namespace HeadToWatts.Calculations.Tests.Hydraulics.Water;

public class SiteConditionsTests
{
    private const double NewtonsPerPound = 0.45359237 * 9.80665;

    [Fact]
    public void Gravity_equals_the_worked_example_and_agrees_with_other_formulas()
    {
        foreach (var row in CheckRows.With(Gravity.Method.Id, "latitudeDeg"))
            row.Check(Gravity.AtMPerS2(CheckRows.Rad(row["latitudeDeg"]), row["elevationM"]));
    }

    [Fact]
    public void Gravity_is_the_same_north_and_south_of_the_equator() =>
        Assert.Equal(Gravity.AtMPerS2(0.7, 400), Gravity.AtMPerS2(-0.7, 400));

    [Fact]
    public void Atmospheric_pressure_equals_the_standard_atmosphere_at_geometric_elevation()
    {
        foreach (var row in CheckRows.With(Atmosphere.Method.Id, "elevationM"))
            row.Check(Atmosphere.PressurePa(row["elevationM"]));
    }

    [Fact]
    public void Atmospheric_pressure_equals_the_standard_at_geopotential_altitude()
    {
        foreach (var row in CheckRows.With(Atmosphere.Method.Id, "geopotentialAltitudeM"))
            row.Check(Atmosphere.AtGeopotentialPa(row["geopotentialAltitudeM"]));
    }

    [Fact]
    public void Specific_weight_equals_the_printed_value()
    {
        foreach (var row in CheckRows.With(SiteConditions.SpecificWeight.Id, "latitudeDeg"))
        {
            var site = SiteConditions.At(CheckRows.Rad(row["latitudeDeg"]), 0, row["temperatureDegC"]);
            row.Check(site.SpecificWeightNPerM3 / NewtonsPerPound * 0.3048 * 0.3048 * 0.3048, "expectedLbfPerFt3");
        }
    }

    [Fact]
    public void A_site_names_every_method_it_used_within_range()
    {
        var uses = SiteConditions.At(0.8, 1200, 12).Uses;
        Assert.Equal(6, uses.Count);
        Assert.All(uses, u => Assert.Empty(u.OutOfRange()));
    }

    [Theory]
    [InlineData(1.6, 0)]
    [InlineData(double.NaN, 0)]
    [InlineData(0.5, 5001)]
    [InlineData(0.5, -501)]
    [InlineData(0.5, double.NaN)]
    public void Places_off_the_map_are_refused(double latitudeRad, double elevationM) =>
        Assert.Throws<ArgumentOutOfRangeException>(() => SiteConditions.At(latitudeRad, elevationM, 10));
}
