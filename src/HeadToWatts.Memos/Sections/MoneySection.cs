using System.Globalization;
using HeadToWatts.Basis.Units;
using HeadToWatts.Economics.CashFlows;
using HeadToWatts.Memos.Content;
using HeadToWatts.Studies.Worth;

namespace HeadToWatts.Memos.Sections;

/// <summary>Whether it pays, where costs or income are entered.</summary>
internal static class MoneySection
{
    public static void Write(MemoContext memo)
    {
        if (memo.Result.Money is not { } money)
            return;
        var body = memo.Body;
        body.Section("Whether it pays", "money");
        body.Say(RichText.Bold(money.Answer.Headline + ". ") + money.Answer.Text, ParagraphKind.Lead);
        body.Say(RichText.Of($"Every figure is in {money.Basis.Currency}: {MoneyText.Terms(money.Flow.Plan)}. The verdict follows thresholds of this project ") + body.Cite(MoneySources.PlainAnswer)
            + ", not of any bank or board. It is a screening of costs and prices as entered, not financial, tax or legal advice, and no promise of income.", ParagraphKind.Note);
        Measures(memo, money);
        Costs(memo, money);
        Cash(memo, money);
        Bars(memo, money);
    }

    private static void Measures(MemoContext memo, MoneyResult money)
    {
        if (!money.HasCosts && !money.HasPrice)
            return;
        var m = money.Measures;
        var rows = new List<TableRow>
        {
            Row("Net present value, after tax and before any loan", MoneyText.Amount(m.NetPresentValueAmount, money.Basis), $"at {UnitDisplay.Percent(money.Input.DiscountRate)} over {money.Input.LifeYears} years"),
            Row("The same, evenly each year", MoneyText.Amount(m.YearlyWorthAmount, money.Basis), ""),
            Row("Internal rate of return", MoneyText.Rate(m.Rate), m.Rate.Statement),
            Row("Modified rate of return", m.ModifiedRate is { } modified ? UnitDisplay.Percent(modified) : "none", "costs financed and income put by at the discount rate"),
            Row("Payback without interest", Years(m.PaybackYears), ""),
            Row("Payback, discounted", Years(m.DiscountedPaybackYears), ""),
            Row("Benefit-cost ratio", m.BenefitCostRatio is { } ratio ? UnitDisplay.Number(ratio) : "–", "present worths; grants and credits count as benefits"),
            Row("Levelised cost of energy", m.LevelisedCostAmountPerKwh is { } lcoe ? MoneyText.PerKwh(lcoe, money.Basis) : "–", "without grants, credits, taxes and loan"),
            Row("Price that breaks even", m.BreakEvenPriceAmountPerKwh is { } even ? MoneyText.PerKwh(even, money.Basis) : "–", money.HasPrice ? $"entered: {MoneyText.PerKwh(money.Flow.Plan.PriceAmountPerKwh, money.Basis)}" : "no price entered"),
        };
        if (m.LowestDebtCover is { } cover)
        {
            rows.Add(Row("Debt cover, lowest year", UnitDisplay.Number(cover), $"mean {UnitDisplay.Number(m.MeanDebtCover ?? 0)}"));
            rows.Add(Row("Net present value to the owner", MoneyText.Amount(m.OwnerNetPresentValueAmount, money.Basis), "after the loan"));
            rows.Add(Row("Internal rate of return to the owner", MoneyText.Rate(m.OwnerRate), m.OwnerRate.Statement));
        }

        memo.Body.Table("tab-measures", RichText.Of("What it comes to ") + memo.Body.Cite(CashFlowMethods.Panneerselvam) + " " + memo.Body.Cite(CashFlowMethods.Short) + ".", [new("Measure", Share: 1.4), new("Value", ColumnAlign.Right, 0), new("For what", Share: 1.4)], rows);
    }

