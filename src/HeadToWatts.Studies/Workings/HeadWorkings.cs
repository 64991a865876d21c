using HeadToWatts.Basis.Units;
using HeadToWatts.Hydraulics.Water;

namespace HeadToWatts.Studies.Workings;

internal static class HeadWorkings
{
    internal static IEnumerable<Working> Of(StudyResult result, UnitDisplay show)
    {
        var site = result.Site;
        yield return new Working(
            "specific-weight", StudyStage.Head, "Specific weight of the water", "γ = ρ g",
            $"{UnitDisplay.Number(site.Water.DensityKgPerM3, 6)} kg/m3 × {UnitDisplay.Number(site.GravityMPerS2, 5)} m/s2, water at {show.Temperature(site.Water.TemperatureDegC)}, latitude {UnitDisplay.Number(site.LatitudeRad * 180 / Math.PI)}°, elevation {show.Length(site.ElevationM)}",
            $"{UnitDisplay.Number(site.SpecificWeightNPerM3, 5)} N/m3" + (show.System == UnitSystem.US ? $" ({UnitDisplay.Number(site.SpecificWeightNPerM3 / 157.087463846246, 4)} lbf/ft3)" : ""),
            "", [IapwsIf97.Density, Gravity.Method, SiteConditions.SpecificWeight]);

        var head = result.Head;
        yield return new Working(
            "gross-head", StudyStage.Head, "Gross head",
            result.Input.Head.IsFromLevels ? "H_g = z_{head} − z_{tail}" : "H_g",
            result.Input.Head.IsFromLevels ? $"{Level(head.HeadwaterM, show)} − {Level(head.TailwaterM, show)}" : result.Input.Head.Measurement.Length > 0 ? result.Input.Head.Measurement : "given by the author",
            show.Length(head.GrossHeadM) + (result.Input.Head.ErrorM > 0 ? " ± " + show.Length(result.Input.Head.ErrorM) : ""),
            head.Levels.Count == 0
                ? "Levels are held constant over the flows."
                : $"At the design flow. Levels move: " + string.Join("; ", head.Levels.Select(l => $"{show.Length(l.GrossHeadM)} at {show.Flow(l.PassingFlowM3PerS)}")) + ". Every flow has its own gross head in the energy.", []);

        var losses = result.Waterway.AtDesign;
        yield return new Working(
            "net-head", StudyStage.Head, "Net head at the design flow", "H_n = H_g − Σ h_f − Σ h_L",
            $"{show.Length(head.GrossHeadM)} − {show.Length(losses.FrictionLossM)} − {show.Length(losses.LocalLossM)}",
            show.Length(head.NetHeadAtDesignM),
            $"{UnitDisplay.Percent(result.Waterway.LossShareOfGrossHead)} of the gross head is lost. Every flow has its own net head in the energy.",
            [.. losses.Uses.Select(u => u.Method)]);
    }

    // Three digits of a high level would hide the fall between two of them: 4310 ft less 4290 ft is not 18.5 ft.
    private static string Level(double elevationM, UnitDisplay show)
    {
        var value = Math.Abs(show.LengthUnit.FromHeld(elevationM));
        var whole = value < 1 ? 1 : (int)Math.Floor(Math.Log10(value)) + 1;
        return UnitDisplay.In(elevationM, show.LengthUnit, whole + (show.System == UnitSystem.US ? 1 : 2)) + " " + show.LengthUnit.Symbol;
    }
}
