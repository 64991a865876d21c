using HeadToWatts.Turbines.Sizing;

namespace HeadToWatts.Turbines.Propeller;

/// <summary>Propeller: axial flow through fixed blades; low head, steady flow.</summary>
public static class PropellerTurbine
{
    /// <summary>The type.</summary>
    public static TurbineType Type { get; } = new(
        "propeller",
        "propeller",
        HeadFlowEnvelope.FromVertices(
            new(0.05, 1.5), new(150, 1.5), new(300, 3), new(300, 20), new(100, 30), new(0.5, 30), new(0.05, 8)),
        EfficiencyCurve.FromTable(
            [(0.4, 0.35), (0.5, 0.48), (0.6, 0.60), (0.7, 0.71), (0.8, 0.80), (0.9, 0.86), (1.0, 0.88)], "propeller").Value,
        0.75,
        new SpecificSpeedBand(257, 943),
        new RunawayRatio(1.8, 2.6),
        true,
        "Low head with steady flow, or several units switched in one after another; simpler and cheaper than a Kaplan.",
        "No turndown: blades are fixed. The setting is limited by cavitation, and runaway is high.",
        "Efficiency falls steeply below three quarters of full flow, where it is shut down; more, smaller units help.",
        [
            new(TurbineFigure.Envelope, TurbineReferences.HongKongTurbines, "usual head 2 to 30 m"),
            new(TurbineFigure.Envelope, TurbineReferences.TypicalEnvelopes, "flows, and heads from 1.5 m"),
            new(TurbineFigure.Efficiency, TurbineReferences.TypicalEfficiency, "fixed blades and fixed or movable guide vanes"),
            new(TurbineFigure.LeastFlow, TurbineReferences.TypicalLeastFlow, ""),
            new(TurbineFigure.SpecificSpeed, TurbineReferences.SpecificSpeedRanges, "300 to 1100 in metric hp, that of the Kaplan"),
            new(TurbineFigure.Runaway, TurbineReferences.TypicalRunaway, "1.8 to 2.6"),
            new(TurbineFigure.Uses, TurbineReferences.TypicalUses, ""),
        ])
    {
        Sizing = ReactionSizing.Kaplan,
        CavitationTable = RunnerFlow.Axial,
    };
}
