using System.Globalization;
using HeadToWatts.Files.FlowFiles.Reading;

namespace HeadToWatts.Files.FlowFiles.Recipes;

/// <summary>Reads dates in the order a recipe names.</summary>
internal static class RecipeStamp
{
    private const double LastSpreadsheetDay = 110_000;

    public static bool TryRead(ReadOnlySpan<char> text, RecipeDateOrder? order, int? twoDigitYearsFrom, out WrittenDate date, out string why)
    {
        text = text.Trim();
        if (order is null)
            return WrittenDate.TryRead(text, out date, out why, twoDigitYearsFrom);
        if (order == RecipeDateOrder.SpreadsheetDay)
            return Spreadsheet(text, out date, out why);

        date = default;
        why = "this is not a date";
        if (text.Length > 2 && text[0] is '\'' or '"' && text[^1] == text[0])
            text = text[1..^1].Trim();
        int time = -1;
        var offset = WrittenDate.NoOffset;
        var cut = text.IndexOfAny(' ', 'T');
        if (cut > 0 && text[cut..].Contains(':'))
        {
            if (!WrittenTime.TryRead(text[(cut + 1)..], compact: false, out time, out offset))
            {
                why = "the time of day is not understood";
                return false;
            }

            text = text[..cut];
        }

        Span<int> parts = stackalloc int[3];
        Span<int> lengths = stackalloc int[3];
        if (!Parts(text, order.Value, parts, lengths, out var named))
            return false;
        var (y, m, d) = order == RecipeDateOrder.YearMonthDay || lengths[0] == 4 ? (0, 1, 2) : order == RecipeDateOrder.MonthDayYear ? (2, 0, 1) : (2, 1, 0);
        if (named && m != 1)
            (m, d) = (1, 0);
        var year = parts[y];
        if (lengths[y] <= 2)
        {
            if (twoDigitYearsFrom is not { } from)
            {
                why = "the year has two digits; the recipe does not say which hundred years are meant";
                return false;
            }

            year = WrittenDate.FullYear(year, from);
        }
        else if (lengths[y] != 4)
        {
            return false;
        }

        if (parts[m] is < 1 or > 12)
        {
            why = "there is no such month in the order that was chosen";
            return false;
        }

        return WrittenDate.Make(year, parts[m], parts[d], true, time, offset, out date, out why);
    }

    /// <summary>A date in three columns.</summary>
    public static bool TryRead(ReadOnlySpan<char> year, ReadOnlySpan<char> month, ReadOnlySpan<char> day, int? twoDigitYearsFrom, out WrittenDate date, out string why)
    {
        date = default;
        why = "this is not a date";
        if (!Digits(year, out var y) || !Digits(day, out var d) || !Month(month, out var m, out _))
            return false;
        if (year.Length <= 2)
        {
            if (twoDigitYearsFrom is not { } from)
            {
                why = "the year has two digits; the recipe does not say which hundred years are meant";
                return false;
            }

            y = WrittenDate.FullYear(y, from);
        }

        if (m is < 1 or > 12)
        {
            why = "there is no such month";
            return false;
        }

        return WrittenDate.Make(y, m, d, true, -1, WrittenDate.NoOffset, out date, out why);
    }

    private static bool Parts(ReadOnlySpan<char> text, RecipeDateOrder order, Span<int> parts, Span<int> lengths, out bool named)
    {
        named = false;
        if (text.Length is 6 or 8 && text.IndexOfAnyExceptInRange('0', '9') < 0)
        {
            var longYear = text.Length - 4;
            (lengths[0], lengths[1], lengths[2]) = order == RecipeDateOrder.YearMonthDay ? (longYear, 2, 2) : (2, 2, longYear);
            var at = 0;
            for (var i = 0; i < 3; i++)
            {
                Digits(text.Slice(at, lengths[i]), out parts[i]);
                at += lengths[i];
            }

            return true;
        }

        Span<Range> ranges = stackalloc Range[4];
        if (text.SplitAny(ranges, "-/. ", StringSplitOptions.RemoveEmptyEntries | StringSplitOptions.TrimEntries) != 3)
            return false;
        for (var i = 0; i < 3; i++)
        {
            var part = text[ranges[i]];
            lengths[i] = part.Length;
            if (i == 1 && Month(part, out parts[i], out named))
                continue;
            if (!Digits(part, out parts[i]))
                return false;
        }

        return true;
    }

    private static bool Month(ReadOnlySpan<char> text, out int month, out bool named)
    {
        named = false;
        if (Digits(text, out month))
            return true;
        if (text.Length < 3)
            return false;
        var names = CultureInfo.InvariantCulture.DateTimeFormat.MonthNames;
        for (var i = 0; i < 12; i++)
        {
            if (names[i].AsSpan().StartsWith(text, StringComparison.OrdinalIgnoreCase))
            {
                month = i + 1;
                named = true;
                return true;
            }
        }

        return false;
    }

    private static bool Spreadsheet(ReadOnlySpan<char> text, out WrittenDate date, out string why)
    {
        date = default;
        why = "this is not a spreadsheet's day number";
        // Day 60 is the 29 February 1900 that never was; what lies before it counts otherwise.
        if (!double.TryParse(text, NumberStyles.AllowDecimalPoint, CultureInfo.InvariantCulture, out var days) || !(days is > 60 and < LastSpreadsheetDay))
            return false;
        var seconds = (long)Math.Round((days - Math.Floor(days)) * 86_400);
        var day = new DateOnly(1899, 12, 30).AddDays((int)Math.Floor(days));
        return WrittenDate.Make(day.Year, day.Month, day.Day, true, text.Contains('.') ? (int)(seconds * 1000) : -1, WrittenDate.NoOffset, out date, out why);
    }

    private static bool Digits(ReadOnlySpan<char> text, out int value)
    {
        value = 0;
        return text.Length is > 0 and <= 4 && int.TryParse(text, NumberStyles.None, CultureInfo.InvariantCulture, out value);
    }
}
