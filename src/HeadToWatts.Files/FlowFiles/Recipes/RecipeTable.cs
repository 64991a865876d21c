using HeadToWatts.Files.FlowFiles.Reading;

namespace HeadToWatts.Files.FlowFiles.Recipes;

/// <summary>What a row at the top of a file is, by a recipe.</summary>
public enum RecipeRowRole
{
    /// <summary>Passed over: above the table, blank, or a comment.</summary>
    Skipped,

    /// <summary>Names of columns.</summary>
    Header,

    /// <summary>Units of columns.</summary>
    Units,

    /// <summary>A value.</summary>
    Data,
}

/// <summary>Follows the rows of a file from its top and tells names, units and data apart.</summary>
internal sealed class RecipeTable(ReadingRecipe recipe)
{
    private int _above;
    private int _cells = -1;

    public IReadOnlyList<string> Names { get; private set; } = [];

    public IReadOnlyList<string> Units { get; private set; } = [];

    /// <summary>Whether a row of data has more cells than the names, or than the first row of data where there are none.</summary>
    public bool IsTooLong(DelimitedText text)
    {
        if (_cells < 0)
            _cells = recipe.Widths.Count > 0 ? recipe.Widths.Count : Names.Count > 0 ? Names.Count : text.Count;
        return text.Count > _cells && text.HoldsMoreThan(_cells);
    }

    public bool IsData(DelimitedText text) => Next(text) == RecipeRowRole.Data;

    public RecipeRowRole Next(DelimitedText text)
    {
        if (text.Row <= recipe.SkipRows)
            return RecipeRowRole.Skipped;
        if (_above < recipe.HeaderRows)
        {
            _above++;
            Names = text.Cells();
            return RecipeRowRole.Header;
        }

        if (_above < recipe.HeaderRows + recipe.UnitsRows)
        {
            _above++;
            Units = text.Cells();
            return RecipeRowRole.Units;
        }

        return RecipeRowRole.Data;
    }
}
