using HeadToWatts.Turbines;

namespace HeadToWatts.Studies.Inputs;

/// <summary>The turbine: what is left null is suggested.</summary>
/// <param name="Type">Type.</param>
/// <param name="UnitCount">Number of equal units.</param>
/// <param name="MakersCurve">A manufacturer's efficiency table in place of the typical curve.</param>
/// <param name="LeastFlowRatio">Least flow of a unit over its design flow, where the manufacturer states it.</param>
public sealed record TurbineInput(TurbineType? Type, int? UnitCount, EfficiencyCurve? MakersCurve, double? LeastFlowRatio);
