using HeadToWatts.EnergyYield;
using HeadToWatts.Studies.Inputs;
using HeadToWatts.Turbines.Units;

namespace HeadToWatts.Studies;

/// <summary>What the energy becomes when the turbine's efficiency is lower than believed.</summary>
internal static class CurveError
{
    /// <summary>How much lower, as is usually asked: three points.</summary>
    internal const double Points = 0.03;

    internal static double LowerKwh(AlternativeInput input, PlantDesign design, FlowSupply supply)
    {
        var lower = design with
        {
            Units = design.Units.With(design.Units.Efficiency.Shifted(-Points)),
            HeadBehaviour = design.HeadBehaviour?.Lowered(Points),
        };
        return AnnualEnergy.Of(YearOfParts.Make(input, lower, supply).Parts).AnnualEnergyKwh;
    }
}
