using HeadToWatts.Drawings.Canvas;
using HeadToWatts.Drawings.Layout;

namespace HeadToWatts.Drawings.Axes;

/// <summary>
/// The frame of a chart: grid, ticks and axis titles drawn, the rest of the drawing placed by value. The vertical axes'
/// titles stand level over their axes, where they are read without turning the head.
/// </summary>
public sealed class ChartFrame
{
    private const double TickGap = 7;

    private ChartFrame(DrawingSize size, Axis x, Axis y, Axis? yRight, double left, double top, double right, double bottom)
    {
        (Size, X, Y, YRight) = (size, x, y, yRight);
        (Left, Top, Right, Bottom) = (left, top, right, bottom);
        Labels = new LabelPlacer(2, 2, size.Width - 2, size.Height - 2);
    }

    /// <summary>The canvas the chart is recorded on.</summary>
    public DrawingRecorder Canvas { get; } = new();

    /// <summary>The placer of labels, which knows the frame's own.</summary>
    public LabelPlacer Labels { get; }

    /// <summary>Size of the drawing.</summary>
    public DrawingSize Size { get; }

    /// <summary>The horizontal axis.</summary>
    public Axis X { get; }

    /// <summary>The vertical axis at the left.</summary>
    public Axis Y { get; }

    /// <summary>The vertical axis at the right, if there is one.</summary>
    public Axis? YRight { get; }

    /// <summary>Left edge of the plot.</summary>
    public double Left { get; }

    /// <summary>Upper edge of the plot.</summary>
    public double Top { get; }

    /// <summary>Right edge of the plot.</summary>
    public double Right { get; }

    /// <summary>Lower edge of the plot.</summary>
    public double Bottom { get; }

    /// <summary>Room for ticks: how many intervals a vertical axis of this drawing takes.</summary>
    public static int VerticalIntervals(DrawingSize size)
    {
        ArgumentNullException.ThrowIfNull(size);
        return Math.Clamp((int)(size.Height / (size.Type.Tick * 3.6)), 3, 7);
    }

    /// <summary>Room for ticks: how many intervals a horizontal axis takes when its longest number is so many digits.</summary>
    public static int HorizontalIntervals(DrawingSize size, int digits = 4)
    {
        ArgumentNullException.ThrowIfNull(size);
        return Math.Clamp((int)((size.Width - 90) / (size.Type.Tick * ((0.6 * digits) + 2.2))), 2, 12);
    }

    /// <summary>Draws the frame.</summary>
    /// <param name="size">Size of the drawing.</param>
    /// <param name="x">The horizontal axis.</param>
    /// <param name="y">The vertical axis.</param>
    /// <param name="yRight">A second vertical axis at the right.</param>
    /// <param name="leftRole">Ink of the left axis's numbers and title.</param>
    /// <param name="rightRole">Ink of the right axis's numbers and title.</param>
    public static ChartFrame Begin(DrawingSize size, Axis x, Axis y, Axis? yRight = null, InkRole leftRole = InkRole.Soft, InkRole rightRole = InkRole.Soft)
    {
        ArgumentNullException.ThrowIfNull(size);
        ArgumentNullException.ThrowIfNull(x);
        ArgumentNullException.ThrowIfNull(y);
        var type = size.Type;
        var left = Widest(y, type) + TickGap + 4;
        var lastTick = x.Ticks.LastOrDefault(t => t.Text.Length > 0);
        var overhang = lastTick.Text is { Length: > 0 } text ? TextMeasure.Width(text, type.Tick) / 2 : 0;
        var right = size.Width - Math.Max(yRight is null ? 6 : Widest(yRight, type) + TickGap + 4, overhang + 3);
        var top = type.Label * 1.9;
        var bottom = size.Height - (type.Tick * 1.6) - (x.Title.Length > 0 ? type.Label * 1.45 : 3);
        var frame = new ChartFrame(size, x, y, yRight, left, top, right, bottom);
        frame.DrawGrid();
        frame.DrawNumbers(leftRole, rightRole);
        return frame;
    }

    /// <summary>Across position of a value.</summary>
    public double AtX(double value) => Left + (X.Fraction(value) * (Right - Left));

    /// <summary>Down position of a value on the left axis.</summary>
    public double AtY(double value) => Bottom - (Y.Fraction(value) * (Bottom - Top));

