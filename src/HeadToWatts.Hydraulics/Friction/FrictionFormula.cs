using HeadToWatts.Basis.Quantities;
using HeadToWatts.Basis.Sources;

namespace HeadToWatts.Hydraulics.Friction;

/// <summary>
/// A formula for the friction of water in a full pipe. The seam is the head lost per metre of pipe, so that formulas
/// without a Darcy friction factor stand beside those that have one.
/// </summary>
public abstract class FrictionFormula
{
    /// <summary>Makes a formula.</summary>
    /// <param name="method">The published method.</param>
    protected FrictionFormula(Method method) => Method = method ?? throw new ArgumentNullException(nameof(method));

    /// <summary>Key of the formula, that of its method.</summary>
    public string Id => Method.Id;

    /// <summary>Name of the formula.</summary>
    public string Name => Method.Name;

    /// <summary>The published method.</summary>
    public Method Method { get; }

    /// <summary>Head lost per metre of pipe, m/m; zero at zero flow.</summary>
    /// <param name="flow">The flow in the pipe.</param>
    public abstract double LossPerMetre(in PipeFlow flow);

    /// <summary>The Darcy friction factor the formula gives; null when it has none, and at zero flow.</summary>
    /// <param name="flow">The flow in the pipe.</param>
    public virtual DarcyFrictionFactor? FactorOf(in PipeFlow flow) => null;

    /// <summary>The Darcy friction factor that would give the same loss; zero at zero flow.</summary>
    /// <param name="flow">The flow in the pipe.</param>
    public DarcyFrictionFactor EquivalentDarcy(in PipeFlow flow)
    {
        var velocityHeadM = flow.VelocityHeadM;
        return DarcyFrictionFactor.FromDarcy(velocityHeadM > 0 ? LossPerMetre(flow) * flow.DiameterM / velocityHeadM : 0);
    }

    /// <summary>The methods used in one pipe between two flows; empty when there is no flow.</summary>
    /// <param name="lowest">The lowest flow in the pipe.</param>
    /// <param name="highest">The highest flow in the same pipe.</param>
    public abstract IReadOnlyList<MethodUse> UsesBetween(in PipeFlow lowest, in PipeFlow highest);

    /// <inheritdoc/>
    public override string ToString() => Name;
}
