using Bunit;
using HeadToWatts.Web.Worksheet.Stages;
using Microsoft.AspNetCore.Components.Forms;

namespace HeadToWatts.Web.Tests.Worksheet;

public sealed class FlowStageTests : Visitor
{
    private static readonly TimeSpan Patience = TimeSpan.FromSeconds(20);

    [Fact]
    public void A_flow_file_of_a_curve_takes_the_place_of_the_record_and_says_what_was_read()
    {
        var page = Open(Put("larkspur-drop"), "flow");
        Upload(page, "exceeded %,flow cfs\n0,100\n50,60\n100,20\n", "curve.csv");
        page.WaitForAssertion(() => Assert.Null(Document.Alternatives[0].Flow.Record), Patience);
        Assert.Equal(["100 cfs", "60 cfs", "20 cfs"], Document.Alternatives[0].Flow.Curve!.Select(r => r.Flow));
        Assert.Equal(["0 %", "50 %", "100 %"], Document.Alternatives[0].Flow.Curve!.Select(r => r.Exceeded));
    }

    [Fact]
    public void A_flow_file_that_is_refused_changes_nothing_and_every_problem_is_listed()
    {
        var page = Open(Put("sorrel-creek"), "flow");
        var before = Files.StudyFiles.StudyFileWriter.Write(Document);
        Upload(page, "exceeded %,flow cfs\n0,100\n120,60\n100,-20\n", "bad.csv");
        page.WaitForAssertion(() => Assert.Contains("bad.csv was not taken", page.Markup, StringComparison.Ordinal), Patience);
        Assert.True(page.FindAll(".notice.red li").Count >= 2);
        Assert.Equal(before, Files.StudyFiles.StudyFileWriter.Write(Document));
    }

    [Fact]
    public void A_file_that_is_no_flow_file_at_all_does_not_break_the_page()
    {
        var page = Open(Put("sorrel-creek"), "flow");
        Upload(page, "\0\u0001\u0002 not a table", "picture.png");
        page.WaitForAssertion(() => Assert.Contains("picture.png was not taken", page.Markup, StringComparison.Ordinal), Patience);
        Assert.NotEmpty(page.FindAll("svg.drawing"));
    }

    [Fact]
    public void A_number_typed_in_the_units_shown_turns_the_other_rows_into_that_unit()
    {
        var page = Open(Put("sorrel-creek", d => d.Units = "SI"), "flow");
        page.FindByLabel("Flow in row 1").Input("90");
        page.WaitForAssertion(() => Assert.Equal("90 L/s", Document.Alternatives[0].Flow.Curve![0].Flow), Patience);
        // 900 US gallons a minute are 900 x 3.785411784 L / 60 s = 56.7812 L/s (US gallon of 231 in3).
        Assert.Equal("56.7812 L/s", Document.Alternatives[0].Flow.Curve![1].Flow);
        Assert.Empty(Session.Problems);
    }

    [Fact]
    public void A_season_with_rows_asks_what_the_percentages_count()
    {
        var page = Open(Put("sorrel-creek", d => d.Alternatives[0].Flow.RowsAreFor = null), "flow");
        page.FindByLabel("Season").Input("Apr 15 to Oct 15");
        page.WaitForAssertion(() => Assert.Equal("true", page.FindByLabel("Percentages count").GetAttribute("aria-invalid")), Patience);
        page.FindByLabel("Percentages count").Change("season");
        page.WaitForAssertion(() => Assert.Empty(Session.Problems), Patience);
    }

    private static void Upload(IRenderedComponent<Web.Pages.StudyPage> page, string text, string name) =>
        page.FindComponent<FlowStage>().FindComponent<InputFile>().UploadFiles(InputFileContent.CreateFromText(text, name));
}
