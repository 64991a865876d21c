namespace HeadToWatts.Files;

/// <summary>Writes a file whole or not at all: into a neighbour first, then moved into place.</summary>
public static class WholeFile
{
    /// <summary>Writes bytes.</summary>
    /// <param name="path">The file.</param>
    /// <param name="bytes">Its content.</param>
    public static void Write(string path, ReadOnlySpan<byte> bytes)
    {
        var full = Path.GetFullPath(path);
        var beside = full + ".part-" + Environment.ProcessId.ToString(System.Globalization.CultureInfo.InvariantCulture);
        try
        {
            File.WriteAllBytes(beside, bytes);
            File.Move(beside, full, overwrite: true);
        }
        finally
        {
            if (File.Exists(beside))
                File.Delete(beside);
        }
    }

    /// <summary>Writes text as UTF-8.</summary>
    /// <param name="path">The file.</param>
    /// <param name="text">Its content.</param>
    public static void Write(string path, string text) => Write(path, System.Text.Encoding.UTF8.GetBytes(text));
}
