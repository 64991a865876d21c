using HeadToWatts.Basis.Sources;

namespace HeadToWatts.FlowRecords.Reserved;

/// <summary>A level of Tennant's table: shares of the mean annual flow in two seasons.</summary>
/// <param name="Id">Key as study files write it.</param>
/// <param name="Name">Name in the table.</param>
/// <param name="WinterRatio">Share from October to March.</param>
/// <param name="SummerRatio">Share from April to September.</param>
public sealed record TennantLevel(string Id, string Name, double WinterRatio, double SummerRatio);

/// <summary>Tennant's levels. Screening figures: the flow in the permit governs.</summary>
public static class TennantLevels
{
    /// <summary>The method.</summary>
    internal static readonly Method Method = new(
        "tennant", "Tennant (Montana) method", "Q_r = share × Q_{mean annual}", FlowRecordSources.Tennant, "table 1", []);

    /// <summary>The levels that name one share in each season, richest first.</summary>
    public static IReadOnlyList<TennantLevel> All { get; } =
    [
        new("optimum", "Optimum range, lower end", 0.6, 0.6),
        new("outstanding", "Outstanding", 0.4, 0.6),
        new("excellent", "Excellent", 0.3, 0.5),
        new("good", "Good", 0.2, 0.4),
        new("fair", "Fair or degrading", 0.1, 0.3),
        new("poor", "Poor or minimum", 0.1, 0.1),
    ];

    /// <summary>Finds a level by its key; null when there is none.</summary>
    /// <param name="id">Key.</param>
    public static TennantLevel? Find(string id) => All.FirstOrDefault(l => string.Equals(l.Id, id, StringComparison.OrdinalIgnoreCase));
}
