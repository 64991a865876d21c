using HeadToWatts.Basis.Units;
using HeadToWatts.Turbines.Units;

namespace HeadToWatts.Studies.Cautions;

/// <summary>Heads that the maker's chart does not cover.</summary>
internal sealed class HillChartLeft() : CautionRule("hill-chart-left", StudyStage.Turbine, Severity.SettleFirst, "Heads outside the maker's chart", HillChart.Method.Source)
{
    public override string? Say(StudyResult result, UnitDisplay show)
    {
        if (result.Input.Turbine.HillChart is not { } chart)
            return null;
        var heads = result.Head.Levels.Count == 0
            ? [result.Head.NetHeadAtDesignM]
            : result.Head.Levels.Select(l => l.GrossHeadM - result.Energy.Plant.Design.LossM(Math.Min(l.UsableFlowM3PerS, result.Flow.DesignFlowM3PerS))).ToList();
        var outside = heads.Count(h => !chart.Covers(h));
        return outside == 0
            ? null
            : $"The chart covers net heads from {show.Length(chart.LowestHeadM)} to {show.Length(chart.HighestHeadM)}; here they run from {show.Length(heads.Min())} to {show.Length(heads.Max())}, {outside} of {heads.Count} looked at outside. Outside the chart the unit is taken to stand; nothing is extrapolated.";
    }
}
