using System.Globalization;

namespace HeadToWatts.Files.FlowFiles.Reading;

/// <summary>A date as written, before the order of day and month is known, with the time of day where one is given.</summary>
/// <param name="Year">Year.</param>
/// <param name="First">Month, or the first of two numbers of which one is the month.</param>
/// <param name="Second">Day of the month, or the second of the two.</param>
/// <param name="OrderKnown">True when First is the month.</param>
/// <param name="TimeMs">Time of day in ms, up to 24:00; below zero where none is given.</param>
/// <param name="OffsetMin">Minutes ahead of UTC, where it is given.</param>
internal readonly record struct WrittenDate(short Year, byte First, byte Second, bool OrderKnown, int TimeMs, short OffsetMin)
{
    public const string Accepted = "yyyy-mm-dd, or m/d/yyyy or d/m/yyyy throughout";

    /// <summary>Stands for "no offset from UTC is given".</summary>
    public const short NoOffset = short.MinValue;

    private const int NoTime = -1;

    private static readonly string[] MonthNames = ["jan", "feb", "mar", "apr", "may", "jun", "jul", "aug", "sep", "oct", "nov", "dec"];

    public bool HasTime => TimeMs >= 0;

    /// <summary>Reads a date; a time of day may follow it.</summary>
    /// <param name="text">The text.</param>
    /// <param name="date">The date.</param>
    /// <param name="why">Why it is none.</param>
    /// <param name="twoDigitYearsFrom">First year of the hundred that two digits stand for; null refuses them.</param>
    public static bool TryRead(ReadOnlySpan<char> text, out WrittenDate date, out string why, int? twoDigitYearsFrom = null)
    {
        date = default;
        why = "this is not a date";
        var rest = text.Trim();
        if (rest.Length > 2 && rest[0] is '\'' or '"' && rest[^1] == rest[0])
            rest = rest[1..^1].Trim();
        int time = NoTime;
        var offset = NoOffset;
        var cut = rest.IndexOfAny(' ', 'T');
        if (cut > 0 && rest[cut..].Contains(':'))
        {
            if (!WrittenTime.TryRead(rest[(cut + 1)..], compact: false, out time, out offset))
            {
                why = "the time of day is not understood";
                return false;
            }

            rest = rest[..cut];
        }

        if (rest.Length == 10 && rest[4] == '-' && rest[7] == '-' && Digits(rest[..4], out var year) && Digits(rest[5..7], out var month) && Digits(rest[8..], out var day))
            return Make(year, month, day, true, time, offset, out date, out why);

        Span<Range> parts = stackalloc Range[4];
        var count = 0;
        foreach (var separator in "-/.")
        {
            count = rest.Split(parts, separator);
            if (count > 1)
                break;
        }

        if (count != 3)
        {
            if (count == 1 && rest.Length == 5 && Digits(rest, out _))
                why = "this may be a spreadsheet's day number; show the column as dates before saving, or say so in a reading recipe";
            return count == 1 && rest.Length == 8 && Digits(rest, out var compact)
                && Make(compact / 10_000, compact / 100 % 100, compact % 100, true, time, offset, out date, out why);
        }

        ReadOnlySpan<char> a = rest[parts[0]], b = rest[parts[1]], c = rest[parts[2]];
        if (a.Length == 4 && Digits(a, out year) && Digits(b, out month) && Digits(c, out day))
            return Make(year, month, day, true, time, offset, out date, out why);
        if (!Digits(a, out var first) || !Digits(c, out year))
            return false;
        if (c.Length == 2 && twoDigitYearsFrom is { } from)
        {
            year = FullYear(year, from);
        }
        else if (c.Length != 4)
        {
            why = "the year has two digits; a reading recipe can say which hundred years are meant";
            return false;
        }

        if (Digits(b, out var second))
            return Make(year, first, second, false, time, offset, out date, out why);
        var name = b.ToString().ToLowerInvariant();
        var at = name.Length < 3 ? -1 : Array.FindIndex(MonthNames, m => name.StartsWith(m, StringComparison.Ordinal));
        return at >= 0 && Make(year, at + 1, first, true, time, offset, out date, out why);
    }

    /// <summary>The year that two digits stand for, within a hundred years from a first one.</summary>
    public static int FullYear(int twoDigits, int from)
    {
        var year = from - (from % 100) + twoDigits;
        return year < from ? year + 100 : year;
    }

    /// <summary>A date of known parts.</summary>
    public static bool Make(int year, int first, int second, bool orderKnown, int timeMs, short offsetMin, out WrittenDate date, out string why)
    {
        date = default;
        // A slip in the year must not make a record of two thousand empty years.
        if (year is < 1700 or > 2200)
        {
            why = "the year is outside 1700 to 2200";
            return false;
        }

        if (first is < 1 or > 31 || second is < 1 or > 31)
        {
            why = "there is no such day";
            return false;
        }

        date = new WrittenDate((short)year, (byte)first, (byte)second, orderKnown, timeMs, offsetMin);
        why = "";
        return true;
    }

    /// <summary>The day, once the order is settled; null when there is no such day.</summary>
    public DateOnly? Day(DateOrder order)
    {
        var (month, day) = OrderKnown || order == DateOrder.MonthFirst ? (First, Second) : (Second, First);
        return month is >= 1 and <= 12 && day >= 1 && day <= DateTime.DaysInMonth(Year, month) ? new DateOnly(Year, month, day) : null;
    }

    public override string ToString() => OrderKnown
        ? string.Create(CultureInfo.InvariantCulture, $"{Year:0000}-{First:00}-{Second:00}")
        : string.Create(CultureInfo.InvariantCulture, $"{First}/{Second}/{Year:0000}");

    private static bool Digits(ReadOnlySpan<char> text, out int value)
    {
        value = 0;
        if (text.Length is 0 or > 8)
            return false;
        foreach (var c in text)
        {
            if (!char.IsAsciiDigit(c))
                return false;
            value = (value * 10) + (c - '0');
        }

        return true;
    }
}
