using System.Globalization;
using System.Text.RegularExpressions;
using HeadToWatts.Basis.Units;

namespace HeadToWatts.Files.FlowFiles.Reading;

/// <summary>Settles which column holds the flows and in which unit; what cannot be settled is asked for.</summary>
internal static partial class FlowColumn
{
    /// <summary>The column of that name or number; null, with a problem, when there is none.</summary>
    public static int? Named(IReadOnlyList<string> names, string wanted, ProblemList problems)
    {
        var found = Enumerable.Range(0, names.Count).Where(i => string.Equals(names[i], wanted.Trim(), StringComparison.OrdinalIgnoreCase)).ToList();
        if (found.Count == 0 && int.TryParse(wanted, NumberStyles.None, CultureInfo.InvariantCulture, out var number) && number >= 1 && number <= names.Count)
            found.Add(number - 1);
        if (found.Count > 0)
            return found[0];
        problems.File(wanted, "there is no column of this name or number", string.Join(", ", names));
        return null;
    }

    /// <summary>Chooses among the columns other than those of date and time: the one asked for, the only one, or the only one named as a flow.</summary>
    public static int? Choose(TableLayout layout, int[] others, string? wanted, bool forLevels, ProblemList problems, out string evidence)
    {
        evidence = "";
        var names = Enumerable.Range(0, layout.ColumnCount).Select(layout.ColumnName).ToList();
        if (wanted is not null)
            return Named(names, wanted, problems);

        var columns = Enumerable.Range(0, names.Count).Where(i => Array.IndexOf(others, i) < 0).ToList();
        var flows = forLevels
            ? columns.Where(i => StageName().IsMatch(names[i])).ToList()
            : columns.Where(i => FlowName().IsMatch(names[i]) || HeaderUnit.Find(layout.NameForUnit(i), out _) is not null).ToList();
        var named = forLevels ? "water level" : "flow";
        if (flows.Count == 1)
        {
            if (columns.Count > 1)
                evidence = $"the {named}s stand in '{names[flows[0]]}', the only column named as a {named}";
            return flows[0];
        }

        if (columns.Count == 1 && forLevels)
            return columns[0];
        if (columns.Count == 1 && !OtherName().IsMatch(names[columns[0]]))
            return columns[0];
        problems.File(string.Join(", ", columns.Select(i => names[i])),
            flows.Count > 1 ? $"several columns may be the {named}"
            : forLevels ? "no column is named as the water level"
            : columns.Exists(i => StageName().IsMatch(names[i])) ? "no column is named as the flow; a water level needs a rating to become one: choose one under “When the file does not say”, or as rating in the study file"
            : "no column is named as the flow",
            "name the column of the flows");
        return null;
    }

    /// <summary>The unit the column's name gives, checked against the one that was told; null, with a problem, when neither is there or they differ.</summary>
    public static UnitOfMeasure? Unit(TableLayout layout, int column, UnitOfMeasure? told, ProblemList problems)
    {
        var name = layout.NameForUnit(column);
        var written = HeaderUnit.Find(name, out var unknown);
        if (written is null && unknown.Length > 0 && told is null)
        {
            var other = UnitTable.FindAny(unknown);
            problems.File(name, other is null ? $"the unit '{unknown}' is not known" : $"'{unknown}' is not a unit of flow", QuantityText.Accepted(Dimension.Flow));
            return null;
        }

        return Agreed(written, told, name, problems);
    }

    /// <summary>The unit of a water level: the one the column's name gives, or the one that was told; null, with a problem, when neither is there or they differ.</summary>
    public static UnitOfMeasure? LevelUnit(string name, UnitOfMeasure? told, ProblemList problems)
    {
        var written = HeaderUnit.FindLevel(name);
        if (told is { Dimension: not Dimension.Length })
            problems.File(told.Symbol, "with a rating the values are water levels; this is not a unit of length", QuantityText.Accepted(Dimension.Length));
        else if (written is not null && told is not null && written.Symbol != told.Symbol)
            problems.File(name, $"the file gives its levels in {written.Symbol}, and {told.Symbol} was chosen", written.Symbol);
        else if ((written ?? told) is { } unit)
            return unit;
        else
            problems.File(name, "the unit of the water levels is not given", "a unit in the header, as in stage_ft or level (m), or one that is chosen");
        return null;
    }

    /// <summary>The unit that is known of a file, checked against the one that was told.</summary>
    public static UnitOfMeasure? Agreed(UnitOfMeasure? known, UnitOfMeasure? told, string where, ProblemList problems)
    {
        if (told is { Dimension: not Dimension.Flow })
        {
            problems.File(told.Symbol, "this is not a unit of flow", QuantityText.Accepted(Dimension.Flow));
            return null;
        }

        if (known is not null && told is not null && known.Symbol != told.Symbol)
        {
            problems.File(where, $"the file gives its flows in {known.Symbol}, and {told.Symbol} was chosen", known.Symbol);
            return null;
        }

        if ((known ?? told) is { } unit)
            return unit;
        problems.File(where, "the unit of the flows is not given", "a unit in the header, as in flow_cfs or flow (m3/s), or one that is chosen");
        return null;
    }

    [GeneratedRegex(@"flow|discharge|^q$|^q[\s_\(\[]|inflow|streamflow", RegexOptions.IgnoreCase)]
    private static partial Regex FlowName();

    [GeneratedRegex(@"level|stage|height|hgt|depth", RegexOptions.IgnoreCase)]
    private static partial Regex StageName();

    [GeneratedRegex(@"level|stage|height|hgt|temp|precip|rain|flag|code|quality|sym|elev|depth", RegexOptions.IgnoreCase)]
    private static partial Regex OtherName();
}
