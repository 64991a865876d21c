using HeadToWatts.Basis.Units;

namespace HeadToWatts.Studies.Cautions;

/// <summary>Levels that move take much of the head.</summary>
internal sealed class HighWaterTakesHead() : CautionRule("high-water-takes-head", StudyStage.Head, Severity.Weigh, "High water takes the head", CautionSources.Corps1979)
{
    public override string? Say(StudyResult result, UnitDisplay show)
    {
        var worst = result.Head.Levels.MinBy(l => l.GrossHeadM);
        if (worst is null || worst.GrossHeadM > 0.75 * result.Head.GrossHeadM)
            return null;
        return worst.GrossHeadM <= 0
            ? $"At {show.Flow(worst.PassingFlowM3PerS)} the tailwater stands as high as the headwater: the plant stops when water is most plentiful. The energy counts this."
            : $"At {show.Flow(worst.PassingFlowM3PerS)} the gross head is {show.Length(worst.GrossHeadM)} against {show.Length(result.Head.GrossHeadM)} at the design flow. The energy counts this; a machine loses capacity and efficiency away from its rated head besides, which it does not.";
    }
}
