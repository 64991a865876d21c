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

    /// <summary>A share of the flow that arrives, and never less than a floor.</summary>
    PercentWithFloor,
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

    /// <summary>The constant flow or the floor, m3/s; 0 for the other kinds.</summary>
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

    /// <summary>A share of the flow that arrives, and never less than a floor.</summary>
    /// <param name="ratio">Share, 0 to 1.</param>
    /// <param name="floorM3PerS">Floor, m3/s, zero or more.</param>
    public static ReservedFlow PercentWithFloor(double ratio, double floorM3PerS)
    {
        if (!(ratio is >= 0 and <= 1))
            throw new ArgumentOutOfRangeException(nameof(ratio), ratio, "A share of the flow lies within 0 to 1.");
        if (!(floorM3PerS >= 0 && double.IsFinite(floorM3PerS)))
            throw new ArgumentOutOfRangeException(nameof(floorM3PerS), floorM3PerS, "A reserved flow is zero or more.");
        return new(ReservedFlowKind.PercentWithFloor, floorM3PerS, ratio);
    }

    /// <summary>What is to stay of an arriving flow, before it is asked how much is there, m3/s.</summary>
    internal double WantedM3PerS(double flowM3PerS) => Math.Max(FlowM3PerS, Ratio * flowM3PerS);
}

/// <summary>Where an arriving flow goes. The three parts sum to it.</summary>
/// <param name="PriorM3PerS">To prior deliveries, m3/s.</param>
/// <param name="ReservedM3PerS">Reserved, m3/s; with a water right also what lies beyond its rate, which stays in the stream.</param>
/// <param name="UsableM3PerS">Left for the plant, m3/s.</param>
public readonly record struct WaterSplit(double PriorM3PerS, double ReservedM3PerS, double UsableM3PerS);

/// <summary>
/// What comes off the flow before the turbine limit: prior deliveries first, then the reserved flow out of what is left. Of the
/// rest the plant may take no more than the rate of its water right.
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

    /// <summary>Rate of the water right, m3/s: the most the plant may take; null when none is given.</summary>
    /// <exception cref="ArgumentOutOfRangeException">The rate is negative, infinite or not a number.</exception>
    public double? RightRateM3PerS
    {
        get;
        init => field = value is not { } rate || (rate >= 0 && double.IsFinite(rate))
            ? value
            : throw new ArgumentOutOfRangeException(nameof(value), value, "The rate of a water right is zero or more.");
    }

    /// <summary>True when nothing comes off.</summary>
    public bool IsNone => PriorDeliveriesM3PerS == 0 && Reserved.FlowM3PerS == 0 && Reserved.Ratio == 0 && RightRateM3PerS is null;

    /// <summary>Flows at which the split bends, m3/s, rising; between them every part is a straight line of the flow.</summary>
    public IReadOnlyList<double> FlowBreakpointsM3PerS
    {
        get
        {
            var (prior, floor, ratio) = (PriorDeliveriesM3PerS, Reserved.FlowM3PerS, Reserved.Ratio);
            var bends = new SortedSet<double>();
            foreach (var rate in RightRateM3PerS is { } right ? new[] { 0, right } : [0.0])
            {
                // Where the rest after prior deliveries meets the reserve, and where it meets reserve and right together.
                Add(prior + rate);
                Add(prior + floor + rate);
                if (ratio < 1)
                    Add((prior + rate) / (1 - ratio));
            }

            if (ratio > 0)
                Add(floor / ratio);
            return [.. bends];

            void Add(double flowM3PerS)
            {
                if (flowM3PerS > 0)
                    bends.Add(flowM3PerS);
            }
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
        var reserved = Math.Min(Reserved.WantedM3PerS(flowM3PerS), left);
        var usable = left - reserved;
        if (RightRateM3PerS is { } right && usable > right)
            (reserved, usable) = (left - right, right);
        return new WaterSplit(prior, reserved, usable);
    }
}
