namespace HeadToWatts.Drawings.Canvas;

/// <summary>One recorded step of a drawing.</summary>
public abstract record DrawOperation
{
    /// <summary>Repeats the step on a canvas.</summary>
    public abstract void DrawOn(ICanvas canvas);
}

/// <summary>A straight line.</summary>
/// <param name="From">One end.</param>
/// <param name="To">The other end.</param>
/// <param name="Stroke">How it is drawn.</param>
public sealed record LineOperation(Point From, Point To, Stroke Stroke) : DrawOperation
{
    /// <inheritdoc/>
    public override void DrawOn(ICanvas canvas) => canvas.Line(From, To, Stroke);
}

/// <summary>An open chain of lines.</summary>
/// <param name="Points">Its points.</param>
/// <param name="Stroke">How it is drawn.</param>
public sealed record PolylineOperation(IReadOnlyList<Point> Points, Stroke Stroke) : DrawOperation
{
    /// <inheritdoc/>
    public override void DrawOn(ICanvas canvas) => canvas.Polyline(Points, Stroke);
}

/// <summary>A closed shape.</summary>
/// <param name="Points">Its corners.</param>
/// <param name="Paint">Filling and outline.</param>
public sealed record PolygonOperation(IReadOnlyList<Point> Points, Paint Paint) : DrawOperation
{
    /// <inheritdoc/>
    public override void DrawOn(ICanvas canvas) => canvas.Polygon(Points, Paint);
}

/// <summary>An upright rectangle.</summary>
/// <param name="TopLeft">Its top left corner.</param>
/// <param name="Width">Width.</param>
/// <param name="Height">Height.</param>
/// <param name="Paint">Filling and outline.</param>
public sealed record RectangleOperation(Point TopLeft, double Width, double Height, Paint Paint) : DrawOperation
{
    /// <inheritdoc/>
    public override void DrawOn(ICanvas canvas) => canvas.Rectangle(TopLeft, Width, Height, Paint);
}

/// <summary>A circle.</summary>
/// <param name="Centre">Its centre.</param>
/// <param name="Radius">Its radius.</param>
/// <param name="Paint">Filling and outline.</param>
public sealed record CircleOperation(Point Centre, double Radius, Paint Paint) : DrawOperation
{
    /// <inheritdoc/>
    public override void DrawOn(ICanvas canvas) => canvas.Circle(Centre, Radius, Paint);
}

/// <summary>A line of text.</summary>
/// <param name="At">The point on its baseline.</param>
/// <param name="Content">The text.</param>
/// <param name="Style">How it is set.</param>
public sealed record TextOperation(Point At, string Content, TextStyle Style) : DrawOperation
{
    /// <inheritdoc/>
    public override void DrawOn(ICanvas canvas) => canvas.Text(At, Content, Style);
}

/// <summary>Begins a mark with a value shown on hover.</summary>
/// <param name="HoverText">The value in words.</param>
public sealed record BeginMarkOperation(string HoverText) : DrawOperation
{
    /// <inheritdoc/>
    public override void DrawOn(ICanvas canvas) => canvas.BeginMark(HoverText);
}

/// <summary>Ends a mark.</summary>
public sealed record EndMarkOperation : DrawOperation
{
    /// <inheritdoc/>
    public override void DrawOn(ICanvas canvas) => canvas.EndMark();
}

/// <summary>An invisible area that shows a value.</summary>
/// <param name="TopLeft">Its top left corner.</param>
/// <param name="Width">Width.</param>
/// <param name="Height">Height.</param>
/// <param name="Dot">Where the value belongs.</param>
/// <param name="HoverText">The value in words.</param>
public sealed record HoverAreaOperation(Point TopLeft, double Width, double Height, Point? Dot, string HoverText) : DrawOperation
{
    /// <inheritdoc/>
    public override void DrawOn(ICanvas canvas) => canvas.HoverArea(TopLeft, Width, Height, Dot, HoverText);
}
