using HeadToWatts.Basis.Units;

namespace HeadToWatts.Studies.Cautions;

/// <summary>An oversized design flow.</summary>
internal sealed class DesignFlowSeldom() : CautionRule("design-flow-seldom", StudyStage.Flow, Severity.Weigh, "Design flow seldom reached", CautionSources.Corps1979)
{
    public override string? Say(StudyResult result, UnitDisplay show)
    {
        var exceeded = result.Flow.DesignFlowExceedance;
        return exceeded >= 0.10
            ? null
            : $"The design flow of {show.Flow(result.Flow.DesignFlowM3PerS)} is reached {UnitDisplay.Percent(exceeded)} of the year. The last kilowatts would hardly work; a smaller machine may earn as much.";
    }
}
