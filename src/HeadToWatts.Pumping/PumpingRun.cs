using HeadToWatts.Basis.Sources;
using HeadToWatts.Hydraulics.Water;

namespace HeadToWatts.Pumping;

/// <summary>What a pumping plant takes.</summary>
/// <param name="Plant">The plant.</param>
/// <param name="UnitsByMonth">Units of energy bought in each month, January first.</param>
/// <param name="HoursByMonth">Hours running in each month.</param>
/// <param name="DemandKw">Electric power while running, kW; zero for engines.</param>
/// <param name="RatingRatio">Water energy per unit bought over that of the criterion: 1 is a good plant.</param>
/// <param name="AchievableUnits">Units a year if the plant met the criterion.</param>
public sealed record PumpingPlantResult(
    PumpingPlant Plant, IReadOnlyList<double> UnitsByMonth, IReadOnlyList<double> HoursByMonth, double DemandKw, double RatingRatio, double AchievableUnits)
{
    /// <summary>Units bought in a year.</summary>
    public double AnnualUnits => UnitsByMonth.Sum();

    /// <summary>Units a year that a repair to the criterion would save; zero for a plant that meets it.</summary>
    public double SavedUnits => Math.Max(0, AnnualUnits - AchievableUnits);

    /// <summary>Cost of a year; null without a price.</summary>
    public double? AnnualCostAmount => Plant.PricePerUnit * AnnualUnits;

    /// <summary>Units for each cubic metre lifted; zero when nothing is lifted.</summary>
    public double UnitsPerM3 => Plant.AnnualVolumeM3 > 0 ? AnnualUnits / Plant.AnnualVolumeM3 : 0;
}

/// <summary>Pumping plants over a year.</summary>
/// <param name="Plants">Each plant.</param>
/// <param name="ElectricByMonthKwh">Electricity of all of them in each month, January first, kWh.</param>
/// <param name="Uses">The methods used.</param>
public sealed record PumpingResult(IReadOnlyList<PumpingPlantResult> Plants, IReadOnlyList<double> ElectricByMonthKwh, IReadOnlyList<MethodUse> Uses)
{
    /// <summary>Electricity of a year, kWh.</summary>
    public double ElectricKwh => ElectricByMonthKwh.Sum();
}

/// <summary>Runs pumping plants.</summary>
public static class PumpingRun
{
    /// <summary>What the plants take in a year.</summary>
    /// <param name="plants">The plants.</param>
    /// <param name="site">Water at the site.</param>
    public static PumpingResult Of(IReadOnlyList<PumpingPlant> plants, SiteConditions site)
    {
        ArgumentNullException.ThrowIfNull(plants);
        ArgumentNullException.ThrowIfNull(site);
        var results = plants.Select(p => Of(p, site)).ToList();
        return new PumpingResult(
            results,
            [.. Enumerable.Range(0, 12).Select(m => results.Where(r => r.Plant.Source.IsElectric).Sum(r => r.UnitsByMonth[m]))],
            [PumpingMethods.PumpPower.Used(), PumpingMethods.Performance.Used()]);
    }

    private static PumpingPlantResult Of(PumpingPlant plant, SiteConditions site)
    {
        // A unit holds 1 kWh of electricity; of a fuel, the water energy a criterion plant lifts with it, so that the efficiency of a fuel plant is its rating.
        var kwhPerUnit = plant.Source.IsElectric ? 1 : plant.Source.WaterKwhPerUnit;
        var waterKwhPerM3 = site.SpecificWeightNPerM3 * plant.Head.TotalM / 3.6e6;
        var unitsPerM3 = waterKwhPerM3 / plant.PlantEfficiency / kwhPerUnit;
        var demandKw = plant.Source.IsElectric ? site.SpecificWeightNPerM3 * plant.FlowM3PerS * plant.Head.TotalM / 1000 / plant.PlantEfficiency : 0;
        return new PumpingPlantResult(
            plant,
            [.. plant.VolumesM3.Select(v => v * unitsPerM3)],
            [.. plant.VolumesM3.Select(v => v / plant.FlowM3PerS / 3600)],
            demandKw,
            plant.PlantEfficiency * kwhPerUnit / plant.Source.WaterKwhPerUnit,
            plant.AnnualVolumeM3 * waterKwhPerM3 / plant.Source.WaterKwhPerUnit);
    }
}
