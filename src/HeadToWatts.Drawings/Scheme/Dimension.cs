using HeadToWatts.Drawings.Canvas;

namespace HeadToWatts.Drawings.Scheme;

/// <summary>An upright dimension line with arrowheads, or with ticks where arrowheads have no room.</summary>
internal static class Dimension
{
    private const double Head = 7;
    private const double HalfWidth = 2.4;

    public static void Draw(ICanvas canvas, double x, double top, double bottom, InkRole role)
    {
        canvas.Line(new Point(x, top), new Point(x, bottom), new Stroke(role, 1.1));
        if (bottom - top > Head * 2.6)
        {
            Arrow(canvas, x, top, Head, role);
            Arrow(canvas, x, bottom, -Head, role);
            return;
        }

        foreach (var y in new[] { top, bottom })
            canvas.Line(new Point(x - 3, y + 2), new Point(x + 3, y - 2), new Stroke(role, 1.1));
    }

    private static void Arrow(ICanvas canvas, double x, double y, double length, InkRole role) =>
        canvas.Polygon([new(x, y), new(x - HalfWidth, y + length), new(x + HalfWidth, y + length)], Paint.Filled(role));
}
