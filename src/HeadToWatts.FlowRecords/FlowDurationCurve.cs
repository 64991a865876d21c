using HeadToWatts.Basis.Problems;

namespace HeadToWatts.FlowRecords;

/// <summary>
/// Flow against the share of time in which it is reached or exceeded, drawn with straight lines between its points.
/// The points run from 0 to 1 and the flows never rise; two points of equal exceedance make a vertical step.
/// </summary>
public sealed class FlowDurationCurve
{
    private readonly double[] _exceedances;
    private readonly double[] _flows;

    internal FlowDurationCurve(double[] exceedances, double[] flows, IReadOnlyList<CurvePoint> rows, BeyondLastRow endRule)
    {
        _exceedances = exceedances;
        _flows = flows;
        Rows = rows;
        EndRule = endRule;
        var points = new CurvePoint[flows.Length];
        for (var i = 0; i < points.Length; i++)
            points[i] = new CurvePoint(exceedances[i], flows[i]);
        Points = points;
        MeanFlowM3PerS = Area(0, 1);
    }

    /// <summary>The points from exceedance 0 to 1, both included, after the rules for the ends were applied.</summary>
    public IReadOnlyList<CurvePoint> Points { get; }

    /// <summary>The rows as given, or the plotted flows of the record.</summary>
    public IReadOnlyList<CurvePoint> Rows { get; }

    /// <summary>What was done beyond the last row.</summary>
    public BeyondLastRow EndRule { get; }

    /// <summary>Exceedances of the points, without a copy.</summary>
    public ReadOnlySpan<double> ExceedanceSpan => _exceedances;

    /// <summary>Flows of the points in m3/s, without a copy.</summary>
    public ReadOnlySpan<double> FlowSpan => _flows;

    /// <summary>Largest flow, m3/s.</summary>
    public double LargestFlowM3PerS => _flows[0];

    /// <summary>Smallest flow, m3/s.</summary>
    public double SmallestFlowM3PerS => _flows[^1];

    /// <summary>Mean flow, m3/s: the area under the curve, exact for straight lines between the points.</summary>
    public double MeanFlowM3PerS { get; }

    /// <summary>Makes a curve from rows in any order, with the rules for what lies outside them.</summary>
    /// <param name="rows">The rows; at least two.</param>
    /// <param name="beyond">What holds beyond the last row.</param>
    /// <param name="where">File or field the rows came from.</param>
    /// <param name="origins">Place and text of each row, when they are known better than by their number.</param>
    /// <returns>The curve, or every problem of the rows.</returns>
    public static Checked<FlowDurationCurve> FromRows(
        IReadOnlyList<CurvePoint> rows, BeyondLastRow beyond, string where, IReadOnlyList<CurveRowOrigin>? origins = null)
    {
        ArgumentNullException.ThrowIfNull(rows);
        ArgumentNullException.ThrowIfNull(where);
        return CurveRows.Build(rows, beyond, where, origins);
    }

    /// <summary>
    /// Makes the curve of a daily record. The days of the season are ranked and plotted; the curve fills the season's share of
    /// the year and the rest is dry, so that missing days inside or outside the season shift nothing. Missing days are left
    /// out, negative flows count as no flow, and of equal flows only the first and last rank are kept, which changes nothing.
    /// </summary>
    /// <param name="record">The record.</param>
    /// <param name="position">The plotting position.</param>
    /// <param name="season">Days of operation.</param>
    /// <exception cref="ArgumentException">The record has no valid day in the season.</exception>
    public static FlowDurationCurve FromRecord(DailyRecord record, PlottingPosition position, OperatingSeason season)
    {
        ArgumentNullException.ThrowIfNull(record);
        ArgumentNullException.ThrowIfNull(position);
        ArgumentNullException.ThrowIfNull(season);
        return RecordCurve.Build(record, position, season);
    }

    /// <summary>
    /// The days of a record in order of size, each with an equal share of the season: steps, not lines. Sums over it equal sums
    /// over the days themselves; a plotting position, which only places flows on a chart, has no part in it.
    /// </summary>
    /// <param name="record">The record.</param>
    /// <param name="season">Days of operation.</param>
    /// <exception cref="ArgumentException">The record has no valid day in the season.</exception>
    public static FlowDurationCurve OfDays(DailyRecord record, OperatingSeason season)
    {
        ArgumentNullException.ThrowIfNull(record);
        ArgumentNullException.ThrowIfNull(season);
        return RecordCurve.Steps(record, season);
    }

