using HeadToWatts.Basis.Sources;
using HeadToWatts.Basis.Units;
using HeadToWatts.Memos.Content;

namespace HeadToWatts.Memos.Sections;

/// <summary>Every method used, its stated range and the span over which this study used it.</summary>
internal static class MethodsAppendix
{
    public static void Write(MemoContext memo)
    {
        var body = memo.Body;
        body.Appendix("Methods and their ranges", "methods");
        body.Say("Every published method behind the numbers, with the range its source states and the span over which it was used here. Leaving a range is a caution.");
        body.Table("tab-methods", "Methods used.",
            [new("Method", Share: 2), new("Formula", Share: 1), new("Stated range and span used", Share: 2), new("Source", ColumnAlign.Left, 0)],
            [.. memo.Methods.Select(u => new TableRow([u.Method.Name, RichText.Formula(u.Method.Formula), Ranges(u), body.Cite(u.Method.Source, u.Method.Locator.Length <= 16 ? u.Method.Locator : "")]))]);
    }

    private static RichText Ranges(MethodUse use)
    {
        var parts = new List<RichText>();
        var outside = use.OutOfRange();
        foreach (var range in use.Method.Ranges)
        {
            var unit = range.Unit is "1" or "" ? "" : " " + range.Unit;
            var stated = (double.IsNegativeInfinity(range.Lowest), double.IsPositiveInfinity(range.Highest)) switch
            {
                (true, true) => "any",
                (true, false) => $"up to {UnitDisplay.Number(range.Highest)}{unit}",
                (false, true) => $"from {UnitDisplay.Number(range.Lowest)}{unit}",
                _ => $"{UnitDisplay.Number(range.Lowest)} to {UnitDisplay.Number(range.Highest)}{unit}",
            };
            var text = RichText.Formula(range.Symbol) + ": " + stated;
            foreach (var span in use.Spans.Where(s => s.Symbol == range.Symbol))
            {
                text += span.Lowest == span.Highest ? $", used {UnitDisplay.Number(span.Lowest)}" : $", used {UnitDisplay.Number(span.Lowest)} to {UnitDisplay.Number(span.Highest)}";
                if (outside.Any(o => o.Range.Symbol == range.Symbol))
                    text += RichText.Bold(" (outside)");
            }

            parts.Add(text);
        }

        return parts.Count == 0 ? RichText.Of("no range stated") : RichText.Join("; ", parts);
    }
}
