using System.Globalization;
using HeadToWatts.Basis.Sources;

namespace HeadToWatts.Turbines.Sizing;

/// <summary>A wheel driven by free jets (Pelton, Turgo): the rim runs a little slower than half the jet, the jets pass the flow.</summary>
/// <param name="rimSpeedRatio">Speed of the wheel at the jet over the spouting velocity.</param>
/// <param name="leastDiameters">Least wheel diameter over jet diameter that is usual.</param>
public sealed class JetWheelSizing(double rimSpeedRatio, double leastDiameters) : RunnerSizing
{
    /// <summary>C_v, velocity of a real jet over the spouting velocity.</summary>
    public const double JetVelocityCoefficient = 0.98;

    /// <summary>The method.</summary>
    public static Method Method { get; } = new(
        "jet-wheel", "Wheel and jets of an impulse turbine", "D = 60 k (2 g H)^{1/2}/(π n), d = (4 Q/(z π C_v (2 g H)^{1/2}))^{1/2}", TurbineReferences.Nag, "chapter 10: C_v = 0.98, wheel at 0.46 of the jet, so k = 0.451",
        [new InputRange("k", "speed of the wheel over the spouting velocity", "1", 0.43, 0.48)]);

    /// <summary>Diameter of each jet, m.</summary>
    /// <param name="duty">What one unit has to do.</param>
    public static double JetDiameterM(in RunnerDuty duty) => Math.Sqrt(4 * duty.FlowM3PerS / (duty.Jets * Math.PI * JetVelocityCoefficient * duty.SpoutingMPerS));

    /// <inheritdoc/>
    public override RunnerGeometry At(in RunnerDuty duty)
    {
        var diameterM = DiameterM(rimSpeedRatio, duty);
        var jetM = JetDiameterM(duty);
        var ratio = diameterM / jetM;
        var text = ratio.ToString("0.0", CultureInfo.InvariantCulture);
        return new RunnerGeometry(
            diameterM,
            "wheel, between the jets' axes",
            [new RunnerDimension("jet", jetM)],
            [duty.Jets == 1 ? "1 jet" : duty.Jets.ToString(CultureInfo.InvariantCulture) + " jets"],
            ratio < leastDiameters ? [$"The wheel is only {text} jets across; below about {leastDiameters.ToString("0", CultureInfo.InvariantCulture)} the jets are too thick for it: more jets, or a slower speed."] : [],
            Method.Used(new InputSpan("k", rimSpeedRatio, rimSpeedRatio)));
    }
}
