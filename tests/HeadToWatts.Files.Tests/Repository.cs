namespace HeadToWatts.Files.Tests;

/// <summary>Finds the repository's own files from where the tests run.</summary>
internal static class Repository
{
    internal static string Root { get; } = FindRoot();

    internal static string Path(params string[] parts) => System.IO.Path.Combine([Root, .. parts]);

    private static string FindRoot()
    {
        for (var at = new DirectoryInfo(AppContext.BaseDirectory); at is not null; at = at.Parent)
        {
            if (File.Exists(System.IO.Path.Combine(at.FullName, "HeadToWatts.sln")))
                return at.FullName;
        }

        throw new DirectoryNotFoundException("HeadToWatts.sln is not above " + AppContext.BaseDirectory);
    }
}
