using HeadToWatts.Basis.Units;

namespace HeadToWatts.Studies.Cautions;

/// <summary>A record too short for a long-term mean.</summary>
internal sealed class RecordUnderTenYears() : CautionRule("record-under-ten-years", StudyStage.Flow, Severity.Weigh, "Short record", CautionSources.Corps1979)
{
    public override string? Say(StudyResult result, UnitDisplay show)
    {
        if (result.Input.Flow.Record is not { } record || record.YearsSpanned >= 10)
            return null;
        return $"The record holds {UnitDisplay.Number(record.YearsSpanned)} years of flows. With fewer than 10 the mean year is not a long-term mean: a run of wet or dry years would shift it.";
    }
}
