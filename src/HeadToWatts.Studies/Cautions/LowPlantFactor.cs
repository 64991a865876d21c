using HeadToWatts.Basis.Units;

namespace HeadToWatts.Studies.Cautions;

/// <summary>The machine seldom works fully.</summary>
internal sealed class LowPlantFactor() : CautionRule("low-plant-factor", StudyStage.Energy, Severity.Weigh, "Low plant factor", CautionSources.Corps1979)
{
    public override string? Say(StudyResult result, UnitDisplay show)
    {
        var factor = result.Energy.Annual.PlantFactor;
        return factor >= 0.25 || result.Energy.Annual.InstalledPowerKw <= 0
            ? null
            : $"The plant factor is {UnitDisplay.Percent(factor)}: the machine would stand or idle most of the year. Try a smaller design flow.";
    }
}
