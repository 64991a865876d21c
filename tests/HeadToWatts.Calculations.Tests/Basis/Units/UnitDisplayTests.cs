using System.Globalization;
using CsCheck;
using HeadToWatts.Basis.Units;

namespace HeadToWatts.Calculations.Tests.Basis.Units;

public class UnitDisplayTests
{
    // Rounding to significant digits is worked by hand in each row.
    [Theory]
    [InlineData(999.6, 3, "1000")]
    [InlineData(999.4, 3, "999")]
    [InlineData(0.0118, 3, "0.0118")]
    [InlineData(0.01184, 3, "0.0118")]
    [InlineData(4060, 3, "4060")]
    [InlineData(4063, 3, "4060")]
    [InlineData(-4060, 3, "−4060")]
    [InlineData(-0.5, 3, "−0.500")]
    [InlineData(17.08, 3, "17.1")]
    [InlineData(9.996, 3, "10.0")]
    [InlineData(99.96, 3, "100")]
    [InlineData(0.9996, 3, "1.00")]
    [InlineData(0.09996, 3, "0.100")]
    [InlineData(0.00099996, 3, "0.00100")]
    [InlineData(9999.6, 3, "10 000")]
    [InlineData(12345, 3, "12 300")]
    [InlineData(12345, 5, "12 345")]
    [InlineData(1234567, 3, "1 230 000")]
    [InlineData(99960, 3, "100 000")]
    [InlineData(0, 3, "0")]
    [InlineData(-0.0, 3, "0")]
    [InlineData(1, 3, "1.00")]
    [InlineData(2.5, 1, "3")]
    [InlineData(4.6e-5, 3, "4.6 × 10⁻⁵")]
    [InlineData(-4.6e-5, 3, "−4.6 × 10⁻⁵")]
    [InlineData(1.5e-6, 3, "1.5 × 10⁻⁶")]
    [InlineData(9.999e-5, 3, "1 × 10⁻⁴")]
    [InlineData(9.999e-7, 3, "1 × 10⁻⁶")]
    [InlineData(1.306e-6, 4, "1.306 × 10⁻⁶")]
    [InlineData(5e-324, 3, "4.94 × 10⁻³²⁴")]
    [InlineData(double.NaN, 3, "–")]
    [InlineData(double.PositiveInfinity, 3, "∞")]
    [InlineData(double.NegativeInfinity, 3, "−∞")]
    public void Numbers_are_shown_to_so_many_digits(double value, int digits, string shown) =>
        Assert.Equal(shown, UnitDisplay.Number(value, digits).Replace('\u202f', ' '));

    [Fact]
    public void Thousands_stand_apart_by_a_narrow_no_break_space_from_five_digits_up()
    {
        Assert.Equal("12\u202f300", UnitDisplay.Number(12345));
        Assert.DoesNotContain('\u202f', UnitDisplay.Number(9990));
    }

    [Fact]
    public void The_number_shown_lies_within_half_a_unit_of_its_last_digit()
    {
        Gen.Select(Gen.Double[-9, 12], Gen.Bool, Gen.Int[1, 6]).Sample((log, negative, digits) =>
        {
            var value = Math.Pow(10, log) * (negative ? -1 : 1);
            var shown = UnitDisplay.Number(value, digits);
            Assert.Equal(value, Parse(shown), Math.Abs(value) * 0.500001 * Math.Pow(10, 1 - digits));
        });
    }

    [Fact]
    public void Two_systems_show_the_same_length_in_their_own_units()
    {
        var (us, si) = (UnitDisplay.For(UnitSystem.US), UnitDisplay.For(UnitSystem.SI));

        // 5.6388 m is 18.5 ft exactly; 0.6096 m is 24 in; 68.947573 kPa is 10 psi; 1 cfs is 0.0283 m3/s and 449 gpm.
        Assert.Equal("18.5 ft", us.Length(5.6388));
        Assert.Equal("5.64 m", si.Length(5.6388));
        Assert.Equal("24.0 in", us.Diameter(0.6096));
        Assert.Equal("610 mm", si.Diameter(0.6096));
        Assert.Equal("10.0 psi", us.Pressure(68_947.57));
        Assert.Equal("68.9 kPa", si.Pressure(68_947.57));
        Assert.Equal("0.0460 mm", us.Roughness(4.6e-5));
        Assert.Equal("10.0 ft/s", us.Velocity(3.048));
        Assert.Equal("50.0 degF", us.Temperature(10));
        Assert.Equal("10.0 degC", si.Temperature(10));
        Assert.Equal("1.00 acre-ft", us.Volume(1233.48183754752));
    }

    [Fact]
    public void Small_flows_are_shown_in_the_small_unit()
    {
        Assert.Equal("449 gpm", UnitDisplay.For(UnitSystem.US, 0.028).Flow(0.028316846592));
        Assert.Equal("10.0 cfs", UnitDisplay.For(UnitSystem.US, 1).Flow(0.28316846592));
        Assert.Equal("28.3 L/s", UnitDisplay.For(UnitSystem.SI, 0.028).Flow(0.028316846592));
        Assert.Equal("0.283 m3/s", UnitDisplay.For(UnitSystem.SI, 1).Flow(0.28316846592));
    }

    [Fact]
    public void Power_energy_and_percent_choose_a_readable_unit()
    {
        Assert.Equal("850 W", UnitDisplay.Power(0.85));
        Assert.Equal("85.0 kW", UnitDisplay.Power(85));
        Assert.Equal("0 kW", UnitDisplay.Power(0));
        Assert.Equal("99\u202f900 kWh", UnitDisplay.Energy(99_940));
        Assert.Equal("1230 MWh", UnitDisplay.Energy(1_234_000));
        Assert.Equal("45.1 %", UnitDisplay.Percent(0.451));
    }

    [Fact]
    public void Every_dimension_has_a_unit_in_both_systems() =>
        Assert.All(Enum.GetValues<Dimension>(), d =>
        {
            Assert.Equal(d, UnitDisplay.For(UnitSystem.US).UnitOf(d).Dimension);
            Assert.Equal(d, UnitDisplay.For(UnitSystem.SI).UnitOf(d).Dimension);
        });

    [Fact]
    public void What_is_shown_does_not_depend_on_the_culture_of_the_machine()
    {
        var before = CultureInfo.CurrentCulture;
        try
        {
            CultureInfo.CurrentCulture = CultureInfo.GetCultureInfo("de-DE");
            Assert.Equal("18.5 ft", UnitDisplay.For(UnitSystem.US).Length(5.6388));
        }
        finally
        {
            CultureInfo.CurrentCulture = before;
        }
    }

    private static double Parse(string shown)
    {
        var plain = shown.Replace("\u202f", "", StringComparison.Ordinal).Replace('−', '-');
        var parts = plain.Split(" × 10");
        var mantissa = double.Parse(parts[0], CultureInfo.InvariantCulture);
        if (parts.Length == 1)
            return mantissa;
        var exponent = string.Concat(parts[1].Select(c => c == '⁻' ? "-" : "⁰¹²³⁴⁵⁶⁷⁸⁹".IndexOf(c, StringComparison.Ordinal).ToString(CultureInfo.InvariantCulture)));
        return mantissa * Math.Pow(10, int.Parse(exponent, CultureInfo.InvariantCulture));
    }
}
