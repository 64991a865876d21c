using HeadToWatts.Basis.Sources;

namespace HeadToWatts.Turbines.WaterWheel;

/// <summary>Water wheel, overshot or breastshot: the weight of the water in the buckets turns a large slow wheel.</summary>
public static class WaterWheelTurbine
{
    private static readonly Source Overshot = new("waterwheelfactory-overshot", SourceKind.Published, "waterwheelfactory.com", "", "The overshot water wheel", "waterwheelfactory.com; a maker's page");

    /// <summary>The type.</summary>
    public static TurbineType Type { get; } = new(
        "water-wheel",
        "water wheel",
        HeadFlowEnvelope.FromVertices(
            new(0.1, 1.2), new(3, 1.2), new(3, 4), new(0.8, 10), new(0.05, 10), new(0.05, 3)),
        EfficiencyCurve.FromTable(
            [(0.1, 0.57), (0.2, 0.67), (0.3, 0.72), (0.5, 0.75), (0.8, 0.75), (0.9, 0.74), (1.0, 0.71)], "water wheel").Value,
        0.15,
        new SpecificSpeedBand(0.2, 35),
        new RunawayRatio(1.6, 2.0),
        false,
        "Old mill sites and small canal drops where a wheel is wanted for its looks, its passing of debris, or local building.",
        "Large for its power, always geared, with high torque. A tailwater that rises brakes it.",
        "Efficiency stays good down to about a fifth of full flow: half-filled buckets spill later.",
        [
            new(TurbineFigure.Envelope, TurbineReferences.TypicalEnvelopes, "overshot 2.5 to 10 m, breastshot from 1.2 m"),
            new(TurbineFigure.Efficiency, Overshot, "70 to 75 percent, overshot"),
            new(TurbineFigure.Efficiency, TurbineReferences.TypicalEfficiency, "shape of the curve"),
            new(TurbineFigure.LeastFlow, TurbineReferences.TypicalLeastFlow, ""),
            new(TurbineFigure.SpecificSpeed, TurbineReferences.TypicalSpecificSpeed, "what the speed rule gives within the envelope; it does not set the speed"),
            new(TurbineFigure.Runaway, TurbineReferences.TypicalRunaway, ""),
            new(TurbineFigure.Uses, TurbineReferences.TypicalUses, ""),
        ])
    {
        OwnSpeedRule = new WaterWheelSpeed(),
    };
}
