using HeadToWatts.Basis.Sources;

namespace HeadToWatts.EnergyYield.Electrical;

/// <summary>The methods between the shaft and the meter.</summary>
public static class ElectricalMethods
{
    private const double None = double.PositiveInfinity;

    /// <summary>J. Bird: losses of a transformer.</summary>
    public static Source Bird { get; } = new("bird-circuit-theory", SourceKind.Published, "J. Bird", "", "Electrical Circuit Theory and Technology", "chapter 20, transformer losses and efficiency");

    /// <summary>Chakrabarti and others: loss of a three-phase line.</summary>
    public static Source Chakrabarti { get; } = new("chakrabarti-power-system", SourceKind.Published, "A. Chakrabarti, M. L. Soni, P. V. Gupta and U. S. Bhatnagar", "", "A Textbook on Power System Engineering", "Dhanpat Rai, part II, chapter 3");

    /// <summary>Typical efficiencies of generators by size.</summary>
    public static Source GeneratorSizes { get; } = Source.Memory("generator-sizes", "Efficiency of small synchronous generators by size, after the European guide on small hydropower (ESHA 2004, table 6.8); induction machines after the motor standard CSA C390");

    /// <summary>Resistance of wires.</summary>
    public static Source Wires { get; } = new("hyperphysics-wire", SourceKind.Published, "R. Nave", "", "HyperPhysics: American wire gauges; resistivity of copper and its change with temperature", "Georgia State University; aluminium from memory of IEC 60889");

    /// <summary>Losses of a machine.</summary>
    public static Source MachineLosses { get; } = Source.CommonPractice("machine-losses", "Losses of an electrical machine as a constant part and a part with the square of the load");

    /// <summary>Efficiency of a generator by its size.</summary>
    public static Method GeneratorSize { get; } = new(
        "generator-efficiency", "Efficiency of a generator by its size", "η_g(P_r)", GeneratorSizes, "straight lines over the logarithm of the rated power",
        [new InputRange("P_r", "rated power", "kW", 3.5, 1000)]);

    /// <summary>Losses of a generator over its load.</summary>
    public static Method GeneratorLosses { get; } = new(
        "generator-losses", "Losses of a generator over its load", "P_{loss} = P_r (1/η_r − 1)(s + (1 − s)(P/P_r)^2)", MachineLosses, "", []);

    /// <summary>Losses of a transformer.</summary>
    public static Method TransformerLosses { get; } = new(
        "transformer-losses", "No-load and load losses of a transformer", "P_{loss} = P_0 + P_k (P/(cos φ S_r))^2", Bird, "chapter 20", []);

    /// <summary>Loss of a line.</summary>
    public static Method LineLoss { get; } = new(
        "line-loss", "Loss of a line", "P_{loss} = R P^2/(V^2 cos^2 φ)", Chakrabarti, "example 3.2; two conductors carry single phase, so 2 R", [new InputRange("φ", "power factor", "1", 0.3, 1)]);

    /// <summary>Resistance of a conductor.</summary>
    public static Method ConductorResistance { get; } = new(
        "conductor-resistance", "Resistance of a conductor", "R = ρ_{20} (1 + α(T − 20)) L/A", Wires, "", [new InputRange("T", "conductor temperature", "°C", -40, 100)]);

    /// <summary>Area of a conductor by American wire gauge.</summary>
    public static Method WireGauge { get; } = new(
        "american-wire-gauge", "Diameter by American wire gauge", "d = 0.127 mm × 92^{(36−n)/39}", Source.Memory("astm-b258", "ASTM B258: standard nominal diameters of solid round wires"), "",
        [new InputRange("n", "gauge, 0 for 1/0, −1 for 2/0", "1", -3, 36)]);

    /// <summary>Every method between the shaft and the meter.</summary>
    public static IReadOnlyList<Method> All { get; } = [GeneratorSize, GeneratorLosses, TransformerLosses, LineLoss, ConductorResistance, WireGauge];
}
