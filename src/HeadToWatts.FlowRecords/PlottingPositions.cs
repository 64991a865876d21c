namespace HeadToWatts.FlowRecords;

/// <summary>The plotting positions that may be chosen.</summary>
public static class PlottingPositions
{
    /// <summary>Weibull, m/(n+1); the default.</summary>
    public static readonly PlottingPosition Weibull = new("weibull", "Weibull", FlowRecordMethods.Weibull, 0);

    /// <summary>Hazen, (m - 0.5)/n.</summary>
    public static readonly PlottingPosition Hazen = new("hazen", "Hazen", FlowRecordMethods.Hazen, 0.5);

    /// <summary>Gringorten, (m - 0.44)/(n + 0.12).</summary>
    public static readonly PlottingPosition Gringorten = new("gringorten", "Gringorten", FlowRecordMethods.Gringorten, 0.44);

    /// <summary>Cunnane, (m - 0.4)/(n + 0.2).</summary>
    public static readonly PlottingPosition Cunnane = new("cunnane", "Cunnane", FlowRecordMethods.Cunnane, 0.4);

    /// <summary>California, m/n.</summary>
    public static readonly PlottingPosition California = new("california", "California", FlowRecordMethods.California, 0, isCalifornia: true);

    /// <summary>All of them, the default first.</summary>
    public static IReadOnlyList<PlottingPosition> All { get; } = [Weibull, Hazen, Gringorten, Cunnane, California];

    /// <summary>The default, Weibull.</summary>
    public static PlottingPosition Default => Weibull;

    /// <summary>Finds a plotting position by its key or name; null when there is none.</summary>
    public static PlottingPosition? Find(string id) =>
        All.FirstOrDefault(p => string.Equals(p.Id, id, StringComparison.OrdinalIgnoreCase));
}
