namespace HeadToWatts.Economics.CashFlows;

/// <summary>Walks through the years of a plan in order. A value without allocation, so that ten thousand draws are cheap; table and quick worth share it and cannot differ.</summary>
internal struct CashWalk(CashFlowPlan plan, PlanChange change)
{
    private readonly CashFlowPlan _plan = plan;
    private readonly PlanChange _change = change;
    private double _projectLossAmount;
    private double _ownerLossAmount;

    internal readonly int LifeYears => Math.Max(1, _plan.LifeYears + _change.LifeYearsShift);

    internal readonly double DiscountRate => _plan.DiscountRate + _change.DiscountRateShift;

    internal YearOfCash Next(int year)
    {
        var plan = _plan;
        var capital = plan.CapitalAmount * _change.CapitalRatio;
        if (year == 0)
            return new YearOfCash { CapitalAmount = capital, GrantAmount = plan.GrantAmount, LoanAmount = plan.Loan?.PrincipalAmount ?? 0 };

        var last = year == LifeYears;
        var general = plan.Terms == PriceTerms.Nominal ? Grown(plan.InflationRate, year) : 1;

        // Sums fixed in the money of their own year lose worth when everything else is counted at the prices of year 0.
        var deflator = plan.Terms == PriceTerms.Real ? Grown(plan.InflationRate, year) : 1;
        var energy = plan.AnnualEnergyKwh * _change.EnergyRatio * Grown(-plan.DegradationRate, year - 1);
        var income = energy * ((plan.PriceAmountPerKwh * _change.PriceRatio) + _change.PriceShiftAmountPerKwh) * Grown(plan.PriceEscalationRate, year);
        var credits = 0.0;
        for (var i = 0; i < plan.Credits.Count; i++)
        {
            var credit = plan.Credits[i];
            if (year <= credit.LastYear)
                credits += (credit.YearlyAmount + (credit.AmountPerKwh * energy)) * Grown(credit.EscalationRate, year);
        }

        var running = 0.0;
        for (var i = 0; i < plan.RunningCosts.Count; i++)
        {
            var cost = plan.RunningCosts[i];
            running += (cost.YearlyAmount + (cost.AmountPerKwh * energy)) * Grown(cost.EscalationRate, year) * _change.RunningRatio;
        }

        var replaced = 0.0;
        for (var i = 0; i < plan.Replacements.Count; i++)
        {
            var part = plan.Replacements[i];
            if (!last && year % part.EveryYears == 0)
                replaced += part.Amount * Grown(part.EscalationRate, year) * _change.RunningRatio;
        }

        var salvage = last ? plan.SalvageAmount * general : 0;
        var interest = (plan.Loan?.InterestAmount(year) ?? 0) / deflator;
        var repaid = (plan.Loan?.RepaidAmount(year) ?? 0) / deflator;
        double tax = 0, ownerTax = 0;
        if (plan.Tax is { } entry)
        {
            var writtenOff = entry.DepreciableAmount * _change.CapitalRatio * entry.Depreciation.ShareOf(year) / deflator;
            var taxable = income + credits - running - replaced + salvage - writtenOff;
            tax = entry.TaxRate * AfterLosses(taxable, ref _projectLossAmount);
            ownerTax = entry.TaxRate * AfterLosses(taxable - interest, ref _ownerLossAmount);
        }

        return new YearOfCash
        {
            Year = year,
            EnergyKwh = energy,
            IncomeAmount = income,
            CreditAmount = credits,
            RunningAmount = running,
            ReplacementAmount = replaced,
            SalvageAmount = salvage,
            TaxAmount = tax,
            OwnerTaxAmount = ownerTax,
            InterestAmount = interest,
            RepaidAmount = repaid,
        };
    }

    private static double AfterLosses(double taxableAmount, ref double lossAmount)
    {
        var net = taxableAmount - lossAmount;
        lossAmount = Math.Max(0, -net);
        return Math.Max(0, net);
    }

    private static double Grown(double rate, int years) => rate == 0 ? 1 : Math.Pow(1 + rate, years);
}
