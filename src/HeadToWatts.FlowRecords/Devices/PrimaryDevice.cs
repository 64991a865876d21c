using HeadToWatts.Basis;
using HeadToWatts.Basis.Sources;
using HeadToWatts.FlowRecords.Ratings;

namespace HeadToWatts.FlowRecords.Devices;

/// <summary>A weir or flume whose flow follows from one head.</summary>
public abstract class PrimaryDevice
{
    /// <summary>Key of the kind, as study files write it.</summary>
    public abstract string KindId { get; }

    /// <summary>The method with its source and ranges.</summary>
    public abstract Method Method { get; }

    /// <summary>Lowest head of the range, m.</summary>
    public abstract double LowestHeadM { get; }

    /// <summary>Highest head of the range, m: the least of the limits that apply to these measures.</summary>
    public abstract double HighestHeadM { get; }

    /// <summary>Head below over head above, both over the crest, from which the flow is no longer free.</summary>
    public abstract double SubmergenceLimitRatio { get; }

    /// <summary>The device in words.</summary>
    public abstract string Describe();

    /// <summary>The flow at a head.</summary>
    /// <param name="headM">Head over the crest or flume floor, in still water upstream, m; NaN where missing.</param>
    /// <param name="downstreamHeadM">Head below, over the same datum, m; null when it was not measured and the flow is taken as free.</param>
    /// <param name="outside">What is done outside the range. A submerged flow is never held at an end: it is left out, or given by the free formula, which reads too high.</param>
    /// <exception cref="ArgumentOutOfRangeException">A head is infinite, or the head below is not a number.</exception>
    public RatedFlow At(double headM, double? downstreamHeadM = null, OutsideRating outside = OutsideRating.LeaveOut)
    {
        if (double.IsInfinity(headM))
            throw new ArgumentOutOfRangeException(nameof(headM), headM, "A head is a number, or missing.");
        if (downstreamHeadM is { } given && !double.IsFinite(given))
            throw new ArgumentOutOfRangeException(nameof(downstreamHeadM), downstreamHeadM, "The head below is a number.");
        if (double.IsNaN(headM))
            return new RatedFlow(double.NaN, RatingPlace.Missing);
        if (headM <= 0)
            return new RatedFlow(0, RatingPlace.Within);
        if (downstreamHeadM is { } belowM && belowM > SubmergenceLimitRatio * headM)
            return new RatedFlow(outside == OutsideRating.Extend ? FreeFlowM3PerS(headM) : double.NaN, RatingPlace.Submerged);
        var flag = headM < LowestHeadM * (1 - 1e-12) ? RatingPlace.Below : headM > HighestHeadM * (1 + 1e-12) ? RatingPlace.Above : RatingPlace.Within;
        return (flag, outside) switch
        {
            (RatingPlace.Within, _) or (_, OutsideRating.Extend) => new RatedFlow(FreeFlowM3PerS(headM), flag),
            (_, OutsideRating.HoldEnd) => new RatedFlow(FreeFlowM3PerS(Math.Clamp(headM, LowestHeadM, HighestHeadM)), flag),
            _ => new RatedFlow(double.NaN, flag),
        };
    }

    /// <summary>States the use of the method over a span of heads.</summary>
    /// <param name="lowestM">Lowest head, m.</param>
    /// <param name="highestM">Highest head, m.</param>
    public abstract MethodUse UsedBetween(double lowestM, double highestM);

    /// <summary>The formula of free flow, m3/s, at a head above 0.</summary>
    /// <param name="headM">Head, m.</param>
    protected abstract double FreeFlowM3PerS(double headM);

    /// <summary>Refuses a measure that is not above 0.</summary>
    internal static double Require(double figure, string name, string why) =>
        figure > 0 && double.IsFinite(figure) ? figure : throw new ArgumentOutOfRangeException(name, figure, why);

    /// <summary>(2 g)^(1/2) with standard gravity: the devices' coefficients are not known better than it.</summary>
    internal static readonly double RootTwoGravity = Math.Sqrt(2 * PhysicalConstants.StandardGravityMPerS2);
}
