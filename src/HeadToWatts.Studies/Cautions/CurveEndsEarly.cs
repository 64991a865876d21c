using HeadToWatts.Basis.Units;

namespace HeadToWatts.Studies.Cautions;

/// <summary>Low flows outside the rows.</summary>
internal sealed class CurveEndsEarly() : CautionRule("curve-ends-early", StudyStage.Flow, Severity.Weigh, "Curve ends early", CautionSources.Practice)
{
    public override string? Say(StudyResult result, UnitDisplay show)
    {
        if (result.Input.Flow.TypedCurve is not { } curve || curve.Rows[^1].Exceedance >= 0.9)
            return null;
        var last = curve.Rows[^1];
        return curve.EndRule == FlowRecords.BeyondLastRow.Hold
            ? $"The last row is {UnitDisplay.Percent(last.Exceedance)} exceeded with {show.Flow(last.FlowM3PerS)}. Beyond it the flow is held at that value: the least flows, and the energy from them, are not known."
            : $"The last row is {UnitDisplay.Percent(last.Exceedance)} exceeded with {show.Flow(last.FlowM3PerS)}. Beyond it the waterway counts as dry, as the study says.";
    }
}
