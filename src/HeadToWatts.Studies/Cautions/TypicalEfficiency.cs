using HeadToWatts.Basis.Units;

namespace HeadToWatts.Studies.Cautions;

/// <summary>The curve is not a maker's.</summary>
internal sealed class TypicalEfficiency() : CautionRule("typical-efficiency", StudyStage.Turbine, Severity.Note, "Typical efficiency, not a maker's", CautionSources.Practice)
{
    public override string? Say(StudyResult result, UnitDisplay show)
    {
        return result.Turbine.EfficiencyIsMakers
            ? null
            : $"The {result.Turbine.Chosen.Type.Name} efficiency curve is typical, not a guarantee. Three points less at every load would leave {UnitDisplay.Energy(result.Energy.ThreePointsLowerKwh)} of {UnitDisplay.Energy(result.Energy.Annual.AnnualEnergyKwh)} a year. Ask makers for their own.";
    }
}
