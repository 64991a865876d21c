using HeadToWatts.Turbines;

namespace HeadToWatts.EnergyYield;

/// <summary>A turbine type weighed on this site's flows and head.</summary>
/// <param name="Type">The type.</param>
/// <param name="UnitCount">Number of equal units that suits it best here.</param>
/// <param name="UnitFlowM3PerS">Design flow of one unit, m3/s.</param>
/// <param name="NetHeadM">Net head at the design flow, m.</param>
/// <param name="Fit">How one unit lies in the head-flow envelope at its design flow.</param>
/// <param name="EnergyKwhByUnits">Annual energy with 1, 2, 3 and 4 units, kWh.</param>
/// <param name="AnnualEnergyKwh">Annual energy with the chosen number, kWh.</param>
/// <param name="MeterPowerKw">Power at the meter at full flow, kW.</param>
/// <param name="LeastFlowM3PerS">Least usable flow on which it runs, m3/s.</param>
/// <param name="ShareOfYearBelowLeast">Share of the year with some usable water, but too little to run on.</param>
/// <param name="EfficiencyAtHalfLoad">Turbine efficiency with one unit at half its design flow.</param>
/// <param name="PeakEfficiency">Highest turbine efficiency.</param>
/// <param name="Speed">Speed and specific speed at the design point.</param>
public sealed record TurbineCandidate(
    TurbineType Type,
    int UnitCount,
    double UnitFlowM3PerS,
    double NetHeadM,
    EnvelopeFit Fit,
    IReadOnlyList<double> EnergyKwhByUnits,
    double AnnualEnergyKwh,
    double MeterPowerKw,
    double LeastFlowM3PerS,
    double ShareOfYearBelowLeast,
    double EfficiencyAtHalfLoad,
    double PeakEfficiency,
    SpeedChoice? Speed);
