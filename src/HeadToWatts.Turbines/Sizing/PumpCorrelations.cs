using HeadToWatts.Basis.Sources;

namespace HeadToWatts.Turbines.Sizing;

/// <summary>A published way of going from a pump's best point to its best point as a turbine.</summary>
/// <param name="Name">Its authors.</param>
/// <param name="Formula">Flow ratio q and head ratio h, in the notation of formulas.</param>
/// <param name="FlowRatio">Flow as turbine over flow as pump, from the pump's efficiency.</param>
/// <param name="HeadRatio">Head as turbine over head as pump, from the pump's efficiency.</param>
public sealed record PumpCorrelation(string Name, string Formula, Func<double, double> FlowRatio, Func<double, double> HeadRatio);

/// <summary>Pump as turbine: several correlations beside each other, because they scatter.</summary>
public static class PumpCorrelations
{
    /// <summary>How far measured machines lie from any correlation, as a ratio.</summary>
    public const double ScatterRatio = 0.2;

    private static readonly Source Reviews = Source.Memory("pump-as-turbine-reviews", "Correlations of Stepanoff, Sharma and Williams, Yang and others 2012, Childs, and Alatorre-Frenk, as reviews of pumps as turbines quote them; coefficients from memory, scatter about 20 percent");

    /// <summary>The method.</summary>
    public static Method Method { get; } = new(
        "pump-as-turbine", "From a pump's best point to its best point as a turbine", "Q_t = q(η_p) Q_p, H_t = h(η_p) H_p", Reviews, "",
        [new InputRange("η_p", "best efficiency as a pump", "1", 0.6, 0.88)]);

    /// <summary>The correlations.</summary>
    public static IReadOnlyList<PumpCorrelation> All { get; } =
    [
        new("Stepanoff", "q = 1/η_p^{1/2}, h = 1/η_p", e => 1 / Math.Sqrt(e), e => 1 / e),
        new("Childs", "q = 1/η_p, h = 1/η_p", e => 1 / e, e => 1 / e),
        new("Sharma and Williams", "q = 1/η_p^{0.8}, h = 1/η_p^{1.2}", e => Math.Pow(e, -0.8), e => Math.Pow(e, -1.2)),
        new("Yang and others", "q = 1.2/η_p^{0.55}, h = 1.2/η_p^{1.1}", e => 1.2 * Math.Pow(e, -0.55), e => 1.2 * Math.Pow(e, -1.1)),
        new("Alatorre-Frenk", "h = 1/(0.85 η_p^5 + 0.385), q = (0.85 η_p^5 + 0.385)/(2 η_p^{9.5} + 0.205)", e => ((0.85 * Math.Pow(e, 5)) + 0.385) / ((2 * Math.Pow(e, 9.5)) + 0.205), e => 1 / ((0.85 * Math.Pow(e, 5)) + 0.385)),
    ];
}

/// <summary>A pump's best point from its catalogue.</summary>
/// <param name="FlowM3PerS">Flow, m3/s.</param>
/// <param name="HeadM">Head, m.</param>
/// <param name="Efficiency">Efficiency there, 0 to 1.</param>
/// <param name="SpeedRpm">Speed for which the catalogue states it, rpm.</param>
public sealed record PumpPoint(double FlowM3PerS, double HeadM, double Efficiency, double SpeedRpm);

/// <summary>One correlation applied.</summary>
/// <param name="Correlation">The correlation.</param>
/// <param name="FlowM3PerS">Best flow as turbine, or of the pump to look for, m3/s.</param>
/// <param name="HeadM">Best head as turbine, or of the pump to look for, m.</param>
public readonly record struct PumpEstimate(PumpCorrelation Correlation, double FlowM3PerS, double HeadM);

/// <summary>What the correlations say of a pump as turbine, as a band.</summary>
/// <param name="Pump">The pump; null when the estimates are of the pump to look for.</param>
/// <param name="PumpEfficiency">Efficiency as a pump that was used, 0 to 1.</param>
/// <param name="Estimates">One for each correlation.</param>
/// <param name="SiteFlowM3PerS">Flow of one unit at this site, m3/s.</param>
/// <param name="SiteHeadM">Net head at this site, m.</param>
/// <param name="Use">The method used.</param>
public sealed record PumpBand(PumpPoint? Pump, double PumpEfficiency, IReadOnlyList<PumpEstimate> Estimates, double SiteFlowM3PerS, double SiteHeadM, MethodUse Use)
{
    /// <summary>Efficiency of the pump to look for when none is named.</summary>
    public const double UsualPumpEfficiency = 0.75;

    /// <summary>Least of the flows, m3/s.</summary>
    public double LowestFlowM3PerS => Estimates.Min(e => e.FlowM3PerS);

    /// <summary>Greatest of the flows, m3/s.</summary>
    public double HighestFlowM3PerS => Estimates.Max(e => e.FlowM3PerS);

    /// <summary>Least of the heads, m.</summary>
    public double LowestHeadM => Estimates.Min(e => e.HeadM);

    /// <summary>Greatest of the heads, m.</summary>
    public double HighestHeadM => Estimates.Max(e => e.HeadM);

    /// <summary>True when a pump is named and this site's flow and head lie in the band, widened by the scatter.</summary>
    public bool HoldsSite => Pump is not null
        && SiteFlowM3PerS >= LowestFlowM3PerS * (1 - PumpCorrelations.ScatterRatio) && SiteFlowM3PerS <= HighestFlowM3PerS * (1 + PumpCorrelations.ScatterRatio)
        && SiteHeadM >= LowestHeadM * (1 - PumpCorrelations.ScatterRatio) && SiteHeadM <= HighestHeadM * (1 + PumpCorrelations.ScatterRatio);

    /// <summary>The band of a pump, or of the pump to look for.</summary>
    /// <param name="pump">The pump; null for the one to look for.</param>
    /// <param name="siteFlowM3PerS">Flow of one unit, m3/s.</param>
    /// <param name="siteHeadM">Net head, m.</param>
    public static PumpBand Of(PumpPoint? pump, double siteFlowM3PerS, double siteHeadM)
    {
        var efficiency = pump?.Efficiency ?? UsualPumpEfficiency;
        return new PumpBand(
            pump,
            efficiency,
            [.. PumpCorrelations.All.Select(c => pump is null
                ? new PumpEstimate(c, siteFlowM3PerS / c.FlowRatio(efficiency), siteHeadM / c.HeadRatio(efficiency))
                : new PumpEstimate(c, pump.FlowM3PerS * c.FlowRatio(efficiency), pump.HeadM * c.HeadRatio(efficiency)))],
            siteFlowM3PerS,
            siteHeadM,
            PumpCorrelations.Method.Used(new InputSpan("η_p", efficiency, efficiency)));
    }
}
