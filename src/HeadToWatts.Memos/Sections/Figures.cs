using HeadToWatts.Drawings;
using HeadToWatts.Drawings.Canvas;

namespace HeadToWatts.Memos.Sections;

/// <summary>The figures of the memo: the same drawings as on the screen, at the size of the page. Null where a study has nothing to draw.</summary>
internal static class Figures
{
    private static readonly DrawingSize Size = DrawingSize.MemoPage;

    public static Drawing Section(MemoContext memo) => SchemeSection.Draw(memo.Result, memo.Show, Size);

    public static Drawing FlowDuration(MemoContext memo) => FlowDurationChart.Draw(memo.Result, memo.Show, Size);

    public static Drawing? Gaps(MemoContext memo) => GapTimeline.Draw(memo.Result, Size with { Height = 72 });

    public static Drawing? Hydrograph(MemoContext memo) => HydrographChart.Draw(memo.Result, memo.Show, Size with { Height = 190 });

    public static Drawing? Curves(MemoContext memo) => CurvesChart.DrawYears(memo.Result, memo.Show, Size);

    public static Drawing? FlowCalendar(MemoContext memo) => DayCalendar.DrawFlow(memo.Result, Size with { Height = Years(memo) });

    public static Drawing? EnergyCalendar(MemoContext memo) => DayCalendar.DrawEnergy(memo.Result, Size with { Height = Years(memo) });

    // A line for each year wants some height to be told from the next.
    private static double Years(MemoContext memo) => Math.Clamp(40 + (9 * (memo.Result.Summary?.Years.All.Count ?? 1)), 100, 420);

    public static Drawing? Levels(MemoContext memo) => LevelsChart.Draw(memo.Result, memo.Show, Size);

    public static Drawing? CanalDrop(MemoContext memo) => CanalDropDrawing.Draw(memo.Result, memo.Show, Size);

    public static Drawing? Pumping(MemoContext memo) => PumpingMonthsChart.Draw(memo.Result, Size with { Height = 200 });

    public static Drawing Envelopes(MemoContext memo) => EnvelopeChart.Draw(memo.Result, memo.Show, Size with { Height = 290 });

    public static Drawing? DesignFlow(MemoContext memo) => DesignFlowChart.Draw(memo.Result, memo.Show, Size);

    public static Drawing Power(MemoContext memo) => PowerChart.Draw(memo.Result, memo.Show, Size);

    public static Drawing? Losses(MemoContext memo) => LossShareChart.Draw(memo.Result, memo.Show, Size);

    public static Drawing? Staircase(MemoContext memo) => EnergyStaircaseChart.Draw(memo.Result, Size);

    public static Drawing? CashFlow(MemoContext memo) => CashFlowChart.Draw(memo.Result, Size);

    public static Drawing? CostBuildUp(MemoContext memo) => CostBuildUpChart.Draw(memo.Result, Size);

    public static Drawing? Sensitivity(MemoContext memo) => SensitivityBarsChart.Draw(memo.Result, Size);

    public static Drawing? StopHeads(MemoContext memo) => StopHeadsChart.Draw(memo.Result, memo.Show, Size with { Height = 210 });

    public static Drawing? StopTime(MemoContext memo) => StopTimeChart.Draw(memo.Result, memo.Show, Size with { Height = 190 });

    public static Drawing? PumpBand(MemoContext memo) => PumpBandChart.Draw(memo.Result, memo.Show, Size with { Height = 240 });

    public static Drawing? Split(MemoContext memo) => SplitChart.Draw(memo.Result, memo.Show, Size with { Height = 230 });

    public static Drawing Efficiency(MemoContext memo) => EfficiencyChart.Draw(memo.Result, memo.Show, Size with { Height = 210 });

    public static Drawing? Months(MemoContext memo) => MonthsChart.Draw(memo.Result, Size with { Height = 190 });
}
