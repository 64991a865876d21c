namespace HeadToWatts.Hydraulics.Waterways;

/// <summary>The energy of the water at one section, in metres: pressure head p/γ, elevation z and velocity head α V^2/2g.</summary>
/// <param name="Name">Name of the section.</param>
/// <param name="StationM">Distance along the waterway from the intake, m.</param>
/// <param name="CentreElevationM">Elevation of the pipe's centre (of the surface, at the two water levels) z, m.</param>
/// <param name="PressureHeadM">Gauge pressure head p/γ, m.</param>
/// <param name="VelocityHeadM">Velocity head α V^2/2g, m.</param>
/// <param name="EnergyGradeM">Elevation of the energy grade line, m: the sum of the three.</param>
public sealed record EnergySection(string Name, double StationM, double CentreElevationM, double PressureHeadM, double VelocityHeadM, double EnergyGradeM)
{
    /// <summary>Elevation of the hydraulic grade line z + p/γ, m.</summary>
    public double HydraulicGradeM => CentreElevationM + PressureHeadM;
}
