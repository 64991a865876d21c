using HeadToWatts.Basis.Sources;
using HeadToWatts.FlowRecords.Devices;
using HeadToWatts.FlowRecords.OneOff;
using HeadToWatts.FlowRecords.Ratings;
using HeadToWatts.FlowRecords.Reserved;
using HeadToWatts.FlowRecords.Statistics;
using HeadToWatts.FlowRecords.Transfer;

namespace HeadToWatts.FlowRecords;

/// <summary>The methods of this project's stage, with their sources.</summary>
public static class FlowRecordMethods
{
    private static readonly InputRange Count = new("n", "number of flows ranked", "1", 1, double.PositiveInfinity);

    /// <summary>Weibull plotting position.</summary>
    public static readonly Method Weibull = new("plotting-position-weibull", "Weibull plotting position", "p = m/(n + 1)", FlowRecordSources.Vogel, "", [Count]);

    /// <summary>Hazen plotting position.</summary>
    public static readonly Method Hazen = new("plotting-position-hazen", "Hazen plotting position", "p = (m - 0.5)/n", FlowRecordSources.Stedinger, "plotting positions", [Count]);

    /// <summary>Gringorten plotting position.</summary>
    public static readonly Method Gringorten = new("plotting-position-gringorten", "Gringorten plotting position", "p = (m - 0.44)/(n + 0.12)", FlowRecordSources.Stedinger, "plotting positions", [Count]);

    /// <summary>Cunnane plotting position.</summary>
    public static readonly Method Cunnane = new("plotting-position-cunnane", "Cunnane plotting position", "p = (m - 0.4)/(n + 0.2)", FlowRecordSources.Stedinger, "plotting positions", [Count]);

    /// <summary>California plotting position.</summary>
    public static readonly Method California = new("plotting-position-california", "California plotting position", "p = m/n", FlowRecordSources.Stedinger, "plotting positions", [Count]);

    /// <summary>The flow-duration curve of a period of record, and the mean of what is taken under a cap.</summary>
    public static readonly Method DurationCurve = new("flow-duration-curve", "Flow-duration curve of the period of record", "Q_{mean} = ∫ Q(p) dp", FlowRecordSources.Searcy, "", []);

    /// <summary>Every method.</summary>
    public static IReadOnlyList<Method> All { get; } =
    [
        Weibull, Hazen, Gringorten, Cunnane, California, DurationCurve,
        .. RatingMethods.All,
        .. PrimaryDevices.All.SelectMany(d => d.Methods),
        FloatMethod.Method,
        VelocityArea.Method,
        BucketAndStopwatch.Method,
        DrainageAreaRatio.Method,
        MoveOne.Method,
        DurationCurves.MedianAnnual,
        LowFlow.Minimum,
        PearsonThree.Method,
        LogPearsonThree.Method,
        TennantLevels.Method,
    ];
}
