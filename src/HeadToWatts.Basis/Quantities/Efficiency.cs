namespace HeadToWatts.Basis.Quantities;

/// <summary>An efficiency, held as a ratio from 0 to 1.</summary>
public readonly record struct Efficiency
{
    private Efficiency(double ratio) => Ratio = ratio;

    /// <summary>The efficiency as a ratio, 0 to 1.</summary>
    public double Ratio { get; }

    /// <summary>No loss at all.</summary>
    public static Efficiency Lossless => new(1);

    /// <summary>Makes an efficiency.</summary>
    /// <param name="ratio">Ratio from 0 to 1.</param>
    /// <exception cref="ArgumentOutOfRangeException">Below 0, above 1 or not a number.</exception>
    public static Efficiency FromRatio(double ratio) =>
        ratio is >= 0 and <= 1 ? new Efficiency(ratio) : throw new ArgumentOutOfRangeException(nameof(ratio), ratio, "An efficiency lies between 0 and 1.");
}
