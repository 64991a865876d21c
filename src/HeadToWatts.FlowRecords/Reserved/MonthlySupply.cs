namespace HeadToWatts.FlowRecords.Reserved;

/// <summary>The supply of one month: run the plant on it as on a year that is dry outside the month, and add up the months.</summary>
/// <param name="Month">1 to 12.</param>
/// <param name="ShareOfYear">Share of the year that its days of operation take.</param>
/// <param name="EnergyCurve">The month's days in order of size, each an equal share, over the whole year: dry outside the month. Energy is summed over it.</param>
/// <param name="Allocation">What comes off in the month.</param>
public sealed record MonthSupply(int Month, double ShareOfYear, FlowDurationCurve EnergyCurve, WaterAllocation Allocation);

/// <summary>
/// How rules that change by month enter the flow-duration curve: the days of each month have a curve of their own and the
/// month's own allocation. A curve of the whole year mixes the months and cannot tell which of its flows belong to which rule.
/// </summary>
public static class MonthlySupply
{
    /// <summary>The months that have days of operation and at least one day with a flow.</summary>
    /// <param name="gauge">Record at the gauge.</param>
    /// <param name="season">Operating season.</param>
    /// <param name="rules">The rules.</param>
    public static IReadOnlyList<MonthSupply> Of(DailyRecord gauge, OperatingSeason season, WaterRules rules)
    {
        ArgumentNullException.ThrowIfNull(gauge);
        ArgumentNullException.ThrowIfNull(rules);
        var site = rules.Seepage.At(gauge);
        var months = new List<MonthSupply>(12);
        if (rules.SeasonWithin(season) is not { } days)
            return months;
        for (var month = 1; month <= 12; month++)
        {
            if (days.Within(OperatingSeason.Months([month])) is { } own && site.ValidDaysIn(own) > 0)
                months.Add(new MonthSupply(month, own.ShareOfYear, FlowDurationCurve.OfDays(site, own), rules.ForMonth(month)));
        }

        return months;
    }
}
