namespace HeadToWatts.Files.FlowFiles.Reading;

/// <summary>Counts marks in the order they first stood.</summary>
internal sealed class Tally
{
    private const int MostKinds = 200;
    private readonly Dictionary<string, int> _counts = new(StringComparer.Ordinal);
    private readonly List<string> _order = [];

    public void Add(ReadOnlySpan<char> mark)
    {
        var counts = _counts.GetAlternateLookup<ReadOnlySpan<char>>();
        if (counts.TryGetValue(mark, out var count))
        {
            counts[mark] = count + 1;
        }
        else if (_order.Count < MostKinds)
        {
            counts[mark] = 1;
            _order.Add(mark.ToString());
        }
    }

    public IReadOnlyList<MarkCount> Counts() => [.. _order.Select(m => new MarkCount(m, _counts[m]))];
}
