using System.Globalization;

namespace HeadToWatts.FlowRecords.Quality;

/// <summary>What is done about days without a flow.</summary>
public enum GapPolicy
{
    /// <summary>They are left out: the curve is of the days that have a flow.</summary>
    LeftOut,

    /// <summary>Short gaps are filled by a straight line between their neighbours.</summary>
    Interpolated,

    /// <summary>Only years without a gap are used.</summary>
    WholeYearsOnly,
}

/// <summary>What is done about negative flows.</summary>
public enum NegativePolicy
{
    /// <summary>The record is refused, with the rows.</summary>
    Refused,

    /// <summary>They become zero.</summary>
    Zeroed,

    /// <summary>They are kept out, as days without a flow.</summary>
    KeptOut,

    /// <summary>They are kept as they are; a flow-duration curve counts them as no flow.</summary>
    Kept,
}

/// <summary>What is done about a day or time that stands twice with different flows.</summary>
public enum RepeatPolicy
{
    /// <summary>The record is refused, with the rows.</summary>
    Refused,

    /// <summary>The first one holds.</summary>
    First,

    /// <summary>The last one holds.</summary>
    Last,
}

/// <summary>The user's choices about the days of a record. They are printed with the results.</summary>
/// <param name="Gaps">What is done about days without a flow.</param>
/// <param name="LongestGapDays">Longest gap that is filled, days, when gaps are interpolated.</param>
/// <param name="YearStartMonth">Month in which a year begins, 1 to 12, when whole years are wanted.</param>
/// <param name="Negatives">What is done about negative flows.</param>
/// <param name="KeepEstimated">False to leave out values the agency marks as estimated.</param>
/// <param name="Repeats">What is done about two flows for one day.</param>
public sealed record RecordPolicies(
    GapPolicy Gaps = GapPolicy.LeftOut,
    int LongestGapDays = 0,
    int YearStartMonth = 1,
    NegativePolicy Negatives = NegativePolicy.Refused,
    bool KeepEstimated = true,
    RepeatPolicy Repeats = RepeatPolicy.Refused)
{
    /// <summary>Gaps left out, negatives refused, estimated values kept, different repeats refused.</summary>
    public static RecordPolicies Default { get; } = new();

    /// <summary>The choices in plain sentences.</summary>
    public IReadOnlyList<string> Lines() =>
    [
        Gaps switch
        {
            GapPolicy.Interpolated => $"Gaps of up to {Days(LongestGapDays)} are filled by a straight line; longer ones are left out.",
            GapPolicy.WholeYearsOnly => $"Only years without a gap are used; a year begins in {CultureInfo.InvariantCulture.DateTimeFormat.GetMonthName(YearStartMonth)}.",
            _ => "Days without a flow are left out.",
        },
        Negatives switch
        {
            NegativePolicy.Zeroed => "Negative flows are set to zero.",
            NegativePolicy.KeptOut => "Negative flows are kept out, as days without a flow.",
            NegativePolicy.Kept => "Negative flows are kept; the duration curve counts them as no flow.",
            _ => "A record with negative flows is refused.",
        },
        KeepEstimated ? "Estimated values are kept." : "Estimated values are left out.",
        Repeats switch
        {
            RepeatPolicy.First => "Of two different flows for one day or time the first holds.",
            RepeatPolicy.Last => "Of two different flows for one day or time the last holds.",
            _ => "A record with two different flows for one day or time is refused.",
        },
    ];

    private static string Days(int days) => days == 1 ? "1 day" : days.ToString("N0", CultureInfo.InvariantCulture) + " days";
}
