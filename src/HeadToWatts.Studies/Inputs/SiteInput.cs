namespace HeadToWatts.Studies.Inputs;

/// <summary>Place and water: they fix gravity, air pressure, density and viscosity.</summary>
/// <param name="LatitudeRad">Latitude, rad.</param>
/// <param name="ElevationM">Elevation above the sea, m.</param>
/// <param name="WaterTemperatureDegC">Water temperature, degrees Celsius, 0 to 40.</param>
/// <param name="FrequencyHz">Grid frequency, Hz: 50 or 60.</param>
public sealed record SiteInput(double LatitudeRad, double ElevationM, double WaterTemperatureDegC, double FrequencyHz);
