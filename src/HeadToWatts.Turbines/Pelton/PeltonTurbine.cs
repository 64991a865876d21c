using HeadToWatts.Turbines.Sizing;

namespace HeadToWatts.Turbines.Pelton;

/// <summary>Pelton: jets on the buckets of a wheel in air; high head, little flow.</summary>
public static class PeltonTurbine
{
    /// <summary>The type.</summary>
    public static TurbineType Type { get; } = new(
        "pelton",
        "Pelton",
        HeadFlowEnvelope.FromVertices(
            new(0.001, 30), new(0.02, 30), new(0.3, 60), new(3, 120), new(20, 300), new(20, 1300), new(0.01, 1300), new(0.001, 200)),
        EfficiencyCurve.FromTable(
            [(0.05, 0.60), (0.1, 0.73), (0.2, 0.83), (0.3, 0.86), (0.4, 0.88), (0.6, 0.89), (0.8, 0.88), (1.0, 0.87)], "Pelton").Value,
        0.10,
        new SpecificSpeedBand(4, 26, 6),
        new RunawayRatio(1.8, 1.9),
        false,
        "Creeks and pipelines with high head and little flow; also in place of a pressure reducer where the water leaves to the air.",
        "The wheel hangs above the highest tailwater and the fall below it is lost. Nozzles clog and wear with sand; close them slowly, a deflector takes the jet away at once.",
        "Holds its efficiency down to about a tenth of full flow, by spear or by shutting jets: the best of all types at low flow.",
        [
            new(TurbineFigure.Envelope, TurbineReferences.HeadRanges, "usual head 50 to 1300 m"),
            new(TurbineFigure.Envelope, TurbineReferences.TypicalEnvelopes, "flows, and heads from 30 m for very small wheels"),
            new(TurbineFigure.Efficiency, TurbineReferences.TypicalEfficiency, "two jets or more"),
            new(TurbineFigure.LeastFlow, TurbineReferences.TypicalLeastFlow, ""),
            new(TurbineFigure.SpecificSpeed, TurbineReferences.TypicalSpecificSpeed, "4 to 26 per jet, up to six jets"),
            new(TurbineFigure.SpecificSpeed, TurbineReferences.SpecificSpeedRanges, "4 to 70 in metric hp for the wheel, whatever its jets"),
            new(TurbineFigure.Runaway, TurbineReferences.RunawaySpeeds, "1.8 to 1.9"),
            new(TurbineFigure.Uses, TurbineReferences.TypicalUses, ""),
        ])
    {
        Sizing = new JetWheelSizing(0.451, 9),
    };
}
