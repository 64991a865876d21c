using HeadToWatts.Storage;
using HeadToWatts.Web.Components;
using HeadToWatts.Web.Hosting;
using HeadToWatts.Web.Sessions;
using Microsoft.AspNetCore.DataProtection;
using Radzen;

var builder = WebApplication.CreateBuilder(new WebApplicationOptions
{
    Args = args,
    // Files of this program lie beside it, wherever it is started from.
    ContentRootPath = AppContext.BaseDirectory,
});
builder.Logging.AddFilter("Microsoft.AspNetCore", LogLevel.Warning);
builder.Logging.AddFilter("Microsoft.AspNetCore.DataProtection", LogLevel.Error);
builder.WebHost.ConfigureKestrel(kestrel => kestrel.AddServerHeader = false);
builder.WebHost.UseStaticWebAssets();
LocalHost.Configure(builder);

var data = DataFolder.From(builder.Configuration);
builder.Services.AddDataProtection().SetApplicationName("HeadToWatts").PersistKeysToFileSystem(new DirectoryInfo(Path.Combine(data, "keys")));
builder.Services.AddSingleton(_ => StudyStore.Open(data));
builder.Services.AddSingleton(TimeProvider.System);
builder.Services.AddScoped<StudySession>();
if (!string.Equals(builder.Configuration["warm-up"], "no", StringComparison.OrdinalIgnoreCase))
    builder.Services.AddHostedService<WarmUp>();
builder.Services.AddRadzenComponents();
builder.Services.AddRazorComponents().AddInteractiveServerComponents();

var app = builder.Build();
app.UseHostFiltering();
app.UseMiddleware<SecurityHeaders>();
app.UseMiddleware<SameOriginOnly>();
app.UseStatusCodePagesWithReExecute("/not-found", createScopeForStatusCodePages: true);
app.UseAntiforgery();
app.MapStaticAssets();
StudyFilesEndpoints.Map(app);
app.MapRazorComponents<App>().AddInteractiveServerRenderMode(options => options.ContentSecurityFrameAncestorsPolicy = null);
app.Run();

/// <summary>The web app's entry point; public so that tests can start the app.</summary>
public partial class Program;
