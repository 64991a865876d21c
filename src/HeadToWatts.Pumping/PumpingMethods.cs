using HeadToWatts.Basis.Sources;

namespace HeadToWatts.Pumping;

/// <summary>Methods of this stage.</summary>
public static class PumpingMethods
{
    /// <summary>Power a pump takes for its water.</summary>
    public static Method PumpPower { get; } = new("pump-power", "Power taken by a pump", "P = γ Q H/η", PumpingSources.Daugherty, "ch. 14", []);

    /// <summary>What a good plant needs.</summary>
    public static Method Performance { get; } = new("pumping-performance", "Nebraska Pumping Plant Performance Criteria", "rating = whp-h per unit of energy over the criterion", PumpingSources.Nebraska, "", []);

    /// <summary>Suction head available.</summary>
    public static Method SuctionHead { get; } = new("npsh-available", "Net positive suction head available", "NPSH_a = (p_{atm} − p_v)/γ − z_s − h_s", PumpingSources.Munson, "ch. 12", []);

    /// <summary>Every method of this stage.</summary>
    public static IReadOnlyList<Method> All { get; } = [PumpPower, Performance, SuctionHead];
}
