using HeadToWatts.Basis.Sources;

namespace HeadToWatts.Hydraulics.Surge;

/// <summary>Head rise of a steady closure that takes longer than the wave needs to return: ΔH = 2 L ΔV/(g T) for T above 2 L/a.</summary>
public static class Michaud
{
    /// <summary>The method.</summary>
    public static readonly Method Method = new(
        "michaud", "Surge of slow closure, Michaud", "ΔH = 2 L ΔV / (g T) for T > 2 L/a", SurgeSources.Michaud, "", []);

    /// <summary>Time a pressure wave needs to the intake and back, s: 2 L/a.</summary>
    /// <param name="lengthM">Length L, m.</param>
    /// <param name="waveSpeedMPerS">Wave speed a, m/s; above 0.</param>
    public static double CriticalTimeS(double lengthM, double waveSpeedMPerS) => 2 * lengthM / waveSpeedMPerS;

    /// <summary>Head rise, m; at most Joukowsky's, which holds when the closure is faster than 2 L/a.</summary>
    /// <param name="lengthM">Length L, m.</param>
    /// <param name="closureTimeS">Closure time T, s; above 0.</param>
    /// <param name="waveSpeedMPerS">Wave speed a, m/s.</param>
    /// <param name="velocityChangeMPerS">Velocity stopped ΔV, m/s.</param>
    /// <param name="gravityMPerS2">Acceleration of gravity g, m/s2.</param>
    /// <exception cref="ArgumentOutOfRangeException">The closure time is not above 0 or not a number.</exception>
    public static double RiseM(double lengthM, double closureTimeS, double waveSpeedMPerS, double velocityChangeMPerS, double gravityMPerS2)
    {
        if (closureTimeS is not (> 0 and < double.PositiveInfinity))
            throw new ArgumentOutOfRangeException(nameof(closureTimeS), closureTimeS, "The closure time must be above 0.");
        var slowM = 2 * lengthM * velocityChangeMPerS / (gravityMPerS2 * closureTimeS);
        return Math.Min(slowM, Joukowsky.RiseM(waveSpeedMPerS, velocityChangeMPerS, gravityMPerS2));
    }
}
