using HeadToWatts.Basis.Sources;

namespace HeadToWatts.Turbines.Screw;

/// <summary>
/// Diameter and speed of an Archimedes screw. The speed is the greatest at which water does not slop over the flights,
/// n = 50 / D^{2/3} (rpm, m); the diameter is the one that passes the flow at that speed, D = 1.65 Q^{3/7}.
/// </summary>
public sealed class ScrewSpeed : RunnerSpeedRule
{
    /// <summary>
    /// m per (m3/s)^{3/7}. At n = 50 / D^{2/3} a screw that takes V = c D^3 in each turn passes Q = (50/60) c D^{7/3}; a screw of
    /// three flights of the best proportions laid at 22 degrees takes c = 0.37.
    /// </summary>
    public const double DiameterCoefficient = 1.65;

    private static readonly Source Muysken = Source.Memory("muysken-1932", "J. Muysken, 1932, on the greatest speed of screw pumps, as quoted by C. Rorres, The turn of the screw, Journal of Hydraulic Engineering 126, 2000");

    /// <summary>The method: n = 50 / D^{2/3}.</summary>
    public static Method Speed { get; } = new(
        "screw-speed", "Greatest speed of an Archimedes screw", "n = 50 / D^{2/3}", Muysken, "",
        [new InputRange("D", "outside diameter", "m", 0.3, 5)]);

    /// <inheritdoc/>
    public override Method Method => Speed;

    /// <summary>Greatest speed, rpm, of a screw of this outside diameter, m.</summary>
    public static double GreatestSpeedRpm(double diameterM) => diameterM > 0
        ? 50 / Math.Pow(diameterM, 2.0 / 3)
        : throw new ArgumentOutOfRangeException(nameof(diameterM), diameterM, "A diameter is a positive number.");

    /// <inheritdoc/>
    public override RunnerSize At(double unitFlowM3PerS, double netHeadM)
    {
        var diameterM = DiameterCoefficient * Math.Pow(unitFlowM3PerS, 3.0 / 7);
        return new RunnerSize(diameterM, GreatestSpeedRpm(diameterM));
    }
}
