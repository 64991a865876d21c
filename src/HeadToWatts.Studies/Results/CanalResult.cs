using HeadToWatts.Basis.Sources;
using HeadToWatts.Hydraulics.Canals;

namespace HeadToWatts.Studies.Results;

/// <summary>Both sides of a drop at one flow.</summary>
/// <param name="FlowM3PerS">Flow in the canal, m3/s.</param>
/// <param name="Upstream">Depths and energies above the drop.</param>
/// <param name="Downstream">Depths and energies below it.</param>
public sealed record CanalAtFlow(double FlowM3PerS, CanalFlowResult Upstream, CanalFlowResult Downstream);

/// <summary>A term of the energy equation at a section.</summary>
/// <param name="BedM">Elevation of the bed z, m.</param>
/// <param name="DepthM">Depth y, m.</param>
/// <param name="VelocityHeadM">α V^2/2g, m.</param>
public sealed record CanalEnergyTerms(double BedM, double DepthM, double VelocityHeadM)
{
    /// <summary>Elevation of the energy line, m.</summary>
    public double EnergyM => BedM + DepthM + VelocityHeadM;
}

/// <summary>What the study found of the canal and its drop.</summary>
/// <param name="AtFlows">Both sides over the flow, lowest first.</param>
/// <param name="AtDesign">Both sides at the design flow.</param>
/// <param name="AtFull">Both sides at the largest flow of the study.</param>
/// <param name="EnergyAbove">Energy above the drop at the design flow, at normal depth; null where the section is full.</param>
/// <param name="EnergyBelow">Energy below it; null where the section is full.</param>
/// <param name="Drawdown">Water line above the drop when the largest flow falls over it freely, from the brink upstream; empty where there is none.</param>
/// <param name="DrawdownLengthM">How far upstream of the drop the water stands below 99 percent of its normal depth, m.</param>
/// <param name="Basin">The basin at the largest flow, with the plant stopped; null when none is given or no fast flow forms.</param>
/// <param name="Uses">The methods used.</param>
public sealed record CanalResult(
    IReadOnlyList<CanalAtFlow> AtFlows,
    CanalAtFlow AtDesign,
    CanalAtFlow AtFull,
    CanalEnergyTerms? EnergyAbove,
    CanalEnergyTerms? EnergyBelow,
    IReadOnlyList<CanalEnergy> Drawdown,
    double DrawdownLengthM,
    BasinCheck? Basin,
    IReadOnlyList<MethodUse> Uses)
{
    /// <summary>Energy between the two sections, m: what the machine and the drop share; null where a section is full.</summary>
    public double? FallOfEnergyM => EnergyAbove is { } above && EnergyBelow is { } below ? above.EnergyM - below.EnergyM : null;
}
