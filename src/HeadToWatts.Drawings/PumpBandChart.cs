using HeadToWatts.Basis.Units;
using HeadToWatts.Drawings.Axes;
using HeadToWatts.Drawings.Canvas;
using HeadToWatts.Drawings.Layout;

namespace HeadToWatts.Drawings;

/// <summary>One estimate of a pump as turbine.</summary>
/// <param name="Name">Whose it is.</param>
/// <param name="FlowM3PerS">Flow.</param>
/// <param name="HeadM">Head.</param>
public readonly record struct PumpBandPoint(string Name, double FlowM3PerS, double HeadM);

/// <summary>What the chart of a pump as turbine shows.</summary>
/// <param name="Estimates">One for each correlation.</param>
/// <param name="ScatterRatio">How far measured machines lie from any of them.</param>
/// <param name="Site">Flow of one unit and net head of the site.</param>
/// <param name="IsPumpToLookFor">True when the estimates are of the pump, false when they are of the turbine.</param>
public sealed record PumpBandInput(IReadOnlyList<PumpBandPoint> Estimates, double ScatterRatio, PumpBandPoint Site, bool IsPumpToLookFor);

/// <summary>Flow and head of a pump as turbine by several correlations, with the field in which measured machines lie.</summary>
public static partial class PumpBandChart
{
    /// <summary>Draws the chart.</summary>
    /// <exception cref="ArgumentException">There is no estimate.</exception>
    public static Drawing Draw(PumpBandInput input, UnitDisplay show, DrawingSize size)
    {
        ArgumentNullException.ThrowIfNull(input);
        ArgumentNullException.ThrowIfNull(show);
        ArgumentNullException.ThrowIfNull(size);
        if (input.Estimates.Count == 0)
            throw new ArgumentException("A band needs an estimate.", nameof(input));
        var (flow, length) = (show.FlowUnit, show.LengthUnit);
        var (s, all) = (input.ScatterRatio, input.Estimates.Append(input.Site).ToList());
        var low = new PumpBandPoint("", input.Estimates.Min(e => e.FlowM3PerS) * (1 - s), input.Estimates.Min(e => e.HeadM) * (1 - s));
        var high = new PumpBandPoint("", input.Estimates.Max(e => e.FlowM3PerS) * (1 + s), input.Estimates.Max(e => e.HeadM) * (1 + s));
        var frame = ChartFrame.Begin(
            size,
            Axis.Linear("flow, " + flow.Symbol, 0, flow.FromHeld(Math.Max(high.FlowM3PerS, all.Max(p => p.FlowM3PerS))) * 1.05, ChartFrame.HorizontalIntervals(size)),
            Axis.Linear("head, " + length.Symbol, 0, length.FromHeld(Math.Max(high.HeadM, all.Max(p => p.HeadM))) * 1.05, ChartFrame.VerticalIntervals(size)));
        var a = At(low);
        var b = At(high);
        frame.Canvas.Rectangle(new Point(a.X, b.Y), b.X - a.X, a.Y - b.Y, Paint.Filled(InkRole.Ochre, 0.12));
        frame.Labels.TryPlace(frame.Canvas, $"± {UnitDisplay.Percent(s)} around them all", frame.LabelStyle(InkRole.Soft), [new LabelSpot(new Point(a.X + 4, a.Y - 4)), new LabelSpot(new Point(a.X + 4, b.Y + (size.Type.Label * 1.1)))]);
        foreach (var e in input.Estimates)
            Dot(e, InkRole.Ochre, 4);
        Dot(input.Site, InkRole.Water, 5);
        foreach (var e in input.Estimates.OrderBy(e => e.FlowM3PerS))
            Name(e, InkRole.Ochre);
        Name(input.Site, InkRole.Water);
        var what = input.IsPumpToLookFor ? "The pump to look for" : "The pump as a turbine, at its best";
        return frame.Canvas.Finish(
            what,
            $"{what}: {string.Join("; ", input.Estimates.Select(e => $"{e.Name} {show.Flow(e.FlowM3PerS)} and {show.Length(e.HeadM)}"))}. {input.Site.Name}: {show.Flow(input.Site.FlowM3PerS)} and {show.Length(input.Site.HeadM)}.",
            size.Width,
            size.Height);

        Point At(PumpBandPoint p) => new(frame.AtX(flow.FromHeld(p.FlowM3PerS)), frame.AtY(length.FromHeld(p.HeadM)));

        void Dot(PumpBandPoint p, InkRole role, double radius)
        {
            var at = At(p);
            frame.Canvas.BeginMark($"{p.Name}: {show.Flow(p.FlowM3PerS)} and {show.Length(p.HeadM)}");
            frame.Canvas.Circle(at, radius, new Paint(new Fill(role), new Stroke(InkRole.Card, 1.5)));
            frame.Canvas.EndMark();
            frame.Labels.Avoid(LabelBox.Of(new Point(at.X - radius - 1, at.Y - radius - 1), (2 * radius) + 2, (2 * radius) + 2));
        }

        void Name(PumpBandPoint p, InkRole role)
        {
            var at = At(p);
            var line = size.Type.Label;
            var spots = new List<LabelSpot>();
            foreach (var dy in new[] { 0.35, -0.6, 1.3, -1.5, 2.2, -2.5, 3.2 })
            {
                spots.Add(new LabelSpot(new Point(at.X + 8, at.Y + (dy * line))));
                spots.Add(new LabelSpot(new Point(at.X - 8, at.Y + (dy * line)), TextAnchor.End));
            }

            frame.Labels.TryPlace(frame.Canvas, p.Name, frame.LabelStyle(role), spots);
        }
    }
}
