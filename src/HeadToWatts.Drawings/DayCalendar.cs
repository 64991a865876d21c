using System.Globalization;
using HeadToWatts.Drawings.Axes;
using HeadToWatts.Drawings.Canvas;
using HeadToWatts.Drawings.Layout;

namespace HeadToWatts.Drawings;

/// <summary>What a calendar of days shows.</summary>
/// <param name="FirstDay">First day.</param>
/// <param name="Shares">Value of each day over the value that counts as full; NaN where there is none.</param>
/// <param name="FirstMonth">Month in which a year begins, 1 or 10.</param>
/// <param name="Title">What it is, as "Daily flow".</param>
/// <param name="FullName">What counts as full, as "the design flow".</param>
/// <param name="TopName">What the darkest days are, as "the design flow or more".</param>
public sealed record DayCalendarInput(DateOnly FirstDay, IReadOnlyList<double> Shares, int FirstMonth, string Title, string FullName, string TopName);

/// <summary>Every day of a record: a line for each year, darker for more. Days without a value stay blank with a line through them.</summary>
public static partial class DayCalendar
{
    private const int MostYears = 60;
    private static readonly double[] Limits = [0.25, 0.5, 0.75, 1];
    private static readonly double[] Inks = [0.16, 0.36, 0.58, 0.8, 1];

    /// <summary>Draws the calendar.</summary>
    /// <exception cref="ArgumentException">There is no day.</exception>
    public static Drawing Draw(DayCalendarInput input, DrawingSize size)
    {
        ArgumentNullException.ThrowIfNull(input);
        ArgumentNullException.ThrowIfNull(size);
        if (input.Shares.Count == 0)
            throw new ArgumentException("There is no day.", nameof(input));

        var rows = Rows(input);
        var shown = rows.Count > MostYears ? rows.GetRange(rows.Count - MostYears, MostYears) : rows;
        var frame = ChartFrame.Begin(size, YearAxis.Make(), Axis.Linear(" ", 0, 1, 2, toTicks: false).WithoutTicks());
        var type = size.Type;
        var gutter = TextMeasure.Width("2000", type.Tick) + 6;
        var left = frame.Left + gutter;
        var width = frame.Right - left;
        var line = (frame.Bottom - frame.Top) / shown.Count;
        var every = (int)Math.Ceiling(type.Tick * 1.25 / line);
        for (var r = 0; r < shown.Count; r++)
            Row(shown[r], frame.Top + (r * line), r % every == 0);
        Months();
        Legend();
        return frame.Canvas.Finish(input.Title, Describe(), size.Width, size.Height);

        double X(double place) => left + (place / 365 * width);

        void Row(CalendarRow row, double top, bool named)
        {
            var height = line * (line > 4 ? 0.86 : 1);
            frame.Canvas.BeginMark($"{row.Name}: {row.Days} days with a value, {row.MissingDays} without");
            for (var from = 0; from < 365;)
            {
                var to = from + 1;
                while (to < 365 && row.Classes[to] == row.Classes[from])
                    to++;
                var at = new Point(X(from), top);
                var span = X(to) - X(from);
                switch (row.Classes[from])
                {
                    case CalendarRow.Outside:
                        break;
                    case CalendarRow.Missing:
                        frame.Canvas.Line(at with { Y = top + (height / 2) }, new Point(X(to), top + (height / 2)), new Stroke(InkRole.Plum, Math.Max(0.8, height * 0.18)));
                        break;
                    case 0:
                        frame.Canvas.Rectangle(at, span, height, Paint.Filled(InkRole.Grid));
                        break;
                    case var c:
                        frame.Canvas.Rectangle(at, span, height, Paint.Filled(InkRole.Water, Inks[c - 1]));
                        break;
                }

                from = to;
            }

            frame.Canvas.EndMark();
            if (named)
                frame.Labels.Fix(frame.Canvas, new Point(left - 5, top + (height / 2) + (type.Tick * 0.36)), row.Name, new TextStyle(InkRole.Soft, type.Tick, TextAnchor.End));
        }

        void Months()
        {
            var slot = width / 12;
            for (var i = 0; i < 12; i++)
            {
                var month = ((input.FirstMonth - 1 + i) % 12) + 1;
                var place = YearAxis.Place(month, 15, input.FirstMonth);
                var name = CultureInfo.InvariantCulture.DateTimeFormat.GetAbbreviatedMonthName(month);
                frame.Labels.Fix(frame.Canvas, new Point(X(place), frame.Bottom + (type.Tick * 1.4)), slot < TextMeasure.Width("May", type.Tick) + 4 ? name[..1] : name, new TextStyle(InkRole.Soft, type.Tick, TextAnchor.Middle));
            }
        }

        void Legend()
        {
            var y = frame.Top - (type.Label * 0.85);
            var box = type.Label * 0.75;
            var x = left;
            string[] names = size.Width < 440 ? ["none", "¼", "½", "¾", "<1", "full"] : ["none", "to ¼", "to ½", "to ¾", "below full", input.TopName];
            for (var i = 0; i < names.Length; i++)
            {
                frame.Canvas.Rectangle(new Point(x, y - box), box, box, Paint.Filled(i == 0 ? InkRole.Grid : InkRole.Water, i == 0 ? 1 : Inks[i - 1]));
                frame.Labels.Fix(frame.Canvas, new Point(x + box + 3, y), names[i], new TextStyle(InkRole.Soft, type.Tick));
                x += box + 3 + TextMeasure.Width(names[i], type.Tick) + 9;
            }

            if (x + TextMeasure.Width("no value", type.Tick) + 20 > frame.Right)
                return;
            frame.Canvas.Line(new Point(x, y - (box / 2)), new Point(x + (box * 1.6), y - (box / 2)), new Stroke(InkRole.Plum, 1.4));
            frame.Labels.Fix(frame.Canvas, new Point(x + (box * 1.6) + 3, y), "no value", new TextStyle(InkRole.Soft, type.Tick));
        }

        string Describe()
        {
            var values = input.Shares.Where(s => !double.IsNaN(s)).ToList();
            var full = values.Count == 0 ? 0 : values.Count(v => v >= 1) / (double)values.Count;
            var none = values.Count == 0 ? 0 : values.Count(v => v <= 0) / (double)values.Count;
            var missing = input.Shares.Count - values.Count;
            var cut = shown.Count < rows.Count ? $" The last {MostYears} of {rows.Count} years are shown." : "";
            return $"{Count(rows.Count, "year")}. {Wording.Share(full)} of the days reach {input.FullName}, {Wording.Share(none)} have none; {Count(missing, "day")} without a value.{cut}";
        }
    }

