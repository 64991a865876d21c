namespace HeadToWatts.FlowRecords.Statistics;

/// <summary>
/// A dry, a median and a wet year of a record: the whole years whose annual volume stands nearest to the one exceeded in 90, 50
/// and 10 percent of years. They are years that happened, not made up of parts.
/// </summary>
/// <param name="Dry">The dry year.</param>
/// <param name="Median">The median year.</param>
/// <param name="Wet">The wet year.</param>
/// <param name="WholeYears">Whole years among which they stand.</param>
public sealed record YearClasses(RecordYear Dry, RecordYear Median, RecordYear Wet, int WholeYears)
{
    /// <summary>Picks the three years; null with fewer than three whole years.</summary>
    /// <param name="years">The record's years.</param>
    public static YearClasses? Of(RecordYears years)
    {
        ArgumentNullException.ThrowIfNull(years);
        RecordYear[] ascending = [.. years.Whole.OrderBy(y => y.VolumeM3).ThenBy(y => y.Year)];
        if (ascending.Length < 3)
            return null;
        RecordYear At(double nonExceedance)
        {
            // Weibull: the year of rank m stands at m/(n + 1).
            var rank = (int)Math.Round(nonExceedance * (ascending.Length + 1), MidpointRounding.AwayFromZero);
            return ascending[Math.Clamp(rank, 1, ascending.Length) - 1];
        }

        return new YearClasses(At(0.1), At(0.5), At(0.9), ascending.Length);
    }
}
