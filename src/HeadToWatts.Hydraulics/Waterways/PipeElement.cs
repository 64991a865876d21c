using HeadToWatts.Hydraulics.LocalLosses;
using HeadToWatts.Hydraulics.Pipes;

namespace HeadToWatts.Hydraulics.Waterways;

/// <summary>A pipe of one diameter and material, with its fittings.</summary>
/// <param name="Name">Name.</param>
/// <param name="LengthM">Length along the pipe, m.</param>
/// <param name="InsideDiameterM">Inside diameter, m.</param>
/// <param name="Material">Material.</param>
/// <param name="RoughnessM">Absolute roughness used, m.</param>
/// <param name="HazenWilliamsCoefficient">Hazen-Williams C used.</param>
/// <param name="ManningCoefficient">Manning n used.</param>
/// <param name="Fittings">Fittings; their K belong to this pipe's velocity head.</param>
/// <param name="WallThicknessM">Wall thickness, m; null when not given.</param>
/// <param name="PressureRatingPa">Rated pressure, Pa gauge; null when not given.</param>
/// <param name="EndElevationM">Elevation of the pipe's centre at its downstream end, m; null when not given.</param>
public sealed record PipeElement(
    string Name,
    double LengthM,
    double InsideDiameterM,
    PipeMaterial Material,
    double RoughnessM,
    double HazenWilliamsCoefficient,
    double ManningCoefficient,
    IReadOnlyList<Fitting> Fittings,
    double? WallThicknessM,
    double? PressureRatingPa,
    double? EndElevationM)
{
    /// <summary>Inside cross-section π D^2/4, m2.</summary>
    public double AreaM2 => Math.PI / 4 * InsideDiameterM * InsideDiameterM;

    /// <summary>A pipe with the roughness of its material when new.</summary>
    /// <param name="name">Name.</param>
    /// <param name="lengthM">Length, m.</param>
    /// <param name="insideDiameterM">Inside diameter, m.</param>
    /// <param name="material">Material.</param>
    /// <param name="fittings">Fittings.</param>
    public static PipeElement Of(string name, double lengthM, double insideDiameterM, PipeMaterial material, params IReadOnlyList<Fitting> fittings)
    {
        ArgumentNullException.ThrowIfNull(material);
        return new(
            name, lengthM, insideDiameterM, material, material.RoughnessM, material.HazenWilliamsCoefficient, material.ManningCoefficient, fittings, null, null, null);
    }
}
