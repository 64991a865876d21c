using HeadToWatts.Basis.Units;
using HeadToWatts.Drawings.Axes;
using HeadToWatts.Drawings.Canvas;
using HeadToWatts.Drawings.Layout;

namespace HeadToWatts.Drawings;

/// <summary>What one design flow would give.</summary>
/// <param name="DesignFlowM3PerS">The design flow tried.</param>
/// <param name="AnnualEnergyKwh">Energy in a mean year.</param>
/// <param name="PlantFactor">Plant factor, 0 to 1.</param>
public readonly record struct DesignFlowPoint(double DesignFlowM3PerS, double AnnualEnergyKwh, double PlantFactor);

/// <summary>What the design-flow chart shows.</summary>
/// <param name="Points">The design flows tried, in rising order.</param>
/// <param name="Suggested">The one suggested; null when none could be.</param>
/// <param name="Chosen">The one of this study.</param>
public sealed record DesignFlowInput(IReadOnlyList<DesignFlowPoint> Points, DesignFlowPoint? Suggested, DesignFlowPoint Chosen);

/// <summary>Annual energy and plant factor against design flow, the suggestion marked.</summary>
public static partial class DesignFlowChart
{
    /// <summary>Draws the chart.</summary>
    /// <exception cref="ArgumentException">There are fewer than two points.</exception>
    public static Drawing Draw(DesignFlowInput input, UnitDisplay show, DrawingSize size)
    {
        ArgumentNullException.ThrowIfNull(input);
        ArgumentNullException.ThrowIfNull(show);
        ArgumentNullException.ThrowIfNull(size);
        if (input.Points.Count < 2)
            throw new ArgumentException("A curve needs two points.", nameof(input));

        var flow = show.FlowUnit;
        var highestFlow = flow.FromHeld(Math.Max(input.Points[^1].DesignFlowM3PerS, input.Chosen.DesignFlowM3PerS));
        var highestEnergy = Math.Max(input.Points.Max(p => p.AnnualEnergyKwh), input.Chosen.AnnualEnergyKwh);
        var mega = highestEnergy >= 100_000;
        var highestFactor = Math.Max(input.Points.Max(p => p.PlantFactor), input.Chosen.PlantFactor) * 100;
        var intervals = ChartFrame.VerticalIntervals(size);
        var frame = ChartFrame.Begin(
            size,
            Axis.Linear("design flow, " + flow.Symbol, 0, highestFlow > 0 ? highestFlow : 1, ChartFrame.HorizontalIntervals(size), toTicks: false),
            Axis.Linear(mega ? "energy a year, MWh" : "energy a year, kWh", 0, highestEnergy > 0 ? Shown(highestEnergy) * 1.06 : 1, intervals),
            Axis.Linear("plant factor, %", 0, Math.Max(1, Math.Min(100, highestFactor)), intervals),
            InkRole.Ochre,
            InkRole.Green);

        IReadOnlyList<Point> energy = Simplify.Curve([.. input.Points.Select(At)]);
        IReadOnlyList<Point> factor = Simplify.Curve([.. input.Points.Select(p => new Point(frame.AtX(flow.FromHeld(p.DesignFlowM3PerS)), frame.AtRight(p.PlantFactor * 100)))]);
        frame.Curve(factor, new Stroke(InkRole.Green, 2, Dash.Dashed));
        frame.Curve(energy, new Stroke(InkRole.Ochre, 2.2));

        var same = input.Suggested is { } s && Math.Abs(s.DesignFlowM3PerS - input.Chosen.DesignFlowM3PerS) <= 0.005 * s.DesignFlowM3PerS;
        Upright(input.Chosen, InkRole.Ink, isMain: true);
        if (input.Suggested is { } suggested && !same)
            Upright(suggested, InkRole.Soft, isMain: false);

        var type = size.Type;
        frame.Labels.TryPlace(frame.Canvas, $"{(same ? "suggested" : "this study")} {Wording.Trimmed(show.Flow(input.Chosen.DesignFlowM3PerS))}", frame.StrongStyle(InkRole.Ink), Beside(input.Chosen));
        if (input.Suggested is { } other && !same)
            frame.Labels.TryPlace(frame.Canvas, $"suggested {show.Flow(other.DesignFlowM3PerS)}", frame.LabelStyle(InkRole.Soft), Beside(other));
        frame.Labels.TryPlace(frame.Canvas, "energy", frame.StrongStyle(InkRole.Ochre), Spots.AlongCurve(energy, type.Strong, 0.3, aboveFirst: false));
        frame.Labels.TryPlace(frame.Canvas, "plant factor", frame.LabelStyle(InkRole.Green), Spots.AlongCurve(factor, type.Label, 0.3));

        frame.HoverBands(Hovers(input.Points, show, At));
        return frame.Canvas.Finish("Energy against design flow", Describe(input, show, same), size.Width, size.Height);

        double Shown(double energyKwh) => mega ? energyKwh / 1000 : energyKwh;

        Point At(DesignFlowPoint p) => frame.At(flow.FromHeld(p.DesignFlowM3PerS), Shown(p.AnnualEnergyKwh));

        void Upright(DesignFlowPoint p, InkRole role, bool isMain)
        {
            var at = At(p);
            Point[] line = [new(at.X, frame.Top), new(at.X, frame.Bottom)];
            frame.Canvas.Line(line[0], line[1], new Stroke(role, 1, isMain ? Dash.Solid : Dash.Dashed));
            frame.Labels.AvoidLines(line, 0.5);
            frame.Canvas.BeginMark($"{(isMain ? "this study" : "suggested")}: {show.Flow(p.DesignFlowM3PerS)}, {UnitDisplay.Energy(p.AnnualEnergyKwh)} a year, plant factor {Wording.Share(p.PlantFactor)}");
            frame.Canvas.Circle(at, isMain ? 4.5 : 3.5, new Paint(new Fill(role), new Stroke(InkRole.Card, 1.5)));
            frame.Canvas.EndMark();
            frame.Labels.Avoid(LabelBox.Of(new Point(at.X - 6, at.Y - 6), 12, 12));
        }

        // Away from the other line, so that neither label is taken for the other's.
        IEnumerable<LabelSpot> Beside(DesignFlowPoint p)
        {
            var rightFirst = input.Suggested is not { } suggestion || same || p.DesignFlowM3PerS >= (suggestion.DesignFlowM3PerS + input.Chosen.DesignFlowM3PerS) / 2;
            var x = At(p).X;
            for (var step = 0; step < 10; step++)
            {
                var y = frame.Bottom - (type.Strong * (0.7 + (1.4 * step)));
                var right = new LabelSpot(new Point(x + 6, y));
                var left = new LabelSpot(new Point(x - 6, y), TextAnchor.End);
                yield return rightFirst ? right : left;
                yield return rightFirst ? left : right;
            }
        }
    }

