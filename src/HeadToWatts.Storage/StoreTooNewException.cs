namespace HeadToWatts.Storage;

/// <summary>The store was written by a later release of the program than this one.</summary>
public sealed class StoreTooNewException : Exception
{
    /// <summary>Makes the exception.</summary>
    /// <param name="path">The database file.</param>
    /// <param name="found">The shape found.</param>
    /// <param name="known">The latest shape this release knows.</param>
    public StoreTooNewException(string path, long found, long known)
        : base($"The studies in {path} were kept by a later release (shape {found}; this release knows {known}). Use that release, or name another data folder.")
    {
    }
}