    /// <summary>Down position of a value on the right axis.</summary>
    public double AtRight(double value) => Bottom - ((YRight ?? Y).Fraction(value) * (Bottom - Top));

    /// <summary>The point of a pair of values.</summary>
    public Point At(double x, double y) => new(AtX(x), AtY(y));

    /// <summary>A text style of the drawing's label size.</summary>
    public TextStyle LabelStyle(InkRole role, TextAnchor anchor = TextAnchor.Start) => new(role, Size.Type.Label, anchor, Halo: true);

    /// <summary>A text style for what carries the answer.</summary>
    public TextStyle StrongStyle(InkRole role, TextAnchor anchor = TextAnchor.Start) => new(role, Size.Type.Strong, anchor, TextWeight.SemiBold, Halo: true);

    /// <summary>Draws a curve and keeps labels off it.</summary>
    public void Curve(IReadOnlyList<Point> points, Stroke stroke)
    {
        Canvas.Polyline(points, stroke);
        Labels.AvoidLines(points);
    }

    /// <summary>Invisible bands side by side over the plot, each showing the value at its place.</summary>
    /// <param name="places">Place across, place of the dot and text of each band, in order from left to right.</param>
    public void HoverBands(IReadOnlyList<(Point Dot, string Text)> places)
    {
        ArgumentNullException.ThrowIfNull(places);
        for (var i = 0; i < places.Count; i++)
        {
            var from = i == 0 ? Left : (places[i - 1].Dot.X + places[i].Dot.X) / 2;
            var to = i == places.Count - 1 ? Right : (places[i].Dot.X + places[i + 1].Dot.X) / 2;
            if (to > from)
                Canvas.HoverArea(new Point(from, Top), to - from, Bottom - Top, places[i].Dot, places[i].Text);
        }
    }

    private static double Widest(Axis axis, TypeScale type) =>
        axis.Ticks.Count == 0 ? 0 : axis.Ticks.Max(t => TextMeasure.Width(t.Text, type.Tick));

    private void DrawGrid()
    {
        foreach (var tick in X.Ticks)
            Canvas.Line(new Point(AtX(tick.Value), Top), new Point(AtX(tick.Value), Bottom), Grid(tick));
        foreach (var tick in Y.Ticks)
            Canvas.Line(new Point(Left, AtY(tick.Value)), new Point(Right, AtY(tick.Value)), Grid(tick));

        static Stroke Grid(Tick tick) => tick.Text.Length > 0 ? new Stroke(InkRole.Grid) : new Stroke(InkRole.Grid, 0.5, Dash.Solid, 0.7);
    }

    private void DrawNumbers(InkRole leftRole, InkRole rightRole)
    {
        var type = Size.Type;
        var drop = type.Tick * 0.36;
        foreach (var tick in Y.Ticks.Where(t => t.Text.Length > 0))
            Labels.Fix(Canvas, new Point(Left - TickGap, AtY(tick.Value) + drop), tick.Text, new TextStyle(leftRole, type.Tick, TextAnchor.End));
        foreach (var tick in YRight?.Ticks.Where(t => t.Text.Length > 0) ?? [])
            Labels.Fix(Canvas, new Point(Right + TickGap, AtRight(tick.Value) + drop), tick.Text, new TextStyle(rightRole, type.Tick));

        var lastEnd = double.NegativeInfinity;
        foreach (var tick in X.Ticks.Where(t => t.Text.Length > 0))
        {
            var half = TextMeasure.Width(tick.Text, type.Tick) / 2;
            var x = AtX(tick.Value);
            if (x - half < lastEnd + 4)
                continue;
            lastEnd = x + half;
            Labels.Fix(Canvas, new Point(x, Bottom + (type.Tick * 1.4)), tick.Text, new TextStyle(InkRole.Soft, type.Tick, TextAnchor.Middle));
        }

        var titleY = Top - (type.Label * 0.85);
        Labels.Fix(Canvas, new Point(3, titleY), Y.Title, new TextStyle(leftRole, type.Label));
        if (YRight is not null)
            Labels.Fix(Canvas, new Point(Size.Width - 3, titleY), YRight.Title, new TextStyle(rightRole, type.Label, TextAnchor.End));
        if (X.Title.Length > 0)
            Labels.Fix(Canvas, new Point((Left + Right) / 2, Bottom + (type.Tick * 1.5) + (type.Label * 1.3)), X.Title, new TextStyle(InkRole.Soft, type.Label, TextAnchor.Middle));
    }
}
