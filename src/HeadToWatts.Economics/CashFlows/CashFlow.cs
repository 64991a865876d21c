namespace HeadToWatts.Economics.CashFlows;

/// <summary>A plan run through its years.</summary>
public sealed record CashFlow
{
    private CashFlow(CashFlowPlan plan, IReadOnlyList<YearOfCash> years)
    {
        Plan = plan;
        Years = years;
    }

    /// <summary>The plan.</summary>
    public CashFlowPlan Plan { get; }

    /// <summary>Year 0 and every year of operation.</summary>
    public IReadOnlyList<YearOfCash> Years { get; }

    /// <summary>Flow of the whole plan year by year, after tax and before the loan.</summary>
    public IReadOnlyList<double> ProjectAmounts => [.. Years.Select(y => y.ProjectAmount)];

    /// <summary>Flow to the owner year by year, after tax and loan.</summary>
    public IReadOnlyList<double> OwnerAmounts => [.. Years.Select(y => y.OwnerAmount)];

    /// <summary>Runs a plan.</summary>
    /// <param name="plan">The plan.</param>
    public static CashFlow Of(CashFlowPlan plan)
    {
        ArgumentNullException.ThrowIfNull(plan);
        Check(plan);
        var walk = new CashWalk(plan, PlanChange.None);
        var years = new YearOfCash[walk.LifeYears + 1];
        for (var year = 0; year < years.Length; year++)
            years[year] = walk.Next(year);
        return new CashFlow(plan, years);
    }

    /// <summary>Net present value of a changed plan, after tax and before the loan, without making its table: no allocation.</summary>
    /// <param name="plan">The plan.</param>
    /// <param name="change">What differs from it.</param>
    public static double NetPresentValueAmount(CashFlowPlan plan, in PlanChange change)
    {
        ArgumentNullException.ThrowIfNull(plan);
        var walk = new CashWalk(plan, change);
        var discount = 1 / (1 + walk.DiscountRate);
        var factor = 1.0;
        var sum = 0.0;
        var life = walk.LifeYears;
        for (var year = 0; year <= life; year++)
        {
            sum += walk.Next(year).ProjectAmount * factor;
            factor *= discount;
        }

        return sum;
    }

    private static void Check(CashFlowPlan plan)
    {
        if (plan.LifeYears is < 1 or > 200)
            throw new ArgumentOutOfRangeException(nameof(plan), plan.LifeYears, "A life is 1 to 200 years.");
        if (!(plan.DiscountRate > -1) || !(plan.InflationRate > -1) || !(plan.PriceEscalationRate > -1) || !(plan.DegradationRate < 1))
            throw new ArgumentOutOfRangeException(nameof(plan), "A rate lies above -100 %.");
        if (!double.IsFinite(plan.CapitalAmount + plan.GrantAmount + plan.AnnualEnergyKwh + plan.PriceAmountPerKwh + plan.SalvageAmount))
            throw new ArgumentOutOfRangeException(nameof(plan), "An amount is a finite number.");
        if (plan.Replacements.Any(r => r.EveryYears < 1))
            throw new ArgumentOutOfRangeException(nameof(plan), "A part is replaced after one year at the least.");
    }
}
