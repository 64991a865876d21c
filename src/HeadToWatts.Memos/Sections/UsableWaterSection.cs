using HeadToWatts.FlowRecords;
using HeadToWatts.FlowRecords.Reserved;
using HeadToWatts.Memos.Content;
using HeadToWatts.Studies;

namespace HeadToWatts.Memos.Sections;

/// <summary>The flow-duration curve and the water that may be used.</summary>
internal static class UsableWaterSection
{
    private static readonly double[] Exceedances = [0.05, 0.1, 0.2, 0.3, 0.4, 0.5, 0.6, 0.7, 0.8, 0.9, 0.95];

    public static void Write(MemoContext memo)
    {
        var body = memo.Body;
        var result = memo.Result;
        var show = memo.Show;
        var input = result.Input.Flow;
        body.Section("Water that may be used", "water");
        var rights = WaterWords.Reserved(input, show) switch
        {
            "not stated" => "No reserved flow is stated; none is taken off.",
            "none, as stated" => "No flow is reserved, as stated by the author.",
            var rule => $"What stays in the stream (the reserved flow): {rule}.",
        };
        var deliveries = WaterWords.Deliveries(input, show);
        var prior = deliveries.Count > 0 ? $" Others come first: {string.Join("; ", deliveries)}." : " No prior deliveries are stated.";
        if (input.Rules is { Seepage: var loss } && loss != ReachLoss.None)
            prior += $" Between gauge and site {WaterWords.Loss(loss, show)} is lost; all flows here are those at the site.";
        if (input.Rules?.Right is not null)
            prior += $" The water right: {WaterWords.Right(input, show)}; what lies beyond it stays in the stream and is counted as reserved.";
        var season = input.Season.IsWholeYear ? " The plant may run all year." : $" The plant may run from {input.Season.Describe()}: {MemoContext.Count(input.Season.DaysPerYear, "day", "days")} a year.";
        body.Say(rights + prior + season + " What is reserved comes off before the turbine's limit, never after.");
        body.Say($"The mean flow arriving over the year is {show.Flow(result.Flow.MeanFlowM3PerS)}, of which {show.Flow(result.Flow.MeanUsableFlowM3PerS)} may be used; there is some to use in {MemoContext.Percent(result.Flow.WetShareOfYear)} of the year. The design flow of {show.Flow(result.Flow.DesignFlowM3PerS)} is reached in {MemoContext.Percent(result.Flow.DesignFlowExceedance)} of the year. " + RichText.See("fig-fdc") + " and " + RichText.See("tab-exceedance") + " show the curve." + Position(memo));
        body.Figure("fig-fdc", Figures.FlowDuration(memo), "Flow-duration curve of the year: what goes through the turbines, what is spilled, what is too little to run on, and on top what is reserved or delivered first.");
        body.Table("tab-exceedance", "Flow exceeded for a share of the year.",
            [
                new("Exceeded, % of the year", ColumnAlign.Right),
                new(MemoContext.Head("Arriving", show.FlowUnit), ColumnAlign.Right),
                new(MemoContext.Head("Prior deliveries", show.FlowUnit), ColumnAlign.Right),
                new(MemoContext.Head("Reserved", show.FlowUnit), ColumnAlign.Right),
                new(MemoContext.Head("May be used", show.FlowUnit), ColumnAlign.Right),
            ],
            [.. Exceedances.Select(p =>
            {
                var flow = result.Flow.Curve.FlowAt(p);
                var split = input.Allocation.Split(flow);
                return new TableRow([MemoContext.WholePercent(p), memo.Flow(flow), memo.Flow(split.PriorM3PerS), memo.Flow(split.ReservedM3PerS), memo.Flow(split.UsableM3PerS)]);
            })]);
        if (input.AllocationByMonth is { } months)
            ByMonth(memo, months);
        body.Say(
            input.Rules?.Right is null
                ? "No water right was given: the plant is taken to have the use of all that is left. A right's rate, dates and place of return must be settled before anything is built."
                : "The water right is as the author gave it. Whether it covers power, and where the water must return, was not examined.",
            ParagraphKind.Note);
        if (input.Rules?.Reserved is TennantReserved or LowFlowReserved)
            body.Say(RichText.Of("The rule of the reserved flow is a screening rule ") + Cited(memo) + "; the flow written in a permit governs, and agencies may ask for a study of the stream itself.", ParagraphKind.Note);
    }

    private static RichText Cited(MemoContext memo) =>
        memo.Result.Input.Flow.Rules!.Uses is { Count: > 0 } uses ? memo.Body.Cite(uses[^1].Method.Source) : RichText.Of("(this study's own figure)");

    private static void ByMonth(MemoContext memo, IReadOnlyList<WaterAllocation> months)
    {
        memo.Body.Table("tab-water-months", "What comes off by month.",
            [new("Month"), new(MemoContext.Head("Delivered first", memo.Show.FlowUnit), ColumnAlign.Right), new("Reserved", Share: 2)],
            [.. months.Select((a, i) => (a, Month: i + 1)).Where(x => memo.Result.Input.Flow.Season.RunsInMonth(x.Month)).Select(x => new TableRow([
                System.Globalization.CultureInfo.InvariantCulture.DateTimeFormat.GetMonthName(x.Month), memo.Flow(x.a.PriorDeliveriesM3PerS), WaterWords.Amount(x.a.Reserved, memo.Show)]))]);
        memo.Body.Say("The energy counts each month's own; the curve and the table of exceedance show the season's middle month.", ParagraphKind.Note);
    }

    private static RichText Position(MemoContext memo) => memo.Result.Input.Flow.Record is null
        ? RichText.Empty
        : RichText.Of($" The days were ranked by the {memo.Result.Input.Flow.PlottingPosition.Name} position ") + memo.Body.Cite(memo.Result.Input.Flow.PlottingPosition.Method.Source) + ".";
}
