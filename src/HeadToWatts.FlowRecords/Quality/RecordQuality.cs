using System.Globalization;

namespace HeadToWatts.FlowRecords.Quality;

/// <summary>A kind of thing that was found in a record.</summary>
public enum QualityKind
{
    /// <summary>A day or time that stands again with the same flow, or once without one.</summary>
    RepeatedSame,

    /// <summary>A day or time that stands again with another flow.</summary>
    RepeatedDifferent,

    /// <summary>A row that stands before an earlier day or time.</summary>
    OutOfOrder,

    /// <summary>A negative flow.</summary>
    Negative,

    /// <summary>One value far above or far below both its neighbours.</summary>
    Spike,

    /// <summary>The same flow for a long time.</summary>
    FlatRun,

    /// <summary>A row with a total or a mean instead of a date.</summary>
    TotalsRow,

    /// <summary>A row with fewer cells than the table has columns.</summary>
    ShortRow,

    /// <summary>A row with more cells than the table has columns.</summary>
    LongRow,

    /// <summary>A last row that is cut off.</summary>
    CutRow,

    /// <summary>A last row that may be cut off, since the file does not end with a line end.</summary>
    OpenEnd,

    /// <summary>A count or date in the file's own heading that its rows do not meet.</summary>
    OtherExtent,

    /// <summary>A day with values over too little of it.</summary>
    PartialDay,

    /// <summary>A pause between values too long to be bridged.</summary>
    Pause,

    /// <summary>A water level that the rating does not cover.</summary>
    OutsideRating,
}

/// <summary>One place where it was found.</summary>
/// <param name="Row">Row of the file; 0 where it has none.</param>
/// <param name="Text">What stands there.</param>
public readonly record struct QualityExample(int Row, string Text);

/// <summary>Something that was found in a record, counted.</summary>
/// <param name="Kind">What.</param>
/// <param name="Count">How often.</param>
/// <param name="Examples">The first few places.</param>
/// <param name="Done">What was done about it.</param>
public sealed record QualityFinding(QualityKind Kind, int Count, IReadOnlyList<QualityExample> Examples, string Done)
{
    /// <summary>What was found, in the plural.</summary>
    public string Name => Kind switch
    {
        QualityKind.RepeatedSame => "Rows that repeat a day or time with the same flow or none",
        QualityKind.RepeatedDifferent => "Rows that repeat a day or time with another flow",
        QualityKind.OutOfOrder => "Rows out of order",
        QualityKind.Negative => "Negative flows",
        QualityKind.Spike => "Single values far from both neighbours",
        QualityKind.FlatRun => "Long runs of one and the same flow",
        QualityKind.TotalsRow => "Rows of totals or means",
        QualityKind.ShortRow => "Rows with fewer cells than the table",
        QualityKind.LongRow => "Rows with more cells than the table",
        QualityKind.CutRow => "Last row cut off",
        QualityKind.OpenEnd => "File that ends inside its last row",
        QualityKind.OtherExtent => "Extent in the heading that the rows do not meet",
        QualityKind.PartialDay => "Days known in part only",
        QualityKind.OutsideRating => "Water levels outside the rating",
        _ => "Pauses too long to be bridged",
    };

    /// <summary>The finding on one line.</summary>
    public override string ToString()
    {
        var examples = string.Join("; ", Examples.Select(e => e.Row > 0 ? $"row {e.Row.ToString(CultureInfo.InvariantCulture)}: {e.Text}" : e.Text));
        return $"{Name}: {Count.ToString("N0", CultureInfo.InvariantCulture)} ({examples}{(Examples.Count < Count ? "; ..." : "")}); {Done}";
    }
}

/// <summary>What a flow record is worth: its extent, what is missing or marked, what was found in it and what was done about it.</summary>
public sealed record RecordQuality
{
    /// <summary>First day with a flow, as read.</summary>
    public required DateOnly FirstDay { get; init; }

    /// <summary>Last day with a flow, as read.</summary>
    public required DateOnly LastDay { get; init; }

