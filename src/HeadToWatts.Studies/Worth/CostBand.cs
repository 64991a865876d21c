using HeadToWatts.Basis.Quantities;
using HeadToWatts.Economics.CostCorrelations;
using HeadToWatts.Economics.Costs;
using HeadToWatts.Studies.Inputs;

namespace HeadToWatts.Studies.Worth;

/// <summary>A published correlation beside the user's own figure.</summary>
/// <param name="Correlation">The correlation.</param>
/// <param name="Cost">What it gives, in its own money.</param>
/// <param name="IsInside">True when the plant lies within its range.</param>
/// <param name="AtOurPrices">The same at the study's prices; null without a named index from its year, or in another currency.</param>
/// <param name="Index">The index used; empty when none.</param>
/// <param name="OwnAmount">The user's own figure of the same scope, in the study's money.</param>
public sealed record CostBand(CostCorrelation Correlation, Money Cost, bool IsInside, Money? AtOurPrices, string Index, double OwnAmount)
{
    internal static IReadOnlyList<CostBand> Of(MoneyInput input, CostBuildUp costs, double powerKw, double headM)
    {
        if (!(powerKw > 0) || !(headM > 0))
            return [];

        // Interest during construction is no part of what the correlations count.
        var machine = costs.Classes.Where(c => c.Class == CostClasses.Machine || c.Class == CostClasses.Electrical).Sum(c => c.DirectAmount + c.ContingencyAmount);
        return
        [
            .. CostCorrelationList.All
                .Where(c => headM >= c.Head.Lowest && headM <= c.Head.Highest)
                .Select(c =>
                {
                    var cost = c.Cost(powerKw, headM);
                    var index = c.Basis.Currency == input.Basis.Currency ? input.Indexes.FirstOrDefault(i => i.FromYear == c.Basis.PriceYear) : null;
                    Money? ours = c.Basis == input.Basis ? cost : index is null ? null : cost.AtPricesOf(input.Basis.PriceYear, index.IndexRatio);
                    return new CostBand(c, cost, c.Covers(powerKw, headM), ours, index?.Name ?? "", c.Scope == CostScope.Machine ? machine : costs.TotalAmount - costs.InterestAmount);
                }),
        ];
    }
}