    /// <summary>The flow reached or exceeded in a share of the time, m3/s; at a vertical step the upper flow.</summary>
    /// <param name="exceedance">Share of the time, 0 to 1.</param>
    /// <exception cref="ArgumentOutOfRangeException">Not within 0 to 1.</exception>
    public double FlowAt(double exceedance)
    {
        if (!(exceedance is >= 0 and <= 1))
            throw new ArgumentOutOfRangeException(nameof(exceedance), exceedance, "An exceedance lies within 0 to 1.");

        // First point at or after the exceedance; binary search lands anywhere among equals.
        var i = Array.BinarySearch(_exceedances, exceedance);
        if (i >= 0)
        {
            while (i > 0 && _exceedances[i - 1] == exceedance)
                i--;
            return _flows[i];
        }

        i = ~i;
        var share = (exceedance - _exceedances[i - 1]) / (_exceedances[i] - _exceedances[i - 1]);
        return _flows[i - 1] + (share * (_flows[i] - _flows[i - 1]));
    }

    /// <summary>The share of the time in which the flow is at least this: the largest p with Q(p) >= q; 0 above the largest flow.</summary>
    /// <param name="flowM3PerS">Flow q, m3/s.</param>
    /// <exception cref="ArgumentOutOfRangeException">Not a number.</exception>
    public double ExceedanceOf(double flowM3PerS)
    {
        if (double.IsNaN(flowM3PerS))
            throw new ArgumentOutOfRangeException(nameof(flowM3PerS), flowM3PerS, "The flow is not a number.");
        if (flowM3PerS > _flows[0])
            return 0;

        // Last point whose flow is at least q.
        int low = 0, high = _flows.Length - 1;
        while (low < high)
        {
            var middle = (low + high + 1) / 2;
            if (_flows[middle] >= flowM3PerS)
                low = middle;
            else
                high = middle - 1;
        }

        if (low == _flows.Length - 1)
            return 1;
        var share = (_flows[low] - flowM3PerS) / (_flows[low] - _flows[low + 1]);
        return _exceedances[low] + (share * (_exceedances[low + 1] - _exceedances[low]));
    }

    /// <summary>Mean of the flow when all above a cap is let past, m3/s: the integral of min(Q, cap) over the curve, exact.</summary>
    /// <param name="capFlowM3PerS">The cap, m3/s.</param>
    public double MeanFlowUpToM3PerS(double capFlowM3PerS)
    {
        if (!(capFlowM3PerS >= 0))
            throw new ArgumentOutOfRangeException(nameof(capFlowM3PerS), capFlowM3PerS, "A cap is not negative.");
        var atCap = ExceedanceOf(capFlowM3PerS);
        return atCap <= 0 ? MeanFlowM3PerS : (atCap * capFlowM3PerS) + Area(atCap, 1);
    }

    /// <summary>
    /// Squeezes the curve into a share of the year and leaves the rest dry. For a curve that was measured or typed for the
    /// season of operation only.
    /// </summary>
    /// <param name="shareOfYear">Share of the year with operation, above 0 and up to 1.</param>
    public FlowDurationCurve ForSeasonShare(double shareOfYear)
    {
        if (!(shareOfYear is > 0 and <= 1))
            throw new ArgumentOutOfRangeException(nameof(shareOfYear), shareOfYear, "The share of the year lies above 0 and up to 1.");
        if (shareOfYear >= 1)
            return this;

        var exceedances = new List<double>(_exceedances.Length + 2);
        var flows = new List<double>(_flows.Length + 2);
        for (var i = 0; i < _flows.Length; i++)
        {
            exceedances.Add(_exceedances[i] * shareOfYear);
            flows.Add(_flows[i]);
        }

        if (flows[^1] > 0)
        {
            exceedances.Add(shareOfYear);
            flows.Add(0);
        }

        exceedances.Add(1);
        flows.Add(0);
        return new FlowDurationCurve([.. exceedances], [.. flows], Rows, EndRule);
    }

    // Trapezoids between two exceedances. The upper limit is 1 wherever this is called.
    private double Area(double from, double to)
    {
        var area = 0.0;
        for (var i = 1; i < _flows.Length; i++)
        {
            var left = Math.Max(from, _exceedances[i - 1]);
            var right = Math.Min(to, _exceedances[i]);
            if (right <= left)
                continue;
            var width = _exceedances[i] - _exceedances[i - 1];
            var slope = (_flows[i] - _flows[i - 1]) / width;
            var atLeft = _flows[i - 1] + (slope * (left - _exceedances[i - 1]));
            var atRight = _flows[i - 1] + (slope * (right - _exceedances[i - 1]));
            area += (right - left) * (atLeft + atRight) / 2;
        }

        return area;
    }
}
