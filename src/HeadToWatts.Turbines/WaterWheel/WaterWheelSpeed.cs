using HeadToWatts.Basis.Sources;

namespace HeadToWatts.Turbines.WaterWheel;

/// <summary>
/// Diameter and speed of a water wheel. The diameter is nine tenths of the head; a breastshot wheel at low head is taller than its
/// head. The speed follows from the rim speed, n = 60 V / (π D).
/// </summary>
public sealed class WaterWheelSpeed : RunnerSpeedRule
{
    /// <summary>Rim speed taken, m/s: the middle of the 2 to 6 ft/s of the source.</summary>
    public const double RimVelocityMPerS = 1.2;

    /// <summary>Least diameter taken, m: at low head the wheel is breastshot.</summary>
    public const double LeastDiameterM = 3;

    private const double DiameterToHead = 0.9;

    private static readonly Source Young = new("young-1807", SourceKind.Published, "T. Young", "1807", "Natural philosophy and the mechanical arts", "London, volume 1, on the regulation of hydraulic forces, p. 321");

    /// <summary>The method: n = 60 V / (π D) at a rim speed V of 1.2 m/s.</summary>
    public static Method Speed { get; } = new(
        "water-wheel-speed", "Usual speed of a water wheel", "n = 60 V / (π D), V = 1.2 m/s", Young, "rim speed between 2 and 6 ft/s",
        [new InputRange("D", "diameter", "m", 2, 10)]);

    /// <inheritdoc/>
    public override Method Method => Speed;

    /// <summary>Usual speed, rpm, of a wheel of this diameter, m.</summary>
    public static double UsualSpeedRpm(double diameterM) => diameterM > 0
        ? 60 * RimVelocityMPerS / (Math.PI * diameterM)
        : throw new ArgumentOutOfRangeException(nameof(diameterM), diameterM, "A diameter is a positive number.");

    /// <inheritdoc/>
    public override RunnerSize At(double unitFlowM3PerS, double netHeadM)
    {
        var diameterM = Math.Max(DiameterToHead * netHeadM, LeastDiameterM);
        return new RunnerSize(diameterM, UsualSpeedRpm(diameterM));
    }
}
