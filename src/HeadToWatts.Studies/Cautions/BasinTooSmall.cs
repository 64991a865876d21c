using HeadToWatts.Basis.Units;

namespace HeadToWatts.Studies.Cautions;

/// <summary>A basin that does not hold the jump of the full flow.</summary>
internal sealed class BasinTooSmall() : CautionRule("basin-too-small", StudyStage.Head, Severity.Weigh, "The old basin does not hold the jump", CautionSources.Practice)
{
    public override string? Say(StudyResult result, UnitDisplay show)
    {
        if (result.Canal?.Basin is not { HoldsTheJump: false } basin)
            return null;
        var deep = basin.IsDeepEnough ? "" : $"it needs {show.Length(basin.NeededDepthM)} of water over its floor and has {show.Length(basin.AvailableDepthM)}";
        var length = basin.IsLongEnough ? "" : $"the jump needs {show.Length(basin.NeededLengthM)} and the floor has {show.Length(basin.AvailableLengthM)}";
        return $"With the plant stopped and {show.Flow(result.Canal.AtFull.FlowM3PerS)} over the drop, {string.Join("; ", new[] { deep, length }.Where(t => t.Length > 0))}. The bed below would be scoured. A plain level floor was taken; blocks and sills may help: a hydraulic engineer decides.";
    }
}
