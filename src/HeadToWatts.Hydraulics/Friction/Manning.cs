using HeadToWatts.Basis.Sources;

namespace HeadToWatts.Hydraulics.Friction;

/// <summary>Manning in a full pipe: V = R^(2/3) S^(1/2) / n with R = D/4, solved for S.</summary>
public sealed class Manning : FrictionFormula
{
    /// <summary>Makes the formula.</summary>
    public Manning()
        : base(new Method(
            "manning", "Manning, full pipe", "V = (1/n) R^{2/3} S^{1/2}", FrictionSources.Manning, "",
            [new InputRange("n", "Manning coefficient of a pipe", "1", 0.008, 0.03)]))
    {
    }

    /// <inheritdoc/>
    public override double LossPerMetre(in PipeFlow flow)
    {
        var root = flow.VelocityMPerS * flow.ManningCoefficient / Math.Pow(flow.DiameterM / 4, 2.0 / 3);
        return root * root;
    }

    /// <inheritdoc/>
    public override IReadOnlyList<MethodUse> UsesBetween(in PipeFlow lowest, in PipeFlow highest) =>
        highest.FlowM3PerS > 0 ? [Method.Used(new InputSpan("n", highest.ManningCoefficient, highest.ManningCoefficient))] : [];
}
