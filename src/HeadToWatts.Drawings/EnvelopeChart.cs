using HeadToWatts.Basis.Units;
using HeadToWatts.Drawings.Axes;
using HeadToWatts.Drawings.Canvas;
using HeadToWatts.Drawings.Layout;

namespace HeadToWatts.Drawings;

/// <summary>A pair of flow and net head.</summary>
/// <param name="FlowM3PerS">Flow of one unit.</param>
/// <param name="NetHeadM">Net head.</param>
public readonly record struct HeadAndFlow(double FlowM3PerS, double NetHeadM);

/// <summary>How a machine takes its energy from the water.</summary>
public enum MachineFamily
{
    /// <summary>Jets in air: Pelton, Turgo, crossflow.</summary>
    Impulse,

    /// <summary>Runs full of water: Francis, Kaplan, propeller, pump as turbine.</summary>
    Reaction,

    /// <summary>Moved by the weight of the water: screws and water wheels.</summary>
    Gravity,
}

/// <summary>The range of head and flow a turbine type is built for.</summary>
/// <param name="Name">Name of the type.</param>
/// <param name="Corners">Corners of the range, joined straight in log head and log flow.</param>
/// <param name="Family">How it works; families share a colour.</param>
/// <param name="IsChosen">True for the type of this study.</param>
public sealed record EnvelopeShape(string Name, IReadOnlyList<HeadAndFlow> Corners, MachineFamily Family, bool IsChosen);

/// <summary>What the envelope chart shows.</summary>
/// <param name="Shapes">The turbine types.</param>
/// <param name="Site">Design flow of one unit and net head at it.</param>
/// <param name="Range">What the site offers a unit through the year, from the wettest time to the driest.</param>
public sealed record EnvelopeInput(IReadOnlyList<EnvelopeShape> Shapes, HeadAndFlow Site, IReadOnlyList<HeadAndFlow> Range);

/// <summary>The ranges of the turbine types over log head and log flow, with the site's point and its range through the year.</summary>
public static partial class EnvelopeChart
{
    private static readonly InkRole[] OfFamily = [InkRole.Plum, InkRole.Green, InkRole.Ochre];

    /// <summary>Draws the chart.</summary>
    public static Drawing Draw(EnvelopeInput input, UnitDisplay show, DrawingSize size)
    {
        ArgumentNullException.ThrowIfNull(input);
        ArgumentNullException.ThrowIfNull(show);
        ArgumentNullException.ThrowIfNull(size);
        var points = input.Range.Append(input.Site).Where(p => p.FlowM3PerS > 0 && p.NetHeadM > 0).ToList();
        var site = points.Count > 0 ? points[^1] : new HeadAndFlow(1, 10);
        var corners = input.Shapes.SelectMany(s => s.Corners).Where(p => p.FlowM3PerS > 0 && p.NetHeadM > 0).ToList();

        // Two decades to either side tell all there is to tell about a site; more makes it a dot in a crowd.
        var x = AxisOver("flow of one unit, " + show.FlowUnit.Symbol, show.FlowUnit, p => p.FlowM3PerS, 150, 100, size.Width);
        var y = AxisOver("net head, " + show.LengthUnit.Symbol, show.LengthUnit, p => p.NetHeadM, 40, 60, size.Height);
        var frame = ChartFrame.Begin(size, x, y);

        var shapes = new List<(EnvelopeShape Shape, InkRole Role, IReadOnlyList<Point> Outline)>();
        foreach (var shape in input.Shapes)
        {
            var role = shape.IsChosen ? InkRole.Water : OfFamily[(int)shape.Family];
            var outline = ClipPolygon.To([.. shape.Corners.Where(c => c.FlowM3PerS > 0 && c.NetHeadM > 0).Select(At)], frame.Left, frame.Top, frame.Right, frame.Bottom);
            if (outline.Count >= 3)
                shapes.Add((shape, role, outline));
        }

        // The chosen one last, over the others.
        shapes = [.. shapes.OrderBy(s => s.Shape.IsChosen)];
        foreach (var (shape, role, outline) in shapes)
        {
            frame.Canvas.BeginMark(shape.Name + (shape.IsChosen ? ", the type of this study" : ""));
            frame.Canvas.Polygon(outline, new Paint(new Fill(role, shape.IsChosen ? 0.22 : 0.05), new Stroke(role, shape.IsChosen ? 1.8 : 1, Dash.Solid, shape.IsChosen ? 1 : 0.65)));
            frame.Canvas.EndMark();
            frame.Labels.AvoidLines([.. outline, outline[0]]);
        }

        var range = Simplify.Curve([.. input.Range.Where(p => p.FlowM3PerS > 0 && p.NetHeadM > 0).Select(At)]);
        if (range.Count > 1)
        {
            frame.Canvas.BeginMark($"through the year: {show.Flow(input.Range.Min(p => p.FlowM3PerS))} to {show.Flow(input.Range.Max(p => p.FlowM3PerS))}");
            frame.Curve(range, new Stroke(InkRole.Ink, 1.8));
            frame.Canvas.EndMark();
        }

        var siteAt = At(site);
        var siteText = show.Flow(site.FlowM3PerS) + ", " + show.Length(site.NetHeadM);
        frame.Canvas.BeginMark("design point of one unit: " + siteText);
        frame.Canvas.Circle(siteAt, 5.5, new Paint(new Fill(InkRole.Ink), new Stroke(InkRole.Card, 1.5)));
        frame.Canvas.EndMark();
        frame.Labels.Avoid(LabelBox.Of(new Point(siteAt.X - 7, siteAt.Y - 7), 14, 14));
        frame.Labels.TryPlace(frame.Canvas, siteText, frame.StrongStyle(InkRole.Ink), Spots.Around(siteAt, size.Type.Strong, 11));

        foreach (var (shape, role, outline) in shapes.AsEnumerable().Reverse())
        {
            var style = frame.LabelStyle(role) with { Weight = shape.IsChosen ? TextWeight.SemiBold : TextWeight.Regular };
            frame.Labels.TryPlace(frame.Canvas, shape.Name, style, SpotsWithin(outline, [.. shapes.Where(s => s.Shape != shape).Select(s => s.Outline)], shape.Name, style));
        }

        return frame.Canvas.Finish("Turbine envelopes", Describe(input, show), size.Width, size.Height);

        Point At(HeadAndFlow p) => frame.At(show.FlowUnit.FromHeld(p.FlowM3PerS), show.LengthUnit.FromHeld(p.NetHeadM));

        Axis AxisOver(string title, UnitOfMeasure unit, Func<HeadAndFlow, double> of, double down, double up, double pixels)
        {
            var centre = of(site);
            var (lowest, highest) = corners.Count > 0 ? (corners.Min(of), corners.Max(of)) : (centre / 10, centre * 10);
            var low = Math.Min(Math.Max(lowest * 0.8, centre / down), points.Select(of).DefaultIfEmpty(centre).Min() * 0.7);
            var high = Math.Max(Math.Min(highest * 1.25, centre * up), points.Select(of).DefaultIfEmpty(centre).Max() * 1.5);
            return Axis.Log(title, unit.FromHeld(low), unit.FromHeld(high), Math.Log10(high / low) * 100 < pixels);
        }
    }

