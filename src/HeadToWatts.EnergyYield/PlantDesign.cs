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

    /// <summary>What the units do away from their rated head; null where capacity and efficiency are held.</summary>
    public HeadBehaviour? HeadBehaviour { get; init; }

    /// <summary>Gross head on a usable flow, m.</summary>
    /// <param name="usableFlowM3PerS">Usable flow, m3/s.</param>
    public double GrossHeadM(double usableFlowM3PerS) => MovingHead?.GrossHeadM(usableFlowM3PerS) ?? GrossHead.Metres;

    /// <summary>Head lost when the waterway carries a flow, m.</summary>
    /// <param name="turbineFlowM3PerS">Flow through the waterway, m3/s.</param>
    public double LossM(double turbineFlowM3PerS) => QuickLosses?.LossM(turbineFlowM3PerS) ?? Waterway.LossM(turbineFlowM3PerS, Site);

    /// <summary>Most that the units pass at a gross head, m3/s.</summary>
    /// <param name="grossHeadM">Gross head, m.</param>
    public double CapacityM3PerS(double grossHeadM)
    {
        if (HeadBehaviour is null)
            return Units.DesignFlowM3PerS;

        // The loss goes with what is passed, so twice is near enough: the capacity moves with the root of the head only.
        var flow = Units.DesignFlowM3PerS * HeadBehaviour.CapacityRatio(grossHeadM - LossM(Units.DesignFlowM3PerS));
        return Units.DesignFlowM3PerS * HeadBehaviour.CapacityRatio(grossHeadM - LossM(flow));
    }

    /// <summary>Net head when the waterway carries a flow and the gross head is that of the design flow, m.</summary>
    /// <param name="turbineFlowM3PerS">Flow through the waterway, m3/s.</param>
    public double NetHeadM(double turbineFlowM3PerS) => GrossHead.Metres - LossM(turbineFlowM3PerS);
}
