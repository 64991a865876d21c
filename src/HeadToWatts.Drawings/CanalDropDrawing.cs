using HeadToWatts.Basis.Units;
using HeadToWatts.Drawings.Axes;
using HeadToWatts.Drawings.Canvas;
using HeadToWatts.Drawings.Layout;
using HeadToWatts.Studies;
using HeadToWatts.Studies.Inputs;
using HeadToWatts.Studies.Results;

namespace HeadToWatts.Drawings;

/// <summary>
/// A section along the canal through its drop with the plant stopped and the full flow going over it: bed, water line drawn down
/// to the brink, the jump in the basin, normal and critical depth, and the energy line.
/// </summary>
public static class CanalDropDrawing
{
    /// <summary>Draws the canal of a study; null where none is given or a side is full.</summary>
    public static Drawing? Draw(StudyResult result, UnitDisplay show, DrawingSize size)
    {
        ArgumentNullException.ThrowIfNull(result);
        ArgumentNullException.ThrowIfNull(show);
        ArgumentNullException.ThrowIfNull(size);
        return result is { Canal: { AtFull: { Upstream.NormalDepthM: { } above, Downstream.NormalDepthM: { } below } } canal, Input.Head.Canal: { } given }
            ? Draw(canal, given, above, below, show, size)
            : null;
    }

