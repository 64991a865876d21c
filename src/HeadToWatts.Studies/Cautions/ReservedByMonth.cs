using HeadToWatts.Basis.Units;

namespace HeadToWatts.Studies.Cautions;

/// <summary>A reserved flow or deliveries that change through the year.</summary>
internal sealed class ReservedByMonth() : CautionRule("reserved-by-month", StudyStage.Flow, Severity.Note, "Reserved flow by month", CautionSources.Esha)
{
    public override string? Say(StudyResult result, UnitDisplay show)
    {
        if (result.Input.Flow.AllocationByMonth is not { } months)
            return null;
        var flows = months.Where(m => m.Reserved.FlowM3PerS > 0).Select(m => m.Reserved.FlowM3PerS).ToList();
        var span = flows.Count == 0 ? "" : $" (up to {show.Flow(flows.Max())})";
        return $"What comes off before the plant changes by month{span}. The energy counts each month's own; the duration chart shows the season's middle month.";
    }
}
