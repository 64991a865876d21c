using HeadToWatts.Basis.Units;

namespace HeadToWatts.Studies.Cautions;

/// <summary>Static plus surge against the rating.</summary>
internal sealed class PressureNearRating() : CautionRule("pressure-near-rating", StudyStage.Waterway, Severity.SettleFirst, "Pressure near the rating of the pipe", CautionSources.Practice)
{
    public override string? Say(StudyResult result, UnitDisplay show)
    {
        if (result.Waterway.Surge is not { } surge)
            return null;
        var worst = surge.Elements.Where(e => e.Element.PressureRatingPa is not null)
            .OrderByDescending(e => e.TotalPressurePa / e.Element.PressureRatingPa!.Value).FirstOrDefault();
        if (worst is null || worst.TotalPressurePa < 0.9 * worst.Element.PressureRatingPa!.Value)
            return null;
        return $"{worst.Element.Name}: static pressure {show.Pressure(worst.StaticPressurePa)} and a screening surge of {show.Pressure(worst.TotalPressurePa - worst.StaticPressurePa)} (sudden stop) make {show.Pressure(worst.TotalPressurePa)}; the pipe is rated {show.Pressure(worst.Element.PressureRatingPa.Value)}. An engineer's transient study must settle closing time and pipe class.";
    }
}
