using HeadToWatts.Basis.Sources;

namespace HeadToWatts.FlowRecords.Ratings;

/// <summary>The methods of stage ratings.</summary>
internal static class RatingMethods
{
    private static readonly Source Rantz = new(
        "rantz-1982", SourceKind.Published, "Rantz, S. E. and others", "1982", "Measurement and computation of streamflow, volume 2: computation of discharge",
        "US Geological Survey Water-Supply Paper 2175");

    public static readonly Method TableLinear = new("rating-table-linear", "Rating table, straight lines", "Q = Q_1 + (Q_2 - Q_1)(h - h_1)/(h_2 - h_1)", Rantz, "ch. 10", []);

    public static readonly Method TableLogLog = new("rating-table-log-log", "Rating table, log-log lines", "Q = Q_1 ((h - e)/(h_1 - e))^N", Rantz, "ch. 10", []);

    public static readonly Method Equation = new("rating-equation", "Rating equation", "Q = C (h - h_0)^n", Rantz, "ch. 10", []);

    public static IReadOnlyList<Method> All { get; } = [TableLinear, TableLogLog, Equation];
}
