using System.Globalization;
using System.IO.Compression;
using System.Text;
using System.Text.Json;
using HeadToWatts.Browser.Tests.Running;
using Microsoft.Playwright;
using UglyToad.PdfPig;

namespace HeadToWatts.Browser.Tests;

/// <summary>The main job in a real browser: open an example, change it, take the memo away.</summary>
[Collection(nameof(BrowserRun))]
public sealed class WorksheetTests(BrowserRun run)
{
    private static readonly string[] Stages = ["flow", "head", "waterway", "turbine", "energy", "pumping", "money", "cautions", "memo"];

    [SkippableTheory]
    [InlineData(ColorScheme.Light)]
    [InlineData(ColorScheme.Dark)]
    public async Task No_page_of_the_worksheet_has_an_accessibility_fault_a_foreign_request_or_a_breach_of_policy(ColorScheme scheme)
    {
        BrowserRun.NeedsBrowser();
        await using var visit = await OpenDemoAsync("A canal drop", scheme);
        foreach (var stage in Stages)
        {
            await GoToAsync(visit, stage);
            await visit.ShootAsync($"{stage}-{scheme}");
            Assert.Empty(await visit.FaultsAsync());
            Assert.Equal(0, await visit.SidewaysScrollAsync());
        }

        Assert.Empty(visit.ForeignRequests);
        Assert.Empty(visit.Complaints);
    }

    [SkippableFact]
    public async Task The_worksheet_fits_a_phone_without_scrolling_sideways_and_without_a_fault()
    {
        BrowserRun.NeedsBrowser();
        await using var visit = await OpenDemoAsync("A canal drop", width: 390, height: 800);
        foreach (var stage in Stages)
        {
            await GoToAsync(visit, stage);
            await visit.ShootAsync($"{stage}-phone");
            Assert.Equal(0, await visit.SidewaysScrollAsync());
            Assert.Empty(await visit.FaultsAsync());
        }
    }

    [SkippableFact]
    public async Task A_number_changed_in_US_and_in_SI_units_is_followed_by_the_answer()
    {
        BrowserRun.NeedsBrowser();
        await using var visit = await OpenDemoAsync("A canal drop");
        await GoToAsync(visit, "waterway");
        var page = visit.Page;
        var wide = await FigureAsync(page, "Net head");
        Assert.EndsWith("ft", wide, StringComparison.Ordinal);
        await page.GetByLabel("Inside diameter").FillAsync("48");
        await page.WaitForFunctionAsync("before => document.querySelectorAll('.fig .v')[3].textContent !== before", wide);
        var narrow = await FigureAsync(page, "Net head");
        Assert.True(Number(narrow) < Number(wide), $"{narrow} against {wide}");

        await page.GetByRole(AriaRole.Button, new() { Name = "SI", Exact = true }).ClickAsync();
        await page.WaitForFunctionAsync("() => document.querySelectorAll('.fig .v')[3].textContent.endsWith(' m')");
        // 48 in = 1219.2 mm by the international inch; the head in metres is that in feet times 0.3048, to three digits.
        Assert.Equal("1219.2", await page.GetByLabel("Inside diameter").InputValueAsync());
        Assert.InRange(Number(await FigureAsync(page, "Net head")), (Number(narrow) - 0.05) * 0.3048 - 0.005, (Number(narrow) + 0.05) * 0.3048 + 0.005);

        var inSi = await FigureAsync(page, "Net head");
        await page.GetByLabel("Inside diameter").FillAsync("66 in");
        await page.WaitForFunctionAsync("before => document.querySelectorAll('.fig .v')[3].textContent !== before", inSi);
        await page.GetByRole(AriaRole.Button, new() { Name = "US", Exact = true }).ClickAsync();
        await page.WaitForFunctionAsync("before => document.querySelectorAll('.fig .v')[3].textContent.trim() === before", wide);
    }

