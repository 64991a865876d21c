using System.Text.Json;
using HeadToWatts.Economics.CashFlows;
using HeadToWatts.Files.Exports;
using HeadToWatts.Files.StudyFiles;
using HeadToWatts.Studies;
using HeadToWatts.Studies.Inputs;

namespace HeadToWatts.Files.Tests.StudyFiles;

/// <summary>What a study file says of money.</summary>
public class MoneyTests
{
    private const string Whole = """
        "money": {
          "currency": "usd", "priceYear": 2026, "terms": "nominal", "discountRate": "7 %", "inflation": "2 %", "life": 25,
          "price": "0.08 USD/kWh", "priceEscalation": "1 %", "degradation": "0.3 %",
          "costs": [
            { "name": "pipe", "class": "pipe", "quantity": 300, "unit": "ft", "unitPrice": "USD 250", "contingency": "30 %" },
            { "name": "machine", "class": "Turbine and generator", "unitPrice": "180 000" }
          ],
          "contingency": "15 %", "engineering": "12 %", "constructionYears": 2, "constructionInterest": "5 %",
          "running": [ { "name": "O&M", "yearly": 5000, "perKwh": 0.003 } ],
          "replacements": [ { "name": "runner", "amount": 20000, "everyYears": 12, "escalation": "3 %" } ],
          "credits": [ { "name": "certificates", "perKwh": 0.002, "years": 10 } ],
          "grants": 25000, "salvage": -8000,
          "loan": { "share": "50 %", "interest": "6 %", "years": 15 },
          "tax": { "rate": "21 %", "depreciable": "90 %", "depreciation": "declining balance 15 x 1.5" },
          "indexes": [ { "name": "an invented index", "fromYear": 2014, "ratio": 1.4 } ]
        }
        """;

    [Fact]
    public void Everything_entered_of_money_is_read()
    {
        var money = With(Whole).Money!;
        Assert.Equal(("USD", 2026, PriceTerms.Nominal, 25), (money.Basis.Currency, money.Basis.PriceYear, money.Terms, money.LifeYears));
        Assert.Equal((0.07, 0.02, 0.08, 0.01, 0.003), (money.DiscountRate, money.InflationRate, money.PriceAmountPerKwh, money.PriceEscalationRate, money.DegradationRate));
        Assert.Equal([75_000.0, 180_000], money.CostLines.Select(l => l.Direct.Amount));
        Assert.Equal([0.3, 0.15], money.CostLines.Select(l => l.ContingencyRatio));
        Assert.Equal((2, 0.05), (money.Construction.ConstructionYears, money.Construction.InterestRate));

        // In nominal terms what has no escalation of its own follows inflation.
        Assert.Equal(0.02, money.RunningCosts[0].EscalationRate);
        Assert.Equal((12, 0.03), (money.Replacements[0].EveryYears, money.Replacements[0].EscalationRate));
        Assert.Equal((10, 25_000.0, -8_000.0), (money.Credits[0].LastYear, money.GrantAmount, money.SalvageAmount));
        Assert.Equal(new LoanShare(0.5, 0.06, 15), money.Loan);
        Assert.Equal(0.05, money.Tax!.Depreciation.ShareOf(1), 1e-12);
    }

    [Fact]
    public void A_study_written_and_read_again_is_the_same()
    {
        var document = StudyFileReader.Parse("sample.json", Text(Whole)).Value;
        var again = StudyFileReader.Parse("sample.json", StudyFileWriter.Write(document)).Value;
        Assert.Equal(StudyFileWriter.Write(document), StudyFileWriter.Write(again));
        Assert.Equal("0.08 USD/kWh", again.Alternatives[0].Money!.Price);
    }

    [Fact]
    public void Every_mistake_is_reported_with_its_place_and_no_currency_is_converted()
    {
        var problems = Samples.Problems(Text("""
            "money": {
              "currency": "dollars", "priceYear": "about 2020", "terms": "maybe", "discountRate": "7", "life": 0,
              "price": "0,08", "costs": [ { "class": "penstok", "unitPrice": "" } ], "contingency": "-5 %", "constructionYears": 2,
              "running": [ { "yearly": "much" } ], "replacements": [ { "everyYears": 0 } ], "tax": { "rate": "21 %", "depreciation": "fast" }, "loan": {}, "indexes": [ { "ratio": "-1" } ]
            }
            """));
        string[] places =
        [
            "currency", "priceYear", "terms", "discountRate", "life", "price", "costs[0].class", "costs[0].unitPrice", "contingency", "constructionInterest", "running[0].yearly",
            "replacements[0].amount", "replacements[0].everyYears", "indexes[0].name", "indexes[0].fromYear", "indexes[0].ratio", "tax.depreciation", "loan.share", "loan.interest", "loan.years",
        ];
        Assert.Equal(places.Order(), problems.Select(p => p.Where["alternatives[0].money.".Length..]).Order());

        var other = Assert.Single(Samples.Problems(Text(Whole.Replace("USD 250", "EUR 250", StringComparison.Ordinal))));
        Assert.Contains("never turned into another", other.Why, StringComparison.Ordinal);
        var needs = Assert.Single(Samples.Problems(Text(Whole.Replace("\"inflation\": \"2 %\", ", "", StringComparison.Ordinal))));
        Assert.Equal("alternatives[0].money.inflation", needs.Where);
    }

    [Fact]
    public void The_results_hold_the_money_with_its_currency_and_a_study_without_says_null()
    {
        var result = Study.RunAll(Samples.Input(Text(Whole)));
        using var json = JsonDocument.Parse(ResultsJson.Write(result));
        var money = json.RootElement.GetProperty("alternatives")[0].GetProperty("money");
        Assert.Equal("USD", money.GetProperty("currency").GetString());
        Assert.Equal(26, money.GetProperty("years").GetArrayLength());

        // A named index brings a correlation of its own year and currency to the price year, and no other.
        var bands = money.GetProperty("costCorrelations").EnumerateArray().ToList();
        Assert.All(bands, b => Assert.Equal(b.GetProperty("priceYear").GetInt32() == 2014, b.GetProperty("atOurPrices").ValueKind == JsonValueKind.Number));
        var moved = bands.Single(b => b.GetProperty("priceYear").GetInt32() == 2014);
        Assert.Equal(1.4 * moved.GetProperty("cost").GetDouble(), moved.GetProperty("atOurPrices").GetDouble(), 1e-6);
        Assert.Equal(result[0].Money!.Measures.NetPresentValueAmount, money.GetProperty("netPresentValue").GetDouble());
        using var without = JsonDocument.Parse(ResultsJson.Write(Study.RunAll(Samples.Input(Samples.Good))));
        Assert.Equal(JsonValueKind.Null, without.RootElement.GetProperty("alternatives")[0].GetProperty("money").ValueKind);
    }

    private static AlternativeInput With(string money) => Samples.Input(Text(money)).Alternatives[0];

    private static string Text(string money) => Samples.With("\"turbine\": {", money + ", \"turbine\": {");
}
