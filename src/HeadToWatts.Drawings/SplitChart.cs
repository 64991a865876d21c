using HeadToWatts.Basis.Units;
using HeadToWatts.Drawings.Axes;
using HeadToWatts.Drawings.Canvas;
using HeadToWatts.Drawings.Layout;

namespace HeadToWatts.Drawings;

/// <summary>The turbines together at one flow.</summary>
/// <param name="FlowM3PerS">Flow.</param>
/// <param name="InTurnEfficiency">Their efficiency one after another; zero while they stand.</param>
/// <param name="BestEfficiency">Their efficiency with the best split; zero while they stand.</param>
public readonly record struct SplitPoint(double FlowM3PerS, double InTurnEfficiency, double BestEfficiency);

/// <summary>What the chart of the split shows.</summary>
/// <param name="Points">The turbines over the flow, rising.</param>
/// <param name="Units">Number of units.</param>
/// <param name="GainRatio">What the best split brings in the year, over the energy one after another.</param>
public sealed record SplitInput(IReadOnlyList<SplitPoint> Points, int Units, double GainRatio);

/// <summary>Efficiency of several turbines together over the flow: with the best split, and one after another.</summary>
public static partial class SplitChart
{
    /// <summary>Draws the chart.</summary>
    /// <exception cref="ArgumentException">There are fewer than two points.</exception>
    public static Drawing Draw(SplitInput input, UnitDisplay show, DrawingSize size)
    {
        ArgumentNullException.ThrowIfNull(input);
        ArgumentNullException.ThrowIfNull(show);
        ArgumentNullException.ThrowIfNull(size);
        if (input.Points.Count < 2)
            throw new ArgumentException("A curve needs two points.", nameof(input));
        var flow = show.FlowUnit;
        var frame = ChartFrame.Begin(
            size,
            Axis.Linear("flow through the turbines, " + flow.Symbol, 0, flow.FromHeld(input.Points[^1].FlowM3PerS), ChartFrame.HorizontalIntervals(size), toTicks: false),
            Axis.Linear("efficiency of the turbines together, %", 0, 100, ChartFrame.VerticalIntervals(size)));
        var simple = Curve(p => p.InTurnEfficiency);
        var best = Curve(p => p.BestEfficiency);
        frame.Curve(best, new Stroke(InkRole.Water, 2.2));
        frame.Curve(simple, new Stroke(InkRole.Ochre, 1.8, Dash.Dashed));
        var type = size.Type;
        frame.Labels.TryPlace(frame.Canvas, "best split", frame.StrongStyle(InkRole.Water), Spots.AlongCurve(best, type.Strong, 0.3));
        frame.Labels.TryPlace(frame.Canvas, "one after another", frame.LabelStyle(InkRole.Ochre), Spots.AlongCurve(simple, type.Label, 0.7, aboveFirst: false));
        var step = Math.Max(1, input.Points.Count / 40);
        frame.HoverBands([.. input.Points.Where((_, i) => i % step == 0).Select(p => (
            new Point(frame.AtX(flow.FromHeld(p.FlowM3PerS)), frame.AtY(p.BestEfficiency * 100)),
            $"{show.Flow(p.FlowM3PerS)}: {UnitDisplay.Percent(p.BestEfficiency)}, one after another {UnitDisplay.Percent(p.InTurnEfficiency)}"))]);
        return frame.Canvas.Finish(
            "Sharing the flow among the units",
            $"Efficiency of {input.Units} turbines together over the flow. The best split never lies below one after another and brings about {Wording.Share(Math.Max(0, input.GainRatio))} more energy in the year.",
            size.Width,
            size.Height);

        IReadOnlyList<Point> Curve(Func<SplitPoint, double> efficiency) =>
            Simplify.Curve([.. input.Points.Select(p => new Point(frame.AtX(flow.FromHeld(p.FlowM3PerS)), frame.AtY(efficiency(p) * 100)))]);
    }
}
