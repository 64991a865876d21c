using HeadToWatts.Drawings.Canvas;
using HeadToWatts.Memos.Content;
using HeadToWatts.Memos.Layout.Type;
using PdfSharp.Drawing;
using TextStyle = HeadToWatts.Drawings.Canvas.TextStyle;

namespace HeadToWatts.Memos.Pdf;

/// <summary>Repeats a drawing on a page as vectors, in the print palette.</summary>
internal sealed class PdfCanvas(XGraphics graphics, double leftPt, double topPt, double scale, Func<Face, double, XFont> font) : ICanvas
{
    private const double SmallRatio = 0.7;

    /// <inheritdoc/>
    public void Line(Point from, Point to, Stroke stroke) => graphics.DrawLine(Pen(stroke), At(from), At(to));

    /// <inheritdoc/>
    public void Polyline(IReadOnlyList<Point> points, Stroke stroke)
    {
        if (points.Count > 1)
            graphics.DrawLines(Pen(stroke), [.. points.Select(At)]);
    }

    /// <inheritdoc/>
    public void Polygon(IReadOnlyList<Point> points, Paint paint)
    {
        if (points.Count < 3 || paint is { Fill: null, Stroke: null })
            return;
        var corners = points.Select(At).ToArray();
        if (paint.Fill is { } fill)
            graphics.DrawPolygon(Brush(fill), corners, XFillMode.Winding);
        if (paint.Stroke is { } stroke)
            graphics.DrawLines(Pen(stroke), [.. corners, corners[0]]);
    }

    /// <inheritdoc/>
    public void Rectangle(Point topLeft, double width, double height, Paint paint)
    {
        if (width <= 0 || height <= 0)
            return;
        var at = At(topLeft);
        if (paint.Fill is { } fill)
            graphics.DrawRectangle(Brush(fill), at.X, at.Y, width * scale, height * scale);
        if (paint.Stroke is { } stroke)
            graphics.DrawRectangle(Pen(stroke), at.X, at.Y, width * scale, height * scale);
    }

    /// <inheritdoc/>
    public void Circle(Point centre, double radius, Paint paint)
    {
        var at = At(centre);
        var r = radius * scale;
        if (paint.Fill is { } fill)
            graphics.DrawEllipse(Brush(fill), at.X - r, at.Y - r, 2 * r, 2 * r);
        if (paint.Stroke is { } stroke)
            graphics.DrawEllipse(Pen(stroke), at.X - r, at.Y - r, 2 * r, 2 * r);
    }

    /// <inheritdoc/>
    public void Text(Point at, string text, TextStyle style)
    {
        ArgumentNullException.ThrowIfNull(text);
        if (text.Length == 0)
            return;
        var face = style.Weight == TextWeight.SemiBold ? Face.SemiBold : Face.Regular;
        var size = style.Size * scale;
        var runs = Letters.Fit(new TextRun(text)).ToArray();
        var width = runs.Sum(r => Typeface.WidthPt(r.Text, face, Size(r)));
        var start = style.Anchor switch { TextAnchor.Middle => -width / 2, TextAnchor.End => -width, _ => 0.0 };
        var place = At(at);
        var turned = style.RotationDeg != 0;
        var state = turned ? graphics.Save() : null;
        if (turned)
            graphics.RotateAtTransform(style.RotationDeg, place);
        if (style.Halo)
        {
            var rim = Rgb(Palette.Print[InkRole.Card]);
            graphics.DrawRectangle(new XSolidBrush(XColor.FromArgb(217, rim)), place.X + start - 1.5, place.Y - size * 0.80, width + 3, size * 1.05);
        }

        var x = place.X + start;
        var brush = new XSolidBrush(Rgb(Palette.Print[style.Role]));
        foreach (var run in runs)
        {
            var rise = run.Standing switch { Standing.Above => size * 0.33, Standing.Below => -size * 0.16, _ => 0 };
            graphics.DrawString(run.Text, font(face, Size(run)), brush, x, place.Y - rise, XStringFormats.BaseLineLeft);
            x += Typeface.WidthPt(run.Text, face, Size(run));
        }

        if (state != null)
            graphics.Restore(state);

        double Size(TextRun run) => run.Standing == Standing.OnLine ? size : size * SmallRatio;
    }

    /// <inheritdoc/>
    public void BeginMark(string hoverText)
    {
        // Paper has no pointer.
    }

    /// <inheritdoc/>
    public void EndMark()
    {
        // Paper has no pointer.
    }

    /// <inheritdoc/>
    public void HoverArea(Point topLeft, double width, double height, Point? dot, string hoverText)
    {
        // Paper has no pointer.
    }

    internal static XColor Rgb(Rgb colour) => XColor.FromArgb(colour.Red, colour.Green, colour.Blue);

    private static XColor Tinted(InkRole role, double opacity) =>
        opacity >= 1 ? Rgb(Palette.Print[role]) : XColor.FromArgb((int)Math.Round(255 * Math.Clamp(opacity, 0, 1)), Rgb(Palette.Print[role]));

    private static XSolidBrush Brush(Fill fill) => new(Tinted(fill.Role, fill.Opacity));

    private XPen Pen(Stroke stroke)
    {
        // The library counts dashes in widths of the line.
        var width = Math.Max(0.2, stroke.Width * scale);
        var pen = new XPen(Tinted(stroke.Role, stroke.Opacity), width) { LineJoin = XLineJoin.Round };
        if (stroke.Pattern.Count > 0)
            pen.DashPattern = [.. stroke.Pattern.Select(p => p * scale / width)];
        return pen;
    }

    private XPoint At(Point point)
    {
        if (!double.IsFinite(point.X) || !double.IsFinite(point.Y))
            throw new ArgumentOutOfRangeException(nameof(point), "A drawing holds a number that is not finite.");
        return new XPoint(leftPt + point.X * scale, topPt + point.Y * scale);
    }
}
