using System.Globalization;
using HeadToWatts.Basis.Problems;
using HeadToWatts.Basis.Sources;

namespace HeadToWatts.FlowRecords.OneOff;

/// <summary>A vertical of a velocity-area measurement.</summary>
/// <param name="StationM">Distance across the water, m.</param>
/// <param name="DepthM">Depth, m; 0 at a sloping edge.</param>
/// <param name="VelocityMPerS">Mean velocity in the vertical, m/s; at 0.6 of the depth, or the mean of 0.2 and 0.8. Negative where the water turns back.</param>
public readonly record struct Vertical(double StationM, double DepthM, double VelocityMPerS);

/// <summary>The part of the flow that one vertical stands for.</summary>
/// <param name="Vertical">The vertical.</param>
/// <param name="WidthM">Its width, half way to each neighbour, m.</param>
/// <param name="AreaM2">Its area, m2.</param>
/// <param name="FlowM3PerS">Its flow, m3/s.</param>
/// <param name="FlowShare">Its share of the flow.</param>
public sealed record VerticalPart(Vertical Vertical, double WidthM, double AreaM2, double FlowM3PerS, double FlowShare);

/// <summary>A velocity-area measurement.</summary>
/// <param name="Measurement">Flow and band.</param>
/// <param name="AreaM2">Area, m2.</param>
/// <param name="MeanVelocityMPerS">Flow over area, m/s.</param>
/// <param name="Parts">The parts from edge to edge.</param>
public sealed record VelocityAreaResult(FlowMeasurement Measurement, double AreaM2, double MeanVelocityMPerS, IReadOnlyList<VerticalPart> Parts);

/// <summary>Flow from depths and velocities in verticals by the mid-section method.</summary>
public static class VelocityArea
{
    // Random uncertainty from the number of verticals, 95 percent, after ISO 748 (from memory); the rest is instrument, depth and width.
    private static readonly (int Verticals, double Ratio)[] ByVerticals = [(5, 0.15), (10, 0.09), (15, 0.06), (20, 0.05), (25, 0.04), (30, 0.03)];
    private const double VelocityRatio = 0.05;
    private const double DepthRatio = 0.02;
    private const double FewVerticalsRatio = 0.25;
    private const double LargestShare = 0.1;

    /// <summary>The method.</summary>
    internal static readonly Method Method = new(
        "mid-section", "Velocity-area, mid-section method", "Q = Σ V_i d_i (x_{i+1} - x_{i-1})/2", FlowRecordSources.Iso748, "",
        [new InputRange("n", "verticals with water", "1", 5, double.PositiveInfinity)]);

    /// <summary>The flow, or every problem of the verticals. The first and last are the edges of the water and count for half a width.</summary>
    /// <param name="verticals">Three or more, from edge to edge.</param>
    /// <param name="where">Field they come from.</param>
    public static Checked<VelocityAreaResult> Measure(IReadOnlyList<Vertical> verticals, string where)
    {
        ArgumentNullException.ThrowIfNull(verticals);
        ArgumentNullException.ThrowIfNull(where);
        var problems = new List<Problem>();
        if (verticals.Count < 3)
            problems.Add(new Problem(where, $"{Text(verticals.Count)} verticals", "at least the two edges and one vertical between are needed", "three or more verticals"));
        for (var i = 0; i < verticals.Count; i++)
        {
            var v = verticals[i];
            if (!double.IsFinite(v.StationM) || !double.IsFinite(v.DepthM) || !double.IsFinite(v.VelocityMPerS))
                Add(i, "a figure is not a number", "distance, depth and velocity");
            else if (v.DepthM < 0)
                Add(i, "the depth is negative", "a depth of zero or more");
            else if (i > 0 && v.StationM <= verticals[i - 1].StationM)
                Add(i, "the distance does not grow from the vertical before", "verticals in order across the water");
        }

        if (problems.Count == 0 && verticals.All(v => v.DepthM == 0))
            problems.Add(new Problem(where, $"{Text(verticals.Count)} verticals", "no vertical has any depth", "depths above zero between the edges"));
        if (problems.Count > 0)
            return Checked.Refused<VelocityAreaResult>(problems);

        var widths = new double[verticals.Count];
        for (var i = 0; i < widths.Length; i++)
            widths[i] = (verticals[Math.Min(i + 1, widths.Length - 1)].StationM - verticals[Math.Max(i - 1, 0)].StationM) / 2;
        var flow = verticals.Select((v, i) => v.VelocityMPerS * v.DepthM * widths[i]).Sum();
        var area = verticals.Select((v, i) => v.DepthM * widths[i]).Sum();
        if (flow <= 0)
            return Checked.Refused<VelocityAreaResult>(new Problem(where, Text(flow) + " m3/s", "the verticals give no flow downstream", "velocities above zero"));

        VerticalPart[] parts = [.. verticals.Select((v, i) => new VerticalPart(v, widths[i], v.DepthM * widths[i], v.VelocityMPerS * v.DepthM * widths[i], v.VelocityMPerS * v.DepthM * widths[i] / flow))];
        var wet = verticals.Count(v => v.DepthM > 0);
        var notes = new List<string>();
        if (parts.Max(p => p.FlowShare) is var most && most > LargestShare)
            notes.Add($"one vertical carries {(most * 100).ToString("0", CultureInfo.InvariantCulture)} % of the flow; more verticals would read better (10 % or less is usual)");
        if (verticals.Any(v => v.VelocityMPerS < 0))
            notes.Add("water turns back in places");
        return Checked.Of(new VelocityAreaResult(
            FlowMeasurement.Of(flow, [new("number of verticals", OfVerticals(wet)), new("velocity", VelocityRatio), new("depth and width", DepthRatio)], notes, Method.Used(new InputSpan("n", wet, wet))),
            area, flow / area, parts));

        void Add(int i, string why, string accepted) => problems.Add(new Problem(
            $"{where} vertical {Text(i + 1)}", $"{Text(verticals[i].StationM)} m, {Text(verticals[i].DepthM)} m, {Text(verticals[i].VelocityMPerS)} m/s", why, accepted));
    }

    // The line of the greatest number not above; fewer than five verticals stand outside the standard.
    private static double OfVerticals(int wet) =>
        wet < ByVerticals[0].Verticals ? FewVerticalsRatio : ByVerticals.Last(b => b.Verticals <= wet).Ratio;

    private static string Text(double value) => value.ToString("0.####", CultureInfo.InvariantCulture);
}
