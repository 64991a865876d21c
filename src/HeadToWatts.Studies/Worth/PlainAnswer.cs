using System.Globalization;
using HeadToWatts.Basis.Units;
using HeadToWatts.Economics.CashFlows;

namespace HeadToWatts.Studies.Worth;

/// <summary>What a board may do with the study.</summary>
public enum Verdict
{
    /// <summary>Costs or price are still missing.</summary>
    NotYet,

    /// <summary>Worth a feasibility study.</summary>
    WorthStudy,

    /// <summary>Worth better measurements first.</summary>
    MeasureFirst,

    /// <summary>Not worth going on as described.</summary>
    NotWorth,
}

/// <summary>The answer in one paragraph, made from the numbers. Its thresholds are this project's judgement (decision 0021).</summary>
/// <param name="Verdict">What to do.</param>
/// <param name="Headline">It in a few words.</param>
/// <param name="Text">The paragraph.</param>
public sealed record PlainAnswer(Verdict Verdict, string Headline, string Text)
{
    /// <summary>Share of the energy that must be able to fail, without a long record, before a gain is trusted.</summary>
    public const double NeededMarginRatio = 0.25;

    /// <summary>Whole years from which a record is taken as long.</summary>
    public const int LongRecordYears = 10;

    internal static PlainAnswer Pending { get; } = new(Verdict.NotYet, "", "");

    internal static PlainAnswer Of(MoneyResult money, FlowEvidence evidence)
    {
        var basis = money.Basis;
        var m = money.Measures;
        var plan = money.Flow.Plan;
        if (!(plan.AnnualEnergyKwh > 0))
            return new PlainAnswer(Verdict.NotWorth, "Not worth going on as described", "As described the plant makes no energy, so nothing can pay for it. The cautions say what stands in the way; with water or head that it can use, the question may be asked again.");
        var energy = UnitDisplay.Energy(plan.AnnualEnergyKwh);
        if (!money.HasPrice)
        {
            return new PlainAnswer(Verdict.NotYet, "Not yet to be answered: no price", money.HasCosts
                ? $"No price of energy is given. With {energy} a year and works of {MoneyText.WithYear(money.Costs.TotalAmount, basis)}, a kWh must bring {MoneyText.PerKwh(m.BreakEvenPriceAmountPerKwh ?? 0, basis)} for the money to come back with {UnitDisplay.Percent(plan.DiscountRate)} a year ({MoneyText.Terms(plan)}). Ask the utility what it pays, or what a kWh saved is worth on the bill."
                : $"Neither a price nor a cost is given; all that is known is {energy} in a mean year.");
        }

        if (!money.HasCosts)
        {
            return new PlainAnswer(Verdict.NotYet, "Not yet to be answered: no cost", $"No cost of the works is given. {energy} a year at {MoneyText.PerKwh(plan.PriceAmountPerKwh, basis)}, less the running costs, are worth {MoneyText.WithYear(m.NetPresentValueAmount, basis)} over {plan.LifeYears} years at {UnitDisplay.Percent(plan.DiscountRate)} ({MoneyText.Terms(plan)}). The works may cost no more than that.");
        }

        var first = $"The works cost {MoneyText.WithYear(money.Costs.TotalAmount, basis)} and make {energy} in a mean year at {MoneyText.PerKwh(plan.PriceAmountPerKwh, basis)}. ";
        var deciding = money.Bars.Where(b => b.Decides).ToList();
        if (m.NetPresentValueAmount < 0)
            return Losing(money, first, deciding);

        var payback = m.PaybackYears is { } years ? $"They are paid back after {MoneyText.Years(years)} and " : "They ";
        var gain = payback + $"leave {MoneyText.Amount(m.NetPresentValueAmount, basis)} over {plan.LifeYears} years at {UnitDisplay.Percent(plan.DiscountRate)} a year ({MoneyText.Terms(plan)}). ";
        var margin = money.EnergyMargin ?? 0;
        var thinRecord = evidence.WholeYears < LongRecordYears && margin < NeededMarginRatio;
        if (deciding.Count > 0 || thinRecord)
        {
            var what = deciding.Count > 0
                ? $"But {List(deciding.Take(3).Select(b => $"{b.Name} ({b.WorseText})"))} alone would turn the gain into a loss. "
                : $"But the energy may fall short by no more than {UnitDisplay.Percent(margin)}, and it rests on {Record(evidence)}. ";
            var settle = deciding.Take(3).Select(b => b.HowToSettle).ToList();
            if (settle.Count == 0)
                settle.Add("a flow record of ten years or more at the site, or a gauge nearby it can be tied to");
            return new PlainAnswer(Verdict.MeasureFirst, "Worth better measurements first",
                first + gain + what + $"Worth settling before a feasibility study is paid for: {List(settle, "; ")}. {Price(m, plan)}");
        }

        var widest = money.Bars.Count > 0 ? $"Of the things that were changed one at a time none turns it into a loss; {money.Bars[0].Name} ({money.Bars[0].WorseText}) weighs most and would leave {MoneyText.Amount(money.Bars[0].WorseAmount, basis)}. " : "";
        return new PlainAnswer(Verdict.WorthStudy, "Worth a feasibility study",
            first + gain + widest + $"The energy may fall short by {UnitDisplay.Percent(margin)} before nothing is gained{(evidence.WholeYears < LongRecordYears ? $", though it rests on {Record(evidence)}" : "")}. {Price(m, plan)} Several of these together, a refused permit or a dear interconnection would change the answer.");
    }

