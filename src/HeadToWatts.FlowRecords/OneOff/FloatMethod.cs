using System.Globalization;
using HeadToWatts.Basis.Problems;
using HeadToWatts.Basis.Sources;

namespace HeadToWatts.FlowRecords.OneOff;

/// <summary>Flow by floats: area times surface velocity times a coefficient that turns surface into mean velocity.</summary>
public static class FloatMethod
{
    /// <summary>Coefficient when nothing better is known: mean velocity over surface velocity of a stream.</summary>
    public const double UsualCoefficient = 0.85;

    // A coefficient taken from a book is known to a tenth; an area from a tape and a stick likewise; one float alone may stray by a fifth.
    private const double CoefficientRatio = 0.1;
    private const double AreaRatio = 0.1;
    private const double SingleFloatRatio = 0.2;

    /// <summary>The method.</summary>
    internal static readonly Method Method = new(
        "float-method", "Float method", "Q = c A L/t", FlowRecordSources.Iso748, "floats",
        [new InputRange("c", "mean over surface velocity", "1", 0.6, 0.95)]);

    // Water Measurement Manual, ch. 13, from memory: average depth in feet and coefficient.
    private static readonly (double DepthFt, double Coefficient)[] ByDepth =
        [(1, 0.66), (2, 0.68), (3, 0.70), (4, 0.72), (5, 0.74), (6, 0.76), (9, 0.77), (12, 0.78), (15, 0.79), (20, 0.80)];

    /// <summary>
    /// Coefficient by average depth for rough, shallow canals and streams (US Bureau of Reclamation, Water Measurement Manual,
    /// from memory): 0.66 at 1 ft to 0.80 at 20 ft, with straight lines between. Lower than the usual 0.85: the choice is the user's.
    /// </summary>
    /// <param name="meanDepthM">Average depth, m; above 0.</param>
    public static double CoefficientAtDepth(double meanDepthM)
    {
        if (!(meanDepthM > 0 && double.IsFinite(meanDepthM)))
            throw new ArgumentOutOfRangeException(nameof(meanDepthM), meanDepthM, "A depth is above 0.");
        var depthFt = meanDepthM / 0.3048;
        if (depthFt <= ByDepth[0].DepthFt)
            return ByDepth[0].Coefficient;
        for (var i = 1; i < ByDepth.Length; i++)
        {
            var (a, b) = (ByDepth[i - 1], ByDepth[i]);
            if (depthFt <= b.DepthFt)
                return a.Coefficient + ((b.Coefficient - a.Coefficient) * (depthFt - a.DepthFt) / (b.DepthFt - a.DepthFt));
        }

        return ByDepth[^1].Coefficient;
    }

    /// <summary>The flow, or every problem of the readings.</summary>
    /// <param name="reachLengthM">Distance the floats travel L, m.</param>
    /// <param name="timesS">Time of each float, s; three or more are usual.</param>
    /// <param name="areasM2">Areas of sections along the reach, m2; one or more, their mean is taken.</param>
    /// <param name="coefficient">c; above 0 and up to 1.</param>
    /// <param name="where">Field they come from.</param>
    public static Checked<FlowMeasurement> Measure(double reachLengthM, IReadOnlyList<double> timesS, IReadOnlyList<double> areasM2, double coefficient, string where)
    {
        ArgumentNullException.ThrowIfNull(timesS);
        ArgumentNullException.ThrowIfNull(areasM2);
        ArgumentNullException.ThrowIfNull(where);
        var problems = new List<Problem>();
        Readings.Positive(problems, where + " length", [reachLengthM], "m");
        Readings.Positive(problems, where + " times", timesS, "s");
        Readings.Positive(problems, where + " areas", areasM2, "m2");
        if (!(coefficient is > 0 and <= 1))
            problems.Add(new Problem(where + " coefficient", coefficient.ToString("0.###", CultureInfo.InvariantCulture), "the coefficient lies above 0 and up to 1", "0.6 to 0.95"));
        if (problems.Count > 0)
            return Checked.Refused<FlowMeasurement>(problems);

        double[] velocities = [.. timesS.Select(t => reachLengthM / t)];
        var areaM2 = areasM2.Sum() / areasM2.Count;
        var notes = new List<string>();
        if (timesS.Count < 3)
            notes.Add("fewer than three floats");
        if (timesS.Any(t => t < 20))
            notes.Add("a float took less than 20 s; a longer reach reads better");
        return Checked.Of(FlowMeasurement.Of(
            coefficient * areaM2 * (velocities.Sum() / velocities.Length),
            [
                new("coefficient", CoefficientRatio),
                new("area", Math.Max(AreaRatio, Scatter.OfMeanRatio(areasM2, AreaRatio))),
                new("floats", Scatter.OfMeanRatio(velocities, SingleFloatRatio)),
            ],
            notes,
            Method.Used(new InputSpan("c", coefficient, coefficient))));
    }
}

/// <summary>Checks of readings that must be above zero.</summary>
internal static class Readings
{
    public static void Positive(List<Problem> problems, string where, IReadOnlyList<double> values, string unit)
    {
        if (values.Count == 0)
            problems.Add(new Problem(where, "", "nothing is entered", $"one or more figures in {unit}"));
        for (var i = 0; i < values.Count; i++)
        {
            if (!(values[i] > 0 && double.IsFinite(values[i])))
                problems.Add(new Problem($"{where} {(i + 1).ToString(CultureInfo.InvariantCulture)}", values[i].ToString("0.######", CultureInfo.InvariantCulture), "the figure is not above 0", $"a figure above 0 in {unit}"));
        }
    }
}
