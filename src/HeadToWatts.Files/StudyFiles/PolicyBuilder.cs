using System.Globalization;
using System.Text.RegularExpressions;
using HeadToWatts.Basis.Problems;
using HeadToWatts.Basis.Units;
using HeadToWatts.FlowRecords.Quality;
using HeadToWatts.FlowRecords.SubDaily;

namespace HeadToWatts.Files.StudyFiles;

/// <summary>Turns the choices about a record into policies, or lists what is wrong with them.</summary>
public static partial class PolicyBuilder
{
    private const int LongestGapDays = 366;

    /// <summary>Builds the policies.</summary>
    /// <param name="document">The choices; null for the usual ones.</param>
    /// <param name="where">Field that holds them.</param>
    /// <param name="problems">Receives the problems.</param>
    /// <returns>The policies; the usual ones where a choice is wrong.</returns>
    public static RecordPolicies Policies(PolicyDocument? document, string where, ICollection<Problem> problems)
    {
        ArgumentNullException.ThrowIfNull(problems);
        if (document is null)
            return RecordPolicies.Default;
        var policies = RecordPolicies.Default with
        {
            Negatives = Choice(document.Negatives, where + ".negatives", problems,
                ("refused", NegativePolicy.Refused), ("zeroed", NegativePolicy.Zeroed), ("kept out", NegativePolicy.KeptOut), ("kept", NegativePolicy.Kept)),
            KeepEstimated = Choice(document.Estimated, where + ".estimated", problems, ("kept", true), ("left out", false)),
            Repeats = Choice(document.Repeats, where + ".repeats", problems, ("refused", RepeatPolicy.Refused), ("first", RepeatPolicy.First), ("last", RepeatPolicy.Last)),
            YearStartMonth = Month(document.YearStarts, where + ".yearStarts", problems),
        };
        var gaps = (document.Gaps ?? "").Trim().ToLowerInvariant();
        if (Interpolated().Match(gaps) is { Success: true } match && int.Parse(match.Groups[1].Value, CultureInfo.InvariantCulture) is var days and >= 1 and <= LongestGapDays)
            return policies with { Gaps = GapPolicy.Interpolated, LongestGapDays = days };
        switch (gaps)
        {
            case "" or "left out":
                return policies;
            case "whole years only":
                return policies with { Gaps = GapPolicy.WholeYearsOnly };
            default:
                problems.Add(new Problem(where + ".gaps", document.Gaps!, "this choice is not known", "left out, interpolated up to 5 days (1 to 366), whole years only"));
                return policies;
        }
    }

    /// <summary>Builds the settings for values within a day.</summary>
    /// <param name="document">The choices; null for the usual ones.</param>
    /// <param name="where">Field that holds them.</param>
    /// <param name="problems">Receives the problems.</param>
    public static SubDailySettings SubDaily(PolicyDocument? document, string where, ICollection<Problem> problems)
    {
        ArgumentNullException.ThrowIfNull(problems);
        var settings = SubDailySettings.Default;
        if (!string.IsNullOrWhiteSpace(document?.DayShare) && QuantityText.Read(document.DayShare, Dimension.Ratio, null, where + ".dayShare").TryGet(problems, out var share))
        {
            if (share is > 0 and <= 1)
                settings = settings with { DayShareNeeded = share };
            else
                problems.Add(new Problem(where + ".dayShare", document.DayShare, "it lies outside what is possible here", "above 0 to 100 %"));
        }

        if (!string.IsNullOrWhiteSpace(document?.LongestStep) && QuantityText.Read(document.LongestStep, Dimension.Duration, null, where + ".longestStep").TryGet(problems, out var seconds))
        {
            if (seconds is >= 1 and <= 86_400 * 31)
                settings = settings with { LongestStep = TimeSpan.FromSeconds(seconds) };
            else
                problems.Add(new Problem(where + ".longestStep", document.LongestStep, "it lies outside what is possible here", "1 s to 744 h"));
        }

        return settings;
    }

    /// <summary>The document of policies; choices that are the usual ones are left out of it.</summary>
    /// <param name="policies">The policies.</param>
    /// <param name="subDaily">The settings for values within a day; null for the usual ones.</param>
    public static PolicyDocument From(RecordPolicies policies, SubDailySettings? subDaily = null)
    {
        ArgumentNullException.ThrowIfNull(policies);
        return new PolicyDocument
        {
            Gaps = policies.Gaps switch
            {
                GapPolicy.Interpolated => $"interpolated up to {policies.LongestGapDays.ToString(CultureInfo.InvariantCulture)} days",
                GapPolicy.WholeYearsOnly => "whole years only",
                _ => null,
            },
            YearStarts = policies.YearStartMonth == 1 ? null : CultureInfo.InvariantCulture.DateTimeFormat.GetAbbreviatedMonthName(policies.YearStartMonth),
            Negatives = policies.Negatives switch { NegativePolicy.Zeroed => "zeroed", NegativePolicy.KeptOut => "kept out", NegativePolicy.Kept => "kept", _ => null },
            Estimated = policies.KeepEstimated ? null : "left out",
            Repeats = policies.Repeats switch { RepeatPolicy.First => "first", RepeatPolicy.Last => "last", _ => null },
            DayShare = subDaily is null || subDaily.DayShareNeeded == SubDailySettings.Default.DayShareNeeded ? null : (subDaily.DayShareNeeded * 100).ToString("R", CultureInfo.InvariantCulture) + " %",
            LongestStep = subDaily?.LongestStep is { } step ? step.TotalSeconds.ToString("R", CultureInfo.InvariantCulture) + " s" : null,
        };
    }

    internal static PolicyDocument Fields(JsonObjectReader r) => new()
    {
        Gaps = r.Text("gaps"),
        YearStarts = r.Text("yearStarts"),
        Negatives = r.Text("negatives"),
        Estimated = r.Text("estimated"),
        Repeats = r.Text("repeats"),
        DayShare = r.Text("dayShare"),
        LongestStep = r.Text("longestStep"),
    };

    // The first choice holds when nothing is entered.
    private static T Choice<T>(string? text, string where, ICollection<Problem> problems, params (string Word, T Value)[] choices)
    {
        if (string.IsNullOrWhiteSpace(text))
            return choices[0].Value;
        foreach (var (word, value) in choices)
        {
            if (word.Equals(text.Trim(), StringComparison.OrdinalIgnoreCase))
                return value;
        }

        problems.Add(new Problem(where, text.Trim(), "this choice is not known", string.Join(", ", choices.Select(c => c.Word))));
        return choices[0].Value;
    }

    private static int Month(string? text, string where, ICollection<Problem> problems)
    {
        if (string.IsNullOrWhiteSpace(text))
            return 1;
        var word = text.Trim();
        for (var month = 1; month <= 12; month++)
        {
            if (word.Length >= 3 && CultureInfo.InvariantCulture.DateTimeFormat.GetMonthName(month).StartsWith(word, StringComparison.OrdinalIgnoreCase))
                return month;
        }

        problems.Add(new Problem(where, word, "this is not the name of a month", "Jan to Dec"));
        return 1;
    }

    [GeneratedRegex(@"^interpolated up to (\d{1,3}) days?$")]
    private static partial Regex Interpolated();
}
