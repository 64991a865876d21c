using HeadToWatts.Basis.Units;
using HeadToWatts.Files.FlowFiles.Recipes;
using HeadToWatts.FlowRecords;
using HeadToWatts.FlowRecords.Quality;
using HeadToWatts.FlowRecords.SubDaily;

namespace HeadToWatts.Files.FlowFiles;

/// <summary>Order of day and month in dates such as 3/4/2020.</summary>
public enum DateOrder
{
    /// <summary>Month, day, year.</summary>
    MonthFirst,

    /// <summary>Day, month, year.</summary>
    DayFirst,
}

/// <summary>What the reader is told about a file; whatever is left out is taken from the file, and stated in its report.</summary>
/// <param name="Unit">Unit of the flows, for a file that does not name it.</param>
/// <param name="Order">Order of day and month.</param>
/// <param name="Column">Name or number of the value column, or the station, where a file has several.</param>
/// <param name="Format">Key of the format, to pass over recognition.</param>
/// <param name="AcceptNegatives">True to keep negative flows, which a flow-duration curve then counts as no flow.</param>
/// <param name="Beyond">What a flow-duration series does beyond its last row.</param>
/// <param name="Policies">What is done about gaps, negatives, estimated values and repeats.</param>
/// <param name="SubDaily">How values within a day become daily means.</param>
/// <param name="Recipe">How the file is read, in place of a known format.</param>
/// <param name="Stage">How water levels become flows, for a file of levels.</param>
public sealed record FlowFileOptions(
    UnitOfMeasure? Unit = null,
    DateOrder? Order = null,
    string? Column = null,
    string? Format = null,
    bool AcceptNegatives = false,
    BeyondLastRow Beyond = BeyondLastRow.Hold,
    RecordPolicies? Policies = null,
    SubDailySettings? SubDaily = null,
    ReadingRecipe? Recipe = null,
    StageReading? Stage = null)
{
    /// <summary>Nothing told.</summary>
    public static FlowFileOptions Default { get; } = new();

    /// <summary>The policies, the usual ones where none are told.</summary>
    internal RecordPolicies Chosen =>
        AcceptNegatives ? (Policies ?? RecordPolicies.Default) with { Negatives = NegativePolicy.Kept } : Policies ?? RecordPolicies.Default;

    /// <summary>The time zone whose clock the times are of.</summary>
    internal TimeZoneInfo? Zone => Recipe?.Clock.Zone;

    /// <summary>Whether the clock is known not to change to daylight-saving time.</summary>
    internal bool ClockStandsStill => Recipe is { Clock.StandsStill: true };
}
