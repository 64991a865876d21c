namespace HeadToWatts.Basis.Quantities;

/// <summary>Gross head: headwater level less tailwater level.</summary>
public readonly record struct GrossHead
{
    private GrossHead(double metres) => Metres = metres;

    /// <summary>Gross head, m.</summary>
    public double Metres { get; }

    /// <summary>Makes a gross head.</summary>
    /// <param name="metres">Gross head, m; above 0 and at most 2500.</param>
    /// <exception cref="ArgumentOutOfRangeException">Not above 0, above 2500 m, or not a number.</exception>
    public static GrossHead FromMetres(double metres) =>
        metres is > 0 and <= 2500 ? new GrossHead(metres) : throw new ArgumentOutOfRangeException(nameof(metres), metres, "Gross head must be above 0 and at most 2500 m.");
}

/// <summary>Net head: gross head less the losses up to the machine. It may be negative when a pipe is forced beyond what the fall can drive.</summary>
public readonly record struct NetHead
{
    private NetHead(double metres) => Metres = metres;

    /// <summary>Net head, m.</summary>
    public double Metres { get; }

    /// <summary>Net head left after losses.</summary>
    /// <param name="gross">Gross head.</param>
    /// <param name="lossM">Head lost up to the machine, m.</param>
    public static NetHead After(GrossHead gross, double lossM) => new(gross.Metres - lossM);

    /// <summary>Makes a net head from a figure known otherwise.</summary>
    /// <param name="metres">Net head, m.</param>
    public static NetHead FromMetres(double metres) => new(metres);
}
