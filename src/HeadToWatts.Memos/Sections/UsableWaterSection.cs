using HeadToWatts.FlowRecords;
using HeadToWatts.Memos.Content;

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
        var reserved = input.Allocation.Reserved;
        body.Section("Water that may be used", "water");
        var rights = reserved.Kind switch
        {
            ReservedFlowKind.Constant when reserved.FlowM3PerS > 0 => $"A reserved flow of {show.Flow(reserved.FlowM3PerS)} stays in the stream.",
            ReservedFlowKind.PercentOfFlow => $"A reserved flow of {MemoContext.Percent(reserved.Ratio)} of what arrives stays in the stream.",
            _ => input.ReservedFlowIsStated ? "No flow is reserved, as stated by the author." : "No reserved flow is stated; none is taken off.",
        };
        var prior = input.Allocation.PriorDeliveriesM3PerS > 0
            ? $" Prior deliveries of {show.Flow(input.Allocation.PriorDeliveriesM3PerS)} come first."
            : " No prior deliveries are stated.";
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
        body.Say("The water right itself (rate, dates, place of return) was not examined.", ParagraphKind.Note);
    }

    private static RichText Position(MemoContext memo) => memo.Result.Input.Flow.Record is null
        ? RichText.Empty
        : RichText.Of($" The days were ranked by the {memo.Result.Input.Flow.PlottingPosition.Name} position ") + memo.Body.Cite(memo.Result.Input.Flow.PlottingPosition.Method.Source) + ".";
}
