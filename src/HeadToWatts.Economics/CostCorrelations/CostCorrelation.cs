using HeadToWatts.Basis.Quantities;
using HeadToWatts.Basis.Sources;

namespace HeadToWatts.Economics.CostCorrelations;

/// <summary>What a correlation gives the cost of.</summary>
public enum CostScope
{
    /// <summary>Turbine, generator and what belongs to them.</summary>
    Machine,

    /// <summary>The whole plant.</summary>
    Project,
}

/// <summary>
/// A published power law of cost over power and head. It is a band to hold an estimate against, never an estimate: its own
/// currency and price year stand beside it, and nothing is converted.
/// </summary>
/// <param name="Id">Key: lower-case words with hyphens.</param>
/// <param name="Name">Authors and year.</param>
/// <param name="Scope">What it gives the cost of.</param>
/// <param name="For">Kind of plants it was drawn from, in words.</param>
/// <param name="Basis">Its currency and price year.</param>
/// <param name="Formula">Formula in symbols.</param>
/// <param name="Source">Where it comes from.</param>
/// <param name="Power">Range of power, kW.</param>
/// <param name="Head">Range of head, m.</param>
/// <param name="CostAmountOf">Cost in its own money from power in kW and head in m.</param>
public sealed record CostCorrelation(string Id, string Name, CostScope Scope, string For, MoneyBasis Basis, string Formula, Source Source, InputRange Power, InputRange Head, Func<double, double, double> CostAmountOf)
{
    /// <summary>The cost in the correlation's own money.</summary>
    /// <param name="powerKw">Installed power, kW; above 0.</param>
    /// <param name="headM">Head, m; above 0.</param>
    public Money Cost(double powerKw, double headM)
    {
        ArgumentOutOfRangeException.ThrowIfNegativeOrZero(powerKw);
        ArgumentOutOfRangeException.ThrowIfNegativeOrZero(headM);
        return Money.Of(CostAmountOf(powerKw, headM), Basis);
    }

    /// <summary>True when the plant lies within what the correlation was drawn from.</summary>
    /// <param name="powerKw">Installed power, kW.</param>
    /// <param name="headM">Head, m.</param>
    public bool Covers(double powerKw, double headM) => powerKw >= Power.Lowest && powerKw <= Power.Highest && headM >= Head.Lowest && headM <= Head.Highest;
}
