using HeadToWatts.Basis.Sources;

namespace HeadToWatts.Hydraulics.Friction;

/// <summary>
/// Hazen and Williams: V = 0.849 C R^0.63 S^0.54 with the hydraulic radius R = D/4, solved for S. The rounded forms with 10.67
/// in front differ from it by up to 0.3 %, so this one is fixed.
/// </summary>
public sealed class HazenWilliams : FrictionFormula
{
    private const double HydraulicRadiusExponent = 0.63;

    /// <summary>Makes the formula.</summary>
    public HazenWilliams()
        : base(new Method(
            "hazen-williams", "Hazen-Williams", "V = 0.849 C R^{0.63} S^{0.54}", FrictionSources.HazenWilliams, "",
            [
                new InputRange("D", "inside diameter", "m", 0.05, double.PositiveInfinity),
                new InputRange("V", "velocity", "m/s", 0, 3),
                new InputRange("C", "Hazen-Williams coefficient", "1", 40, 160),
            ]))
    {
    }

    /// <inheritdoc/>
    public override double LossPerMetre(in PipeFlow flow)
    {
        var velocityMPerS = flow.VelocityMPerS;
        if (!(velocityMPerS > 0))
            return 0;
        var unitSlopeVelocityMPerS = 0.849 * flow.HazenWilliamsCoefficient * Math.Pow(flow.DiameterM / 4, HydraulicRadiusExponent);
        return Math.Pow(velocityMPerS / unitSlopeVelocityMPerS, 1 / 0.54);
    }

    /// <inheritdoc/>
    public override IReadOnlyList<MethodUse> UsesBetween(in PipeFlow lowest, in PipeFlow highest) =>
        highest.FlowM3PerS > 0
            ? [Method.Used(
                new InputSpan("D", highest.DiameterM, highest.DiameterM),
                new InputSpan("V", lowest.VelocityMPerS, highest.VelocityMPerS),
                new InputSpan("C", highest.HazenWilliamsCoefficient, highest.HazenWilliamsCoefficient))]
            : [];
}
