using HeadToWatts.EnergyYield;
using HeadToWatts.Hydraulics.Water;
using HeadToWatts.Pumping;
using HeadToWatts.Studies.Inputs;
using HeadToWatts.Studies.Results;

namespace HeadToWatts.Studies;

/// <summary>Sets pumping beside generation.</summary>
internal static class PumpingStudy
{
    internal static PumpingSide? Of(PumpingInput? input, SiteConditions site, AnnualEnergy annual, DailyRun? days) => input is null
        ? null
        : new PumpingSide(
            PumpingRun.Of([.. input.Plants.Select(p => p.Plant)], site),
            days is null ? null : [.. days.Months.Select(m => m.MeanEnergyKwh)],
            annual.AnnualEnergyKwh,
            [.. input.Plants.Select(p => p.SuctionLiftM is { } lift ? SuctionHead.AvailableM(site, lift, p.SuctionLossM) : (double?)null)]);
}
