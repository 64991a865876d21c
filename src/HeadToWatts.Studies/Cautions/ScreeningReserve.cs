using HeadToWatts.Basis.Units;
using HeadToWatts.FlowRecords.Reserved;

namespace HeadToWatts.Studies.Cautions;

/// <summary>A reserved flow by a rule of thumb.</summary>
internal sealed class ScreeningReserve() : CautionRule("screening-reserve", StudyStage.Flow, Severity.Weigh, "Reserved flow by a screening rule", CautionSources.Esha)
{
    public override string? Say(StudyResult result, UnitDisplay show) => result.Input.Flow.Rules?.Reserved is TennantReserved or LowFlowReserved
        ? $"The reserved flow follows a screening rule: {WaterWords.Reserved(result.Input.Flow, show)}. The permit governs; ask the water and fish agencies before relying on it."
        : null;
}