    private static Drawing Draw(CanalResult canal, CanalInput given, double aboveM, double belowM, UnitDisplay show, DrawingSize size)
    {
        var unit = show.LengthUnit;
        var (up, down) = (canal.AtFull.Upstream, canal.AtFull.Downstream);
        var (bed1, bed2) = (given.Upstream.BedElevationM, given.Downstream.BedElevationM);
        var floor = given.Basin?.FloorElevationM ?? bed2;
        var basinM = given.Basin?.LengthM ?? 6 * belowM;
        var reachM = Math.Clamp(canal.DrawdownLengthM, 4 * aboveM, 14 * aboveM);
        var (left, right) = (-reachM, basinM + (0.7 * reachM));
        var top = bed1 + (up.SpecificEnergyM ?? aboveM);
        var bottom = Math.Min(floor, bed2);
        var frame = ChartFrame.Begin(
            size,
            Axis.Linear("along the canal from the drop, " + unit.Symbol, unit.FromHeld(left), unit.FromHeld(right), ChartFrame.HorizontalIntervals(size), toTicks: false),
            Axis.Linear("elevation, " + unit.Symbol, unit.FromHeld(bottom - ((top - bottom) * 0.12)), unit.FromHeld(top + ((top - bottom) * 0.12)), ChartFrame.VerticalIntervals(size)));

        Point At(double x, double z) => frame.At(unit.FromHeld(Math.Clamp(x, left, right)), unit.FromHeld(z));
        double Bed1(double x) => bed1 - (given.Upstream.Canal.BedSlopeRatio * x);
        double Bed2(double x) => bed2 - (given.Downstream.Canal.BedSlopeRatio * Math.Max(0, x - basinM));

        var surface = canal.Drawdown.Count > 1
            ? canal.Drawdown.Reverse().Where(s => s.StationM >= left).Select(s => At(s.StationM, s.SurfaceElevationM)).ToList()
            : [At(left, Bed1(left) + aboveM), At(0, bed1 + aboveM)];
        if (canal.Drawdown.Count > 1)
            surface.Insert(0, At(left, Bed1(left) + aboveM));
        Point[] bedLine = [At(left, Bed1(left)), At(0, bed1), At(0, floor), At(basinM, floor), At(basinM, Bed2(basinM)), At(right, Bed2(right))];
        var fast = canal.Basin?.EntryDepthM ?? ((down.CriticalDepthM ?? belowM) * 0.5);
        var jumpEnd = Math.Min(basinM, canal.Basin?.NeededLengthM ?? (0.8 * basinM));
        var tail = bed2 + belowM;
        List<Point> falls = [At(0.12 * basinM, floor + fast), At(0.3 * basinM, floor + fast), At(0.3 * basinM + (0.6 * jumpEnd), tail), At(right, Bed2(right) + belowM)];
        frame.Canvas.Polygon([.. surface, .. falls, .. bedLine.Reverse()], Paint.Filled(InkRole.WaterFill));
        frame.Canvas.Polygon([.. bedLine, new Point(frame.Right, frame.Bottom), new Point(frame.Left, frame.Bottom)], Paint.Filled(InkRole.Ground));
        frame.Curve([.. surface, .. falls], new Stroke(InkRole.Water, 2));
        frame.Curve(bedLine, new Stroke(InkRole.Ink, 1.4));

        var energyAbove = bed1 + (up.SpecificEnergyM ?? aboveM);
        var energyBelow = bed2 + (down.SpecificEnergyM ?? belowM);
        Point[] energy = [At(left, Bed1(left) - bed1 + energyAbove), At(0, energyAbove), At(0.3 * basinM, energyAbove), At(0.3 * basinM + (0.6 * jumpEnd), energyBelow), At(right, Bed2(right) - bed2 + energyBelow)];
        frame.Curve(energy, new Stroke(InkRole.Ochre, 1.4, Dash.Dashed));
        Depth(left + (0.18 * reachM), Bed1(left + (0.18 * reachM)), aboveM, up.CriticalDepthM);
        Depth(basinM + (0.45 * reachM), Bed2(basinM + (0.45 * reachM)), belowM, down.CriticalDepthM);
        var style = frame.LabelStyle(InkRole.Ochre);
        frame.Labels.TryPlace(frame.Canvas, "energy line", style, Spots.AlongCurve(energy, style.Size, 0.15), style.Size * 3);
        if (canal.Basin is { } basin)
        {
            var text = basin.HoldsTheJump ? "the basin holds the jump" : "the basin does not hold the jump";
            frame.Labels.TryPlace(frame.Canvas, text, frame.LabelStyle(basin.HoldsTheJump ? InkRole.Soft : InkRole.Amber), [
                new LabelSpot(new Point((At(0, floor).X + At(basinM, floor).X) / 2, At(0, floor).Y + (size.Type.Label * 1.3)), TextAnchor.Middle),
                new LabelSpot(new Point(frame.Right - 4, frame.Bottom - 4), TextAnchor.End)]);
        }

        frame.HoverBands(
        [
            (At(left + (0.3 * reachM), Bed1(left + (0.3 * reachM)) + aboveM), Hover("above the drop", up)),
            (At(basinM + (0.3 * reachM), Bed2(basinM + (0.3 * reachM)) + belowM), Hover("below the drop", down)),
        ]);
        return frame.Canvas.Finish(
            "The canal through its drop, plant stopped",
            $"With {show.Flow(canal.AtFull.FlowM3PerS)}: normal depth {show.Length(aboveM)} above and {show.Length(belowM)} below; the energy line falls {show.Length(energyAbove - energyBelow)} over the drop.",
            size.Width,
            size.Height);

        string Hover(string where, HeadToWatts.Hydraulics.Canals.CanalFlowResult at) =>
            $"{where}, {show.Flow(at.FlowM3PerS)}: normal depth {show.Length(at.NormalDepthM ?? 0)}, critical {(at.CriticalDepthM is { } c ? show.Length(c) : "not reached")}, Froude number {UnitDisplay.Number(at.FroudeNumber ?? 0)}";

        void Depth(double x, double bed, double normal, double? critical)
        {
            frame.Canvas.Line(At(x, bed), At(x, bed + normal), new Stroke(InkRole.Ink, 1));
            if (critical is { } c)
                frame.Canvas.Line(At(x - (0.08 * reachM), bed + c), At(x + (0.08 * reachM), bed + c), new Stroke(InkRole.Plum, 1.2, Dash.Dotted));
            var ink = frame.LabelStyle(InkRole.Ink);
            var at = At(x, bed + (normal / 2));
            frame.Labels.TryPlace(frame.Canvas, $"normal {Wording.Trimmed(show.Length(normal))}", ink, [new LabelSpot(at with { X = at.X + 5 }), new LabelSpot(at with { X = at.X - 5 }, TextAnchor.End), new LabelSpot(new Point(at.X + 5, At(x, bed + normal).Y - 6))]);
            if (critical is { } yc)
            {
                var plum = frame.LabelStyle(InkRole.Plum);
                var spot = At(x + (0.08 * reachM), bed + yc);
                frame.Labels.TryPlace(frame.Canvas, $"critical {Wording.Trimmed(show.Length(yc))}", plum, [new LabelSpot(new Point(spot.X + 4, spot.Y + (size.Type.Label * 0.4))), new LabelSpot(new Point(spot.X + 4, spot.Y + (size.Type.Label * 1.5))), new LabelSpot(new Point(spot.X + 4, spot.Y - 6))]);
            }
        }
    }
}
