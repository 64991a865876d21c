using HeadToWatts.Basis.Units;

namespace HeadToWatts.Studies.Cautions;

/// <summary>Water levels beyond the measurements behind their rating.</summary>
internal sealed class StagesOutsideRating() : CautionRule("stages-outside-rating", StudyStage.Flow, Severity.Weigh, "Water levels outside the rating", CautionSources.Practice)
{
    private const string Says = "Water levels outside the rating:";

    public override string? Say(StudyResult result, UnitDisplay show) =>
        result.Input.Flow.Findings.FirstOrDefault(f => f.Contains(Says, StringComparison.Ordinal)) is { } found
            ? $"{found[found.IndexOf(Says, StringComparison.Ordinal)..]}. Flows beyond the measured range of a rating are guesses: floods are often far off, and low flows decide the dry season. Have the rating measured there."
            : null;
}
