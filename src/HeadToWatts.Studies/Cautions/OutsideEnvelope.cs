using HeadToWatts.Basis.Units;

namespace HeadToWatts.Studies.Cautions;

/// <summary>The chosen type does not usually serve here.</summary>
internal sealed class OutsideEnvelope() : CautionRule("outside-envelope", StudyStage.Turbine, Severity.SettleFirst, "Outside the turbine's envelope", CautionSources.Choice)
{
    public override string? Say(StudyResult result, UnitDisplay show)
    {
        var chosen = result.Turbine.Chosen;
        return chosen.Fit.IsInside
            ? OfUnequal(result, show)
            : $"One {chosen.Type.Name} unit at {show.Flow(result.Turbine.Units.DesignFlowM3PerS / chosen.UnitCount)} and {show.Length(result.Head.NetHeadAtDesignM)} net lies outside the usual range of the type: {TurbineWords.Outside(chosen, show)}. Makers may not offer one.";
    }

    // The ranking weighs a unit of the mean size; of unequal units the smallest or the largest may lie outside all the same.
    private static string? OfUnequal(StudyResult result, UnitDisplay show)
    {
        if (result.Input.Turbine.UnitSizes is not { } sizes || result.Head.NetHeadAtDesignM <= 0)
            return null;
        var flows = sizes.Select(s => s.ShareRatio * result.Turbine.Units.DesignFlowM3PerS).ToList();
        var outside = Enumerable.Range(0, flows.Count).Where(i => !result.Turbine.Chosen.Type.Envelope.Contains(flows[i], result.Head.NetHeadAtDesignM)).ToList();
        return outside.Count == 0
            ? null
            : $"Of the {result.Turbine.Chosen.Type.Name} units, {string.Join(" and ", outside.Select(i => $"number {i + 1} with {show.Flow(flows[i])}"))} at {show.Length(result.Head.NetHeadAtDesignM)} net lies outside the usual range of the type. Makers may not offer one.";
    }
}
