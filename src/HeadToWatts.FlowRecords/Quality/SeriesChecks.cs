namespace HeadToWatts.FlowRecords.Quality;

/// <summary>A run of one value.</summary>
/// <param name="First">Index of its first value.</param>
/// <param name="Length">How many values.</param>
public readonly record struct FlatRun(int First, int Length);

/// <summary>
/// Looks for values that a person should look at. The limits are this project's own judgement (decision 0012): they flag, and
/// nothing is changed by them, since floods rise fast and gates hold flows level.
/// </summary>
public static class SeriesChecks
{
    /// <summary>How many times a value stands above or below both its neighbours to be flagged.</summary>
    public const double SpikeFactor = 10;

    /// <summary>Days of one and the same flow that are flagged.</summary>
    public const int FlatDays = 14;

    /// <summary>Indexes of single values more than ten times the larger, or less than a tenth of the smaller, of their two neighbours.</summary>
    /// <param name="flowsM3PerS">Successive flows, m3/s; NaN where one is missing, which makes a neighbour of none.</param>
    public static IReadOnlyList<int> Spikes(ReadOnlySpan<double> flowsM3PerS)
    {
        var found = new List<int>();
        for (var i = 1; i < flowsM3PerS.Length - 1; i++)
        {
            var (before, here, after) = (flowsM3PerS[i - 1], flowsM3PerS[i], flowsM3PerS[i + 1]);

            // A canal that is opened or shut goes from or to zero on one side only; both sides must agree.
            if (!(before > 0 && after > 0) || double.IsNaN(here) || here < 0)
                continue;
            if (here > SpikeFactor * Math.Max(before, after) || here < Math.Min(before, after) / SpikeFactor)
                found.Add(i);
        }

        return found;
    }

    /// <summary>Runs of the same flow above zero over at least some number of values.</summary>
    /// <param name="flowsM3PerS">Successive flows, m3/s; NaN where one is missing.</param>
    /// <param name="least">How many values make a run.</param>
    public static IReadOnlyList<FlatRun> FlatRuns(ReadOnlySpan<double> flowsM3PerS, int least = FlatDays)
    {
        ArgumentOutOfRangeException.ThrowIfLessThan(least, 2);
        var found = new List<FlatRun>();
        for (var i = 0; i < flowsM3PerS.Length;)
        {
            var end = i + 1;
            while (end < flowsM3PerS.Length && flowsM3PerS[end] == flowsM3PerS[i])
                end++;
            if (end - i >= least && flowsM3PerS[i] > 0)
                found.Add(new FlatRun(i, end - i));
            i = end;
        }

        return found;
    }

    /// <summary>Longest run of missing values.</summary>
    /// <param name="flowsM3PerS">Successive flows, m3/s; NaN where one is missing.</param>
    public static int LongestGap(ReadOnlySpan<double> flowsM3PerS)
    {
        var longest = 0;
        var here = 0;
        foreach (var flow in flowsM3PerS)
        {
            here = double.IsNaN(flow) ? here + 1 : 0;
            longest = Math.Max(longest, here);
        }

        return longest;
    }
}
