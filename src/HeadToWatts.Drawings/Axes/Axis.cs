namespace HeadToWatts.Drawings.Axes;

/// <summary>An axis: its ends, its ticks and where a value lies between the ends. Values are in the unit shown.</summary>
public sealed class Axis
{
    private Axis(string title, double low, double high, bool isLog, IReadOnlyList<Tick> ticks) =>
        (Title, Low, High, IsLog, Ticks) = (title, low, high, isLog, ticks);

    /// <summary>What it measures, with the unit: "flow, cfs".</summary>
    public string Title { get; }

    /// <summary>Value at its beginning.</summary>
    public double Low { get; }

    /// <summary>Value at its end.</summary>
    public double High { get; }

    /// <summary>True for a logarithmic axis.</summary>
    public bool IsLog { get; }

    /// <summary>Its ticks in rising order.</summary>
    public IReadOnlyList<Tick> Ticks { get; }

    /// <summary>A linear axis.</summary>
    /// <param name="title">What it measures, with the unit.</param>
    /// <param name="low">Lowest value to show.</param>
    /// <param name="high">Highest value to show, above the lowest.</param>
    /// <param name="intervals">Largest number of intervals between ticks.</param>
    /// <param name="toTicks">True to lengthen the axis to the next tick at both ends.</param>
    public static Axis Linear(string title, double low, double high, int intervals, bool toTicks = true)
    {
        if (!double.IsFinite(low) || !(high > low))
            throw new ArgumentOutOfRangeException(nameof(high), high, "An axis needs low < high.");
        var step = Axes.Ticks.Step(high - low, intervals);
        if (toTicks)
        {
            // Lengthening may add an interval; a wider step may then be called for.
            while (Math.Ceiling((high / step) - 1e-9) - Math.Floor((low / step) + 1e-9) > intervals)
                step = Axes.Ticks.Step(step * 1.5, 1);
            low = Math.Floor((low / step) + 1e-9) * step;
            high = Math.Ceiling((high / step) - 1e-9) * step;
        }

        return new Axis(title, low, high, false, Axes.Ticks.Linear(low, high, step));
    }

    /// <summary>A logarithmic axis.</summary>
    /// <param name="title">What it measures, with the unit.</param>
    /// <param name="low">Lowest value to show, above zero.</param>
    /// <param name="high">Highest value to show, above the lowest.</param>
    /// <param name="withTwoAndFive">True to number 2 and 5 between the powers of ten.</param>
    public static Axis Log(string title, double low, double high, bool withTwoAndFive) =>
        new(title, low, high, true, Axes.Ticks.Log(low, high, withTwoAndFive));

    /// <summary>The same axis without ticks, for one whose places have names instead of numbers.</summary>
    public Axis WithoutTicks() => new(Title, Low, High, IsLog, []);

    /// <summary>Where a value lies: 0 at the beginning, 1 at the end, outside that beyond them.</summary>
    /// <exception cref="ArgumentOutOfRangeException">The value is not above zero on a logarithmic axis.</exception>
    public double Fraction(double value)
    {
        if (!IsLog)
            return (value - Low) / (High - Low);
        return value > 0
            ? Math.Log(value / Low) / Math.Log(High / Low)
            : throw new ArgumentOutOfRangeException(nameof(value), value, "A logarithmic axis has no zero.");
    }

    /// <summary>The value at a fraction of the axis.</summary>
    public double Value(double fraction) => IsLog ? Low * Math.Pow(High / Low, fraction) : Low + (fraction * (High - Low));
}
