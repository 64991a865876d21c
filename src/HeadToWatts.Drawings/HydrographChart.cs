using HeadToWatts.Basis.Units;
using HeadToWatts.Drawings.Axes;
using HeadToWatts.Drawings.Canvas;
using HeadToWatts.Drawings.Layout;
using HeadToWatts.FlowRecords.Statistics;

namespace HeadToWatts.Drawings;

/// <summary>What the hydrograph shows.</summary>
/// <param name="Days">The days of the year, those without a flow left out.</param>
/// <param name="FirstMonth">Month in which the year begins, 1 or 10.</param>
/// <param name="DesignFlowM3PerS">Full flow of all units together.</param>
public sealed record HydrographInput(IReadOnlyList<DayOfYearBand> Days, int FirstMonth, double DesignFlowM3PerS);

/// <summary>Flow through the year: the median of each day over the years, and the band that eight years in ten keep to.</summary>
public static partial class HydrographChart
{
    // A flood of many times the design flow would press the part that matters flat against the axis.
    private const double HighestShownDesignFlows = 4;

    /// <summary>Draws the chart.</summary>
    /// <exception cref="ArgumentException">There is no day.</exception>
    public static Drawing Draw(HydrographInput input, UnitDisplay show, DrawingSize size)
    {
        ArgumentNullException.ThrowIfNull(input);
        ArgumentNullException.ThrowIfNull(show);
        ArgumentNullException.ThrowIfNull(size);
        if (input.Days.Count == 0)
            throw new ArgumentException("There is no day.", nameof(input));

        var unit = show.FlowUnit;
        var days = input.Days.Select(d => (Place: YearAxis.Place(d.Month, d.Day, input.FirstMonth), Day: d)).OrderBy(d => d.Place).ToList();
        var peak = input.Days.Max(d => d.HighFlowM3PerS);
        var limit = HighestShownDesignFlows * input.DesignFlowM3PerS;
        var isCut = input.DesignFlowM3PerS > 0 && peak > limit * 1.2;
        var highest = Math.Max(isCut ? limit : peak, input.DesignFlowM3PerS * 1.08);
        var frame = ChartFrame.Begin(size, YearAxis.Make(), Axis.Linear("flow, " + unit.Symbol, 0, highest > 0 ? unit.FromHeld(highest) : 1, ChartFrame.VerticalIntervals(size)));
        YearAxis.Months(frame, input.FirstMonth);

        IReadOnlyList<Point> median = [];
        foreach (var stretch in Stretches(days))
        {
            var high = Level(stretch, d => d.HighFlowM3PerS);
            var low = Level(stretch, d => d.LowFlowM3PerS);
            frame.Canvas.Polygon([.. Simplify.Curve(high), .. Simplify.Curve(low).Reverse()], Paint.Filled(InkRole.WaterFill));
            var line = Level(stretch, d => d.MedianFlowM3PerS);
            frame.Curve(Simplify.Curve(line), new Stroke(InkRole.Water, 2));
            if (line.Count > median.Count)
                median = line;
        }

        var designY = frame.AtY(unit.FromHeld(input.DesignFlowM3PerS));
        Point[] design = [new(frame.Left, designY), new(frame.Right, designY)];
        frame.Canvas.Line(design[0], design[1], new Stroke(InkRole.Ochre, 1.4));
        frame.Labels.AvoidLines(design, 0.5);
        var style = frame.LabelStyle(InkRole.Ochre);
        frame.Labels.TryPlace(frame.Canvas, "design flow " + Wording.Trimmed(show.Flow(input.DesignFlowM3PerS)), style, Spots.AlongLevel(frame.Left, frame.Right, designY, style.Size), style.Size * 2);
        frame.Labels.TryPlace(frame.Canvas, "median", frame.StrongStyle(InkRole.Water), Spots.AlongCurve(Simplify.Curve(median), size.Type.Strong), size.Type.Strong * 3);
        var note = isCut ? $"band: eight years in ten; up to {Wording.Trimmed(show.Flow(peak))}" : "band: eight years in ten";
        frame.Labels.TryPlace(frame.Canvas, note, frame.LabelStyle(InkRole.Soft), [new LabelSpot(new Point(size.Width - 4, frame.Top - (size.Type.Label * 0.85)), TextAnchor.End)]);
        frame.HoverBands([.. days.Where((_, i) => i % 5 == 2 || days.Count < 60).Select(d => (
            new Point(frame.AtX(d.Place + 0.5), Math.Max(frame.Top, frame.AtY(unit.FromHeld(d.Day.MedianFlowM3PerS)))),
            $"{YearAxis.Name(d.Place, input.FirstMonth)}: {show.Flow(d.Day.MedianFlowM3PerS)}, {show.Flow(d.Day.LowFlowM3PerS)} to {show.Flow(d.Day.HighFlowM3PerS)} in eight years of ten"))]);
        return frame.Canvas.Finish("Flow through the year", Describe(), size.Width, size.Height);

        IReadOnlyList<Point> Level(IReadOnlyList<(int Place, DayOfYearBand Day)> stretch, Func<DayOfYearBand, double> flow) =>
            [.. stretch.Select(d => new Point(frame.AtX(d.Place + 0.5), Math.Clamp(frame.AtY(unit.FromHeld(flow(d.Day))), frame.Top, frame.Bottom)))];

        string Describe()
        {
            var most = input.Days.MaxBy(d => d.MedianFlowM3PerS)!;
            var least = input.Days.MinBy(d => d.MedianFlowM3PerS)!;
            return $"The median flow is highest, {show.Flow(most.MedianFlowM3PerS)}, about {Date(most)}, and lowest, {show.Flow(least.MedianFlowM3PerS)}, about {Date(least)}.";
        }

        string Date(DayOfYearBand d) => YearAxis.Name(YearAxis.Place(d.Month, d.Day, input.FirstMonth), input.FirstMonth);
    }

    // A day without a flow in any year breaks the line; it is not bridged.
    private static IEnumerable<IReadOnlyList<(int Place, DayOfYearBand Day)>> Stretches(List<(int Place, DayOfYearBand Day)> days)
    {
        var from = 0;
        for (var i = 1; i <= days.Count; i++)
        {
            if (i < days.Count && days[i].Place == days[i - 1].Place + 1)
                continue;
            if (i - from > 1)
                yield return days.GetRange(from, i - from);
            from = i;
        }
    }
}