    [SkippableFact]
    public async Task A_flow_file_is_taken_and_a_wrong_one_leaves_the_study_as_it_was()
    {
        BrowserRun.NeedsBrowser();
        await using var visit = await OpenDemoAsync("A farm creek");
        var page = visit.Page;
        var before = await FigureAsync(page, "Energy in a mean year");
        await Upload(page, "curve.csv", "exceeded %,flow cfs\n0,3\n50,1.2\n100,0.4\n");
        await page.WaitForFunctionAsync("before => document.querySelectorAll('.fig .v')[1].textContent !== before", before);
        await Assertions.Expect(page.GetByLabel("Flow in row 1", new() { Exact = true })).ToBeVisibleAsync();
        var after = await FigureAsync(page, "Energy in a mean year");

        await Upload(page, "wrong.csv", "exceeded %,flow cfs\n0,3\n130,1.2\n");
        await Assertions.Expect(page.GetByText("wrong.csv was not taken")).ToBeVisibleAsync();
        Assert.Equal(after, await FigureAsync(page, "Energy in a mean year"));
    }

    [SkippableFact]
    public async Task Rows_pasted_from_a_spreadsheet_take_the_place_of_the_rows()
    {
        BrowserRun.NeedsBrowser();
        await using var visit = await OpenDemoAsync("A farm creek");
        var page = visit.Page;
        await page.GetByLabel("Flow in row 1", new() { Exact = true }).ClickAsync();
        await page.EvaluateAsync(
            """
            () => {
              const data = new DataTransfer();
              data.setData('text/plain', 'exceeded %\tflow gpm\n0\t1000\n40\t500\n100\t90\n');
              document.activeElement.dispatchEvent(new ClipboardEvent('paste', { clipboardData: data, bubbles: true, cancelable: true }));
            }
            """);
        await Assertions.Expect(page.GetByLabel("Flow in row 4", new() { Exact = true })).ToHaveCountAsync(0);
        await Assertions.Expect(page.GetByLabel("Flow in row 2", new() { Exact = true })).ToHaveValueAsync("500");
    }

    [SkippableFact]
    public async Task The_memo_taken_away_carries_the_name_the_answer_and_its_status()
    {
        BrowserRun.NeedsBrowser();
        await using var visit = await OpenDemoAsync("A canal drop");
        await GoToAsync(visit, "memo");
        await visit.Page.GetByLabel("Study", new() { Exact = true }).FillAsync("Drop five, revised");
        await Assertions.Expect(visit.Page.Locator(".saved")).ToContainTextAsync("saved");
        var power = Number(await FigureAsync(visit.Page, "Power at the meter"));

        var bytes = await TakeAsync(visit.Page, "Memo, PDF");
        using var pdf = PdfDocument.Open(bytes);
        var text = string.Join(' ', pdf.GetPages().SelectMany(p => p.GetWords()).Select(w => w.Text));
        Assert.Contains("Drop five, revised", text, StringComparison.Ordinal);
        Assert.Contains(power.ToString("0.##", CultureInfo.InvariantCulture) + " kW", text.Replace('\u00a0', ' '), StringComparison.Ordinal);
        Assert.Contains("not for construction", text, StringComparison.OrdinalIgnoreCase);
        Assert.True(pdf.NumberOfPages > 3);
    }

    [SkippableFact]
    public async Task Results_tables_and_the_study_itself_can_be_taken_away()
    {
        BrowserRun.NeedsBrowser();
        await using var visit = await OpenDemoAsync("A district pipeline");
        await GoToAsync(visit, "memo");
        using var results = JsonDocument.Parse(await TakeAsync(visit.Page, "Results, JSON"));
        Assert.Contains("annualEnergyKwh", results.RootElement.GetRawText(), StringComparison.Ordinal);

        using var zip = new ZipArchive(new MemoryStream(await TakeAsync(visit.Page, "Tables, CSV")));
        Assert.NotEmpty(zip.Entries);

        var study = await TakeAsync(visit.Page, "Study file, JSON");
        await visit.GoAsync("/");
        await visit.Page.Locator("input[type=file]").SetInputFilesAsync(new FilePayload { Name = "study.json", MimeType = "application/json", Buffer = study });
        await visit.Page.WaitForURLAsync("**/study/**");
        await visit.InteractiveAsync("main.stage");
        Assert.Equal("Flow", await visit.Page.Locator("h1").TextContentAsync());
    }

