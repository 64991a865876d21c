using System.Text.RegularExpressions;
using HeadToWatts.Basis.Units;
using HeadToWatts.FlowRecords.Reserved;

namespace HeadToWatts.Files.StudyFiles;

/// <summary>Reads what a reserved flow is in words: "0.4 m3/s", "20 %", "20 %, at least 2 cfs", "Tennant good", "70 % of Q95", "7Q10", "none".</summary>
internal static partial class ReservedText
{
    private const double LargestFlowM3PerS = 20_000;
    private const string Accepted = "a flow, a percent of the flow, a percent with a floor (20 %, at least 2 cfs), Tennant good, 70 % of Q95, 7Q10, or none";

    /// <summary>The rule; null with a problem reported when it cannot be read.</summary>
    internal static ReservedRule? Read(string text, FlowStatistics flows, string where, FieldReader read)
    {
        var words = text.Trim();
        if (words.Equals("none", StringComparison.OrdinalIgnoreCase))
            return new NothingReserved();
        if (Tennant().Match(words) is { Success: true } level)
            return OfTennant(text, level.Groups[1].Value, flows, where, read);
        if (LowFlowShare().Match(words) is { Success: true } share)
            return OfLowFlow(text, share, flows, where, read);
        if (Floored().Match(words) is { Success: true } floored)
        {
            var ratio = read.Optional(floored.Groups[1].Value, Dimension.Ratio, where, 0, 1);
            var floor = read.Optional(floored.Groups[2].Value, Dimension.Flow, where, 0, LargestFlowM3PerS);
            return ratio is { } r && floor is { } f ? new ProportionalReserved(r, f) : null;
        }

        if (words.Contains('%', StringComparison.Ordinal))
            return read.Optional(words, Dimension.Ratio, where, 0, 1) is { } plain ? new ProportionalReserved(plain) : null;
        if (words.Length == 0 || !(char.IsDigit(words[0]) || words[0] is '.' or '-' or '+'))
        {
            read.Refuse(where, text, "this rule of reserved flow is not known", Accepted);
            return null;
        }

        return read.Optional(words, Dimension.Flow, where, 0, LargestFlowM3PerS) is { } flow ? new ConstantReserved(flow) : null;
    }

    private static TennantReserved? OfTennant(string text, string name, FlowStatistics flows, string where, FieldReader read)
    {
        if (TennantLevels.Find(name) is not { } level)
        {
            read.Refuse(where, text, "this level of Tennant's table is not known", string.Join(", ", TennantLevels.All.Select(l => "Tennant " + l.Id)));
            return null;
        }

        if (flows.MeanAnnualM3PerS is { } mean)
            return new TennantReserved(mean, level);
        read.Refuse(where, text, "the mean annual flow is not known here", "a daily record, or rows of a curve that count the whole year");
        return null;
    }

    private static LowFlowReserved? OfLowFlow(string text, Match share, FlowStatistics flows, string where, FieldReader read)
    {
        double? ratio = 1;
        if (share.Groups[1].Success)
            ratio = read.Optional(share.Groups[1].Value, Dimension.Ratio, where, 0, 10);
        if (ratio is not { } part)
            return null;
        if (share.Groups[2].Value.Equals("Q95", StringComparison.OrdinalIgnoreCase))
        {
            if (flows.Q95M3PerS is { } q95)
                return new LowFlowReserved("Q95", q95, part);
            read.Refuse(where, text, "Q95 is not known here", "a daily record, or rows of a curve that count the whole year");
            return null;
        }

        if (flows.SevenQTen is { } low)
            return new LowFlowReserved("7Q10", low.FlowM3PerS, part) { StatisticUses = low.Uses };
        read.Refuse(where, text, flows.HasRecord ? "7Q10 cannot be reckoned: fewer than three whole years from 1 April have a flow" : "7Q10 needs a daily record", "a daily record of three whole years or more, or a flow");
        return null;
    }

    [GeneratedRegex(@"^Tennant[\s:,]+(\w+)$", RegexOptions.IgnoreCase | RegexOptions.CultureInvariant)]
    private static partial Regex Tennant();

    [GeneratedRegex(@"^(?:(.+%)\s*of\s+)?(Q95|7Q10)$", RegexOptions.IgnoreCase | RegexOptions.CultureInvariant)]
    private static partial Regex LowFlowShare();

    [GeneratedRegex(@"^(.+%)\s*,?\s*at least\s+(.+)$", RegexOptions.IgnoreCase | RegexOptions.CultureInvariant)]
    private static partial Regex Floored();
}
