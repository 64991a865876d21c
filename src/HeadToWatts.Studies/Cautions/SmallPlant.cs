using HeadToWatts.Basis.Units;

namespace HeadToWatts.Studies.Cautions;

/// <summary>Below the agency threshold.</summary>
internal sealed class SmallPlant() : CautionRule("small-plant", StudyStage.Energy, Severity.Note, "Small plant", CautionSources.Reclamation2012)
{
    public override string? Say(StudyResult result, UnitDisplay show)
    {
        var kw = result.Energy.Annual.InstalledPowerKw;
        return kw is <= 0 or >= 50
            ? null
            : $"{UnitDisplay.Power(kw)} is below the 50 kW at which Reclamation stopped looking for sale to the grid. Own use beside the machine is the usual case at this size; line, interconnection and permits weigh heavily.";
    }
}
