using HeadToWatts.Basis.Quantities;
using HeadToWatts.Basis.Sources;

namespace HeadToWatts.Economics.CostCorrelations;

/// <summary>Hall, Hunt, Reeves and Carroll: licensing and construction in the United States.</summary>
public static class Hall
{
    /// <summary>The source, as it is remembered.</summary>
    public static Source Source { get; } = new("hall-2003", SourceKind.Memory, "D. G. Hall, R. T. Hunt, K. S. Reeves and G. R. Carroll", "2003", "Estimation of economic parameters of U.S. hydropower resources", "INEEL/EXT-03-00662");

    private static MoneyBasis Dollars { get; } = MoneyBasis.Of("USD", 2002);

    /// <summary>Sites without works.</summary>
    public static CostCorrelation Undeveloped { get; } = new(
        "hall-undeveloped", "Hall and others 2003", CostScope.Project, "undeveloped sites, licensing and construction", Dollars, "C = 0.61 × 10^6 P^{0.7} + 3.3 × 10^6 P^{0.9}, P in MW", Source,
        Power, Any, (kw, _) => (610_000 * Math.Pow(kw / 1000, 0.7)) + (3_300_000 * Math.Pow(kw / 1000, 0.9)));

    /// <summary>Dams without power.</summary>
    public static CostCorrelation Dam { get; } = new(
        "hall-dam", "Hall and others 2003", CostScope.Project, "dams without power, licensing and construction", Dollars, "C = 0.31 × 10^6 P^{0.7} + 2.2 × 10^6 P^{0.81}, P in MW", Source,
        Power, Any, (kw, _) => (310_000 * Math.Pow(kw / 1000, 0.7)) + (2_200_000 * Math.Pow(kw / 1000, 0.81)));

    private static InputRange Power => new("P", "power", "kW", 1000, 100_000);

    private static InputRange Any => new("H", "head", "m", 0, double.PositiveInfinity);
}
