using HeadToWatts.Turbines.Sizing;

namespace HeadToWatts.Turbines.Crossflow;

/// <summary>Crossflow: a sheet of water that crosses a drum of blades twice; simple, forgiving, of moderate efficiency.</summary>
public static class CrossflowTurbine
{
    /// <summary>The type.</summary>
    public static TurbineType Type { get; } = new(
        "crossflow",
        "crossflow",
        HeadFlowEnvelope.FromVertices(
            new(0.04, 2), new(10, 2), new(10, 15), new(1.5, 150), new(0.8, 200), new(0.03, 200), new(0.02, 60), new(0.02, 6)),
        EfficiencyCurve.FromTable(
            [(0.1, 0.60), (0.15, 0.67), (0.2, 0.71), (0.3, 0.76), (0.4, 0.78), (0.6, 0.79), (0.8, 0.79), (1.0, 0.77)], "crossflow").Value,
        0.15,
        new SpecificSpeedBand(20, 200),
        new RunawayRatio(1.8, 2.0),
        false,
        "Small sites of low to medium head with flow that varies much; leaves and sand pass through; can be built and mended locally.",
        "Peak efficiency is well below a Francis or Kaplan. The runner stands above tailwater, so a little head is lost, which weighs at low head.",
        "With two cells of one third and two thirds the efficiency is nearly flat down to about a sixth of full flow.",
        [
            new(TurbineFigure.Envelope, TurbineReferences.HeadRanges, "usual head 2 to 200 m"),
            new(TurbineFigure.Envelope, TurbineReferences.TypicalEnvelopes, "flows"),
            new(TurbineFigure.Efficiency, TurbineReferences.TypicalEfficiency, "two cells"),
            new(TurbineFigure.LeastFlow, TurbineReferences.TypicalLeastFlow, ""),
            new(TurbineFigure.SpecificSpeed, TurbineReferences.TypicalSpecificSpeed, "20 to 200"),
            new(TurbineFigure.Runaway, TurbineReferences.TypicalRunaway, "1.8 to 2.0"),
            new(TurbineFigure.Uses, TurbineReferences.TypicalUses, ""),
        ])
    {
        Sizing = new CrossflowSizing(),
    };
}
