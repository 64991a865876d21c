namespace HeadToWatts.Studies.Results;

/// <summary>Net head at a share of the design flow.</summary>
/// <param name="ShareOfDesignFlow">Share of the design flow, 0 to 1.</param>
/// <param name="FlowM3PerS">Flow, m3/s.</param>
/// <param name="LossM">Head lost, m.</param>
/// <param name="NetHeadM">Net head, m.</param>
public sealed record NetHeadPoint(double ShareOfDesignFlow, double FlowM3PerS, double LossM, double NetHeadM);

/// <summary>What the study found of the head.</summary>
/// <param name="GrossHeadM">Gross head, m.</param>
/// <param name="HeadwaterM">Headwater level, m.</param>
/// <param name="TailwaterM">Tailwater level, m.</param>
/// <param name="NetHeadAtDesignM">Net head at the design flow, m.</param>
/// <param name="AtShares">Net head at 25, 50, 75 and 100 percent of the design flow.</param>
public sealed record HeadResult(double GrossHeadM, double HeadwaterM, double TailwaterM, double NetHeadAtDesignM, IReadOnlyList<NetHeadPoint> AtShares)
{
    /// <summary>Levels over the flow, highest flow first; empty where they stay.</summary>
    public IReadOnlyList<LevelAtFlow> Levels { get; init; } = [];
}

/// <summary>Levels at a flow, where they move.</summary>
/// <param name="UsableFlowM3PerS">Usable flow, m3/s.</param>
/// <param name="PassingFlowM3PerS">Flow passing the site, m3/s.</param>
/// <param name="HeadwaterM">Headwater level, m.</param>
/// <param name="TailwaterM">Tailwater level, m.</param>
/// <param name="IsOutsideRating">True when the flow lies outside a level rating, so that a level is held at its end.</param>
public sealed record LevelAtFlow(double UsableFlowM3PerS, double PassingFlowM3PerS, double HeadwaterM, double TailwaterM, bool IsOutsideRating)
{
    /// <summary>Gross head, m.</summary>
    public double GrossHeadM => HeadwaterM - TailwaterM;
}
