using HeadToWatts.Basis.Quantities;
using HeadToWatts.Economics.CashFlows;
using HeadToWatts.Economics.Costs;

namespace HeadToWatts.Studies.Inputs;

/// <summary>Costs, income and how they are weighed. All in one currency, one price year and one kind of terms.</summary>
/// <param name="Basis">Currency and price year.</param>
/// <param name="Terms">Real or nominal.</param>
/// <param name="LifeYears">Years of operation.</param>
/// <param name="DiscountRate">Discount rate in these terms.</param>
public sealed record MoneyInput(MoneyBasis Basis, PriceTerms Terms, int LifeYears, double DiscountRate)
{
    /// <summary>Inflation; null when it is not needed and not given.</summary>
    public double? InflationRate { get; init; }

    /// <summary>Income from one kWh; null when no price is given.</summary>
    public double? PriceAmountPerKwh { get; init; }

    /// <summary>Yearly change of the price, in these terms.</summary>
    public double PriceEscalationRate { get; init; }

    /// <summary>Energy lost from year to year through wear.</summary>
    public double DegradationRate { get; init; }

    /// <summary>Lines of the cost estimate.</summary>
    public IReadOnlyList<CostLine> CostLines { get; init; } = [];

    /// <summary>Engineering over direct cost and contingency.</summary>
    public double EngineeringRatio { get; init; }

    /// <summary>How it is paid for while it is built.</summary>
    public Construction Construction { get; init; } = new(0, 0);

    /// <summary>Yearly costs.</summary>
    public IReadOnlyList<RunningCost> RunningCosts { get; init; } = [];

    /// <summary>Replacements.</summary>
    public IReadOnlyList<Replacement> Replacements { get; init; } = [];

    /// <summary>Credits and other income.</summary>
    public IReadOnlyList<Credit> Credits { get; init; } = [];

    /// <summary>Grants at the start.</summary>
    public double GrantAmount { get; init; }

    /// <summary>Worth at the end; negative for removal.</summary>
    public double SalvageAmount { get; init; }

    /// <summary>The loan; null when there is none.</summary>
    public LoanShare? Loan { get; init; }

    /// <summary>The tax; null when none is counted.</summary>
    public TaxEntry? Tax { get; init; }

    /// <summary>Indexes that bring prices of earlier years to the price year.</summary>
    public IReadOnlyList<PriceIndex> Indexes { get; init; } = [];
}

/// <summary>How prices have moved from one year to the price year, by an index that is named.</summary>
/// <param name="Name">Name of the index.</param>
/// <param name="FromYear">The earlier year.</param>
/// <param name="IndexRatio">Index of the price year over that of the earlier year.</param>
public sealed record PriceIndex(string Name, int FromYear, double IndexRatio);

/// <summary>A loan over a share of the capital cost.</summary>
/// <param name="CapitalShare">Share of the capital cost that is lent, 0 to 1.</param>
/// <param name="InterestRate">Interest a year, nominal.</param>
/// <param name="TermYears">Years of repayment.</param>
public sealed record LoanShare(double CapitalShare, double InterestRate, int TermYears);

/// <summary>A tax as the user enters it.</summary>
/// <param name="TaxRate">Tax over taxable income.</param>
/// <param name="DepreciableShare">Share of the capital cost that is written off.</param>
/// <param name="Depreciation">How it is written off.</param>
public sealed record TaxEntry(double TaxRate, double DepreciableShare, Depreciation Depreciation);
