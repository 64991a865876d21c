using System.Globalization;
using HeadToWatts.Basis.Problems;

namespace HeadToWatts.Turbines;

/// <summary>A point of an efficiency curve.</summary>
/// <param name="FlowRatio">Flow of the unit against its full flow, 0 to 1.</param>
/// <param name="Efficiency">Efficiency of the turbine, 0 to 1.</param>
public readonly record struct EfficiencyPoint(double FlowRatio, double Efficiency);

/// <summary>Efficiency of a turbine unit against its flow ratio: straight lines between points, the last at full flow.</summary>
public sealed class EfficiencyCurve
{
    // Accepts a last ratio that was rounded on the way, and is then taken as 1.
    private const double FullFlowSlack = 1e-9;

    private readonly double[] _ratio;
    private readonly double[] _efficiency;
    private readonly double[] _slope;

    // _cell[c] is the segment in which the flow ratio c / cells lies, so that At starts next to its segment.
    private readonly int[] _cell;

    private EfficiencyCurve(EfficiencyPoint[] points)
    {
        Points = Array.AsReadOnly(points);
        _ratio = [.. points.Select(p => p.FlowRatio)];
        _efficiency = [.. points.Select(p => p.Efficiency)];
        _slope = new double[points.Length];
        for (var i = 0; i + 1 < points.Length; i++)
            _slope[i] = (_efficiency[i + 1] - _efficiency[i]) / (_ratio[i + 1] - _ratio[i]);
        _cell = new int[(4 * points.Length) + 1];
        for (int c = 0, segment = 0; c < _cell.Length; c++)
        {
            while (segment + 2 < points.Length && _ratio[segment + 1] <= (double)c / (_cell.Length - 1))
                segment++;
            _cell[c] = segment;
        }

        var peak = points[0];
        foreach (var point in points)
        {
            if (point.Efficiency > peak.Efficiency)
                peak = point;
        }

        Peak = peak.Efficiency;
        PeakAtFlowRatio = peak.FlowRatio;
    }

    /// <summary>The points, by rising flow ratio; the last is at 1.</summary>
    public IReadOnlyList<EfficiencyPoint> Points { get; }

    /// <summary>Highest efficiency, 0 to 1.</summary>
    public double Peak { get; }

    /// <summary>Lowest flow ratio at which the highest efficiency is reached.</summary>
    public double PeakAtFlowRatio { get; }

    /// <summary>
    /// Makes a curve from a table, such as a manufacturer's, in any order of rows. Refused with every problem listed: ratios or
    /// efficiencies outside 0 to 1, a ratio given twice, no row at full flow, fewer than two rows.
    /// </summary>
    /// <param name="table">Rows of flow ratio (flow of the unit against its full flow) and efficiency, both 0 to 1.</param>
    /// <param name="where">The field or file the table came from, for the problems.</param>
    public static Checked<EfficiencyCurve> FromTable(IEnumerable<(double flowRatio, double efficiency)> table, string where)
    {
        ArgumentNullException.ThrowIfNull(table);
        ArgumentNullException.ThrowIfNull(where);
        var problems = new List<Problem>();
        var rows = table.ToList();
        if (rows.Count < 2)
            problems.Add(new Problem(where, Count(rows.Count), "an efficiency table needs at least two rows", "two rows or more, the last at full flow"));

        var points = new List<EfficiencyPoint>(rows.Count);
        var first = new Dictionary<double, int>();
        for (var i = 0; i < rows.Count; i++)
        {
            var at = string.Create(CultureInfo.InvariantCulture, $"{where}, row {i + 1}");
            var (ratio, efficiency) = rows[i];
            if (Math.Abs(ratio - 1) <= FullFlowSlack)
                ratio = 1;
            var good = Check(at, "flow ratio", ratio, problems) & Check(at, "efficiency", efficiency, problems);
            if (!good)
                continue;
            if (first.TryGetValue(ratio, out var earlier))
                problems.Add(new Problem(at, Text(ratio), string.Create(CultureInfo.InvariantCulture, $"this flow ratio stands in row {earlier + 1} already"), "each flow ratio once"));
            else
                first.Add(ratio, i);
            points.Add(new EfficiencyPoint(ratio, efficiency));
        }

        if (rows.Count >= 2 && points.Count == rows.Count && points.Max(p => p.FlowRatio) < 1)
            problems.Add(new Problem(where, Text(points.Max(p => p.FlowRatio)), "the table ends before full flow", "a last row at flow ratio 1"));
        if (problems.Count == 0 && points.All(p => p.Efficiency == 0))
            problems.Add(new Problem(where, "0", "every efficiency is zero", "efficiencies above 0"));
        return problems.Count > 0
            ? Checked.Refused<EfficiencyCurve>(problems)
            : Checked.Of(new EfficiencyCurve([.. points.OrderBy(p => p.FlowRatio)]));
    }

    /// <summary>
    /// Efficiency at a flow ratio, 0 to 1: linear between points, the value at full flow above 1, and 0 below the first point, where
    /// the table says nothing and the unit stands still.
    /// </summary>
    public double At(double flowRatio)
    {
        if (!(flowRatio >= _ratio[0]))
            return 0;
        if (flowRatio >= 1)
            return _efficiency[^1];
        var segment = _cell[(int)(flowRatio * (_cell.Length - 1))];
        while (_ratio[segment + 1] < flowRatio)
            segment++;
        return _efficiency[segment] + (_slope[segment] * (flowRatio - _ratio[segment]));
    }

    /// <summary>The curve with every efficiency higher or lower by so much, kept between 0 and 1.</summary>
    /// <param name="change">What is added, -1 to 1.</param>
    public EfficiencyCurve Shifted(double change) => new([.. Points.Select(p => p with { Efficiency = Math.Clamp(p.Efficiency + change, 0, 1) })]);

    private static bool Check(string at, string what, double value, List<Problem> problems)
    {
        if (value is >= 0 and <= 1)
            return true;
        var why = value is > 1.5 and <= 100
            ? $"the {what} lies above 1; a percentage is divided by 100"
            : $"the {what} is not a number from 0 to 1";
        problems.Add(new Problem(at, Text(value), why, "0 to 1"));
        return false;
    }

    private static string Text(double value) => value.ToString("R", CultureInfo.InvariantCulture);

    private static string Count(int rows) => string.Create(CultureInfo.InvariantCulture, $"{rows} {(rows == 1 ? "row" : "rows")}");
}
