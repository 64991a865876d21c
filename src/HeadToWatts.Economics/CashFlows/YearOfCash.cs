namespace HeadToWatts.Economics.CashFlows;

/// <summary>The cash of one year, in the plan's terms. Costs are positive numbers here and taken off in the sums.</summary>
public readonly record struct YearOfCash
{
    /// <summary>0 for the start of operation, 1 for its first year.</summary>
    public int Year { get; init; }

    /// <summary>Energy of the year, kWh.</summary>
    public double EnergyKwh { get; init; }

    /// <summary>Income from energy.</summary>
    public double IncomeAmount { get; init; }

    /// <summary>Credits and other income.</summary>
    public double CreditAmount { get; init; }

    /// <summary>Running costs.</summary>
    public double RunningAmount { get; init; }

    /// <summary>Replacements.</summary>
    public double ReplacementAmount { get; init; }

    /// <summary>Capital cost.</summary>
    public double CapitalAmount { get; init; }

    /// <summary>Grants.</summary>
    public double GrantAmount { get; init; }

    /// <summary>Worth at the end; negative for removal.</summary>
    public double SalvageAmount { get; init; }

    /// <summary>Tax without regard to a loan.</summary>
    public double TaxAmount { get; init; }

    /// <summary>Tax with the loan's interest taken off the income.</summary>
    public double OwnerTaxAmount { get; init; }

    /// <summary>Loan paid out.</summary>
    public double LoanAmount { get; init; }

    /// <summary>Interest on the loan.</summary>
    public double InterestAmount { get; init; }

    /// <summary>Loan paid back.</summary>
    public double RepaidAmount { get; init; }

    /// <summary>Income and credits less running costs, before tax.</summary>
    public double OperatingAmount => IncomeAmount + CreditAmount - RunningAmount;

    /// <summary>Flow of the whole plan, after tax, before the loan.</summary>
    public double ProjectAmount => OperatingAmount - ReplacementAmount - CapitalAmount + GrantAmount + SalvageAmount - TaxAmount;

    /// <summary>Flow to the owner, after tax and loan.</summary>
    public double OwnerAmount => OperatingAmount - ReplacementAmount - CapitalAmount + GrantAmount + SalvageAmount - OwnerTaxAmount + LoanAmount - DebtServiceAmount;

    /// <summary>Interest and repayment.</summary>
    public double DebtServiceAmount => InterestAmount + RepaidAmount;
}
