using HeadToWatts.Basis.Sources;
using HeadToWatts.Turbines.Screw;
using HeadToWatts.Turbines.Sizing;
using HeadToWatts.Turbines.WaterWheel;

namespace HeadToWatts.Turbines;

/// <summary>The published methods of this stage.</summary>
public static class TurbineMethods
{
    private const double None = double.PositiveInfinity;

    /// <summary>Specific speed in rpm, kW and m.</summary>
    public static Method SpecificSpeedKwM { get; } = new(
        "specific-speed-kw-m", "Specific speed of a turbine (rpm, kW, m)", "n_s = n P^{1/2} / H^{5/4}", TurbineReferences.Nag, "chapter 10",
        [new InputRange("n", "speed", "rpm", 0, None), new InputRange("P", "power of one runner", "kW", 0, None), new InputRange("H", "net head", "m", 0, None)]);

    /// <summary>Specific speed in rpm, US horsepower and feet.</summary>
    public static Method SpecificSpeedUsHpFt { get; } = new(
        "specific-speed-us-hp-ft", "Specific speed of a turbine (rpm, hp, ft)", "N_s = N P^{1/2} / H^{5/4}", TurbineReferences.DaughertyFranzini, "chapters 15 and 16",
        [new InputRange("N", "speed", "rpm", 0, None), new InputRange("P", "power of one runner", "hp", 0, None), new InputRange("H", "net head", "ft", 0, None)]);

    /// <summary>Specific speed without dimension.</summary>
    public static Method SpecificSpeedDimensionless { get; } = new(
        "specific-speed-dimensionless", "Specific speed without dimension", "n_{QE} = n Q^{1/2} / E^{3/4}", TurbineReferences.Iec60193, "",
        [new InputRange("n", "speed", "1/s", 0, None), new InputRange("Q", "flow of one runner", "m3/s", 0, None), new InputRange("E", "specific hydraulic energy", "J/kg", 0, None)]);

    /// <summary>Power specific speed in radians.</summary>
    public static Method PowerSpecificSpeed { get; } = new(
        "power-specific-speed", "Power specific speed", "Ω_{sp} = Ω (P/ρ)^{1/2} / (g H)^{5/4}", TurbineReferences.Dixon, "chapter 9", []);

    /// <summary>Specific speed restated in other units.</summary>
    public static Method SpecificSpeedConversions { get; } = new(
        "specific-speed-conversions", "Specific speed restated in other units", "n_s(kW, m) = 3.813 N_s(hp, ft) = 0.8576 n_s(metric hp, m)", TurbineReferences.UnitAlgebra, "", []);

    /// <summary>Synchronous speed.</summary>
    public static Method SynchronousSpeed { get; } = new(
        "synchronous-speed", "Synchronous speed", "n = 120 f / p", TurbineReferences.SynchronousMachines, "",
        [new InputRange("f", "frequency", "Hz", 0, None), new InputRange("p", "poles", "1", 2, None)]);

    /// <summary>Every method; each has expected values from outside under its id.</summary>
    public static IReadOnlyList<Method> All { get; } =
    [
        SpecificSpeedKwM,
        SpecificSpeedUsHpFt,
        SpecificSpeedDimensionless,
        PowerSpecificSpeed,
        SpecificSpeedConversions,
        SynchronousSpeed,
        ScrewSpeed.Speed,
        WaterWheelSpeed.Speed,
        JetWheelSizing.Method,
        CrossflowSizing.Method,
        ReactionSizing.Method,
        ScrewSizing.Method,
        RunnerSetting.CriticalSigma,
        RunnerSetting.Highest,
        PumpCorrelations.Method,
        MoodyStepUp.Method,
        Units.HeldSpeed.Method,
        Units.HillChart.Method,
    ];
}
