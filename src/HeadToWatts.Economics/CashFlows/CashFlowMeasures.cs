using HeadToWatts.Basis.Quantities;

namespace HeadToWatts.Economics.CashFlows;

/// <summary>What a cash flow comes to. Everything is in the plan's terms, currency and price year.</summary>
public sealed record CashFlowMeasures
{
    /// <summary>Currency and price year.</summary>
    public required MoneyBasis Basis { get; init; }

    /// <summary>Net present value of the plan, after tax, before the loan.</summary>
    public required double NetPresentValueAmount { get; init; }

    /// <summary>The same sum spread evenly over the years of operation.</summary>
    public required double YearlyWorthAmount { get; init; }

    /// <summary>Internal rates of return of the plan.</summary>
    public required RateOfReturn Rate { get; init; }

    /// <summary>Modified rate of return, financed and put by at the discount rate; null when it does not exist.</summary>
    public required double? ModifiedRate { get; init; }

    /// <summary>Years until what came in covers what was paid, without interest; null when never within the life.</summary>
    public required double? PaybackYears { get; init; }

    /// <summary>The same with every year discounted; null when never within the life.</summary>
    public required double? DiscountedPaybackYears { get; init; }

    /// <summary>Present worth of income, credits, grants and salvage over that of all costs and taxes; null without cost.</summary>
    public required double? BenefitCostRatio { get; init; }

    /// <summary>Present worth of capital, running cost and replacements (less salvage) over that of the energy; grants, credits, tax and loan left out. Null without energy.</summary>
    public required double? LevelisedCostAmountPerKwh { get; init; }

    /// <summary>Price of a kWh in the price year at which the net present value is zero; null without energy.</summary>
    public required double? BreakEvenPriceAmountPerKwh { get; init; }

    /// <summary>Net present value to the owner, after tax and loan.</summary>
    public required double OwnerNetPresentValueAmount { get; init; }

    /// <summary>Internal rates of return to the owner.</summary>
    public required RateOfReturn OwnerRate { get; init; }

    /// <summary>Lowest ratio of the cash of a year to the debt service of that year; null without a loan.</summary>
    public required double? LowestDebtCover { get; init; }

    /// <summary>Mean of that ratio over the years of the loan; null without a loan.</summary>
    public required double? MeanDebtCover { get; init; }

    /// <summary>Measures a cash flow.</summary>
    /// <param name="flow">The cash flow.</param>
    public static CashFlowMeasures Of(CashFlow flow)
    {
        ArgumentNullException.ThrowIfNull(flow);
        var plan = flow.Plan;
        var project = flow.ProjectAmounts.ToArray();
        var owner = flow.OwnerAmounts.ToArray();
        var rate = plan.DiscountRate;
        var npv = PresentWorth.OfFlows(project, rate);
        var benefit = Worth(y => y.IncomeAmount + y.CreditAmount + y.GrantAmount + Math.Max(0, y.SalvageAmount));
        var cost = Worth(y => y.CapitalAmount + y.RunningAmount + y.ReplacementAmount + y.TaxAmount - Math.Min(0, y.SalvageAmount));
        var gross = Worth(y => y.CapitalAmount + y.RunningAmount + y.ReplacementAmount - y.SalvageAmount);
        var energy = Worth(y => y.EnergyKwh);
        var cover = flow.Years.Where(y => y.DebtServiceAmount > 0).Select(y => (y.OperatingAmount - y.ReplacementAmount - y.OwnerTaxAmount) / y.DebtServiceAmount).ToList();
        return new CashFlowMeasures
        {
            Basis = plan.Basis,
            NetPresentValueAmount = npv,
            YearlyWorthAmount = npv * PresentWorth.CapitalRecovery(rate, plan.LifeYears),
            Rate = RateOfReturn.Of(project),
            ModifiedRate = RateOfReturn.Modified(project, rate, rate),
            PaybackYears = Payback(project, 0),
            DiscountedPaybackYears = Payback(project, rate),
            BenefitCostRatio = cost > 0 ? benefit / cost : null,
            LevelisedCostAmountPerKwh = energy > 0 ? gross / energy : null,
            BreakEvenPriceAmountPerKwh = energy > 0 ? BreakEven(plan, npv) : null,
            OwnerNetPresentValueAmount = PresentWorth.OfFlows(owner, rate),
            OwnerRate = RateOfReturn.Of(owner),
            LowestDebtCover = cover.Count > 0 ? cover.Min() : null,
            MeanDebtCover = cover.Count > 0 ? cover.Average() : null,
        };

        double Worth(Func<YearOfCash, double> pick) => PresentWorth.OfFlows([.. flow.Years.Select(pick)], rate);
    }

    /// <summary>Years until the running sum of the flows reaches zero and the income of that year is counted evenly over it.</summary>
    /// <param name="amounts">Flows, year 0 first.</param>
    /// <param name="rate">Discount rate; 0 for the simple payback.</param>
    /// <returns>Years, or null when the sum never reaches zero.</returns>
    public static double? Payback(ReadOnlySpan<double> amounts, double rate)
    {
        var sum = 0.0;
        for (var year = 0; year < amounts.Length; year++)
        {
            var now = amounts[year] * PresentWorth.OfOne(rate, year);
            if (sum + now >= 0)
                return year == 0 || now <= 0 ? year : year - 1 + (-sum / now);
            sum += now;
        }

        return null;
    }

    // The worth rises with the price; with losses carried forward it is not straight, so the root is bracketed and halved.
    private static double? BreakEven(CashFlowPlan plan, double npvAmount)
    {
        double At(double shift) => CashFlow.NetPresentValueAmount(plan, PlanChange.None with { PriceShiftAmountPerKwh = shift });
        if (npvAmount == 0)
            return plan.PriceAmountPerKwh;
        var step = Math.Max(Math.Abs(plan.PriceAmountPerKwh), 1e-3);
        var direction = npvAmount < 0 ? 1 : -1;
        var inner = 0.0;
        var outer = direction * step;
        for (var i = 0; i < 60 && Math.Sign(At(outer)) == Math.Sign(npvAmount); i++)
        {
            inner = outer;
            outer *= 2;
        }

        if (Math.Sign(At(outer)) == Math.Sign(npvAmount))
            return null;
        for (var i = 0; i < 100; i++)
        {
            var middle = (inner + outer) / 2;
            if (middle == inner || middle == outer)
                break;
            if (Math.Sign(At(middle)) == Math.Sign(npvAmount))
                inner = middle;
            else
                outer = middle;
        }

        return plan.PriceAmountPerKwh + ((inner + outer) / 2);
    }
}
