using Bunit;

namespace HeadToWatts.Web.Tests.Worksheet;

public sealed class MoneyStageTests : Visitor
{
    private static readonly TimeSpan Patience = TimeSpan.FromSeconds(20);

    [Fact]
    public void The_page_answers_plainly_and_follows_the_price()
    {
        var page = Open(Put("larkspur-drop"), "money");
        Assert.Contains("Worth better measurements first", page.Markup, StringComparison.Ordinal);
        Assert.Contains("Net present value", page.Find(".answer").TextContent, StringComparison.Ordinal);
        page.FindByLabel("Price, USD/kWh").Input("0.02");
        page.WaitForAssertion(() => Assert.Contains("Not worth going on as described", page.Markup, StringComparison.Ordinal), Patience);
        page.FindByLabel("Price, USD/kWh").Input("0.02 EUR");
        page.WaitForAssertion(() => Assert.Contains("one currency is never turned into another", page.Markup, StringComparison.OrdinalIgnoreCase), Patience);
    }

    [Fact]
    public void Money_is_begun_filled_and_left_out_again()
    {
        var page = Open(Put("larkspur-drop"), "money");
        page.FindAll("button").Single(b => b.TextContent == "Leave money out").Click();
        page.WaitForAssertion(() => Assert.Null(Session.Result!.Money), Patience);
        Assert.DoesNotContain("Net present value", page.Find(".answer").TextContent, StringComparison.Ordinal);

        page.FindAll("button").Single(b => b.TextContent == "Enter costs and income").Click();
        page.WaitForAssertion(() => Assert.NotNull(Session.Result!.Money), Patience);
        Assert.Empty(Session.Problems);
        page.FindAll("button").Single(b => b.TextContent == "Add an item").Click();
        page.WaitForAssertion(() => Assert.NotNull(page.FindByLabel("Price of one, USD")), Patience);
        page.FindByLabel("Price of one, USD").Input("400000");
        page.FindByLabel("Price, USD/kWh").Input("0.1");
        page.FindAll("button").Single(b => b.TextContent == "Add a running cost").Click();
        page.FindByLabel("Loan").Change("yes");
        page.WaitForAssertion(() => Assert.Contains(Session.Problems, p => p.Where.EndsWith("money.inflation", StringComparison.Ordinal)), Patience);
        page.FindByLabel("Inflation").Input("2");
        page.WaitForAssertion(() => Assert.NotNull(Session.Result!.Money!.Measures.LowestDebtCover), Patience);
        Assert.Equal(480_000, Session.Result!.Money!.Costs.TotalAmount, 1e-6);
    }
}
