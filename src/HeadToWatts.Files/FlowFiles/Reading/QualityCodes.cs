using HeadToWatts.FlowRecords.Quality;

namespace HeadToWatts.Files.FlowFiles.Reading;

/// <summary>What the quality codes of agencies and spreadsheets mean.</summary>
internal static class QualityCodes
{
    /// <summary>US Geological Survey: "A", "P", "e", "A:e", "A:[91]", several parts apart by colons.</summary>
    public static DayMarks Usgs(ReadOnlySpan<char> code)
    {
        var marks = DayMarks.None;
        foreach (var range in code.SplitAny(":, "))
        {
            var part = code[range];
            if (part is "e" or "E" or "[e]")
                marks |= DayMarks.Estimated;
            else if (part is "P")
                marks |= DayMarks.Provisional;
            else if (part.Equals("Ice", StringComparison.OrdinalIgnoreCase))
                marks |= DayMarks.Ice;
        }

        return marks;
    }

    /// <summary>Water Survey of Canada: A part of a day, B ice, D dry, E estimated, R revised.</summary>
    public static DayMarks Canada(ReadOnlySpan<char> code) => code switch
    {
        "A" or "a" => DayMarks.Partial,
        "B" or "b" => DayMarks.Ice,
        "E" or "e" => DayMarks.Estimated,
        _ => DayMarks.None,
    };

    /// <summary>A column of codes in a table of one's own: words, or the letters that mean the same everywhere.</summary>
    public static DayMarks Common(ReadOnlySpan<char> code)
    {
        if (code.Length == 0)
            return DayMarks.None;
        if (code.Equals("e", StringComparison.OrdinalIgnoreCase) || code.StartsWith("est", StringComparison.OrdinalIgnoreCase))
            return DayMarks.Estimated;
        if (code is "P" or "p" || code.StartsWith("prov", StringComparison.OrdinalIgnoreCase))
            return DayMarks.Provisional;
        if (code.StartsWith("ice", StringComparison.OrdinalIgnoreCase))
            return DayMarks.Ice;
        return Usgs(code);
    }
}
