using HeadToWatts.Basis.Sources;

namespace HeadToWatts.Economics.Costs;

/// <summary>The methods of the cost build-up.</summary>
public static class CostMethods
{
    /// <summary>Interest during construction.</summary>
    public static Source Practice { get; } = Source.CommonPractice("interest-during-construction", "Interest during construction on money spent evenly, each year's share at its middle");

    /// <summary>Interest during construction.</summary>
    public static Method InterestDuringConstruction { get; } = new("interest-during-construction", "Interest during construction", "I = K Σ ((1 + i)^{n − k + 1/2} − 1)/n", Practice, "", []);

    /// <summary>Every method of the cost build-up.</summary>
    public static IReadOnlyList<Method> All { get; } = [InterestDuringConstruction];
}
