using System.Globalization;
using CsCheck;
using HeadToWatts.Basis.Units;

namespace HeadToWatts.Calculations.Tests.Basis.Units;

public class QuantityTextTests
{
    [Theory]
    [InlineData("24 in", Dimension.Length, 0.6096)]
    [InlineData("24in", Dimension.Length, 0.6096)]
    [InlineData("24\"", Dimension.Length, 0.6096)]
    [InlineData("24″", Dimension.Length, 0.6096)]
    [InlineData("  0.6   m ", Dimension.Length, 0.6)]
    [InlineData("18 ft 6 in", Dimension.Length, 5.6388)]
    [InlineData("18'6\"", Dimension.Length, 5.6388)]
    [InlineData("18 feet 6 inches", Dimension.Length, 5.6388)]
    [InlineData("-3 ft 6 in", Dimension.Length, -1.0668)]
    [InlineData("−3 ft 6 in", Dimension.Length, -1.0668)]
    [InlineData("+2 m", Dimension.Length, 2)]
    [InlineData(".5 m", Dimension.Length, 0.5)]
    [InlineData("5. m", Dimension.Length, 5)]
    [InlineData("1,234.5 ft", Dimension.Length, 376.2756)]
    [InlineData("1,234,567 ft", Dimension.Length, 376296.0216)]
    [InlineData("1 234 m", Dimension.Length, 1234)]
    [InlineData("1\u00a0234 m", Dimension.Length, 1234)]
    [InlineData("1\u202f234 m", Dimension.Length, 1234)]
    [InlineData("12 345.5 m", Dimension.Length, 12345.5)]
    [InlineData("1e3 mm", Dimension.Length, 1)]
    [InlineData("1.5E-3 m", Dimension.Length, 0.0015)]
    [InlineData("3.2 m3/s", Dimension.Flow, 3.2)]
    [InlineData("3.2 m³/s", Dimension.Flow, 3.2)]
    [InlineData("3.2 cumecs", Dimension.Flow, 3.2)]
    [InlineData("100 cfs", Dimension.Flow, 2.8316846592)]
    [InlineData("100 CFS", Dimension.Flow, 2.8316846592)]
    [InlineData("100 second-feet", Dimension.Flow, 2.8316846592)]
    [InlineData("200 l/s", Dimension.Flow, 0.2)]
    [InlineData("50 miner's inches (ID)", Dimension.Flow, 0.028316846592)]
    [InlineData("40 miner's inch (CA)", Dimension.Flow, 0.028316846592)]
    [InlineData("85 %", Dimension.Ratio, 0.85)]
    [InlineData("85%", Dimension.Ratio, 0.85)]
    [InlineData("57 degF", Dimension.Temperature, 13.8888888888889)]
    [InlineData("12 °C", Dimension.Temperature, 12)]
    [InlineData("10 hp", Dimension.Power, 7456.99871582)]
    [InlineData("43.4 deg", Dimension.Angle, 0.757472895365539)]
    public void Quantities_are_read_as_people_write_them(string text, Dimension dimension, double held) =>
        Assert.Equal(held, QuantityText.Read(text, dimension, null, "field").Value, Math.Abs(held) * 1e-11);

    [Theory]
    [InlineData("12,5 m", Dimension.Length, "comma")]
    [InlineData("1,234 m", Dimension.Length, "comma")]
    [InlineData("0,5 m", Dimension.Length, "comma")]
    [InlineData("1,23,456 m", Dimension.Length, "comma")]
    [InlineData("1234,567 m", Dimension.Length, "comma")]
    [InlineData("12", Dimension.Length, "unit is missing")]
    [InlineData("6 ft 2", Dimension.Length, "unit is missing")]
    [InlineData("3 psi", Dimension.Length, "measures a pressure, and this is a length")]
    [InlineData("3 ft", Dimension.Flow, "measures a length, and this is a flow")]
    [InlineData("3 furlongs", Dimension.Length, "'furlongs' is not known")]
    [InlineData("10 miner's inches", Dimension.Flow, "differs by state")]
    [InlineData("10 miner's inches (TX)", Dimension.Flow, "differs by state")]
    [InlineData("", Dimension.Length, "nothing is entered")]
    [InlineData("   ", Dimension.Length, "nothing is entered")]
    [InlineData("NaN m", Dimension.Length, "does not begin with a number")]
    [InlineData("Infinity m", Dimension.Length, "does not begin with a number")]
    [InlineData("∞ m", Dimension.Length, "does not begin with a number")]
    [InlineData("1e400 m", Dimension.Length, "cannot be held|can be held")]
    [InlineData("1e308 mi", Dimension.Length, "cannot be held|can be held")]
    [InlineData("abc", Dimension.Length, "does not begin with a number")]
    [InlineData("1.2.3 m", Dimension.Length, "not known")]
    [InlineData("3 ft -6 in", Dimension.Length, "not known")]
    [InlineData("5 kW 3 W", Dimension.Power, "not known")]
    [InlineData("1/2 in", Dimension.Length, "not known|unit is missing")]
    public void What_is_unknown_or_could_mean_two_things_is_refused(string text, Dimension dimension, string why)
    {
        var read = QuantityText.Read(text, dimension, null, "pipe.length");
        var problem = Assert.Single(read.Problems);
        Assert.Equal("pipe.length", problem.Where);
        Assert.Equal(text, problem.Read);
        Assert.Contains(why.Split('|'), w => problem.Why.Contains(w, StringComparison.Ordinal));
        Assert.Contains(dimension == Dimension.Flow ? "m3/s" : dimension == Dimension.Power ? "kW" : "ft", problem.Accepted);
    }

