using System.Text.RegularExpressions;
using HeadToWatts.Basis.Units;

namespace HeadToWatts.Files.FlowFiles.Reading;

/// <summary>Finds the unit in the name of a column: "flow_cfs", "flow (m3/s)", "Discharge [L/s]", "q_m3_s".</summary>
internal static partial class HeaderUnit
{
    /// <summary>The unit of flow the name gives, if any.</summary>
    /// <param name="header">Name of the column.</param>
    /// <param name="unknown">What stands in brackets when it is no unit of flow.</param>
    public static UnitOfMeasure? Find(string header, out string unknown)
    {
        unknown = "";
        var bracket = Bracketed().Match(header);
        if (bracket.Success)
        {
            var inside = bracket.Groups[1].Value.Trim();
            if (FindFlow(inside) is { } unit)
                return unit;
            unknown = inside;
        }

        foreach (Match start in WordStarts().Matches(header))
        {
            if (FindFlow(header[start.Index..].Trim()) is { } unit)
            {
                unknown = "";
                return unit;
            }
        }

        return null;
    }

    /// <summary>The unit of a water level that the name of a column gives, as in "stage_ft" or "level (m)"; null when it gives none.</summary>
    public static UnitOfMeasure? FindLevel(string header)
    {
        var bracket = Bracketed().Match(header);
        if (bracket.Success && UnitTable.Find(Dimension.Length, bracket.Groups[1].Value.Trim()) is { } inside)
            return inside;
        foreach (Match start in WordStarts().Matches(header))
        {
            if (UnitTable.Find(Dimension.Length, header[start.Index..].Trim()) is { } unit)
                return unit;
        }

        return null;
    }

    public static UnitOfMeasure? FindFlow(string text) =>
        UnitTable.Find(Dimension.Flow, text)
        ?? UnitTable.Find(Dimension.Flow, text.Replace("_per_", "/", StringComparison.OrdinalIgnoreCase).Replace(" per ", "/", StringComparison.OrdinalIgnoreCase))
        ?? UnitTable.Find(Dimension.Flow, text.Replace('_', '/'))
        ?? (text.ToLowerInvariant() is "m3s" or "m3ps" or "cubic metres per second" or "cubic meters per second" ? UnitTable.CubicMetrePerSecond
            : text.ToLowerInvariant() is "cubic feet per second" or "ft3s" ? UnitTable.CubicFootPerSecond
            : text.ToLowerInvariant() is "litres per second" or "liters per second" ? UnitTable.LitrePerSecond
            : text.ToLowerInvariant() is "gallons per minute" ? UnitTable.GallonPerMinute
            : null);

    [GeneratedRegex(@"[\(\[]([^\)\]]*)[\)\]]")]
    private static partial Regex Bracketed();

    [GeneratedRegex(@"(?<=^|[\s_,:])(?=[^\s_,:])")]
    private static partial Regex WordStarts();
}
