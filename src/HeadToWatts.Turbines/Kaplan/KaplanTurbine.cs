using HeadToWatts.Turbines.Sizing;

namespace HeadToWatts.Turbines.Kaplan;

/// <summary>Kaplan: axial flow with guide vanes and runner blades that both turn; low head, flow that varies.</summary>
public static class KaplanTurbine
{
    /// <summary>The type.</summary>
    public static TurbineType Type { get; } = new(
        "kaplan",
        "Kaplan",
        HeadFlowEnvelope.FromVertices(
            new(0.7, 1.5), new(300, 1.5), new(500, 3), new(500, 30), new(200, 40), new(1.5, 40), new(0.5, 10)),
        EfficiencyCurve.FromTable(
            [(0.1, 0.52), (0.15, 0.63), (0.2, 0.70), (0.3, 0.80), (0.4, 0.85), (0.5, 0.88), (0.6, 0.89), (0.7, 0.90), (0.8, 0.90), (1.0, 0.88)], "Kaplan").Value,
        0.20,
        new SpecificSpeedBand(257, 943),
        new RunawayRatio(2.5, 3.0),
        true,
        "Canal drops and river weirs of low head with flow that changes through the season; double regulated.",
        "The dearest machine for each kilowatt at low head, with the most moving parts. Highest runaway: gear and generator must survive it. The setting is limited by cavitation.",
        "Blades and guide vanes turn together, so that efficiency stays high down to about a quarter of full flow.",
        [
            new(TurbineFigure.Envelope, TurbineReferences.HeadRanges, "usual head 2 to 40 m"),
            new(TurbineFigure.Envelope, TurbineReferences.TypicalEnvelopes, "flows, and heads from 1.5 m"),
            new(TurbineFigure.Efficiency, TurbineReferences.TypicalEfficiency, ""),
            new(TurbineFigure.LeastFlow, TurbineReferences.TypicalLeastFlow, "15 to 20 percent; the higher is taken"),
            new(TurbineFigure.SpecificSpeed, TurbineReferences.SpecificSpeedRanges, "300 to 1100 in metric hp"),
            new(TurbineFigure.Runaway, TurbineReferences.RunawaySpeeds, "2.5 to 3.0"),
            new(TurbineFigure.Uses, TurbineReferences.TypicalUses, ""),
        ])
    {
        Sizing = ReactionSizing.Kaplan,
        CavitationTable = RunnerFlow.Axial,
    };
}
