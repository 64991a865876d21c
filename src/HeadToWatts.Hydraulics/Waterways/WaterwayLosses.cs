using HeadToWatts.Basis.Sources;
using HeadToWatts.Hydraulics.Friction;
using HeadToWatts.Hydraulics.LocalLosses;

namespace HeadToWatts.Hydraulics.Waterways;

/// <summary>What one sort of fitting takes.</summary>
/// <param name="Fitting">The fittings.</param>
/// <param name="LossM">Head lost in all of them, m.</param>
public sealed record FittingLoss(Fitting Fitting, double LossM);

/// <summary>What one pipe takes at a flow.</summary>
/// <param name="Element">The pipe.</param>
/// <param name="FlowM3PerS">Flow, m3/s.</param>
/// <param name="VelocityMPerS">Mean velocity, m/s.</param>
/// <param name="VelocityHeadM">Velocity head V^2/2g, m.</param>
/// <param name="Reynolds">Reynolds number.</param>
/// <param name="RelativeRoughness">Relative roughness e/D.</param>
/// <param name="DarcyFrictionFactor">Darcy friction factor, or the one that would give the same loss; 0 at zero flow.</param>
/// <param name="Regime">Flow regime.</param>
/// <param name="FrictionLossM">Friction loss, m.</param>
/// <param name="Fittings">The fittings with their losses.</param>
/// <param name="LocalLossM">Local losses together, m.</param>
public sealed record ElementLosses(
    PipeElement Element,
    double FlowM3PerS,
    double VelocityMPerS,
    double VelocityHeadM,
    double Reynolds,
    double RelativeRoughness,
    double DarcyFrictionFactor,
    FlowRegime Regime,
    double FrictionLossM,
    IReadOnlyList<FittingLoss> Fittings,
    double LocalLossM)
{
    /// <summary>Friction and local losses together, m.</summary>
    public double TotalLossM => FrictionLossM + LocalLossM;
}

/// <summary>What the whole waterway takes at a flow.</summary>
/// <param name="FlowM3PerS">Flow, m3/s.</param>
/// <param name="Elements">The pipes in the order of the flow.</param>
/// <param name="FrictionLossM">Friction loss, m.</param>
/// <param name="LocalLossM">Local losses, m.</param>
/// <param name="TotalLossM">Both together, m.</param>
/// <param name="Uses">The methods used.</param>
public sealed record WaterwayLosses(
    double FlowM3PerS,
    IReadOnlyList<ElementLosses> Elements,
    double FrictionLossM,
    double LocalLossM,
    double TotalLossM,
    IReadOnlyList<MethodUse> Uses);
