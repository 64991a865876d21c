using System.Globalization;

namespace HeadToWatts.Files.FlowFiles.Reading;

/// <summary>A date as written, before the order of day and month is known.</summary>
internal readonly record struct WrittenDate(short Year, byte First, byte Second, bool OrderKnown, bool HasTime)
{
    public const string Accepted = "yyyy-mm-dd, or m/d/yyyy or d/m/yyyy throughout";

    private static readonly string[] MonthNames = ["jan", "feb", "mar", "apr", "may", "jun", "jul", "aug", "sep", "oct", "nov", "dec"];

    /// <summary>Reads a date; a time of day may follow it.</summary>
    /// <returns>True, or false with the reason.</returns>
    public static bool TryRead(string text, out WrittenDate date, out string why)
    {
        date = default;
        why = "this is not a date";
        var rest = text.AsSpan().Trim();
        var hasTime = false;
        var cut = rest.IndexOfAny(' ', 'T');
        if (cut > 0 && rest.IndexOf(':') > cut)
        {
            if (!IsTime(rest[(cut + 1)..].Trim()))
            {
                why = "the time of day is not understood";
                return false;
            }

            rest = rest[..cut];
            hasTime = true;
        }

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
                why = "this may be a spreadsheet's day number; show the column as dates before saving";
            return count == 1 && rest.Length == 8 && Digits(rest, out var compact)
                && Make(compact / 10_000, compact / 100 % 100, compact % 100, true, hasTime, out date, out why);
        }

        ReadOnlySpan<char> a = rest[parts[0]], b = rest[parts[1]], c = rest[parts[2]];
        if (a.Length == 4 && Digits(a, out var year) && Digits(b, out var month) && Digits(c, out var day))
            return Make(year, month, day, true, hasTime, out date, out why);
        if (!Digits(a, out var first) || !Digits(c, out year))
            return false;
        if (c.Length != 4)
        {
            why = "the year has two digits";
            return false;
        }

        if (Digits(b, out var second))
            return Make(year, first, second, false, hasTime, out date, out why);
        var name = b.ToString().ToLowerInvariant();
        var at = name.Length < 3 ? -1 : Array.FindIndex(MonthNames, m => name.StartsWith(m, StringComparison.Ordinal));
        return at >= 0 && Make(year, at + 1, first, true, hasTime, out date, out why);
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

    private static bool Make(int year, int first, int second, bool orderKnown, bool hasTime, out WrittenDate date, out string why)
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

        date = new WrittenDate((short)year, (byte)first, (byte)second, orderKnown, hasTime);
        why = "";
        return true;
    }

    private static bool Digits(ReadOnlySpan<char> text, out int value)
    {
        value = 0;
        return text.Length is > 0 and <= 8 && int.TryParse(text, NumberStyles.None, CultureInfo.InvariantCulture, out value);
    }

    private static bool IsTime(ReadOnlySpan<char> text)
    {
        if (text.EndsWith("am", StringComparison.OrdinalIgnoreCase) || text.EndsWith("pm", StringComparison.OrdinalIgnoreCase))
            text = text[..^2].TrimEnd();
        text = text.TrimEnd('Z');
        Span<Range> parts = stackalloc Range[4];
        var count = text.Split(parts, ':');
        if (count is < 2 or > 3 || !Digits(text[parts[0]], out var hour) || hour > 23 || !Digits(text[parts[1]], out var minute) || minute > 59)
            return false;
        return count == 2 || (double.TryParse(text[parts[2]], NumberStyles.AllowDecimalPoint, CultureInfo.InvariantCulture, out var second) && second is >= 0 and < 61);
    }
}