    private static void Costs(MemoContext memo, MoneyResult money)
    {
        if (!money.HasCosts)
            return;
        var body = memo.Body;
        body.Part("What it costs", "money-costs");
        if (Figures.CostBuildUp(memo) is { } drawing)
            body.Figure("fig-costs", drawing, $"Capital cost, {money.Basis}; what is added to the works in ochre.");
        var rows = money.Costs.Lines
            .Select(l => new TableRow([l.Name, l.Class.Name, Quantity(l.QuantityNumber, l.QuantityUnit), MoneyText.Whole(l.UnitPrice.Amount), MoneyText.Whole(l.Direct.Amount), MemoContext.WholePercent(l.ContingencyRatio)]))
            .ToList();
        rows.Add(new TableRow(["Works", "", "", "", MoneyText.Whole(money.Costs.DirectAmount), ""], RowKind.Total));
        rows.Add(new TableRow(["Contingency", "", "", "", MoneyText.Whole(money.Costs.ContingencyAmount), ""]));
        rows.Add(new TableRow(["Engineering and management", $"{MemoContext.Percent(money.Costs.EngineeringRatio)} of both", "", "", MoneyText.Whole(money.Costs.EngineeringAmount), ""]));
        rows.Add(new TableRow(["Interest during construction", $"{MemoContext.Count(money.Costs.Construction.ConstructionYears, "year", "years")} at {MemoContext.Percent(money.Costs.Construction.InterestRate)}", "", "", MoneyText.Whole(money.Costs.InterestAmount), ""]));
        rows.Add(new TableRow(["Capital cost", "", "", "", MoneyText.Whole(money.Costs.TotalAmount), ""], RowKind.Total));
        body.Table("tab-costs", $"Cost estimate, {money.Basis}.",
            [new("Item", Share: 1.5), new("Class", Share: 1.1), new("Quantity", ColumnAlign.Right, 0), new("Unit price", ColumnAlign.Right, 0), new("Amount", ColumnAlign.Right, 0), new("Contingency, %", ColumnAlign.Right, 0)],
            rows);
        Bands(memo, money);
    }

    // Beside the user's figures, never in their place: each in its own money, with what it was drawn from.
    private static void Bands(MemoContext memo, MoneyResult money)
    {
        if (money.CostBands.Count == 0)
            return;
        var body = memo.Body;
        var rows = money.CostBands.Select(b => new TableRow([
            RichText.Of(b.Correlation.Name + " ") + body.Cite(b.Correlation.Source),
            $"{(b.Correlation.Scope == Economics.CostCorrelations.CostScope.Machine ? "machine" : "plant")}: {b.Correlation.For}{(b.IsInside ? "" : "; this plant lies outside")}",
            MoneyText.WithYear(b.Cost.Amount, b.Cost.Basis),
            b.AtOurPrices is { } ours ? MoneyText.WithYear(ours.Amount, ours.Basis) + (b.Index.Length > 0 ? $" by {b.Index}" : "") : "no index given, or another currency",
            MoneyText.WithYear(b.OwnAmount, money.Basis)])).ToList();
        body.Table("tab-bands", "Published correlations as a band beside the estimate.", [new("Correlation"), new("Of what", Share: 1.5), new("Gives", ColumnAlign.Right), new("At this study's prices", ColumnAlign.Right), new("This estimate", ColumnAlign.Right)], rows,
            RichText.Of("They lie two to three times apart and are no estimate. Their coefficients were written down from memory and not checked against print. Machine: turbine, generator, electrical works with contingency; plant: everything but interest."));
    }

    private static void Cash(MemoContext memo, MoneyResult money)
    {
        var body = memo.Body;
        body.Part("Cash by year", "money-cash");
        if (Figures.CashFlow(memo) is { } drawing)
            body.Figure("fig-cash", drawing, $"Cash by year ({MoneyText.Terms(money.Flow.Plan)}) and its running sum, not discounted, after tax and before any loan.");
        var loan = money.Flow.Plan.Loan is not null;
        var columns = new List<TableColumn> { new("Year", ColumnAlign.Right, 0.4), new("Energy income", ColumnAlign.Right), new("Other income", ColumnAlign.Right), new("Running", ColumnAlign.Right), new("Capital, replace\u00adments", ColumnAlign.Right), new("Tax", ColumnAlign.Right), new("Cash", ColumnAlign.Right), new("Sum", ColumnAlign.Right) };
        if (loan)
            columns.Add(new("To the owner", ColumnAlign.Right));
        var sum = 0.0;
        var rows = new List<TableRow>();
        foreach (var y in money.Flow.Years)
        {
            sum += y.ProjectAmount;
            var cells = new List<RichText>
            {
                y.Year.ToString(CultureInfo.InvariantCulture), MoneyText.Whole(y.IncomeAmount), MoneyText.Whole(y.CreditAmount + y.GrantAmount + y.SalvageAmount), MoneyText.Whole(-y.RunningAmount),
                MoneyText.Whole(-y.CapitalAmount - y.ReplacementAmount), MoneyText.Whole(-y.TaxAmount), MoneyText.Whole(y.ProjectAmount), MoneyText.Whole(sum),
            };
            if (loan)
                cells.Add(MoneyText.Whole(y.OwnerAmount));
            rows.Add(new TableRow(cells));
        }

        body.Table("tab-cash", $"Cash by year, {MoneyText.Terms(money.Flow.Plan)}.", columns, rows, RichText.Of("Each figure is rounded by itself. Year 0 is the start of operation; other years' cash falls at their end."));
    }

