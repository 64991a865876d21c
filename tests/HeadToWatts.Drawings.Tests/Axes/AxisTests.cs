using HeadToWatts.Drawings.Axes;

namespace HeadToWatts.Drawings.Tests.Axes;

public sealed class AxisTests
{
    public static TheoryData<double, double, int> Spans
    {
        get
        {
            var data = new TheoryData<double, double, int>();
            foreach (var high in new[] { 3e-6, 0.0047, 0.1, 0.3, 0.99, 1, 7, 9.99, 18.5, 140, 999, 1234.5, 8.76e6 })
            {
                foreach (var intervals in new[] { 2, 3, 5, 7, 10 })
                {
                    data.Add(0, high, intervals);
                    data.Add(high * 0.8, high, intervals);
                    data.Add(-high / 3, high, intervals);
                }
            }

            return data;
        }
    }

    [Theory]
    [MemberData(nameof(Spans))]
    public void Linear_ticks_are_one_two_or_five_times_a_power_of_ten_apart(double low, double high, int intervals)
    {
        var axis = Axis.Linear("x", low, high, intervals);
        var step = axis.Ticks[1].Value - axis.Ticks[0].Value;
        var digit = step / Math.Pow(10, Math.Floor(Math.Log10(step) + 1e-9));
        Assert.Contains(new[] { 1.0, 2.0, 5.0 }, d => Math.Abs(d - digit) < 1e-6);
        Assert.True(axis.Ticks.Count - 1 <= intervals);
        Assert.True(axis.Low <= low + (1e-9 * high) && axis.High >= high * (1 - 1e-9));
        for (var i = 1; i < axis.Ticks.Count; i++)
            Assert.Equal(step, axis.Ticks[i].Value - axis.Ticks[i - 1].Value, step * 1e-6);
    }

    [Theory]
    [MemberData(nameof(Spans))]
    public void The_number_at_a_tick_is_its_value_in_full(double low, double high, int intervals)
    {
        foreach (var tick in Axis.Linear("x", low, high, intervals).Ticks)
        {
            var read = double.Parse(tick.Text.Replace("\u202f", "", StringComparison.Ordinal).Replace('−', '-'), System.Globalization.CultureInfo.InvariantCulture);
            Assert.Equal(tick.Value, read, high * 1e-9);
        }
    }

    [Theory]
    [InlineData(0.0)]
    [InlineData(-1.0)]
    [InlineData(double.NaN)]
    public void A_logarithmic_axis_never_gets_zero(double low)
    {
        Assert.Throws<ArgumentOutOfRangeException>(() => Axis.Log("x", low, 10, false));
        Assert.Throws<ArgumentOutOfRangeException>(() => Axis.Log("x", 1, 10, false).Fraction(low));
    }

    [Fact]
    public void A_decade_is_as_long_as_the_next_on_a_logarithmic_axis()
    {
        var axis = Axis.Log("x", 0.5, 5000, true);
        var decade = axis.Fraction(10) - axis.Fraction(1);
        Assert.Equal(decade, axis.Fraction(1000) - axis.Fraction(100), 12);
        Assert.Equal(0.25, decade, 12);
        Assert.Equal(0, axis.Fraction(0.5), 12);
        Assert.Equal(1, axis.Fraction(5000), 12);
        Assert.Equal(50, axis.Value(axis.Fraction(50)), 9);
    }

    [Fact]
    public void Logarithmic_ticks_stand_at_every_digit_and_are_numbered_at_the_round_ones()
    {
        var ticks = Axis.Log("x", 0.8, 130, true).Ticks;
        Assert.Equal(["0.8", "0.9"], ticks.Take(2).Select(t => t.Value.ToString("0.0", System.Globalization.CultureInfo.InvariantCulture)));
        Assert.Equal(["1", "2", "5", "10", "20", "50", "100"], ticks.Where(t => t.Text.Length > 0).Select(t => t.Text));
        Assert.Equal(21, ticks.Count);
    }

    [Fact]
    public void Thousands_stand_apart_and_a_minus_is_a_minus()
    {
        Assert.Equal("15\u202f000", Ticks.Text(15000, 5000));
        Assert.Equal("5000", Ticks.Text(5000, 5000));
        Assert.Equal("−0.5", Ticks.Text(-0.5, 0.5));
        Assert.Equal("0.05", Ticks.Text(0.05, 0.05));
    }

    [Fact]
    public void An_axis_without_length_is_refused()
    {
        Assert.Throws<ArgumentOutOfRangeException>(() => Axis.Linear("x", 1, 1, 5));
        Assert.Throws<ArgumentOutOfRangeException>(() => Axis.Linear("x", 0, double.NaN, 5));
        Assert.Throws<ArgumentOutOfRangeException>(() => Axis.Linear("x", 0, double.PositiveInfinity, 5));
    }
}
