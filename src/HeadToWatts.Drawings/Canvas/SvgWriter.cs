using System.Globalization;
using System.Text;

namespace HeadToWatts.Drawings.Canvas;

/// <summary>
/// Writes a drawing as an SVG element for a page that carries <see cref="DrawingStyles.Css"/>. Colours come from the page's
/// theme through classes; numbers are invariant with at most two decimals, so the same drawing is the same text everywhere.
/// </summary>
public sealed class SvgWriter : ICanvas
{
    private readonly StringBuilder _out = new();

    private SvgWriter()
    {
    }

    /// <summary>Writes the drawing.</summary>
    /// <param name="drawing">The drawing.</param>
    /// <param name="id">An id unique on the page: letters, digits and hyphens. Title and description get ids from it.</param>
    /// <returns>One svg element, without an XML declaration.</returns>
    public static string Write(Drawing drawing, string id)
    {
        ArgumentNullException.ThrowIfNull(drawing);
        ArgumentException.ThrowIfNullOrEmpty(id);
        if (!id.All(c => char.IsAsciiLetterOrDigit(c) || c == '-'))
            throw new ArgumentException("Letters, digits and hyphens only.", nameof(id));
        var writer = new SvgWriter();
        var text = writer._out;
        text.Append("<svg xmlns=\"http://www.w3.org/2000/svg\" class=\"drawing\" viewBox=\"0 0 ").Append(Number(drawing.Width)).Append(' ').Append(Number(drawing.Height))
            .Append("\" width=\"").Append(Number(drawing.Width)).Append("\" height=\"").Append(Number(drawing.Height))
            .Append("\" role=\"img\" aria-labelledby=\"").Append(id).Append("-t ").Append(id).Append("-d\"><title id=\"").Append(id).Append("-t\">");
        writer.Escaped(drawing.Title);
        text.Append("</title><desc id=\"").Append(id).Append("-d\">");
        writer.Escaped(drawing.Description);
        text.Append("</desc>");
        drawing.DrawOn(writer);
        return text.Append("</svg>").ToString();
    }

    /// <inheritdoc/>
    public void Line(Point from, Point to, Stroke stroke)
    {
        _out.Append("<line x1=\"").Append(Number(from.X)).Append("\" y1=\"").Append(Number(from.Y))
            .Append("\" x2=\"").Append(Number(to.X)).Append("\" y2=\"").Append(Number(to.Y)).Append('"');
        Painted(new Paint(null, stroke));
        _out.Append("/>");
    }

    /// <inheritdoc/>
    public void Polyline(IReadOnlyList<Point> points, Stroke stroke)
    {
        _out.Append("<polyline");
        Points(points);
        Painted(new Paint(null, stroke));
        _out.Append("/>");
    }

    /// <inheritdoc/>
    public void Polygon(IReadOnlyList<Point> points, Paint paint)
    {
        _out.Append("<polygon");
        Points(points);
        Painted(paint);
        _out.Append("/>");
    }

    /// <inheritdoc/>
    public void Rectangle(Point topLeft, double width, double height, Paint paint)
    {
        Box("<rect", topLeft, width, height);
        Painted(paint);
        _out.Append("/>");
    }

    /// <inheritdoc/>
    public void Circle(Point centre, double radius, Paint paint)
    {
        Disc(centre, radius);
        Painted(paint);
        _out.Append("/>");
    }

    /// <inheritdoc/>
    public void Text(Point at, string text, TextStyle style)
    {
        _out.Append("<text x=\"").Append(Number(at.X)).Append("\" y=\"").Append(Number(at.Y)).Append("\" font-size=\"").Append(Number(style.Size)).Append('"');
        if (style.Anchor != TextAnchor.Start)
            _out.Append(" text-anchor=\"").Append(style.Anchor == TextAnchor.Middle ? "middle" : "end").Append('"');
        if (style.Weight == TextWeight.SemiBold)
            _out.Append(" font-weight=\"600\"");
        if (style.RotationDeg != 0)
            _out.Append(" transform=\"rotate(").Append(Number(style.RotationDeg)).Append(' ').Append(Number(at.X)).Append(' ').Append(Number(at.Y)).Append(")\"");
        _out.Append(" class=\"").Append(DrawingStyles.FillClass(style.Role));
        if (style.Halo)
            _out.Append(" halo");
        _out.Append("\">");
        Escaped(text);
        _out.Append("</text>");
    }

