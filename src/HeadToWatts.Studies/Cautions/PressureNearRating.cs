using HeadToWatts.Basis.Units;

namespace HeadToWatts.Studies.Cautions;

/// <summary>Static pressure against the rating.</summary>
internal sealed class PressureNearRating() : CautionRule("pressure-near-rating", StudyStage.Waterway, Severity.SettleFirst, "Standing pressure near the rating of the pipe", CautionSources.Practice)
{
    public override string? Say(StudyResult result, UnitDisplay show)
    {
        if (result.Waterway.Surge is not { } surge)
            return null;
        var worst = surge.Elements.Where(e => e.Element.PressureRatingPa is not null).MaxBy(e => e.StaticPressurePa / e.Element.PressureRatingPa!.Value);
        if (worst is null || worst.StaticPressurePa < 0.8 * worst.Element.PressureRatingPa!.Value)
            return null;
        return $"{worst.Element.Name} stands under {show.Pressure(worst.StaticPressurePa)} before anything moves, {UnitDisplay.Percent(worst.StaticPressurePa / worst.Element.PressureRatingPa.Value)} of its rating of {show.Pressure(worst.Element.PressureRatingPa.Value)}. Nothing is left for a surge: take a stronger class.";
    }
}
