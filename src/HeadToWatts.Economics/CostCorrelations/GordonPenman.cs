using HeadToWatts.Basis.Quantities;
using HeadToWatts.Basis.Sources;

namespace HeadToWatts.Economics.CostCorrelations;

/// <summary>Gordon and Penman: turbine and generator of small plants.</summary>
public static class GordonPenman
{
    /// <summary>The source, as it is remembered.</summary>
    public static Source Source { get; } = new("gordon-penman-1979", SourceKind.Memory, "J. L. Gordon and A. C. Penman", "1979", "Quick estimating techniques for small hydro potential", "Water Power and Dam Construction");

    /// <summary>Cost = 9000 P^0.7 H^-0.35.</summary>
    public static CostCorrelation Machine { get; } = new(
        "gordon-penman", "Gordon and Penman 1979", CostScope.Machine, "new small plants", MoneyBasis.Of("USD", 1978), "C = 9000 P^{0.7} H^{−0.35}", Source,
        new InputRange("P", "power", "kW", 0, 5000), new InputRange("H", "head", "m", 0, double.PositiveInfinity), (kw, m) => 9000 * Math.Pow(kw, 0.7) * Math.Pow(m, -0.35));
}
