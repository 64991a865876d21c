namespace HeadToWatts.Economics.CashFlows;

/// <summary>A loan paid back in level yearly sums from the first year of operation on.</summary>
/// <param name="PrincipalAmount">Sum lent, 0 or more.</param>
/// <param name="InterestRate">Interest a year as the bank states it (nominal).</param>
/// <param name="TermYears">Years of repayment, 1 or more.</param>
public sealed record Loan(double PrincipalAmount, double InterestRate, int TermYears)
{
    /// <summary>The level yearly payment.</summary>
    public double PaymentAmount => PrincipalAmount * PresentWorth.CapitalRecovery(InterestRate, TermYears);

    /// <summary>What is still owed after some years.</summary>
    /// <param name="year">Years since the first payment began to run, 0 or more.</param>
    public double BalanceAmount(int year) => year >= TermYears ? 0 : PaymentAmount * PresentWorth.OfUniform(InterestRate, TermYears - year);

    /// <summary>Interest paid in a year.</summary>
    /// <param name="year">1 for the first.</param>
    public double InterestAmount(int year) => year > TermYears ? 0 : BalanceAmount(year - 1) * InterestRate;

    /// <summary>Principal paid back in a year.</summary>
    /// <param name="year">1 for the first.</param>
    public double RepaidAmount(int year) => year > TermYears ? 0 : PaymentAmount - InterestAmount(year);
}
