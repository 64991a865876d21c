namespace HeadToWatts.FlowRecords.SubDaily;

/// <summary>
/// Daily means of values at instants, weighted by time: between two values the flow runs in a straight line, and a longer pause
/// than the limit breaks the line. A day's mean is the volume under the line over the part of the day that the line covers, so
/// that mean times covered time adds up to the volume of the whole line.
/// </summary>
public sealed class DailyMeans
{
    /// <summary>Milliseconds of a day.</summary>
    public const long DayMs = 86_400_000;

    private const double Hair = 1e-9;
    private readonly double[] _flows;
    private readonly double[] _shares;

    private DailyMeans(int firstDayNumber, double[] flows, double[] shares)
    {
        FirstDay = DateOnly.FromDayNumber(firstDayNumber);
        _flows = flows;
        _shares = shares;
    }

    /// <summary>Day of the first value.</summary>
    public DateOnly FirstDay { get; }

    /// <summary>Mean flow of each day in m3/s, NaN where too little of the day is known.</summary>
    public ReadOnlySpan<double> Flows => _flows;

    /// <summary>Share of each day, 0 to 1, that the line covers.</summary>
    public ReadOnlySpan<double> CoveredShares => _shares;

    /// <summary>Median time between values.</summary>
    public TimeSpan UsualStep { get; private init; }

    /// <summary>Longest time between two values that was bridged.</summary>
    public TimeSpan LongestStep { get; private init; }

    /// <summary>Pauses longer than that, where the line breaks.</summary>
    public int Breaks { get; private init; }

    /// <summary>Volume under the whole line, m3.</summary>
    public double VolumeM3 { get; private init; }

    /// <summary>Days that have values but too few for a mean.</summary>
    public int PartialDays { get; private init; }

    /// <summary>Daily means of a series.</summary>
    /// <param name="timesMs">Instants in ms from the start of 1 January of the year 1, on a clock that never jumps; strictly rising.</param>
    /// <param name="flowsM3PerS">Flow at each instant in m3/s; NaN where it is missing.</param>
    /// <param name="settings">Share of the day that is needed, and the longest step.</param>
    /// <exception cref="ArgumentException">No instant, lengths that differ, instants that do not rise, or a setting outside its range.</exception>
    public static DailyMeans Of(ReadOnlySpan<long> timesMs, ReadOnlySpan<double> flowsM3PerS, SubDailySettings settings)
    {
        ArgumentNullException.ThrowIfNull(settings);
        if (timesMs.Length == 0 || timesMs.Length != flowsM3PerS.Length)
            throw new ArgumentException("Instants and flows are as many as each other, and at least one.", nameof(flowsM3PerS));
        if (!(settings.DayShareNeeded is > 0 and <= 1))
            throw new ArgumentException("The share of the day that is needed lies above 0 and up to 1.", nameof(settings));
        if (settings.LongestStep is { } told && told <= TimeSpan.Zero)
            throw new ArgumentException("The longest step is longer than nothing.", nameof(settings));

        var usual = MedianStep(timesMs);
        var longest = settings.LongestStepFor(usual);
        var longestMs = (long)longest.TotalMilliseconds;
        var firstDay = timesMs[0] / DayMs;
        var days = (int)((timesMs[^1] / DayMs) - firstDay + 1);
        var volumes = new double[days];
        var coveredMs = new double[days];
        var touched = new bool[days];
        var breaks = 0;
        var volume = 0.0;
        var before = -1;
        for (var i = 0; i < timesMs.Length; i++)
        {
            if (i > 0 && timesMs[i] <= timesMs[i - 1])
                throw new ArgumentException($"Instant {i + 1} does not come after the one before.", nameof(timesMs));
            if (double.IsNaN(flowsM3PerS[i]))
                continue;
            touched[(int)((timesMs[i] / DayMs) - firstDay)] = true;
            if (before >= 0)
            {
                if (timesMs[i] - timesMs[before] <= longestMs)
                    volume += Lay(timesMs[before], flowsM3PerS[before], timesMs[i], flowsM3PerS[i], firstDay, volumes, coveredMs);
                else
                    breaks++;
            }

            before = i;
        }

        var partial = 0;
        for (var d = 0; d < days; d++)
        {
            var share = coveredMs[d] / DayMs;
            if (share >= settings.DayShareNeeded - Hair && share > 0)
            {
                volumes[d] /= coveredMs[d] / 1000;
            }
            else
            {
                if (touched[d])
                    partial++;
                volumes[d] = double.NaN;
            }

            coveredMs[d] = Math.Min(1, share);
        }

        return new DailyMeans((int)firstDay, volumes, coveredMs)
        {
            UsualStep = usual,
            LongestStep = longest,
            Breaks = breaks,
            VolumeM3 = volume,
            PartialDays = partial,
        };
    }

    // A straight piece of the line, cut at each midnight.
    private static double Lay(long fromMs, double from, long toMs, double to, long firstDay, double[] volumes, double[] coveredMs)
    {
        var total = 0.0;
        var slope = (to - from) / (toMs - fromMs);
        for (var at = fromMs; at < toMs;)
        {
            var day = at / DayMs;
            var end = Math.Min(toMs, (day + 1) * DayMs);
            var middle = from + (slope * ((0.5 * (at + end - (2 * fromMs)))));
            var piece = middle * (end - at) / 1000;
            volumes[(int)(day - firstDay)] += piece;
            coveredMs[(int)(day - firstDay)] += end - at;
            total += piece;
            at = end;
        }

        return total;
    }

    // A median of at most some thousand steps spread over the series is the usual step of any logger.
    private static TimeSpan MedianStep(ReadOnlySpan<long> timesMs)
    {
        const int Most = 5000;
        var steps = timesMs.Length - 1;
        if (steps == 0)
            return TimeSpan.Zero;
        var every = Math.Max(1, steps / Most);
        var sample = new long[((steps - 1) / every) + 1];
        for (var i = 0; i < sample.Length; i++)
            sample[i] = timesMs[(i * every) + 1] - timesMs[i * every];
        Array.Sort(sample);
        return TimeSpan.FromMilliseconds(sample[sample.Length / 2]);
    }
}
