namespace HeadToWatts.Files.StudyFiles;

/// <summary>The fields of "money" by name.</summary>
internal static class MoneyFields
{
    internal static MoneyDocument Read(JsonObjectReader r) => new()
    {
        Currency = r.Text("currency"),
        PriceYear = r.NumberText("priceYear"),
        Terms = r.Text("terms"),
        DiscountRate = r.Text("discountRate"),
        Inflation = r.Text("inflation"),
        Life = r.NumberText("life"),
        Price = r.NumberText("price"),
        PriceEscalation = r.Text("priceEscalation"),
        Degradation = r.Text("degradation"),
        Costs = r.Array("costs", c => new CostLineDocument { Name = c.Text("name"), Class = c.Text("class"), Quantity = c.NumberText("quantity"), Unit = c.Text("unit"), UnitPrice = c.NumberText("unitPrice"), Contingency = c.Text("contingency") }),
        Contingency = r.Text("contingency"),
        Engineering = r.Text("engineering"),
        ConstructionYears = r.NumberText("constructionYears"),
        ConstructionInterest = r.Text("constructionInterest"),
        Running = r.Array("running", c => new RunningCostDocument { Name = c.Text("name"), Yearly = c.NumberText("yearly"), PerKwh = c.NumberText("perKwh"), Escalation = c.Text("escalation") }),
        Replacements = r.Array("replacements", c => new ReplacementDocument { Name = c.Text("name"), Amount = c.NumberText("amount"), EveryYears = c.NumberText("everyYears"), Escalation = c.Text("escalation") }),
        Credits = r.Array("credits", c => new CreditDocument { Name = c.Text("name"), Yearly = c.NumberText("yearly"), PerKwh = c.NumberText("perKwh"), Years = c.NumberText("years"), Escalation = c.Text("escalation") }),
        Grants = r.NumberText("grants"),
        Salvage = r.NumberText("salvage"),
        Loan = r.Object("loan", c => new LoanDocument { Share = c.Text("share"), Interest = c.Text("interest"), Years = c.NumberText("years") }),
        Tax = r.Object("tax", c => new TaxDocument { Rate = c.Text("rate"), Depreciable = c.Text("depreciable"), Depreciation = c.Text("depreciation") }),
        Indexes = r.Array("indexes", c => new PriceIndexDocument { Name = c.Text("name"), FromYear = c.NumberText("fromYear"), Ratio = c.NumberText("ratio") }),
    };
}
