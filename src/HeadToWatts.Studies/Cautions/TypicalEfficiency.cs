using HeadToWatts.Basis.Units;

namespace HeadToWatts.Studies.Cautions;

/// <summary>The curve is not a maker's.</summary>
internal sealed class TypicalEfficiency() : CautionRule("typical-efficiency", StudyStage.Turbine, Severity.Note, "Typical efficiency, not a maker's", CautionSources.Practice)
{
    public override string? Say(StudyResult result, UnitDisplay show)
    {
        return result.Turbine.EfficiencyIsMakers
            ? null
            : $"The {result.Turbine.Chosen.Type.Name} efficiency curve is typical, not a guarantee. Three points less would cost about {UnitDisplay.Percent(0.03 / Math.Max(result.Turbine.Efficiency.Peak, 0.03))} of the energy. Ask makers for their own.";
    }
}
