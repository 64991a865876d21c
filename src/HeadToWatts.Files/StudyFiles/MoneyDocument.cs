namespace HeadToWatts.Files.StudyFiles;

/// <summary>Costs, income and how they are weighed. Amounts are numbers in the study's currency, with its three letters or without.</summary>
public sealed class MoneyDocument
{
    /// <summary>Currency, three letters.</summary>
    public string? Currency { get; set; }

    /// <summary>Year of the prices.</summary>
    public string? PriceYear { get; set; }

    /// <summary>"real" or "nominal".</summary>
    public string? Terms { get; set; }

    /// <summary>Discount rate in these terms.</summary>
    public string? DiscountRate { get; set; }

    /// <summary>Inflation.</summary>
    public string? Inflation { get; set; }

    /// <summary>Years of operation.</summary>
    public string? Life { get; set; }

    /// <summary>Income from one kWh.</summary>
    public string? Price { get; set; }

    /// <summary>Yearly change of the price.</summary>
    public string? PriceEscalation { get; set; }

    /// <summary>Energy lost from year to year through wear.</summary>
    public string? Degradation { get; set; }

    /// <summary>Lines of the cost estimate.</summary>
    public List<CostLineDocument>? Costs { get; set; }

    /// <summary>Contingency of the lines that have none of their own.</summary>
    public string? Contingency { get; set; }

    /// <summary>Engineering and management over the cost of the works.</summary>
    public string? Engineering { get; set; }

    /// <summary>Years of construction.</summary>
    public string? ConstructionYears { get; set; }

    /// <summary>Interest during construction.</summary>
    public string? ConstructionInterest { get; set; }

    /// <summary>Yearly costs.</summary>
    public List<RunningCostDocument>? Running { get; set; }

    /// <summary>Replacements.</summary>
    public List<ReplacementDocument>? Replacements { get; set; }

    /// <summary>Credits and other income.</summary>
    public List<CreditDocument>? Credits { get; set; }

    /// <summary>Grants at the start.</summary>
    public string? Grants { get; set; }

    /// <summary>Worth at the end; negative for removal.</summary>
    public string? Salvage { get; set; }

    /// <summary>The loan.</summary>
    public LoanDocument? Loan { get; set; }

    /// <summary>The tax.</summary>
    public TaxDocument? Tax { get; set; }

    /// <summary>Indexes that bring published costs of earlier years to the price year.</summary>
    public List<PriceIndexDocument>? Indexes { get; set; }
}

/// <summary>An index of prices.</summary>
public sealed class PriceIndexDocument
{
    /// <summary>Name of the index.</summary>
    public string? Name { get; set; }

    /// <summary>The earlier year.</summary>
    public string? FromYear { get; set; }

    /// <summary>Index of the price year over that of the earlier year.</summary>
    public string? Ratio { get; set; }
}

/// <summary>A line of the cost estimate.</summary>
public sealed class CostLineDocument
{
    /// <summary>What is bought or built.</summary>
    public string? Name { get; set; }

    /// <summary>Its class.</summary>
    public string? Class { get; set; }

    /// <summary>How much of it; 1 when left out.</summary>
    public string? Quantity { get; set; }

    /// <summary>Unit of the quantity, printed as written.</summary>
    public string? Unit { get; set; }

    /// <summary>Price of one unit.</summary>
    public string? UnitPrice { get; set; }

    /// <summary>Contingency of this line.</summary>
    public string? Contingency { get; set; }
}

/// <summary>A yearly cost.</summary>
public sealed class RunningCostDocument
{
    /// <summary>What it is.</summary>
    public string? Name { get; set; }

    /// <summary>A year.</summary>
    public string? Yearly { get; set; }

    /// <summary>For each kWh.</summary>
    public string? PerKwh { get; set; }

    /// <summary>Yearly change.</summary>
    public string? Escalation { get; set; }
}

/// <summary>A part replaced again and again.</summary>
public sealed class ReplacementDocument
{
    /// <summary>What it is.</summary>
    public string? Name { get; set; }

    /// <summary>Each time.</summary>
    public string? Amount { get; set; }

    /// <summary>After so many years.</summary>
    public string? EveryYears { get; set; }

    /// <summary>Yearly change.</summary>
    public string? Escalation { get; set; }
}

/// <summary>Income beside the price.</summary>
public sealed class CreditDocument
{
    /// <summary>What it is.</summary>
    public string? Name { get; set; }

    /// <summary>A year.</summary>
    public string? Yearly { get; set; }

    /// <summary>For each kWh.</summary>
    public string? PerKwh { get; set; }

    /// <summary>For so many years; the whole life when left out.</summary>
    public string? Years { get; set; }

    /// <summary>Yearly change.</summary>
    public string? Escalation { get; set; }
}

/// <summary>A loan.</summary>
public sealed class LoanDocument
{
    /// <summary>Share of the capital cost.</summary>
    public string? Share { get; set; }

    /// <summary>Interest as the bank states it.</summary>
    public string? Interest { get; set; }

    /// <summary>Years of repayment.</summary>
    public string? Years { get; set; }
}

/// <summary>A tax.</summary>
public sealed class TaxDocument
{
    /// <summary>Tax over taxable income.</summary>
    public string? Rate { get; set; }

    /// <summary>Share of the capital cost that is written off; all when left out.</summary>
    public string? Depreciable { get; set; }

    /// <summary>"straight line 20", "declining balance 15 x 1.5", or the shares of the years.</summary>
    public string? Depreciation { get; set; }
}
