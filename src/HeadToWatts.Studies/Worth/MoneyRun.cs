using System.Globalization;
using HeadToWatts.Basis.Quantities;
using HeadToWatts.Basis.Units;
using HeadToWatts.Economics.CashFlows;
using HeadToWatts.Economics.Costs;
using HeadToWatts.Studies.Inputs;

namespace HeadToWatts.Studies.Worth;

/// <summary>Puts the study's energy and the user's costs and prices together.</summary>
public static class MoneyRun
{
    /// <summary>Energy is swung by this share.</summary>
    public const double EnergySwingRatio = 0.10;

    /// <summary>Price and capital cost are swung by this share.</summary>
    public const double PriceSwingRatio = 0.20;

    /// <summary>Running costs are swung by this share.</summary>
    public const double RunningSwingRatio = 0.25;

    /// <summary>The discount rate is swung by so much.</summary>
    public const double RateSwingShare = 0.02;

    /// <summary>Availability is swung by so much.</summary>
    public const double AvailabilitySwingShare = 0.03;

    /// <summary>The gross head is swung by this share, or by its stated error where that is more.</summary>
    public const double HeadSwingRatio = 0.03;

    /// <summary>Years by which the life is swung.</summary>
    public const int LifeSwingYears = 10;

    /// <summary>Runs the money of an alternative.</summary>
    /// <param name="input">What was entered.</param>
    /// <param name="annualEnergyKwh">Energy at the meter in a mean year, kWh.</param>
    /// <param name="availability">Availability within that energy.</param>
    /// <param name="accountIncome">Income of that year by an account of its own; null to use the flat price.</param>
    /// <param name="headSwing">Energy with the head lower and higher; null to leave the bar out.</param>
    /// <param name="evidence">How sure the flow is.</param>
    public static MoneyResult Of(MoneyInput input, double annualEnergyKwh, double availability, Money? accountIncome, HeadSwing? headSwing, FlowEvidence evidence)
    {
        ArgumentNullException.ThrowIfNull(input);
        var costs = CostBuildUp.Of(input.Basis, input.CostLines, input.EngineeringRatio, input.Construction);
        var plan = Plan(input, costs, annualEnergyKwh, accountIncome);
        var flow = CashFlow.Of(plan);
        var measures = CashFlowMeasures.Of(flow);
        IReadOnlyList<SensitivityBar> bars = costs.TotalAmount > 0 && plan.PriceAmountPerKwh > 0 && annualEnergyKwh > 0
            ? [.. Bars(plan, annualEnergyKwh, availability, headSwing).Where(b => Math.Abs(b.SwingAmount) > 0).OrderByDescending(b => Math.Abs(b.SwingAmount))]
            : [];
        var result = new MoneyResult(input, costs, flow, measures, bars, PlainAnswer.Pending) { EnergyMargin = Margin(plan, measures) };
        return result with { Answer = PlainAnswer.Of(result, evidence) };
    }

    private static CashFlowPlan Plan(MoneyInput input, CostBuildUp costs, double annualEnergyKwh, Money? accountIncome)
    {
        var price = input.PriceAmountPerKwh ?? 0;
        if (accountIncome is { } income && annualEnergyKwh > 0)
            price = input.Basis == income.Basis ? income.Amount / annualEnergyKwh : throw new ArgumentException($"An account in {income.Basis} cannot be counted in {input.Basis}.", nameof(accountIncome));
        return new CashFlowPlan(input.Basis, input.Terms, input.LifeYears, input.DiscountRate)
        {
            InflationRate = input.InflationRate ?? 0,
            CapitalAmount = costs.TotalAmount,
            GrantAmount = input.GrantAmount,
            AnnualEnergyKwh = annualEnergyKwh,
            DegradationRate = input.DegradationRate,
            PriceAmountPerKwh = price,
            PriceEscalationRate = input.PriceEscalationRate,
            RunningCosts = input.RunningCosts,
            Replacements = input.Replacements,
            Credits = input.Credits,
            SalvageAmount = input.SalvageAmount,
            Loan = input.Loan is { } loan ? new Loan(loan.CapitalShare * costs.TotalAmount, loan.InterestRate, loan.TermYears) : null,
            Tax = input.Tax is { } tax ? new IncomeTax(tax.TaxRate, tax.DepreciableShare * costs.TotalAmount, tax.Depreciation) : null,
        };
    }

