using System.Globalization;
using System.Runtime.CompilerServices;

namespace HeadToWatts.Calculations.Tests;

/// <summary>
/// A file of expected values from outside the project, tests/CheckValues/&lt;method id&gt;/&lt;source&gt;.csv. It opens with
/// "# source:", "# place:", "# kind:" (printed, independent, agreement), "# tolerance:" (rel x or abs x) and "# why:" (why that
/// tolerance), then a header row and the rows. A column named "tolerance" overrides the file's. A row may end with a note.
/// </summary>
public sealed class CheckValueFile
{
    private CheckValueFile(string path, IReadOnlyDictionary<string, string> head, IReadOnlyList<CheckRow> rows)
    {
        Path = path;
        Head = head;
        Rows = rows;
    }

    public string Path { get; }

    public IReadOnlyDictionary<string, string> Head { get; }

    public IReadOnlyList<CheckRow> Rows { get; }

    public static string Folder([CallerFilePath] string here = "") =>
        System.IO.Path.GetFullPath(System.IO.Path.Combine(Root(), "tests", "CheckValues"));

    /// <summary>The repository's root, found upwards from where the tests run.</summary>
    public static string Root()
    {
        for (var at = new DirectoryInfo(AppContext.BaseDirectory); at is not null; at = at.Parent)
        {
            if (File.Exists(System.IO.Path.Combine(at.FullName, "HeadToWatts.sln")))
                return at.FullName;
        }

        throw new DirectoryNotFoundException("HeadToWatts.sln is not above " + AppContext.BaseDirectory);
    }

    public static IReadOnlyList<CheckValueFile> OfMethod(string methodId)
    {
        var folder = System.IO.Path.Combine(Folder(), methodId);
        return Directory.Exists(folder)
            ? [.. Directory.GetFiles(folder, "*.csv").Order(StringComparer.Ordinal).Select(Read)]
            : [];
    }

    public static CheckValueFile Read(string path)
    {
        var head = new Dictionary<string, string>(StringComparer.Ordinal);
        var rows = new List<CheckRow>();
        string[]? columns = null;
        var number = 0;
        foreach (var line in File.ReadLines(path))
        {
            number++;
            if (line.StartsWith('#'))
            {
                var colon = line.IndexOf(':', StringComparison.Ordinal);
                if (colon > 0)
                    head[line[1..colon].Trim()] = line[(colon + 1)..].Trim();
                continue;
            }

            if (line.Length == 0)
                continue;
            var cells = Split(line);
            if (columns is null)
                columns = cells;
            else
                rows.Add(new CheckRow(System.IO.Path.GetFileName(path) + ":" + number.ToString(CultureInfo.InvariantCulture), columns, cells, head.GetValueOrDefault("tolerance", "")));
        }

        return new CheckValueFile(path, head, rows);
    }

    private static string[] Split(string line)
    {
        var cells = new List<string>();
        var cell = new System.Text.StringBuilder();
        var quoted = false;
        foreach (var c in line)
        {
            if (c == '"')
                quoted = !quoted;
            else if (c == ',' && !quoted)
            {
                cells.Add(cell.ToString());
                cell.Clear();
            }
            else
                cell.Append(c);
        }

        cells.Add(cell.ToString());
        return [.. cells];
    }
}

/// <summary>One row of a check-value file.</summary>
public sealed class CheckRow(string where, string[] columns, string[] cells, string fileTolerance)
{
    public string Where { get; } = where;

    public double this[string column] => double.Parse(Text(column), NumberStyles.Float, CultureInfo.InvariantCulture);

    public bool Has(string column) => Array.IndexOf(columns, column) is >= 0 and var i && i < cells.Length && cells[i].Length > 0;

    public string Text(string column)
    {
        var i = Array.IndexOf(columns, column);
        return i >= 0 && i < cells.Length ? cells[i] : throw new ArgumentException($"{Where} has no column '{column}'.");
    }

    /// <summary>Asserts that the value equals the row's expected value within its tolerance.</summary>
    public void Check(double actual, string column = "expected")
    {
        var expected = this[column];
        var tolerance = Has("tolerance") ? Text("tolerance") : fileTolerance;
        var parts = tolerance.Split(' ', StringSplitOptions.RemoveEmptyEntries);
        Assert.True(parts.Length == 2 && parts[0] is "rel" or "abs", $"{Where}: tolerance '{tolerance}' is not 'rel x' or 'abs x'");
        var size = double.Parse(parts[1], CultureInfo.InvariantCulture);
        var allowed = parts[0] == "rel" ? size * Math.Abs(expected) : size;
        Assert.True(Math.Abs(actual - expected) <= allowed, $"{Where}: expected {expected:R} ± {allowed:R}, got {actual:R}");
    }

    public override string ToString() => Where;
}
