using HeadToWatts.Basis.Units;

namespace HeadToWatts.Studies.Cautions;

/// <summary>Static plus surge against the rating.</summary>
internal sealed class SurgeOverRating() : CautionRule("surge-over-rating", StudyStage.Waterway, Severity.Weigh, "A sudden stop may burst the pipe", CautionSources.Practice)
{
    public override string? Say(StudyResult result, UnitDisplay show)
    {
        if (result.Waterway.Surge is not { } surge)
            return null;
        var worst = surge.Elements.Where(e => e.Element.PressureRatingPa is not null).MaxBy(e => e.TotalPressurePa / e.Element.PressureRatingPa!.Value);
        if (worst is null || worst.TotalPressurePa < 0.9 * worst.Element.PressureRatingPa!.Value)
            return null;
        var rating = worst.Element.PressureRatingPa.Value;
        var text = $"{worst.Element.Name}: {show.Pressure(worst.StaticPressurePa)} standing and {show.Pressure(worst.TotalPressurePa - worst.StaticPressurePa)} from a sudden stop (screening) make {show.Pressure(worst.TotalPressurePa)}; the pipe is rated {show.Pressure(rating)}.";
        var spareM = ((0.9 * rating) - worst.StaticPressurePa) / result.Site.SpecificWeightNPerM3;
        if (spareM <= 0)
            return text;

        // Michaud: dH = 2 L V/(g T), with L V summed over the pipes in series.
        var momentum = surge.Elements.Sum(e => e.Element.LengthM * e.VelocityMPerS);
        var seconds = 2 * momentum / (result.Site.GravityMPerS2 * spareM);
        return $"{text} Closing must take at least about {UnitDisplay.Number(Math.Max(seconds, surge.CriticalTimeS), 2)} s to keep a tenth in hand; an engineer's transient study must settle closing time and pipe class.";
    }
}
