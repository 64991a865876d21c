using System.Collections.Concurrent;
using Deque.AxeCore.Playwright;
using Microsoft.Playwright;

namespace HeadToWatts.Browser.Tests.Running;

/// <summary>A visitor's page, with everything it asked of other hosts and every complaint of the browser.</summary>
public sealed class Visit : IAsyncDisposable
{
    private readonly IBrowserContext _context;
    private readonly string _address;
    private readonly ConcurrentQueue<string> _foreign = new();
    private readonly ConcurrentQueue<string> _complaints = new();

    public Visit(IBrowserContext context, IPage page, string address)
    {
        _context = context;
        _address = address;
        Page = page;
        page.SetDefaultTimeout(15_000);
        page.Request += (_, request) =>
        {
            var own = request.Url.StartsWith(address, StringComparison.Ordinal) || request.Url.StartsWith("data:", StringComparison.Ordinal) || request.Url.StartsWith("blob:", StringComparison.Ordinal);
            if (!own)
                _foreign.Enqueue(request.Url);
        };
        page.Console += (_, message) =>
        {
            if (message.Type is "error" or "warning" || message.Text.Contains("Content Security Policy", StringComparison.Ordinal))
                _complaints.Enqueue(message.Text);
        };
        page.PageError += (_, error) => _complaints.Enqueue(error);
    }

    public IPage Page { get; }

    public IReadOnlyCollection<string> ForeignRequests => _foreign;

    public IReadOnlyCollection<string> Complaints => _complaints;

    public async Task GoAsync(string path)
    {
        await Page.GotoAsync(_address + path);
        await InteractiveAsync();
    }

    /// <summary>Waits until the page answers to the user: the marker is set after its first render on the live connection.</summary>
    public Task InteractiveAsync(string main = "main") => Page.WaitForSelectorAsync(main + "[data-live]", new PageWaitForSelectorOptions { State = WaitForSelectorState.Attached });

    /// <summary>Accessibility faults of the page as it stands, one a line.</summary>
    public async Task<IReadOnlyList<string>> FaultsAsync()
    {
        var result = await Page.RunAxe();
        return [.. result.Violations.SelectMany(v => v.Nodes.Select(n => $"{v.Id}: {v.Help}: {n.Html}"))];
    }

    /// <summary>How far the page scrolls sideways, in pixels; 0 is right.</summary>
    public Task<int> SidewaysScrollAsync() => Page.EvaluateAsync<int>("document.documentElement.scrollWidth - document.documentElement.clientWidth");

    public async Task ShootAsync(string name)
    {
        var folder = Environment.GetEnvironmentVariable("HEADTOWATTS_PICTURES");
        if (!string.IsNullOrEmpty(folder))
            await Page.ScreenshotAsync(new PageScreenshotOptions { Path = Path.Combine(folder, name + ".png"), FullPage = true });
    }

    public async ValueTask DisposeAsync() => await _context.DisposeAsync();
}