    private static void Bars(MemoContext memo, MoneyResult money)
    {
        if (Figures.Sensitivity(memo) is not { } drawing)
            return;
        var body = memo.Body;
        body.Part("What would change it", "money-bars");
        body.Say(RichText.Of("Each bar changes one thing alone by a step that is this project's judgement ") + body.Cite(MoneySources.Swings) + "; several may come together.");
        body.Figure("fig-bars", drawing, $"Net present value, {money.Basis}, when one thing alone is changed: ochre where it costs, blue where it helps.");
        body.Table("tab-bars", "One thing at a time.",
            [new("What"), new("Worse", Share: 0.5), new("Leaves", ColumnAlign.Right, 0), new("Better", Share: 0.5), new("Leaves", ColumnAlign.Right, 0), new("What would settle it", Share: 2)],
            [.. money.Bars.Select(b => new TableRow([MemoContext.Capital(b.Name), b.WorseText, MoneyText.Whole(b.WorseAmount), b.BetterText, MoneyText.Whole(b.BetterAmount), b.HowToSettle]))]);
    }

    /// <summary>What was put in, for the appendix.</summary>
    public static IEnumerable<(string Name, string Value)> Given(MemoContext memo)
    {
        if (memo.Result.Money is not { } money)
            yield break;
        var input = money.Input;
        string A(double amount) => MoneyText.Amount(amount, money.Basis);
        yield return ("Money", $"{MoneyText.Terms(money.Flow.Plan)}; {input.LifeYears} years of operation; discount rate {MemoContext.Percent(input.DiscountRate)}{(input.InflationRate is { } inflation ? $"; inflation {MemoContext.Percent(inflation)}" : "")}");
        yield return ("Price of energy", input.PriceAmountPerKwh is { } price ? $"{MoneyText.PerKwh(price, money.Basis)}, {Yearly(input.PriceEscalationRate)}; energy {MemoContext.Percent(input.DegradationRate)} less each year" : "not given");
        yield return ("Capital cost", money.HasCosts ? $"see {"the cost estimate"}: {A(money.Costs.TotalAmount)} with engineering {MemoContext.Percent(input.EngineeringRatio)}, construction {MemoContext.Count(input.Construction.ConstructionYears, "year", "years")} at {MemoContext.Percent(input.Construction.InterestRate)}" : "not given");
        yield return ("Running costs", input.RunningCosts.Count == 0 ? "none" : string.Join("; ", input.RunningCosts.Select(c => $"{c.Name} {A(c.YearlyAmount)} a year{(c.AmountPerKwh > 0 ? $" and {MoneyText.PerKwh(c.AmountPerKwh, money.Basis)}" : "")}, {Yearly(c.EscalationRate)}")));
        yield return ("Replacements", input.Replacements.Count == 0 ? "none" : string.Join("; ", input.Replacements.Select(c => $"{c.Name} {A(c.Amount)} every {c.EveryYears} years, {Yearly(c.EscalationRate)}")));
        yield return ("Grants, credits, worth at the end", $"{A(input.GrantAmount)} at the start; {(input.Credits.Count == 0 ? "no credits" : string.Join("; ", input.Credits.Select(c => $"{c.Name} {A(c.YearlyAmount)} a year and {MoneyText.PerKwh(c.AmountPerKwh, money.Basis)} until year {Math.Min(c.LastYear, input.LifeYears)}")))}; {A(input.SalvageAmount)} at the end");
        yield return ("Loan", input.Loan is { } loan ? $"{MemoContext.Percent(loan.CapitalShare)} of the capital cost at {MemoContext.Percent(loan.InterestRate)} nominal, paid back in {loan.TermYears} level payments" : "none");
        yield return ("Tax", input.Tax is { } tax ? $"{MemoContext.Percent(tax.TaxRate)} of taxable income; {MemoContext.Percent(tax.DepreciableShare)} of the capital cost written off by {tax.Depreciation.Name}; losses carried forward" : "none counted");

        static string Yearly(double rate) => rate == 0 ? "unchanged from year to year" : $"{MemoContext.Percent(rate)} a year";
    }

    private static string Quantity(double number, string unit) => (number == Math.Floor(number) && number < 1e9 ? MemoContext.Count((int)number) : UnitDisplay.Number(number, 4)) is var text && unit.Length > 0 ? text + " " + unit : text;

    private static string Years(double? years) => years is { } known ? MoneyText.Years(known) : "never";

    private static TableRow Row(string name, string value, string note) => new([name, value, note]);
}