    [Fact]
    public void Nothing_at_all_is_refused_like_an_empty_text() =>
        Assert.Equal("nothing is entered", Assert.Single(QuantityText.Read(null, Dimension.Length, UnitTable.Metre, "x").Problems).Why);

    [Fact]
    public void A_bare_number_takes_the_unit_that_is_shown()
    {
        Assert.Equal(0.6096, QuantityText.Read("24", Dimension.Length, UnitTable.Inch, "x").Value, 1e-12);
        Assert.Equal(24, QuantityText.Read("24 m", Dimension.Length, UnitTable.Inch, "x").Value, 1e-12);
    }

    [Fact]
    public void The_refusal_of_a_flow_lists_every_state_of_the_miners_inch()
    {
        var accepted = QuantityText.Accepted(Dimension.Flow);
        foreach (var unit in UnitTable.Of(Dimension.Flow).Where(u => u.Symbol.StartsWith("miner", StringComparison.Ordinal)))
            Assert.Contains(unit.Symbol.Split('(')[1].TrimEnd(')'), accepted);
        Assert.All(UnitTable.Of(Dimension.Flow).Where(u => !u.Symbol.StartsWith("miner", StringComparison.Ordinal)), u => Assert.Contains(u.Symbol, accepted));
    }

    [Fact]
    public void Reading_does_not_depend_on_the_culture_of_the_machine()
    {
        var before = CultureInfo.CurrentCulture;
        try
        {
            CultureInfo.CurrentCulture = CultureInfo.GetCultureInfo("de-DE");
            Assert.Equal(1.5, QuantityText.Read("1.5 m", Dimension.Length, null, "x").Value);
            Assert.False(QuantityText.Read("1,5 m", Dimension.Length, null, "x").IsGood);
        }
        finally
        {
            CultureInfo.CurrentCulture = before;
        }
    }

    [Fact]
    public void Every_unit_and_spelling_reads_back_the_value_written()
    {
        var spellings = UnitTable.All.SelectMany(u => u.Aliases.Append(u.Symbol).Select(s => (Unit: u, Spelling: s))).ToArray();
        Gen.Select(Gen.Double[-1e7, 1e7], Gen.OneOf(spellings)).Sample((value, s) =>
        {
            var text = value.ToString("R", CultureInfo.InvariantCulture) + " " + s.Spelling;
            var held = s.Unit.ToHeld(value);
            var read = QuantityText.Read(text, s.Unit.Dimension, null, "x").Value;
            Assert.Equal(held, read, Math.Abs(held) * 1e-15);
            Assert.Equal(value, s.Unit.FromHeld(read), (Math.Abs(value) * 1e-12) + (s.Unit.Offset == 0 ? 0 : 1e-10));
        });
    }

    [Fact]
    public void What_is_shown_in_either_system_reads_back_to_three_digits()
    {
        Gen.Select(Gen.Double[-3.5, 5.5], Gen.OneOf(UnitSystem.US, UnitSystem.SI), Gen.OneOf(Dimension.Flow, Dimension.Length, Dimension.Pressure, Dimension.Velocity)).Sample((log, system, dimension) =>
        {
            var show = UnitDisplay.For(system);
            var unit = show.UnitOf(dimension);
            var held = unit.ToHeld(Math.Pow(10, log));
            var read = QuantityText.Read(UnitDisplay.With(held, unit), dimension, null, "x").Value;
            Assert.Equal(held, read, Math.Abs(held) * 0.0051);
        });
    }

    [Fact]
    public void Any_text_gives_a_finite_value_or_one_problem()
    {
        Gen.Select(Gen.String[Gen.Char["0123456789.,'\"-+eEftin m³/s%()∞NaN "], 0, 24], Gen.OneOf(Enum.GetValues<Dimension>())).Sample((text, dimension) =>
        {
            var read = QuantityText.Read(text, dimension, null, "x");
            if (read.IsGood)
                Assert.True(double.IsFinite(read.Value), text);
            else
                Assert.Single(read.Problems);
        });
    }
}
