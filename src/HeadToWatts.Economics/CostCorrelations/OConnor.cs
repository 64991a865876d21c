using HeadToWatts.Basis.Quantities;
using HeadToWatts.Basis.Sources;

namespace HeadToWatts.Economics.CostCorrelations;

/// <summary>O'Connor and others: initial capital cost in the United States.</summary>
public static class OConnor
{
    /// <summary>The source, as it is remembered.</summary>
    public static Source Source { get; } = new("oconnor-2015", SourceKind.Memory, "P. O'Connor and others", "2015", "Hydropower baseline cost modeling, version 2", "ORNL/TM-2015/471");

    /// <summary>New plants on a stream.</summary>
    public static CostCorrelation NewStream { get; } = new(
        "oconnor-new-stream", "O'Connor and others 2015", CostScope.Project, "new plants on a stream", MoneyBasis.Of("USD", 2014), "C = 9605710 P^{0.977} H^{−0.126}, P in MW, H in ft", Source,
        new InputRange("P", "power", "kW", 100, double.PositiveInfinity), new InputRange("H", "head", "m", 0, double.PositiveInfinity), (kw, m) => 9_605_710 * Math.Pow(kw / 1000, 0.977) * Math.Pow(m / 0.3048, -0.126));
}
