using HeadToWatts.FlowRecords.Quality;

namespace HeadToWatts.Files.FlowFiles.Reading;

/// <summary>Gathers what is found in a file: how often, the first few places, what was done.</summary>
internal sealed class Findings
{
    private const int MostExamples = 5;
    private readonly SortedDictionary<QualityKind, Found> _found = [];

    /// <summary>Counts one place; true when it is still wanted as an example.</summary>
    public bool Count(QualityKind kind, string done)
    {
        if (!_found.TryGetValue(kind, out var found))
            _found[kind] = found = new Found(done);
        found.Count++;
        return found.Examples.Count < MostExamples;
    }

    public void Example(QualityKind kind, int row, string text) =>
        _found[kind].Examples.Add(new QualityExample(row, text.Length <= 80 ? text : text[..80] + "..."));

    public void Add(QualityKind kind, int row, string text, string done)
    {
        if (Count(kind, done))
            Example(kind, row, text);
    }

    public int Of(QualityKind kind) => _found.TryGetValue(kind, out var found) ? found.Count : 0;

    public IReadOnlyList<QualityFinding> All() =>
        [.. _found.Select(f => new QualityFinding(f.Key, f.Value.Count, f.Value.Examples, f.Value.Done))];

    private sealed class Found(string done)
    {
        public string Done { get; } = done;

        public int Count { get; set; }

        public List<QualityExample> Examples { get; } = [];
    }
}
