using HeadToWatts.Basis.Units;
using HeadToWatts.EnergyYield.Electrical;

namespace HeadToWatts.Studies.Cautions;

/// <summary>An induction generator leans on the grid.</summary>
internal sealed class InductionNeedsGrid() : CautionRule("induction-needs-grid", StudyStage.Energy, Severity.Note, "An induction generator leans on the grid", CautionSources.Practice)
{
    public override string? Say(StudyResult result, UnitDisplay show)
    {
        return result.Input.Train.Generator is { Kind: GeneratorKind.Induction }
            ? "An induction generator is excited by the grid: it stops when the grid stops, draws reactive power that the utility may charge for or want compensated, and with capacitors beside it can excite itself and overspeed after a trip. The utility and an electrical engineer settle this."
            : null;
    }
}
