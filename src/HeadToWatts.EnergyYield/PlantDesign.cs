using HeadToWatts.Basis.Quantities;
using HeadToWatts.Hydraulics.Water;
using HeadToWatts.Hydraulics.Waterways;
using HeadToWatts.Turbines.Units;

namespace HeadToWatts.EnergyYield;

/// <summary>A plant as it is to be run: the fall, the waterway, the units and what lies behind them.</summary>
/// <param name="Site">Water and gravity at the site.</param>
/// <param name="GrossHead">Gross head.</param>
/// <param name="Waterway">Waterway up to the machine, shared by all units.</param>
/// <param name="Units">The units.</param>
/// <param name="Train">From the shaft to the meter.</param>
public sealed record PlantDesign(SiteConditions Site, GrossHead GrossHead, Waterway Waterway, UnitSet Units, PowerTrain Train)
{
    /// <summary>Tabulated losses for quick comparisons; null where figures are reported.</summary>
    public LossTable? QuickLosses { get; init; }

    /// <summary>Net head when the waterway carries a flow, m.</summary>
    /// <param name="turbineFlowM3PerS">Flow through the waterway, m3/s.</param>
    public double NetHeadM(double turbineFlowM3PerS) => 
        GrossHead.Metres - (QuickLosses?.LossM(turbineFlowM3PerS) ?? Waterway.LossM(turbineFlowM3PerS, Site));
}
