using HeadToWatts.Basis.Units;

namespace HeadToWatts.Studies.Cautions;

/// <summary>A type of higher yield was passed over.</summary>
internal sealed class BetterType() : CautionRule("better-type", StudyStage.Turbine, Severity.Note, "Another type gives more", CautionSources.Choice)
{
    public override string? Say(StudyResult result, UnitDisplay show)
    {
        var chosen = result.Turbine.Chosen;
        var best = result.Turbine.Ranking[0];
        return result.Turbine.TypeIsSuggested || best.Type.Id == chosen.Type.Id || !best.Fit.IsInside || best.AnnualEnergyKwh <= chosen.AnnualEnergyKwh * 1.05
            ? null
            : $"{best.Type.Name} would make {UnitDisplay.Energy(best.AnnualEnergyKwh)} a year here against {UnitDisplay.Energy(chosen.AnnualEnergyKwh)} with {chosen.Type.Name}, both by typical efficiencies. Cost is not weighed.";
    }
}
