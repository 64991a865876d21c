using HeadToWatts.FlowRecords;
using HeadToWatts.Memos.Content;

namespace HeadToWatts.Memos.Sections;

/// <summary>Where the flows come from and how good they are.</summary>
internal static class FlowDataSection
{
    public static void Write(MemoContext memo)
    {
        var body = memo.Body;
        var flow = memo.Result.Input.Flow;
        body.Section("Flow data and their quality", "flow-data");
        var source = MemoContext.OrElse(flow.SourceDescription, flow.Record?.Description is { Length: > 0 } description ? description : "");
        body.Say(source.Length > 0 ? RichText.Of("Source, in the author's words: ") + RichText.Italic(source) : "The author states no source for the flows.");
        if (flow.Origin is { } origin)
            Origin(memo, origin);
        if (flow.Record is { } record)
            Record(memo, record);
        if (flow.Findings.Count > 0)
        {
            body.Say(RichText.Bold("Found in the file, and what was done"), keepWithNext: true);
            body.Add(ListBlock.Bullets([.. flow.Findings.Select(f => RichText.Of(MemoContext.Sentence(f)))]));
        }

        else if (flow.TypedCurve is { } curve)
            Typed(memo, curve);
    }

    private static void Origin(MemoContext memo, HeadToWatts.Studies.Inputs.FlowOrigin origin)
    {
        var body = memo.Body;
        var text = RichText.Bold("Not measured at the site. ") + $"The flow was {origin.Reason}. Confidence: {origin.Grade}.";
        if (origin.Uses.Count > 0)
            text = text + " Method: " + string.Join("; ", origin.Uses.Select(u => u.Method.Name)) + " " + body.Cite(origin.Uses[0].Method.Source) + ".";
        body.Say(text, keepWithNext: true);
        body.Add(ListBlock.Bullets([.. origin.Notes.Select(n => RichText.Of(MemoContext.Sentence(n)))]));
    }

    private static void Record(MemoContext memo, DailyRecord record)
    {
        var show = memo.Show;
        var flow = memo.Result.Input.Flow;
        var missing = record.DayCount == 0 ? 0 : (double)record.MissingCount / record.DayCount;
        memo.Body.Table("tab-record", "The record.", [new("What"), new("Found"), new("What was done about it", Share: 2)],
        [
            Row("First and last day", $"{TitleSection.Day(record.FirstDay)} to {TitleSection.Day(record.LastDay)}", "used whole"),
            Row("Resolution", "daily means", "shorter peaks and stops are not seen"),
            Row("Days with a flow", $"{MemoContext.Count(record.ValidCount)} ({record.YearsSpanned.ToString("0.0", System.Globalization.CultureInfo.InvariantCulture)} years)", record.YearsSpanned < 10 ? "fewer than ten years: the mean here is not a long-term mean" : "ranked for the duration curve"),
            Row("Days without a flow", $"{MemoContext.Count(record.MissingCount)} ({MemoContext.Percent(missing)})", record.MissingCount == 0 ? "nothing to do" : "left out; not read as zero, not filled in"),
            Row("Days of no flow", MemoContext.Count(record.ZeroCount), record.ZeroCount == 0 ? "nothing to do" : "kept: dry days are data"),
            Row("Days of negative flow", MemoContext.Count(record.NegativeCount), record.NegativeCount == 0 ? "nothing to do" : "counted as no flow"),
            Row("Least, mean, most", $"{show.Flow(record.SmallestM3PerS)}, {show.Flow(record.MeanM3PerS)}, {show.Flow(record.LargestM3PerS)}", "as read"),
        ]);
        if (record.MissingCount > 0 && Figures.Gaps(memo) is { } gaps)
            memo.Body.Figure("fig-gaps", gaps, "The record on a time line; its gaps are cut out.");
        memo.Body.Say((flow.Origin is null ? "No day was estimated here. " : "") + "Whether the station estimated some, and how well its rating holds, must be asked of its owner. Flow measured upstream of turnouts is not the flow at a drop below them.", ParagraphKind.Note);
    }

    private static void Typed(MemoContext memo, FlowDurationCurve curve)
    {
        var flow = memo.Result.Input.Flow;
        var end = curve.EndRule == BeyondLastRow.Hold ? "beyond the last row the last flow holds" : "beyond the last row it is taken as dry";
        var season = flow.RowsAreForSeason && !flow.Season.IsWholeYear
            ? $" The rows count the season only ({flow.Season.Describe()}, {MemoContext.Percent(flow.Season.ShareOfYear)} of the year); for the rest of the year the curve is dry."
            : "";
        memo.Body.Say($"The flows were given as a flow-duration curve of {MemoContext.Count(curve.Rows.Count, "row", "rows")}, drawn with straight lines between the rows. Above the first row the first flow holds, so that no flood is made up; {end}.{season} The rows stand in " + RichText.See("inputs") + ".");
        memo.Body.Say("A curve does not show its period, its gaps or its dry years. None of these could be checked here, and months cannot be told apart.");
    }

    private static TableRow Row(string what, string found, string done) => new([what, found, done]);
}
