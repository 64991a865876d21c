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

    public IReadOnlyList<string> Names { get; private set; } = [];

    public IReadOnlyList<string> Units { get; private set; } = [];

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
