using HeadToWatts.Basis.Sources;

namespace HeadToWatts.Hydraulics.Pipes;

/// <summary>A pipe material with the figures a screening starts from. Roughness is known to half its value either way.</summary>
/// <param name="Id">Key.</param>
/// <param name="Name">Name in the trade.</param>
/// <param name="RoughnessM">Absolute roughness when new, m.</param>
/// <param name="RoughnessAgedM">Absolute roughness after years of service, m.</param>
/// <param name="HazenWilliamsCoefficient">Hazen-Williams C.</param>
/// <param name="ManningCoefficient">Manning n.</param>
/// <param name="ElasticModulusPa">Young's modulus E, short term, Pa.</param>
/// <param name="PoissonRatio">Poisson's ratio.</param>
/// <param name="UsualVelocityLowMPerS">Lowest usual velocity at design flow, m/s.</param>
/// <param name="UsualVelocityHighMPerS">Highest usual velocity at design flow, m/s.</param>
/// <param name="Source">Where roughness comes from.</param>
public sealed record PipeMaterial(
    string Id,
    string Name,
    double RoughnessM,
    double RoughnessAgedM,
    double HazenWilliamsCoefficient,
    double ManningCoefficient,
    double ElasticModulusPa,
    double PoissonRatio,
    double UsualVelocityLowMPerS,
    double UsualVelocityHighMPerS,
    Source Source)
{
    /// <summary>Diameter over wall thickness D/e assumed for surge when no wall thickness is given (typical, from memory).</summary>
    public double TypicalDiameterThicknessRatio { get; init; } = 100;

    /// <summary>Where the source of roughness gives it.</summary>
    public string Locator { get; init; } = "";
}
