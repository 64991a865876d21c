using HeadToWatts.Basis.Sources;

namespace HeadToWatts.EnergyYield;

/// <summary>Methods of this stage.</summary>
public static class EnergyMethods
{
    private static readonly Source Handbook = new("usace-tp-61", SourceKind.Published, "US Army Corps of Engineers, Hydrologic Engineering Center", "1979", "Feasibility studies for small scale hydropower additions", "Technical Paper 61");

    /// <summary>Power of falling water.</summary>
    public static Method WaterPower { get; } = new("water-power", "Power of falling water", "P = η γ Q H_n", Handbook, "", []);

    /// <summary>Energy over a flow-duration curve.</summary>
    public static Method AnnualEnergy { get; } = new("duration-curve-energy", "Energy over the flow-duration curve", "E = A 8760 h ∫ P(Q(p)) dp", Handbook, "", []);

    /// <summary>Plant factor.</summary>
    public static Method PlantFactor { get; } = new("plant-factor", "Plant factor", "CF = E/(P_{installed} 8760 h)", Handbook, "", []);

    /// <summary>Every method of this stage.</summary>
    public static IReadOnlyList<Method> All { get; } = [WaterPower, AnnualEnergy, PlantFactor, .. Electrical.ElectricalMethods.All];
}
