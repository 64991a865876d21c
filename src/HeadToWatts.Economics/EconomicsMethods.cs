using HeadToWatts.Basis.Sources;

namespace HeadToWatts.Economics;

/// <summary>Methods of this stage.</summary>
public static class EconomicsMethods
{
    /// <summary>Every method of this stage.</summary>
    public static IReadOnlyList<Method> All { get; } = [];
}
