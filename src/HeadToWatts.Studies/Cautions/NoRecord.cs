using HeadToWatts.Basis.Units;

namespace HeadToWatts.Studies.Cautions;

/// <summary>A typed curve cannot be checked.</summary>
internal sealed class NoRecord() : CautionRule("no-record", StudyStage.Flow, Severity.Weigh, "No flow record in the study", CautionSources.Practice)
{
    public override string? Say(StudyResult result, UnitDisplay show)
    {
        return result.Input.Flow.Record is not null
            ? null
            : "The duration curve was entered as rows; the record behind it is not part of this study. Months, dry years and gaps cannot be checked from here. Name the record and its years before relying on the energy.";
    }
}
