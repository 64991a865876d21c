using HeadToWatts.Basis.Units;
using HeadToWatts.Hydraulics.Surge;
using HeadToWatts.Hydraulics.Transients;

namespace HeadToWatts.Studies.Workings;

internal static class StopWorkings
{
    internal static IEnumerable<Working> Of(StudyResult result, UnitDisplay show)
    {
        if (result.Waterway.Stop is not { } stop)
            yield break;
        var g = UnitDisplay.Number(result.Site.GravityMPerS2);
        var pipe = result.Waterway.Surge!.Elements[^1];
        yield return new Working(
            "wave-speed", StudyStage.Waterway, $"Wave speed, {pipe.Element.Name}", WaveSpeed.Method.Formula,
            $"K = {UnitDisplay.Number(result.Site.Water.BulkModulusPa / 1e9)} GPa, ρ = {UnitDisplay.Number(result.Site.Water.DensityKgPerM3, 4)} kg/m3, E = {UnitDisplay.Number(pipe.Element.Material.ElasticModulusPa / 1e9)} GPa, D/e = {UnitDisplay.Number(pipe.DiameterThicknessRatio)}, c_1 = {UnitDisplay.Number(WaveSpeed.RestraintCoefficient(stop.Input.Restraint, pipe.Element.Material.PoissonRatio))} ({StopWords.Restraint(stop.Input.Restraint)})",
            show.Velocity(pipe.WaveSpeedMPerS),
            $"To the intake and back a wave needs {UnitDisplay.Number(stop.ReturnTimeS)} s.{(pipe.ThicknessAssumed ? " The wall thickness is not given; the material's usual D/e is taken." : "")}", [WaveSpeed.Method]);
        yield return new Working(
            "stop", StudyStage.Waterway, "Highest pressure when the unit trips (screening)", Characteristics.Method.Formula,
            $"{stop.Run.Grid.ReachCount} reaches, Δt = {UnitDisplay.Number(stop.Run.Grid.TimeStepS * 1000)} ms, {UnitDisplay.Number(stop.Run.DurationS)} s reckoned; the head before the machine is highest {UnitDisplay.Number(stop.Run.HighestAtS)} s after the trip, {show.Length(stop.Run.RiseOverStaticM)} over standing water",
            show.Pressure(stop.Pipes.Max(p => p.HighestPressurePa)),
            StopWords.Manoeuvre(stop) + " " + StopWords.Reckoning(stop), [Characteristics.Method]);
        if (stop.Limit is not { MichaudTimeS: { } michaud, AllieviTimeS: { } allievi } limit)
            yield break;
        var momentum = show.System == UnitSystem.US ? $"{UnitDisplay.Number(stop.Run.Case.MomentumM2PerS / 0.09290304)} ft2/s" : $"{UnitDisplay.Number(stop.Run.Case.MomentumM2PerS)} m2/s";
        yield return new Working(
            "closing-time", StudyStage.Waterway, "Closing time for the limit", "T = 2 Σ(L V)/(g ΔH)",
            $"2 × {momentum} / ({g} m/s2 × {show.Length(limit.AllowedRiseM)})",
            $"{UnitDisplay.Number(michaud)} s",
            $"Limit {show.Pressure(limit.LimitPa)} before the machine{(limit.IsGiven ? "" : ", nine tenths of the rating")}; at least the time of the wave's return. With the opening falling evenly, T = Σ(L V) (1 + x)^(1/2)/(g H_0 x) with x = ΔH/H_0: {UnitDisplay.Number(allievi)} s. What the machine holds back by itself as it races is in neither.",
            [Michaud.Method, AllieviClosure.Method]);
    }
}
