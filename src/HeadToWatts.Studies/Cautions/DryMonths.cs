using HeadToWatts.Basis.Units;

namespace HeadToWatts.Studies.Cautions;

/// <summary>Months without water.</summary>
internal sealed class DryMonths() : CautionRule("dry-months", StudyStage.Flow, Severity.Note, "Dry part of the year", CautionSources.Reclamation2012)
{
    public override string? Say(StudyResult result, UnitDisplay show)
    {
        var dry = 1 - result.Flow.WetShareOfYear;
        if (dry < 0.02)
            return null;
        var months = 12 * result.Flow.WetShareOfYear;
        var season = result.Input.Flow.Season.ShareOfYear < 1 ? $" (season {result.Input.Flow.Season.Describe()})" : "";
        return $"There is no usable water for {UnitDisplay.Percent(dry)} of the year{season}: about {UnitDisplay.Number(months, 2)} months of running at most. Reclamation screened out conduits with fewer than 4.";
    }
}
