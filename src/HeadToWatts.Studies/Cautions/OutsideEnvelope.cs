using HeadToWatts.Basis.Units;

namespace HeadToWatts.Studies.Cautions;

/// <summary>The chosen type does not usually serve here.</summary>
internal sealed class OutsideEnvelope() : CautionRule("outside-envelope", StudyStage.Turbine, Severity.SettleFirst, "Outside the turbine's envelope", CautionSources.Choice)
{
    public override string? Say(StudyResult result, UnitDisplay show)
    {
        var chosen = result.Turbine.Chosen;
        return chosen.Fit.IsInside
            ? null
            : $"One {chosen.Type.Name} unit at {show.Flow(result.Turbine.Units.DesignFlowM3PerS / chosen.UnitCount)} and {show.Length(result.Head.NetHeadAtDesignM)} net lies outside the usual range of the type: {TurbineWords.Outside(chosen, show)}. Makers may not offer one.";
    }
}
