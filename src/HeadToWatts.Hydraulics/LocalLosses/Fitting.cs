namespace HeadToWatts.Hydraulics.LocalLosses;

/// <summary>Fittings of one sort in a pipe.</summary>
/// <param name="Name">Name, as the user gave it.</param>
/// <param name="LossCoefficient">K of one of them, in h_L = K V^2/2g.</param>
/// <param name="Count">How many there are.</param>
/// <param name="Kind">The kind it was taken from; null when only K was given.</param>
public sealed record Fitting(string Name, double LossCoefficient, int Count, FittingKind? Kind)
{
    /// <summary>K of all of them together.</summary>
    public double TotalLossCoefficient => LossCoefficient * Count;

    /// <summary>Where along its pipe the loss is taken.</summary>
    public FittingPlace Place => Kind?.Place ?? FittingPlace.Along;

    /// <summary>Fittings of a kind with its usual K.</summary>
    /// <param name="kind">The kind.</param>
    /// <param name="count">How many, 1 or more.</param>
    /// <exception cref="ArgumentOutOfRangeException">Count below 1.</exception>
    public static Fitting Of(FittingKind kind, int count = 1)
    {
        ArgumentNullException.ThrowIfNull(kind);
        ArgumentOutOfRangeException.ThrowIfLessThan(count, 1);
        return new(kind.Name, kind.LossCoefficient, count, kind);
    }
}
