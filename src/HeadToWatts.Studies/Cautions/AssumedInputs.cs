using HeadToWatts.Basis.Units;

namespace HeadToWatts.Studies.Cautions;

/// <summary>Inputs that were left out.</summary>
internal sealed class AssumedInputs() : CautionRule("assumed-inputs", StudyStage.Flow, Severity.Note, "Inputs assumed", CautionSources.Practice)
{
    public override string? Say(StudyResult result, UnitDisplay show) =>
        result.Input.Assumptions.Count == 0 ? null : string.Join(" ", result.Input.Assumptions);
}
