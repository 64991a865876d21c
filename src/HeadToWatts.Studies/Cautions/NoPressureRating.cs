using HeadToWatts.Basis.Units;

namespace HeadToWatts.Studies.Cautions;

/// <summary>The rating is not stated.</summary>
internal sealed class NoPressureRating() : CautionRule("no-pressure-rating", StudyStage.Waterway, Severity.Note, "Pressure class not given", CautionSources.Practice)
{
    public override string? Say(StudyResult result, UnitDisplay show)
    {
        if (result.Waterway.Surge is not { } surge || result.Head.GrossHeadM < 10)
            return null;
        var without = surge.Elements.Where(e => e.Element.PressureRatingPa is null).ToList();
        if (without.Count == 0)
            return null;
        var worst = without.MaxBy(e => e.TotalPressurePa)!;
        return $"{worst.Element.Name} has no pressure rating in the study. It must carry {show.Pressure(worst.StaticPressurePa)} standing, and about {show.Pressure(worst.TotalPressurePa)} if the flow is stopped at once (screening figure).";
    }
}
