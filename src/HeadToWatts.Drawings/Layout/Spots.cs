using HeadToWatts.Drawings.Canvas;

namespace HeadToWatts.Drawings.Layout;

/// <summary>Spots for labels that belong to a curve, a line or an area.</summary>
internal static class Spots
{
    private static readonly double[] Rings = [0, 0.08, 0.16, 0.24, 0.32, 0.4, 0.48];
    private static readonly double[] Sides = [-1, 1];
    private static readonly double[] Gaps = [0.55, 1.2];

    /// <summary>Spots above and below a curve, from the preferred share of its width outwards.</summary>
    public static IEnumerable<LabelSpot> AlongCurve(IReadOnlyList<Point> curve, double size, double preferred = 0.5, bool aboveFirst = true)
    {
        if (curve.Count < 2)
            yield break;
        var (from, to) = (curve[0].X, curve[^1].X);
        foreach (var distance in Rings)
        {
            foreach (var side in Sides)
            {
                var share = preferred + (side * distance);
                if (share is < 0.02 or > 0.98 || (distance == 0 && side > 0))
                    continue;
                var x = from + (share * (to - from));
                var y = HeightAt(curve, x);

                // Beside a steep stretch there is no room above or below: end on it from the left, begin on it to the right.
                var rises = HeightAt(curve, x + 1) < HeightAt(curve, x - 1);
                var left = new LabelSpot(new Point(x - 6, rises ? y - (size * 0.3) : y + size), TextAnchor.End);
                var right = new LabelSpot(new Point(x + 6, rises ? y + size : y - (size * 0.3)));
                yield return rises == aboveFirst ? left : right;
                yield return rises == aboveFirst ? right : left;
                foreach (var gap in Gaps)
                {
                    var above = new LabelSpot(new Point(x, y - (size * gap)), TextAnchor.Middle);
                    var below = new LabelSpot(new Point(x, y + (size * (gap + 0.7))), TextAnchor.Middle);
                    yield return aboveFirst ? above : below;
                    yield return aboveFirst ? below : above;
                }
            }
        }
    }

    /// <summary>Spots along a level line: above it, then below, right end first when asked.</summary>
    public static IEnumerable<LabelSpot> AlongLevel(double left, double right, double y, double size, bool rightFirst = true)
    {
        var ends = rightFirst
            ? new[] { (right - 2, TextAnchor.End), ((left + right) / 2, TextAnchor.Middle), (left + 4, TextAnchor.Start) }
            : [(left + 4, TextAnchor.Start), ((left + right) / 2, TextAnchor.Middle), (right - 2, TextAnchor.End)];
        foreach (var lift in new[] { -0.4, 1.05, -1.6, 2.25 })
        {
            foreach (var (x, anchor) in ends)
                yield return new LabelSpot(new Point(x, y + (lift * size)), anchor);
        }
    }

    /// <summary>Spots round a point.</summary>
    public static IEnumerable<LabelSpot> Around(Point p, double size, double gap = 9)
    {
        yield return new LabelSpot(new Point(p.X + gap, p.Y + (size * 0.35)));
        yield return new LabelSpot(new Point(p.X - gap, p.Y + (size * 0.35)), TextAnchor.End);
        foreach (var far in new[] { 1.0, 2.2, 3.4 })
        {
            yield return new LabelSpot(new Point(p.X, p.Y - (gap * far)), TextAnchor.Middle);
            yield return new LabelSpot(new Point(p.X, p.Y + (gap * far) + (size * 0.7)), TextAnchor.Middle);
            yield return new LabelSpot(new Point(p.X + (gap * 0.6), p.Y - (gap * far * 0.8)));
            yield return new LabelSpot(new Point(p.X - (gap * 0.6), p.Y - (gap * far * 0.8)), TextAnchor.End);
            yield return new LabelSpot(new Point(p.X + (gap * 0.6), p.Y + (gap * far * 0.8) + (size * 0.7)));
            yield return new LabelSpot(new Point(p.X - (gap * 0.6), p.Y + (gap * far * 0.8) + (size * 0.7)), TextAnchor.End);
        }
    }

    /// <summary>Spots in the widest parts of the area between two curves over the same places across.</summary>
    public static IEnumerable<LabelSpot> BetweenCurves(IReadOnlyList<Point> upper, IReadOnlyList<Point> lower, string text, TextStyle style)
    {
        var width = TextMeasure.Width(text, style);
        var height = style.Size * (TextMeasure.AscentRatio + TextMeasure.DescentRatio);
        var (from, to) = (Math.Max(upper[0].X, lower[0].X), Math.Min(upper[^1].X, lower[^1].X));
        const int steps = 48;
        var found = new List<(double Room, LabelSpot Spot)>();
        for (var i = 0; i <= steps; i++)
        {
            var centre = from + ((to - from) * i / steps);
            double top = double.NegativeInfinity, bottom = double.PositiveInfinity;
            for (var k = -4; k <= 4; k++)
            {
                var x = centre + (k * (width + 6) / 8);
                if (x < from || x > to)
                {
                    top = double.PositiveInfinity;
                    break;
                }

                top = Math.Max(top, HeightAt(upper, x));
                bottom = Math.Min(bottom, HeightAt(lower, x));
            }

            // Not a number where the label would reach beyond the curves' ends.
            var room = bottom - top - height;
            if (!(room >= 3))
                continue;
            var baseline = ((top + bottom) / 2) + (style.Size * (TextMeasure.AscentRatio - TextMeasure.DescentRatio) / 2);
            found.Add((room, new LabelSpot(new Point(centre, baseline), TextAnchor.Middle)));
        }

        // Roomy spots are equal; among them the middle of the area is the most natural.
        const double roomy = 10;
        var middle = found.Count == 0 ? 0 : found.Sum(f => f.Room * f.Spot.At.X) / found.Sum(f => f.Room);
        return found.OrderByDescending(f => Math.Min(f.Room, roomy)).ThenBy(f => Math.Abs(f.Spot.At.X - middle)).Select(f => f.Spot);
    }

    /// <summary>Height of a curve that runs from left to right, at a place across; the ends go on level.</summary>
    public static double HeightAt(IReadOnlyList<Point> curve, double x)
    {
        if (x <= curve[0].X)
            return curve[0].Y;
        if (x > curve[^1].X)
            return curve[^1].Y;
        int low = 0, high = curve.Count - 1;
        while (high - low > 1)
        {
            var middle = (low + high) / 2;
            if (curve[middle].X < x)
                low = middle;
            else
                high = middle;
        }

        var (a, b) = (curve[low], curve[high]);
        return b.X - a.X <= 0 ? b.Y : a.Y + ((x - a.X) / (b.X - a.X) * (b.Y - a.Y));
    }
}
