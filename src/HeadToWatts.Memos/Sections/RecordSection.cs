using System.Globalization;
using HeadToWatts.FlowRecords.Statistics;
using HeadToWatts.Memos.Content;
using HeadToWatts.Studies.Results;

namespace HeadToWatts.Memos.Sections;

/// <summary>What a daily record tells of seasons and years. Nothing without one.</summary>
internal static class RecordSection
{
    public static void Write(MemoContext memo)
    {
        if (memo.Result.Summary is not { } summary)
            return;
        var body = memo.Body;
        body.Section("The flow by season and year", "seasons");
        body.Say(Years(memo, summary) + " " + RichText.See("fig-hydrograph") + ", " + RichText.See("fig-curves") + " and " + RichText.See("fig-calendar") + " show how it moves.");
        if (Figures.Hydrograph(memo) is { } hydrograph)
            body.Figure("fig-hydrograph", hydrograph, "Flow through the year: the median of each day over the years, and the band that eight years in ten keep to.");
        if (Figures.Curves(memo) is { } curves)
            body.Figure("fig-curves", curves, "Flow-duration curves, each over its own time, and the band between the whole years.");
        if (Figures.FlowCalendar(memo) is { } calendar)
            body.Figure("fig-calendar", calendar, "Every day of the record: its flow as a share of the design flow. A thin line marks days without a value.");
        Low(memo, summary);
        Months(memo, summary);
    }

    private static RichText Years(MemoContext memo, RecordSummary summary)
    {
        var kind = summary.Years.Kind == YearKind.Water ? "water years (from 1 October)" : "calendar years";
        var text = $"The record holds {MemoContext.Count(summary.Years.Whole.Count, "whole year", "whole years")}, counted as {kind}.";
        return summary.Classes is { } c
            ? RichText.Of($"{text} By volume the dry year (exceeded in nine years of ten) is {Year(c.Dry)}, the median year {Year(c.Median)}, the wet year {Year(c.Wet)}, with mean flows of {memo.Show.Flow(c.Dry.MeanFlowM3PerS)}, {memo.Show.Flow(c.Median.MeanFlowM3PerS)} and {memo.Show.Flow(c.Wet.MeanFlowM3PerS)}.")
            : RichText.Of(text + " That is too few to name a dry and a wet year.");
    }

    private static void Low(MemoContext memo, RecordSummary summary)
    {
        var show = memo.Show;
        var text = RichText.Of($"Mean annual flow {(summary.MeanAnnualM3PerS is { } mean ? show.Flow(mean) : "not known")}; Q95 of all days {(summary.Q95M3PerS is { } q95 ? show.Flow(q95) : "not known")}; ");
        text += summary.SevenQTen is { } low
            ? RichText.Of($"7Q10 {show.Flow(low.FlowM3PerS)} by log-Pearson III from the minima of {MemoContext.Count(low.Minima.Count, "year", "years")} ") + memo.Body.Cite(low.Uses[^1].Method.Source) + "."
            : RichText.Of($"7Q10 is not given ({summary.WhyNoSevenQTen}).");
        memo.Body.Say(text);
    }

    private static void Months(MemoContext memo, RecordSummary summary)
    {
        var names = CultureInfo.InvariantCulture.DateTimeFormat;
        memo.Body.Table("tab-month-flows", "Flow exceeded for a share of each month's own time.",
            [
                new("Month"), new(MemoContext.Head("90 %", memo.Show.FlowUnit), ColumnAlign.Right), new(MemoContext.Head("50 %", memo.Show.FlowUnit), ColumnAlign.Right),
                new(MemoContext.Head("10 %", memo.Show.FlowUnit), ColumnAlign.Right), new("Days", ColumnAlign.Right),
            ],
            [.. Enumerable.Range(1, 12).Select(m => summary.Months.FirstOrDefault(x => x.Month == m) is { } month
                ? new TableRow([names.GetMonthName(m), memo.Flow(month.Curve.FlowAt(0.9)), memo.Flow(month.Curve.FlowAt(0.5)), memo.Flow(month.Curve.FlowAt(0.1)), MemoContext.Count(month.Days)])
                : new TableRow([names.GetMonthName(m), "–", "–", "–", "0"]))],
            summary.Months.Count < 12 ? "A month without a day of flow is not known; its energy stands at zero, and the year shows too little." : "");
    }

    private static string Year(RecordYear year) => year.Year.ToString(CultureInfo.InvariantCulture);
}
