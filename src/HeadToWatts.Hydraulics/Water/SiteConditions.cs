using HeadToWatts.Basis.Sources;

namespace HeadToWatts.Hydraulics.Water;

/// <summary>What the place gives to every formula: water, gravity and air.</summary>
/// <param name="LatitudeRad">Latitude, rad.</param>
/// <param name="ElevationM">Elevation above sea level, m.</param>
/// <param name="Water">Properties of the water.</param>
/// <param name="GravityMPerS2">Acceleration of gravity, m/s2.</param>
/// <param name="AtmosphericPressurePa">Atmospheric pressure, Pa.</param>
public sealed record SiteConditions(double LatitudeRad, double ElevationM, WaterProperties Water, double GravityMPerS2, double AtmosphericPressurePa)
{
    /// <summary>Specific weight γ = ρ g.</summary>
    public static readonly Method SpecificWeight = new(
        "specific-weight", "Specific weight of water", "γ = ρ g", WaterSources.IndustrialFormulation, "density of the release times local gravity", []);

    /// <summary>Specific weight γ = ρ g, N/m3.</summary>
    public double SpecificWeightNPerM3 => Water.DensityKgPerM3 * GravityMPerS2;

    /// <summary>The methods behind these figures.</summary>
    public IReadOnlyList<MethodUse> Uses =>
    [
        IapwsIf97.Density.Used(Span("T", Water.TemperatureDegC)),
        IapwsViscosity.Method.Used(Span("T", Water.TemperatureDegC)),
        IapwsIf97.SaturationPressure.Used(Span("T", Water.TemperatureDegC)),
        Gravity.Method.Used(Span("φ", LatitudeRad), Span("z", ElevationM)),
        SpecificWeight.Used(),
        Atmosphere.Method.Used(Span("z", ElevationM)),
    ];

    /// <summary>Conditions at a place.</summary>
    /// <param name="latitudeRad">Latitude, rad; -π/2 to π/2.</param>
    /// <param name="elevationM">Elevation above sea level, m; -500 to 5000.</param>
    /// <param name="temperatureDegC">Water temperature, degC; 0 to 40.</param>
    /// <exception cref="ArgumentOutOfRangeException">Outside these limits or not a number.</exception>
    public static SiteConditions At(double latitudeRad, double elevationM, double temperatureDegC) =>
        new(latitudeRad, elevationM, WaterProperties.At(temperatureDegC), Gravity.AtMPerS2(latitudeRad, elevationM), Atmosphere.PressurePa(elevationM));

    private static InputSpan Span(string symbol, double value) => new(symbol, value, value);
}
