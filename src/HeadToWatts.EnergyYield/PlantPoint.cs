namespace HeadToWatts.EnergyYield;

/// <summary>How the plant runs on one flow.</summary>
/// <param name="UsableFlowM3PerS">Flow that it may use, m3/s.</param>
/// <param name="TurbineFlowM3PerS">Flow through the turbines, m3/s; zero when it stands.</param>
/// <param name="UnitsRunning">Units running.</param>
/// <param name="NetHeadM">Net head, m; the gross head when it stands.</param>
/// <param name="TurbineEfficiency">Turbine efficiency, 0 to 1.</param>
/// <param name="ShaftPowerKw">Power at the shaft, kW.</param>
/// <param name="MeterPowerKw">Power at the meter while it is fit to run, kW; below zero while it stands and a transformer stays live.</param>
public readonly record struct PlantPoint(
    double UsableFlowM3PerS,
    double TurbineFlowM3PerS,
    int UnitsRunning,
    double NetHeadM,
    double TurbineEfficiency,
    double ShaftPowerKw,
    double MeterPowerKw)
{
    /// <summary>Gross head at this flow, m.</summary>
    public double GrossHeadM { get; init; }

    /// <summary>Full flow of the running units over that of all units, 0 to 1.</summary>
    public double RunningShare { get; init; }

    /// <summary>How unevenly the running units are loaded: mean square of their loads over the square of the mean, weighted by size over all units.</summary>
    public double LoadSpread { get; init; }

    /// <summary>True when water goes through a turbine.</summary>
    public bool IsRunning => TurbineFlowM3PerS > 0;
}
