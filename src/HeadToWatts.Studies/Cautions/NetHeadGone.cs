using HeadToWatts.Basis.Units;

namespace HeadToWatts.Studies.Cautions;

/// <summary>Losses exceed the fall.</summary>
internal sealed class NetHeadGone() : CautionRule("net-head-gone", StudyStage.Head, Severity.SettleFirst, "The waterway cannot carry the design flow", CautionSources.Practice)
{
    public override string? Say(StudyResult result, UnitDisplay show)
    {
        return result.Head.NetHeadAtDesignM > 0
            ? null
            : $"At {show.Flow(result.Flow.DesignFlowM3PerS)} the waterway would lose {show.Length(result.Waterway.AtDesign.TotalLossM)}, more than the gross head of {show.Length(result.Head.GrossHeadM)}. Check the units of the diameter and the flow, or take a larger pipe.";
    }
}
