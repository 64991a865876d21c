namespace HeadToWatts.Hydraulics.Canals.Sections;

/// <summary>A shape of canal section that may be chosen.</summary>
/// <param name="Id">Key as study files write it.</param>
/// <param name="Name">Name in the trade.</param>
/// <param name="Measures">What describes it.</param>
public sealed record CanalSectionKind(string Id, string Name, string Measures);

/// <summary>The shapes that may be chosen.</summary>
public static class CanalSectionKinds
{
    /// <summary>All of them.</summary>
    public static IReadOnlyList<CanalSectionKind> All { get; } =
    [
        new("rectangular", "Rectangular", "width"),
        new("trapezoidal", "Trapezoidal", "bed width and side slope"),
        new("circular", "Circular pipe, part full", "diameter"),
        new("natural", "Surveyed by points", "distance and elevation of each point, from bank to bank"),
    ];

    /// <summary>Finds a shape by its key; null when there is none.</summary>
    /// <param name="id">Key.</param>
    public static CanalSectionKind? Find(string id) => All.FirstOrDefault(k => string.Equals(k.Id, id, StringComparison.OrdinalIgnoreCase));
}
