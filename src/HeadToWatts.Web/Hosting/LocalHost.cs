using Microsoft.AspNetCore.HostFiltering;

namespace HeadToWatts.Web.Hosting;

/// <summary>
/// Binds the app to this machine only, unless told otherwise, and answers only requests that name it by an address it
/// listens on. A page of another site that points its own name at 127.0.0.1 is refused by the second rule.
/// </summary>
internal static class LocalHost
{
    private const string DefaultUrl = "http://127.0.0.1:5080";
    private static readonly string[] LoopbackNames = ["localhost", "127.0.0.1", "[::1]"];
    private static readonly string[] AnyAddress = ["*", "+", "0.0.0.0", "[::]", "::"];

    public static void Configure(WebApplicationBuilder builder)
    {
        var configured = builder.Configuration[WebHostDefaults.ServerUrlsKey];
        var urls = string.IsNullOrWhiteSpace(configured) ? DefaultUrl : configured;
        if (string.IsNullOrWhiteSpace(configured))
            builder.WebHost.UseUrls(DefaultUrl);

        var allowed = builder.Configuration["AllowedHosts"];
        var names = string.IsNullOrWhiteSpace(allowed) || allowed == "*" ? NamesOf(urls) : allowed.Split(';', StringSplitOptions.RemoveEmptyEntries);
        builder.Services.Configure<HostFilteringOptions>(options =>
        {
            options.AllowedHosts = [.. names];
            options.AllowEmptyHosts = false;
        });
    }

    /// <summary>The loopback names and the names in the addresses listened on. Listening on any address adds no name: that takes AllowedHosts.</summary>
    internal static IReadOnlyList<string> NamesOf(string urls) =>
    [
        .. LoopbackNames
            .Concat(urls.Split(';', StringSplitOptions.RemoveEmptyEntries | StringSplitOptions.TrimEntries).Select(url => BindingAddress.Parse(url).Host))
            .Where(name => name.Length > 0 && !AnyAddress.Contains(name))
            .Distinct(StringComparer.OrdinalIgnoreCase),
    ];
}
