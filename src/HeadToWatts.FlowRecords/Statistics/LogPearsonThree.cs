using HeadToWatts.Basis.Sources;

namespace HeadToWatts.FlowRecords.Statistics;

/// <summary>
/// Log-Pearson type III fitted to yearly values by the moments of their logarithms, with the skew of the station itself. Years
/// of zero are left out of the fit and come back by conditional probability: with a share p_0 of them, a flow not exceeded with
/// probability F is the fit's at (F - p_0)/(1 - p_0), and 0 where F is not above p_0.
/// </summary>
public sealed class LogPearsonThree
{
    /// <summary>The method.</summary>
    internal static readonly Method Method = new(
        "log-pearson-3", "Log-Pearson type III", "log Q = mean + K(G, F) s", FlowRecordSources.Bulletin17B, "station skew; zeros by conditional probability (appendix 5)",
        [new InputRange("n", "years with flow", "1", 10, double.PositiveInfinity)]);

    private LogPearsonThree(int years, int zeroYears, double meanLog, double deviationLog, double skewCoefficient)
    {
        Years = years;
        ZeroYears = zeroYears;
        MeanLog = meanLog;
        DeviationLog = deviationLog;
        SkewCoefficient = skewCoefficient;
    }

    /// <summary>Years in all.</summary>
    public int Years { get; }

    /// <summary>Years of zero, or of less than zero, which count as zero.</summary>
    public int ZeroYears { get; }

    /// <summary>Mean of the decimal logarithms of the flows in m3/s.</summary>
    public double MeanLog { get; }

    /// <summary>Standard deviation of the decimal logarithms.</summary>
    public double DeviationLog { get; }

    /// <summary>Skew of the decimal logarithms, corrected for the number of years.</summary>
    public double SkewCoefficient { get; }

    /// <summary>Share of years of zero p_0.</summary>
    public double ZeroShare => (double)ZeroYears / Years;

    /// <summary>The use of the method, with the years behind it.</summary>
    public IReadOnlyList<MethodUse> Uses =>
    [
        Method.Used(new InputSpan("n", Years - ZeroYears, Years - ZeroYears)),
        PearsonThree.Method.Used(new InputSpan("G", SkewCoefficient, SkewCoefficient)),
    ];

    /// <summary>Fits yearly values; null with fewer than three years of flow.</summary>
    /// <param name="flowsM3PerS">Flow of each year, m3/s; finite.</param>
    /// <exception cref="ArgumentOutOfRangeException">A flow is not finite.</exception>
    public static LogPearsonThree? Fit(IReadOnlyList<double> flowsM3PerS)
    {
        ArgumentNullException.ThrowIfNull(flowsM3PerS);
        var logs = new List<double>(flowsM3PerS.Count);
        foreach (var flow in flowsM3PerS)
        {
            if (!double.IsFinite(flow))
                throw new ArgumentOutOfRangeException(nameof(flowsM3PerS), flow, "Every year has a flow.");
            if (flow > 0)
                logs.Add(Math.Log10(flow));
        }

        var n = logs.Count;
        if (n < 3)
            return null;
        var mean = logs.Sum() / n;
        double squares = 0, cubes = 0;
        foreach (var log in logs)
        {
            var d = log - mean;
            squares += d * d;
            cubes += d * d * d;
        }

        var deviation = Math.Sqrt(squares / (n - 1));
        // Equal flows in all years leave rounding only, from which no skew can be read.
        var isFlat = deviation < 1e-12;
        var skew = isFlat ? 0 : n * cubes / ((n - 1.0) * (n - 2.0) * deviation * deviation * deviation);
        return new LogPearsonThree(flowsM3PerS.Count, flowsM3PerS.Count - n, mean, isFlat ? 0 : deviation, skew);
    }

    /// <summary>The flow not exceeded with a probability in a year, m3/s.</summary>
    /// <param name="nonExceedance">F; above 0 and below 1. A low flow of ten years' return has 0.1.</param>
    public double FlowM3PerS(double nonExceedance)
    {
        if (!(nonExceedance is > 0 and < 1))
            throw new ArgumentOutOfRangeException(nameof(nonExceedance), nonExceedance, "A probability lies between 0 and 1.");
        if (nonExceedance <= ZeroShare)
            return 0;
        var conditional = (nonExceedance - ZeroShare) / (1 - ZeroShare);
        return Math.Pow(10, MeanLog + (PearsonThree.FrequencyFactor(SkewCoefficient, conditional) * DeviationLog));
    }
}
