using HeadToWatts.Basis.Sources;

namespace HeadToWatts.Hydraulics.Water;

/// <summary>Local acceleration of gravity from latitude and elevation.</summary>
public static class Gravity
{
    /// <summary>The lowest elevation served by the elevation term, m.</summary>
    public const double LowestElevationM = -500;

    /// <summary>The highest elevation served by the elevation term, m.</summary>
    public const double HighestElevationM = 5000;

    /// <summary>The WELMEC formula: normal gravity of the 1967 reference system and a free-air term linear in elevation.</summary>
    public static readonly Method Method = new(
        "welmec-gravity", "Gravity from latitude and elevation",
        "g = 9.780318 (1 + 0.0053024 sin^2 φ - 0.0000058 sin^2 2φ) - 3.085e-6 z",
        WaterSources.WelmecGravity, "gravity formula",
        [new InputRange("φ", "latitude", "rad", -Math.PI / 2, Math.PI / 2), new InputRange("z", "elevation", "m", LowestElevationM, HighestElevationM)]);

    /// <summary>Acceleration of gravity g, m/s2.</summary>
    /// <param name="latitudeRad">Latitude φ, rad; -π/2 to π/2.</param>
    /// <param name="elevationM">Elevation z above sea level, m; -500 to 5000.</param>
    /// <exception cref="ArgumentOutOfRangeException">Outside these limits or not a number.</exception>
    public static double AtMPerS2(double latitudeRad, double elevationM)
    {
        if (latitudeRad is not (>= -Math.PI / 2 and <= Math.PI / 2))
            throw new ArgumentOutOfRangeException(nameof(latitudeRad), latitudeRad, "A latitude lies between -90 and 90 degrees.");
        if (elevationM is not (>= LowestElevationM and <= HighestElevationM))
            throw new ArgumentOutOfRangeException(nameof(elevationM), elevationM, "The elevation must lie between -500 and 5000 m.");
        var sine = Math.Sin(latitudeRad);
        var sineOfTwice = Math.Sin(2 * latitudeRad);
        return (9.780318 * (1 + (0.0053024 * sine * sine) - (0.0000058 * sineOfTwice * sineOfTwice))) - (3.085e-6 * elevationM);
    }
}
