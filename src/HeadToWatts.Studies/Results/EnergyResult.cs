using HeadToWatts.EnergyYield;

namespace HeadToWatts.Studies.Results;

/// <summary>What the study found of the energy.</summary>
/// <param name="Plant">Power over usable flow.</param>
/// <param name="Annual">The year over the duration curve.</param>
/// <param name="Days">The record run day by day; null without a record.</param>
/// <param name="Curve">Points of the power curve from zero to the largest usable flow, for drawing.</param>
/// <param name="PowerAtMeanFlowKwh">What the power at the mean flow times 8760 h would claim, kWh: shown to warn against it.</param>
public sealed record EnergyResult(PlantCurve Plant, AnnualEnergy Annual, DailyRun? Days, IReadOnlyList<PlantPoint> Curve, double PowerAtMeanFlowKwh);
