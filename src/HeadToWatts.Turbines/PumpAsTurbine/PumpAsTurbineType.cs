namespace HeadToWatts.Turbines.PumpAsTurbine;

/// <summary>Pump as turbine: a stock pump that runs backwards; steady flow, low price.</summary>
public static class PumpAsTurbineType
{
    /// <summary>The type.</summary>
    public static TurbineType Type { get; } = new(
        "pump-as-turbine",
        "pump as turbine",
        HeadFlowEnvelope.FromVertices(
            new(0.005, 15), new(0.02, 8), new(0.6, 8), new(0.8, 15), new(0.8, 60), new(0.3, 150), new(0.005, 150)),
        EfficiencyCurve.FromTable(
            [(0.5, 0.20), (0.6, 0.44), (0.7, 0.60), (0.8, 0.71), (0.9, 0.77), (1.0, 0.79)], "pump as turbine").Value,
        0.80,
        new SpecificSpeedBand(25, 250),
        new RunawayRatio(1.3, 1.7),
        true,
        "Pressure pipelines with steady flow, beside or in place of a pressure reducer; cheap, quickly delivered, mended by any pump shop.",
        "No guide vanes: flow follows head. Makers rarely give turbine curves, and conversions from pump curves scatter by 20 percent.",
        "Efficiency falls steeply below its best flow; it is shut down at about 80 percent, and several units or a bypass take the rest.",
        [
            new(TurbineFigure.Envelope, TurbineReferences.TypicalEnvelopes, "head 10 m to well above 100 m"),
            new(TurbineFigure.Efficiency, TurbineReferences.TypicalEfficiency, "a unit chosen so that its best flow is the full flow"),
            new(TurbineFigure.LeastFlow, TurbineReferences.TypicalLeastFlow, ""),
            new(TurbineFigure.SpecificSpeed, TurbineReferences.TypicalSpecificSpeed, "end-suction and split-case pumps"),
            new(TurbineFigure.Runaway, TurbineReferences.TypicalRunaway, "1.3 to 1.7"),
            new(TurbineFigure.Uses, TurbineReferences.TypicalUses, ""),
        ]);
}
