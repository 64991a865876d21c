using HeadToWatts.Basis;
using HeadToWatts.Basis.Units;
using HeadToWatts.EnergyYield;

namespace HeadToWatts.Studies.Workings;

internal static class EnergyWorkings
{
    internal static IEnumerable<Working> Of(StudyResult result, UnitDisplay show)
    {
        var annual = result.Energy.Annual;
        var train = result.Input.Train;
        var point = result.Energy.Plant.At(result.Energy.Plant.BestUsableFlowM3PerS);
        var gamma = UnitDisplay.Number(result.Site.SpecificWeightNPerM3 / 1000, 4);
        yield return new Working(
            "shaft-power", StudyStage.Energy, "Power at the shaft", "P_{shaft} = η_t γ Q H_n",
            $"{UnitDisplay.Number(point.TurbineEfficiency)} × {gamma} kN/m3 × {show.Flow(point.TurbineFlowM3PerS)} × {show.Length(point.NetHeadM)}",
            UnitDisplay.Power(point.ShaftPowerKw),
            show.System == UnitSystem.US ? "Feet and cubic feet are turned into metres first: 1 ft = 0.3048 m exactly." : "", [EnergyMethods.WaterPower]);

        foreach (var working in ElectricalWorkings.Of(result))
            yield return working;

        if (result.Energy.Electrical is null)
        {
            yield return new Working(
                "power", StudyStage.Energy, "Power at the meter", "P = (P_{shaft} η_d η_g (1 − u) − P_u) η_{tr} η_l",
                $"({UnitDisplay.Power(point.ShaftPowerKw)} × {UnitDisplay.Number(train.DriveEfficiency)} × {UnitDisplay.Number(train.GeneratorEfficiency)} × (1 − {UnitDisplay.Number(train.OwnUseRatio)}) − {UnitDisplay.Power(train.OwnUseKw)}) × {UnitDisplay.Number(train.TransformerEfficiency)} × {UnitDisplay.Number(train.LineEfficiency)}",
                UnitDisplay.Power(annual.MeterPowerKw),
                $"Installed power, at the generator: {UnitDisplay.Power(annual.InstalledPowerKw)}.", [EnergyMethods.WaterPower]);
        }

        var meanKw = annual.Integral.MeterPowerKw;
        yield return new Working(
            "energy", StudyStage.Energy, "Energy in a mean year", EnergyMethods.AnnualEnergy.Formula,
            $"{UnitDisplay.Number(train.Availability)} × 8760 h × {UnitDisplay.Power(meanKw)}, the mean of the power over the whole curve",
            UnitDisplay.Energy(annual.AnnualEnergyKwh),
            $"Each flow has its own net head, units and efficiency. Power at the mean flow times 8760 h would claim {UnitDisplay.Energy(result.Energy.PowerAtMeanFlowKwh)}; that is not used."
                + (result.Energy.WithHeadError is { } range ? $" The error of the head alone, ± {show.Length(result.Input.Head.ErrorM)}, moves it between {UnitDisplay.Energy(range.LowKwh)} and {UnitDisplay.Energy(range.HighKwh)}." : ""),
            [EnergyMethods.AnnualEnergy]);

        yield return new Working(
            "plant-factor", StudyStage.Energy, "Plant factor", EnergyMethods.PlantFactor.Formula,
            $"{UnitDisplay.Energy(annual.AnnualEnergyKwh)} / ({UnitDisplay.Power(annual.InstalledPowerKw)} × {PhysicalConstants.HoursPerYear:0} h)",
            UnitDisplay.Percent(annual.PlantFactor),
            $"{UnitDisplay.Number(annual.FullLoadHours)} full-load hours; {UnitDisplay.Number(annual.RunningHours)} h running.", [EnergyMethods.PlantFactor]);

        if (result.Energy.Days is { } run)
        {
            var months = run.SumOfMonthsKwh;
            var same = annual.AnnualEnergyKwh == 0 || Math.Abs(run.MeanOfDaysKwh - annual.AnnualEnergyKwh) <= 1e-9 * annual.AnnualEnergyKwh;
            yield return new Working(
                "day-by-day", StudyStage.Energy, "Energy day by day", "E = 8760 h s Σ P_i/n",
                $"mean power of the season's days with a flow, over the season's share of the year, {UnitDisplay.Number(result.Input.Flow.Season.ShareOfYear)}",
                UnitDisplay.Energy(run.MeanOfDaysKwh),
                (same
                    ? $"The same as over the duration curve, {UnitDisplay.Energy(annual.AnnualEnergyKwh)}."
                    : $"Over the duration curve it is {UnitDisplay.Energy(annual.AnnualEnergyKwh)}: where levels or reserved flow change with the month, the curve counts each month by its length, the days by how many of them have a flow.")
                    + $" The twelve months add up to {UnitDisplay.Energy(months)}; they differ by what gaps and leap days do to single months."
                    + (run.LongestStandstillDays > 0 ? $" Longest standstill in the season: {run.LongestStandstillDays} days from {run.StandstillFrom:yyyy-MM-dd}." : " It never stands in the season."),
                [EnergyMethods.AnnualEnergy]);
        }

        if (result.Energy.Days is { DryYearKwh: { } dry } days)
        {
            yield return new Working(
                "dry-year", StudyStage.Energy, "Energy in a dry year", "E_{90}",
                $"the energy reached or exceeded in 90 % of {days.WholeYearsKwh.Count} whole years of the record, each run day by day",
                UnitDisplay.Energy(dry), $"Half of the years reach {UnitDisplay.Energy(days.MedianYearKwh ?? 0)}; lowest {UnitDisplay.Energy(days.WholeYearsKwh[0])}.", []);
        }

        var water = annual.Water;
        yield return new Working(
            "water-balance", StudyStage.Energy, "Where the water goes", "V = V_{prior} + V_{res} + V_{turbine} + V_{least} + V_{stop} + V_{spill}",
            $"{show.Volume(water.PriorM3)} + {show.Volume(water.ReservedM3)} + {show.Volume(water.TurbinedM3)} + {show.Volume(water.BelowLeastM3)} + {show.Volume(water.OutOfServiceM3)} + {show.Volume(water.SpilledM3)}",
            show.Volume(water.ArrivingM3), "A year of 365 days.", []);
    }
}
