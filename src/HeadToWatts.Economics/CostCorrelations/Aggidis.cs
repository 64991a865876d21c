using HeadToWatts.Basis.Quantities;
using HeadToWatts.Basis.Sources;

namespace HeadToWatts.Economics.CostCorrelations;

/// <summary>Aggidis, Luchinskaya, Rothschild and Howard: small plants in Britain.</summary>
public static class Aggidis
{
    /// <summary>The source, as it is remembered.</summary>
    public static Source Source { get; } = new("aggidis-2010", SourceKind.Memory, "G. A. Aggidis, E. Luchinskaya, R. Rothschild and D. C. Howard", "2010", "The costs of small-scale hydro power production", "Renewable Energy 35, 2632-2638");

    private static MoneyBasis Pounds { get; } = MoneyBasis.Of("GBP", 2008);

    /// <summary>Turbine and generator.</summary>
    public static CostCorrelation Machine { get; } = new(
        "aggidis-machine", "Aggidis and others 2010", CostScope.Machine, "small plants in Britain, head 2 to 30 m", Pounds, "C = 12000 (P/H^{0.2})^{0.56}", Source,
        Power, new InputRange("H", "head", "m", 2, 30), (kw, m) => 12_000 * Math.Pow(kw / Math.Pow(m, 0.2), 0.56));

    /// <summary>Whole plants at low heads.</summary>
    public static CostCorrelation LowHead { get; } = new(
        "aggidis-low-head", "Aggidis and others 2010", CostScope.Project, "small plants in Britain, head 2 to 30 m", Pounds, "C = 25000 (P/H^{0.35})^{0.65}", Source,
        Power, new InputRange("H", "head", "m", 2, 30), (kw, m) => 25_000 * Math.Pow(kw / Math.Pow(m, 0.35), 0.65));

    /// <summary>Whole plants at higher heads.</summary>
    public static CostCorrelation HighHead { get; } = new(
        "aggidis-high-head", "Aggidis and others 2010", CostScope.Project, "small plants in Britain, head 30 to 200 m", Pounds, "C = 45500 (P/H^{0.3})^{0.6}", Source,
        Power, new InputRange("H", "head", "m", 30, 200), (kw, m) => 45_500 * Math.Pow(kw / Math.Pow(m, 0.3), 0.6));

    private static InputRange Power => new("P", "power", "kW", 25, 990);
}
