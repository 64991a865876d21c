using Microsoft.AspNetCore.Hosting;
using Microsoft.AspNetCore.Mvc.Testing;

namespace HeadToWatts.Browser.Tests.Running;

/// <summary>The web app on a free loopback port, with a data folder of its own that goes away with it.</summary>
public sealed class LocalApp : WebApplicationFactory<Program>
{
    public LocalApp(string? dataFolder = null)
    {
        OwnsFolder = dataFolder is null;
        DataFolder = dataFolder ?? Path.Combine(Path.GetTempPath(), "headtowatts-" + Guid.NewGuid().ToString("N"));
        UseKestrel(0);
        StartServer();
        Address = ClientOptions.BaseAddress.ToString().TrimEnd('/').Replace("localhost", "127.0.0.1", StringComparison.Ordinal);
    }

    public string DataFolder { get; }

    public string Address { get; }

    private bool OwnsFolder { get; }

    protected override void ConfigureWebHost(IWebHostBuilder builder)
    {
        builder.UseEnvironment("Production");
        builder.UseSetting("data", DataFolder);
        builder.UseSetting("warm-up", "no");
    }

    protected override void Dispose(bool disposing)
    {
        base.Dispose(disposing);
        if (disposing && OwnsFolder && Directory.Exists(DataFolder))
        {
            Microsoft.Data.Sqlite.SqliteConnection.ClearAllPools();
            Directory.Delete(DataFolder, recursive: true);
        }
    }
}
