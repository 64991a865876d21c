using HeadToWatts.Hydraulics.Water;

namespace HeadToWatts.Pumping;

/// <summary>Net positive suction head: whether the water reaches the pump without boiling.</summary>
public static class SuctionHead
{
    /// <summary>Head available at the pump, m.</summary>
    /// <param name="site">Air pressure, vapour pressure and specific weight.</param>
    /// <param name="suctionLiftM">Height of the pump over the water it draws from, m; negative when it stands below.</param>
    /// <param name="suctionLossM">Head lost in the suction pipe, m; zero or more.</param>
    public static double AvailableM(SiteConditions site, double suctionLiftM, double suctionLossM)
    {
        ArgumentNullException.ThrowIfNull(site);
        if (!double.IsFinite(suctionLiftM))
            throw new ArgumentOutOfRangeException(nameof(suctionLiftM), suctionLiftM, "A lift is a number.");
        if (!(suctionLossM >= 0 && double.IsFinite(suctionLossM)))
            throw new ArgumentOutOfRangeException(nameof(suctionLossM), suctionLossM, "A loss is zero or more.");
        return ((site.AtmosphericPressurePa - site.Water.VapourPressurePa) / site.SpecificWeightNPerM3) - suctionLiftM - suctionLossM;
    }
}
