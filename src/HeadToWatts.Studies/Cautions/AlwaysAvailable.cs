using HeadToWatts.Basis.Units;

namespace HeadToWatts.Studies.Cautions;

/// <summary>No outage is counted.</summary>
internal sealed class AlwaysAvailable() : CautionRule("always-available", StudyStage.Energy, Severity.Note, "Never out of service", CautionSources.Practice)
{
    public override string? Say(StudyResult result, UnitDisplay show)
    {
        return result.Input.Train.Availability < 0.995
            ? null
            : "Availability is taken as 100 %: no stop for repair, racks, weeds, ice or the grid. 90 to 97 % is usual.";
    }
}
