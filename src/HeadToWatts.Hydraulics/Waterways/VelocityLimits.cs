using HeadToWatts.Basis.Sources;

namespace HeadToWatts.Hydraulics.Waterways;

/// <summary>How fast water may run in a penstock. The usual range stands with each pipe material.</summary>
public static class VelocityLimits
{
    /// <summary>The limit of the US Bureau of Reclamation.</summary>
    public static readonly Method Method = new(
        "usbr-velocity-limit", "Penstock velocity limit", "V_{max} = 0.125 (2 g H)^{1/2}",
        new Source("usbr-em3", SourceKind.Published, "Bier, P. J.", "1961", "Welded Steel Penstocks", "US Bureau of Reclamation, Engineering Monograph 3"), "", []);

    /// <summary>Highest velocity, m/s.</summary>
    /// <param name="grossHeadM">Gross head, m; above 0.</param>
    /// <param name="gravityMPerS2">Acceleration of gravity, m/s2; above 0.</param>
    /// <exception cref="ArgumentOutOfRangeException">Not above 0 or not a number.</exception>
    public static double UsbrLimitMPerS(double grossHeadM, double gravityMPerS2)
    {
        if (grossHeadM is not (> 0 and < double.PositiveInfinity))
            throw new ArgumentOutOfRangeException(nameof(grossHeadM), grossHeadM, "The gross head must be above 0.");
        if (gravityMPerS2 is not (> 0 and < double.PositiveInfinity))
            throw new ArgumentOutOfRangeException(nameof(gravityMPerS2), gravityMPerS2, "Gravity must be above 0.");
        return 0.125 * Math.Sqrt(2 * gravityMPerS2 * grossHeadM);
    }
}
