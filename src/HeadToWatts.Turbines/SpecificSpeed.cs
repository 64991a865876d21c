using HeadToWatts.Basis;

namespace HeadToWatts.Turbines;

/// <summary>
/// Specific speed in the forms in use. The forms differ by factors of 1.2 to 4.4, so the units are part of every name. Power is that
/// of one runner, never of the whole plant; for machines with jets the per-jet value is the one compared with a band.
/// </summary>
public static class SpecificSpeed
{
    /// <summary>Metric horsepower, kW: 75 kgf m/s.</summary>
    public const double MetricHorsepowerKw = 75 * PhysicalConstants.StandardGravityMPerS2 / 1000;

    /// <summary>US (mechanical) horsepower, kW: 550 ft lbf/s.</summary>
    public const double UsHorsepowerKw = 550 * MetresPerFoot * KilogramsPerPound * PhysicalConstants.StandardGravityMPerS2 / 1000;

    private const double MetresPerFoot = 0.3048;
    private const double KilogramsPerPound = 0.45359237;
    private static readonly double KwMPerUsHpFt = Math.Sqrt(UsHorsepowerKw) / Math.Pow(MetresPerFoot, 1.25);
    private static readonly double KwMPerMetricHpM = Math.Sqrt(MetricHorsepowerKw);

    /// <summary>n_s = n P^{1/2} / H^{5/4} in rpm, kW, m.</summary>
    /// <param name="speedRpm">Speed, rpm.</param>
    /// <param name="powerKw">Shaft power of one runner, kW.</param>
    /// <param name="netHeadM">Net head, m.</param>
    public static double KwM(double speedRpm, double powerKw, double netHeadM)
    {
        Require(speedRpm, nameof(speedRpm));
        Require(powerKw, nameof(powerKw));
        Require(netHeadM, nameof(netHeadM));
        return speedRpm * Math.Sqrt(powerKw) / Math.Pow(netHeadM, 1.25);
    }

    /// <summary>n_s = n P^{1/2} / H^{5/4} in rpm, metric horsepower, m.</summary>
    /// <param name="speedRpm">Speed, rpm.</param>
    /// <param name="powerMetricHp">Shaft power of one runner, metric horsepower.</param>
    /// <param name="netHeadM">Net head, m.</param>
    public static double MetricHpM(double speedRpm, double powerMetricHp, double netHeadM) => KwM(speedRpm, powerMetricHp, netHeadM);

    /// <summary>N_s = N P^{1/2} / H^{5/4} in rpm, US horsepower, ft.</summary>
    /// <param name="speedRpm">Speed, rpm.</param>
    /// <param name="powerUsHp">Shaft power of one runner, US horsepower.</param>
    /// <param name="netHeadFt">Net head, ft.</param>
    public static double UsHpFt(double speedRpm, double powerUsHp, double netHeadFt) => KwM(speedRpm, powerUsHp, netHeadFt);

    /// <summary>n_{QE} = n Q^{1/2} / E^{3/4} without dimension, with n in revolutions per second and E = g H.</summary>
    /// <param name="speedRpm">Speed, rpm.</param>
    /// <param name="flowM3PerS">Flow of one runner, m3/s.</param>
    /// <param name="specificEnergyJPerKg">Specific hydraulic energy E = g H, J/kg.</param>
    public static double Dimensionless(double speedRpm, double flowM3PerS, double specificEnergyJPerKg)
    {
        Require(speedRpm, nameof(speedRpm));
        Require(flowM3PerS, nameof(flowM3PerS));
        Require(specificEnergyJPerKg, nameof(specificEnergyJPerKg));
        return speedRpm / 60 * Math.Sqrt(flowM3PerS) / Math.Pow(specificEnergyJPerKg, 0.75);
    }

