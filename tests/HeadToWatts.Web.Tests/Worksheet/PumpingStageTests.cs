using Bunit;

namespace HeadToWatts.Web.Tests.Worksheet;

public sealed class PumpingStageTests : Visitor
{
    private static readonly TimeSpan Patience = TimeSpan.FromSeconds(20);

    [Fact]
    public void A_pump_begins_with_figures_that_can_be_read_and_is_set_against_the_generation()
    {
        var page = Open(Put("larkspur-drop"), "pumping");
        page.Press("Enter a pump");
        page.WaitForAssertion(() => Assert.NotNull(Session.Result!.Pumping), Patience);
        Assert.Empty(Session.Problems);
        page.WaitForAssertion(() => Assert.Contains("Pumping covered in its own month", page.Markup, StringComparison.Ordinal), Patience);
        var before = Session.Result!.Pumping!.Pumping.ElectricKwh;
        page.FindByLabel("Pump 1: static lift").Input("180 ft");
        page.WaitForAssertion(() => Assert.Equal(2, Session.Result!.Pumping!.Pumping.ElectricKwh / before, 1e-9), Patience);
        page.Press("Remove pump 1");
        page.WaitForAssertion(() => Assert.Null(Session.Result!.Pumping), Patience);
    }

    [Fact]
    public void Hours_turn_into_volumes_without_changing_the_energy()
    {
        var page = Open(Put("larkspur-drop"), "pumping");
        page.Press("Enter a pump");
        page.WaitForAssertion(() => Assert.NotNull(Session.Result!.Pumping), Patience);
        var before = Session.Result!.Pumping!.Pumping.ElectricKwh;
        page.FindByLabel("Pump 1: months given as").Change("volume");
        page.WaitForAssertion(() => Assert.NotNull(Document.Alternatives[0].Pumping!.Plants[0].VolumeByMonth), Patience);
        page.WaitForAssertion(() => Assert.Equal(1, Session.Result!.Pumping!.Pumping.ElectricKwh / before, 1e-3), Patience);
        Assert.Empty(Session.Problems);
    }
}
