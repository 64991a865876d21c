using HeadToWatts.Basis.Sources;

namespace HeadToWatts.Hydraulics.LocalLosses;

/// <summary>Long-radius penstock bend: K = 0.25 (θ/90°)^(1/2).</summary>
public static class PenstockBend
{
    /// <summary>The method.</summary>
    public static readonly Method Method = new(
        "penstock-bend", "Long-radius penstock bend", "K = 0.25 (θ/90°)^{1/2}", LocalLossSources.PenstockTabulation, "bends of the tabulation",
        [new InputRange("θ", "deflection", "rad", 0, Math.PI / 2)]);

    /// <summary>K of the bend.</summary>
    /// <param name="deflectionRad">Deflection θ, rad; 0 to π/2.</param>
    /// <exception cref="ArgumentOutOfRangeException">Outside 0 to π/2 or not a number.</exception>
    public static double LossCoefficient(double deflectionRad) =>
        deflectionRad is >= 0 and <= Math.PI / 2
            ? 0.25 * Math.Sqrt(deflectionRad / (Math.PI / 2))
            : throw new ArgumentOutOfRangeException(nameof(deflectionRad), deflectionRad, "The deflection lies between 0 and 90 degrees.");
}
