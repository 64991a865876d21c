using HeadToWatts.Basis.Units;
using HeadToWatts.EnergyYield;
using HeadToWatts.Memos.Content;
using HeadToWatts.Studies;

namespace HeadToWatts.Memos.Sections;

/// <summary>Why this size.</summary>
internal static class DesignFlowSection
{
    private const int RowsShown = 9;

    public static void Write(MemoContext memo)
    {
        var body = memo.Body;
        var flow = memo.Result.Flow;
        var show = memo.Show;
        body.Section("Design flow", "design-flow");
        body.Say(flow.DesignFlowIsSuggested
            ? $"A design flow of {show.Flow(flow.DesignFlowM3PerS)} is suggested: {DesignFlowWords.Reason(memo.Result, show)}. Cost is not weighed; a size is settled by net benefit in a feasibility study, not by the largest power."
            : $"The design flow of {show.Flow(flow.DesignFlowM3PerS)} was given by the author. By energy alone this project would suggest {show.Flow(flow.Scan.SuggestedM3PerS)}: {DesignFlowWords.Reason(memo.Result, show)}.");
        if (Figures.DesignFlow(memo) is not { } drawing)
            return;
        body.Figure("fig-design-flow", drawing, "Energy in a mean year and plant factor against the design flow.");
        var points = Spread(flow.Scan.Points);
        body.Table("tab-scan", "What other sizes would give.",
            [
                new(MemoContext.Head("Design flow", show.FlowUnit), ColumnAlign.Right), new("Reached, % of the year", ColumnAlign.Right), new("Installed, kW", ColumnAlign.Right),
                new("Energy, MWh a year", ColumnAlign.Right), new("Plant factor, %", ColumnAlign.Right), new("Last kW works, h a year", ColumnAlign.Right),
            ],
            [.. points.Select(p => new TableRow([memo.Flow(p.DesignFlowM3PerS), MemoContext.PercentColumn(p.Exceedance), UnitDisplay.Number(p.InstalledPowerKw), UnitDisplay.Number(p.AnnualEnergyKwh / 1000), MemoContext.PercentColumn(p.PlantFactor), p.HoursOfLastKw > 0 ? UnitDisplay.Number(p.HoursOfLastKw) : "none"]))]);
    }

    private static IEnumerable<DesignFlowPoint> Spread(IReadOnlyList<DesignFlowPoint> points)
    {
        if (points.Count <= RowsShown)
            return points;
        return Enumerable.Range(0, RowsShown).Select(i => points[(int)Math.Round((i + 1.0) * points.Count / RowsShown) - 1]).Distinct();
    }
}