    // Best where fewest other ranges lie underneath, then near the top of the shape.
    private static IEnumerable<LabelSpot> SpotsWithin(IReadOnlyList<Point> outline, IReadOnlyList<IReadOnlyList<Point>> others, string text, TextStyle style)
    {
        var half = TextMeasure.Width(text, style) / 2;
        var (left, right) = (outline.Min(p => p.X) + half + 4, outline.Max(p => p.X) - half - 4);
        var (top, bottom) = (outline.Min(p => p.Y) + (style.Size * 1.1), outline.Max(p => p.Y) - (style.Size * 0.5));
        const int across = 10, down = 8;
        var found = new List<(double Cost, LabelSpot Spot)>();
        for (var i = 0; i <= across; i++)
        {
            for (var k = 0; k <= down; k++)
            {
                var at = new Point(left + ((right - left) * i / across), top + ((bottom - top) * k / down));
                var middle = at.Y - (style.Size * 0.3);
                var (above, below) = (at.Y - (style.Size * 0.9), at.Y + (style.Size * 0.35));
                if (!ClipPolygon.Contains(outline, new Point(at.X - half - 2, above)) || !ClipPolygon.Contains(outline, new Point(at.X + half + 2, above))
                    || !ClipPolygon.Contains(outline, new Point(at.X - half - 2, below)) || !ClipPolygon.Contains(outline, new Point(at.X + half + 2, below)))
                {
                    continue;
                }

                var under = others.Count(o => ClipPolygon.Contains(o, new Point(at.X, middle)));
                found.Add(((under * 10) + (k * 0.3) + (Math.Abs(i - (across / 2.0)) * 0.1), new LabelSpot(at, TextAnchor.Middle)));
            }
        }

        return found.OrderBy(f => f.Cost).Select(f => f.Spot).DefaultIfEmpty(
            new LabelSpot(new Point((outline.Min(p => p.X) + outline.Max(p => p.X)) / 2, (outline.Min(p => p.Y) + outline.Max(p => p.Y)) / 2), TextAnchor.Middle));
    }

    private static string Describe(EnvelopeInput input, UnitDisplay show)
    {
        var chosen = input.Shapes.FirstOrDefault(s => s.IsChosen);
        var inside = input.Shapes.Where(s => ClipPolygon.Contains([.. s.Corners.Select(Log)], Log(input.Site))).Select(s => s.Name).ToList();
        return $"Head and flow ranges of {string.Join(", ", input.Shapes.Select(s => s.Name))}. One unit of this site takes {show.Flow(input.Site.FlowM3PerS)} under {show.Length(input.Site.NetHeadM)} of net head; "
            + (inside.Count > 0 ? "that lies within the range of " + string.Join(", ", inside) + "." : "that lies within none of them.")
            + (chosen is null ? "" : $" The type of this study is {chosen.Name}.");

        static Point Log(HeadAndFlow p) => new(Math.Log(Math.Max(p.FlowM3PerS, 1e-9)), Math.Log(Math.Max(p.NetHeadM, 1e-9)));
    }
}
