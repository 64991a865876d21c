namespace HeadToWatts.FlowRecords.Statistics;

/// <summary>Quantiles by the Weibull position p = m/(n + 1), held at the ends.</summary>
internal static class Quantile
{
    /// <summary>The value not exceeded with a probability.</summary>
    /// <param name="ascending">The sample in rising order; one value or more.</param>
    /// <param name="nonExceedance">Probability, 0 to 1.</param>
    public static double Of(ReadOnlySpan<double> ascending, double nonExceedance)
    {
        var rank = (nonExceedance * (ascending.Length + 1)) - 1;
        if (rank <= 0)
            return ascending[0];
        if (rank >= ascending.Length - 1)
            return ascending[^1];
        var low = (int)Math.Floor(rank);
        return ascending[low] + ((rank - low) * (ascending[low + 1] - ascending[low]));
    }
}
