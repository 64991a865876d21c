using System.Globalization;
using HeadToWatts.Basis.Units;
using HeadToWatts.Drawings.Axes;
using HeadToWatts.Drawings.Canvas;
using HeadToWatts.Drawings.Layout;
using HeadToWatts.Studies;

namespace HeadToWatts.Drawings;

/// <summary>Pumping and generation of one month.</summary>
/// <param name="Month">1 to 12.</param>
/// <param name="GeneratedKwh">Generated, kWh.</param>
/// <param name="PumpedKwh">Taken by pumps, kWh.</param>
public readonly record struct PumpingMonth(int Month, double GeneratedKwh, double PumpedKwh);

/// <summary>Months of generation upwards and pumping downwards, with the net.</summary>
public static class PumpingMonthsChart
{
    private static readonly string[] Short = ["Jan", "Feb", "Mar", "Apr", "May", "Jun", "Jul", "Aug", "Sep", "Oct", "Nov", "Dec"];

    /// <summary>Draws the chart of a study; null without pumping or without a daily record, since a curve knows no months.</summary>
    public static Drawing? Draw(StudyResult result, DrawingSize size)
    {
        ArgumentNullException.ThrowIfNull(result);
        return result.Pumping is { GeneratedByMonthKwh: { } generated, Pumping.ElectricKwh: > 0 } side
            ? Draw([.. generated.Select((g, i) => new PumpingMonth(i + 1, g, side.Pumping.ElectricByMonthKwh[i]))], size)
            : null;
    }

    /// <summary>Draws the chart.</summary>
    /// <exception cref="ArgumentException">There are not twelve months.</exception>
    public static Drawing Draw(IReadOnlyList<PumpingMonth> months, DrawingSize size)
    {
        ArgumentNullException.ThrowIfNull(months);
        ArgumentNullException.ThrowIfNull(size);
        if (months.Count != 12)
            throw new ArgumentException("A year has twelve months.", nameof(months));
        var most = months.Max(m => Math.Max(m.GeneratedKwh, m.PumpedKwh));
        var mega = most >= 10_000;
        var scale = mega ? 1000.0 : 1;
        var up = Math.Max(months.Max(m => m.GeneratedKwh), most * 0.15) / scale;
        var down = Math.Max(months.Max(m => m.PumpedKwh), most * 0.15) / scale;
        var frame = ChartFrame.Begin(
            size,
            Axis.Linear("", 0, 12, 24).WithoutTicks(),
            Axis.Linear("energy of the month, " + (mega ? "MWh" : "kWh"), -down * 1.08, Math.Max(up * 1.08, 1e-6), ChartFrame.VerticalIntervals(size)));
        var type = size.Type;
        var slot = (frame.Right - frame.Left) / 12;
        var zero = frame.AtY(0);
        var initials = slot < TextMeasure.Width("May", type.Tick) + 4;
        for (var i = 0; i < 12; i++)
        {
            var m = months[i];
            var (left, width) = (frame.Left + ((i + 0.18) * slot), slot * 0.64);
            var net = (m.GeneratedKwh - m.PumpedKwh) / scale;
            frame.Canvas.BeginMark($"{CultureInfo.InvariantCulture.DateTimeFormat.GetMonthName(m.Month)}: generated {UnitDisplay.Energy(m.GeneratedKwh)}, pumped {UnitDisplay.Energy(m.PumpedKwh)}, net {(net < 0 ? "−" : "")}{UnitDisplay.Energy(Math.Abs(net) * scale)}");
            var top = frame.AtY(m.GeneratedKwh / scale);
            if (zero - top > 0)
                frame.Canvas.Rectangle(new Point(left, top), width, zero - top, Paint.Filled(InkRole.Water));
            var foot = frame.AtY(-m.PumpedKwh / scale);
            if (foot - zero > 0)
                frame.Canvas.Rectangle(new Point(left, zero), width, foot - zero, Paint.Filled(InkRole.Ochre));
            frame.Canvas.Circle(new Point(left + (width / 2), frame.AtY(net)), Math.Max(2.6, type.Tick * 0.28), new Paint(new Fill(InkRole.Card), new Stroke(InkRole.Ink, 1.6)));
            frame.Canvas.EndMark();
            frame.Labels.Fix(frame.Canvas, new Point(left + (width / 2), frame.Bottom + (type.Tick * 1.4)), initials ? Short[i][..1] : Short[i], new TextStyle(InkRole.Soft, type.Tick, TextAnchor.Middle));
        }

        frame.Canvas.Line(new Point(frame.Left, zero), new Point(frame.Right, zero), new Stroke(InkRole.Soft));
        frame.Labels.TryPlace(frame.Canvas, size.Width < 400 ? "up generated, down pumped" : "up: generated; down: pumped; ring: the net", frame.LabelStyle(InkRole.Soft), [new LabelSpot(new Point(size.Width - 4, frame.Top - (type.Label * 0.85)), TextAnchor.End)]);
        var (all, pumped) = (months.Sum(m => m.GeneratedKwh), months.Sum(m => m.PumpedKwh));
        return frame.Canvas.Finish(
            "Pumping against generation by month",
            $"{UnitDisplay.Energy(all)} generated and {UnitDisplay.Energy(pumped)} pumped in a mean year; in {months.Count(m => m.GeneratedKwh >= m.PumpedKwh)} of twelve months generation covers the pumping of the month.",
            size.Width,
            size.Height);
    }
}
