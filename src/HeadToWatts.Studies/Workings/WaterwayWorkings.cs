using HeadToWatts.Basis.Units;
using HeadToWatts.Hydraulics.Friction;
using HeadToWatts.Hydraulics.Surge;
using HeadToWatts.Hydraulics.Waterways;

namespace HeadToWatts.Studies.Workings;

internal static class WaterwayWorkings
{
    internal static IEnumerable<Working> Of(StudyResult result, UnitDisplay show)
    {
        var losses = result.Waterway.AtDesign;
        var formula = result.Input.Waterway.Formula;
        for (var i = 0; i < losses.Elements.Count; i++)
        {
            var e = losses.Elements[i];
            var mark = losses.Elements.Count == 1 ? "" : "-" + (i + 1);
            yield return new Working(
                "velocity" + mark, StudyStage.Waterway, $"Velocity, {e.Element.Name}", "V = 4 Q/(π D^2)",
                $"4 × {show.Flow(e.FlowM3PerS)} / (π × ({show.Diameter(e.Element.InsideDiameterM)})²)",
                show.Velocity(e.VelocityMPerS),
                $"Usual for {e.Element.Material.Name}: {show.Velocity(e.Element.Material.UsualVelocityLowMPerS)} to {show.Velocity(e.Element.Material.UsualVelocityHighMPerS)}.", []);

            var darcy = formula is DarcyFormula;
            yield return new Working(
                "friction" + mark, StudyStage.Waterway, $"Friction loss, {e.Element.Name}",
                darcy ? "h_f = f (L/D) V^2/(2 g)" : formula.Method.Formula,
                darcy
                    ? $"{UnitDisplay.Number(e.DarcyFrictionFactor)} × ({show.Length(e.Element.LengthM)} / {show.Length(e.Element.InsideDiameterM)}) × {show.Length(e.VelocityHeadM)}"
                    : $"V = {show.Velocity(e.VelocityMPerS)}, D = {show.Diameter(e.Element.InsideDiameterM)}, L = {show.Length(e.Element.LengthM)}"
                        + (formula is HazenWilliams ? $", C = {UnitDisplay.Number(e.Element.HazenWilliamsCoefficient)}" : $", n = {UnitDisplay.Number(e.Element.ManningCoefficient)}"),
                show.Length(e.FrictionLossM),
                darcy
                    ? $"f by {formula.Name} at Re = {UnitDisplay.Number(e.Reynolds)}, e/D = {UnitDisplay.Number(e.RelativeRoughness)} (e = {show.Roughness(e.Element.RoughnessM)})."
                    : "",
                darcy ? [DarcyFormula.DarcyWeisbach, formula.Method] : [formula.Method]);

            if (e.Fittings.Count > 0)
            {
                var k = e.Fittings.Sum(f => f.Fitting.LossCoefficient * f.Fitting.Count);
                yield return new Working(
                    "local-losses" + mark, StudyStage.Waterway, $"Local losses, {e.Element.Name}", "h_L = Σ K V^2/(2 g)",
                    $"({string.Join(" + ", e.Fittings.Select(f => (f.Fitting.Count > 1 ? f.Fitting.Count + " × " : "") + UnitDisplay.Number(f.Fitting.LossCoefficient) + " " + f.Fitting.Name))}) × {show.Length(e.VelocityHeadM)}",
                    show.Length(e.LocalLossM), $"ΣK = {UnitDisplay.Number(k)}.", [Hydraulics.LocalLosses.LocalLoss.Method]);
            }
        }

        if (losses.Elements.Count > 0)
        {
            yield return new Working(
                "velocity-limit", StudyStage.Waterway, "Penstock velocity limit", VelocityLimits.Method.Formula,
                $"0.125 × (2 × {UnitDisplay.Number(result.Site.GravityMPerS2)} m/s2 × {show.Length(result.Head.GrossHeadM)})^(1/2)",
                show.Velocity(result.Waterway.VelocityLimitMPerS), $"Highest here: {show.Velocity(result.Waterway.HighestVelocityMPerS)}.", [VelocityLimits.Method]);
        }

        if (result.Waterway.Surge is { } surge && surge.Elements.MaxBy(e => e.TotalPressurePa) is { } worst)
        {
            yield return new Working(
                "surge", StudyStage.Waterway, "Pressure with a sudden stop (screening)", Joukowsky.Method.Formula,
                $"{UnitDisplay.Number(worst.WaveSpeedMPerS)} m/s × {show.Velocity(worst.VelocityMPerS)} / {UnitDisplay.Number(result.Site.GravityMPerS2)} m/s2 = {show.Length(worst.RiseM)} on {show.Length(worst.StaticHeadM)} standing",
                show.Pressure(worst.TotalPressurePa),
                (worst.ThicknessAssumed ? $"Wall thickness not given: D/e = {UnitDisplay.Number(worst.DiameterThicknessRatio)} assumed. " : "") + "The most a stop can do in a single pipe; an engineer's transient study decides.",
                [WaveSpeed.Method, Joukowsky.Method]);
        }
    }
}
