using HeadToWatts.Basis.Units;
using HeadToWatts.FlowRecords;

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
public sealed record FlowFileOptions(
    UnitOfMeasure? Unit = null,
    DateOrder? Order = null,
    string? Column = null,
    string? Format = null,
    bool AcceptNegatives = false,
    BeyondLastRow Beyond = BeyondLastRow.Hold)
{
    /// <summary>Nothing told.</summary>
    public static FlowFileOptions Default { get; } = new();
}
