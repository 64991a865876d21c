namespace HeadToWatts.EnergyYield;

/// <summary>
/// What lies between the turbine shaft and the meter, as constant ratios of 0 to 1, and how much of the time the plant is fit to run.
/// </summary>
/// <param name="DriveEfficiency">Gear or belt between turbine and generator; 1 when they share a shaft.</param>
/// <param name="GeneratorEfficiency">Generator.</param>
/// <param name="TransformerEfficiency">Transformer.</param>
/// <param name="LineEfficiency">Line from the transformer to the meter.</param>
/// <param name="OwnUseRatio">Share of the generator's output that the plant itself uses while it runs.</param>
/// <param name="OwnUseKw">Power that the plant itself draws while it runs, kW.</param>
/// <param name="Availability">Share of the time in which the plant can run when there is water.</param>
public sealed record PowerTrain(
    double DriveEfficiency,
    double GeneratorEfficiency,
    double TransformerEfficiency,
    double LineEfficiency,
    double OwnUseRatio,
    double OwnUseKw,
    double Availability)
{
    /// <summary>Power at the meter from power at the shaft, kW. Below zero where the plant would use more than it makes; <see cref="PlantCurve"/> then keeps it standing.</summary>
    /// <param name="shaftPowerKw">Power at the turbine shaft, kW.</param>
    public double MeterPowerKw(double shaftPowerKw)
    {
        var generatedKw = shaftPowerKw * DriveEfficiency * GeneratorEfficiency;
        return ((generatedKw * (1 - OwnUseRatio)) - OwnUseKw) * TransformerEfficiency * LineEfficiency;
    }

    /// <summary>Power at the generator's terminals from power at the shaft, kW.</summary>
    /// <param name="shaftPowerKw">Power at the turbine shaft, kW.</param>
    public double GeneratedPowerKw(double shaftPowerKw) => shaftPowerKw * DriveEfficiency * GeneratorEfficiency;
}
