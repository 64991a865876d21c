using HeadToWatts.FlowRecords;
using HeadToWatts.Hydraulics.Levels;

namespace HeadToWatts.EnergyYield;

/// <summary>
/// Gross head where headwater or tailwater follows the flow or the month. The levels are read at the flow that passes the site:
/// what arrives, less prior deliveries, whether it goes through the machine or past it.
/// </summary>
/// <param name="headwater">Headwater level.</param>
/// <param name="tailwater">Tailwater level.</param>
/// <param name="allocation">Prior deliveries and reserved flow.</param>
/// <param name="month">Month, 1 to 12.</param>
public sealed class MovingHead(LevelRule headwater, LevelRule tailwater, WaterAllocation allocation, int month)
{
    /// <summary>Headwater level when the plant may use a flow, m.</summary>
    /// <param name="usableFlowM3PerS">Usable flow, m3/s.</param>
    public double HeadwaterM(double usableFlowM3PerS) => headwater.LevelM(PassingM3PerS(usableFlowM3PerS), month);

    /// <summary>Tailwater level when the plant may use a flow, m.</summary>
    /// <param name="usableFlowM3PerS">Usable flow, m3/s.</param>
    public double TailwaterM(double usableFlowM3PerS) => tailwater.LevelM(PassingM3PerS(usableFlowM3PerS), month);

    /// <summary>Gross head when the plant may use a flow, m; zero or below when the tailwater has drowned the fall.</summary>
    /// <param name="usableFlowM3PerS">Usable flow, m3/s.</param>
    public double GrossHeadM(double usableFlowM3PerS)
    {
        var passing = PassingM3PerS(usableFlowM3PerS);
        return headwater.LevelM(passing, month) - tailwater.LevelM(passing, month);
    }

    /// <summary>The flow that passes the site when the plant may use a flow above zero, m3/s.</summary>
    /// <param name="usableFlowM3PerS">Usable flow, m3/s.</param>
    public double PassingM3PerS(double usableFlowM3PerS)
    {
        // The greater of what the constant or floor and what the share of the flow leaves in the stream.
        var (reserved, prior) = (allocation.Reserved, allocation.PriorDeliveriesM3PerS);
        var byFloor = usableFlowM3PerS + reserved.FlowM3PerS;
        return reserved.Ratio is > 0 and < 1 ? Math.Max(byFloor, ((usableFlowM3PerS + prior) / (1 - reserved.Ratio)) - prior) : byFloor;
    }

    /// <summary>Usable flows at which a rating changes its slope, m3/s.</summary>
    public IEnumerable<double> BreakpointsM3PerS()
    {
        foreach (var rule in new[] { headwater, tailwater })
        {
            if (rule is not RatedLevel rated)
                continue;
            foreach (var point in rated.Points)
            {
                var usable = allocation.Split(point.FlowM3PerS + allocation.PriorDeliveriesM3PerS).UsableM3PerS;
                if (usable > 0)
                    yield return usable;
            }
        }
    }
}
