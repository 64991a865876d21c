using HeadToWatts.Basis;

namespace HeadToWatts.EnergyYield;

/// <summary>A plant's year over the whole duration curve.</summary>
/// <param name="AnnualEnergyKwh">Energy at the meter in a mean year, kWh.</param>
/// <param name="InstalledPowerKw">Power at the generator's terminals with all units at their best, kW.</param>
/// <param name="MeterPowerKw">Power at the meter at the same time, kW.</param>
/// <param name="PlantFactor">Annual energy over installed power times 8760 h.</param>
/// <param name="RunningHours">Hours a year in which water goes through a turbine, h.</param>
/// <param name="FullLoadHours">Annual energy over installed power, h.</param>
/// <param name="Water">Where the water goes.</param>
/// <param name="Staircase">Where the energy goes.</param>
/// <param name="Integral">The means behind these figures.</param>
public sealed record AnnualEnergy(
    double AnnualEnergyKwh,
    double InstalledPowerKw,
    double MeterPowerKw,
    double PlantFactor,
    double RunningHours,
    double FullLoadHours,
    WaterBalance Water,
    EnergyStaircase Staircase,
    YearIntegral Integral)
{
    /// <summary>Runs a plant over a year of flows.</summary>
    /// <param name="plant">The plant.</param>
    /// <param name="supply">The flows.</param>
    public static AnnualEnergy Of(PlantCurve plant, FlowSupply supply) => Of([new YearPart(plant, supply)]);

    /// <summary>Runs a plant over the parts of a year.</summary>
    /// <param name="parts">Parts that together make the year, each dry outside its part; at least one.</param>
    public static AnnualEnergy Of(IReadOnlyList<YearPart> parts)
    {
        ArgumentNullException.ThrowIfNull(parts);
        var year = parts.Count == 1 ? YearIntegral.Over(parts[0].Plant, parts[0].Supply) : YearIntegral.Sum([.. parts.Select(p => YearIntegral.Over(p.Plant, p.Supply))]);
        var best = parts.MaxBy(p => p.Plant.BestPowerKw)!.Plant;
        var train = best.Design.Train;
        var availability = train.Availability;
        var energyKwh = year.MeterPowerKw * PhysicalConstants.HoursPerYear * availability;
        var top = best.At(best.BestUsableFlowM3PerS);
        var installedKw = train.IsConstant ? train.GeneratedPowerKw(top.ShaftPowerKw) : top.IsRunning ? train.At(top.ShaftPowerKw, top.RunningShare, top.LoadSpread).GeneratedKw : 0;
        var fullLoadHours = installedKw > 0 ? energyKwh / installedKw : 0;
        return new AnnualEnergy(
            energyKwh,
            installedKw,
            top.IsRunning ? top.MeterPowerKw : 0,
            fullLoadHours / PhysicalConstants.HoursPerYear,
            year.RunningShare * availability * PhysicalConstants.HoursPerYear,
            fullLoadHours,
            Balance(parts, year, availability),
            EnergyStaircase.Of(year, train, PhysicalConstants.HoursPerYear),
            year);
    }

    // Every part is integrated on its own, so that the balance is a check and not a definition: spill alone is the rest.
    private static WaterBalance Balance(IReadOnlyList<YearPart> parts, YearIntegral year, double availability)
    {
        const double s = PhysicalConstants.SecondsPerYear;
        double arriving = 0, prior = 0, reserved = 0;
        foreach (var supply in parts.Select(part => part.Supply))
        {
            var p = supply.Exceedance;
            var q = supply.ArrivingM3PerS;
            for (var i = 0; i + 1 < p.Length; i++)
            {
                var half = (p[i + 1] - p[i]) / 2;
                var a = supply.Allocation.Split(q[i]);
                var b = supply.Allocation.Split(q[i + 1]);
                arriving += half * (q[i] + q[i + 1]);
                prior += half * (a.PriorM3PerS + b.PriorM3PerS);
                reserved += half * (a.ReservedM3PerS + b.ReservedM3PerS);
            }
        }

        var spilled = year.UsableM3PerS - year.TurbineFlowM3PerS - year.BelowLeastM3PerS;
        return new WaterBalance(
            arriving * s,
            prior * s,
            reserved * s,
            year.TurbineFlowM3PerS * availability * s,
            year.BelowLeastM3PerS * s,
            year.TurbineFlowM3PerS * (1 - availability) * s,
            spilled * s);
    }
}
