using HeadToWatts.Turbines;
using HeadToWatts.Turbines.Sizing;
using HeadToWatts.Turbines.Units;

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

    /// <summary>The units one by one, in the order in which they come in; null for equal units.</summary>
    public IReadOnlyList<UnitSize>? UnitSizes { get; init; }

    /// <summary>How several units share the flow.</summary>
    public LoadSplit Split { get; init; }

    /// <summary>A manufacturer's chart of flow, head and efficiency, in place of a curve.</summary>
    public HillChart? HillChart { get; init; }

    /// <summary>Diameter of the runner on which the manufacturer's efficiencies were measured, m; null when it is that of the runner here.</summary>
    public double? TestedDiameterM { get; init; }

    /// <summary>Diameter of the runner here, m; null for the rule's.</summary>
    public double? RunnerDiameterM { get; init; }

    /// <summary>True when capacity and efficiency follow the head away from the rated one.</summary>
    public bool FollowsHead { get; init; }

    /// <summary>Net head below which a unit is shut off, over its rated head; null when it is not given that way.</summary>
    public double? LeastHeadRatio { get; init; }

    /// <summary>Net head below which a unit is shut off, m; null when it is not given that way.</summary>
    public double? LeastHeadM { get; init; }

    /// <summary>Best point of the pump that is to run as turbine; null when none is named.</summary>
    public PumpPoint? Pump { get; init; }
}
