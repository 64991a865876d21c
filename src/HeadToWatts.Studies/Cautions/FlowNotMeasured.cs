using HeadToWatts.Basis.Units;
using HeadToWatts.FlowRecords.Transfer;

namespace HeadToWatts.Studies.Cautions;

/// <summary>Flow that was made for the site, not measured there.</summary>
internal sealed class FlowNotMeasured() : CautionRule("flow-not-measured", StudyStage.Flow, Severity.SettleFirst, "Flow not measured at the site", CautionSources.Corps1979)
{
    public override string? Say(StudyResult result, UnitDisplay show) => result.Input.Flow.Origin is { Confidence: not FlowConfidence.High } origin
        ? $"The flow was {origin.Reason} (confidence: {origin.Grade}). Energy and dry years stand or fall with it. Measure at the site over at least a year, at low flow above all, before money is spent on more than a study."
        : null;
}