    /// <inheritdoc/>
    public void BeginMark(string hoverText)
    {
        _out.Append("<g class=\"mark\"><title>");
        Escaped(hoverText);
        _out.Append("</title>");
    }

    /// <inheritdoc/>
    public void EndMark() => _out.Append("</g>");

    /// <inheritdoc/>
    public void HoverArea(Point topLeft, double width, double height, Point? dot, string hoverText)
    {
        _out.Append("<g class=\"hover\"><title>");
        Escaped(hoverText);
        _out.Append("</title>");
        Box("<rect", topLeft, width, height);
        _out.Append(" class=\"area\"/>");
        if (dot is { } at)
        {
            Disc(at, 4);
            _out.Append(" class=\"dot\"/>");
        }

        _out.Append("</g>");
    }

    private void Box(string open, Point topLeft, double width, double height) =>
        _out.Append(open).Append(" x=\"").Append(Number(topLeft.X)).Append("\" y=\"").Append(Number(topLeft.Y))
            .Append("\" width=\"").Append(Number(width)).Append("\" height=\"").Append(Number(height)).Append('"');

    private void Disc(Point centre, double radius) =>
        _out.Append("<circle cx=\"").Append(Number(centre.X)).Append("\" cy=\"").Append(Number(centre.Y)).Append("\" r=\"").Append(Number(radius)).Append('"');

    private void Points(IReadOnlyList<Point> points)
    {
        _out.Append(" points=\"");
        for (var i = 0; i < points.Count; i++)
        {
            if (i > 0)
                _out.Append(' ');
            _out.Append(Number(points[i].X)).Append(',').Append(Number(points[i].Y));
        }

        _out.Append('"');
    }

    private void Painted(Paint paint)
    {
        _out.Append(" class=\"");
        _out.Append(paint.Fill is { } filled ? DrawingStyles.FillClass(filled.Role) : "hollow");
        if (paint.Stroke is { } inked)
            _out.Append(' ').Append(DrawingStyles.InkClass(inked.Role));
        _out.Append('"');
        if (paint.Fill is { Opacity: < 1 } fill)
            _out.Append(" fill-opacity=\"").Append(Number(fill.Opacity)).Append('"');
        if (paint.Stroke is not { } stroke)
            return;
        if (stroke.Width != 1)
            _out.Append(" stroke-width=\"").Append(Number(stroke.Width)).Append('"');
        if (stroke.Opacity < 1)
            _out.Append(" stroke-opacity=\"").Append(Number(stroke.Opacity)).Append('"');
        if (stroke.Pattern.Count > 0)
            _out.Append(" stroke-dasharray=\"").AppendJoin(' ', stroke.Pattern.Select(Number)).Append('"');
    }

    // At most two decimals, no exponent, no "-0".
    private static string Number(double value)
    {
        if (!double.IsFinite(value))
            throw new ArgumentOutOfRangeException(nameof(value), "A drawing holds a number that is not finite.");
        var rounded = Math.Round(value, 2, MidpointRounding.AwayFromZero);
        return rounded == 0 ? "0" : rounded.ToString("0.##", CultureInfo.InvariantCulture);
    }

    private void Escaped(string text)
    {
        foreach (var c in text)
        {
            // Characters XML 1.0 forbids would make the whole page unreadable; they carry no meaning in a label.
            if (c < ' ' && c is not ('\t' or '\n' or '\r'))
                continue;
            _ = c switch
            {
                '&' => _out.Append("&amp;"),
                '<' => _out.Append("&lt;"),
                '>' => _out.Append("&gt;"),
                '"' => _out.Append("&quot;"),
                _ => _out.Append(c),
            };
        }
    }
}
