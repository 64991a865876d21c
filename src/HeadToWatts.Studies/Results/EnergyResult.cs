using HeadToWatts.EnergyYield;

namespace HeadToWatts.Studies.Results;

/// <summary>What the study found of the energy.</summary>
/// <param name="Plant">Power over usable flow.</param>
/// <param name="Annual">The year over the duration curve.</param>
/// <param name="Days">The record run day by day; null without a record.</param>
/// <param name="Curve">Points of the power curve from zero to the largest usable flow, for drawing.</param>
/// <param name="PowerAtMeanFlowKwh">What the power at the mean flow times 8760 h would claim, kWh: shown to warn against it.</param>
public sealed record EnergyResult(PlantCurve Plant, AnnualEnergy Annual, DailyRun? Days, IReadOnlyList<PlantPoint> Curve, double PowerAtMeanFlowKwh)
{
    /// <summary>Annual energy with the head lower and higher by its stated error; null when no error is stated.</summary>
    public EnergyRange? WithHeadError { get; init; }

    /// <summary>Annual energy with the turbine's efficiency three points lower at every load, kWh.</summary>
    public double ThreePointsLowerKwh { get; init; }

    /// <summary>From the shaft to the meter in detail; null where every step keeps a constant ratio.</summary>
    public ElectricalResult? Electrical { get; init; }
}

/// <summary>Annual energy at the two ends of an error.</summary>
/// <param name="LowKwh">With the head lower by the error, kWh.</param>
/// <param name="HighKwh">With the head higher by the error, kWh.</param>
public sealed record EnergyRange(double LowKwh, double HighKwh);
