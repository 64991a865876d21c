using HeadToWatts.Basis.Units;
using HeadToWatts.Drawings.Axes;
using HeadToWatts.Drawings.Canvas;
using HeadToWatts.Drawings.Layout;

namespace HeadToWatts.Drawings;

/// <summary>Energy of one month of the year.</summary>
/// <param name="Month">1 to 12.</param>
/// <param name="EnergyKwh">Energy in a mean year.</param>
/// <param name="LowEnergyKwh">Energy in a dry year, when known.</param>
/// <param name="HighEnergyKwh">Energy in a wet year, when known.</param>
public readonly record struct MonthEnergy(int Month, double EnergyKwh, double? LowEnergyKwh = null, double? HighEnergyKwh = null);

/// <summary>What the months chart shows.</summary>
/// <param name="Months">The months in the order shown.</param>
/// <param name="RangeName">What the range from low to high is, as "10 to 90 % of the years"; null without a range.</param>
public sealed record MonthsInput(IReadOnlyList<MonthEnergy> Months, string? RangeName = null);

/// <summary>Energy by month.</summary>
public static partial class MonthsChart
{
    private static readonly string[] Short = ["Jan", "Feb", "Mar", "Apr", "May", "Jun", "Jul", "Aug", "Sep", "Oct", "Nov", "Dec"];
    private static readonly string[] Full =
        ["January", "February", "March", "April", "May", "June", "July", "August", "September", "October", "November", "December"];

    /// <summary>Draws the chart.</summary>
    /// <exception cref="ArgumentException">There is no month.</exception>
    public static Drawing Draw(MonthsInput input, DrawingSize size)
    {
        ArgumentNullException.ThrowIfNull(input);
        ArgumentNullException.ThrowIfNull(size);
        if (input.Months.Count == 0)
            throw new ArgumentException("There is no month.", nameof(input));

        var highest = input.Months.Max(m => Math.Max(m.EnergyKwh, m.HighEnergyKwh ?? 0));
        var mega = highest >= 10_000;
        var unit = mega ? "MWh" : "kWh";
        var frame = ChartFrame.Begin(
            size,
            Axis.Linear("", 0, input.Months.Count, input.Months.Count * 2).WithoutTicks(),
            Axis.Linear("energy of the month, " + unit, 0, highest > 0 ? Shown(highest) * 1.06 : 1, ChartFrame.VerticalIntervals(size)));
        var type = size.Type;
        var slot = (frame.Right - frame.Left) / input.Months.Count;
        var bar = slot * 0.66;
        var initials = slot < TextMeasure.Width("May", type.Tick) + 4;

        for (var i = 0; i < input.Months.Count; i++)
        {
            var month = input.Months[i];
            var centre = frame.Left + ((i + 0.5) * slot);
            var top = frame.AtY(Shown(month.EnergyKwh));
            frame.Canvas.BeginMark(Hover(month));
            if (frame.Bottom - top > 0)
                frame.Canvas.Rectangle(new Point(centre - (bar / 2), top), bar, frame.Bottom - top, Paint.Filled(InkRole.Water));
            if (month is { LowEnergyKwh: { } low, HighEnergyKwh: { } high } && high > low)
                Whisker(centre, frame.AtY(Shown(low)), frame.AtY(Shown(high)), bar * 0.28);
            frame.Canvas.EndMark();
            var name = Short[month.Month - 1];
            frame.Labels.Fix(frame.Canvas, new Point(centre, frame.Bottom + (type.Tick * 1.4)), initials ? name[..1] : name, new TextStyle(InkRole.Soft, type.Tick, TextAnchor.Middle));
        }

        frame.Canvas.Line(new Point(frame.Left, frame.Bottom), new Point(frame.Right, frame.Bottom), new Stroke(InkRole.Soft));
        if (input.RangeName is { } range)
            frame.Labels.TryPlace(frame.Canvas, "upright line: " + range, frame.LabelStyle(InkRole.Soft), [new LabelSpot(new Point(size.Width - 4, frame.Top - (type.Label * 0.85)), TextAnchor.End)]);
        Dry();
        return frame.Canvas.Finish("Energy by month", Describe(), size.Width, size.Height);

        double Shown(double energyKwh) => mega ? energyKwh / 1000 : energyKwh;

        // Card-coloured rim so that the line is seen over the bar as well as over the card.
        void Whisker(double x, double low, double high, double half)
        {
            frame.Canvas.Line(new Point(x, low), new Point(x, high), new Stroke(InkRole.Card, 3.5));
            frame.Canvas.Line(new Point(x, low), new Point(x, high), new Stroke(InkRole.Ink, 1.4));
            foreach (var end in new[] { low, high })
                frame.Canvas.Line(new Point(x - half, end), new Point(x + half, end), new Stroke(InkRole.Ink, 1.4));
        }

        string Hover(MonthEnergy m) => Full[m.Month - 1] + ": " + UnitDisplay.Energy(m.EnergyKwh)
            + (m is { LowEnergyKwh: { } low, HighEnergyKwh: { } high } ? $", {UnitDisplay.Energy(low)} to {UnitDisplay.Energy(high)}" : "");

        // An empty stretch is a fact, not a fault of the chart: say so.
        void Dry()
        {
            for (var i = 0; i < input.Months.Count; i++)
            {
                var from = i;
                while (i < input.Months.Count && input.Months[i].EnergyKwh <= 0)
                    i++;
                if (i == from)
                    continue;
                var style = frame.LabelStyle(InkRole.Soft);
                var centre = frame.Left + ((from + i) / 2.0 * slot);
                if ((i - from) * slot > TextMeasure.Width("none", style))
                    frame.Labels.TryPlace(frame.Canvas, "none", style, [new LabelSpot(new Point(centre, frame.Bottom - (type.Label * 0.6)), TextAnchor.Middle)]);
            }
        }

        string Describe()
        {
            var best = input.Months.MaxBy(m => m.EnergyKwh);
            var least = input.Months.MinBy(m => m.EnergyKwh);
            return $"{UnitDisplay.Energy(input.Months.Sum(m => m.EnergyKwh))} in a mean year. The most is {UnitDisplay.Energy(best.EnergyKwh)} in {Full[best.Month - 1]}, the least {UnitDisplay.Energy(least.EnergyKwh)} in {Full[least.Month - 1]}.";
        }
    }
}
