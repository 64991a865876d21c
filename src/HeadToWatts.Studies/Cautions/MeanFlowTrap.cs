using HeadToWatts.Basis.Units;

namespace HeadToWatts.Studies.Cautions;

/// <summary>A common shortcut would mislead.</summary>
internal sealed class MeanFlowTrap() : CautionRule("mean-flow-trap", StudyStage.Energy, Severity.Note, "Not the power at the mean flow", CautionSources.Practice)
{
    public override string? Say(StudyResult result, UnitDisplay show)
    {
        var claim = result.Energy.PowerAtMeanFlowKwh;
        var energy = result.Energy.Annual.AnnualEnergyKwh;
        return energy <= 0 || Math.Abs(claim - energy) < 0.1 * energy
            ? null
            : $"Power at the mean flow times 8760 h would claim {UnitDisplay.Energy(claim)}; over the whole curve it is {UnitDisplay.Energy(energy)}. Only the latter is used.";
    }
}
