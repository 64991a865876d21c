namespace HeadToWatts.Hydraulics.Water;

/// <summary>Properties of fresh water at one temperature and a pressure of one standard atmosphere.</summary>
/// <param name="TemperatureDegC">Temperature, degC.</param>
/// <param name="DensityKgPerM3">Density ρ, kg/m3.</param>
/// <param name="DynamicViscosityPaS">Dynamic viscosity μ, Pa s.</param>
/// <param name="KinematicViscosityM2PerS">Kinematic viscosity ν = μ/ρ, m2/s.</param>
/// <param name="VapourPressurePa">Vapour pressure, Pa absolute.</param>
/// <param name="SpeedOfSoundMPerS">Speed of sound, m/s.</param>
public sealed record WaterProperties(
    double TemperatureDegC,
    double DensityKgPerM3,
    double DynamicViscosityPaS,
    double KinematicViscosityM2PerS,
    double VapourPressurePa,
    double SpeedOfSoundMPerS)
{
    /// <summary>The lowest temperature served, degC.</summary>
    public const double LowestTemperatureDegC = 0;

    /// <summary>The highest temperature served, degC.</summary>
    public const double HighestTemperatureDegC = 40;

    /// <summary>Bulk modulus of elasticity K = ρ w^2, Pa.</summary>
    public double BulkModulusPa => DensityKgPerM3 * SpeedOfSoundMPerS * SpeedOfSoundMPerS;

    /// <summary>Properties at a temperature (IAPWS-IF97 and IAPWS R12-08 at 101.325 kPa).</summary>
    /// <param name="temperatureDegC">Temperature, degC; 0 to 40.</param>
    /// <exception cref="ArgumentOutOfRangeException">Outside 0 to 40 degC or not a number.</exception>
    public static WaterProperties At(double temperatureDegC)
    {
        if (temperatureDegC is not (>= LowestTemperatureDegC and <= HighestTemperatureDegC))
            throw new ArgumentOutOfRangeException(nameof(temperatureDegC), temperatureDegC, "The water temperature must lie between 0 and 40 degC.");
        var density = IapwsIf97.DensityKgPerM3(temperatureDegC);
        var viscosity = IapwsViscosity.DynamicPaS(temperatureDegC, density);
        return new WaterProperties(
            temperatureDegC,
            density,
            viscosity,
            viscosity / density,
            IapwsIf97.VapourPressurePa(temperatureDegC),
            IapwsIf97.SpeedOfSoundMPerS(temperatureDegC));
    }
}
