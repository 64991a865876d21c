using Bunit;
using HeadToWatts.Files.StudyFiles;
using HeadToWatts.Web.Pages;

namespace HeadToWatts.Web.Tests.Pages;

public sealed class StudyPageTests : Visitor
{
    private static readonly TimeSpan Patience = TimeSpan.FromSeconds(20);

    [Theory]
    [InlineData("larkspur-drop")]
    [InlineData("sorrel-creek")]
    [InlineData("tamarack-pipeline")]
    public void Every_stage_of_every_demonstration_is_drawn_without_a_fault(string demo)
    {
        var id = Put(demo);
        foreach (var stage in Web.Worksheet.Stages.StageDefinitions.All)
        {
            var page = Open(id, stage.Key);
            Assert.Equal(stage.Title, page.Find("h1").TextContent);
            Assert.DoesNotContain("met a fault", page.Markup, StringComparison.Ordinal);
            Assert.Equal("page", page.FindAll(".stages a").Single(a => a.TextContent.Contains(stage.Title, StringComparison.Ordinal)).GetAttribute("aria-current"));
        }
    }

    [Fact]
    public void A_narrower_pipe_is_followed_by_the_whole_answer_and_stored()
    {
        var id = Put("larkspur-drop");
        var page = Open(id, "waterway");
        var before = Session.Result!;
        page.FindByLabel("Inside diameter").Input("48");
        page.WaitForAssertion(() => Assert.NotSame(before, Session.Result), Patience);

        Assert.Equal("48 in", Document.Alternatives[0].Waterway.Elements[0].InsideDiameter);
        Assert.True(Session.Result!.Head.NetHeadAtDesignM < before.Head.NetHeadAtDesignM);
        Assert.True(Session.Result.Energy.Annual.AnnualEnergyKwh < before.Energy.Annual.AnnualEnergyKwh);
        page.WaitForAssertion(() => Assert.Contains("\"insideDiameter\": \"48 in\"", Store.Find(id)!.StudyJson, StringComparison.Ordinal), Patience);
    }

    [Fact]
    public void The_unit_switch_shows_other_units_and_changes_no_quantity_of_the_study()
    {
        var page = Open(Put("larkspur-drop"), "waterway");
        var before = StudyFileWriter.Write(Document);
        page.FindAll("button").Single(b => b.TextContent == "SI").Click();
        page.WaitForAssertion(() => Assert.EndsWith(" m", Figure(page, "Net head"), StringComparison.Ordinal), Patience);

        // 66 in = 1676.4 mm by the international inch.
        page.WaitForAssertion(() => Assert.Equal("1676.4", page.FindByLabel("Inside diameter").GetAttribute("value")), Patience);
        Assert.Equal(before.Replace("\"units\": \"US\"", "\"units\": \"SI\"", StringComparison.Ordinal), StudyFileWriter.Write(Document));
        page.FindByLabel("Inside diameter").Input("1500");
        page.WaitForAssertion(() => Assert.Equal("1500 mm", Document.Alternatives[0].Waterway.Elements[0].InsideDiameter), Patience);
    }

    [Fact]
    public void An_impossible_number_is_told_beside_its_field_and_the_last_good_answer_stays()
    {
        var page = Open(Put("larkspur-drop"), "head");
        var power = Figure(page, "Power at the meter");
        page.FindByLabel("Tailwater level").Input("4400 ft");
        page.WaitForAssertion(() => Assert.Equal("true", page.FindByLabel("Tailwater level").GetAttribute("aria-invalid")), Patience);
        Assert.Equal(power, Figure(page, "Power at the meter"));
        Assert.Contains("tailwater level", page.Find(".stale-note").TextContent, StringComparison.Ordinal);

        page.FindByLabel("Tailwater level").Input("4290 ft");
        page.WaitForAssertion(() => Assert.Empty(page.FindAll(".stale-note")), Patience);
    }

    [Fact]
    public void Each_figure_opens_to_its_working_with_formula_numbers_and_source()
    {
        Open(Put("larkspur-drop"), "flow");
        foreach (var key in new[] { "power", "energy", "plant-factor", "net-head", "velocity", "turbine" })
        {
            var panel = Render<Web.Components.WorkingPanel>(p => p.Add(w => w.Session, Session).Add(w => w.Key, key));
            Assert.NotEmpty(panel.FindAll(".working"));
            Assert.NotEmpty(panel.Find(".formula").TextContent);
            Assert.NotEmpty(panel.FindAll(".working b"));
        }
    }

    [Fact]
    public void A_study_changed_in_another_window_is_not_overwritten_unasked()
    {
        var id = Put("larkspur-drop");
        var page = Open(id, "head");
        var stored = Store.Find(id)!;
        Store.Save(id, stored.Edition, "theirs", stored.StudyJson);

        page.FindByLabel("Headwater level").Input("4309 ft");
        page.WaitForAssertion(() => Assert.Contains("changed in another window", page.Markup, StringComparison.Ordinal), Patience);
        Assert.Equal("theirs", Store.Find(id)!.Name);

        page.FindAll("button").Single(b => b.TextContent == "Keep what is on this screen").Click();
        page.WaitForAssertion(() => Assert.Contains("4309 ft", Store.Find(id)!.StudyJson, StringComparison.Ordinal), Patience);
        Assert.Equal("theirs", Assert.Single(Store.Versions(id)).Name);
    }

    [Fact]
    public void An_unknown_study_is_said_to_be_missing()
    {
        var page = Render<StudyPage>(p => p.Add(s => s.Id, Guid.NewGuid()));
        Assert.Equal("This study is not here", page.Find("h1").TextContent);
    }

    [Fact]
    public void A_study_that_cannot_be_worked_out_yet_says_what_to_enter()
    {
        var id = Store.Add("Empty", StudyFileWriter.Write(Web.Sessions.NewStudy.FromNumbers(Basis.Units.UnitSystem.US, null, null, null, null))).Id;
        var page = Render<StudyPage>(p => p.Add(s => s.Id, id).Add(s => s.Stage, "flow"));
        Assert.Contains("To begin with", page.Markup, StringComparison.Ordinal);
        Assert.Contains(page.FindAll(".empty li a"), a => a.TextContent == "head, gross head" && a.GetAttribute("href") == $"/study/{id}/head");
    }
}
