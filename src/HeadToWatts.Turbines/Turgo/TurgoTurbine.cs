using HeadToWatts.Basis.Sources;
using HeadToWatts.Turbines.Sizing;

namespace HeadToWatts.Turbines.Turgo;

/// <summary>Turgo: jets that strike the runner at an angle and leave on the other side; more flow than a Pelton at less head.</summary>
public static class TurgoTurbine
{
    private static readonly Source CobbSharp = new("cobb-sharp-2013", SourceKind.Published, "B. R. Cobb and K. V. Sharp", "2013", "Impulse (Turgo and Pelton) turbine performance characteristics and their impact on pico-hydro installations", "Renewable Energy 50, 959-964");

    /// <summary>The type.</summary>
    public static TurbineType Type { get; } = new(
        "turgo",
        "Turgo",
        HeadFlowEnvelope.FromVertices(
            new(0.003, 25), new(0.1, 25), new(1, 50), new(6, 80), new(6, 250), new(0.008, 250), new(0.003, 100)),
        EfficiencyCurve.FromTable(
            [(0.1, 0.62), (0.2, 0.76), (0.3, 0.80), (0.4, 0.82), (0.6, 0.84), (0.8, 0.84), (1.0, 0.82)], "Turgo").Value,
        0.20,
        new SpecificSpeedBand(20, 70, 3),
        new RunawayRatio(1.8, 1.9),
        false,
        "Medium to high head with more flow than suits a Pelton; stands up to dirty water; runs faster, so the generator is smaller.",
        "Efficiency a little below a Pelton. The runner stands above tailwater and pushes along the shaft, which the bearings must take.",
        "Efficiency stays flat down to about a fifth of full flow.",
        [
            new(TurbineFigure.Envelope, TurbineReferences.HeadRanges, "usual head 50 to 250 m"),
            new(TurbineFigure.Envelope, TurbineReferences.TypicalEnvelopes, "flows, and heads from 25 m for small runners"),
            new(TurbineFigure.Efficiency, TurbineReferences.TypicalEfficiency, ""),
            new(TurbineFigure.Efficiency, CobbSharp, "over 80 percent measured on a very small runner"),
            new(TurbineFigure.LeastFlow, TurbineReferences.TypicalLeastFlow, ""),
            new(TurbineFigure.SpecificSpeed, TurbineReferences.TypicalSpecificSpeed, "20 to 70 per jet, up to three jets"),
            new(TurbineFigure.Runaway, TurbineReferences.TypicalRunaway, "1.8 to 1.9"),
            new(TurbineFigure.Uses, TurbineReferences.TypicalUses, ""),
        ])
    {
        Sizing = new JetWheelSizing(0.451, 4),
    };
}
