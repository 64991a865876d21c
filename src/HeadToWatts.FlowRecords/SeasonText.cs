using System.Globalization;
using System.Text.RegularExpressions;
using HeadToWatts.Basis.Problems;

namespace HeadToWatts.FlowRecords;

/// <summary>Reads a season as people write it; what could mean two things is refused.</summary>
internal static partial class SeasonText
{
    private const string Accepted = "all year; 15 Apr to 15 Oct; Apr 15 to Oct 15; 04-15..10-15 (month-day); Apr to Oct; Apr, May, Jun; several of these with commas";

    private static readonly string[] MonthNames =
        ["january", "february", "march", "april", "may", "june", "july", "august", "september", "october", "november", "december"];

    private enum EndKind
    {
        Day,
        WholeMonth,
    }

    public static Checked<OperatingSeason> Read(string? text, string where)
    {
        var shown = text ?? "";
        var clean = Blanks().Replace(shown.Replace('\u2013', '-').Replace('\u2014', '-').Replace('\u2212', '-'), " ").Trim();
        if (clean.Length == 0)
            return Refuse("nothing is entered");
        if (AllYear().IsMatch(clean))
            return Checked.Of(OperatingSeason.WholeYear);
        if (clean.Contains('/', StringComparison.Ordinal))
            return Refuse("a date with a slash may be month/day or day/month; name the month");

        var spans = new List<(MonthDay, MonthDay)>();
        foreach (var part in Parts().Split(clean))
        {
            var why = ReadPart(part.Trim(), spans);
            if (why.Length > 0)
                return Refuse(why);
        }

        return Checked.Of(OperatingSeason.Spans(spans));

        Checked<OperatingSeason> Refuse(string why) => Checked.Refused<OperatingSeason>(new Problem(where, shown, why, Accepted));
    }

    // Adds the span of one part, or says why it cannot be read.
    private static string ReadPart(string part, List<(MonthDay, MonthDay)> spans)
    {
        if (part.Length == 0)
            return "a part between commas is empty";
        var match = SpanPattern().Match(part);
        if (!match.Success)
        {
            var month = MonthOf(part);
            if (month > 0)
            {
                spans.Add((new MonthDay(month, 1), LastOf(month)));
                return "";
            }

            return EndPattern().IsMatch(part)
                ? $"'{part}' is one day only; give the first and the last day"
                : $"'{part}' is not understood as a month or as a first and a last day";
        }

        var whyFrom = ReadEnd(match.Groups["from"].Value, out var from, out var fromKind);
        var whyTo = ReadEnd(match.Groups["to"].Value, out var to, out var toKind);
        if (whyFrom.Length + whyTo.Length > 0)
            return whyFrom.Length > 0 ? whyFrom : whyTo;
        if (fromKind != toKind)
            return $"'{part}' gives a day at one end and only a month at the other";
        spans.Add((from, toKind == EndKind.WholeMonth ? LastOf(to.Month) : to));
        return "";
    }

    private static string ReadEnd(string text, out MonthDay end, out EndKind kind)
    {
        end = default;
        kind = EndKind.Day;
        var match = EndPattern().Match(text.Trim());
        if (!match.Success)
            return $"'{text}' is not understood as a day or a month";

        int month, day;
        if (match.Groups["mm"].Success)
        {
            month = Number(match.Groups["mm"].Value);
            day = Number(match.Groups["dd"].Value);
        }
        else
        {
            month = MonthOf(match.Groups["name"].Value);
            if (month == 0)
                return $"'{match.Groups["name"].Value}' is not the name of one month";
            var digits = match.Groups["day"].Success ? match.Groups["day"] : match.Groups["dayafter"];
            kind = digits.Success ? EndKind.Day : EndKind.WholeMonth;
            day = digits.Success ? Number(digits.Value) : 1;
        }

        if (month is < 1 or > 12 || day < 1 || day > LastOf(month).Day)
            return $"there is no day '{text.Trim()}'" + (match.Groups["mm"].Success ? " (read as month-day)" : "");
        end = new MonthDay(month, day);
        return "";
    }

    private static MonthDay LastOf(int month) => new(month, DateTime.DaysInMonth(2000, month));

    private static int Number(string digits) => int.Parse(digits, CultureInfo.InvariantCulture);

    // At least three letters; "sept" as well as "sep".
    private static int MonthOf(string name)
    {
        var lower = name.TrimEnd('.').ToLowerInvariant();
        return lower.Length < 3 ? 0 : Array.FindIndex(MonthNames, m => m.StartsWith(lower, StringComparison.Ordinal)) + 1;
    }

    [GeneratedRegex(@"\s+")]
    private static partial Regex Blanks();

    [GeneratedRegex(@"^(all|whole|the whole|full) year$|^year[- ]round$", RegexOptions.IgnoreCase)]
    private static partial Regex AllYear();

    [GeneratedRegex(@"[,;]| and ", RegexOptions.IgnoreCase)]
    private static partial Regex Parts();

    [GeneratedRegex(@"^(?:from )?(?<from>\d\d-\d\d|\d{1,2} ?[a-z]+\.?|[a-z]+\.?(?: ?\d{1,2})?)(?: (?:to|until|till|through|thru) | ?\.\. ?| ?- ?)(?<to>\d\d-\d\d|\d{1,2} ?[a-z]+\.?|[a-z]+\.?(?: ?\d{1,2})?)$", RegexOptions.IgnoreCase)]
    private static partial Regex SpanPattern();

    [GeneratedRegex(@"^(?:(?<mm>\d\d)-(?<dd>\d\d)|(?<day>\d{1,2}) ?(?<name>[a-z]+\.?)|(?<name>[a-z]+\.?)(?: ?(?<dayafter>\d{1,2}))?)$", RegexOptions.IgnoreCase)]
    private static partial Regex EndPattern();
}
