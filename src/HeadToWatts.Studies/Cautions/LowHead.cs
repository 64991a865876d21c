using HeadToWatts.Basis.Units;

namespace HeadToWatts.Studies.Cautions;

/// <summary>Below the screening head.</summary>
internal sealed class LowHead() : CautionRule("low-head", StudyStage.Head, Severity.Weigh, "Very low head", CautionSources.Reclamation2012)
{
    public override string? Say(StudyResult result, UnitDisplay show)
    {
        return result.Head.GrossHeadM >= 5 * 0.3048
            ? null
            : $"The gross head of {show.Length(result.Head.GrossHeadM)} is below the {show.Length(5 * 0.3048)} at which Reclamation stopped looking. Small errors in level are large errors in energy.";
    }
}
