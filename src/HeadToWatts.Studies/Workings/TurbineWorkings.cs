using HeadToWatts.Basis.Units;
using HeadToWatts.Turbines;

namespace HeadToWatts.Studies.Workings;

internal static class TurbineWorkings
{
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
    }
}
