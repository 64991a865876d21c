using HeadToWatts.Basis.Quantities;

namespace HeadToWatts.Economics.CashFlows;

/// <summary>Whether amounts of later years are counted at today's prices or at the prices of their own year.</summary>
public enum PriceTerms
{
    /// <summary>At the prices of the price year; the discount rate is above inflation.</summary>
    Real,

    /// <summary>At the prices of each year; the discount rate includes inflation.</summary>
    Nominal,
}

/// <summary>
/// Everything a cash flow is made of, in one currency, one price year and one kind of terms. Year 0 is the start of operation
/// and the price year; each later year's flows fall at its end. Every escalation and the discount rate are in the plan's terms.
/// </summary>
/// <param name="Basis">Currency and price year of every amount.</param>
/// <param name="Terms">Real or nominal.</param>
/// <param name="LifeYears">Years of operation, 1 to 200.</param>
/// <param name="DiscountRate">Discount rate a year, above -1.</param>
public sealed record CashFlowPlan(MoneyBasis Basis, PriceTerms Terms, int LifeYears, double DiscountRate)
{
    /// <summary>Inflation a year; needed in real terms where a loan or depreciation is fixed in nominal sums.</summary>
    public double InflationRate { get; init; }

    /// <summary>Capital cost at the start of operation, with interest during construction.</summary>
    public double CapitalAmount { get; init; }

    /// <summary>Grants received at the start.</summary>
    public double GrantAmount { get; init; }

    /// <summary>Energy of the first year, kWh.</summary>
    public double AnnualEnergyKwh { get; init; }

    /// <summary>Energy lost from one year to the next through wear, as a ratio.</summary>
    public double DegradationRate { get; init; }

    /// <summary>Income from one kWh at the prices of the price year.</summary>
    public double PriceAmountPerKwh { get; init; }

    /// <summary>Yearly change of that price.</summary>
    public double PriceEscalationRate { get; init; }

    /// <summary>Operation and maintenance, insurance, water charge, lease.</summary>
    public IReadOnlyList<RunningCost> RunningCosts { get; init; } = [];

    /// <summary>Replacements of parts.</summary>
    public IReadOnlyList<Replacement> Replacements { get; init; } = [];

    /// <summary>Credits and other income beside the price.</summary>
    public IReadOnlyList<Credit> Credits { get; init; } = [];

    /// <summary>What the plant is worth at the end, at the prices of the price year; negative where it must be taken away.</summary>
    public double SalvageAmount { get; init; }

    /// <summary>The loan; null when there is none.</summary>
    public Loan? Loan { get; init; }

    /// <summary>The tax; null when none is counted.</summary>
    public IncomeTax? Tax { get; init; }
}

/// <summary>A yearly cost.</summary>
/// <param name="Name">What it is.</param>
/// <param name="YearlyAmount">A year, at the prices of the price year.</param>
/// <param name="AmountPerKwh">For each kWh, at the prices of the price year.</param>
/// <param name="EscalationRate">Yearly change, in the plan's terms.</param>
public sealed record RunningCost(string Name, double YearlyAmount, double AmountPerKwh, double EscalationRate);

/// <summary>A part replaced again and again; never in the last year.</summary>
/// <param name="Name">What it is.</param>
/// <param name="Amount">Each time, at the prices of the price year.</param>
/// <param name="EveryYears">After so many years each time, 1 or more.</param>
/// <param name="EscalationRate">Yearly change, in the plan's terms.</param>
public sealed record Replacement(string Name, double Amount, int EveryYears, double EscalationRate);

/// <summary>Income beside the price: a credit, a certificate, a saved cost.</summary>
/// <param name="Name">What it is.</param>
/// <param name="YearlyAmount">A year, at the prices of the price year.</param>
/// <param name="AmountPerKwh">For each kWh, at the prices of the price year.</param>
/// <param name="LastYear">Last year in which it is paid.</param>
/// <param name="EscalationRate">Yearly change, in the plan's terms.</param>
public sealed record Credit(string Name, double YearlyAmount, double AmountPerKwh, int LastYear, double EscalationRate);

/// <summary>Tax on income, as the user enters it. A loss is carried forward.</summary>
/// <param name="TaxRate">Tax over taxable income, 0 to 1.</param>
/// <param name="DepreciableAmount">Sum that is written off.</param>
/// <param name="Depreciation">How it is written off.</param>
public sealed record IncomeTax(double TaxRate, double DepreciableAmount, Depreciation Depreciation);
