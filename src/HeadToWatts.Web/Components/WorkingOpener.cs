namespace HeadToWatts.Web.Components;

/// <summary>Opens the working of a number, wherever on the page the number stands.</summary>
/// <param name="open">Told the key of the working.</param>
public sealed class WorkingOpener(Func<string, Task> open)
{
    /// <summary>Opens a working by its key.</summary>
    public Task Open(string key) => open(key);
}
