using HeadToWatts.EnergyYield;
using HeadToWatts.Studies.Inputs;
using HeadToWatts.Turbines;
using HeadToWatts.Turbines.Units;

namespace HeadToWatts.Studies;

/// <summary>What the chosen units do away from their rated head.</summary>
internal static class AwayFromRated
{
    internal static HeadBehaviour? Of(TurbineInput turbine, TurbineType type, PlantDesign design)
    {
        if (turbine.HillChart is { } chart)
            return chart;
        var ratedHeadM = design.NetHeadM(design.Units.DesignFlowM3PerS);

        // Screws and wheels follow the water's level by themselves; their speed is not tied to the head.
        if (!turbine.FollowsHead || type.OwnSpeedRule is not null || ratedHeadM <= 0)
            return null;
        var leastM = turbine.LeastHeadM ?? ((turbine.LeastHeadRatio ?? HeldSpeed.UsualLeastHeadRatio) * ratedHeadM);
        return new HeldSpeed(ratedHeadM, (type.Runaway.Lowest + type.Runaway.Highest) / 2, leastM);
    }
}
