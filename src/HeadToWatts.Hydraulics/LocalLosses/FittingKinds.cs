using HeadToWatts.Basis.Sources;

namespace HeadToWatts.Hydraulics.LocalLosses;

/// <summary>The fittings a study may choose from. K belongs to the velocity head in the fitting's own pipe.</summary>
public static class FittingKinds
{
    /// <summary>All kinds, in the order in which the water meets them.</summary>
    public static IReadOnlyList<FittingKind> All { get; } =
    [
        Entrance("trash-rack", "Trash rack, clean", 0.1, 0.05, 0.5, LocalLossSources.Typical,
            "related to the pipe velocity; wide rack with slow approach; compute it by the rack formula when bars and approach are known"),
        Entrance("entrance-square", "Entrance, square-edged", 0.5, 0.4, 0.57, LocalLossSources.Cengel, "Ex. 8-8; Rennels gives 0.57"),
        Entrance("entrance-rounded", "Entrance, rounded", 0.2, 0.1, 0.3, LocalLossSources.Typical, "radius of a tenth of the diameter"),
        Entrance("entrance-bell-mouth", "Entrance, bell-mouth", 0.05, 0.03, 0.1, LocalLossSources.Typical, ""),
        Entrance("entrance-re-entrant", "Entrance, pipe projecting into the forebay", 0.9, 0.8, 1.0, LocalLossSources.Typical, ""),
        Along("bend-90", "Bend, 90 degrees, long radius", 0.25, 0.15, 0.3, LocalLossSources.PenstockTabulation, "0.25 (θ/90°)^(1/2); radius of three diameters or more"),
        Along("bend-60", "Bend, 60 degrees, long radius", 0.2, 0.12, 0.25, LocalLossSources.PenstockTabulation, "0.25 (θ/90°)^(1/2) = 0.204"),
        Along("bend-45", "Bend, 45 degrees, long radius", 0.18, 0.1, 0.2, LocalLossSources.PenstockTabulation, "0.25 (θ/90°)^(1/2) = 0.177"),
        Along("bend-30", "Bend, 30 degrees, long radius", 0.14, 0.08, 0.16, LocalLossSources.PenstockTabulation, "0.25 (θ/90°)^(1/2) = 0.144"),
        Along("bend-22", "Bend, 22.5 degrees, long radius", 0.125, 0.06, 0.14, LocalLossSources.PenstockTabulation, "0.25 (θ/90°)^(1/2) = 0.125"),
        Along("elbow-90-flanged", "Elbow, 90 degrees, flanged", 0.3, 0.25, 0.6, LocalLossSources.Cengel, "Ex. 8-8"),
        Along("elbow-90-threaded", "Elbow, 90 degrees, threaded", 0.9, 0.7, 1.5, LocalLossSources.Typical, "small pipe"),
        Along("elbow-45", "Elbow, 45 degrees", 0.4, 0.2, 0.45, LocalLossSources.Typical, ""),
        Along("mitre-90", "Mitre bend, 90 degrees, one cut", 1.1, 1.1, 1.3, LocalLossSources.Miller, "single mitre"),
        Along("mitre-60", "Mitre bend, 60 degrees, one cut", 0.5, 0.45, 0.6, LocalLossSources.Miller, "single mitre"),
        Along("mitre-45", "Mitre bend, 45 degrees, one cut", 0.29, 0.24, 0.35, LocalLossSources.Miller, "single mitre"),
        Along("mitre-30", "Mitre bend, 30 degrees, one cut", 0.1, 0.1, 0.16, LocalLossSources.Miller, "single mitre"),
        Along("tee-through", "Tee, straight through", 0.2, 0.1, 0.9, LocalLossSources.Typical, "flanged low, threaded high"),
        Along("tee-branch", "Tee, into the branch", 1.0, 0.9, 2.0, LocalLossSources.Typical, "flanged low, threaded high"),
        Along("wye", "Wye, into a branch", 0.75, 0.3, 0.9, LocalLossSources.PenstockTabulation, "on the velocity head of the main"),
        Along("valve-gate", "Gate valve, open", 0.15, 0.1, 0.2, LocalLossSources.Typical, "Çengel and Cimbala, Ex. 8-8, use 0.2"),
        Along("valve-butterfly", "Butterfly valve, open", 0.25, 0.15, 0.3, LocalLossSources.Typical, ""),
        Along("valve-ball", "Ball or spherical valve, open", 0.05, 0.05, 0.1, LocalLossSources.Typical, "full bore"),
        Along("valve-globe", "Globe valve, open", 10, 5, 12, LocalLossSources.Typical, ""),
        Along("valve-check", "Check valve, swing", 2, 1.5, 2.5, LocalLossSources.Typical, ""),
        Along("meter-magnetic", "Flow meter, magnetic or ultrasonic", 0, 0, 0.1, LocalLossSources.Typical, "full bore"),
        Entrance("contraction-gradual", "Reducer, gradual", 0.05, 0.03, 0.1, LocalLossSources.Rennels, "on the smaller pipe's velocity head; cone of 20 to 45 degrees"),
        Entrance("contraction-sudden", "Contraction, sudden, to half the area", 0.25, 0.2, 0.4, LocalLossSources.Weisbach, "0.5 (1 - A2/A1) on the smaller pipe's velocity head"),
        Along("expansion-gradual", "Expansion, gradual", 0.15, 0.1, 0.3, LocalLossSources.Typical, "on the smaller pipe's velocity head: list it with that pipe"),
        Exit("exit", "Exit into still water", 1.0, 1.0, 1.06, LocalLossSources.Cengel, "Ex. 8-8: the whole velocity head, α = 1.06 in turbulent flow"),
        Exit("draft-tube-exit", "Draft tube, lost at its outlet", 0.15, 0.05, 0.3, LocalLossSources.Typical,
            "related to the pipe velocity; only when the machine's efficiency does not count it already"),
    ];

    /// <summary>The kind of that id or name, whatever the case; null when there is none.</summary>
    /// <param name="idOrName">Id, as "bend-90", or name.</param>
    public static FittingKind? Find(string? idOrName) =>
        All.FirstOrDefault(k => string.Equals(k.Id, idOrName?.Trim(), StringComparison.OrdinalIgnoreCase)
                             || string.Equals(k.Name, idOrName?.Trim(), StringComparison.OrdinalIgnoreCase));

    private static FittingKind Entrance(string id, string name, double usual, double lowest, double highest, Source source, string locator) =>
        new(id, name, usual, lowest, highest, source, locator) { Place = FittingPlace.Entrance };

    private static FittingKind Along(string id, string name, double usual, double lowest, double highest, Source source, string locator) =>
        new(id, name, usual, lowest, highest, source, locator);

    private static FittingKind Exit(string id, string name, double usual, double lowest, double highest, Source source, string locator) =>
        new(id, name, usual, lowest, highest, source, locator) { Place = FittingPlace.Exit };
}
