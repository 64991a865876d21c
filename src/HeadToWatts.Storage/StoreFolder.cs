namespace HeadToWatts.Storage;

/// <summary>Where studies are kept when nobody says otherwise.</summary>
public static class StoreFolder
{
    /// <summary>
    /// A folder of this program in the user's local application data, or in the home folder where the system names no such place.
    /// </summary>
    public static string Default()
    {
        var local = Environment.GetFolderPath(Environment.SpecialFolder.LocalApplicationData, Environment.SpecialFolderOption.Create);
        if (local.Length == 0)
            local = Environment.GetFolderPath(Environment.SpecialFolder.UserProfile);
        return Path.Combine(local, "HeadToWatts");
    }

    /// <summary>Makes the folder if it is not there; only its owner may look into it where the system knows file modes.</summary>
    /// <param name="folder">The folder.</param>
    internal static void Ensure(string folder)
    {
        if (Directory.Exists(folder))
            return;
        if (OperatingSystem.IsWindows())
            Directory.CreateDirectory(folder);
        else
            Directory.CreateDirectory(folder, UnixFileMode.UserRead | UnixFileMode.UserWrite | UnixFileMode.UserExecute);
    }
}
