using HeadToWatts.Memos.Tests.Pdf;
using HeadToWatts.Studies.Worth;

namespace HeadToWatts.Memos.Tests.Sections;

/// <summary>What the memo says of money.</summary>
public class MoneySectionTests
{
    [Fact]
    public void The_plain_answer_the_costs_and_every_year_stand_in_the_memo()
    {
        var result = Studies.Changed("tamarack-pipeline", _ => { });
        using var read = new ReadBack(Memo.Make(result, result.Show()));
        var text = string.Join("\n", read.PageTexts).Replace('\u00a0', ' ').Replace('\u202f', ' ');
        var money = result.Money!;
        Assert.Contains("Whether it pays", text, StringComparison.Ordinal);
        Assert.Contains(money.Answer.Headline, text, StringComparison.Ordinal);
        Assert.Contains(Plain(MoneyText.Amount(money.Measures.NetPresentValueAmount, money.Basis)), text, StringComparison.Ordinal);
        Assert.Contains("Interest during construction", text, StringComparison.Ordinal);
        Assert.Contains("One thing at a time", text, StringComparison.Ordinal);
        Assert.Contains("not financial, tax or legal advice", text, StringComparison.Ordinal);
        Assert.Contains(Plain(MoneyText.Whole(money.Flow.Years[^1].ProjectAmount)), text, StringComparison.Ordinal);
    }

    [Fact]
    public void A_study_without_money_says_nothing_of_it()
    {
        var result = Studies.Changed("larkspur-drop", study => study.Alternatives[0].Money = null);
        using var read = new ReadBack(Memo.Make(result, result.Show()));
        Assert.DoesNotContain(read.PageTexts, t => t.Contains("Whether it pays", StringComparison.Ordinal));
    }

    private static string Plain(string text) => text.Replace('\u00a0', ' ').Replace('\u202f', ' ');
}
