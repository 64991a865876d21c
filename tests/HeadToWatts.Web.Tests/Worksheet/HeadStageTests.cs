using Bunit;

namespace HeadToWatts.Web.Tests.Worksheet;

public sealed class HeadStageTests : Visitor
{
    private static readonly TimeSpan Patience = TimeSpan.FromSeconds(20);

    [Theory]
    [InlineData("gross")]
    [InlineData("levels")]
    [InlineData("measured")]
    public void The_fall_stays_when_it_is_given_in_another_way(string given)
    {
        var page = Open(Put("larkspur-drop"), "head");
        var before = Session.Result!;
        page.FindByLabel("Given as").Change(given);
        page.WaitForAssertion(() => Assert.NotSame(before, Session.Result), Patience);
        Assert.Empty(Session.Problems);
        // Headwater 4308.7 ft less tailwater 4290.2 ft is 18.5 ft.
        Assert.Equal(18.5 * 0.3048, Session.Result!.Head.GrossHeadM, 3);
    }

    [Theory]
    [InlineData("Headwater", "month")]
    [InlineData("Headwater", "flow")]
    [InlineData("Headwater", "crest")]
    [InlineData("Headwater", "pressure")]
    [InlineData("Tailwater", "month")]
    [InlineData("Tailwater", "flow")]
    [InlineData("Tailwater", "pressure")]
    public void A_level_that_moves_starts_from_the_level_that_was_held(string level, string kind)
    {
        var page = Open(Put("larkspur-drop"), "head");
        var before = Session.Result!;
        page.FindByLabel(level).Change(kind);
        page.WaitForAssertion(() => Assert.NotSame(before, Session.Result), Patience);
        Assert.Empty(Session.Problems);
        page.FindByLabel(level).Change("held");
        page.WaitForAssertion(() => Assert.False(Session.Result!.Input.Head.Moves), Patience);
        Assert.Empty(Session.Problems);
    }

    [Fact]
    public void Steps_with_level_and_staff_add_up()
    {
        var page = Open(Put("larkspur-drop"), "head");
        page.FindByLabel("Given as").Change("measured");
        page.FindByLabel("Step 1").Input("10 ft");
        page.FindAll("button").Single(b => b.TextContent == "Add a step").Click();
        page.FindByLabel("Step 2").Input("8 ft 6 in");
        page.WaitForAssertion(() => Assert.Equal(18.5 * 0.3048, Session.Result!.Head.GrossHeadM, 6), Patience);
    }
}
