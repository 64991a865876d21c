namespace HeadToWatts.Calculations.Tests.HouseRules;

public class MethodsPageTests
{
    [Fact]
    public void The_methods_page_is_current()
    {
        var path = Path.Combine(CheckValueFile.Root(), "docs", "methods.md");
        var page = MethodsPage.Write();
        if (Environment.GetEnvironmentVariable("HEADTOWATTS_WRITE_DOCS") == "1")
            File.WriteAllText(path, page);
        var written = File.Exists(path) ? File.ReadAllText(path).ReplaceLineEndings("\n") : "";
        Assert.True(page == written, "docs/methods.md is stale: run this test with the environment variable HEADTOWATTS_WRITE_DOCS=1 and commit the page");
    }
}
