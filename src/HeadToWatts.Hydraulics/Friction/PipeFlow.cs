namespace HeadToWatts.Hydraulics.Friction;

/// <summary>Flow filling one round pipe: all that a friction formula may ask for.</summary>
/// <param name="FlowM3PerS">Flow Q, m3/s; not negative.</param>
/// <param name="DiameterM">Inside diameter D, m.</param>
/// <param name="RoughnessM">Absolute roughness e, m.</param>
/// <param name="HazenWilliamsCoefficient">Hazen-Williams C.</param>
/// <param name="ManningCoefficient">Manning n.</param>
/// <param name="KinematicViscosityM2PerS">Kinematic viscosity ν, m2/s.</param>
/// <param name="GravityMPerS2">Acceleration of gravity g, m/s2.</param>
public readonly record struct PipeFlow(
    double FlowM3PerS,
    double DiameterM,
    double RoughnessM,
    double HazenWilliamsCoefficient,
    double ManningCoefficient,
    double KinematicViscosityM2PerS,
    double GravityMPerS2)
{
    /// <summary>Mean velocity V = Q / (π D^2/4), m/s.</summary>
    public double VelocityMPerS => FlowM3PerS / (Math.PI / 4 * DiameterM * DiameterM);

    /// <summary>Reynolds number V D / ν.</summary>
    public double Reynolds => VelocityMPerS * DiameterM / KinematicViscosityM2PerS;

    /// <summary>Relative roughness e/D.</summary>
    public double RelativeRoughness => RoughnessM / DiameterM;

    /// <summary>Velocity head V^2/2g, m.</summary>
    public double VelocityHeadM => VelocityMPerS * VelocityMPerS / (2 * GravityMPerS2);
}
