using HeadToWatts.Drawings.Canvas;
using HeadToWatts.Drawings.Layout;

namespace HeadToWatts.Drawings.Tests;

/// <summary>The outermost points of a step of a drawing.</summary>
internal static class Extent
{
    public static IEnumerable<Point> Of(DrawOperation operation) => operation switch
    {
        LineOperation line => [line.From, line.To],
        PolylineOperation line => line.Points,
        PolygonOperation shape => shape.Points,
        RectangleOperation box => Box(box.TopLeft, box.Width, box.Height),
        HoverAreaOperation area => Box(area.TopLeft, area.Width, area.Height).Concat(area.Dot is { } dot ? [dot] : []),
        CircleOperation disc => Box(new Point(disc.Centre.X - disc.Radius, disc.Centre.Y - disc.Radius), disc.Radius * 2, disc.Radius * 2),
        TextOperation text => LabelBox.Of(text.At, text.Content, text.Style).Corners,
        _ => [],
    };

    private static Point[] Box(Point topLeft, double width, double height) => [topLeft, new Point(topLeft.X + width, topLeft.Y + height)];
}
