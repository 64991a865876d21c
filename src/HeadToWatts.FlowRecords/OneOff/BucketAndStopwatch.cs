using HeadToWatts.Basis.Problems;
using HeadToWatts.Basis.Sources;

namespace HeadToWatts.FlowRecords.OneOff;

/// <summary>Flow by filling a bucket or tank of known volume against time.</summary>
public static class BucketAndStopwatch
{
    // A marked bucket is good to 2 percent; a hand on a stopwatch to half a second.
    private const double VolumeRatio = 0.02;
    private const double HandS = 0.5;
    private const double SingleRunRatio = 0.1;
    private const double ShortFillS = 5;

    /// <summary>The method.</summary>
    internal static readonly Method Method = new(
        "bucket-and-stopwatch", "Bucket and stopwatch", "Q = volume/t", Source.CommonPractice("bucket-and-stopwatch", "Volumetric measurement of small flows"), "",
        [new InputRange("t", "time to fill", "s", ShortFillS, double.PositiveInfinity)]);

    /// <summary>The flow, or every problem of the readings.</summary>
    /// <param name="volumeM3">Volume filled, m3.</param>
    /// <param name="timesS">Time of each filling, s.</param>
    /// <param name="where">Field they come from.</param>
    public static Checked<FlowMeasurement> Measure(double volumeM3, IReadOnlyList<double> timesS, string where)
    {
        ArgumentNullException.ThrowIfNull(timesS);
        ArgumentNullException.ThrowIfNull(where);
        var problems = new List<Problem>();
        Readings.Positive(problems, where + " volume", [volumeM3], "m3");
        Readings.Positive(problems, where + " times", timesS, "s");
        if (problems.Count > 0)
            return Checked.Refused<FlowMeasurement>(problems);
        double[] flows = [.. timesS.Select(t => volumeM3 / t)];
        var meanTimeS = timesS.Sum() / timesS.Count;
        var notes = new List<string>();
        if (timesS.Count < 3)
            notes.Add("fewer than three fillings");
        if (timesS.Min() < ShortFillS)
            notes.Add("a filling took less than 5 s; a larger tank reads better");
        return Checked.Of(FlowMeasurement.Of(
            flows.Sum() / flows.Length,
            [new("volume", VolumeRatio), new("stopwatch", HandS / meanTimeS), new("fillings", Scatter.OfMeanRatio(flows, SingleRunRatio))],
            notes,
            Method.Used(new InputSpan("t", timesS.Min(), timesS.Max()))));
    }
}
