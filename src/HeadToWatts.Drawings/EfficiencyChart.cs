using HeadToWatts.Basis.Units;
using HeadToWatts.Drawings.Axes;
using HeadToWatts.Drawings.Canvas;
using HeadToWatts.Drawings.Layout;
using HeadToWatts.Turbines;

namespace HeadToWatts.Drawings;

/// <summary>A line of the efficiency chart.</summary>
/// <param name="Name">What it is.</param>
/// <param name="Points">Flow of the unit over its full flow, and efficiency, by rising flow.</param>
public sealed record EfficiencyLine(string Name, IReadOnlyList<EfficiencyPoint> Points);

/// <summary>What the efficiency chart shows.</summary>
/// <param name="Used">The curve that is reckoned with.</param>
/// <param name="LessPoints">How many points lower the second line lies.</param>
/// <param name="Heads">A manufacturer's lines at his heads; none where there is no chart.</param>
/// <param name="LeastFlowRatio">Least flow of a unit over its full flow.</param>
public sealed record EfficiencyInput(EfficiencyLine Used, double LessPoints, IReadOnlyList<EfficiencyLine> Heads, double LeastFlowRatio);

/// <summary>Efficiency of one unit over its flow: the curve in use, the same some points lower, and a manufacturer's heads where there are any.</summary>
public static partial class EfficiencyChart
{
    /// <summary>Draws the chart.</summary>
    /// <exception cref="ArgumentException">The curve has fewer than two points.</exception>
    public static Drawing Draw(EfficiencyInput input, DrawingSize size)
    {
        ArgumentNullException.ThrowIfNull(input);
        ArgumentNullException.ThrowIfNull(size);
        if (input.Used.Points.Count < 2)
            throw new ArgumentException("A curve needs two points.", nameof(input));
        var furthest = Math.Max(100, input.Heads.Append(input.Used).Max(l => l.Points[^1].FlowRatio) * 100);
        var least = input.Heads.Append(input.Used).SelectMany(l => l.Points).Min(p => p.Efficiency) - input.LessPoints;
        var frame = ChartFrame.Begin(
            size,
            Axis.Linear("flow of the unit, % of its full flow", 0, furthest, ChartFrame.HorizontalIntervals(size), toTicks: false),
            Axis.Linear("turbine efficiency, %", Math.Max(0, Math.Floor(least * 5) * 20), 100, ChartFrame.VerticalIntervals(size)));
        var used = Line(input.Used.Points, 0);
        var lower = Line(input.Used.Points, input.LessPoints);
        var stopX = frame.AtX(input.LeastFlowRatio * 100);
        Point[] stop = [new(stopX, frame.Top), new(stopX, frame.Bottom)];
        frame.Canvas.Line(stop[0], stop[1], new Stroke(InkRole.Soft, 1, Dash.Dotted));
        foreach (var head in input.Heads)
            frame.Curve(Line(head.Points, 0), new Stroke(InkRole.Green, 1.2));
        frame.Curve(lower, new Stroke(InkRole.Ochre, 1.4, Dash.Dashed));
        frame.Curve(used, new Stroke(InkRole.Water, 2.2));
        frame.Labels.AvoidLines(stop, 0.4);
        var type = size.Type;
        frame.Labels.TryPlace(frame.Canvas, input.Used.Name, frame.StrongStyle(InkRole.Water), Spots.AlongCurve(used, type.Strong, 0.6));
        frame.Labels.TryPlace(frame.Canvas, $"{UnitDisplay.Number(input.LessPoints * 100, 1)} points lower", frame.LabelStyle(InkRole.Ochre), Spots.AlongCurve(lower, type.Label, 0.7, aboveFirst: false));
        foreach (var head in input.Heads)
        {
            var line = Line(head.Points, 0);
            frame.Labels.TryPlace(frame.Canvas, head.Name, frame.LabelStyle(InkRole.Green), Spots.AlongCurve(line, type.Label, 0.25, aboveFirst: false));
        }

        frame.Labels.TryPlace(frame.Canvas, "least flow", frame.LabelStyle(InkRole.Soft), [new LabelSpot(new Point(stopX + 5, frame.Bottom - (type.Label * 0.6))), new LabelSpot(new Point(stopX - 5, frame.Bottom - (type.Label * 0.6)), TextAnchor.End)]);
        frame.HoverBands([.. input.Used.Points.Select(p => (new Point(frame.AtX(p.FlowRatio * 100), frame.AtY(p.Efficiency * 100)), $"{UnitDisplay.Percent(p.FlowRatio)} of full flow: {UnitDisplay.Percent(p.Efficiency)}"))]);
        var peak = input.Used.Points.MaxBy(p => p.Efficiency);
        return frame.Canvas.Finish(
            "Efficiency of one unit",
            $"{input.Used.Name}: highest {UnitDisplay.Percent(peak.Efficiency)} at {UnitDisplay.Percent(peak.FlowRatio)} of full flow; a unit runs from {UnitDisplay.Percent(input.LeastFlowRatio)}."
                + (input.Heads.Count > 0 ? $" The manufacturer gives {input.Heads.Count} heads: {string.Join(", ", input.Heads.Select(h => h.Name))}." : ""),
            size.Width,
            size.Height);

        IReadOnlyList<Point> Line(IReadOnlyList<EfficiencyPoint> points, double less) =>
            [.. points.Select(p => new Point(frame.AtX(p.FlowRatio * 100), frame.AtY(Math.Max(0, p.Efficiency - less) * 100)))];
    }
}
