using HeadToWatts.Basis.Sources;

namespace HeadToWatts.Hydraulics.LocalLosses;

/// <summary>The local loss h_L = K V^2/2g.</summary>
public static class LocalLoss
{
    /// <summary>The method.</summary>
    public static readonly Method Method = new(
        "local-loss", "Local losses", "h_L = K V^2/2g", LocalLossSources.Weisbach, "",
        [new InputRange("K", "loss coefficient", "1", 0, double.PositiveInfinity)]);

    /// <summary>Head lost, m.</summary>
    /// <param name="lossCoefficient">K; not negative.</param>
    /// <param name="velocityMPerS">Velocity V, m/s.</param>
    /// <param name="gravityMPerS2">Acceleration of gravity g, m/s2.</param>
    public static double LossM(double lossCoefficient, double velocityMPerS, double gravityMPerS2) =>
        lossCoefficient * velocityMPerS * velocityMPerS / (2 * gravityMPerS2);
}
