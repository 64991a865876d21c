using HeadToWatts.Files.FlowFiles.Reading;

namespace HeadToWatts.Files.FlowFiles.Recipes;

/// <summary>The marks of a recipe for a missing value: texts, numbers and limits.</summary>
internal sealed class MissingMarkSet
{
    private readonly HashSet<string> _texts = new(StringComparer.OrdinalIgnoreCase);
    private readonly List<double> _numbers = [];
    private double _lowest = double.NegativeInfinity;
    private double _highest = double.PositiveInfinity;

    public MissingMarkSet(IEnumerable<string> marks)
    {
        foreach (var mark in marks)
        {
            if (Limit(mark, out var below, out var limit))
                (_lowest, _highest) = below ? (Math.Max(_lowest, limit), _highest) : (_lowest, Math.Min(_highest, limit));
            else if (Number(mark, out var number))
                _numbers.Add(number);
            _texts.Add(mark.Trim());
        }
    }

    public static bool IsGood(string? mark)
    {
        if (string.IsNullOrWhiteSpace(mark) || mark.Length > 40)
            return false;
        return mark.TrimStart()[0] is not ('<' or '>') || Limit(mark, out _, out _);
    }

    public bool HoldsText(string cell) => _texts.Contains(cell);

    public bool HoldsNumber(double value) => value <= _lowest || value >= _highest || _numbers.Contains(value);

    private static bool Limit(string mark, out bool below, out double limit)
    {
        var text = mark.Trim();
        below = text.StartsWith("<=", StringComparison.Ordinal);
        limit = 0;
        return (below || text.StartsWith(">=", StringComparison.Ordinal)) && Number(text[2..], out limit);
    }

    private static bool Number(string text, out double number) => WrittenValue.TryNumber(text.Trim(), NumberSigns.Point, out number);
}
