using HeadToWatts.Basis.Sources;

namespace HeadToWatts.Turbines.WaterWheel;

/// <summary>
/// Diameter and speed of a water wheel. The diameter is nine tenths of the head, a breastshot wheel of low head is taller than its
/// head; the speed is half of that at which the rim throws the water off, n = 21 / D^{1/2} (rpm, m).
/// </summary>
public sealed class WaterWheelSpeed : RunnerSpeedRule
{
    /// <summary>Least diameter taken, m: at low head the wheel is breastshot.</summary>
    public const double LeastDiameterM = 3;

    private static readonly Source Practice = Source.Memory("water-wheel-speed", "Usual speed of overshot and breastshot wheels, half the speed at which the rim's acceleration equals gravity");

    /// <summary>The method: n = 21 / D^{1/2}.</summary>
    public static Method Speed { get; } = new(
        "water-wheel-speed", "Usual speed of a water wheel", "n = 21 / D^{1/2}", Practice, "",
        [new InputRange("D", "diameter", "m", 2, 10)]);

    /// <inheritdoc/>
    public override Method Method => Speed;

    /// <summary>Usual speed, rpm, of a wheel of this diameter, m.</summary>
    public static double UsualSpeedRpm(double diameterM) => diameterM > 0
        ? 21 / Math.Sqrt(diameterM)
        : throw new ArgumentOutOfRangeException(nameof(diameterM), diameterM, "A diameter is a positive number.");

    /// <inheritdoc/>
    public override RunnerSize At(double unitFlowM3PerS, double netHeadM)
    {
        var diameterM = Math.Max(0.9 * netHeadM, LeastDiameterM);
        return new RunnerSize(diameterM, UsualSpeedRpm(diameterM));
    }
}
