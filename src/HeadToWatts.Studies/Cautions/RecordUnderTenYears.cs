using HeadToWatts.Basis.Units;
using HeadToWatts.FlowRecords.Transfer;

namespace HeadToWatts.Studies.Cautions;

/// <summary>A record too short for a long-term mean.</summary>
internal sealed class RecordUnderTenYears() : CautionRule("record-under-ten-years", StudyStage.Flow, Severity.Weigh, "Short record", CautionSources.Corps1979)
{
    public override string? Say(StudyResult result, UnitDisplay show)
    {
        // A plan or a typical year has no years to count; that it is none is said by another caution.
        if (result.Input.Flow.Record is not { } record || record.YearsSpanned >= 10 || result.Input.Flow.Origin is { Confidence: FlowConfidence.Low or FlowConfidence.Plan })
            return null;
        return $"The record holds {UnitDisplay.Number(record.YearsSpanned)} years of flows. With fewer than 10 the mean year is not a long-term mean: a run of wet or dry years would shift it.";
    }
}
