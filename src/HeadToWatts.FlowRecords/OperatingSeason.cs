using System.Globalization;
using HeadToWatts.Basis.Problems;

namespace HeadToWatts.FlowRecords;

/// <summary>A day of any year.</summary>
/// <param name="Month">Month, 1 to 12.</param>
/// <param name="Day">Day of the month; 29 February is allowed.</param>
public readonly record struct MonthDay(int Month, int Day);

/// <summary>The days of the year on which water runs and the plant may operate.</summary>
public sealed class OperatingSeason : IEquatable<OperatingSeason>
{
    // Every day of a leap year; 29 February counts in no share, since shares are of a 365-day year.
    private const int LeapYear = 2000;
    private const int LeapDay = 59;
    private readonly bool[] _runs;

    private OperatingSeason(bool[] runs)
    {
        _runs = runs;
        for (var i = 0; i < runs.Length; i++)
        {
            if (runs[i] && i != LeapDay)
                DaysPerYear++;
        }
    }

    /// <summary>The whole year.</summary>
    public static OperatingSeason WholeYear { get; } = new([.. Enumerable.Repeat(true, 366)]);

    /// <summary>True when every day runs.</summary>
    public bool IsWholeYear => DaysPerYear == 365;

    /// <summary>Days of operation in a 365-day year.</summary>
    public int DaysPerYear { get; }

    /// <summary>Share of a 365-day year.</summary>
    public double ShareOfYear => DaysPerYear / 365.0;

    /// <summary>The season from one day to another, both included; it may run over the new year.</summary>
    /// <exception cref="ArgumentOutOfRangeException">There is no such day.</exception>
    public static OperatingSeason Span(MonthDay from, MonthDay to) => Spans([(from, to)]);

    /// <summary>The season of several spans; where they overlap they are joined.</summary>
    /// <exception cref="ArgumentException">No span, or no such day.</exception>
    public static OperatingSeason Spans(IReadOnlyList<(MonthDay From, MonthDay To)> spans)
    {
        ArgumentNullException.ThrowIfNull(spans);
        if (spans.Count == 0)
            throw new ArgumentException("A season has at least one span.", nameof(spans));
        var runs = new bool[366];
        foreach (var (from, to) in spans)
        {
            var last = IndexOf(to);
            for (var i = IndexOf(from); ; i = (i + 1) % 366)
            {
                runs[i] = true;
                if (i == last)
                    break;
            }
        }

        // From 1 March to 28 February is every day there is in three years of four.
        if (!runs[LeapDay] && runs.Where((_, i) => i != LeapDay).All(r => r))
            runs[LeapDay] = true;
        var season = new OperatingSeason(runs);
        return season.DaysPerYear > 0 ? season : throw new ArgumentException("A season of 29 February alone has no day in most years.", nameof(spans));
    }

    /// <summary>The season of whole months.</summary>
    /// <param name="months">Months, 1 to 12.</param>
    public static OperatingSeason Months(IReadOnlyList<int> months)
    {
        ArgumentNullException.ThrowIfNull(months);
        return Spans([.. months.Select(m => (new MonthDay(m, 1), new MonthDay(m, m is >= 1 and <= 12 ? DateTime.DaysInMonth(LeapYear, m) : 1)))]);
    }

    /// <summary>The days that are in both seasons; null when there is none.</summary>
    /// <param name="other">The other season.</param>
    public OperatingSeason? Within(OperatingSeason other)
    {
        ArgumentNullException.ThrowIfNull(other);
        var both = new OperatingSeason([.. _runs.Zip(other._runs, (a, b) => a && b)]);
        return both.DaysPerYear > 0 ? both : null;
    }

    /// <summary>Reads a season: "all year", "15 Apr to 15 Oct", "Apr 15 - Oct 15", "04-15..10-15", "Apr to Oct", "Apr, May, Jun", or several spans with commas.</summary>
    /// <param name="text">The text as written.</param>
    /// <param name="where">Where it stands.</param>
    public static Checked<OperatingSeason> Parse(string? text, string where) => SeasonText.Read(text, where);

    /// <summary>Whether a date is in the season.</summary>
    public bool Runs(DateOnly day) => _runs[IndexOf(new MonthDay(day.Month, day.Day))];

    /// <summary>Whether a day of any year is in the season.</summary>
    /// <param name="month">Month, 1 to 12.</param>
    /// <param name="dayOfMonth">Day of the month.</param>
    public bool Runs(int month, int dayOfMonth) => _runs[MonthStart(month) + dayOfMonth - 1];

    /// <summary>Whether any day of the month is in the season.</summary>
    /// <param name="month">Month, 1 to 12.</param>
    public bool RunsInMonth(int month) => DaysInMonth(month) > 0;

    /// <summary>Days of operation in a month of a 365-day year.</summary>
    /// <param name="month">Month, 1 to 12.</param>
    public double DaysInMonth(int month)
    {
        ArgumentOutOfRangeException.ThrowIfLessThan(month, 1);
        ArgumentOutOfRangeException.ThrowIfGreaterThan(month, 12);
        var days = 0;
        var start = MonthStart(month);
        for (var i = start; i < start + DateTime.DaysInMonth(LeapYear, month); i++)
        {
            if (_runs[i] && i != LeapDay)
                days++;
        }

        return days;
    }

    /// <summary>The season in words, "15 Apr to 15 Oct"; <see cref="Parse"/> reads it back.</summary>
    public string Describe()
    {
        if (IsWholeYear)
            return "all year";
        var parts = new List<string>();
        for (var i = 0; i < 366; i++)
        {
            if (!_runs[i] || _runs[(i + 365) % 366])
                continue;
            var last = i;
            while (_runs[(last + 1) % 366])
                last = (last + 1) % 366;
            parts.Add(Describe(i, last));
        }

        return string.Join(", ", parts);
    }

    /// <inheritdoc/>
    public bool Equals(OperatingSeason? other) => other is not null && _runs.AsSpan().SequenceEqual(other._runs);

    /// <inheritdoc/>
    public override bool Equals(object? obj) => Equals(obj as OperatingSeason);

    /// <inheritdoc/>
    public override int GetHashCode() => Describe().GetHashCode(StringComparison.Ordinal);

    /// <inheritdoc/>
    public override string ToString() => Describe();

    private static string Describe(int first, int last)
    {
        var (from, to) = (DayAt(first), DayAt(last));
        var wholeMonths = from.Day == 1 && to.Day == DateTime.DaysInMonth(LeapYear, to.Month);
        if (wholeMonths)
            return from.Month == to.Month && first <= last ? Month(from) : $"{Month(from)} to {Month(to)}";
        return $"{from.Day.ToString(CultureInfo.InvariantCulture)} {Month(from)} to {to.Day.ToString(CultureInfo.InvariantCulture)} {Month(to)}";

        static string Month(DateOnly day) => day.ToString("MMM", CultureInfo.InvariantCulture);
    }

    private static DateOnly DayAt(int index) => new DateOnly(LeapYear, 1, 1).AddDays(index);

    private static int MonthStart(int month) => new DateOnly(LeapYear, month, 1).DayOfYear - 1;

    private static int IndexOf(MonthDay day)
    {
        if (day.Month is < 1 or > 12 || day.Day < 1 || day.Day > DateTime.DaysInMonth(LeapYear, day.Month))
            throw new ArgumentOutOfRangeException(nameof(day), day, "There is no such day of the year.");
        return MonthStart(day.Month) + day.Day - 1;
    }
}
