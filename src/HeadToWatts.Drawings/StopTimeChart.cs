using HeadToWatts.Basis.Units;
using HeadToWatts.Drawings.Axes;
using HeadToWatts.Drawings.Canvas;
using HeadToWatts.Drawings.Layout;

namespace HeadToWatts.Drawings;

/// <summary>What the chart over time shows.</summary>
/// <param name="TimeStepS">Time between two values.</param>
/// <param name="PressuresPa">Pressure before the machine from the trip on, gauge.</param>
/// <param name="FlowsM3PerS">Flow through the machine.</param>
/// <param name="StandingPa">Pressure of standing water there.</param>
/// <param name="LimitPa">Limit there; null without one.</param>
public sealed record StopTimeInput(double TimeStepS, IReadOnlyList<double> PressuresPa, IReadOnlyList<double> FlowsM3PerS, double StandingPa, double? LimitPa);

/// <summary>Pressure before the machine and flow through it from the trip on.</summary>
public static partial class StopTimeChart
{
    private const int MostPoints = 380;

    /// <summary>Draws the chart.</summary>
    /// <exception cref="ArgumentException">There are fewer than two values.</exception>
    public static Drawing Draw(StopTimeInput input, UnitDisplay show, DrawingSize size)
    {
        ArgumentNullException.ThrowIfNull(input);
        ArgumentNullException.ThrowIfNull(show);
        ArgumentNullException.ThrowIfNull(size);
        var count = input.PressuresPa.Count;
        if (count < 2)
            throw new ArgumentException("Two values at least.", nameof(input));
        var (pressure, flow) = (show.PressureUnit, show.FlowUnit);
        var (low, top) = (Math.Min(0, input.PressuresPa.Min()), input.PressuresPa.Max());
        var showsLimit = input.LimitPa < top + (0.6 * (top - low));
        var high = showsLimit ? Math.Max(top, input.LimitPa!.Value) : top;
        var most = Math.Max(input.FlowsM3PerS.Max(), 1e-9);
        var least = Math.Min(0, input.FlowsM3PerS.Min());
        var frame = ChartFrame.Begin(
            size,
            Axis.Linear("since the trip, s", 0, input.TimeStepS * (count - 1), ChartFrame.HorizontalIntervals(size), toTicks: false),
            Axis.Linear("pressure, " + pressure.Symbol, pressure.FromHeld(low), pressure.FromHeld(high) * 1.05, ChartFrame.VerticalIntervals(size)),
            Axis.Linear("flow, " + flow.Symbol, flow.FromHeld(least), flow.FromHeld(most) * 1.05, ChartFrame.VerticalIntervals(size)),
            InkRole.Water, InkRole.Ochre);
        Level(input.StandingPa, new Stroke(InkRole.Soft, 1, Dash.Dashed), "standing");
        if (showsLimit)
            Level(input.LimitPa!.Value, new Stroke(InkRole.Amber, 1.4, Dash.Dashed), "limit");
        var flows = Curve(i => frame.AtRight(flow.FromHeld(input.FlowsM3PerS[i])));
        frame.Curve(flows, new Stroke(InkRole.Ochre, 1.4));
        var pressures = Curve(i => frame.AtY(pressure.FromHeld(input.PressuresPa[i])));
        frame.Curve(pressures, new Stroke(InkRole.Water, 2));
        var highest = 0;
        for (var i = 1; i < count; i++)
        {
            if (input.PressuresPa[i] > input.PressuresPa[highest])
                highest = i;
        }

        var peak = new Point(frame.AtX(highest * input.TimeStepS), frame.AtY(pressure.FromHeld(input.PressuresPa[highest])));
        frame.Canvas.Circle(peak, 3.5, new Paint(new Fill(InkRole.Water), new Stroke(InkRole.Card, 1.5)));
        frame.Labels.TryPlace(frame.Canvas, Wording.Trimmed(show.Pressure(input.PressuresPa[highest])), frame.StrongStyle(InkRole.Water), Spots.Around(peak, size.Type.Strong));
        frame.HoverBands([.. Enumerable.Range(0, 41).Select(n => n * (count - 1) / 40).Distinct().Select(i => (
            new Point(frame.AtX(i * input.TimeStepS), frame.AtY(pressure.FromHeld(input.PressuresPa[i]))),
            $"{UnitDisplay.Number(i * input.TimeStepS)} s: {show.Pressure(input.PressuresPa[i])}, {show.Flow(input.FlowsM3PerS[i])}"))]);
        return frame.Canvas.Finish(
            "Pressure before the machine when the unit trips",
            $"Highest {show.Pressure(input.PressuresPa[highest])} after {UnitDisplay.Number(highest * input.TimeStepS)} s, against {show.Pressure(input.StandingPa)} of standing water; lowest {show.Pressure(input.PressuresPa.Min())}.",
            size.Width, size.Height);

        void Level(double pressurePa, Stroke stroke, string name)
        {
            var y = frame.AtY(pressure.FromHeld(pressurePa));
            Point[] line = [new(frame.Left, y), new(frame.Right, y)];
            frame.Canvas.Line(line[0], line[1], stroke);
            frame.Labels.AvoidLines(line, 0.5);
            var style = frame.LabelStyle(stroke.Role);
            frame.Labels.TryPlace(frame.Canvas, name, style, Spots.AlongLevel(frame.Left, frame.Right, y, style.Size), style.Size * 2);
        }

        // Of many values the lowest and highest of each stretch are kept, so that no peak is lost.
        IReadOnlyList<Point> Curve(Func<int, double> y)
        {
            if (count <= MostPoints)
                return [.. Enumerable.Range(0, count).Select(At)];
            var points = new List<Point>();
            var stretch = (2.0 * count) / MostPoints;
            for (var from = 0.0; from < count; from += stretch)
            {
                var (a, b) = ((int)from, Math.Min(count, (int)(from + stretch)));
                if (b <= a)
                    continue;
                var (upper, lower) = (a, a);
                for (var i = a; i < b; i++)
                {
                    if (y(i) < y(upper))
                        upper = i;
                    if (y(i) > y(lower))
                        lower = i;
                }

                points.Add(At(Math.Min(upper, lower)));
                if (upper != lower)
                    points.Add(At(Math.Max(upper, lower)));
            }

            return points;

            Point At(int i) => new(frame.AtX(i * input.TimeStepS), y(i));
        }
    }
}
