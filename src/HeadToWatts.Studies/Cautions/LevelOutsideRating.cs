using HeadToWatts.Basis.Units;

namespace HeadToWatts.Studies.Cautions;

/// <summary>A level rating that does not reach the flows.</summary>
internal sealed class LevelOutsideRating() : CautionRule("level-outside-rating", StudyStage.Head, Severity.Weigh, "Flows outside the level rating", CautionSources.Practice)
{
    public override string? Say(StudyResult result, UnitDisplay show)
    {
        var outside = result.Head.Levels.Where(l => l.IsOutsideRating).ToList();
        return outside.Count == 0
            ? null
            : $"{outside.Count} of {result.Head.Levels.Count} flows looked at, from {show.Flow(outside.Min(l => l.PassingFlowM3PerS))} to {show.Flow(outside.Max(l => l.PassingFlowM3PerS))}, lie outside the measured levels; the level is held at the nearest measurement, never drawn on. Measure there.";
    }
}