    private static IEnumerable<SensitivityBar> Bars(CashFlowPlan plan, double annualEnergyKwh, double availability, HeadSwing? headSwing)
    {
        var none = PlanChange.None;
        double At(PlanChange change) => CashFlow.NetPresentValueAmount(plan, change);
        yield return Bar("energy", "energy", $"−{Share(EnergySwingRatio)}", $"+{Share(EnergySwingRatio)}", none with { EnergyRatio = 1 - EnergySwingRatio }, none with { EnergyRatio = 1 + EnergySwingRatio }, "a flow record of ten years or more at the site, or a gauge nearby it can be tied to");
        yield return Bar("price", "price of energy", $"−{Share(PriceSwingRatio)}", $"+{Share(PriceSwingRatio)}", none with { PriceRatio = 1 - PriceSwingRatio }, none with { PriceRatio = 1 + PriceSwingRatio }, "the utility's written price and terms, or a year of bills by meter");
        yield return Bar("capital", "capital cost", $"+{Share(PriceSwingRatio)}", $"−{Share(PriceSwingRatio)}", none with { CapitalRatio = 1 + PriceSwingRatio }, none with { CapitalRatio = 1 - PriceSwingRatio }, "quotations for pipe, machine and interconnection, and a survey of the pipe's route");
        yield return Bar("running", "running costs and replacements", $"+{Share(RunningSwingRatio)}", $"−{Share(RunningSwingRatio)}", none with { RunningRatio = 1 + RunningSwingRatio }, none with { RunningRatio = 1 - RunningSwingRatio }, "who will run and insure the plant, and at what price");
        yield return Bar("discount", "discount rate", $"+{Points(RateSwingShare)}", $"−{Points(RateSwingShare)}", none with { DiscountRateShift = RateSwingShare }, none with { DiscountRateShift = -RateSwingShare }, "what the owner's money earns or costs elsewhere");
        var shorter = Math.Min(LifeSwingYears, plan.LifeYears - 1);
        yield return Bar("life", "years of operation", $"−{shorter} years", $"+{LifeSwingYears} years", none with { LifeYearsShift = -shorter }, none with { LifeYearsShift = LifeSwingYears }, "the term of the water right, the lease and the maker's guarantee");
        if (availability > 0)
        {
            var up = Math.Min(AvailabilitySwingShare, 1 - availability);
            yield return Bar("availability", "availability", $"−{Points(AvailabilitySwingShare)}", $"+{Points(up)}", none with { EnergyRatio = 1 - (AvailabilitySwingShare / availability) }, none with { EnergyRatio = 1 + (up / availability) }, "who clears the rack and how soon a fault is met");
        }

        if (headSwing is { } head)
            yield return Bar("head", "gross head", $"−{head.Text}", $"+{head.Text}", none with { EnergyRatio = head.LowKwh / annualEnergyKwh }, none with { EnergyRatio = head.HighKwh / annualEnergyKwh }, "both water levels by level and staff, at low and at full flow");

        SensitivityBar Bar(string id, string name, string worse, string better, PlanChange worseChange, PlanChange betterChange, string settle)
        {
            var (a, b) = (At(worseChange), At(betterChange));
            return a <= b ? new SensitivityBar(id, name, worse, better, a, b, settle) : new SensitivityBar(id, name, better, worse, b, a, settle);
        }

        static string Share(double ratio) => UnitDisplay.Number(ratio * 100, 2) + " %";
        static string Points(double ratio) => (ratio * 100).ToString("0.#", CultureInfo.InvariantCulture) + " points";
    }

    // The worth is a straight line over the energy but for taxes, so the secant through two points finds where it ends.
    private static double? Margin(CashFlowPlan plan, CashFlowMeasures measures)
    {
        if (!(measures.NetPresentValueAmount > 0))
            return null;
        var (low, high) = (0.0, 1.0);
        if (CashFlow.NetPresentValueAmount(plan, PlanChange.None with { EnergyRatio = 0 }) > 0)
            return 1;
        for (var i = 0; i < 60; i++)
        {
            var middle = (low + high) / 2;
            if (CashFlow.NetPresentValueAmount(plan, PlanChange.None with { EnergyRatio = middle }) > 0)
                high = middle;
            else
                low = middle;
        }

        return 1 - high;
    }
}

/// <summary>Energy with the gross head lower and higher.</summary>
/// <param name="LowKwh">With it lower, kWh a year.</param>
/// <param name="HighKwh">With it higher, kWh a year.</param>
/// <param name="Text">By how much, in words.</param>
public sealed record HeadSwing(double LowKwh, double HighKwh, string Text);

/// <summary>How sure the flow is.</summary>
/// <param name="WholeYears">Whole years of record; 0 without a record.</param>
public readonly record struct FlowEvidence(int WholeYears);
