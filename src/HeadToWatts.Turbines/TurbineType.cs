using HeadToWatts.Basis.Sources;
using HeadToWatts.Turbines.Sizing;

namespace HeadToWatts.Turbines;

/// <summary>A kind of turbine: where it works, how well, how fast, and who says so. Figures are for one unit.</summary>
/// <param name="Id">Key: lower-case words with hyphens.</param>
/// <param name="Name">Name in the trade.</param>
/// <param name="Envelope">The heads and flows such units are usually built for.</param>
/// <param name="Efficiency">Typical efficiency of a small unit against the ratio of its flow to its full flow.</param>
/// <param name="LeastFlowRatio">Least flow at which a unit is kept running, as a ratio of its full flow, 0 to 1.</param>
/// <param name="SpecificSpeed">Usual specific speeds.</param>
/// <param name="Runaway">Speed without load against rated speed.</param>
/// <param name="UsesDraftTube">True when the head below the runner is recovered by a draft tube, so that setting and cavitation matter.</param>
/// <param name="Uses">Where it is usually put, in words.</param>
/// <param name="Limits">What speaks against it, in words.</param>
/// <param name="AtLowFlow">How it behaves when flow is low, in words.</param>
/// <param name="Sources">Which figure comes from where.</param>
public sealed record TurbineType(
    string Id,
    string Name,
    HeadFlowEnvelope Envelope,
    EfficiencyCurve Efficiency,
    double LeastFlowRatio,
    SpecificSpeedBand SpecificSpeed,
    RunawayRatio Runaway,
    bool UsesDraftTube,
    string Uses,
    string Limits,
    string AtLowFlow,
    IReadOnlyList<TurbineSource> Sources)
{
    /// <summary>
    /// The rule that sets the speed of machines too slow for any generator on the same shaft (screw, water wheel); null where the
    /// specific speed sets it.
    /// </summary>
    public RunnerSpeedRule? OwnSpeedRule { get; init; }

    /// <summary>The rule for the size of its runner; null where this project has none.</summary>
    public RunnerSizing? Sizing { get; init; }

    /// <summary>Which table of critical cavitation coefficients its runner follows; null where the setting is the maker's matter, or the runner turns in air.</summary>
    public RunnerFlow? CavitationTable { get; init; }

    /// <summary>The name.</summary>
    public override string ToString() => Name;
}

/// <summary>How water goes through a runner under pressure.</summary>
public enum RunnerFlow
{
    /// <summary>Inward and then along the shaft (Francis).</summary>
    Mixed,

    /// <summary>Along the shaft (Kaplan, propeller).</summary>
    Axial,
}

/// <summary>The figures of a turbine type that need a source.</summary>
public enum TurbineFigure
{
    /// <summary>The head-flow envelope.</summary>
    Envelope,

    /// <summary>The efficiency curve.</summary>
    Efficiency,

    /// <summary>The least flow.</summary>
    LeastFlow,

    /// <summary>The band of specific speeds.</summary>
    SpecificSpeed,

    /// <summary>The runaway ratio.</summary>
    Runaway,

    /// <summary>Uses, limits and behaviour at low flow.</summary>
    Uses,
}

/// <summary>Where a figure of a turbine type comes from.</summary>
/// <param name="Figure">The figure.</param>
/// <param name="Source">Its source.</param>
/// <param name="Note">What was taken from it, in words; may be empty.</param>
public sealed record TurbineSource(TurbineFigure Figure, Source Source, string Note);

/// <summary>Speed without load at full head and open gate, as a multiple of the rated speed.</summary>
/// <param name="Lowest">Lower end of the usual ratio.</param>
/// <param name="Highest">Upper end; generator and gear must survive it.</param>
public sealed record RunawayRatio(double Lowest, double Highest);

/// <summary>Usual specific speeds n_s = n P^{1/2} / H^{5/4} with n in rpm, P in kW and H in m, of one runner; of one jet where the machine has jets.</summary>
/// <param name="LowestKwM">Lower end.</param>
/// <param name="HighestKwM">Upper end.</param>
/// <param name="MostJets">Most jets on one runner; 1 for machines without jets.</param>
public sealed record SpecificSpeedBand(double LowestKwM, double HighestKwM, int MostJets = 1)
{
    /// <summary>Geometric middle of the band.</summary>
    public double MiddleKwM => Math.Sqrt(LowestKwM * HighestKwM);

    /// <summary>True when the specific speed (per jet, where the machine has jets) lies in the band.</summary>
    public bool Contains(double specificSpeedKwM) => specificSpeedKwM >= LowestKwM && specificSpeedKwM <= HighestKwM;
}