    [SkippableFact]
    public async Task A_figure_opens_to_its_working()
    {
        BrowserRun.NeedsBrowser();
        await using var visit = await OpenDemoAsync("A canal drop");
        await visit.Page.Locator(".fig", new() { HasText = "Net head" }).Locator("button").ClickAsync();
        await Assertions.Expect(visit.Page.Locator(".working").First).ToContainTextAsync("Net head at the design flow");
        await visit.ShootAsync("working");
        Assert.Empty(await visit.FaultsAsync());
    }

    [SkippableFact]
    public async Task What_was_entered_survives_a_reload_and_a_restart_of_the_server()
    {
        BrowserRun.NeedsBrowser();
        var folder = Path.Combine(Path.GetTempPath(), "headtowatts-" + Guid.NewGuid().ToString("N"));
        try
        {
            string path;
            using (var first = new LocalApp(folder))
            {
                await using var visit = await OpenDemoAsync("A canal drop", app: first);
                await GoToAsync(visit, "head");
                await visit.Page.GetByLabel("Headwater level").FillAsync("4311.5");
                await Assertions.Expect(visit.Page.Locator(".saved")).ToContainTextAsync("saved");
                await visit.Page.ReloadAsync();
                await visit.InteractiveAsync("main.stage");
                Assert.Equal("4311.5", await visit.Page.GetByLabel("Headwater level").InputValueAsync());
                path = new Uri(visit.Page.Url).AbsolutePath;
            }

            using var second = new LocalApp(folder);
            await using var again = await run.VisitAsync(path, app: second);
            Assert.Equal("4311.5", await again.Page.GetByLabel("Headwater level").InputValueAsync());
        }
        finally
        {
            Microsoft.Data.Sqlite.SqliteConnection.ClearAllPools();
            if (Directory.Exists(folder))
                Directory.Delete(folder, recursive: true);
        }
    }

    private async Task<Visit> OpenDemoAsync(string title, ColorScheme scheme = ColorScheme.Light, int width = 1280, int height = 900, LocalApp? app = null)
    {
        var visit = await run.VisitAsync("/", scheme, width, height, app);
        await visit.Page.Locator("ul.sites button", new() { HasText = title }).ClickAsync();
        await visit.Page.WaitForURLAsync("**/study/**");
        await visit.InteractiveAsync("main.stage");
        return visit;
    }

    private static async Task GoToAsync(Visit visit, string stage)
    {
        await visit.Page.Locator($".stages a[href$='/{stage}']").ClickAsync();
        await visit.Page.WaitForURLAsync("**/" + stage);
        await Assertions.Expect(visit.Page.Locator("h1")).ToHaveTextAsync(char.ToUpperInvariant(stage[0]) + stage[1..]);
    }

    private static async Task<string> FigureAsync(IPage page, string label) =>
        (await page.Locator(".fig", new() { HasText = label }).Locator(".v").TextContentAsync())!.Trim();

    private static double Number(string figure) =>
        double.Parse(figure.Replace("\u202f", "", StringComparison.Ordinal).Split(' ')[0], CultureInfo.InvariantCulture);

    private static Task Upload(IPage page, string name, string text) =>
        page.Locator("input[type=file]").SetInputFilesAsync(new FilePayload { Name = name, MimeType = "text/csv", Buffer = Encoding.UTF8.GetBytes(text) });

    private static async Task<byte[]> TakeAsync(IPage page, string link)
    {
        var download = await page.RunAndWaitForDownloadAsync(() => page.GetByRole(AriaRole.Link, new() { Name = link }).ClickAsync());
        await using var stream = await download.CreateReadStreamAsync();
        using var bytes = new MemoryStream();
        await stream.CopyToAsync(bytes);
        return bytes.ToArray();
    }
}