    /// <summary>Time from one value to the next: a day, or the usual step of a logger.</summary>
    public TimeSpan Step { get; init; } = TimeSpan.FromDays(1);

    /// <summary>Rows of data in the file.</summary>
    public int Rows { get; init; }

    /// <summary>Days from the first to the last.</summary>
    public int Days { get; init; }

    /// <summary>Days without a flow, before any gap is filled.</summary>
    public int MissingDays { get; init; }

    /// <summary>Longest run of days without a flow, before any gap is filled.</summary>
    public int LongestGapDays { get; init; }

    /// <summary>Days the agency marks as estimated.</summary>
    public int EstimatedDays { get; init; }

    /// <summary>Days with ice at the gauge, with a flow or without.</summary>
    public int IceDays { get; init; }

    /// <summary>Days whose value is not yet approved.</summary>
    public int ProvisionalDays { get; init; }

    /// <summary>Days of no flow; they are data.</summary>
    public int ZeroDays { get; init; }

    /// <summary>Days filled by a straight line.</summary>
    public int FilledDays { get; init; }

    /// <summary>What was found, each with its count.</summary>
    public IReadOnlyList<QualityFinding> Findings { get; init; } = [];

    /// <summary>The user's choices.</summary>
    public RecordPolicies Policies { get; init; } = RecordPolicies.Default;

    /// <summary>What the choices did to this record.</summary>
    public IReadOnlyList<string> Done { get; init; } = [];

    /// <summary>Share of the days without a flow, 0 to 1, before any gap is filled.</summary>
    public double MissingRatio => Days == 0 ? 0 : (double)MissingDays / Days;

    /// <summary>The finding of a kind; null when there is none.</summary>
    public QualityFinding? Find(QualityKind kind) => Findings.FirstOrDefault(f => f.Kind == kind);

    /// <summary>The step in words.</summary>
    public string StepText => Words(Step);

    /// <summary>A span of time in words: "1 day", "15 minutes", "5 min 30 s".</summary>
    public static string Words(TimeSpan span)
    {
        if (span == TimeSpan.FromDays(1))
            return "1 day";
        if (span.Ticks > 0 && span.Ticks % TimeSpan.TicksPerHour == 0)
            return span.TotalHours == 1 ? "1 hour" : Number(span.TotalHours) + " hours";
        if (span.Ticks > 0 && span.Ticks % TimeSpan.TicksPerMinute == 0)
            return span.TotalMinutes == 1 ? "1 minute" : Number(span.TotalMinutes) + " minutes";
        return span.TotalMinutes < 1 ? Number(span.TotalSeconds) + " s" : $"{Number(Math.Floor(span.TotalMinutes))} min {Number(span.TotalSeconds % 60)} s";

        static string Number(double value) => value.ToString("0.#", CultureInfo.InvariantCulture);
    }

    /// <summary>The quality in plain lines.</summary>
    public IReadOnlyList<string> Lines()
    {
        var lines = new List<string>
        {
            $"Step: {StepText}",
            $"Missing: {Count(MissingDays)} of {Count(Days)} days ({Percent(MissingDays)}), the longest gap {Count(LongestGapDays)} days",
            $"Estimated: {Count(EstimatedDays)} days ({Percent(EstimatedDays)}); ice: {Count(IceDays)} days ({Percent(IceDays)}); provisional: {Count(ProvisionalDays)} days ({Percent(ProvisionalDays)})",
        };
        lines.AddRange(Findings.Select(f => "Found: " + f));
        lines.AddRange(Policies.Lines().Select(l => "Policy: " + l));
        lines.AddRange(Done.Select(d => "Done: " + d));
        return lines;

        static string Count(int count) => count.ToString("N0", CultureInfo.InvariantCulture);

        string Percent(int count) => (Days == 0 ? 0 : 100.0 * count / Days).ToString("0.#", CultureInfo.InvariantCulture) + " %";
    }
}
