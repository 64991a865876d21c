using HeadToWatts.Basis.Units;
using HeadToWatts.Turbines.Sizing;

namespace HeadToWatts.Studies.Cautions;

/// <summary>Pumps as turbines scatter.</summary>
internal sealed class PumpScatter() : CautionRule("pump-scatter", StudyStage.Turbine, Severity.Weigh, "A pump as turbine is a guess until tested", PumpCorrelations.Method.Source)
{
    public override string? Say(StudyResult result, UnitDisplay show)
    {
        if (result.Turbine.Chosen.Type.Id != "pump-as-turbine" || result.Turbine.Pump is not { } band)
            return null;
        var spread = $"flow {show.Flow(band.LowestFlowM3PerS)} to {show.Flow(band.HighestFlowM3PerS)}, head {show.Length(band.LowestHeadM)} to {show.Length(band.HighestHeadM)}";
        var scatter = $"measured machines lie up to {UnitDisplay.Percent(PumpCorrelations.ScatterRatio)} from any of them";
        if (band.Pump is null)
            return $"Published correlations put the pump to look for at {spread}; {scatter}. Ask for a turbine test of the pump itself before it is bought.";
        return $"Published correlations put this pump's best point as turbine at {spread}; {scatter}. This site has {show.Flow(band.SiteFlowM3PerS)} and {show.Length(band.SiteHeadM)}{(band.HoldsSite ? "" : ", which lies outside the band even so")}. Ask for a turbine test before it is bought.";
    }
}
