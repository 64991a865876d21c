namespace HeadToWatts.FlowRecords.Quality;

/// <summary>What the agency says of a day's value.</summary>
[Flags]
public enum DayMarks
{
    /// <summary>Nothing.</summary>
    None = 0,

    /// <summary>The value is estimated.</summary>
    Estimated = 1,

    /// <summary>Ice at the gauge.</summary>
    Ice = 2,

    /// <summary>The value is not yet approved.</summary>
    Provisional = 4,

    /// <summary>The value stands for a part of the day.</summary>
    Partial = 8,
}
