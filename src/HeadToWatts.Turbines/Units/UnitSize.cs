namespace HeadToWatts.Turbines.Units;

/// <summary>One of several units.</summary>
/// <param name="ShareRatio">Its full flow over that of all units, above 0 and up to 1.</param>
/// <param name="LeastFlowRatio">Its least flow over its own full flow, 0 to 1.</param>
public readonly record struct UnitSize(double ShareRatio, double LeastFlowRatio);

/// <summary>How the units share the flow.</summary>
public enum LoadSplit
{
    /// <summary>One after another in the order given; those that run are opened alike.</summary>
    InTurn,

    /// <summary>So that the turbines give most power at each flow.</summary>
    Best,
}
