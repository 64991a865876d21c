namespace HeadToWatts.Drawings.Canvas;

/// <summary>
/// What a drawing is drawn on: a recorder, an SVG, a page of the memo. Units are those of the drawing, x to the right and y
/// down. Later marks lie over earlier ones.
/// </summary>
public interface ICanvas
{
    /// <summary>A straight line.</summary>
    void Line(Point from, Point to, Stroke stroke);

    /// <summary>An open chain of straight lines, joined round.</summary>
    void Polyline(IReadOnlyList<Point> points, Stroke stroke);

    /// <summary>A closed shape.</summary>
    void Polygon(IReadOnlyList<Point> points, Paint paint);

    /// <summary>An upright rectangle from its top left corner.</summary>
    void Rectangle(Point topLeft, double width, double height, Paint paint);

    /// <summary>A circle.</summary>
    void Circle(Point centre, double radius, Paint paint);

    /// <summary>One line of text; the point lies on its baseline.</summary>
    void Text(Point at, string text, TextStyle style);

    /// <summary>Begins a mark whose value is shown on hover; paper ignores the text. Marks do not nest.</summary>
    void BeginMark(string hoverText);

    /// <summary>Ends the mark.</summary>
    void EndMark();

    /// <summary>
    /// An invisible area that shows a value while the pointer is in it, and a dot at the place the value belongs to. Paper
    /// draws nothing.
    /// </summary>
    void HoverArea(Point topLeft, double width, double height, Point? dot, string hoverText);
}
