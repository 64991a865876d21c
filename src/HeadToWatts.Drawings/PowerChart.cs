using HeadToWatts.Basis.Units;
using HeadToWatts.Drawings.Axes;
using HeadToWatts.Drawings.Canvas;
using HeadToWatts.Drawings.Layout;

namespace HeadToWatts.Drawings;

/// <summary>The plant at one flow.</summary>
/// <param name="FlowM3PerS">Flow through the turbines.</param>
/// <param name="PowerKw">Power delivered; zero while no unit runs.</param>
/// <param name="NetHeadM">Net head.</param>
public readonly record struct PowerPoint(double FlowM3PerS, double PowerKw, double NetHeadM);

/// <summary>What the power chart shows.</summary>
/// <param name="Points">The plant over its flows, in rising order.</param>
/// <param name="Design">The plant at design flow.</param>
/// <param name="Units">Number of units.</param>
public sealed record PowerInput(IReadOnlyList<PowerPoint> Points, PowerPoint Design, int Units);

/// <summary>Power and net head against the flow through the turbines.</summary>
public static partial class PowerChart
{
    /// <summary>Draws the chart.</summary>
    /// <exception cref="ArgumentException">There are fewer than two points.</exception>
    public static Drawing Draw(PowerInput input, UnitDisplay show, DrawingSize size)
    {
        ArgumentNullException.ThrowIfNull(input);
        ArgumentNullException.ThrowIfNull(show);
        ArgumentNullException.ThrowIfNull(size);
        if (input.Points.Count < 2)
            throw new ArgumentException("A curve needs two points.", nameof(input));

        var (flow, length) = (show.FlowUnit, show.LengthUnit);
        var highestFlow = flow.FromHeld(Math.Max(input.Points.Max(p => p.FlowM3PerS), input.Design.FlowM3PerS));
        var highestPower = Math.Max(input.Points.Max(p => p.PowerKw), input.Design.PowerKw);
        var small = highestPower < 1;
        var highestHead = length.FromHeld(Math.Max(input.Points.Max(p => p.NetHeadM), input.Design.NetHeadM));
        var intervals = ChartFrame.VerticalIntervals(size);
        var frame = ChartFrame.Begin(
            size,
            Axis.Linear("flow through the turbines, " + flow.Symbol, 0, highestFlow > 0 ? highestFlow : 1, ChartFrame.HorizontalIntervals(size), toTicks: false),
            Axis.Linear(small ? "power, W" : "power, kW", 0, highestPower > 0 ? Shown(highestPower) * 1.05 : 1, intervals),
            Axis.Linear("net head, " + length.Symbol, 0, highestHead > 0 ? highestHead * 1.05 : 1, intervals),
            InkRole.Ochre,
            InkRole.Water);

        IReadOnlyList<Point> power = Simplify.Curve([.. input.Points.Select(p => new Point(frame.AtX(flow.FromHeld(p.FlowM3PerS)), frame.AtY(Shown(p.PowerKw))))]);
        IReadOnlyList<Point> head = Simplify.Curve([.. input.Points.Select(p => new Point(frame.AtX(flow.FromHeld(p.FlowM3PerS)), frame.AtRight(length.FromHeld(p.NetHeadM))))]);
        frame.Canvas.Polygon([.. power, new Point(power[^1].X, frame.Bottom), new Point(power[0].X, frame.Bottom)], Paint.Filled(InkRole.Ochre, 0.1));
        frame.Curve(head, new Stroke(InkRole.Water, 2, Dash.Dashed));
        frame.Curve(power, new Stroke(InkRole.Ochre, 2.2));

        var designX = frame.AtX(flow.FromHeld(input.Design.FlowM3PerS));
        Point[] down = [new(designX, frame.Top), new(designX, frame.Bottom)];
        frame.Canvas.Line(down[0], down[1], new Stroke(InkRole.Soft, 1, Dash.Dotted));
        frame.Labels.AvoidLines(down, 0.4);
        Dot(new Point(designX, frame.AtY(Shown(input.Design.PowerKw))), InkRole.Ochre);
        Dot(new Point(designX, frame.AtRight(length.FromHeld(input.Design.NetHeadM))), InkRole.Water);

        var type = size.Type;
        frame.Labels.TryPlace(frame.Canvas, "net head, " + show.Length(input.Design.NetHeadM) + " at design flow", frame.LabelStyle(InkRole.Water), Spots.AlongCurve(head, type.Label, 0.35));
        frame.Labels.TryPlace(frame.Canvas, "power, " + UnitDisplay.Power(input.Design.PowerKw) + " at design flow", frame.StrongStyle(InkRole.Ochre), Spots.AlongCurve(power, type.Strong, 0.55, aboveFirst: false));
        frame.Labels.TryPlace(frame.Canvas, "design flow " + Wording.Trimmed(show.Flow(input.Design.FlowM3PerS)), frame.LabelStyle(InkRole.Soft), DesignSpots());

        frame.HoverBands(Hovers(input.Points, show, frame, Shown));
        var units = input.Units == 1 ? "one unit" : $"{input.Units} units brought in one after another";
        return frame.Canvas.Finish(
            "Power and net head against flow",
            $"Power of {units} rises from {UnitDisplay.Power(input.Points[0].PowerKw)} to {UnitDisplay.Power(highestPower)}; at the design flow {show.Flow(input.Design.FlowM3PerS)} it is {UnitDisplay.Power(input.Design.PowerKw)} under a net head of {show.Length(input.Design.NetHeadM)}.",
            size.Width,
            size.Height);

        double Shown(double powerKw) => small ? powerKw * 1000 : powerKw;

        void Dot(Point at, InkRole role)
        {
            frame.Canvas.Circle(at, 4, new Paint(new Fill(role), new Stroke(InkRole.Card, 1.5)));
            frame.Labels.Avoid(LabelBox.Of(new Point(at.X - 5, at.Y - 5), 10, 10));
        }

        IEnumerable<LabelSpot> DesignSpots()
        {
            for (var step = 0; step < 10; step++)
            {
                var y = frame.Bottom - (type.Label * (0.6 + (1.3 * step)));
                yield return new LabelSpot(new Point(designX - 5, y), TextAnchor.End);
                yield return new LabelSpot(new Point(designX + 5, y));
            }
        }
    }

    private static List<(Point Dot, string Text)> Hovers(IReadOnlyList<PowerPoint> points, UnitDisplay show, ChartFrame frame, Func<double, double> shown)
    {
        const int most = 48;
        var step = Math.Max(1, points.Count / most);
        var places = new List<(Point Dot, string Text)>();
        for (var i = 0; i < points.Count; i += step)
        {
            var p = points[i];
            places.Add((
                new Point(frame.AtX(show.FlowUnit.FromHeld(p.FlowM3PerS)), frame.AtY(shown(p.PowerKw))),
                $"{show.Flow(p.FlowM3PerS)}: {UnitDisplay.Power(p.PowerKw)} under {show.Length(p.NetHeadM)}"));
        }

        return places;
    }
}
