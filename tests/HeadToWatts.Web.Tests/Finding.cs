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
        var found = page.FindAll("label").Where(l => l.TextContent.Trim() == label).ToList();
        Assert.True(found.Count == 1, $"{found.Count} labels read '{label}'. There are: {string.Join(" | ", page.FindAll("label").Select(l => l.TextContent.Trim()))}");
        var id = found[0].GetAttribute("for");
        return id is null ? found[0].QuerySelector("input,select,textarea")! : page.Find("#" + id);
    }
}
