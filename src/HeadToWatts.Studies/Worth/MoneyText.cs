using System.Globalization;
using HeadToWatts.Basis.Quantities;
using HeadToWatts.Basis.Units;
using HeadToWatts.Economics.CashFlows;

namespace HeadToWatts.Studies.Worth;

/// <summary>Amounts as people read them, always with their currency.</summary>
public static class MoneyText
{
    /// <summary>An amount with its currency, to three digits: "USD 452 000".</summary>
    public static string Amount(double moneyAmount, MoneyBasis basis)
    {
        ArgumentNullException.ThrowIfNull(basis);
        return basis.Currency + "\u00a0" + UnitDisplay.Number(moneyAmount);
    }

    /// <summary>An amount with its currency and price year: "USD 452 000 of 2026".</summary>
    public static string WithYear(double moneyAmount, MoneyBasis basis)
    {
        ArgumentNullException.ThrowIfNull(basis);
        return Amount(moneyAmount, basis) + " of " + basis.PriceYear.ToString(CultureInfo.InvariantCulture);
    }

    /// <summary>A price of a kWh: "0.0832 USD/kWh".</summary>
    public static string PerKwh(double amountPerKwh, MoneyBasis basis)
    {
        ArgumentNullException.ThrowIfNull(basis);
        return UnitDisplay.Number(amountPerKwh) + "\u00a0" + basis.Currency + "/kWh";
    }

    /// <summary>A whole amount for a column, thousands apart, without its currency.</summary>
    public static string Whole(double moneyAmount)
    {
        var text = Math.Round(Math.Abs(moneyAmount), MidpointRounding.AwayFromZero).ToString("#,##0", CultureInfo.InvariantCulture).Replace(',', '\u202f');
        return moneyAmount < 0 && text != "0" ? "−" + text : text;
    }

    /// <summary>Years with one decimal.</summary>
    public static string Years(double spanYears) => spanYears.ToString("0.0", CultureInfo.InvariantCulture) + " years";

    /// <summary>The terms in words: "real, prices of 2026" or "nominal, prices of each year".</summary>
    public static string Terms(CashFlowPlan plan)
    {
        ArgumentNullException.ThrowIfNull(plan);
        return plan.Terms == PriceTerms.Real
            ? string.Create(CultureInfo.InvariantCulture, $"real, {plan.Basis.Currency} at prices of {plan.Basis.PriceYear}")
            : string.Create(CultureInfo.InvariantCulture, $"nominal, {plan.Basis.Currency} of each year, from prices of {plan.Basis.PriceYear}");
    }

    /// <summary>The internal rate of return, or what there is instead of one.</summary>
    public static string Rate(RateOfReturn rate)
    {
        ArgumentNullException.ThrowIfNull(rate);
        return rate.Rates.Count switch
        {
            1 => UnitDisplay.Percent(rate.Rates[0]),
            0 => "none",
            _ => string.Join("; ", rate.Rates.Select(UnitDisplay.Percent)),
        };
    }
}
