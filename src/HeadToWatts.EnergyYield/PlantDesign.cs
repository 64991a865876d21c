using HeadToWatts.Basis.Quantities;
using HeadToWatts.Hydraulics.Water;
using HeadToWatts.Hydraulics.Waterways;
using HeadToWatts.Turbines.Units;

namespace HeadToWatts.EnergyYield;

/// <summary>A plant as it is to be run: the fall, the waterway, the units and what lies behind them.</summary>
/// <param name="Site">Water and gravity at the site.</param>
/// <param name="GrossHead">Gross head; where it moves with the flow, the one at the design flow.</param>
/// <param name="Waterway">Waterway up to the machine, shared by all units.</param>
/// <param name="Units">The units.</param>
/// <param name="Train">From the shaft to the meter.</param>
public sealed record PlantDesign(SiteConditions Site, GrossHead GrossHead, Waterway Waterway, UnitSet Units, PowerTrain Train)
{
    /// <summary>Tabulated losses for quick comparisons; null where figures are reported.</summary>
    public LossTable? QuickLosses { get; init; }

    /// <summary>Gross head over usable flow, where the levels move with the flow; null where they stay.</summary>
    public MovingHead? MovingHead { get; init; }

    /// <summary>Gross head on a usable flow, m.</summary>
    /// <param name="usableFlowM3PerS">Usable flow, m3/s.</param>
    public double GrossHeadM(double usableFlowM3PerS) => MovingHead?.GrossHeadM(usableFlowM3PerS) ?? GrossHead.Metres;

    /// <summary>Head lost when the waterway carries a flow, m.</summary>
    /// <param name="turbineFlowM3PerS">Flow through the waterway, m3/s.</param>
    public double LossM(double turbineFlowM3PerS) => QuickLosses?.LossM(turbineFlowM3PerS) ?? Waterway.LossM(turbineFlowM3PerS, Site);

    /// <summary>Net head when the waterway carries a flow and the gross head is that of the design flow, m.</summary>
    /// <param name="turbineFlowM3PerS">Flow through the waterway, m3/s.</param>
    public double NetHeadM(double turbineFlowM3PerS) => GrossHead.Metres - LossM(turbineFlowM3PerS);
}
