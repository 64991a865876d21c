using HeadToWatts.Basis.Units;

namespace HeadToWatts.Studies.Cautions;

/// <summary>Days without a flow.</summary>
internal sealed class MissingDays() : CautionRule("missing-days", StudyStage.Flow, Severity.Weigh, "Gaps in the record", CautionSources.Corps1979)
{
    public override string? Say(StudyResult result, UnitDisplay show)
    {
        if (result.Input.Flow.Record is not { } record || record.DayCount == 0)
            return null;
        var share = (double)record.MissingCount / record.DayCount;
        return share < 0.05
            ? null
            : $"{UnitDisplay.Percent(share)} of the record has no flow ({record.MissingCount} of {record.DayCount} days). These days are left out, not read as zero; if they fall in one season the curve is biased.";
    }
}
