namespace HeadToWatts.FlowRecords;

/// <summary>How the reserved flow is set.</summary>
public enum ReservedFlowKind
{
    /// <summary>Nothing is reserved.</summary>
    None,

    /// <summary>A constant flow.</summary>
    Constant,

    /// <summary>A share of the flow that arrives.</summary>
    PercentOfFlow,
}

/// <summary>Water that must stay in the stream or canal (instream or compensation flow).</summary>
public sealed record ReservedFlow
{
    private ReservedFlow(ReservedFlowKind kind, double flowM3PerS, double ratio)
    {
        Kind = kind;
        FlowM3PerS = flowM3PerS;
        Ratio = ratio;
    }

    /// <summary>Nothing is reserved.</summary>
    public static ReservedFlow None { get; } = new(ReservedFlowKind.None, 0, 0);

    /// <summary>How it is set.</summary>
    public ReservedFlowKind Kind { get; }

    /// <summary>The constant flow, m3/s; 0 for the other kinds.</summary>
    public double FlowM3PerS { get; }

    /// <summary>Share of the arriving flow, 0 to 1; 0 for the other kinds.</summary>
    public double Ratio { get; }

    /// <summary>A constant flow.</summary>
    /// <param name="flowM3PerS">Flow, m3/s, zero or more.</param>
    public static ReservedFlow Constant(double flowM3PerS) => flowM3PerS >= 0 && double.IsFinite(flowM3PerS)
        ? new(ReservedFlowKind.Constant, flowM3PerS, 0)
        : throw new ArgumentOutOfRangeException(nameof(flowM3PerS), flowM3PerS, "A reserved flow is zero or more.");

    /// <summary>A share of the flow that arrives.</summary>
    /// <param name="ratio">Share, 0 to 1.</param>
    public static ReservedFlow PercentOfFlow(double ratio) => ratio is >= 0 and <= 1
        ? new(ReservedFlowKind.PercentOfFlow, 0, ratio)
        : throw new ArgumentOutOfRangeException(nameof(ratio), ratio, "A share of the flow lies within 0 to 1.");
}

/// <summary>Where an arriving flow goes. The three parts sum to it.</summary>
/// <param name="PriorM3PerS">To prior deliveries, m3/s.</param>
/// <param name="ReservedM3PerS">Reserved, m3/s.</param>
/// <param name="UsableM3PerS">Left for the plant, m3/s.</param>
public readonly record struct WaterSplit(double PriorM3PerS, double ReservedM3PerS, double UsableM3PerS);

/// <summary>
/// What comes off the flow before the turbine limit: prior deliveries first, then the reserved flow out of what is left.
/// </summary>
public sealed record WaterAllocation
{
    /// <summary>An allocation.</summary>
    /// <param name="reserved">The reserved flow.</param>
    /// <param name="priorDeliveriesM3PerS">Water others are entitled to first, m3/s, zero or more.</param>
    public WaterAllocation(ReservedFlow reserved, double priorDeliveriesM3PerS)
    {
        ArgumentNullException.ThrowIfNull(reserved);
        if (!(priorDeliveriesM3PerS >= 0 && double.IsFinite(priorDeliveriesM3PerS)))
            throw new ArgumentOutOfRangeException(nameof(priorDeliveriesM3PerS), priorDeliveriesM3PerS, "Prior deliveries are zero or more.");
        Reserved = reserved;
        PriorDeliveriesM3PerS = priorDeliveriesM3PerS;
    }

    /// <summary>Nothing comes off.</summary>
    public static WaterAllocation None { get; } = new(ReservedFlow.None, 0);

    /// <summary>The reserved flow.</summary>
    public ReservedFlow Reserved { get; }

    /// <summary>Water others are entitled to first, m3/s.</summary>
    public double PriorDeliveriesM3PerS { get; }

    /// <summary>True when nothing comes off.</summary>
    public bool IsNone => PriorDeliveriesM3PerS == 0 && Reserved.FlowM3PerS == 0 && Reserved.Ratio == 0;

    /// <summary>Flows at which the split bends, m3/s, rising; between them every part is a straight line of the flow.</summary>
    public IReadOnlyList<double> FlowBreakpointsM3PerS
    {
        get
        {
            var bends = new List<double>(2);
            if (PriorDeliveriesM3PerS > 0)
                bends.Add(PriorDeliveriesM3PerS);
            var second = Reserved.Kind switch
            {
                ReservedFlowKind.Constant => PriorDeliveriesM3PerS + Reserved.FlowM3PerS,
                ReservedFlowKind.PercentOfFlow when Reserved.Ratio < 1 => PriorDeliveriesM3PerS / (1 - Reserved.Ratio),
                _ => 0,
            };
            if (second > PriorDeliveriesM3PerS)
                bends.Add(second);
            return bends;
        }
    }

    /// <summary>Splits a flow.</summary>
    /// <param name="flowM3PerS">The flow that arrives, m3/s, zero or more.</param>
    public WaterSplit Split(double flowM3PerS)
    {
        if (!(flowM3PerS >= 0))
            throw new ArgumentOutOfRangeException(nameof(flowM3PerS), flowM3PerS, "A flow is zero or more.");
        var prior = Math.Min(PriorDeliveriesM3PerS, flowM3PerS);
        var left = flowM3PerS - prior;
        var reserved = Reserved.Kind switch
        {
            ReservedFlowKind.Constant => Math.Min(Reserved.FlowM3PerS, left),
            ReservedFlowKind.PercentOfFlow => Math.Min(Reserved.Ratio * flowM3PerS, left),
            _ => 0,
        };
        return new WaterSplit(prior, reserved, left - reserved);
    }
}
