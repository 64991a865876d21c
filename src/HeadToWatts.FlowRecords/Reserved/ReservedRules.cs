namespace HeadToWatts.FlowRecords.Reserved;

/// <summary>A kind of reserved-flow rule that may be chosen.</summary>
/// <param name="Id">Key as study files write it.</param>
/// <param name="Name">Name in words.</param>
/// <param name="Needs">What must be given.</param>
public sealed record ReservedRuleKind(string Id, string Name, string Needs);

/// <summary>The reserved-flow rules that may be chosen.</summary>
public static class ReservedRules
{
    /// <summary>All of them.</summary>
    public static IReadOnlyList<ReservedRuleKind> All { get; } =
    [
        new("none", "None given", ""),
        new("constant", "A constant flow", "flow"),
        new("proportional", "A share of the flow that arrives, with or without a floor", "percent; floor"),
        new("monthly", "A flow for each month", "twelve flows from January on"),
        new("tennant", "Tennant's shares of the mean annual flow, by season", "level; mean annual flow, from the record when not given"),
        new("low-flow", "A share of Q95 or 7Q10", "percent; the statistic, from the record when not given"),
    ];

    /// <summary>Finds a kind by its key; null when there is none.</summary>
    /// <param name="id">Key.</param>
    public static ReservedRuleKind? Find(string id) => All.FirstOrDefault(k => string.Equals(k.Id, id, StringComparison.OrdinalIgnoreCase));
}