    private static PlainAnswer Losing(MoneyResult money, string first, List<SensitivityBar> deciding)
    {
        var basis = money.Basis;
        var m = money.Measures;
        var plan = money.Flow.Plan;
        var loss = $"Over {plan.LifeYears} years at {UnitDisplay.Percent(plan.DiscountRate)} a year that falls short by {MoneyText.Amount(-m.NetPresentValueAmount, basis)} ({MoneyText.Terms(plan)})"
            + (m.PaybackYears is { } years ? $", though without interest the money is back after {MoneyText.Years(years)}. " : "; even without interest the money never comes back. ");
        if (deciding.Count > 0)
        {
            return new PlainAnswer(Verdict.MeasureFirst, "Worth better measurements first",
                first + loss + $"But {List(deciding.Take(3).Select(b => $"{b.Name} ({b.BetterText})"))} alone would make it pay. Worth settling before anything else is spent: {List(deciding.Take(3).Select(b => b.HowToSettle), "; ")}. {Price(m, plan)}");
        }

        var largest = money.Costs.TotalAmount + m.NetPresentValueAmount;
        var cost = largest > 0 && plan.Tax is null ? $" or works of {MoneyText.Amount(largest, basis)} or less" : "";
        var price = m.BreakEvenPriceAmountPerKwh is { } even ? $"It would take {MoneyText.PerKwh(even, basis)}{cost}. " : "";
        return new PlainAnswer(Verdict.NotWorth, "Not worth going on as described",
            first + loss + $"None of the things that were changed one at a time makes it pay. {price}A cheaper scheme, a shared pipe, a grant or a better price would be a different question, and worth asking.");
    }

    private static string Price(CashFlowMeasures m, CashFlowPlan plan) =>
        m.BreakEvenPriceAmountPerKwh is { } even ? $"It breaks even at {MoneyText.PerKwh(even, plan.Basis)}." : "";

    private static string Record(FlowEvidence evidence) => evidence.WholeYears switch
    {
        0 => "rows of flow without a record",
        1 => "one whole year of record",
        var n => string.Create(CultureInfo.InvariantCulture, $"{n} whole years of record"),
    };

    private static string List(IEnumerable<string> items, string comma = ", ")
    {
        var all = items.ToList();
        return all.Count < 2 ? string.Concat(all) : string.Join(comma, all.Take(all.Count - 1)) + (comma == "; " ? "; and " : " or ") + all[^1];
    }
}
