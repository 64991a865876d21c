using System.Text.Json;
using HeadToWatts.Studies;

namespace HeadToWatts.Files.Exports;

/// <summary>Whether it pays, as JSON. Amounts are in the currency, price year and terms named at its head.</summary>
internal static class MoneyJson
{
    internal static void Write(Utf8JsonWriter json, StudyResult r)
    {
        if (r.Money is not { } money)
        {
            json.WriteNull("money");
            return;
        }

        var m = money.Measures;
        json.WriteStartObject("money");
        json.WriteString("currency", money.Basis.Currency);
        json.WriteNumber("priceYear", money.Basis.PriceYear);
        json.WriteString("terms", money.Input.Terms == Economics.CashFlows.PriceTerms.Real ? "real" : "nominal");
        json.WriteNumber("lifeYears", money.Input.LifeYears);
        json.WriteNumber("discountRate", money.Input.DiscountRate);
        json.WriteString("verdict", money.Answer.Verdict.ToString());
        json.WriteString("answer", money.Answer.Text);
        json.WriteNumber("directCost", money.Costs.DirectAmount);
        json.WriteNumber("contingency", money.Costs.ContingencyAmount);
        json.WriteNumber("engineering", money.Costs.EngineeringAmount);
        json.WriteNumber("interestDuringConstruction", money.Costs.InterestAmount);
        json.WriteNumber("capitalCost", money.Costs.TotalAmount);
        json.WriteNumber("pricePerKwh", money.Flow.Plan.PriceAmountPerKwh);
        json.WriteNumber("netPresentValue", m.NetPresentValueAmount);
        json.WriteNumber("yearlyWorth", m.YearlyWorthAmount);
        json.WriteStartArray("ratesOfReturn");
        foreach (var rate in m.Rate.Rates)
            json.WriteNumberValue(rate);
        json.WriteEndArray();
        MachineJson.Number(json, "modifiedRateOfReturn", m.ModifiedRate);
        MachineJson.Number(json, "paybackYears", m.PaybackYears);
        MachineJson.Number(json, "discountedPaybackYears", m.DiscountedPaybackYears);
        MachineJson.Number(json, "benefitCostRatio", m.BenefitCostRatio);
        MachineJson.Number(json, "levelisedCostPerKwh", m.LevelisedCostAmountPerKwh);
        MachineJson.Number(json, "breakEvenPricePerKwh", m.BreakEvenPriceAmountPerKwh);
        MachineJson.Number(json, "lowestDebtCover", m.LowestDebtCover);
        json.WriteNumber("ownerNetPresentValue", m.OwnerNetPresentValueAmount);
        json.WriteStartArray("years");
        foreach (var y in money.Flow.Years)
        {
            json.WriteStartObject();
            json.WriteNumber("year", y.Year);
            json.WriteNumber("energyKwh", y.EnergyKwh);
            json.WriteNumber("income", y.IncomeAmount);
            json.WriteNumber("credits", y.CreditAmount);
            json.WriteNumber("grants", y.GrantAmount);
            json.WriteNumber("running", y.RunningAmount);
            json.WriteNumber("replacements", y.ReplacementAmount);
            json.WriteNumber("capital", y.CapitalAmount);
            json.WriteNumber("salvage", y.SalvageAmount);
            json.WriteNumber("tax", y.TaxAmount);
            json.WriteNumber("cash", y.ProjectAmount);
            json.WriteNumber("debtService", y.DebtServiceAmount);
            json.WriteNumber("cashToOwner", y.OwnerAmount);
            json.WriteEndObject();
        }

        json.WriteEndArray();
        json.WriteStartArray("costCorrelations");
        foreach (var band in money.CostBands)
        {
            json.WriteStartObject();
            json.WriteString("id", band.Correlation.Id);
            json.WriteString("currency", band.Cost.Basis.Currency);
            json.WriteNumber("priceYear", band.Cost.Basis.PriceYear);
            json.WriteNumber("cost", band.Cost.Amount);
            json.WriteBoolean("insideRange", band.IsInside);
            MachineJson.Number(json, "atOurPrices", band.AtOurPrices?.Amount);
            json.WriteString("index", band.Index);
            json.WriteEndObject();
        }

        json.WriteEndArray();
        json.WriteStartArray("sensitivity");
        foreach (var bar in money.Bars)
        {
            json.WriteStartObject();
            json.WriteString("id", bar.Id);
            json.WriteString("worse", bar.WorseText);
            json.WriteNumber("worseNetPresentValue", bar.WorseAmount);
            json.WriteString("better", bar.BetterText);
            json.WriteNumber("betterNetPresentValue", bar.BetterAmount);
            json.WriteEndObject();
        }

        json.WriteEndArray();
        json.WriteEndObject();
    }
}