    /// <summary>Power specific speed Ω_{sp} = Ω (P/ρ)^{1/2} / (g H)^{5/4}, in radians.</summary>
    /// <param name="speedRpm">Speed, rpm.</param>
    /// <param name="powerW">Shaft power of one runner, W.</param>
    /// <param name="densityKgPerM3">Density of the water, kg/m3.</param>
    /// <param name="specificEnergyJPerKg">Specific hydraulic energy g H, J/kg.</param>
    public static double PowerRad(double speedRpm, double powerW, double densityKgPerM3, double specificEnergyJPerKg)
    {
        Require(speedRpm, nameof(speedRpm));
        Require(powerW, nameof(powerW));
        Require(densityKgPerM3, nameof(densityKgPerM3));
        Require(specificEnergyJPerKg, nameof(specificEnergyJPerKg));
        return speedRpm * Math.Tau / 60 * Math.Sqrt(powerW / densityKgPerM3) / Math.Pow(specificEnergyJPerKg, 1.25);
    }

    /// <summary>The speed (rpm) of a runner of this specific speed (rpm, kW, m), power (kW) and net head (m).</summary>
    public static double SpeedRpm(double specificSpeedKwM, double powerKw, double netHeadM)
    {
        Require(specificSpeedKwM, nameof(specificSpeedKwM));
        Require(powerKw, nameof(powerKw));
        Require(netHeadM, nameof(netHeadM));
        return specificSpeedKwM * Math.Pow(netHeadM, 1.25) / Math.Sqrt(powerKw);
    }

    /// <summary>Specific speed of one jet from that of the runner: power is shared by the jets, so n_s / z^{1/2}.</summary>
    /// <param name="specificSpeedKwM">Specific speed of the runner (rpm, kW, m).</param>
    /// <param name="jets">Number of jets on the runner.</param>
    public static double PerJetKwM(double specificSpeedKwM, int jets)
    {
        ArgumentOutOfRangeException.ThrowIfLessThan(jets, 1);
        return specificSpeedKwM / Math.Sqrt(jets);
    }

    /// <summary>From rpm, US hp, ft to rpm, kW, m: times 3.813.</summary>
    public static double KwMFromUsHpFt(double specificSpeedUsHpFt) => specificSpeedUsHpFt * KwMPerUsHpFt;

    /// <summary>From rpm, kW, m to rpm, US hp, ft: times 0.26226.</summary>
    public static double UsHpFtFromKwM(double specificSpeedKwM) => specificSpeedKwM / KwMPerUsHpFt;

    /// <summary>From rpm, metric hp, m to rpm, kW, m: times 0.8576.</summary>
    public static double KwMFromMetricHpM(double specificSpeedMetricHpM) => specificSpeedMetricHpM * KwMPerMetricHpM;

    /// <summary>From rpm, kW, m to rpm, metric hp, m: times 1.166.</summary>
    public static double MetricHpMFromKwM(double specificSpeedKwM) => specificSpeedKwM / KwMPerMetricHpM;

    /// <summary>From rpm, US hp, ft to rpm, metric hp, m: times 4.446.</summary>
    public static double MetricHpMFromUsHpFt(double specificSpeedUsHpFt) => MetricHpMFromKwM(KwMFromUsHpFt(specificSpeedUsHpFt));

    /// <summary>From n_{QE} to rpm, kW, m: n_s = 60 g^{5/4} (ρ η/1000)^{1/2} n_{QE}.</summary>
    /// <param name="specificSpeedDimensionless">n_{QE}.</param>
    /// <param name="efficiency">Efficiency of the turbine, 0 to 1.</param>
    /// <param name="densityKgPerM3">Density of the water, kg/m3.</param>
    /// <param name="gravityMPerS2">Acceleration of gravity, m/s2.</param>
    public static double KwMFromDimensionless(double specificSpeedDimensionless, double efficiency, double densityKgPerM3, double gravityMPerS2)
    {
        Require(efficiency, nameof(efficiency));
        Require(densityKgPerM3, nameof(densityKgPerM3));
        Require(gravityMPerS2, nameof(gravityMPerS2));
        return 60 * Math.Pow(gravityMPerS2, 1.25) * Math.Sqrt(densityKgPerM3 * efficiency / 1000) * specificSpeedDimensionless;
    }

    private static void Require(double value, string name)
    {
        if (!(value > 0) || double.IsInfinity(value))
            throw new ArgumentOutOfRangeException(name, value, "Must be a positive number.");
    }
}
