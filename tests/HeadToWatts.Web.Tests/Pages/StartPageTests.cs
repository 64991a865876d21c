using Bunit;
using HeadToWatts.Files.StudyFiles;
using HeadToWatts.Web.Pages;
using Microsoft.AspNetCore.Components;
using Microsoft.AspNetCore.Components.Forms;
using Microsoft.Extensions.DependencyInjection;

namespace HeadToWatts.Web.Tests.Pages;

public sealed class StartPageTests : Visitor
{
    private string Address => Services.GetRequiredService<NavigationManager>().Uri;

    [Fact]
    public void Three_numbers_make_a_study()
    {
        var page = Render<StartPage>();
        page.FindByLabel("Flow").Input("20");
        page.FindByLabel("Gross head").Input("12 m");
        page.FindByLabel("Pipe, length").Input("400");
        page.FindByLabel("Pipe, inside diameter").Input("24");
        page.FindAll("button").Single(b => b.TextContent == "Begin").Click();

        var study = Store.Find(Assert.Single(Store.Recent(5)).Id)!;
        Assert.EndsWith($"/study/{study.Id}/flow", Address, StringComparison.Ordinal);
        var document = StudyFileReader.Parse("", study.StudyJson).Value;
        Assert.Equal(["20 cfs", "20 cfs"], document.Alternatives[0].Flow.Curve!.Select(r => r.Flow));
        Assert.Equal("12 m", document.Alternatives[0].Head.Gross);
        Assert.Equal("400 ft", document.Alternatives[0].Waterway.Elements[0].Length);
        Assert.True(StudyBuilder.Build(document, NoFlowFiles.Instance).IsGood);
    }

    [Fact]
    public void A_wrong_file_is_told_and_nothing_is_added()
    {
        var page = Render<StartPage>();
        page.FindComponent<InputFile>().UploadFiles(InputFileContent.CreateFromText("{ \"format\": 1, \"nmae\": \"x\" }", "study.json"));
        page.WaitForAssertion(() => Assert.Contains("study.json was not opened", page.Markup, StringComparison.Ordinal));
        Assert.Contains("nmae:", page.Find(".notice.red").TextContent, StringComparison.Ordinal);
        Assert.Empty(Store.Recent(5));
    }

    [Fact]
    public void A_study_file_opens_as_it_was_saved()
    {
        var id = Put("tamarack-pipeline");
        var text = Store.Find(id)!.StudyJson;
        var page = Render<StartPage>();
        page.FindComponent<InputFile>().UploadFiles(InputFileContent.CreateFromText(text, "study.json"));
        page.WaitForAssertion(() => Assert.Equal(2, Store.Recent(5).Count));
        Assert.All(Store.Recent(5), r => Assert.Equal(text, Store.Find(r.Id)!.StudyJson));
    }

    [Fact]
    public void The_demonstrations_stand_ready()
    {
        var page = Render<StartPage>();
        foreach (var site in Files.Demonstrations.DemoSites.All)
            page.FindAll("ul.sites button").Single(b => b.TextContent.Contains(site.Title, StringComparison.Ordinal)).Click();
        Assert.Equal(Files.Demonstrations.DemoSites.All.Count, Store.Recent(9).Count);
    }
}
