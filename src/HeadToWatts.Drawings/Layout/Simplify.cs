using HeadToWatts.Drawings.Canvas;

namespace HeadToWatts.Drawings.Layout;

/// <summary>Leaves out points that nobody could see missing, by the method of Douglas and Peucker (1973).</summary>
public static class Simplify
{
    /// <summary>Fewer points for the same curve.</summary>
    /// <param name="points">The curve.</param>
    /// <param name="tolerance">Farthest a left-out point may lie from the new curve, drawing units.</param>
    public static IReadOnlyList<Point> Curve(IReadOnlyList<Point> points, double tolerance = 0.15)
    {
        ArgumentNullException.ThrowIfNull(points);
        if (points.Count < 3)
            return points;
        var keep = new bool[points.Count];
        keep[0] = keep[^1] = true;
        var open = new Stack<(int From, int To)>();
        open.Push((0, points.Count - 1));
        while (open.TryPop(out var span))
        {
            var (farthest, distance) = (0, tolerance);
            for (var i = span.From + 1; i < span.To; i++)
            {
                var d = DistanceToChord(points[i], points[span.From], points[span.To]);
                if (d > distance)
                    (farthest, distance) = (i, d);
            }

            if (farthest == 0)
                continue;
            keep[farthest] = true;
            open.Push((span.From, farthest));
            open.Push((farthest, span.To));
        }

        return [.. points.Where((_, i) => keep[i])];
    }

    private static double DistanceToChord(Point p, Point a, Point b)
    {
        var (dx, dy) = (b.X - a.X, b.Y - a.Y);
        var square = (dx * dx) + (dy * dy);
        var along = square == 0 ? 0 : Math.Clamp((((p.X - a.X) * dx) + ((p.Y - a.Y) * dy)) / square, 0, 1);
        var (x, y) = (p.X - a.X - (along * dx), p.Y - a.Y - (along * dy));
        return Math.Sqrt((x * x) + (y * y));
    }
}
