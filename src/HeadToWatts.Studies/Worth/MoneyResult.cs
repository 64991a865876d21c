using HeadToWatts.Basis.Quantities;
using HeadToWatts.Basis.Sources;
using HeadToWatts.Economics.CashFlows;
using HeadToWatts.Economics.Costs;
using HeadToWatts.Studies.Inputs;

namespace HeadToWatts.Studies.Worth;

/// <summary>Whether it pays: what was built up from costs, income and the study's energy.</summary>
/// <param name="Input">As entered.</param>
/// <param name="Costs">Capital cost built up.</param>
/// <param name="Flow">Cash by year.</param>
/// <param name="Measures">What it comes to.</param>
/// <param name="Bars">One thing at a time, the widest first.</param>
/// <param name="Answer">The plain answer.</param>
public sealed record MoneyResult(MoneyInput Input, CostBuildUp Costs, CashFlow Flow, CashFlowMeasures Measures, IReadOnlyList<SensitivityBar> Bars, PlainAnswer Answer)
{
    /// <summary>Currency and price year.</summary>
    public MoneyBasis Basis => Input.Basis;

    /// <summary>True when a cost of the works is given.</summary>
    public bool HasCosts => Costs.TotalAmount > 0;

    /// <summary>True when energy brings an income.</summary>
    public bool HasPrice => Flow.Plan.PriceAmountPerKwh > 0 || Flow.Plan.Credits.Count > 0;

    /// <summary>Share of the energy that may fail before nothing is gained; null where there is no gain or no price.</summary>
    public double? EnergyMargin { get; init; }

    /// <summary>Published correlations beside the user's figures.</summary>
    public IReadOnlyList<CostBand> CostBands { get; init; } = [];

    /// <summary>The methods behind it.</summary>
    public IReadOnlyList<MethodUse> Uses =>
    [
        .. Input.Construction.ConstructionYears > 0 ? [CostMethods.InterestDuringConstruction.Used()] : Array.Empty<MethodUse>(),
        CashFlowMethods.NetPresentValue.Used(),
        CashFlowMethods.InternalRate.Used(),
        CashFlowMethods.ModifiedRate.Used(),
        CashFlowMethods.LevelisedCost.Used(),
        CashFlowMethods.UniformSeries.Used(),
        .. Input.Loan is null ? Array.Empty<MethodUse>() : [CashFlowMethods.LevelLoan.Used()],
        .. Input.Tax is { } tax && tax.Depreciation.Name.StartsWith("declining", StringComparison.Ordinal) ? [CashFlowMethods.DecliningBalance.Used()] : Array.Empty<MethodUse>(),
    ];
}
