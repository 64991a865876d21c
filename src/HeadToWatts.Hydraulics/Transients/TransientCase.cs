namespace HeadToWatts.Hydraulics.Transients;

/// <summary>One pipe of a transient.</summary>
/// <param name="Name">Name.</param>
/// <param name="LengthM">Length, m; above 0.</param>
/// <param name="AreaM2">Inside cross-section, m2; above 0.</param>
/// <param name="WaveSpeedMPerS">Wave speed a, m/s; above 0.</param>
/// <param name="SteadyLossM">Head lost in it, fittings included, at the flow that is stopped, m; 0 or more. Spread evenly over its length.</param>
/// <param name="StartCentreM">Elevation of its centre at the upper end, m.</param>
/// <param name="EndCentreM">Elevation of its centre at the lower end, m.</param>
public sealed record TransientPipe(
    string Name, double LengthM, double AreaM2, double WaveSpeedMPerS, double SteadyLossM, double StartCentreM, double EndCentreM)
{
    /// <summary>Time a wave needs through it, s: L/a.</summary>
    public double TravelTimeS => LengthM / WaveSpeedMPerS;
}

/// <summary>A reservoir, pipes in series and the machine at their end, running steadily until it trips.</summary>
/// <param name="Pipes">Pipes in the order of the flow; at least one.</param>
/// <param name="FlowM3PerS">Flow that is stopped, m3/s; above 0.</param>
/// <param name="HeadwaterM">Level of the reservoir, m; it holds.</param>
/// <param name="TailwaterM">Level behind the machine, m; it holds.</param>
/// <param name="GravityMPerS2">Acceleration of gravity, m/s2.</param>
/// <param name="SeparationHeadM">Pressure head at which the water column parts, m gauge: vapour pressure less the pressure of the air, (p_v - p_a)/γ, below 0.</param>
public sealed record TransientCase(
    IReadOnlyList<TransientPipe> Pipes, double FlowM3PerS, double HeadwaterM, double TailwaterM, double GravityMPerS2, double SeparationHeadM)
{
    /// <summary>Time a wave needs from the machine to the intake, s: Σ L/a.</summary>
    public double TravelTimeS => Pipes.Sum(p => p.TravelTimeS);

    /// <summary>Σ L V, m2/s: what takes the place of L V where pipes are joined in series.</summary>
    public double MomentumM2PerS => Pipes.Sum(p => p.LengthM * FlowM3PerS / p.AreaM2);

    /// <summary>Steady head before the machine over the tailwater, m.</summary>
    public double NetHeadM => HeadwaterM - TailwaterM - Pipes.Sum(p => p.SteadyLossM);

    /// <summary>True where the case can be run: there is a pipe, a flow and a head left before the machine.</summary>
    public bool IsSound => Pipes.Count > 0 && FlowM3PerS is > 0 and < double.PositiveInfinity && NetHeadM is > 0 and < double.PositiveInfinity
        && GravityMPerS2 > 0 && double.IsFinite(SeparationHeadM)
        && Pipes.All(p => p.LengthM > 0 && p.AreaM2 > 0 && p.WaveSpeedMPerS > 0 && p.SteadyLossM >= 0 && double.IsFinite(p.StartCentreM) && double.IsFinite(p.EndCentreM) && double.IsFinite(p.TravelTimeS));
}
