using HeadToWatts.Basis.Units;
using HeadToWatts.Turbines;

namespace HeadToWatts.Studies.Workings;

internal static class TurbineWorkings
{
    private static string MemoSentence(string text) => text.Length == 0 ? "" : char.ToUpperInvariant(text[0]) + text[1..] + ".";

    internal static IEnumerable<Working> Of(StudyResult result, UnitDisplay show)
    {
        var turbine = result.Turbine;
        var chosen = turbine.Chosen;
        var best = turbine.Ranking[0];
        yield return new Working(
            "turbine", StudyStage.Turbine, turbine.TypeIsSuggested ? "Turbine, suggested" : "Turbine, as given", "(Q_{unit}, H_n)",
            $"{show.Flow(chosen.UnitFlowM3PerS)} a unit and {show.Length(chosen.NetHeadM)} net",
            $"{chosen.Type.Name} × {chosen.UnitCount}",
            string.Join(" ", TurbineWords.Reasons(chosen, show)) + (best.Type.Id == chosen.Type.Id ? "" : $" First in the ranking is {best.Type.Name}."),
            []);

        if (chosen.Speed is { } speed && result.Energy.Annual.MeterPowerKw > 0)
        {
            var point = result.Energy.Plant.At(result.Energy.Plant.BestUsableFlowM3PerS);
            var perUnit = point.ShaftPowerKw / Math.Max(1, point.UnitsRunning);
            yield return new Working(
                "specific-speed", StudyStage.Turbine, "Specific speed (rpm, kW, m)", TurbineMethods.SpecificSpeedKwM.Formula,
                $"{UnitDisplay.Number(speed.RunnerSpeedRpm)} rpm × ({UnitDisplay.Number(perUnit)} kW)^(1/2) / ({UnitDisplay.Number(chosen.NetHeadM)} m)^(5/4)",
                UnitDisplay.Number(speed.SpecificSpeedKwM),
                speed.IsDirect ? $"Synchronous at {UnitDisplay.Number(result.Input.Site.FrequencyHz)} Hz with {speed.Poles} poles." : "Not a synchronous speed: geared or belted.",
                [TurbineMethods.SpecificSpeedKwM]);
        }

        yield return new Working(
            "three-points", StudyStage.Turbine, "Energy with three points less", "E(η − 0.03)",
            $"every efficiency of the curve three points lower, at best {UnitDisplay.Percent(turbine.Efficiency.Peak - CurveError.Points)} in place of {UnitDisplay.Percent(turbine.Efficiency.Peak)}",
            UnitDisplay.Energy(result.Energy.ThreePointsLowerKwh),
            $"In place of {UnitDisplay.Energy(result.Energy.Annual.AnnualEnergyKwh)}: what it means when the machine bought falls short of its curve."
                + (turbine.StepUp is { } up ? $" The maker's efficiencies were stepped up by {UnitDisplay.Number(up.PeakChange * 100, 2)} points from a runner of {show.Diameter(up.TestedDiameterM)} to one of {show.Diameter(up.RunnerDiameterM)}." : ""),
            turbine.StepUp is null ? [EnergyYield.EnergyMethods.AnnualEnergy] : [EnergyYield.EnergyMethods.AnnualEnergy, Turbines.Sizing.MoodyStepUp.Method]);
        if (turbine.ChosenSheet is not { } sheet)
            yield break;
        if (sheet.Geometry is { } geometry)
        {
            yield return new Working(
                "runner-size", StudyStage.Turbine, "Size of the runner", geometry.Use.Method.Formula,
                $"{show.Flow(chosen.UnitFlowM3PerS)} and {show.Length(chosen.NetHeadM)} at {UnitDisplay.Number(chosen.Speed!.RunnerSpeedRpm)} rpm",
                show.Diameter(geometry.DiameterM),
                MemoSentence(MachineWords.Size(sheet, show)) + string.Concat(geometry.Doubts.Select(d => " " + d)), [geometry.Use.Method]);
        }

        if (sheet.Setting is { } setting)
        {
            yield return new Working(
                "runner-setting", StudyStage.Turbine, "Highest setting of the runner", Turbines.Sizing.RunnerSetting.Highest.Formula,
                $"{show.Length(setting.AirHeadM)} − {show.Length(setting.VapourHeadM)} − {UnitDisplay.Number(setting.ThomaSigma)} × {show.Length(chosen.NetHeadM)}",
                show.Length(setting.HighestM),
                $"Above the lowest tailwater; negative is below it. The coefficient is read at a specific speed of {UnitDisplay.Number(sheet.SpecificSpeedUsHpFt!.Value)} (rpm, hp, ft).",
                [Turbines.Sizing.RunnerSetting.Highest, Turbines.Sizing.RunnerSetting.CriticalSigma]);
        }
    }
}
