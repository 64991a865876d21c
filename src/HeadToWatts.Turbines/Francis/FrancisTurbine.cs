using HeadToWatts.Basis.Sources;
using HeadToWatts.Turbines.Sizing;

namespace HeadToWatts.Turbines.Francis;

/// <summary>Francis: inward flow through guide vanes and a fixed runner under pressure; medium head.</summary>
public static class FrancisTurbine
{
    private static readonly Source RoughZone = new("hydroco-rated-flow", SourceKind.Published, "hydroco.ca", "", "Glossary: rated flow", "hydroco.ca/glossary");

    /// <summary>The type.</summary>
    public static TurbineType Type { get; } = new(
        "francis",
        "Francis",
        HeadFlowEnvelope.FromVertices(
            new(0.08, 30), new(0.5, 13), new(30, 13), new(100, 25), new(100, 150), new(20, 350), new(0.3, 350), new(0.08, 60)),
        EfficiencyCurve.FromTable(
            [(0.2, 0.40), (0.3, 0.56), (0.4, 0.69), (0.5, 0.78), (0.6, 0.84), (0.7, 0.88), (0.8, 0.90), (0.9, 0.90), (1.0, 0.88)], "Francis").Value,
        0.40,
        new SpecificSpeedBand(51, 343),
        new RunawayRatio(2.0, 2.2),
        true,
        "Medium head with steady flow: pressure pipelines, dams, falls served by a penstock. Can discharge against pressure.",
        "Guide vanes and seals want clean water. The setting above tailwater is limited by cavitation. Closing it, or a runaway, stops water quickly: check the surge.",
        "Efficiency falls and the draft tube runs roughly below about half of full flow; it is shut down at about 40 percent.",
        [
            new(TurbineFigure.Envelope, TurbineReferences.HeadRanges, "usual head 25 to 350 m"),
            new(TurbineFigure.Envelope, TurbineReferences.HongKongTurbines, "down to 2 m; the envelope here stops at 13 m, below which small Francis turbines are seldom made any more"),
            new(TurbineFigure.Envelope, TurbineReferences.TypicalEnvelopes, "flows, and heads from 13 m for small units"),
            new(TurbineFigure.Efficiency, TurbineReferences.TypicalEfficiency, ""),
            new(TurbineFigure.LeastFlow, RoughZone, "rough zone at about 40 percent of rated flow"),
            new(TurbineFigure.SpecificSpeed, TurbineReferences.SpecificSpeedRanges, "60 to 400 in metric hp"),
            new(TurbineFigure.SpecificSpeed, TurbineReferences.Britannica, "10 to 90 in hp and ft"),
            new(TurbineFigure.Runaway, TurbineReferences.RunawaySpeeds, "2.0 to 2.2"),
            new(TurbineFigure.Uses, TurbineReferences.TypicalUses, ""),
        ])
    {
        Sizing = ReactionSizing.Francis,
        CavitationTable = RunnerFlow.Mixed,
    };
}
