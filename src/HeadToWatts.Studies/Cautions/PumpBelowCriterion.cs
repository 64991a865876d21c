using HeadToWatts.Basis.Units;
using HeadToWatts.Pumping;

namespace HeadToWatts.Studies.Cautions;

/// <summary>A pumping plant far below what a good one needs.</summary>
internal sealed class PumpBelowCriterion() : CautionRule("pump-below-criterion", StudyStage.Pumping, Severity.Weigh, "A pump takes more than it should", PumpingMethods.Performance.Source)
{
    private const double Enough = 0.9;

    public override string? Say(StudyResult result, UnitDisplay show)
    {
        var poor = result.Pumping?.Pumping.Plants.Where(p => p.RatingRatio < Enough && p.AnnualUnits > 0).ToList() ?? [];
        return poor.Count == 0
            ? null
            : $"Of what a good plant lifts with a unit of energy, {string.Join("; ", poor.Select(p => $"{p.Plant.Name} lifts {UnitDisplay.Percent(p.RatingRatio)}: {UnitDisplay.Number(p.SavedUnits)} {p.Plant.Source.Unit} a year could be saved"))}. A repaired pump is often cheaper than a new turbine; have it tested.";
    }
}
