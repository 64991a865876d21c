using HeadToWatts.Turbines;
using HeadToWatts.Turbines.Sizing;

namespace HeadToWatts.Studies.Inputs;

/// <summary>The turbine: what is left null is suggested.</summary>
/// <param name="Type">Type.</param>
/// <param name="UnitCount">Number of equal units.</param>
/// <param name="MakersCurve">A manufacturer's efficiency table in place of the typical curve.</param>
/// <param name="LeastFlowRatio">Least flow of a unit over its design flow, where the manufacturer states it.</param>
public sealed record TurbineInput(TurbineType? Type, int? UnitCount, EfficiencyCurve? MakersCurve, double? LeastFlowRatio)
{
    /// <summary>Height at which the runner is to stand above the lowest tailwater, m; negative below it; null when it is not settled.</summary>
    public double? RunnerHeightM { get; init; }

    /// <summary>Best point of the pump that is to run as turbine; null when none is named.</summary>
    public PumpPoint? Pump { get; init; }
}
