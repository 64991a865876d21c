using HeadToWatts.Basis.Units;

namespace HeadToWatts.Studies.Cautions;

/// <summary>A vendor figure is not a site figure.</summary>
internal sealed class MakersEfficiency() : CautionRule("makers-efficiency", StudyStage.Turbine, Severity.Weigh, "A maker's efficiency", CautionSources.Practice)
{
    public override string? Say(StudyResult result, UnitDisplay show)
    {
        return result.Turbine.EfficiencyIsMakers
            ? "The efficiency is a manufacturer's table. It holds for the machine and head it was measured at; intake, setting and age may take some of it at the site."
            : null;
    }
}
