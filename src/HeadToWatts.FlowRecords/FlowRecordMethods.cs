using HeadToWatts.Basis.Sources;
using HeadToWatts.FlowRecords.Devices;
using HeadToWatts.FlowRecords.Ratings;

namespace HeadToWatts.FlowRecords;

/// <summary>The methods of this project's stage, with their sources.</summary>
public static class FlowRecordMethods
{
    private static readonly Source Stedinger = new("stedinger-1993", SourceKind.Published, "Stedinger, J. R., Vogel, R. M., Foufoula-Georgiou, E.", "1993", "Frequency analysis of extreme events", "Handbook of Hydrology (D. R. Maidment, ed.), chapter 18, McGraw-Hill");

    private static readonly Source Vogel = new("vogel-fennessey-1994", SourceKind.Published, "Vogel, R. M., Fennessey, N. M.", "1994", "Flow-duration curves I: new interpretation and confidence intervals", "Journal of Water Resources Planning and Management 120(4)");

    private static readonly Source Searcy = new("searcy-1959", SourceKind.Published, "Searcy, J. K.", "1959", "Flow-duration curves", "Manual of Hydrology part 2, US Geological Survey Water-Supply Paper 1542-A");

    private static readonly InputRange Count = new("n", "number of flows ranked", "1", 1, double.PositiveInfinity);

    /// <summary>Weibull plotting position.</summary>
    public static readonly Method Weibull = new("plotting-position-weibull", "Weibull plotting position", "p = m/(n + 1)", Vogel, "", [Count]);

    /// <summary>Hazen plotting position.</summary>
    public static readonly Method Hazen = new("plotting-position-hazen", "Hazen plotting position", "p = (m - 0.5)/n", Stedinger, "plotting positions", [Count]);

    /// <summary>Gringorten plotting position.</summary>
    public static readonly Method Gringorten = new("plotting-position-gringorten", "Gringorten plotting position", "p = (m - 0.44)/(n + 0.12)", Stedinger, "plotting positions", [Count]);

    /// <summary>Cunnane plotting position.</summary>
    public static readonly Method Cunnane = new("plotting-position-cunnane", "Cunnane plotting position", "p = (m - 0.4)/(n + 0.2)", Stedinger, "plotting positions", [Count]);

    /// <summary>California plotting position.</summary>
    public static readonly Method California = new("plotting-position-california", "California plotting position", "p = m/n", Stedinger, "plotting positions", [Count]);

    /// <summary>The flow-duration curve of a period of record, and the mean of what is taken under a cap.</summary>
    public static readonly Method DurationCurve = new("flow-duration-curve", "Flow-duration curve of the period of record", "Q_{mean} = ∫ Q(p) dp", Searcy, "", []);

    /// <summary>Every method.</summary>
    public static IReadOnlyList<Method> All { get; } = 
    [
        Weibull, Hazen, Gringorten, Cunnane, California, DurationCurve,
        .. RatingMethods.All,
        .. PrimaryDevices.All.SelectMany(d => d.Methods),
    ];
}
