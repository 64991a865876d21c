using HeadToWatts.Browser.Tests.Running;
using Microsoft.Playwright;

namespace HeadToWatts.Browser.Tests;

[Collection(nameof(BrowserRun))]
public sealed class StartPageTests(BrowserRun run)
{
    [SkippableTheory]
    [InlineData(ColorScheme.Light)]
    [InlineData(ColorScheme.Dark)]
    public async Task The_start_page_has_no_accessibility_fault_loads_nothing_from_elsewhere_and_breaks_no_policy(ColorScheme scheme)
    {
        BrowserRun.NeedsBrowser();
        await using var visit = await run.VisitAsync("/", scheme);
        await visit.ShootAsync("start-" + scheme);
        Assert.Empty(await visit.FaultsAsync());
        Assert.Empty(visit.ForeignRequests);
        Assert.Empty(visit.Complaints);
    }

    [SkippableFact]
    public async Task The_start_page_fits_a_phone()
    {
        BrowserRun.NeedsBrowser();
        await using var visit = await run.VisitAsync("/", width: 390, height: 800);
        await visit.ShootAsync("start-phone");
        Assert.Equal(0, await visit.SidewaysScrollAsync());
    }

    [SkippableFact]
    public async Task The_colours_chosen_stay_after_a_reload()
    {
        BrowserRun.NeedsBrowser();
        await using var visit = await run.VisitAsync("/");
        await visit.Page.GetByRole(AriaRole.Button, new PageGetByRoleOptions { Name = "Switch between light and dark" }).ClickAsync();
        Assert.Equal("dark", await visit.Page.GetAttributeAsync("html", "data-theme"));
        await visit.GoAsync("/");
        Assert.Equal("dark", await visit.Page.GetAttributeAsync("html", "data-theme"));
    }
}
