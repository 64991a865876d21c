using HeadToWatts.Basis.Units;

namespace HeadToWatts.Studies.Cautions;

/// <summary>Nothing comes out.</summary>
internal sealed class NoEnergy() : CautionRule("no-energy", StudyStage.Energy, Severity.SettleFirst, "No energy", CautionSources.Practice)
{
    public override string? Say(StudyResult result, UnitDisplay show)
    {
        return result.Energy.Annual.AnnualEnergyKwh > 0
            ? null
            : "With these figures the plant never runs. Check the flow, the reserved flow, the season, the head and the units of each.";
    }
}
