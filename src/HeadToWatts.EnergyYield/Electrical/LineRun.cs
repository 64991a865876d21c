namespace HeadToWatts.EnergyYield.Electrical;

/// <summary>A line from the plant to the meter.</summary>
/// <param name="LengthM">Length of the run, one way, m.</param>
/// <param name="VoltageV">Voltage at the meter, V: between phases of a three-phase line, between the two wires of a single-phase one.</param>
/// <param name="Phases">3 or 1.</param>
/// <param name="Size">Size of each conductor.</param>
/// <param name="Metal">Its metal.</param>
/// <param name="TemperatureDegC">Temperature of the conductor in use, °C.</param>
public sealed record LineRun(double LengthM, double VoltageV, int Phases, ConductorSize Size, ConductorMetal Metal, double TemperatureDegC)
{
    /// <summary>Resistance of one conductor, ohm.</summary>
    public double ResistanceOhm => Conductors.ResistanceOhm(Metal, Size.AreaMm2, LengthM, TemperatureDegC);

    /// <summary>Current in each conductor, A, when so much arrives at the meter.</summary>
    /// <param name="meterKw">Power at the meter, kW.</param>
    /// <param name="powerFactor">Power factor, 0 to 1.</param>
    public double CurrentA(double meterKw, double powerFactor) => meterKw * 1000 / ((Phases == 3 ? Math.Sqrt(3) : 1) * VoltageV * powerFactor);

    /// <summary>Loss, kW, when so much arrives at the meter.</summary>
    /// <param name="meterKw">Power at the meter, kW.</param>
    /// <param name="powerFactor">Power factor, 0 to 1.</param>
    public double LossKw(double meterKw, double powerFactor) => PerKw(powerFactor) * meterKw * meterKw;

    // Three conductors carry P/(sqrt 3 V cos φ) each, so 3 I^2 R = R P^2/(V cos φ)^2; two carry P/(V cos φ), so twice that.
    internal double PerKw(double powerFactor) => (Phases == 3 ? 1 : 2) * ResistanceOhm * 1000 / (VoltageV * VoltageV * powerFactor * powerFactor);
}
