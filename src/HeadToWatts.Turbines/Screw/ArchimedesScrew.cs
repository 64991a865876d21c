using HeadToWatts.Basis.Sources;
using HeadToWatts.Turbines.Sizing;

namespace HeadToWatts.Turbines.Screw;

/// <summary>Archimedes screw: water travels down in the pockets of a slowly turning screw; very low head.</summary>
public static class ArchimedesScrew
{
    private static readonly Source ScrewSites = new("eco-evolution-screws", SourceKind.Published, "Eco Evolution", "", "Archimedean screw hydro turbine: fish friendly generation", "ecoevolution.ie; a supplier's page");

    private static readonly Source YoosefDoostLubitz = new("yoosefdoost-lubitz-2020", SourceKind.Published, "A. YoosefDoost and W. D. Lubitz", "2020", "Archimedes screw turbines: a sustainable development solution for green and renewable energy generation", "Sustainability 12(18), 7352");

    private static readonly Source Lashofer = new("lashofer-2012", SourceKind.Published, "A. Lashofer, W. Hawle, I. Kampel, F. Kaltenberger and B. Pelikan", "2012", "State of technology and design guidelines for the Archimedes screw turbine", "University of Natural Resources and Life Sciences, Vienna");

    /// <summary>The type.</summary>
    public static TurbineType Type { get; } = new(
        "screw",
        "Archimedes screw",
        HeadFlowEnvelope.FromVertices(
            new(0.1, 1), new(10, 1), new(10, 7), new(6, 10), new(0.2, 10), new(0.1, 5)),
        EfficiencyCurve.FromTable(
            [(0.1, 0.56), (0.2, 0.67), (0.3, 0.74), (0.4, 0.77), (0.6, 0.80), (0.8, 0.80), (1.0, 0.78)], "Archimedes screw").Value,
        0.20,
        new SpecificSpeedBand(10, 170),
        new RunawayRatio(1.5, 2.0),
        false,
        "Weirs and canal drops of very low head; lets fish and floating matter pass; coarse racks are enough.",
        "Large and heavy for its power, always geared. A tailwater that rises drowns the lower end and takes head and efficiency away.",
        "Efficiency stays flat down to about a third of full flow, better still with variable speed.",
        [
            new(TurbineFigure.Envelope, ScrewSites, "fall 1 to 10 m, flow 100 to 10,000 L/s; corners cut from memory"),
            new(TurbineFigure.Efficiency, YoosefDoostLubitz, "60 to 80 percent in practice"),
            new(TurbineFigure.Efficiency, Lashofer, "plants 69 percent on average, the best above 75 percent, generator included"),
            new(TurbineFigure.Efficiency, TurbineReferences.TypicalEfficiency, "shape of the curve"),
            new(TurbineFigure.LeastFlow, ScrewSites, "efficient down to 20 percent of full flow"),
            new(TurbineFigure.SpecificSpeed, TurbineReferences.TypicalSpecificSpeed, "what the speed rule gives within the envelope; it does not set the speed"),
            new(TurbineFigure.Runaway, TurbineReferences.TypicalRunaway, ""),
            new(TurbineFigure.Uses, TurbineReferences.TypicalUses, ""),
        ])
    {
        Sizing = new ScrewSizing(),
        OwnSpeedRule = new ScrewSpeed(),
    };
}
