using HeadToWatts.Basis;
using HeadToWatts.Basis.Sources;

namespace HeadToWatts.Hydraulics.Water;

/// <summary>Pressure of the standard atmosphere.</summary>
public static class Atmosphere
{
    private const double SeaLevelTemperatureK = 288.15;
    private const double LapseRateKPerM = 0.0065;
    private const double GasConstantJPerKgK = 287.05287;
    private const double EarthRadiusM = 6_356_766;

    /// <summary>The standard atmosphere below 11 km. Elevation is geometric; the formula works on the geopotential altitude H.</summary>
    public static readonly Method Method = new(
        "iso-2533-atmosphere", "Atmospheric pressure from elevation",
        "p_a = 101325 (1 - 0.0065 H / 288.15)^{5.25588}, H = r z / (r + z), r = 6356766 m",
        WaterSources.StandardAtmosphere, "",
        [new InputRange("z", "elevation", "m", Gravity.LowestElevationM, Gravity.HighestElevationM)]);

    /// <summary>Atmospheric pressure, Pa.</summary>
    /// <param name="elevationM">Elevation z above sea level (geometric), m; -500 to 5000.</param>
    /// <exception cref="ArgumentOutOfRangeException">Outside these limits or not a number.</exception>
    public static double PressurePa(double elevationM)
    {
        if (elevationM is not (>= Gravity.LowestElevationM and <= Gravity.HighestElevationM))
            throw new ArgumentOutOfRangeException(nameof(elevationM), elevationM, "The elevation must lie between -500 and 5000 m.");
        return AtGeopotentialPa(EarthRadiusM * elevationM / (EarthRadiusM + elevationM));
    }

    /// <summary>Atmospheric pressure at a geopotential altitude, Pa.</summary>
    /// <param name="geopotentialAltitudeM">Geopotential altitude H, m; -500 to 11000.</param>
    /// <exception cref="ArgumentOutOfRangeException">Outside these limits or not a number.</exception>
    public static double AtGeopotentialPa(double geopotentialAltitudeM)
    {
        if (geopotentialAltitudeM is not (>= -501 and <= 11_000))
            throw new ArgumentOutOfRangeException(nameof(geopotentialAltitudeM), geopotentialAltitudeM, "The altitude must lie between -500 and 11000 m.");
        const double exponent = PhysicalConstants.StandardGravityMPerS2 / (GasConstantJPerKgK * LapseRateKPerM);
        return PhysicalConstants.StandardAtmospherePa * Math.Pow(1 - (LapseRateKPerM * geopotentialAltitudeM / SeaLevelTemperatureK), exponent);
    }
}
