using AngleSharp.Dom;
using Bunit;

namespace HeadToWatts.Web.Tests.Worksheet;

public sealed class TurbineStageTests : Visitor
{
    private static readonly TimeSpan Patience = TimeSpan.FromSeconds(20);

    [Fact]
    public void Every_machine_stands_in_the_table_and_one_can_be_picked()
    {
        var page = Open(Put("larkspur-drop"), "turbine");
        var rows = page.FindAll("table.machines tbody");
        Assert.Equal(9, rows.Count);
        var before = Session.Result!;
        var other = Session.Result!.Turbine.Ranking[1].Type;
        page.Find($"table.machines button[aria-label='Use {other.Name}']").Click();
        page.WaitForAssertion(() => Assert.Equal(other.Id, Session.Result!.Turbine.Chosen.Type.Id), Patience);
        Assert.NotSame(before, Session.Result);
    }

    [Fact]
    public void A_runner_set_too_high_is_cautioned()
    {
        var page = Open(Put("larkspur-drop"), "turbine");
        page.FindByLabel("Runner above tailwater").Input("30 ft");
        page.WaitForAssertion(() => Assert.Contains(Session.Cautions, c => c.Id == "runner-too-high"), Patience);
    }

    [Fact]
    public void A_pump_begins_in_the_middle_of_the_band_and_can_be_forgotten()
    {
        var page = Open(Put("tamarack-pipeline"), "turbine");
        page.FindByLabel("Type").Change("pump-as-turbine");
        page.WaitForAssertion(() => Assert.Contains("The pump to look for", page.Markup, StringComparison.Ordinal), Patience);
        page.Press("Enter a pump's catalogue point");
        page.WaitForAssertion(() => Assert.NotNull(Session.Result!.Turbine.Pump!.Pump), Patience);
        Assert.Empty(Session.Problems);
        Assert.True(Session.Result!.Turbine.Pump!.HoldsSite);
        page.Press("Forget this pump");
        page.WaitForAssertion(() => Assert.Null(Session.Result!.Turbine.Pump!.Pump), Patience);
    }
}
