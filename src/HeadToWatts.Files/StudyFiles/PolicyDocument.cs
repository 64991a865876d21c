namespace HeadToWatts.Files.StudyFiles;

/// <summary>The user's choices about the days of a record, each a text.</summary>
public sealed class PolicyDocument
{
    /// <summary>"left out", "interpolated up to 5 days" or "whole years only".</summary>
    public string? Gaps { get; set; }

    /// <summary>Month in which a year begins, as in "Oct", for whole years.</summary>
    public string? YearStarts { get; set; }

    /// <summary>"refused", "zeroed", "kept out" or "kept".</summary>
    public string? Negatives { get; set; }

    /// <summary>"kept" or "left out".</summary>
    public string? Estimated { get; set; }

    /// <summary>"refused", "first" or "last": two different flows for one day or time.</summary>
    public string? Repeats { get; set; }

    /// <summary>Share of a day over which the flow must be known, as in "90 %".</summary>
    public string? DayShare { get; set; }

    /// <summary>Longest time between two values that is bridged, as in "2 h".</summary>
    public string? LongestStep { get; set; }
}
