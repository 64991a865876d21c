using HeadToWatts.Basis.Units;
using HeadToWatts.FlowRecords;
using HeadToWatts.Memos.Content;
using HeadToWatts.Studies.Cautions;

namespace HeadToWatts.Memos.Sections;

/// <summary>The head of the first page.</summary>
internal static class TitleSection
{
    public static void Write(MemoContext memo)
    {
        var header = memo.Result.Header;
        var alternative = memo.Result.Input.Name;
        var subtitle = string.Join(". ", new[] { header.Place, alternative }.Where(t => !string.IsNullOrWhiteSpace(t)).Select(t => t.Trim().TrimEnd('.')));
        memo.Body.Add(new TitleBlock(
            "Hydropower pre-feasibility memo",
            MemoContext.OrElse(header.Name, "Unnamed site"),
            subtitle,
            StandingCautions.Status,
            [
                ("Client", MemoContext.OrElse(header.Client, "not stated")),
                ("Author", MemoContext.OrElse(header.Author, "not stated")),
                ("Date", MemoContext.OrElse(header.Date, "not stated")),
                ("Revision", MemoContext.OrElse(header.Revision, "not stated")),
                ("Flow data", Period(memo)),
                ("Accuracy", "screening: good enough to decide on closer study, no more"),
            ]));
    }

    internal static string Period(MemoContext memo)
    {
        var flow = memo.Result.Input.Flow;
        return flow.Record is { } record
            ? $"daily, {Day(record.FirstDay)} to {Day(record.LastDay)}"
            : $"flow-duration curve of {MemoContext.Count(flow.TypedCurve?.Rows.Count ?? 0, "row", "rows")}, period not stated";
    }

    internal static string Day(DateOnly day) => day.ToString("d MMM yyyy", System.Globalization.CultureInfo.InvariantCulture);
}
