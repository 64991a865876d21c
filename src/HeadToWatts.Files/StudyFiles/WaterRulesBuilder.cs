using System.Text.RegularExpressions;
using HeadToWatts.Basis.Units;
using HeadToWatts.FlowRecords;
using HeadToWatts.FlowRecords.Reserved;

namespace HeadToWatts.Files.StudyFiles;

/// <summary>Builds what comes off the flow before the plant: loss on the way, prior deliveries, reserved flow, water right.</summary>
internal static partial class WaterRulesBuilder
{
    private const double LargestFlowM3PerS = 20_000;

    /// <summary>The loss between gauge and site.</summary>
    internal static ReachLoss Loss(string? text, string where, FieldReader read)
    {
        if (string.IsNullOrWhiteSpace(text) || text.Trim().Equals("none", StringComparison.OrdinalIgnoreCase))
            return ReachLoss.None;
        var both = Both().Match(text.Trim());
        double? ratio = 0, flow = 0;
        if (both.Success)
        {
            ratio = read.Optional(both.Groups[1].Value, Dimension.Ratio, where, 0, 0.99);
            flow = read.Optional(both.Groups[2].Value, Dimension.Flow, where, 0, LargestFlowM3PerS);
        }
        else if (text.Contains('%', StringComparison.Ordinal))
        {
            ratio = read.Optional(text, Dimension.Ratio, where, 0, 0.99);
        }
        else
        {
            flow = read.Optional(text, Dimension.Flow, where, 0, LargestFlowM3PerS);
        }

        return ratio is { } r && flow is { } f ? new ReachLoss(r, f) : ReachLoss.None;
    }

    /// <summary>The rules; null with problems reported when something cannot be read.</summary>
    internal static WaterRules? Build(FlowDocument d, string path, FlowStatistics flows, ReachLoss loss, FieldReader read)
    {
        var before = read.Problems.Count;
        var reserved = Reserved(d, path, flows, read);
        var deliveries = new List<Delivery>();
        if (read.Optional(d.PriorDeliveries, Dimension.Flow, path + ".priorDeliveries", 0, LargestFlowM3PerS) is { } prior and > 0)
            deliveries.Add(new Delivery("prior deliveries", prior));
        for (var i = 0; i < (d.Turnouts?.Count ?? 0); i++)
        {
            if (Turnout(d.Turnouts![i], i, $"{path}.turnouts[{i}]", read) is { } turnout)
                deliveries.Add(turnout);
        }

        var right = Right(d.WaterRight, path + ".waterRight", read);
        return read.Problems.Count > before ? null : new WaterRules(reserved ?? new NothingReserved(), deliveries, right, loss);
    }

    private static ReservedRule? Reserved(FlowDocument d, string path, FlowStatistics flows, FieldReader read)
    {
        if (d.ReservedByMonth is not { Count: > 0 } months)
            return string.IsNullOrWhiteSpace(d.ReservedFlow) ? null : ReservedText.Read(d.ReservedFlow, flows, path + ".reservedFlow", read);
        if (!string.IsNullOrWhiteSpace(d.ReservedFlow))
            read.Refuse(path + ".reservedByMonth", d.ReservedFlow, "reserved flow is given for the year and by month", "one of the two");
        if (months.Count != 12)
        {
            read.Refuse(path + ".reservedByMonth", $"{months.Count} flows", "twelve flows are wanted, January first");
            return null;
        }

        var rules = new List<ReservedFlow>(12);
        for (var i = 0; i < 12; i++)
        {
            var where = $"{path}.reservedByMonth[{i}]";
            if (string.IsNullOrWhiteSpace(months[i]))
                read.Refuse(where, months[i], "nothing is entered", "a flow, a percent of the flow arriving, or none");
            else if (ReservedText.Read(months[i]!, flows, where, read) is { } rule)
                rules.Add(rule.ReservedIn(i + 1));
        }

        return rules.Count == 12 ? new MonthlyReserved(rules) : null;
    }

    private static Delivery? Turnout(TurnoutDocument d, int index, string path, FieldReader read)
    {
        if (string.IsNullOrWhiteSpace(d.Flow))
        {
            read.Refuse(path + ".flow", d.Flow, "nothing is entered", "a flow");
            return null;
        }

        var flow = read.Optional(d.Flow, Dimension.Flow, path + ".flow", 0, LargestFlowM3PerS);
        var season = Season(d.Season, path + ".season", read);
        if (flow is not { } amount || season is null)
            return null;
        var name = string.IsNullOrWhiteSpace(d.Name) ? $"turnout {index + 1}" : d.Name.Trim();
        var partly = Enumerable.Range(1, 12).Where(m => season.RunsInMonth(m) && season.DaysInMonth(m) < FullDays(m)).ToList();
        if (partly.Count > 0)
            read.Assume($"{name} is taken for part of {string.Join(" and ", partly.Select(m => System.Globalization.CultureInfo.InvariantCulture.DateTimeFormat.GetMonthName(m)))} only; it is counted for the whole month, which leaves the plant less.");
        return new Delivery(name, [.. Enumerable.Range(1, 12).Select(m => season.RunsInMonth(m) ? amount : 0)]);
    }

    private static WaterRight? Right(WaterRightDocument? d, string path, FieldReader read)
    {
        if (d is null)
            return null;
        var rate = read.Optional(d.Rate, Dimension.Flow, path + ".rate", 0, LargestFlowM3PerS);
        var season = Season(d.Season, path + ".season", read);
        if (string.IsNullOrWhiteSpace(d.Rate) && string.IsNullOrWhiteSpace(d.Season))
            read.Refuse(path, "", "a water right has a rate, days, or both", "rate, season");
        return season is null ? null : new WaterRight(rate, season);
    }

    private static OperatingSeason? Season(string? text, string where, FieldReader read) =>
        string.IsNullOrWhiteSpace(text) ? OperatingSeason.WholeYear : OperatingSeason.Parse(text, where).TryGet(read.Problems, out var season) ? season : null;

    private static double FullDays(int month) => OperatingSeason.WholeYear.DaysInMonth(month);

    [GeneratedRegex(@"^(.+%)\s*(?:and|,|\+)\s*(.+)$", RegexOptions.IgnoreCase | RegexOptions.CultureInvariant)]
    private static partial Regex Both();
}
