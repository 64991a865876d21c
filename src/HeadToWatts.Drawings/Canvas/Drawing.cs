namespace HeadToWatts.Drawings.Canvas;

/// <summary>A finished drawing: recorded steps that any canvas can repeat.</summary>
/// <param name="Title">What it shows, in a few words.</param>
/// <param name="Description">What it shows in sentences with its key numbers, for those who do not see it.</param>
/// <param name="Width">Width in drawing units; one is a CSS pixel on the screen.</param>
/// <param name="Height">Height in drawing units.</param>
/// <param name="Operations">The steps, first to last.</param>
public sealed record Drawing(string Title, string Description, double Width, double Height, IReadOnlyList<DrawOperation> Operations)
{
    /// <summary>Repeats the drawing on a canvas.</summary>
    public void DrawOn(ICanvas canvas)
    {
        ArgumentNullException.ThrowIfNull(canvas);
        foreach (var operation in Operations)
            operation.DrawOn(canvas);
    }
}

/// <summary>A canvas that records, from which a <see cref="Drawing"/> is made.</summary>
public sealed class DrawingRecorder : ICanvas
{
    private readonly List<DrawOperation> _operations = [];
    private bool _inMark;

    /// <inheritdoc/>
    public void Line(Point from, Point to, Stroke stroke) => _operations.Add(new LineOperation(from, to, stroke));

    /// <inheritdoc/>
    public void Polyline(IReadOnlyList<Point> points, Stroke stroke) => _operations.Add(new PolylineOperation([.. points], stroke));

    /// <inheritdoc/>
    public void Polygon(IReadOnlyList<Point> points, Paint paint) => _operations.Add(new PolygonOperation([.. points], paint));

    /// <inheritdoc/>
    public void Rectangle(Point topLeft, double width, double height, Paint paint) =>
        _operations.Add(new RectangleOperation(topLeft, width, height, paint));

    /// <inheritdoc/>
    public void Circle(Point centre, double radius, Paint paint) => _operations.Add(new CircleOperation(centre, radius, paint));

    /// <inheritdoc/>
    public void Text(Point at, string text, TextStyle style) => _operations.Add(new TextOperation(at, text, style));

    /// <inheritdoc/>
    public void BeginMark(string hoverText)
    {
        if (_inMark)
            throw new InvalidOperationException("A mark is already open.");
        _inMark = true;
        _operations.Add(new BeginMarkOperation(hoverText));
    }

    /// <inheritdoc/>
    public void EndMark()
    {
        if (!_inMark)
            throw new InvalidOperationException("No mark is open.");
        _inMark = false;
        _operations.Add(new EndMarkOperation());
    }

    /// <inheritdoc/>
    public void HoverArea(Point topLeft, double width, double height, Point? dot, string hoverText) =>
        _operations.Add(new HoverAreaOperation(topLeft, width, height, dot, hoverText));

    /// <summary>Ends the recording.</summary>
    /// <exception cref="InvalidOperationException">A mark is still open.</exception>
    public Drawing Finish(string title, string description, double width, double height) =>
        _inMark
            ? throw new InvalidOperationException("A mark is still open.")
            : new Drawing(title, description, width, height, [.. _operations]);
}
