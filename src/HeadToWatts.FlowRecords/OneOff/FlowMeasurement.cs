using HeadToWatts.Basis.Sources;

namespace HeadToWatts.FlowRecords.OneOff;

/// <summary>A flow measured once, with the band in which it lies.</summary>
/// <param name="FlowM3PerS">The flow, m3/s.</param>
/// <param name="UncertaintyRatio">Half the band over the flow, at about 95 percent confidence.</param>
/// <param name="Parts">What the uncertainty is made of, in words and ratios; they add as squares.</param>
/// <param name="Notes">What a reader should know of the measurement.</param>
/// <param name="Uses">The method used.</param>
public sealed record FlowMeasurement(
    double FlowM3PerS, double UncertaintyRatio, IReadOnlyList<UncertaintyPart> Parts, IReadOnlyList<string> Notes, IReadOnlyList<MethodUse> Uses)
{
    /// <summary>Lower end of the band, m3/s.</summary>
    public double LowM3PerS => Math.Max(0, FlowM3PerS * (1 - UncertaintyRatio));

    /// <summary>Upper end of the band, m3/s.</summary>
    public double HighM3PerS => FlowM3PerS * (1 + UncertaintyRatio);

    internal static FlowMeasurement Of(double flowM3PerS, IReadOnlyList<UncertaintyPart> parts, IReadOnlyList<string> notes, MethodUse use) =>
        new(flowM3PerS, Math.Sqrt(parts.Sum(p => p.Ratio * p.Ratio)), parts, notes, [use]);
}

/// <summary>A part of an uncertainty.</summary>
/// <param name="Name">What it comes from.</param>
/// <param name="Ratio">Its size over the flow, at about 95 percent confidence.</param>
public sealed record UncertaintyPart(string Name, double Ratio);

/// <summary>Scatter of repeated readings.</summary>
internal static class Scatter
{
    /// <summary>Uncertainty of a mean at about 95 percent over the mean, by Student's t; a set ratio where there is one reading only.</summary>
    public static double OfMeanRatio(IReadOnlyList<double> values, double whenSingle)
    {
        var n = values.Count;
        if (n < 2)
            return whenSingle;
        var mean = values.Sum() / n;
        var deviation = Math.Sqrt(values.Sum(v => (v - mean) * (v - mean)) / (n - 1));
        var t = MathNet.Numerics.Distributions.StudentT.InvCDF(0, 1, n - 1, 0.975);
        return t * deviation / Math.Sqrt(n) / mean;
    }
}
