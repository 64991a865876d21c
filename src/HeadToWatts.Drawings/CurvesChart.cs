using HeadToWatts.Basis.Units;
using HeadToWatts.Drawings.Axes;
using HeadToWatts.Drawings.Canvas;
using HeadToWatts.Drawings.Layout;
using HeadToWatts.FlowRecords;
using HeadToWatts.FlowRecords.Statistics;

namespace HeadToWatts.Drawings;

/// <summary>A curve of the comparison.</summary>
/// <param name="Name">What it counts.</param>
/// <param name="Curve">Flow against the share of its own time.</param>
public sealed record ComparedCurve(string Name, FlowDurationCurve Curve);

/// <summary>What the comparison of duration curves shows.</summary>
/// <param name="Curves">One to five curves, the most important first.</param>
/// <param name="Band">Band between the years; empty when there is none.</param>
/// <param name="DesignFlowM3PerS">Full flow of all units together.</param>
public sealed record CurvesInput(IReadOnlyList<ComparedCurve> Curves, IReadOnlyList<ExceedanceBand> Band, double DesignFlowM3PerS);

/// <summary>Flow-duration curves of all days, of a season or month, of single years, and the band between the years. Each over its own time.</summary>
public static partial class CurvesChart
{
    private const double HighestShownDesignFlows = 4;

    private static readonly Stroke[] Strokes =
    [
        new(InkRole.Water, 2.2), new(InkRole.Ochre, 1.8), new(InkRole.Ink, 1.4, Dash.Dashed), new(InkRole.Plum, 1.4), new(InkRole.Green, 1.4),
    ];

    /// <summary>Draws the chart.</summary>
    /// <exception cref="ArgumentException">There is no curve, or there are more than five.</exception>
    public static Drawing Draw(CurvesInput input, UnitDisplay show, DrawingSize size)
    {
        ArgumentNullException.ThrowIfNull(input);
        ArgumentNullException.ThrowIfNull(show);
        ArgumentNullException.ThrowIfNull(size);
        if (input.Curves.Count is 0 or > 5)
            throw new ArgumentException("One to five curves can be told apart.", nameof(input));

        var unit = show.FlowUnit;
        var peak = Math.Max(input.Curves.Max(c => c.Curve.FlowAt(0.002)), input.Band.Select(b => b.HighFlowM3PerS).DefaultIfEmpty(0).Max());
        var limit = HighestShownDesignFlows * input.DesignFlowM3PerS;
        var highest = input.DesignFlowM3PerS > 0 && peak > limit * 1.2 ? limit : Math.Max(peak, input.DesignFlowM3PerS * 1.08);
        var frame = ChartFrame.Begin(
            size,
            Axis.Linear("percent of its own time exceeded", 0, 100, ChartFrame.HorizontalIntervals(size, 3) >= 10 ? 10 : 5),
            Axis.Linear("flow, " + unit.Symbol, 0, highest > 0 ? unit.FromHeld(highest) : 1, ChartFrame.VerticalIntervals(size)));
        if (input.Band.Count > 1)
        {
            frame.Canvas.Polygon([.. BandLevel(b => b.HighFlowM3PerS), .. BandLevel(b => b.LowFlowM3PerS).Reverse()], Paint.Filled(InkRole.WaterFill));
            frame.Labels.TryPlace(frame.Canvas, "band: eight years in ten", frame.LabelStyle(InkRole.Soft), [new LabelSpot(new Point(size.Width - 4, frame.Top - (size.Type.Label * 0.85)), TextAnchor.End)]);
        }

        var drawn = new List<(IReadOnlyList<Point> Line, string Name, InkRole Role)>();
        for (var i = input.Curves.Count - 1; i >= 0; i--)
        {
            var curve = input.Curves[i].Curve;
            Point[] line = [.. Enumerable.Range(0, 201).Select(n => At(n / 200.0, curve.FlowAt(Math.Clamp(n / 200.0, 0.001, 0.999))))];
            var simple = Simplify.Curve(line);
            frame.Curve(simple, Strokes[i]);
            drawn.Add((simple, input.Curves[i].Name, Strokes[i].Role));
        }

        for (var n = drawn.Count - 1; n >= 0; n--)
        {
            var (line, name, role) = drawn[n];
            var style = frame.LabelStyle(role);
            var preferred = 0.3 + (0.12 * (n % 4));
            frame.Labels.TryPlace(frame.Canvas, name, style, Spots.AlongCurve(line, style.Size, preferred), style.Size * 3);
        }

        frame.HoverBands([.. Enumerable.Range(0, 21).Select(n => n / 20.0).Select(p => (
            At(p, input.Curves[0].Curve.FlowAt(Math.Clamp(p, 0.001, 0.999))),
            $"{p * 100:0} %: " + string.Join("; ", input.Curves.Select(c => $"{c.Name} {show.Flow(c.Curve.FlowAt(Math.Clamp(p, 0.001, 0.999)))}"))))]);
        return frame.Canvas.Finish("Duration curves compared", Describe(), size.Width, size.Height);

        Point At(double exceedance, double flowM3PerS) => new(frame.AtX(exceedance * 100), Math.Clamp(frame.AtY(unit.FromHeld(flowM3PerS)), frame.Top, frame.Bottom));

        IReadOnlyList<Point> BandLevel(Func<ExceedanceBand, double> flow) => Simplify.Curve([.. input.Band.Select(b => At(b.Exceedance, flow(b)))]);

        string Describe() => "Flow exceeded in half of its own time: " + string.Join("; ", input.Curves.Select(c => $"{c.Name} {show.Flow(c.Curve.FlowAt(0.5))}")) + ".";
    }
}
