using HeadToWatts.Basis.Units;

namespace HeadToWatts.Studies.Cautions;

/// <summary>The least flow of the machine matters.</summary>
internal sealed class MuchBelowLeast() : CautionRule("much-below-least", StudyStage.Turbine, Severity.Weigh, "Often too little water to run", CautionSources.Esha)
{
    public override string? Say(StudyResult result, UnitDisplay show)
    {
        var share = result.Turbine.Chosen.ShareOfYearBelowLeast;
        return share < 0.10
            ? null
            : $"For {UnitDisplay.Percent(share)} of the year there is water, but less than the {show.Flow(result.Turbine.Chosen.LeastFlowM3PerS)} the machine needs. More units, or a type that holds its efficiency at low flow, would use some of it.";
    }
}
