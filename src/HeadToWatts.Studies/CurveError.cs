using HeadToWatts.EnergyYield;

namespace HeadToWatts.Studies;

/// <summary>What the energy becomes when the turbine's efficiency is lower than believed.</summary>
internal static class CurveError
{
    /// <summary>How much lower, as is usually asked: three points.</summary>
    internal const double Points = 0.03;

    private const int SharesOfYear = 400;

    // Both plants are run on the same equal shares of the year and their ratio taken, so that what the shares miss falls out: every keystroke asks for this.
    internal static double LowerKwh(PlantCurve plant, FlowSupply supply, double annualEnergyKwh)
    {
        var design = plant.Design with { QuickLosses = new LossTable(plant.Design.Waterway, plant.Design.Site, plant.Design.Units.DesignFlowM3PerS) };
        var lower = new PlantCurve(design with
        {
            Units = design.Units.With(design.Units.Efficiency.Shifted(-Points)),
            HeadBehaviour = design.HeadBehaviour?.Lowered(Points),
        });
        var own = new PlantCurve(design);
        double ownKw = 0, lowerKw = 0;
        foreach (var flow in supply.MiddlesM3PerS(SharesOfYear))
        {
            ownKw += own.At(flow).MeterPowerKw;
            lowerKw += lower.At(flow).MeterPowerKw;
        }

        return ownKw > 0 ? annualEnergyKwh * lowerKw / ownKw : annualEnergyKwh;
    }
}
