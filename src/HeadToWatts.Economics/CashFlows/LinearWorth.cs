namespace HeadToWatts.Economics.CashFlows;

/// <summary>
/// The net present value as a straight line over energy and capital cost: what a map of thousands of sizes needs. It equals
/// <see cref="CashFlow.NetPresentValueAmount"/> exactly, for without tax that is linear in both.
/// </summary>
/// <param name="FixedAmount">What neither energy nor capital cost changes.</param>
/// <param name="WorthAmountPerKwh">Present worth of one kWh a year over the whole life, after what each kWh costs.</param>
public readonly record struct LinearWorth(double FixedAmount, double WorthAmountPerKwh)
{
    /// <summary>Net present value of one size.</summary>
    /// <param name="annualEnergyKwh">Energy of the first year, kWh.</param>
    /// <param name="capitalAmount">Capital cost.</param>
    public double NetPresentValueAmount(double annualEnergyKwh, double capitalAmount) => FixedAmount + (WorthAmountPerKwh * annualEnergyKwh) - capitalAmount;

    /// <summary>The line of a plan; null where a tax bends it.</summary>
    /// <param name="plan">The plan.</param>
    public static LinearWorth? Of(CashFlowPlan plan)
    {
        ArgumentNullException.ThrowIfNull(plan);
        if (plan.Tax is not null)
            return null;
        var none = CashFlow.NetPresentValueAmount(plan with { AnnualEnergyKwh = 0, CapitalAmount = 0 }, PlanChange.None);
        var one = CashFlow.NetPresentValueAmount(plan with { AnnualEnergyKwh = 1, CapitalAmount = 0, RunningCosts = [.. plan.RunningCosts.Select(c => c with { YearlyAmount = 0 })], Credits = [.. plan.Credits.Select(c => c with { YearlyAmount = 0 })], Replacements = [], SalvageAmount = 0, GrantAmount = 0 }, PlanChange.None);
        return new LinearWorth(none, one);
    }

    /// <summary>The line of a plain plan: a price, a yearly cost, a cost by kWh, each with its growth.</summary>
    /// <param name="priceAmountPerKwh">Income from one kWh at the prices of the price year.</param>
    /// <param name="yearlyAmount">Yearly cost at the prices of the price year.</param>
    /// <param name="costAmountPerKwh">Cost of one kWh at the prices of the price year.</param>
    /// <param name="discountRate">Discount rate.</param>
    /// <param name="lifeYears">Years of operation.</param>
    /// <param name="priceEscalationRate">Yearly change of the price.</param>
    /// <param name="costEscalationRate">Yearly change of the costs.</param>
    /// <param name="degradationRate">Energy lost from year to year.</param>
    public static LinearWorth Plain(double priceAmountPerKwh, double yearlyAmount, double costAmountPerKwh, double discountRate, int lifeYears, double priceEscalationRate = 0, double costEscalationRate = 0, double degradationRate = 0)
    {
        var price = (1 + priceEscalationRate) * PresentWorth.OfGrowing(((1 + priceEscalationRate) * (1 - degradationRate)) - 1, discountRate, lifeYears);
        var perKwh = (1 + costEscalationRate) * PresentWorth.OfGrowing(((1 + costEscalationRate) * (1 - degradationRate)) - 1, discountRate, lifeYears);
        var yearly = (1 + costEscalationRate) * PresentWorth.OfGrowing(costEscalationRate, discountRate, lifeYears);
        return new LinearWorth(-yearlyAmount * yearly, (priceAmountPerKwh * price) - (costAmountPerKwh * perKwh));
    }
}
