using HeadToWatts.Basis.Units;
using HeadToWatts.Drawings.Axes;
using HeadToWatts.Drawings.Canvas;
using HeadToWatts.Drawings.Layout;

namespace HeadToWatts.Drawings;

/// <summary>Heads at one place along the pipe, as levels.</summary>
/// <param name="StationM">Length of pipe from the intake.</param>
/// <param name="CentreM">The pipe's centre.</param>
/// <param name="SteadyM">Head before the trip.</param>
/// <param name="HighestM">Highest head.</param>
/// <param name="LowestM">Lowest head.</param>
/// <param name="RatedM">Head at which the pipe's rating is reached; null without a rating.</param>
public readonly record struct StopHeads(double StationM, double CentreM, double SteadyM, double HighestM, double LowestM, double? RatedM);

/// <summary>What the chart of heads along the pipe shows.</summary>
/// <param name="Places">Places from the intake to the machine.</param>
/// <param name="VapourHeadM">Pressure head at which the column parts, below 0.</param>
/// <param name="Parts">True when it does.</param>
public sealed record StopHeadsInput(IReadOnlyList<StopHeads> Places, double VapourHeadM, bool Parts);

/// <summary>Highest and lowest head along the pipe while the plant stops, with the pipe and the head of its rating.</summary>
public static partial class StopHeadsChart
{
    // Where the rating lies above the picture it is left out; a line along the edge would tell a lower one.
    private static IEnumerable<IReadOnlyList<StopHeads>> RatingWithin(IReadOnlyList<StopHeads> places, double highestM)
    {
        var stretch = new List<StopHeads>();
        foreach (var place in places)
        {
            if (place.RatedM <= highestM)
            {
                stretch.Add(place);
                continue;
            }

            if (stretch.Count > 1)
                yield return stretch;
            stretch = [];
        }

        if (stretch.Count > 1)
            yield return stretch;
    }

    /// <summary>Draws the chart.</summary>
    /// <exception cref="ArgumentException">There are fewer than two places.</exception>
    public static Drawing Draw(StopHeadsInput input, UnitDisplay show, DrawingSize size)
    {
        ArgumentNullException.ThrowIfNull(input);
        ArgumentNullException.ThrowIfNull(show);
        ArgumentNullException.ThrowIfNull(size);
        var places = input.Places;
        if (places.Count < 2)
            throw new ArgumentException("Two places at least.", nameof(input));
        var unit = show.LengthUnit;
        var low = Math.Min(places.Min(p => p.LowestM), places.Min(p => p.CentreM));
        var top = places.Max(p => p.HighestM);
        var span = Math.Max(top - low, 1e-3);

        // A rating far above everything else would press the rest flat; then it is told, not drawn.
        var rated = places.Where(p => p.RatedM is not null).Select(p => p.RatedM!.Value).DefaultIfEmpty(double.NaN).Min();
        var showsRating = rated < top + (0.8 * span);
        var high = showsRating ? Math.Max(top, rated) : top;
        var frame = ChartFrame.Begin(
            size,
            Axis.Linear("along the pipe, " + unit.Symbol, 0, unit.FromHeld(places[^1].StationM), ChartFrame.HorizontalIntervals(size), toTicks: false),
            Axis.Linear("head as level, " + unit.Symbol, unit.FromHeld(low - (0.04 * span)), unit.FromHeld(high + (0.06 * span)), ChartFrame.VerticalIntervals(size)));

        var highest = Line(p => p.HighestM);
        var lowest = Line(p => p.LowestM);
        frame.Canvas.Polygon([.. highest, .. lowest.Reverse()], Paint.Filled(InkRole.WaterFill));
        IReadOnlyList<Point> rating = [];
        foreach (var stretch in showsRating ? RatingWithin(places, high + (0.06 * span)) : [])
        {
            var line = Simplify.Curve([.. stretch.Select(p => frame.At(unit.FromHeld(p.StationM), unit.FromHeld(p.RatedM!.Value)))]);
            frame.Curve(line, new Stroke(InkRole.Ochre, 1.6, Dash.Dashed));
            if (line.Count > 1 && (rating.Count == 0 || line[^1].X - line[0].X > rating[^1].X - rating[0].X))
                rating = line;
        }

        IReadOnlyList<Point> vapour = input.Parts ? Line(p => Math.Max(p.CentreM + input.VapourHeadM, low - (0.04 * span))) : [];
        if (vapour.Count > 1)
            frame.Curve(vapour, new Stroke(InkRole.Amber, 1.4, Dash.Dashed));
        var pipe = Line(p => p.CentreM);
        var steady = Line(p => p.SteadyM);
        frame.Curve(pipe, new Stroke(InkRole.Ink, 2.4));
        frame.Curve(steady, new Stroke(InkRole.Soft, 1.2, Dash.Dashed));
        frame.Curve(lowest, new Stroke(InkRole.Plum, 1.8));
        frame.Curve(highest, new Stroke(InkRole.Water, 2.2));
        Name("highest", highest, InkRole.Water, 0.6);
        Name("lowest", lowest, InkRole.Plum, 0.5);
        Name("pipe", pipe, InkRole.Ink, 0.3);
        Name("running", steady, InkRole.Soft, 0.75);
        Name("pipe's rating", rating, InkRole.Ochre, 0.4);
        Name("vapour", vapour, InkRole.Amber, 0.2);
        if (!showsRating && rated > 0)
            frame.Labels.TryPlace(frame.Canvas, "rating not reached", frame.LabelStyle(InkRole.Soft), [new LabelSpot(new Point(size.Width - 4, frame.Top - (size.Type.Label * 0.85)), TextAnchor.End)]);
        var step = Math.Max(1, places.Count / 40);
        frame.HoverBands([.. places.Where((_, i) => i % step == 0 || i == places.Count - 1).DistinctBy(p => p.StationM).Select(p => (
            frame.At(unit.FromHeld(p.StationM), unit.FromHeld(p.HighestM)),
            $"{show.Length(p.StationM)}: pressure head {show.Length(p.LowestM - p.CentreM)} to {show.Length(p.HighestM - p.CentreM)}, {show.Length(p.SteadyM - p.CentreM)} running"))]);
        var worst = places.MaxBy(p => p.HighestM - p.CentreM);
        var least = places.MinBy(p => p.LowestM - p.CentreM);
        return frame.Canvas.Finish(
            "Heads along the pipe when the unit trips",
            $"Highest pressure head {show.Length(worst.HighestM - worst.CentreM)} at {show.Length(worst.StationM)}, lowest {show.Length(least.LowestM - least.CentreM)} at {show.Length(least.StationM)} from the intake{(input.Parts ? "; the water column parts" : "")}.",
            size.Width, size.Height);

        IReadOnlyList<Point> Line(Func<StopHeads, double> head) =>
            Simplify.Curve([.. places.Where(p => double.IsFinite(head(p))).Select(p => frame.At(unit.FromHeld(p.StationM), unit.FromHeld(head(p))))]);

        void Name(string text, IReadOnlyList<Point> line, InkRole role, double preferred)
        {
            if (line.Count < 2)
                return;
            var style = frame.LabelStyle(role);
            frame.Labels.TryPlace(frame.Canvas, text, style, Spots.AlongCurve(line, style.Size, preferred), style.Size * 3);
        }
    }
}
