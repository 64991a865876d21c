using System.Globalization;
using HeadToWatts.Files.FlowFiles.Reading;

namespace HeadToWatts.Files.FlowFiles.Recipes;

/// <summary>One row of a file as a recipe splits it.</summary>
/// <param name="Row">Its number in the file.</param>
/// <param name="Role">What it is.</param>
/// <param name="Cells">Its cells.</param>
/// <param name="Stamp">The date and time that was read; empty where none was.</param>
/// <param name="Value">The value that was read, "missing", or empty.</param>
/// <param name="Problem">Why the row cannot be read; empty when it can.</param>
public sealed record RecipePreviewRow(int Row, RecipeRowRole Role, IReadOnlyList<string> Cells, string Stamp, string Value, string Problem);

/// <summary>The first rows of a file as a recipe splits and reads them, for a screen to show beside the choices.</summary>
/// <param name="Columns">Names of the columns, or their numbers.</param>
/// <param name="Rows">The rows.</param>
public sealed record RecipePreview(IReadOnlyList<string> Columns, IReadOnlyList<RecipePreviewRow> Rows)
{
    /// <summary>The preview of a file.</summary>
    /// <param name="source">The bytes.</param>
    /// <param name="recipe">The recipe.</param>
    /// <param name="most">How many rows.</param>
    public static RecipePreview Of(FlowFileSource source, ReadingRecipe recipe, int most = 30)
    {
        ArgumentNullException.ThrowIfNull(source);
        ArgumentNullException.ThrowIfNull(recipe);
        var rows = new List<RecipePreviewRow>();
        var table = new RecipeTable(recipe);
        var cells = new RecipeCells(recipe);
        RecipeColumns? columns = null;
        var lost = "";
        try
        {
            using var text = RecipeReader.Open(source, recipe);
            while (rows.Count < most && text.ReadAny())
            {
                var skipped = text.Count == 0 || DelimitedText.IsSkipped(text.RowText());
                var role = skipped ? RecipeRowRole.Skipped : table.Next(text);
                if (role == RecipeRowRole.Data && lost.Length == 0)
                    columns ??= RecipeColumns.Find(recipe, table.Names, name => lost = $"there is no column '{name}'");
                rows.Add(role == RecipeRowRole.Data ? Data(text, columns, cells, recipe, lost) : new RecipePreviewRow(text.Row, role, text.Cells(), "", "", ""));
            }
        }
        catch (CsvHelper.CsvFormatException)
        {
            lost = "a row is too long";
        }

        var count = rows.Count == 0 ? 0 : rows.Max(r => r.Cells.Count);
        return new RecipePreview([.. Enumerable.Range(0, count).Select(i => i < table.Names.Count && table.Names[i].Length > 0 ? table.Names[i] : RecipeWords.Number(i + 1))], rows);
    }

    private static RecipePreviewRow Data(DelimitedText text, RecipeColumns? columns, RecipeCells cells, ReadingRecipe recipe, string lost)
    {
        var row = new RecipePreviewRow(text.Row, RecipeRowRole.Data, text.Cells(), "", "", lost);
        if (columns is null)
            return row;
        if (columns.Only >= 0 && !text.Cell(columns.Only).Equals(recipe.OnlyText, StringComparison.OrdinalIgnoreCase))
            return row with { Role = RecipeRowRole.Skipped };
        if (text.Count < columns.Needed)
            return row with { Problem = "the row has too few cells" };
        if (!cells.Stamp(text, columns, out var date, out var why))
            return row with { Problem = why };
        var stamp = date.HasTime ? string.Create(CultureInfo.InvariantCulture, $"{date} {TimeSpan.FromMilliseconds(date.TimeMs):hh\\:mm}") : date.ToString();
        return cells.Value(text.Cell(columns.Value), out var value, out var note) switch
        {
            CellKind.Value => row with { Stamp = stamp, Value = value.ToString("R", CultureInfo.InvariantCulture) },
            CellKind.Missing => row with { Stamp = stamp, Value = "missing" },
            _ => row with { Stamp = stamp, Problem = note },
        };
    }
}
