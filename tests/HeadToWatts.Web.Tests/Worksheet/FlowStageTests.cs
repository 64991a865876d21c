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

    [Fact]
    public void A_file_of_no_known_format_is_read_by_a_recipe_that_the_study_keeps()
    {
        var page = Open(Put("sorrel-creek"), "flow");
        // Day first or month first cannot be told: every day is 12 or less.
        Upload(page, "logger 7\nplace: head gate\nwhen;reading\n01/02/2020;12,5\n02/02/2020;13,0\n03/02/2020;11,25\n", "logger.txt");
        page.WaitForAssertion(() => Assert.Contains("logger.txt was not taken", page.Markup, StringComparison.Ordinal), Patience);
        page.Press("Say how this file is read");
        page.WaitForAssertion(() => Assert.Contains("The file does not decide this", page.Markup, StringComparison.Ordinal), Patience);
        page.FindByLabel("Order of the dates").Change("day-month-year");
        page.FindByLabel("Unit").Change("cfs");
        page.WaitForAssertion(() => Assert.Contains("2020-02-01: 12.5", page.Find(".preview").TextContent, StringComparison.Ordinal), Patience);
        page.Press("Read by this recipe");
        page.WaitForAssertion(() => Assert.Equal("2020-02-01", Document.Alternatives[0].Flow.Record?.FirstDay), Patience);
        Assert.Equal("day-month-year", Document.Alternatives[0].Flow.Record!.Recipe!.DateOrder);
        Assert.Equal("12.5 13 11.25", Document.Alternatives[0].Flow.Record!.Days);
    }

    [Fact]
    public void A_record_with_gaps_is_shown_before_it_is_taken_and_the_choice_about_them_counts()
    {
        var page = Open(Put("sorrel-creek"), "flow");
        var before = Files.StudyFiles.StudyFileWriter.Write(Document);
        Upload(page, "date,flow_cfs\n2020-01-01,1\n2020-01-02,2\n2020-01-04,4\n2020-01-05,5\n", "gap.csv");
        page.WaitForAssertion(() => Assert.Contains("Look, choose, then take it", page.Markup, StringComparison.Ordinal), Patience);
        Assert.Equal(before, Files.StudyFiles.StudyFileWriter.Write(Document));
        page.FindByLabel("Gaps are").Change("interpolated");
        page.WaitForAssertion(() => Assert.Contains("1 day", page.Find("section.notice").TextContent, StringComparison.Ordinal), Patience);
        page.Press("Take these days");
        page.WaitForAssertion(() => Assert.Equal("1 2 3 4 5", Document.Alternatives[0].Flow.Record?.Days), Patience);
        Assert.NotEmpty(Document.Alternatives[0].Flow.Record!.Found!);
        page.WaitForAssertion(() => Assert.NotEmpty(Session.Result!.Input.Flow.Findings), Patience);
    }

    [Fact]
    public void One_measurement_stands_for_the_year_and_the_answer_says_so()
    {
        var page = Open(Put("sorrel-creek"), "flow");
        page.FindByLabel("The flow is given as").Change("once");
        page.FindByLabel("Volume filled").Input("5 gal");
        page.FindByLabel("Times").Input("2; 2.2; 2.1");
        page.WaitForAssertion(() => Assert.Equal(0.01892705892 * ((1 / 2.0) + (1 / 2.2) + (1 / 2.1)) / 3, Session.Result!.Flow.MeanFlowM3PerS, 1e-9), Patience);
        page.WaitForAssertion(() => Assert.Contains("flow not measured", page.Markup, StringComparison.Ordinal), Patience);
    }

    [Fact]
    public void A_reserved_flow_by_Tennant_says_what_it_comes_to()
    {
        var page = Open(Put("larkspur-drop"), "flow");
        page.FindByLabel("Reserved flow").Change("tennant");
        page.FindByLabel("Tennant's level").Change("Tennant fair");
        page.WaitForAssertion(() => Assert.Contains("from April to September", page.Markup, StringComparison.Ordinal), Patience);
        Assert.Equal("Tennant fair", Document.Alternatives[0].Flow.ReservedFlow);
        Assert.Empty(Session.Problems);
    }

    private static void Upload(IRenderedComponent<Web.Pages.StudyPage> page, string text, string name) =>
        page.FindComponent<FlowStage>().FindComponent<InputFile>().UploadFiles(InputFileContent.CreateFromText(text, name));
}
