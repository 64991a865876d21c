using HeadToWatts.Basis.Sources;
using HeadToWatts.Economics.CashFlows;
using HeadToWatts.Economics.Costs;

namespace HeadToWatts.Economics;

/// <summary>Methods of this stage.</summary>
public static class EconomicsMethods
{
    /// <summary>Every method of this stage.</summary>
    public static IReadOnlyList<Method> All { get; } =
    [
        .. CostMethods.All,
        .. CashFlowMethods.All,
    ];
}
