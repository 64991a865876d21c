using Bunit;

namespace HeadToWatts.Web.Tests.Worksheet;

public sealed class EnergyStageTests : Visitor
{
    private static readonly TimeSpan Patience = TimeSpan.FromSeconds(20);

    [Fact]
    public void Machines_given_in_detail_take_the_place_of_their_efficiencies()
    {
        var page = Open(Put("larkspur-drop"), "energy");
        foreach (var machine in new[] { "Generator", "Transformer", "Line" })
        {
            var before = Session.Result!;
            page.FindByLabel(machine).Change("detail");
            page.WaitForAssertion(() => Assert.NotSame(before, Session.Result), Patience);
            Assert.Empty(Session.Problems);
        }

        Assert.NotNull(Session.Result!.Energy.Electrical);
        Assert.Null(Document.Alternatives[0].Losses.Generator);
        Assert.Contains("Shaft to meter", page.Markup, StringComparison.Ordinal);
        page.FindByLabel("Conductor").Change("795 kcmil");
        page.WaitForAssertion(() => Assert.Equal("795 kcmil", Session.Result!.Input.Train.Line!.Size.Name), Patience);

        foreach (var machine in new[] { "Generator", "Transformer", "Line" })
            page.FindByLabel(machine).Change("simple");
        page.WaitForAssertion(() => Assert.Null(Session.Result!.Energy.Electrical), Patience);
        Assert.Empty(Session.Problems);
    }

    [Fact]
    public void The_staircase_is_drawn_from_the_water_to_the_meter()
    {
        var page = Open(Put("larkspur-drop"), "energy");
        Assert.Contains("falling water", page.Find("#staircase, [id^=staircase]").ParentElement!.InnerHtml, StringComparison.Ordinal);
    }
}
