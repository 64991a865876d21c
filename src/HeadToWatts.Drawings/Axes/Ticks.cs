using System.Globalization;

namespace HeadToWatts.Drawings.Axes;

/// <summary>A tick of an axis.</summary>
/// <param name="Value">Where it stands.</param>
/// <param name="Text">Its number; empty for a tick that has a grid line only.</param>
public readonly record struct Tick(double Value, string Text);

/// <summary>Round ticks: steps of 1, 2 or 5 times a power of ten.</summary>
public static class Ticks
{
    /// <summary>The smallest round step that gives at most so many intervals.</summary>
    /// <param name="span">Length of the axis, above zero.</param>
    /// <param name="intervals">Largest number of intervals, at least 1.</param>
    public static double Step(double span, int intervals)
    {
        if (!(span > 0) || !double.IsFinite(span))
            throw new ArgumentOutOfRangeException(nameof(span), span, "An axis needs a length above zero.");
        ArgumentOutOfRangeException.ThrowIfLessThan(intervals, 1);
        var exponent = (int)Math.Floor(Math.Log10(span / intervals));
        while (true)
        {
            foreach (var digit in (ReadOnlySpan<int>)[1, 2, 5])
            {
                var step = Times(digit, exponent);
                if (span / step <= intervals * (1 + 1e-9))
                    return step;
            }

            exponent++;
        }
    }

    /// <summary>Ticks of a linear axis from the first multiple of the step at or above the low end.</summary>
    public static IReadOnlyList<Tick> Linear(double low, double high, double step)
    {
        var ticks = new List<Tick>();
        var first = Math.Ceiling((low / step) - 1e-9);
        var last = Math.Floor((high / step) + 1e-9);
        for (var i = first; i <= last; i++)
        {
            // From a power of ten by division, so that 3 x 0.1 is 0.3.
            var value = Clean(i, step);
            ticks.Add(new Tick(value, Text(value, step)));
        }

        return ticks;
    }

    /// <summary>
    /// Ticks of a logarithmic axis: numbers at the powers of ten, at 2 and 5 too where asked, grid lines at every digit.
    /// </summary>
    /// <param name="low">Low end, above zero.</param>
    /// <param name="high">High end, above the low end.</param>
    /// <param name="withTwoAndFive">True to number 2 and 5 as well.</param>
    public static IReadOnlyList<Tick> Log(double low, double high, bool withTwoAndFive)
    {
        if (!(low > 0) || !(high > low) || !double.IsFinite(high))
            throw new ArgumentOutOfRangeException(nameof(low), low, "A logarithmic axis needs 0 < low < high.");
        var ticks = new List<Tick>();
        for (var exponent = (int)Math.Floor(Math.Log10(low) + 1e-9); ; exponent++)
        {
            for (var digit = 1; digit <= 9; digit++)
            {
                var value = Times(digit, exponent);
                if (value > high * (1 + 1e-9))
                    return ticks;
                if (value < low * (1 - 1e-9))
                    continue;
                var numbered = digit == 1 || (withTwoAndFive && digit is 2 or 5);
                ticks.Add(new Tick(value, numbered ? Text(value, Times(1, exponent)) : ""));
            }
        }
    }

    /// <summary>The number of a tick with the decimals its step needs: 0.5, 20, 1500, 15 000.</summary>
    public static string Text(double value, double step)
    {
        var decimals = Math.Clamp((int)-Math.Floor(Math.Log10(step) + 1e-9), 0, 12);
        var size = Math.Abs(value);
        var text = size.ToString((size >= 9999.5 ? "#,##0" : "0") + (decimals > 0 ? "." + new string('0', decimals) : ""), CultureInfo.InvariantCulture)
            .Replace(',', '\u202f');
        return value < 0 ? "−" + text : text;
    }

    private static double Times(double digits, int exponent) => exponent < 0 ? digits / Math.Pow(10, -exponent) : digits * Math.Pow(10, exponent);

    private static double Clean(double multiple, double step)
    {
        var exponent = (int)Math.Floor(Math.Log10(step) + 1e-9);
        var digit = Math.Round(step / Math.Pow(10, exponent));
        return multiple == 0 ? 0 : Times(multiple * digit, exponent);
    }
}
