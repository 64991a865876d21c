using HeadToWatts.Basis.Quantities;
using HeadToWatts.Basis.Sources;

namespace HeadToWatts.Hydraulics.Friction;

/// <summary>
/// Friction by Darcy-Weisbach, h_f = f (L/D) V^2/2g, with a formula for f in turbulent flow; laminar flow and the transition
/// follow <see cref="TransitionFlow"/> unless the formula covers them itself.
/// </summary>
public abstract class DarcyFormula : FrictionFormula
{
    /// <summary>The Darcy-Weisbach equation.</summary>
    public static readonly Method DarcyWeisbach = new(
        "darcy-weisbach", "Darcy-Weisbach equation", "h_f = f (L/D) V^2/2g", FrictionSources.Weisbach, "", []);

    /// <summary>Makes a formula.</summary>
    /// <param name="method">The published method.</param>
    protected DarcyFormula(Method method)
        : base(method)
    {
    }

    /// <summary>True when the formula covers laminar and transition flow itself.</summary>
    protected virtual bool CoversAllFlow => false;

    /// <inheritdoc/>
    public sealed override double LossPerMetre(in PipeFlow flow)
    {
        var velocityMPerS = flow.VelocityMPerS;
        var reynolds = velocityMPerS * flow.DiameterM / flow.KinematicViscosityM2PerS;
        if (reynolds < 1)
        {
            // Poiseuille's form of f = 64/Re: no division by a vanishing Reynolds number.
            return 32 * flow.KinematicViscosityM2PerS * velocityMPerS / (flow.GravityMPerS2 * flow.DiameterM * flow.DiameterM);
        }

        return Factor(reynolds, flow.RoughnessM / flow.DiameterM) / flow.DiameterM * (velocityMPerS * velocityMPerS / (2 * flow.GravityMPerS2));
    }

    /// <inheritdoc/>
    public sealed override DarcyFrictionFactor? FactorOf(in PipeFlow flow) =>
        flow.FlowM3PerS > 0 ? DarcyFrictionFactor.FromDarcy(Factor(flow.Reynolds, flow.RelativeRoughness)) : null;

    /// <summary>Darcy friction factor over all flow.</summary>
    /// <param name="reynolds">Reynolds number, above 0.</param>
    /// <param name="relativeRoughness">Relative roughness e/D, not negative.</param>
    public double Factor(double reynolds, double relativeRoughness)
    {
        if (reynolds < 1)
            return TransitionFlow.LaminarFactor(reynolds);
        if (CoversAllFlow || reynolds >= TransitionFlow.TurbulentReynolds)
            return TurbulentFactor(reynolds, relativeRoughness);
        return reynolds < TransitionFlow.LaminarReynolds
            ? TransitionFlow.LaminarFactor(reynolds)
            : TransitionFlow.TransitionFactor(reynolds, TurbulentFactor(TransitionFlow.TurbulentReynolds, relativeRoughness));
    }

    /// <inheritdoc/>
    public sealed override IReadOnlyList<MethodUse> UsesBetween(in PipeFlow lowest, in PipeFlow highest)
    {
        double from = lowest.Reynolds, to = highest.Reynolds;
        if (!(to > 0))
            return [];
        var uses = new List<MethodUse> { DarcyWeisbach.Used() };
        if (CoversAllFlow)
        {
            uses.Add(Method.Used(new InputSpan("Re", from, to), Roughness(highest)));
            return uses;
        }

        if (to >= TransitionFlow.TurbulentReynolds)
            uses.Add(Method.Used(new InputSpan("Re", Math.Max(from, TransitionFlow.TurbulentReynolds), to), Roughness(highest)));
        if (from <= TransitionFlow.TurbulentReynolds && to >= TransitionFlow.LaminarReynolds)
        {
            uses.Add(TransitionFlow.Transition.Used(new InputSpan(
                "Re", Math.Max(from, TransitionFlow.LaminarReynolds), Math.Min(to, TransitionFlow.TurbulentReynolds))));
        }

        if (from < TransitionFlow.LaminarReynolds)
            uses.Add(TransitionFlow.Laminar.Used(new InputSpan("Re", from, Math.Min(to, TransitionFlow.LaminarReynolds))));
        return uses;
    }

    /// <summary>Darcy friction factor of the formula itself.</summary>
    /// <param name="reynolds">Reynolds number; 4,000 and above unless the formula covers all flow.</param>
    /// <param name="relativeRoughness">Relative roughness e/D, not negative.</param>
    protected abstract double TurbulentFactor(double reynolds, double relativeRoughness);

    private static InputSpan Roughness(in PipeFlow flow) => new("e/D", flow.RelativeRoughness, flow.RelativeRoughness);
}
