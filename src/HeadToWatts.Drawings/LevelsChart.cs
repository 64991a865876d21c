using HeadToWatts.Basis.Units;
using HeadToWatts.Drawings.Axes;
using HeadToWatts.Drawings.Canvas;
using HeadToWatts.Drawings.Layout;

namespace HeadToWatts.Drawings;

/// <summary>Levels and heads at a flow.</summary>
/// <param name="PassingFlowM3PerS">Flow passing the site, m3/s.</param>
/// <param name="HeadwaterM">Headwater, m.</param>
/// <param name="TailwaterM">Tailwater, m.</param>
/// <param name="NetHeadM">Net head with the plant on as much of the flow as it takes, m; zero where it stands.</param>
public readonly record struct LevelsAtFlow(double PassingFlowM3PerS, double HeadwaterM, double TailwaterM, double NetHeadM);

/// <summary>What the chart of levels shows.</summary>
/// <param name="Points">Points in the order of rising flow.</param>
/// <param name="DesignPassingM3PerS">Flow passing when the plant runs full.</param>
public sealed record LevelsInput(IReadOnlyList<LevelsAtFlow> Points, double DesignPassingM3PerS);

/// <summary>Water levels against the flow, with the net head that is left between them.</summary>
public static partial class LevelsChart
{
    /// <summary>Draws the chart.</summary>
    /// <exception cref="ArgumentException">There are fewer than two points.</exception>
    public static Drawing Draw(LevelsInput input, UnitDisplay show, DrawingSize size)
    {
        ArgumentNullException.ThrowIfNull(input);
        ArgumentNullException.ThrowIfNull(show);
        ArgumentNullException.ThrowIfNull(size);
        if (input.Points.Count < 2)
            throw new ArgumentException("A line needs two points.", nameof(input));

        var (flow, length) = (show.FlowUnit, show.LengthUnit);
        var low = input.Points.Min(p => Math.Min(p.TailwaterM, p.HeadwaterM));
        var high = input.Points.Max(p => Math.Max(p.HeadwaterM, p.TailwaterM));
        var room = Math.Max(high - low, 0.1) * 0.08;
        var heads = input.Points.Max(p => p.NetHeadM);
        var frame = ChartFrame.Begin(
            size,
            Axis.Linear("flow passing, " + flow.Symbol, 0, Math.Max(flow.FromHeld(input.Points[^1].PassingFlowM3PerS), 1e-6), ChartFrame.HorizontalIntervals(size)),
            Axis.Linear("level, " + length.Symbol, length.FromHeld(low - room), length.FromHeld(high + room), ChartFrame.VerticalIntervals(size)),
            Axis.Linear("net head, " + length.Symbol, 0, heads > 0 ? length.FromHeld(heads) * 1.1 : 1, ChartFrame.VerticalIntervals(size)),
            InkRole.Water,
            InkRole.Ochre);
        var head = Line(p => frame.AtY(length.FromHeld(p.HeadwaterM)));
        var tail = Line(p => frame.AtY(length.FromHeld(p.TailwaterM)));
        var net = Line(p => frame.AtRight(length.FromHeld(Math.Max(0, p.NetHeadM))));
        frame.Canvas.Polygon([.. head, .. tail.Reverse()], Paint.Filled(InkRole.WaterFill));
        frame.Curve(head, new Stroke(InkRole.Water, 2));
        frame.Curve(tail, new Stroke(InkRole.Water, 2, Dash.Dashed));
        frame.Curve(net, new Stroke(InkRole.Ochre, 1.8));
        var designX = frame.AtX(flow.FromHeld(input.DesignPassingM3PerS));
        if (designX > frame.Left && designX < frame.Right)
        {
            frame.Canvas.Line(new Point(designX, frame.Top), new Point(designX, frame.Bottom), new Stroke(InkRole.Soft, 1, Dash.Dashed));
            frame.Labels.TryPlace(frame.Canvas, "plant full", frame.LabelStyle(InkRole.Soft), [new LabelSpot(new Point(designX + 4, frame.Bottom - 5)), new LabelSpot(new Point(designX - 4, frame.Bottom - 5), TextAnchor.End), new LabelSpot(new Point(designX + 4, frame.Top + size.Type.Label))]);
        }

        Name(head, "headwater", InkRole.Water, 0.25);
        Name(tail, "tailwater", InkRole.Water, 0.4);
        Name(net, "net head", InkRole.Ochre, 0.7);
        frame.HoverBands([.. input.Points.Where((_, i) => i % 3 == 0).Select(p => (
            new Point(frame.AtX(flow.FromHeld(p.PassingFlowM3PerS)), frame.AtY(length.FromHeld(p.TailwaterM))),
            $"{show.Flow(p.PassingFlowM3PerS)}: headwater {UnitDisplay.In(p.HeadwaterM, length, 6)}, tailwater {UnitDisplay.In(p.TailwaterM, length, 6)} {length.Symbol}, net head {(p.NetHeadM > 0 ? show.Length(p.NetHeadM) : "none: the plant stands")}"))]);
        return frame.Canvas.Finish("Levels and head against flow", Describe(), size.Width, size.Height);

        IReadOnlyList<Point> Line(Func<LevelsAtFlow, double> y) =>
            Simplify.Curve([.. input.Points.Select(p => new Point(frame.AtX(flow.FromHeld(p.PassingFlowM3PerS)), Math.Clamp(y(p), frame.Top, frame.Bottom)))]);

        void Name(IReadOnlyList<Point> line, string text, InkRole role, double preferred)
        {
            var style = frame.LabelStyle(role);
            frame.Labels.TryPlace(frame.Canvas, text, style, Spots.AlongCurve(line, style.Size, preferred), style.Size * 3);
        }

        string Describe()
        {
            var (first, last) = (input.Points[0], input.Points[^1]);
            var stands = input.Points.Where(p => p.NetHeadM <= 0 && p.PassingFlowM3PerS > input.DesignPassingM3PerS).Select(p => p.PassingFlowM3PerS).DefaultIfEmpty(double.NaN).First();
            return $"From {show.Flow(first.PassingFlowM3PerS)} to {show.Flow(last.PassingFlowM3PerS)} passing, the gross head goes from {show.Length(first.HeadwaterM - first.TailwaterM)} to {show.Length(last.HeadwaterM - last.TailwaterM)}."
                + (double.IsNaN(stands) ? "" : $" From {show.Flow(stands)} on the plant stands.");
        }
    }
}
