using HeadToWatts.Basis.Units;
using HeadToWatts.Drawings.Axes;
using HeadToWatts.Drawings.Canvas;
using HeadToWatts.Drawings.Layout;

namespace HeadToWatts.Drawings;

/// <summary>Where the water goes at one point of the flow-duration curve.</summary>
/// <param name="Exceedance">Share of the time with at least this flow, 0 to 1.</param>
/// <param name="TurbineFlowM3PerS">Through the turbines.</param>
/// <param name="BelowMinimumFlowM3PerS">Too little for the turbines to run on.</param>
/// <param name="SpilledFlowM3PerS">Passed by because the turbines are full.</param>
/// <param name="ReservedFlowM3PerS">Left in the stream, or delivered before the turbines.</param>
public readonly record struct FlowShare(
    double Exceedance, double TurbineFlowM3PerS, double BelowMinimumFlowM3PerS, double SpilledFlowM3PerS, double ReservedFlowM3PerS)
{
    /// <summary>What may be used: all but the reserved flow.</summary>
    public double UsableFlowM3PerS => TurbineFlowM3PerS + BelowMinimumFlowM3PerS + SpilledFlowM3PerS;

    /// <summary>The whole flow.</summary>
    public double TotalFlowM3PerS => UsableFlowM3PerS + ReservedFlowM3PerS;
}

/// <summary>What the flow-duration chart shows.</summary>
/// <param name="Shares">Points in the order of rising exceedance; two at one exceedance make a step.</param>
/// <param name="DesignFlowM3PerS">Full flow of all units together.</param>
/// <param name="DesignExceedance">Share of the time with at least the design flow to use.</param>
/// <param name="LeastFlowM3PerS">Least flow that one unit runs on; 0 when it runs on any.</param>
/// <param name="DryNote">Said where there is no flow, as "canal dry, 15 Oct to 1 Apr"; null when unknown.</param>
/// <param name="ReservedName">What the reserved part is called.</param>
public sealed record FlowDurationInput(
    IReadOnlyList<FlowShare> Shares,
    double DesignFlowM3PerS,
    double DesignExceedance,
    double LeastFlowM3PerS,
    string? DryNote = null,
    string ReservedName = "reserved");

/// <summary>
/// The flow-duration curve with what goes through the turbines, is spilled, is reserved, and is too little to use. Reserved
/// flow lies on top, so that design flow and least flow can be read on the axis.
/// </summary>
public static partial class FlowDurationChart
{
    // A flood of many times the design flow would press the part that matters flat against the axis.
    private const double HighestShownDesignFlows = 3;

