using HeadToWatts.Basis.Units;

namespace HeadToWatts.Studies.Cautions;

/// <summary>The highest pressure of the stop as given against the rating.</summary>
internal sealed class StopOverRating() : CautionRule("stop-over-rating", StudyStage.Waterway, Severity.SettleFirst, "The stop as planned strains the pipe", CautionSources.Practice)
{
    private const double Spare = 0.9;

    public override string? Say(StudyResult result, UnitDisplay show)
    {
        if (result.Waterway.Stop is not { } stop || stop.Pipes.Where(p => p.RatingRatio >= Spare).MaxBy(p => p.RatingRatio) is not { } worst)
            return null;
        return $"{worst.Element.Name}: when the unit trips and closes in {UnitDisplay.Number(stop.Run.Stop.ClosureTimeS)} s the pressure rises to {show.Pressure(worst.HighestPressurePa)} (screening), {UnitDisplay.Percent(worst.RatingRatio!.Value)} of the rating of {show.Pressure(worst.Element.PressureRatingPa!.Value)}. Close more slowly, choose a higher class or relieve the pressure; an engineer's transient study must settle it.";
    }
}
