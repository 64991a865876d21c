using HeadToWatts.Basis.Sources;

namespace HeadToWatts.Pumping;

/// <summary>Methods of this stage.</summary>
public static class PumpingMethods
{
    /// <summary>Every method of this stage.</summary>
    public static IReadOnlyList<Method> All { get; } = [];
}
