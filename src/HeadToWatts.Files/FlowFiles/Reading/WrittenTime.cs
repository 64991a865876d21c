using System.Globalization;

namespace HeadToWatts.Files.FlowFiles.Reading;

/// <summary>Reads a time of day: "00:15", "1:02:03.5", "12:00:00 Am", "24:00", "00:15Z", "00:15-07:00", and where asked "0015".</summary>
internal static class WrittenTime
{
    private const int MinuteMs = 60_000;
    private const int DayMs = 86_400_000;

    /// <summary>Reads the time.</summary>
    /// <param name="text">The text.</param>
    /// <param name="compact">Whether "0015" and "15" are times.</param>
    /// <param name="timeMs">Time of day in ms, up to 24:00.</param>
    /// <param name="offsetMin">Minutes ahead of UTC; <see cref="WrittenDate.NoOffset"/> where none is given.</param>
    public static bool TryRead(ReadOnlySpan<char> text, bool compact, out int timeMs, out short offsetMin)
    {
        timeMs = 0;
        offsetMin = WrittenDate.NoOffset;
        text = text.Trim();
        if (text.Length == 5 && text[2] == ':' && Two(text, 0, out var h) && Two(text, 3, out var m))
            return Make(h, m, 0, out timeMs);
        if (text.Length == 0)
            return false;

        if (text[^1] is 'Z' or 'z')
        {
            offsetMin = 0;
            text = text[..^1].TrimEnd();
        }
        else if (text.LastIndexOfAny('+', '-') is var sign and > 2)
        {
            if (!Offset(text[sign..], out offsetMin))
                return false;
            text = text[..sign].TrimEnd();
        }

        var half = -1;
        if (text.EndsWith("am", StringComparison.OrdinalIgnoreCase) || text.EndsWith("pm", StringComparison.OrdinalIgnoreCase))
        {
            half = text[^2] is 'p' or 'P' ? 12 : 0;
            text = text[..^2].TrimEnd();
        }

        if (compact && half < 0 && text.Length is >= 1 and <= 4 && Whole(text, out var digits))
            return Make(digits / 100, digits % 100, 0, out timeMs);

        Span<Range> parts = stackalloc Range[4];
        var count = text.Split(parts, ':');
        if (count is < 2 or > 3 || !Whole(text[parts[0]], out var hour) || !Whole(text[parts[1]], out var minute))
            return false;
        if (half >= 0)
        {
            if (hour is < 1 or > 12)
                return false;
            hour = (hour % 12) + half;
        }

        double second = 0;
        if (count == 3 && !(double.TryParse(text[parts[2]], NumberStyles.AllowDecimalPoint, CultureInfo.InvariantCulture, out second) && second is >= 0 and < 61))
            return false;
        return Make(hour, minute, second, out timeMs);
    }

    /// <summary>Reads an offset from UTC such as "-07:00", "+0100", "-7".</summary>
    public static bool Offset(ReadOnlySpan<char> text, out short offsetMin)
    {
        offsetMin = WrittenDate.NoOffset;
        if (text.Length < 2 || text[0] is not ('+' or '-'))
            return false;
        var digits = text[1..];
        var colon = digits.IndexOf(':');
        int hour, minute = 0;
        if (colon > 0)
        {
            if (!Whole(digits[..colon], out hour) || !Whole(digits[(colon + 1)..], out minute))
                return false;
        }
        else if (digits.Length is 1 or 2)
        {
            if (!Whole(digits, out hour))
                return false;
        }
        else if (digits.Length == 4 && Whole(digits, out var both))
        {
            (hour, minute) = (both / 100, both % 100);
        }
        else
        {
            return false;
        }

        if (hour > 14 || minute > 59)
            return false;
        offsetMin = (short)(((hour * 60) + minute) * (text[0] == '-' ? -1 : 1));
        return true;
    }

    private static bool Make(int hour, int minute, double second, out int timeMs)
    {
        timeMs = (hour * 60 * MinuteMs) + (minute * MinuteMs) + (int)(second * 1000);
        return minute <= 59 && (hour <= 23 || timeMs == DayMs);
    }

    private static bool Two(ReadOnlySpan<char> text, int at, out int value)
    {
        value = ((text[at] - '0') * 10) + (text[at + 1] - '0');
        return char.IsAsciiDigit(text[at]) && char.IsAsciiDigit(text[at + 1]);
    }

    private static bool Whole(ReadOnlySpan<char> text, out int value)
    {
        value = 0;
        return text.Length is > 0 and <= 4 && int.TryParse(text, NumberStyles.None, CultureInfo.InvariantCulture, out value);
    }
}