    /// <summary>Draws the chart.</summary>
    /// <exception cref="ArgumentException">There are fewer than two points.</exception>
    public static Drawing Draw(FlowDurationInput input, UnitDisplay show, DrawingSize size)
    {
        ArgumentNullException.ThrowIfNull(input);
        ArgumentNullException.ThrowIfNull(show);
        ArgumentNullException.ThrowIfNull(size);
        if (input.Shares.Count < 2)
            throw new ArgumentException("A curve needs two points.", nameof(input));

        var unit = show.FlowUnit;
        var peak = input.Shares.Max(s => s.TotalFlowM3PerS);
        var atDesign = input.Shares.MinBy(s => Math.Abs(s.UsableFlowM3PerS - input.DesignFlowM3PerS));
        var limit = HighestShownDesignFlows * (input.DesignFlowM3PerS + atDesign.ReservedFlowM3PerS);
        var isCut = input.DesignFlowM3PerS > 0 && peak > limit * 1.2;
        var highest = Math.Max(isCut ? limit : peak, input.DesignFlowM3PerS * 1.08);
        var x = Axis.Linear("percent of the time exceeded", 0, 100, ChartFrame.HorizontalIntervals(size, 3) >= 10 ? 10 : 5);
        var y = Axis.Linear("flow, " + unit.Symbol, 0, highest > 0 ? unit.FromHeld(highest) : 1, ChartFrame.VerticalIntervals(size));
        var frame = ChartFrame.Begin(size, x, y);

        var zero = Level(input.Shares, _ => 0);
        var turbine = Level(input.Shares, s => s.TurbineFlowM3PerS);
        var running = Level(input.Shares, s => s.TurbineFlowM3PerS + s.BelowMinimumFlowM3PerS);
        var usable = Level(input.Shares, s => s.UsableFlowM3PerS);
        var total = Level(input.Shares, s => s.TotalFlowM3PerS);

        Area(turbine, zero, new Fill(InkRole.WaterFill));
        Area(running, turbine, new Fill(InkRole.Plum, 0.22));
        Area(usable, running, new Fill(InkRole.Grid));
        Area(total, usable, new Fill(InkRole.Green, 0.22));
        frame.Curve(Simplify.Curve(usable), new Stroke(InkRole.Water, 2.2));
        if (HasArea(total, usable))
            frame.Curve(Simplify.Curve(total), new Stroke(InkRole.Green, 1.2));

        var designY = frame.AtY(unit.FromHeld(input.DesignFlowM3PerS));
        LevelLine(designY, new Stroke(InkRole.Ochre, 1.4));
        var least = input.LeastFlowM3PerS > 0 && input.LeastFlowM3PerS < input.DesignFlowM3PerS;
        var leastY = frame.AtY(unit.FromHeld(input.LeastFlowM3PerS));
        if (least)
            LevelLine(leastY, new Stroke(InkRole.Soft, 1, Dash.Dashed));

        if (isCut)
        {
            // Beside the place where the curve leaves the picture.
            var leaves = total.Last(p => p.Y <= frame.Top).X;
            var line = size.Type.Label;
            frame.Labels.TryPlace(frame.Canvas, "up to " + Wording.Trimmed(show.Flow(peak)), frame.LabelStyle(InkRole.Soft), [
                new LabelSpot(new Point(leaves + (line * 0.8), frame.Top + line)),
                new LabelSpot(new Point(leaves + (line * 2), frame.Top + line)),
                new LabelSpot(new Point(leaves + (line * 4), frame.Top + line)),
            ]);
        }

        AreaLabel(turbine, zero, "through the turbine", frame.StrongStyle(InkRole.Water));
        var designText = "design flow " + Wording.Trimmed(show.Flow(input.DesignFlowM3PerS));
        PlaceFirst([designText + ", exceeded " + Wording.Share(input.DesignExceedance), designText], frame.LabelStyle(InkRole.Ochre), designY);
        if (least)
            PlaceFirst(["least flow " + Wording.Trimmed(show.Flow(input.LeastFlowM3PerS))], frame.LabelStyle(InkRole.Soft), leastY);
        AreaLabel(usable, running, "spilled", frame.LabelStyle(InkRole.Soft));
        AreaLabel(total, usable, input.ReservedName, frame.LabelStyle(InkRole.Green));
        AreaLabel(running, turbine, "below least flow", frame.LabelStyle(InkRole.Plum));
        DryLabel();
        frame.HoverBands(Hovers(input.Shares, input.ReservedName, show, frame));
        return frame.Canvas.Finish("Flow-duration curve", Describe(input, show), size.Width, size.Height);

        IReadOnlyList<Point> Level(IReadOnlyList<FlowShare> shares, Func<FlowShare, double> flow) =>
            [.. shares.Select(s => new Point(frame.AtX(s.Exceedance * 100), Math.Max(frame.Top, frame.AtY(unit.FromHeld(flow(s))))))];

        void Area(IReadOnlyList<Point> upper, IReadOnlyList<Point> lower, Fill fill)
        {
            if (HasArea(upper, lower))
                frame.Canvas.Polygon([.. Simplify.Curve(upper), .. Simplify.Curve(lower).Reverse()], new Paint(fill, null));
        }

        void LevelLine(double at, Stroke stroke)
        {
            Point[] ends = [new(frame.Left, at), new(frame.Right, at)];
            frame.Canvas.Line(ends[0], ends[1], stroke);
            frame.Labels.AvoidLines(ends, 0.5);
        }

        void PlaceFirst(IEnumerable<string> texts, TextStyle style, double at)
        {
            foreach (var text in texts)
            {
                if (frame.Labels.TryPlace(frame.Canvas, text, style, Spots.AlongLevel(frame.Left, frame.Right, at, style.Size), style.Size * 2))
                    return;
            }
        }

        void AreaLabel(IReadOnlyList<Point> upper, IReadOnlyList<Point> lower, string text, TextStyle style)
        {
            if (!HasArea(upper, lower))
                return;
            var inside = Spots.BetweenCurves(Simplify.Curve(upper), Simplify.Curve(lower), text, style).ToList();
            if (inside.Count > 0 && frame.Labels.TryPlace(frame.Canvas, text, style with { Halo = false }, inside, 0.5))
                return;
            OutsideLabel(upper, lower, text, style);
        }

        // No room within: the label stands to the upper right of the thickest part, a hairline leads to it.
        void OutsideLabel(IReadOnlyList<Point> upper, IReadOnlyList<Point> lower, string text, TextStyle style)
        {
            var thickest = Enumerable.Range(0, upper.Count).MaxBy(i => Math.Max(0, lower[i].Y - upper[i].Y));
            var middle = new Point(upper[thickest].X, (upper[thickest].Y + lower[thickest].Y) / 2);
            foreach (var (dx, dy) in new[] { (22.0, -26.0), (30, -14), (40, -40), (56, -24), (60, -60), (14, -50), (80, -30) })
            {
                var end = new Point(middle.X + dx, middle.Y + dy);
                if (frame.Labels.TryPlace(frame.Canvas, text, style, [new LabelSpot(new Point(end.X + 3, end.Y + (style.Size * 0.35)))], style.Size * 0.2))
                {
                    frame.Canvas.Line(middle, end, new Stroke(style.Role, 0.8));
                    return;
                }
            }
        }

        void DryLabel()
        {
            var from = input.Shares.Where(s => s.TotalFlowM3PerS <= 0).Select(s => s.Exceedance).DefaultIfEmpty(1).Min();
            if (from > 0.97)
                return;
            var text = input.DryNote ?? "no flow";
            var (left, right) = (frame.AtX(from * 100), frame.Right);
            var lift = size.Type.Label;
            frame.Labels.TryPlace(frame.Canvas, text, frame.LabelStyle(InkRole.Soft),
                [
                    new LabelSpot(new Point((left + right) / 2, frame.Bottom - (lift * 0.7)), TextAnchor.Middle),
                    new LabelSpot(new Point(right - 2, frame.Bottom - (lift * 0.7)), TextAnchor.End),
                    new LabelSpot(new Point(right - 2, frame.Bottom - (lift * 2)), TextAnchor.End),
                ]);
        }
    }

