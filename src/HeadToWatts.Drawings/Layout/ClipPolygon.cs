using HeadToWatts.Drawings.Canvas;

namespace HeadToWatts.Drawings.Layout;

/// <summary>Cuts shapes to a rectangle (Sutherland and Hodgman 1974) and tells what lies within them.</summary>
internal static class ClipPolygon
{
    public static IReadOnlyList<Point> To(IReadOnlyList<Point> shape, double left, double top, double right, double bottom)
    {
        var cut = Cut(shape, p => p.X - left);
        cut = Cut(cut, p => right - p.X);
        cut = Cut(cut, p => p.Y - top);
        return Cut(cut, p => bottom - p.Y);
    }

    public static bool Contains(IReadOnlyList<Point> shape, Point p)
    {
        var inside = false;
        for (int i = 0, k = shape.Count - 1; i < shape.Count; k = i++)
        {
            var (a, b) = (shape[i], shape[k]);
            if (a.Y > p.Y != b.Y > p.Y && p.X < a.X + ((p.Y - a.Y) / (b.Y - a.Y) * (b.X - a.X)))
                inside = !inside;
        }

        return inside;
    }

    private static List<Point> Cut(IReadOnlyList<Point> shape, Func<Point, double> within)
    {
        var cut = new List<Point>(shape.Count + 2);
        for (var i = 0; i < shape.Count; i++)
        {
            var (a, b) = (shape[i], shape[(i + 1) % shape.Count]);
            var (atA, atB) = (within(a), within(b));
            if (atA >= 0)
                cut.Add(a);
            if (atA >= 0 != atB >= 0)
            {
                var t = atA / (atA - atB);
                cut.Add(new Point(a.X + (t * (b.X - a.X)), a.Y + (t * (b.Y - a.Y))));
            }
        }

        return cut;
    }
}
