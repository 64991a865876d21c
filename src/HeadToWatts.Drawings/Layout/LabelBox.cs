using HeadToWatts.Drawings.Canvas;

namespace HeadToWatts.Drawings.Layout;

/// <summary>The box a text takes up, turned with it.</summary>
public sealed class LabelBox
{
    private readonly Point _at;
    private readonly double _cos;
    private readonly double _sin;
    private readonly double _left;
    private readonly double _top;
    private readonly double _right;
    private readonly double _bottom;
    private readonly Point[] _corners;
    private readonly double _minX;
    private readonly double _maxX;
    private readonly double _minY;
    private readonly double _maxY;

    private LabelBox(Point at, double rotationDeg, double left, double top, double right, double bottom)
    {
        var turn = rotationDeg * Math.PI / 180;
        (_at, _cos, _sin) = (at, Math.Cos(turn), Math.Sin(turn));
        (_left, _top, _right, _bottom) = (left, top, right, bottom);
        _corners = [Turned(left, top), Turned(right, top), Turned(right, bottom), Turned(left, bottom)];
        (_minX, _maxX, _minY, _maxY) = (double.PositiveInfinity, double.NegativeInfinity, double.PositiveInfinity, double.NegativeInfinity);
        foreach (var c in _corners)
        {
            (_minX, _maxX) = (Math.Min(_minX, c.X), Math.Max(_maxX, c.X));
            (_minY, _maxY) = (Math.Min(_minY, c.Y), Math.Max(_maxY, c.Y));
        }
    }

    /// <summary>The four corners in order round the box.</summary>
    public IReadOnlyList<Point> Corners => _corners;

    /// <summary>The box of a text.</summary>
    public static LabelBox Of(Point at, string text, TextStyle style)
    {
        var width = TextMeasure.Width(text, style);
        var left = style.Anchor switch
        {
            TextAnchor.Start => 0,
            TextAnchor.Middle => -width / 2,
            _ => -width,
        };
        return new LabelBox(at, style.RotationDeg, left, -TextMeasure.AscentRatio * style.Size, left + width, TextMeasure.DescentRatio * style.Size);
    }

    /// <summary>An upright box.</summary>
    public static LabelBox Of(Point topLeft, double width, double height) => new(topLeft, 0, 0, 0, width, height);

    /// <summary>True when the box lies wholly within the given bounds.</summary>
    public bool LiesWithin(double left, double top, double right, double bottom) =>
        _minX >= left && _maxX <= right && _minY >= top && _maxY <= bottom;

    /// <summary>True when the two boxes come nearer to each other than the gap.</summary>
    public bool Touches(LabelBox other, double gap)
    {
        ArgumentNullException.ThrowIfNull(other);
        if (other._minX >= _maxX + gap || _minX >= other._maxX + gap || other._minY >= _maxY + gap || _minY >= other._maxY + gap)
            return false;

        // Two convex shapes are apart when they are apart along the normal of one of their edges.
        return !ApartAlong(this, other, _cos, _sin, gap) && !ApartAlong(this, other, -_sin, _cos, gap)
            && !ApartAlong(this, other, other._cos, other._sin, gap) && !ApartAlong(this, other, -other._sin, other._cos, gap);
    }

    /// <summary>Length of the part of a straight line that runs through the box.</summary>
    public double LengthInside(Point from, Point to)
    {
        if (Math.Max(from.X, to.X) < _minX || Math.Min(from.X, to.X) > _maxX || Math.Max(from.Y, to.Y) < _minY || Math.Min(from.Y, to.Y) > _maxY)
            return 0;
        var (a, b) = (Unturned(from), Unturned(to));
        double start = 0, end = 1;
        var (dx, dy) = (b.X - a.X, b.Y - a.Y);
        if (!Clip(-dx, a.X - _left, ref start, ref end) || !Clip(dx, _right - a.X, ref start, ref end)
            || !Clip(-dy, a.Y - _top, ref start, ref end) || !Clip(dy, _bottom - a.Y, ref start, ref end))
        {
            return 0;
        }

        return (end - start) * Math.Sqrt((dx * dx) + (dy * dy));
    }

    private static bool Clip(double direction, double distance, ref double start, ref double end)
    {
        if (direction == 0)
            return distance >= 0;
        var at = distance / direction;
        if (direction < 0)
            start = Math.Max(start, at);
        else
            end = Math.Min(end, at);
        return start < end;
    }

    private static bool ApartAlong(LabelBox a, LabelBox b, double x, double y, double gap)
    {
        var (aLow, aHigh) = Span(a, x, y);
        var (bLow, bHigh) = Span(b, x, y);
        return aHigh + gap <= bLow || bHigh + gap <= aLow;
    }

    private static (double Low, double High) Span(LabelBox box, double x, double y)
    {
        double low = double.PositiveInfinity, high = double.NegativeInfinity;
        foreach (var c in box._corners)
        {
            var at = (c.X * x) + (c.Y * y);
            low = Math.Min(low, at);
            high = Math.Max(high, at);
        }

        return (low, high);
    }

    private Point Turned(double x, double y) => new(_at.X + (x * _cos) - (y * _sin), _at.Y + (x * _sin) + (y * _cos));

    private Point Unturned(Point p)
    {
        var (x, y) = (p.X - _at.X, p.Y - _at.Y);
        return new((x * _cos) + (y * _sin), (y * _cos) - (x * _sin));
    }
}
