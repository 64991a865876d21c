using System.Globalization;

namespace HeadToWatts.Files.FlowFiles.Recipes;

/// <summary>The columns of a recipe found in a file: indexes from 0, -1 for none.</summary>
internal sealed record RecipeColumns(int[] Dates, int Time, int Value, int Quality, int Only)
{
    /// <summary>How many cells a row needs.</summary>
    public int Needed => Math.Max(Dates.Max(), Value) + 1;

    /// <summary>Finds the columns; a name that is not in the header is told through the action.</summary>
    public static RecipeColumns? Find(ReadingRecipe recipe, IReadOnlyList<string> names, Action<string> missing)
    {
        var good = true;
        var columns = new RecipeColumns([.. recipe.DateColumns.Select(Index)], Optional(recipe.TimeColumn), Index(recipe.ValueColumn), Optional(recipe.QualityColumn), Optional(recipe.OnlyColumn));
        return good ? columns : null;

        int Optional(string? name) => name is null ? -1 : Index(name);

        int Index(string name)
        {
            for (var i = 0; i < names.Count; i++)
            {
                if (string.Equals(names[i], name, StringComparison.OrdinalIgnoreCase))
                    return i;
            }

            if (int.TryParse(name, NumberStyles.None, CultureInfo.InvariantCulture, out var number) && number is >= 1 and <= 10_000)
                return number - 1;
            good = false;
            missing(name);
            return 0;
        }
    }
}
