using System.Globalization;
using HeadToWatts.Drawings.Axes;
using HeadToWatts.Drawings.Canvas;
using HeadToWatts.Drawings.Layout;

namespace HeadToWatts.Drawings;

/// <summary>Successive days without a flow.</summary>
/// <param name="From">First day.</param>
/// <param name="Days">How many.</param>
public readonly record struct RecordGap(DateOnly From, int Days);

/// <summary>What the time line of a record shows.</summary>
/// <param name="FirstDay">First day of the record.</param>
/// <param name="LastDay">Last day.</param>
/// <param name="Gaps">Its gaps in order.</param>
public sealed record GapTimelineInput(DateOnly FirstDay, DateOnly LastDay, IReadOnlyList<RecordGap> Gaps);

/// <summary>A record as a bar along the years, with its gaps cut out.</summary>
public static partial class GapTimeline
{
    private const double LeastShown = 1.4;

    /// <summary>Draws the time line.</summary>
    public static Drawing Draw(GapTimelineInput input, DrawingSize size)
    {
        ArgumentNullException.ThrowIfNull(input);
        ArgumentNullException.ThrowIfNull(size);
        var (first, end) = (YearOf(input.FirstDay), YearOf(input.LastDay.AddDays(1)));
        var frame = ChartFrame.Begin(
            size,
            Axis.Linear("", first - (0.04 * Math.Max(end - first, 0.1)), Math.Max(end, first + 0.1), ChartFrame.HorizontalIntervals(size), toTicks: false),
            Axis.Linear(" ", 0, 1, 2, toTicks: false).WithoutTicks());
        var (top, height) = (frame.Top + ((frame.Bottom - frame.Top) * 0.25), (frame.Bottom - frame.Top) * 0.5);
        frame.Canvas.Rectangle(new Point(frame.AtX(first), top), frame.AtX(end) - frame.AtX(first), height, Paint.Filled(InkRole.Water, 0.55));
        foreach (var gap in input.Gaps)
        {
            var from = frame.AtX(YearOf(gap.From));
            var width = Math.Max(LeastShown, frame.AtX(YearOf(gap.From.AddDays(gap.Days))) - from);
            frame.Canvas.BeginMark($"{Days(gap.Days)} without a flow from {Day(gap.From)}");
            frame.Canvas.Rectangle(new Point(from, top - 3), Math.Min(width, frame.Right - from), height + 6, new Paint(new Fill(InkRole.Card), new Stroke(InkRole.Plum, 0.8)));
            frame.Canvas.EndMark();
        }

        var note = input.Gaps.Count == 0
            ? "no gap"
            : $"{input.Gaps.Count.ToString(CultureInfo.InvariantCulture)} gap{(input.Gaps.Count == 1 ? "" : "s")}, {Days(input.Gaps.Sum(g => g.Days))}; longest {Days(Longest(input).Days)} from {Day(Longest(input).From)}";
        frame.Labels.Fix(frame.Canvas, new Point(frame.Left, frame.Top + (size.Type.Label * 0.2)), note, new TextStyle(input.Gaps.Count == 0 ? InkRole.Soft : InkRole.Plum, size.Type.Label));
        if (input.Gaps.Count == 0)
            frame.Canvas.HoverArea(new Point(frame.Left, top), frame.Right - frame.Left, height, null, $"{Day(input.FirstDay)} to {Day(input.LastDay)} without a gap");
        return frame.Canvas.Finish("The record on a time line", $"{Day(input.FirstDay)} to {Day(input.LastDay)}: {note}.", size.Width, size.Height);
    }

    private static RecordGap Longest(GapTimelineInput input) => input.Gaps.MaxBy(g => g.Days);

    private static string Days(int days) => days.ToString("N0", CultureInfo.InvariantCulture) + (days == 1 ? " day" : " days");

    private static string Day(DateOnly day) => day.ToString("d MMM yyyy", CultureInfo.InvariantCulture);

    private static double YearOf(DateOnly day) => day.Year + ((day.DayOfYear - 1) / (DateTime.IsLeapYear(day.Year) ? 366.0 : 365.0));
}
