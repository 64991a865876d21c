using HeadToWatts.Basis.Sources;

namespace HeadToWatts.Hydraulics.Transients;

/// <summary>Head rise of an even closing of the opening that takes much longer than the wave needs to return: Allievi's limit for slow closure.</summary>
public static class AllieviClosure
{
    /// <summary>The method.</summary>
    public static readonly Method Method = new(
        "allievi-slow-closure", "Surge of slow closure of an opening, Allievi",
        "ΔH/H_0 = N/2 + (N^2/4 + N)^{1/2}, N = (L V_0/(g H_0 T))^2", TransientSources.Allievi, "limit of slow closure", []);

    /// <summary>Head rise, m.</summary>
    /// <param name="momentumM2PerS">L V of one pipe, Σ L V of pipes in series, m2/s; 0 or more.</param>
    /// <param name="headM">Head before the opening over that behind it, H_0, m; above 0.</param>
    /// <param name="closureTimeS">Closure time T, s; above 0.</param>
    /// <param name="gravityMPerS2">Acceleration of gravity, m/s2.</param>
    /// <exception cref="ArgumentOutOfRangeException">Head or time is not above 0 or not a number.</exception>
    public static double RiseM(double momentumM2PerS, double headM, double closureTimeS, double gravityMPerS2)
    {
        if (headM is not (> 0 and < double.PositiveInfinity))
            throw new ArgumentOutOfRangeException(nameof(headM), headM, "The head must be above 0.");
        if (closureTimeS is not (> 0 and < double.PositiveInfinity))
            throw new ArgumentOutOfRangeException(nameof(closureTimeS), closureTimeS, "The closure time must be above 0.");
        var root = momentumM2PerS / (gravityMPerS2 * headM * closureTimeS);
        var n = root * root;
        return headM * ((n / 2) + Math.Sqrt((n * n / 4) + n));
    }

    /// <summary>Closure time that keeps the rise to a limit, s: T = L V_0 (1 + x)^(1/2)/(g H_0 x) with x = ΔH/H_0.</summary>
    /// <param name="momentumM2PerS">L V of one pipe, Σ L V of pipes in series, m2/s; 0 or more.</param>
    /// <param name="headM">Head before the opening over that behind it, H_0, m; above 0.</param>
    /// <param name="riseM">Rise allowed, m; above 0.</param>
    /// <param name="gravityMPerS2">Acceleration of gravity, m/s2.</param>
    /// <exception cref="ArgumentOutOfRangeException">Head or rise is not above 0 or not a number.</exception>
    public static double TimeS(double momentumM2PerS, double headM, double riseM, double gravityMPerS2)
    {
        if (headM is not (> 0 and < double.PositiveInfinity))
            throw new ArgumentOutOfRangeException(nameof(headM), headM, "The head must be above 0.");
        if (riseM is not (> 0 and < double.PositiveInfinity))
            throw new ArgumentOutOfRangeException(nameof(riseM), riseM, "The rise must be above 0.");
        var x = riseM / headM;
        return momentumM2PerS * Math.Sqrt(1 + x) / (gravityMPerS2 * headM * x);
    }
}
