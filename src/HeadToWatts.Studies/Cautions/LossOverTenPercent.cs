using HeadToWatts.Basis.Units;

namespace HeadToWatts.Studies.Cautions;

/// <summary>A costly waterway.</summary>
internal sealed class LossOverTenPercent() : CautionRule("loss-over-ten-percent", StudyStage.Waterway, Severity.Weigh, "More than a tenth of the head is lost", CautionSources.Practice)
{
    public override string? Say(StudyResult result, UnitDisplay show)
    {
        var share = result.Waterway.LossShareOfGrossHead;
        return share <= 0.10 || result.Head.NetHeadAtDesignM <= 0
            ? null
            : $"The waterway loses {show.Length(result.Waterway.AtDesign.TotalLossM)} at the design flow, {UnitDisplay.Percent(share)} of the gross head. Two to ten percent is usual; try a larger diameter.";
    }
}
