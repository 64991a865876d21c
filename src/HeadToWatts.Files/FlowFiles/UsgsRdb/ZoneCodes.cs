namespace HeadToWatts.Files.FlowFiles.UsgsRdb;

/// <summary>
/// The time-zone codes of instantaneous files, minutes ahead of UTC. The US zones follow 49 CFR part 71 and 15 USC 260-263;
/// their letters are common practice.
/// </summary>
internal static class ZoneCodes
{
    private static readonly Dictionary<string, short> Offsets = new(StringComparer.Ordinal)
    {
        ["UTC"] = 0, ["GMT"] = 0,
        ["AST"] = -240, ["ADT"] = -180,
        ["EST"] = -300, ["EDT"] = -240,
        ["CST"] = -360, ["CDT"] = -300,
        ["MST"] = -420, ["MDT"] = -360,
        ["PST"] = -480, ["PDT"] = -420,
        ["AKST"] = -540, ["AKDT"] = -480,
        ["HST"] = -600, ["HDT"] = -540,
        ["SST"] = -660,
        ["GST"] = 600, ["ChST"] = 600,
    };

    private static readonly Dictionary<string, short>.AlternateLookup<ReadOnlySpan<char>> Lookup = Offsets.GetAlternateLookup<ReadOnlySpan<char>>();

    public static string Accepted => string.Join(", ", Offsets.Keys);

    public static bool TryFind(ReadOnlySpan<char> code, out short offsetMin) => Lookup.TryGetValue(code, out offsetMin);
}
