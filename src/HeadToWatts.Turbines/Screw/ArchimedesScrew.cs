namespace HeadToWatts.Turbines.Screw;

/// <summary>Archimedes screw: water travels down in the pockets of a slowly turning screw; very low head.</summary>
public static class ArchimedesScrew
{
    /// <summary>The type.</summary>
    public static TurbineType Type { get; } = new(
        "screw",
        "Archimedes screw",
        HeadFlowEnvelope.FromVertices(
            new(0.1, 1), new(10, 1), new(10, 7), new(6, 10), new(0.2, 10), new(0.1, 5)),
        EfficiencyCurve.FromTable(
            [(0.1, 0.58), (0.2, 0.69), (0.3, 0.76), (0.4, 0.79), (0.6, 0.82), (0.8, 0.82), (1.0, 0.79)], "Archimedes screw").Value,
        0.15,
        new SpecificSpeedBand(20, 170),
        new RunawayRatio(1.5, 2.0),
        false,
        "Weirs and canal drops of very low head; lets fish and floating matter pass; coarse racks are enough.",
        "Large and heavy for its power, always geared. A tailwater that rises drowns the lower end and takes head and efficiency away.",
        "Efficiency stays flat down to about a third of full flow, better still with variable speed.",
        [
            new(TurbineFigure.Envelope, TurbineReferences.TypicalEnvelopes, "head 1 to 10 m, flow up to 10 m3/s for one screw"),
            new(TurbineFigure.Efficiency, TurbineReferences.TypicalEfficiency, ""),
            new(TurbineFigure.LeastFlow, TurbineReferences.TypicalLeastFlow, ""),
            new(TurbineFigure.SpecificSpeed, TurbineReferences.TypicalSpecificSpeed, "what the speed rule gives within the envelope; it does not set the speed"),
            new(TurbineFigure.Runaway, TurbineReferences.TypicalRunaway, ""),
            new(TurbineFigure.Uses, TurbineReferences.TypicalUses, ""),
        ])
    {
        OwnSpeedRule = new ScrewSpeed(),
    };
}
