namespace HeadToWatts.Hydraulics.Friction;

/// <summary>The friction formulas a study may choose from.</summary>
public static class FrictionFormulas
{
    /// <summary>Colebrook-White, the default.</summary>
    public static readonly FrictionFormula Default = new ColebrookWhite();

    /// <summary>All formulas, the default first.</summary>
    public static IReadOnlyList<FrictionFormula> All { get; } =
    [
        Default,
        new SwameeJain(),
        new Haaland(),
        new Churchill(),
        new HazenWilliams(),
        new Manning(),
    ];

    /// <summary>The formula of that id or name, whatever the case; null when there is none.</summary>
    /// <param name="idOrName">Id, as "colebrook-white", or name.</param>
    public static FrictionFormula? Find(string? idOrName) =>
        All.FirstOrDefault(f => string.Equals(f.Id, idOrName?.Trim(), StringComparison.OrdinalIgnoreCase)
                             || string.Equals(f.Name, idOrName?.Trim(), StringComparison.OrdinalIgnoreCase));
}