    private static bool HasArea(IReadOnlyList<Point> upper, IReadOnlyList<Point> lower)
    {
        for (var i = 0; i < upper.Count; i++)
        {
            if (lower[i].Y - upper[i].Y > 0.4)
                return true;
        }

        return false;
    }

    private static List<(Point Dot, string Text)> Hovers(IReadOnlyList<FlowShare> shares, string reservedName, UnitDisplay show, ChartFrame frame)
    {
        const int bands = 40;
        var places = new List<(Point Dot, string Text)>();
        for (var band = 0; band <= bands; band++)
        {
            var share = At(shares, (double)band / bands);
            var parts = new List<string> { "through the turbine " + show.Flow(share.TurbineFlowM3PerS) };
            Add("spilled", share.SpilledFlowM3PerS);
            Add(reservedName, share.ReservedFlowM3PerS);
            Add("below least flow", share.BelowMinimumFlowM3PerS);
            places.Add((
                new Point(frame.AtX(share.Exceedance * 100), Math.Max(frame.Top, frame.AtY(show.FlowUnit.FromHeld(share.UsableFlowM3PerS)))),
                $"{Wording.Share(share.Exceedance)} of the time at least {show.Flow(share.TotalFlowM3PerS)}: {string.Join(", ", parts)}"));

            void Add(string name, double flowM3PerS)
            {
                if (flowM3PerS > 0)
                    parts.Add(name + " " + show.Flow(flowM3PerS));
            }
        }

        return places;
    }

    private static FlowShare At(IReadOnlyList<FlowShare> shares, double exceedance)
    {
        if (exceedance <= shares[0].Exceedance)
            return shares[0] with { Exceedance = exceedance };
        for (var i = 1; i < shares.Count; i++)
        {
            if (shares[i].Exceedance < exceedance)
                continue;
            var (a, b) = (shares[i - 1], shares[i]);
            var t = b.Exceedance > a.Exceedance ? (exceedance - a.Exceedance) / (b.Exceedance - a.Exceedance) : 1;
            return new FlowShare(
                exceedance,
                Mix(a.TurbineFlowM3PerS, b.TurbineFlowM3PerS),
                Mix(a.BelowMinimumFlowM3PerS, b.BelowMinimumFlowM3PerS),
                Mix(a.SpilledFlowM3PerS, b.SpilledFlowM3PerS),
                Mix(a.ReservedFlowM3PerS, b.ReservedFlowM3PerS));

            double Mix(double from, double to) => from + (t * (to - from));
        }

        return shares[^1] with { Exceedance = exceedance };
    }

    private static string Describe(FlowDurationInput input, UnitDisplay show)
    {
        var first = input.Shares[0];
        var last = input.Shares[^1];
        var running = input.Shares.Where(s => s.TurbineFlowM3PerS > 0).Select(s => s.Exceedance).DefaultIfEmpty(0).Max();
        var text = $"The flow runs from {show.Flow(first.TotalFlowM3PerS)} at its highest to {show.Flow(last.TotalFlowM3PerS)} at its lowest. "
            + $"The design flow {show.Flow(input.DesignFlowM3PerS)} is exceeded {Wording.Share(input.DesignExceedance)} of the time; the turbines run {Wording.Share(running)} of the time.";
        if (input.LeastFlowM3PerS > 0)
            text += $" The least flow they run on is {show.Flow(input.LeastFlowM3PerS)}.";
        var reserved = input.Shares.Max(s => s.ReservedFlowM3PerS);
        if (reserved > 0)
            text += $" Up to {show.Flow(reserved)} is {input.ReservedName}.";
        return input.DryNote is null ? text : text + " " + char.ToUpperInvariant(input.DryNote[0]) + input.DryNote[1..] + ".";
    }
}
