namespace HeadToWatts.Hydraulics.Pipes;

/// <summary>
/// The pipe materials a study may choose from. Roughness when new is the source's; the aged roughness, the usual velocities
/// and D/e are typical figures from memory. Hazen-Williams C and Manning n lie in the ranges of published tables
/// (PVC and FRP 150, polyethylene 140, ductile iron 140, new steel 140 to 150, concrete 100 to 140, wood stave 110 to 120,
/// corrugated metal 60; n 0.009 to 0.011 PVC, 0.011 to 0.012 steel, 0.012 to 0.016 concrete, 0.011 to 0.013 wood stave, 0.022 corrugated).
/// </summary>
public static class PipeMaterials
{
    private const double Millimetre = 1e-3;
    private const double Gigapascal = 1e9;

    /// <summary>All materials.</summary>
    public static IReadOnlyList<PipeMaterial> All { get; } =
    [
        new("steel-new", "Steel, new, welded", 0.046 * Millimetre, 0.4 * Millimetre, 140, 0.012, 207 * Gigapascal, 0.3, 1.5, 5, PipeSources.White)
            { TypicalDiameterThicknessRatio = 120, Locator = "commercial steel, new" },
        new("steel-lined", "Steel, lined or coated", 0.061 * Millimetre, 0.15 * Millimetre, 145, 0.011, 207 * Gigapascal, 0.3, 1.5, 5, PipeSources.HydraulicInstitute)
            { TypicalDiameterThicknessRatio = 120, Locator = "steel, welded and seamless" },
        new("steel-rusted", "Steel, rusted", 2 * Millimetre, 3.35 * Millimetre, 100, 0.014, 207 * Gigapascal, 0.3, 1.5, 4, PipeSources.White)
            { TypicalDiameterThicknessRatio = 120, Locator = "steel, rusted" },
        new("steel-galvanized", "Steel, galvanized", 0.15 * Millimetre, 0.4 * Millimetre, 120, 0.014, 207 * Gigapascal, 0.3, 1, 3, PipeSources.Binder)
            { TypicalDiameterThicknessRatio = 30, Locator = "galvanized iron" },
        new("steel-riveted", "Steel, riveted", 1.5 * Millimetre, 5 * Millimetre, 110, 0.017, 207 * Gigapascal, 0.3, 1.5, 3.5, PipeSources.Binder)
            { TypicalDiameterThicknessRatio = 120, Locator = "riveted steel, 0.9 to 9 mm" },
        new("ductile-iron", "Ductile iron, cement-mortar lined", 0.061 * Millimetre, 0.12 * Millimetre, 140, 0.012, 165 * Gigapascal, 0.28, 1, 4, PipeSources.HydraulicInstitute)
            { TypicalDiameterThicknessRatio = 60, Locator = "ductile iron" },
        new("cast-iron", "Cast iron, unlined", 0.26 * Millimetre, 1.5 * Millimetre, 130, 0.013, 100 * Gigapascal, 0.25, 1, 3, PipeSources.Binder)
            { TypicalDiameterThicknessRatio = 35, Locator = "cast iron" },
        new("pvc", "PVC", 0.0015 * Millimetre, 0.007 * Millimetre, 150, 0.010, 3.0 * Gigapascal, 0.4, 1, 3, PipeSources.White)
            { TypicalDiameterThicknessRatio = 26, Locator = "thermoplastics" },
        new("hdpe", "HDPE (polyethylene)", 0.0015 * Millimetre, 0.007 * Millimetre, 140, 0.010, 1.1 * Gigapascal, 0.45, 1, 3, PipeSources.White)
            { TypicalDiameterThicknessRatio = 17, Locator = "thermoplastics" },
        new("grp", "GRP (glass-reinforced plastic)", 0.005 * Millimetre, 0.03 * Millimetre, 150, 0.010, 24.5 * Gigapascal, 0.3, 1, 4, PipeSources.Memory)
            { TypicalDiameterThicknessRatio = 70 },
        new("concrete-smooth", "Concrete, steel forms, smooth", 0.3 * Millimetre, 1 * Millimetre, 140, 0.012, 25 * Gigapascal, 0.2, 1, 4, PipeSources.Binder)
            { TypicalDiameterThicknessRatio = 10, Locator = "concrete, 0.3 to 3 mm" },
        new("concrete-rough", "Concrete, rough", 2 * Millimetre, 3 * Millimetre, 110, 0.015, 25 * Gigapascal, 0.2, 1, 3, PipeSources.White)
            { TypicalDiameterThicknessRatio = 10, Locator = "concrete, rough" },
        new("wood-stave", "Wood stave", 0.5 * Millimetre, 0.9 * Millimetre, 115, 0.012, 10 * Gigapascal, 0.3, 1, 3, PipeSources.White)
            { TypicalDiameterThicknessRatio = 25, Locator = "wood stave" },
        new("corrugated-metal", "Corrugated metal", 45 * Millimetre, 50 * Millimetre, 60, 0.022, 207 * Gigapascal, 0.3, 1, 2.5, PipeSources.Memory)
            { TypicalDiameterThicknessRatio = 300 },
    ];

    /// <summary>The material of that id or name, whatever the case; null when there is none.</summary>
    /// <param name="idOrName">Id, as "steel-new", or name.</param>
    public static PipeMaterial? Find(string? idOrName) =>
        All.FirstOrDefault(m => string.Equals(m.Id, idOrName?.Trim(), StringComparison.OrdinalIgnoreCase)
                             || string.Equals(m.Name, idOrName?.Trim(), StringComparison.OrdinalIgnoreCase));
}
