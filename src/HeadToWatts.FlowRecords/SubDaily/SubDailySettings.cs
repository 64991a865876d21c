namespace HeadToWatts.FlowRecords.SubDaily;

/// <summary>How values within a day become daily means.</summary>
/// <param name="DayShareNeeded">Share of a day, above 0 to 1, over which the flow must be known for the day to have a mean.</param>
/// <param name="LongestStep">Longest time between two values over which the flow runs in a straight line; null for three usual steps, and at least two hours.</param>
public sealed record SubDailySettings(double DayShareNeeded = 0.9, TimeSpan? LongestStep = null)
{
    /// <summary>Nine tenths of the day, and three usual steps.</summary>
    public static SubDailySettings Default { get; } = new();

    /// <summary>The longest step that is bridged when the usual one is known.</summary>
    /// <param name="usualStep">Median time between values.</param>
    public TimeSpan LongestStepFor(TimeSpan usualStep) =>
        LongestStep ?? TimeSpan.FromTicks(Math.Max(3 * usualStep.Ticks, TimeSpan.FromHours(2).Ticks));
}
