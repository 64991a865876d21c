using Bunit;
using HeadToWatts.Files.Demonstrations;
using HeadToWatts.Files.StudyFiles;
using HeadToWatts.Storage;
using HeadToWatts.Web.Pages;
using HeadToWatts.Web.Sessions;
using Microsoft.AspNetCore.Components;
using Microsoft.Data.Sqlite;
using Microsoft.Extensions.DependencyInjection;
using Microsoft.Extensions.Logging;
using Microsoft.Extensions.Logging.Abstractions;
using Radzen;

namespace HeadToWatts.Web.Tests;

/// <summary>A visitor with a store of his own, in which a demonstration study lies.</summary>
public abstract class Visitor : BunitContext
{
    private readonly string _folder = Path.Combine(Path.GetTempPath(), "headtowatts-" + Guid.NewGuid().ToString("N"));

    protected Visitor()
    {
        Store = StudyStore.Open(_folder);
        JSInterop.Mode = JSRuntimeMode.Loose;
        Services.AddSingleton(Store);
        Services.AddSingleton(TimeProvider.System);
        Services.AddSingleton<ILogger<StudySession>>(NullLogger<StudySession>.Instance);
        Services.AddScoped<StudySession>();
        Services.AddRadzenComponents();
        SetRendererInfo(new RendererInfo("Server", true));
    }

    protected StudyStore Store { get; }

    protected StudySession Session => Services.GetRequiredService<StudySession>();

    protected StudyDocument Document => Session.Document;

    /// <summary>Puts a demonstration study into the store.</summary>
    protected Guid Put(string demo, Action<StudyDocument>? change = null)
    {
        var document = DemoSites.All.Single(s => s.Id == demo).Load();
        change?.Invoke(document);
        return Store.Add(document.Name!, StudyFileWriter.Write(document)).Id;
    }

    /// <summary>Opens a stage of a study and waits for its first result.</summary>
    protected IRenderedComponent<StudyPage> Open(Guid id, string stage)
    {
        var page = Render<StudyPage>(p => p.Add(s => s.Id, id).Add(s => s.Stage, stage));
        page.WaitForAssertion(() => Assert.NotNull(Session.Result), TimeSpan.FromSeconds(20));
        return page;
    }

    /// <summary>A figure of the answer as the visitor reads it.</summary>
    protected static string Figure<T>(IRenderedComponent<T> page, string label)
        where T : IComponent =>
        page.FindAll(".fig").Single(f => f.QuerySelector(".k")!.TextContent == label).QuerySelector(".v")!.TextContent.Trim();

    protected override void Dispose(bool disposing)
    {
        if (disposing && Session.Keeper is { } keeper)
            Assert.True(keeper.SavedAsync().Wait(TimeSpan.FromSeconds(10)), "The last change was not stored.");
        base.Dispose(disposing);
        if (!disposing || !Directory.Exists(_folder))
            return;
        SqliteConnection.ClearAllPools();
        Directory.Delete(_folder, recursive: true);
    }
}
