using HeadToWatts.Basis.Units;
using HeadToWatts.Pumping;

namespace HeadToWatts.Studies.Workings;

internal static class PumpingWorkings
{
    internal static IEnumerable<Working> Of(StudyResult result, UnitDisplay show)
    {
        if (result.Pumping is not { } side)
            yield break;
        for (var i = 0; i < side.Pumping.Plants.Count; i++)
        {
            var p = side.Pumping.Plants[i];
            yield return new Working(
                $"pumping-{i + 1}", StudyStage.Pumping, $"Energy of {p.Plant.Name}", "E = γ V H/η",
                $"{UnitDisplay.Number(result.Site.SpecificWeightNPerM3, 5)} N/m3 × {show.Volume(p.Plant.AnnualVolumeM3)} × {show.Length(p.Plant.Head.TotalM)}/{UnitDisplay.Percent(p.Plant.PlantEfficiency)}",
                $"{UnitDisplay.Number(p.AnnualUnits, 4)} {p.Plant.Source.Unit} a year",
                $"Head: {show.Length(p.Plant.Head.StaticM)} static, {show.Length(p.Plant.Head.DrawdownM)} drawdown, {show.Length(p.Plant.Head.PressureM)} pressure, {show.Length(p.Plant.Head.PipeLossM)} in the pipe. A good plant would take {UnitDisplay.Number(p.AchievableUnits, 4)} {p.Plant.Source.Unit}.",
                [PumpingMethods.PumpPower, PumpingMethods.Performance]);
        }
    }
}
