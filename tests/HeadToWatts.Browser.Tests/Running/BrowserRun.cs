using Microsoft.Playwright;

namespace HeadToWatts.Browser.Tests.Running;

/// <summary>One browser and one app for all browser tests. Without a browser the tests are skipped and say so; on a build machine (CI=true) they fail.</summary>
public sealed class BrowserRun : IAsyncLifetime, IAsyncDisposable
{
    private static readonly string[] Places = ["/usr/bin/chromium", "/usr/bin/chromium-browser", "/usr/bin/google-chrome", "/usr/bin/google-chrome-stable"];
    private IPlaywright? _playwright;
    private IBrowser? _browser;
    private LocalApp? _app;

    public static string? BrowserPath => Environment.GetEnvironmentVariable("HEADTOWATTS_BROWSER") is { Length: > 0 } named ? named : Places.FirstOrDefault(File.Exists);

    public LocalApp App => _app ?? throw new InvalidOperationException("The app was not started.");

    public IBrowser Browser => _browser ?? throw new InvalidOperationException("The browser was not started.");

    public static void NeedsBrowser()
    {
        var onBuildMachine = string.Equals(Environment.GetEnvironmentVariable("CI"), "true", StringComparison.OrdinalIgnoreCase);
        if (BrowserPath is null && onBuildMachine)
            Assert.Fail("No Chromium was found. Install it, or name it in HEADTOWATTS_BROWSER.");
        Skip.If(BrowserPath is null, "No Chromium was found; name one in HEADTOWATTS_BROWSER to run the browser tests.");
    }

    public async Task InitializeAsync()
    {
        if (BrowserPath is null)
            return;
        _app = new LocalApp();
        _playwright = await Playwright.CreateAsync();
        _browser = await _playwright.Chromium.LaunchAsync(new BrowserTypeLaunchOptions
        {
            ExecutablePath = BrowserPath,
            Headless = true,
            Args =
            [
                "--headless", "--no-sandbox", "--disable-gpu", "--disable-quic", "--no-first-run",
                "--disable-background-networking", "--disable-component-update", "--disable-sync",
            ],
        });
    }

    async ValueTask IAsyncDisposable.DisposeAsync() => await DisposeAsync();

    public async Task DisposeAsync()
    {
        if (_browser is not null)
            await _browser.DisposeAsync();
        _playwright?.Dispose();
        if (_app is not null)
            await _app.DisposeAsync();
    }

    /// <summary>Opens a page as a new visitor and watches what it loads and reports.</summary>
    public async Task<Visit> VisitAsync(string path, ColorScheme scheme = ColorScheme.Light, int width = 1280, int height = 900, LocalApp? app = null)
    {
        var at = app ?? App;
        var context = await Browser.NewContextAsync(new BrowserNewContextOptions
        {
            ColorScheme = scheme,
            ViewportSize = new ViewportSize { Width = width, Height = height },
            AcceptDownloads = true,
            ReducedMotion = ReducedMotion.Reduce,
        });
        var visit = new Visit(context, await context.NewPageAsync(), at.Address);
        await visit.GoAsync(path);
        return visit;
    }
}

[CollectionDefinition(nameof(BrowserRun))]
public sealed class SharedBrowser : ICollectionFixture<BrowserRun>;
