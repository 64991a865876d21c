namespace HeadToWatts.Basis.Sources;

/// <summary>The range of one input over which a method is stated to hold.</summary>
/// <param name="Symbol">Symbol as in the formula.</param>
/// <param name="Name">Name in words.</param>
/// <param name="Unit">Unit of the limits; "1" for a ratio.</param>
/// <param name="Lowest">Lower limit; negative infinity when there is none.</param>
/// <param name="Highest">Upper limit; positive infinity when there is none.</param>
public sealed record InputRange(string Symbol, string Name, string Unit, double Lowest, double Highest);

/// <summary>A published method as data beside its formula.</summary>
/// <param name="Id">Unique key: lower-case words with hyphens; its check values stand in tests/CheckValues under the same name.</param>
/// <param name="Name">Name in the trade.</param>
/// <param name="Formula">Formula in the notation of <see cref="FormulaText"/>.</param>
/// <param name="Source">Where it comes from.</param>
/// <param name="Locator">Equation, table or page in the source; may be empty.</param>
/// <param name="Ranges">Range of each input that has one.</param>
public sealed record Method(string Id, string Name, string Formula, Source Source, string Locator, IReadOnlyList<InputRange> Ranges)
{
    /// <summary>States that the method was used, and over which span of its inputs.</summary>
    public MethodUse Used(params IReadOnlyList<InputSpan> spans) => new(this, spans);
}

/// <summary>The span of one input over which a method was used.</summary>
/// <param name="Symbol">Symbol, as in the method's ranges.</param>
/// <param name="Lowest">Lowest value used.</param>
/// <param name="Highest">Highest value used.</param>
public readonly record struct InputSpan(string Symbol, double Lowest, double Highest);

/// <summary>One use of a method in a study.</summary>
/// <param name="Method">The method.</param>
/// <param name="Spans">The span of each input.</param>
public sealed record MethodUse(Method Method, IReadOnlyList<InputSpan> Spans)
{
    /// <summary>The inputs that left the method's stated range.</summary>
    public IReadOnlyList<(InputRange Range, InputSpan Span)> OutOfRange() =>
    [
        .. from range in Method.Ranges
           from span in Spans
           where span.Symbol == range.Symbol
              && (span.Lowest < range.Lowest * (1 - 1e-12) || span.Highest > range.Highest * (1 + 1e-12))
           select (range, span),
    ];

    /// <summary>Joins uses of the same method, keeping the order of first use.</summary>
    public static IReadOnlyList<MethodUse> Union(IEnumerable<MethodUse> uses)
    {
        var order = new List<string>();
        var byId = new Dictionary<string, MethodUse>(StringComparer.Ordinal);
        foreach (var use in uses)
        {
            if (byId.TryGetValue(use.Method.Id, out var known))
            {
                byId[use.Method.Id] = new MethodUse(use.Method, Join(known.Spans, use.Spans));
            }
            else
            {
                order.Add(use.Method.Id);
                byId[use.Method.Id] = use;
            }
        }

        return [.. order.Select(id => byId[id])];
    }

    private static List<InputSpan> Join(IReadOnlyList<InputSpan> a, IReadOnlyList<InputSpan> b)
    {
        var joined = new List<InputSpan>(a);
        foreach (var span in b)
        {
            var at = joined.FindIndex(s => s.Symbol == span.Symbol);
            if (at < 0)
                joined.Add(span);
            else
                joined[at] = new InputSpan(span.Symbol, Math.Min(joined[at].Lowest, span.Lowest), Math.Max(joined[at].Highest, span.Highest));
        }

        return joined;
    }
}
