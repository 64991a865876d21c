using HeadToWatts.Basis.Units;
using HeadToWatts.Hydraulics.Water;
using HeadToWatts.Memos.Content;

namespace HeadToWatts.Memos.Sections;

/// <summary>Water, gravity and air at the site.</summary>
internal static class ConstantsAppendix
{
    public static void Write(MemoContext memo)
    {
        var body = memo.Body;
        var site = memo.Result.Site;
        var water = site.Water;
        body.Appendix("Constants of the site", "constants");
        body.Say($"Reckoned for water at {memo.Show.Temperature(water.TemperatureDegC)}, latitude {UnitDisplay.Number(site.LatitudeRad * 180 / Math.PI, 4)}° and elevation {memo.Show.Length(site.ElevationM)}.");
        body.Table("tab-constants", "Water, gravity and air.", [new("What", Share: 2), new("Symbol", ColumnAlign.Middle, 0), new("Value", ColumnAlign.Right), new("Source", ColumnAlign.Left)],
        [
            Row("Density of water", "ρ", UnitDisplay.Number(water.DensityKgPerM3, 6) + " kg/m³", body.Cite(IapwsIf97.Density.Source)),
            Row("Kinematic viscosity", "ν", UnitDisplay.Number(water.KinematicViscosityM2PerS, 4) + " m²/s", body.Cite(IapwsViscosity.Method.Source)),
            Row("Vapour pressure, absolute", "p_v", UnitDisplay.Number(water.VapourPressurePa / 1000, 4) + " kPa", body.Cite(IapwsIf97.SaturationPressure.Source)),
            Row("Gravity", "g", UnitDisplay.Number(site.GravityMPerS2, 6) + " m/s²", body.Cite(Gravity.Method.Source)),
            Row("Specific weight of water", "γ", UnitDisplay.Number(site.SpecificWeightNPerM3, 5) + " N/m³", body.Cite(SiteConditions.SpecificWeight.Source)),
            Row("Air pressure", "p_a", UnitDisplay.Number(site.AtmosphericPressurePa / 1000, 4) + " kPa", body.Cite(Atmosphere.Method.Source)),
            Row("Hours in the year", "", "8760 h", RichText.Of("365 days")),
        ]);
    }

    private static TableRow Row(string name, string symbol, string value, RichText source) => new([name, RichText.Formula(symbol), value, source]);
}
