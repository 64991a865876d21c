using HeadToWatts.Basis.Sources;

namespace HeadToWatts.Turbines.Units;

/// <summary>What a unit does at a head other than the one it is rated for.</summary>
public abstract class HeadBehaviour
{
    /// <summary>The method used, with the span of heads.</summary>
    public abstract MethodUse Use { get; }

    /// <summary>Most that a unit passes at a net head, over its full flow at the rated head; 0 to 1.</summary>
    /// <param name="netHeadM">Net head, m.</param>
    public abstract double CapacityRatio(double netHeadM);

    /// <summary>Efficiency at a net head, 0 to 1; 0 where the unit is shut off.</summary>
    /// <param name="openingRatio">Flow of the unit over what it can pass at this head, 0 to 1.</param>
    /// <param name="ratedEfficiency">Efficiency at that opening under the rated head, 0 to 1.</param>
    /// <param name="netHeadM">Net head, m.</param>
    public abstract double Efficiency(double openingRatio, double ratedEfficiency, double netHeadM);

    /// <summary>The same with every efficiency lower by so much.</summary>
    /// <param name="lessEfficiency">What is taken off, 0 to 1.</param>
    public abstract HeadBehaviour Lowered(double lessEfficiency);
}
