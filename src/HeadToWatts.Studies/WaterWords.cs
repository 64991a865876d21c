using HeadToWatts.Basis.Units;
using HeadToWatts.FlowRecords;
using HeadToWatts.FlowRecords.Reserved;
using HeadToWatts.Studies.Inputs;

namespace HeadToWatts.Studies;

/// <summary>What comes off the flow before the plant, in words and in the units shown.</summary>
public static class WaterWords
{
    /// <summary>A reserved flow, as "20 % of the flow arriving, at least 2.00 cfs".</summary>
    /// <param name="reserved">The reserved flow.</param>
    /// <param name="show">Units.</param>
    public static string Amount(ReservedFlow reserved, UnitDisplay show)
    {
        ArgumentNullException.ThrowIfNull(reserved);
        ArgumentNullException.ThrowIfNull(show);
        return reserved.Kind switch
        {
            ReservedFlowKind.Constant when reserved.FlowM3PerS > 0 => show.Flow(reserved.FlowM3PerS),
            ReservedFlowKind.PercentOfFlow => UnitDisplay.Percent(reserved.Ratio) + " of the flow arriving",
            ReservedFlowKind.PercentWithFloor => $"{UnitDisplay.Percent(reserved.Ratio)} of the flow arriving, at least {show.Flow(reserved.FlowM3PerS)}",
            _ => "none",
        };
    }

    /// <summary>The rule of the reserved flow, as "Tennant's level good: ...".</summary>
    /// <param name="flow">The flow of the study.</param>
    /// <param name="show">Units.</param>
    public static string Reserved(FlowInput flow, UnitDisplay show)
    {
        ArgumentNullException.ThrowIfNull(flow);
        ArgumentNullException.ThrowIfNull(show);
        return flow.Rules?.Reserved switch
        {
            TennantReserved t => $"Tennant's level “{t.Level.Name}”: {UnitDisplay.Percent(t.Level.WinterRatio)} of the mean annual flow of {show.Flow(t.MeanAnnualFlowM3PerS)} from October to March ({show.Flow(t.MeanAnnualFlowM3PerS * t.Level.WinterRatio)}), {UnitDisplay.Percent(t.Level.SummerRatio)} from April to September ({show.Flow(t.MeanAnnualFlowM3PerS * t.Level.SummerRatio)})",
            LowFlowReserved low => (low.Ratio == 1 ? low.Statistic : $"{UnitDisplay.Percent(low.Ratio)} of {low.Statistic}") + $", {show.Flow(low.StatisticFlowM3PerS * low.Ratio)}",
            MonthlyReserved months => "by month, January first: " + string.Join("; ", months.Months.Select(m => Amount(m, show))),
            _ when flow.Allocation.Reserved.Kind == ReservedFlowKind.None || Amount(flow.Allocation.Reserved, show) == "none" => ReservedWasStated(flow) ? "none, as stated" : "not stated",
            _ => Amount(flow.Allocation.Reserved, show),
        };
    }

    /// <summary>The deliveries that come first, one line each; empty when there is none.</summary>
    /// <param name="flow">The flow of the study.</param>
    /// <param name="show">Units.</param>
    public static IReadOnlyList<string> Deliveries(FlowInput flow, UnitDisplay show)
    {
        ArgumentNullException.ThrowIfNull(flow);
        ArgumentNullException.ThrowIfNull(show);
        if (flow.Rules is null)
            return flow.Allocation.PriorDeliveriesM3PerS > 0 ? [$"prior deliveries, {show.Flow(flow.Allocation.PriorDeliveriesM3PerS)}"] : [];
        return [.. flow.Rules.Deliveries.Select(d => $"{d.Name}, {show.Flow(d.FlowsM3PerS.Max())}{Months(d.FlowsM3PerS)}")];
    }

    /// <summary>The water right, as "3.00 m3/s, Apr 15 to Oct 15".</summary>
    /// <param name="flow">The flow of the study.</param>
    /// <param name="show">Units.</param>
    public static string Right(FlowInput flow, UnitDisplay show)
    {
        ArgumentNullException.ThrowIfNull(flow);
        ArgumentNullException.ThrowIfNull(show);
        return flow.Rules?.Right switch
        {
            null => "not given",
            { RateM3PerS: { } rate } right => $"{show.Flow(rate)}, {right.Season.Describe()}",
            { } right => $"no rate named, {right.Season.Describe()}",
        };
    }

    /// <summary>The loss between gauge and site.</summary>
    /// <param name="loss">The loss.</param>
    /// <param name="show">Units.</param>
    public static string Loss(ReachLoss loss, UnitDisplay show)
    {
        ArgumentNullException.ThrowIfNull(loss);
        ArgumentNullException.ThrowIfNull(show);
        return (loss.SeepageRatio, loss.LossM3PerS) switch
        {
            (0, 0) => "none",
            (_, 0) => UnitDisplay.Percent(loss.SeepageRatio) + " of the flow",
            (0, _) => show.Flow(loss.LossM3PerS),
            _ => $"{UnitDisplay.Percent(loss.SeepageRatio)} of the flow and {show.Flow(loss.LossM3PerS)}",
        };
    }

    private static bool ReservedWasStated(FlowInput flow) => flow.ReservedFlowIsStated;

    // "", ", April to September" or ", in Apr, May and Oct" would all be right; the span is what people say.
    private static string Months(IReadOnlyList<double> flowsM3PerS)
    {
        var months = Enumerable.Range(1, 12).Where(m => flowsM3PerS[m - 1] > 0).ToList();
        return months.Count is 0 or 12 ? "" : " in " + OperatingSeason.Months(months).Describe();
    }
}
