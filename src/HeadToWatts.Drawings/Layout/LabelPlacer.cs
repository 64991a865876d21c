using HeadToWatts.Drawings.Canvas;

namespace HeadToWatts.Drawings.Layout;

/// <summary>A place where a label may stand.</summary>
/// <param name="At">The point on the baseline.</param>
/// <param name="Anchor">Where that point lies along the label.</param>
/// <param name="RotationDeg">Turn of the label, degrees clockwise.</param>
public readonly record struct LabelSpot(Point At, TextAnchor Anchor = TextAnchor.Start, double RotationDeg = 0);

/// <summary>
/// Puts labels where they fit: never over another label, never outside the drawing, and clear of lines where it can be had.
/// The first spots offered are preferred.
/// </summary>
public sealed class LabelPlacer
{
    private const double Gap = 2;
    private const double CostOfLaterSpot = 1.5;

    private readonly double _left;
    private readonly double _top;
    private readonly double _right;
    private readonly double _bottom;
    private readonly List<LabelBox> _taken = [];
    private readonly List<(Point From, Point To, double Weight)> _lines = [];

    /// <summary>Makes a placer.</summary>
    /// <param name="left">Left bound for labels.</param>
    /// <param name="top">Upper bound.</param>
    /// <param name="right">Right bound.</param>
    /// <param name="bottom">Lower bound.</param>
    public LabelPlacer(double left, double top, double right, double bottom) => (_left, _top, _right, _bottom) = (left, top, right, bottom);

    /// <summary>Keeps labels off a box.</summary>
    public void Avoid(LabelBox box) => _taken.Add(box);

    /// <summary>Keeps labels off a chain of lines where possible.</summary>
    /// <param name="points">The chain.</param>
    /// <param name="weight">How much a crossing counts; 1 for a curve, less for a hairline.</param>
    public void AvoidLines(IReadOnlyList<Point> points, double weight = 1)
    {
        ArgumentNullException.ThrowIfNull(points);
        for (var i = 1; i < points.Count; i++)
            _lines.Add((points[i - 1], points[i], weight));
    }

    /// <summary>Draws a text whose place is fixed and keeps later labels off it.</summary>
    public void Fix(ICanvas canvas, Point at, string text, TextStyle style)
    {
        ArgumentNullException.ThrowIfNull(canvas);
        _taken.Add(LabelBox.Of(at, text, style));
        canvas.Text(at, text, style);
    }

    /// <summary>Draws a label at the best of the spots.</summary>
    /// <param name="canvas">The canvas.</param>
    /// <param name="text">The label.</param>
    /// <param name="style">How it is set; anchor and rotation come from the spot.</param>
    /// <param name="spots">Spots, best first.</param>
    /// <param name="maximumCrossing">Longest stretch of lines that may run through the label; without limit when omitted.</param>
    /// <returns>False when no spot is free: the label is then left out, since one over another helps nobody.</returns>
    public bool TryPlace(ICanvas canvas, string text, TextStyle style, IEnumerable<LabelSpot> spots, double maximumCrossing = double.PositiveInfinity)
    {
        ArgumentNullException.ThrowIfNull(canvas);
        ArgumentNullException.ThrowIfNull(spots);
        LabelBox? best = null;
        var bestSpot = default(LabelSpot);
        var bestCost = double.PositiveInfinity;
        var order = 0;
        foreach (var spot in spots)
        {
            var cost = CostOfLaterSpot * order++;
            if (cost >= bestCost)
                break;
            var box = LabelBox.Of(spot.At, text, style with { Anchor = spot.Anchor, RotationDeg = spot.RotationDeg });
            if (!box.LiesWithin(_left, _top, _right, _bottom) || _taken.Exists(t => t.Touches(box, Gap)))
                continue;
            var crossing = 0.0;
            foreach (var (from, to, weight) in _lines)
                crossing += weight * box.LengthInside(from, to);
            if (crossing > maximumCrossing)
                continue;
            cost += crossing;
            if (cost < bestCost)
                (best, bestSpot, bestCost) = (box, spot, cost);
        }

        if (best is null)
            return false;
        _taken.Add(best);
        canvas.Text(bestSpot.At, text, style with { Anchor = bestSpot.Anchor, RotationDeg = bestSpot.RotationDeg });
        return true;
    }
}
