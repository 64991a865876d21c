namespace HeadToWatts.Economics.CashFlows;

/// <summary>A change to a plan: what a bar of a sensitivity or a draw of a sample alters. Start from <see cref="None"/>.</summary>
/// <param name="EnergyRatio">Energy over the plan's.</param>
/// <param name="PriceRatio">Price over the plan's.</param>
/// <param name="CapitalRatio">Capital cost over the plan's.</param>
/// <param name="RunningRatio">Running costs and replacements over the plan's.</param>
/// <param name="DiscountRateShift">Added to the discount rate.</param>
/// <param name="LifeYearsShift">Added to the years of operation.</param>
public readonly record struct PlanChange(double EnergyRatio, double PriceRatio, double CapitalRatio, double RunningRatio, double DiscountRateShift, int LifeYearsShift)
{
    /// <summary>Added to the price of a kWh, at the prices of the price year.</summary>
    public double PriceShiftAmountPerKwh { get; init; }

    /// <summary>Nothing changed.</summary>
    public static PlanChange None { get; } = new(1, 1, 1, 1, 0, 0);
}