    private static string Count(int number, string what) => number.ToString("N0", CultureInfo.InvariantCulture) + " " + what + (number == 1 ? "" : "s");

    private static List<CalendarRow> Rows(DayCalendarInput input)
    {
        var rows = new List<CalendarRow>();
        var day = input.FirstDay;
        CalendarRow? row = null;
        var year = int.MinValue;
        foreach (var share in input.Shares)
        {
            var of = input.FirstMonth > 1 && day.Month >= input.FirstMonth ? day.Year + 1 : day.Year;
            if (of != year)
            {
                year = of;
                row = new CalendarRow(year.ToString(CultureInfo.InvariantCulture));
                rows.Add(row);
            }

            if (!(day.Month == 2 && day.Day == 29))
                row!.Set(YearAxis.Place(day.Month, day.Day, input.FirstMonth), ClassOf(share));
            day = day.AddDays(1);
        }

        return rows;
    }

    // Zero is a class of its own: a plant that stands is not a plant that runs on little.
    private static int ClassOf(double share)
    {
        if (double.IsNaN(share))
            return CalendarRow.Missing;
        if (share <= 0)
            return 0;
        var i = 0;
        while (i < Limits.Length && share >= Limits[i] - 1e-9)
            i++;
        return i + 1;
    }

    private sealed class CalendarRow(string name)
    {
        internal const int Outside = -2;
        internal const int Missing = -1;

        internal string Name { get; } = name;

        internal int[] Classes { get; } = [.. Enumerable.Repeat(Outside, 365)];

        internal int Days => Classes.Count(c => c >= 0);

        internal int MissingDays => Classes.Count(c => c == Missing);

        internal void Set(int place, int value) => Classes[place] = value;
    }
}
