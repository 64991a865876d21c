using HeadToWatts.Drawings.Axes;
using HeadToWatts.Drawings.Canvas;
using HeadToWatts.Drawings.Layout;

namespace HeadToWatts.Drawings;

/// <summary>A year of 365 days across a chart, with the months named under it. 29 February is left out.</summary>
internal static class YearAxis
{
    private static readonly string[] Short = ["Jan", "Feb", "Mar", "Apr", "May", "Jun", "Jul", "Aug", "Sep", "Oct", "Nov", "Dec"];
    private static readonly int[] Start = [0, 31, 59, 90, 120, 151, 181, 212, 243, 273, 304, 334, 365];

    /// <summary>The axis, without ticks of its own.</summary>
    internal static Axis Make() => Axis.Linear("", 0, 365, 12, toTicks: false).WithoutTicks();

    /// <summary>Place of a day in a year that begins with a month, 0 to 364.</summary>
    internal static int Place(int month, int day, int firstMonth)
    {
        var fromJanuary = Start[month - 1] + Math.Min(day, month == 2 ? 28 : 31) - 1;
        return (fromJanuary - Start[firstMonth - 1] + 365) % 365;
    }

    /// <summary>Draws the names of the months and the lines between them.</summary>
    internal static void Months(ChartFrame frame, int firstMonth)
    {
        var type = frame.Size.Type;
        var slot = (frame.Right - frame.Left) / 12;
        var initials = slot < TextMeasure.Width("May", type.Tick) + 4;
        for (var i = 0; i < 12; i++)
        {
            var month = ((firstMonth - 1 + i) % 12) + 1;
            var from = (Start[month - 1] - Start[firstMonth - 1] + 365) % 365;
            var days = Start[month] - Start[month - 1];
            if (i > 0)
                frame.Canvas.Line(new Point(frame.AtX(from), frame.Top), new Point(frame.AtX(from), frame.Bottom), new Stroke(InkRole.Grid));
            var name = Short[month - 1];
            frame.Labels.Fix(frame.Canvas, new Point(frame.AtX(from + (days / 2.0)), frame.Bottom + (type.Tick * 1.4)), initials ? name[..1] : name, new TextStyle(InkRole.Soft, type.Tick, TextAnchor.Middle));
        }
    }

    /// <summary>Name of the day at a place.</summary>
    internal static string Name(int place, int firstMonth)
    {
        var fromJanuary = (place + Start[firstMonth - 1]) % 365;
        var month = Array.FindLastIndex(Start, s => s <= fromJanuary);
        return $"{fromJanuary - Start[month] + 1} {Short[month]}";
    }
}
