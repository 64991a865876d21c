using HeadToWatts.Basis.Units;

namespace HeadToWatts.Studies.Cautions;

/// <summary>A machine for more water than the right allows.</summary>
internal sealed class RightBelowDesign() : CautionRule("right-below-design", StudyStage.Flow, Severity.SettleFirst, "Water right below the design flow", CautionSources.Practice)
{
    public override string? Say(StudyResult result, UnitDisplay show) =>
        result.Input.Flow.Rules?.Right?.RateM3PerS is { } rate && rate < result.Flow.DesignFlowM3PerS * (1 - 1e-9)
            ? $"The water right allows {show.Flow(rate)}, less than the design flow of {show.Flow(result.Flow.DesignFlowM3PerS)}: the machine never runs full. Choose a smaller design flow or settle the right first."
            : null;
}
