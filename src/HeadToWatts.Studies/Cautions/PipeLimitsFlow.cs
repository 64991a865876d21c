using HeadToWatts.Basis.Units;

namespace HeadToWatts.Studies.Cautions;

/// <summary>More flow gives less power.</summary>
internal sealed class PipeLimitsFlow() : CautionRule("pipe-limits-flow", StudyStage.Waterway, Severity.Weigh, "The pipe limits the plant", CautionSources.Dispatch)
{
    public override string? Say(StudyResult result, UnitDisplay show)
    {
        var best = result.Energy.Plant.BestFlowM3PerS;
        var design = result.Flow.DesignFlowM3PerS;
        return best >= design * 0.999 || result.Head.NetHeadAtDesignM <= 0 || best <= 0
            ? null
            : $"Power is highest at {show.Flow(best)}; at the design flow of {show.Flow(design)} losses eat the gain. The plant is run no higher than {show.Flow(best)}.";
    }
}
