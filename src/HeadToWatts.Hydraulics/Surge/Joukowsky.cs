using HeadToWatts.Basis.Sources;

namespace HeadToWatts.Hydraulics.Surge;

/// <summary>Head rise when the flow is stopped faster than the wave returns: ΔH = a ΔV/g for T at most 2 L/a.</summary>
public static class Joukowsky
{
    /// <summary>The method.</summary>
    public static readonly Method Method = new(
        "joukowsky", "Surge of rapid closure, Joukowsky", "ΔH = a ΔV / g for T ≤ 2 L/a", SurgeSources.Joukowsky, "", []);

    /// <summary>Head rise, m.</summary>
    /// <param name="waveSpeedMPerS">Wave speed a, m/s.</param>
    /// <param name="velocityChangeMPerS">Velocity stopped ΔV, m/s.</param>
    /// <param name="gravityMPerS2">Acceleration of gravity g, m/s2.</param>
    public static double RiseM(double waveSpeedMPerS, double velocityChangeMPerS, double gravityMPerS2) =>
        waveSpeedMPerS * velocityChangeMPerS / gravityMPerS2;
}
