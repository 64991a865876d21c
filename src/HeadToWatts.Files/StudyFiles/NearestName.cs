namespace HeadToWatts.Files.StudyFiles;

/// <summary>Finds the known name that a mistyped one most likely meant.</summary>
internal static class NearestName
{
    internal static string? Of(string name, IEnumerable<string> known)
    {
        var best = known.Select(k => (Name: k, Distance: Distance(name.ToLowerInvariant(), k.ToLowerInvariant()))).OrderBy(x => x.Distance).FirstOrDefault();
        return best.Name is not null && best.Distance <= Math.Max(2, best.Name.Length / 3) ? best.Name : null;
    }

    // Levenshtein's distance by two rows.
    private static int Distance(string a, string b)
    {
        var row = Enumerable.Range(0, b.Length + 1).ToArray();
        for (var i = 1; i <= a.Length; i++)
        {
            var diagonal = row[0];
            row[0] = i;
            for (var j = 1; j <= b.Length; j++)
            {
                var above = row[j];
                row[j] = Math.Min(Math.Min(row[j] + 1, row[j - 1] + 1), diagonal + (a[i - 1] == b[j - 1] ? 0 : 1));
                diagonal = above;
            }
        }

        return row[b.Length];
    }
}