    private static List<(Point Dot, string Text)> Hovers(IReadOnlyList<DesignFlowPoint> points, UnitDisplay show, Func<DesignFlowPoint, Point> at)
    {
        const int most = 48;
        var step = Math.Max(1, points.Count / most);
        var places = new List<(Point Dot, string Text)>();
        for (var i = 0; i < points.Count; i += step)
            places.Add((at(points[i]), $"{show.Flow(points[i].DesignFlowM3PerS)}: {UnitDisplay.Energy(points[i].AnnualEnergyKwh)} a year, plant factor {Wording.Share(points[i].PlantFactor)}"));
        return places;
    }

    private static string Describe(DesignFlowInput input, UnitDisplay show, bool same)
    {
        var text = $"With the design flow of this study, {show.Flow(input.Chosen.DesignFlowM3PerS)}, the plant gives {UnitDisplay.Energy(input.Chosen.AnnualEnergyKwh)} a year at a plant factor of {Wording.Share(input.Chosen.PlantFactor)}.";
        if (same)
            return text + " That is the design flow suggested.";
        return input.Suggested is { } s
            ? text + $" Suggested is {show.Flow(s.DesignFlowM3PerS)}, with {UnitDisplay.Energy(s.AnnualEnergyKwh)} a year at {Wording.Share(s.PlantFactor)}."
            : text;
    }
}
