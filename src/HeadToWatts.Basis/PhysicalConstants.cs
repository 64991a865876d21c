namespace HeadToWatts.Basis;

/// <summary>Constants that are defined, not measured.</summary>
public static class PhysicalConstants
{
    /// <summary>Standard acceleration of gravity, m/s2 (3rd CGPM, 1901); the site's own g is computed from latitude and elevation.</summary>
    public const double StandardGravityMPerS2 = 9.80665;

    /// <summary>Hours in the year of 365 days on which plant factors are based, h.</summary>
    public const double HoursPerYear = 8760;

    /// <summary>Seconds in the year of 365 days, s.</summary>
    public const double SecondsPerYear = 31_536_000;

    /// <summary>Mean pressure of the standard atmosphere at sea level, Pa (ISO 2533).</summary>
    public const double StandardAtmospherePa = 101_325;
}
