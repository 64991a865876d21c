using System.Globalization;

namespace HeadToWatts.Files.Tests.FlowFiles;

/// <summary>Real flow records that stand beside the repository where it is developed; tests are skipped where they do not.</summary>
internal static class ReferenceFlows
{
    public static string? Folder()
    {
        for (var at = new DirectoryInfo(AppContext.BaseDirectory); at is not null; at = at.Parent)
        {
            if (!File.Exists(Path.Combine(at.FullName, "HeadToWatts.sln")))
                continue;
            var folder = Path.GetFullPath(Path.Combine(at.FullName, "..", "shared", "reference", "flow"));
            return Directory.Exists(folder) ? folder : null;
        }

        return null;
    }

    public static string PathOf(string name)
    {
        var folder = Folder();
        Skip.If(folder is null, "the reference flow records are not beside the repository");
        return Path.Combine(folder!, name);
    }

    /// <summary>A row of the oracle: numpy's figures for one series, by column name.</summary>
    public static IReadOnlyDictionary<string, string> Oracle(string id)
    {
        var lines = File.ReadAllLines(PathOf("oracle.csv"));
        var names = lines[0].Split(',');
        var cells = Split(lines.Single(l => l.StartsWith(id + ",", StringComparison.Ordinal)));
        return names.Zip(cells).ToDictionary(p => p.First, p => p.Second, StringComparer.Ordinal);
    }

    public static double Number(this IReadOnlyDictionary<string, string> row, string column) =>
        double.Parse(row[column], CultureInfo.InvariantCulture);

    private static List<string> Split(string line)
    {
        var cells = new List<string>();
        var start = 0;
        var quoted = false;
        for (var i = 0; i <= line.Length; i++)
        {
            if (i == line.Length || (line[i] == ',' && !quoted))
            {
                cells.Add(line[start..i]);
                start = i + 1;
            }
            else if (line[i] == '"')
            {
                quoted = !quoted;
            }
        }

        return cells;
    }
}
