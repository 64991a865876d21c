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
        page.InvokeAsync(() => page.Find($"table.machines button[aria-label='Use {other.Name}']").Click());
        page.WaitForAssertion(() => Assert.Equal(other.Id, Session.Result!.Turbine.Chosen.Type.Id), Patience);
        Assert.NotSame(before, Session.Result);
    }

    [Fact]
    public void Units_of_unequal_size_take_the_place_of_their_number_and_may_share_for_most_power()
    {
        var page = Open(Put("larkspur-drop"), "turbine");
        page.Press("Units of unequal size");
        page.WaitForAssertion(() => Assert.Equal(2, Session.Result!.Turbine.Units.UnitCount), Patience);
        Assert.Empty(Session.Problems);
        page.FindByLabel("Sharing the flow").Change("best");
        page.WaitForAssertion(() => Assert.Equal(HeadToWatts.Turbines.Units.LoadSplit.Best, Session.Result!.Turbine.Units.Split), Patience);
        Assert.Contains("with the best split", page.Markup, StringComparison.Ordinal);
        page.FindByLabel("Share of unit 1").Input("50 %");
        page.WaitForAssertion(() => Assert.Contains("do not add up", page.Markup, StringComparison.Ordinal), Patience);
        page.FindByLabel("Share of unit 2").Input("50 %");
        page.WaitForAssertion(() => Assert.Empty(Session.Problems), Patience);
    }

    [Fact]
    public void A_makers_chart_starts_from_the_typical_curve_about_this_head()
    {
        var page = Open(Put("larkspur-drop"), "turbine");
        page.Press("Enter a maker's chart over head");
        page.WaitForAssertion(() => Assert.NotNull(Session.Result!.Input.Turbine.HillChart), Patience);
        Assert.Empty(Session.Problems);
        Assert.True(Session.Result!.Energy.Annual.AnnualEnergyKwh > 0);
        for (var heads = 2; heads > 0; heads--)
        {
            page.InvokeAsync(() => page.FindAll("button").First(b => b.TextContent == "Remove this head").Click());
            page.WaitForAssertion(() => Assert.Equal(heads - 1, page.FindAll("button").Count(b => b.TextContent == "Remove this head")), Patience);
        }

        page.WaitForAssertion(() => Assert.Null(Session.Result!.Input.Turbine.HillChart), Patience);
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
