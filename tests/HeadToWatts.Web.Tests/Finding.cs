using AngleSharp.Dom;
using Bunit;
using Microsoft.AspNetCore.Components;

namespace HeadToWatts.Web.Tests;

/// <summary>Finds fields the way a user does: by their label.</summary>
internal static class Finding
{
    public static IElement FindByLabel<T>(this IRenderedComponent<T> page, string label)
        where T : IComponent
    {
        // A run may be under way from the entry before; its redraw brings the field.
        page.WaitForState(() => Labels(page, label).Count > 0, TimeSpan.FromSeconds(10));
        var found = Labels(page, label);
        Assert.True(found.Count == 1, $"{found.Count} labels read '{label}'. There are: {string.Join(" | ", page.FindAll("label").Select(l => l.TextContent.Trim()))}");
        var id = found[0].GetAttribute("for");
        return id is null ? found[0].QuerySelector("input,select,textarea")! : page.Find("#" + id);
    }

    private static List<IElement> Labels<T>(IRenderedComponent<T> page, string label)
        where T : IComponent =>
        [.. page.FindAll("label").Where(l => l.TextContent.Trim() == label)];

    /// <summary>Presses the button of a name. A redraw between finding and pressing gives the button another handler, so it is then found anew.</summary>
    public static void Press<T>(this IRenderedComponent<T> page, string name)
        where T : Microsoft.AspNetCore.Components.IComponent
    {
        page.WaitForState(() => page.FindAll("button").Any(b => b.TextContent.Trim() == name), TimeSpan.FromSeconds(10));
        page.InvokeAsync(() => page.FindAll("button").Single(b => b.TextContent.Trim() == name).Click()).Wait(TimeSpan.FromSeconds(10));
    }
}
