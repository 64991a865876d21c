namespace HeadToWatts.Files.FlowFiles.Recipes;

/// <summary>A reading recipe as it is written in a study or a file and edited on a screen: every choice a text.</summary>
public sealed class RecipeDocument
{
    /// <summary>"comma", "semicolon", "tab", "bar", "blanks" or "widths".</summary>
    public string? Separator { get; set; }

    /// <summary>Widths of columns apart by blanks, as in "10 6 8".</summary>
    public string? Widths { get; set; }

    /// <summary>Lines at the top that are passed over.</summary>
    public string? SkipRows { get; set; }

    /// <summary>Rows of names.</summary>
    public string? HeaderRows { get; set; }

    /// <summary>Rows of units.</summary>
    public string? UnitsRows { get; set; }

    /// <summary>Number or name of the column of dates; or three, apart by semicolons: year; month; day.</summary>
    public string? DateColumn { get; set; }

    /// <summary>"year-month-day", "month-day-year", "day-month-year" or "spreadsheet-day".</summary>
    public string? DateOrder { get; set; }

    /// <summary>First year of the hundred that years of two digits stand for.</summary>
    public string? TwoDigitYearsFrom { get; set; }

    /// <summary>Number or name of the column of times of day.</summary>
    public string? TimeColumn { get; set; }

    /// <summary>"." or ",".</summary>
    public string? DecimalSign { get; set; }

    /// <summary>"none", ",", ".", "'" or "blank".</summary>
    public string? ThousandsSign { get; set; }

    /// <summary>Marks of a missing value.</summary>
    public List<string>? Missing { get; set; }

    /// <summary>Unit of flow.</summary>
    public string? Unit { get; set; }

    /// <summary>Number or name of the column of values.</summary>
    public string? ValueColumn { get; set; }

    /// <summary>Number or name of the column of quality codes.</summary>
    public string? QualityColumn { get; set; }

    /// <summary>"as written", an offset such as "UTC-07:00", or a place such as "America/Denver".</summary>
    public string? TimeZone { get; set; }

    /// <summary>Number or name of a column by which rows are chosen.</summary>
    public string? OnlyColumn { get; set; }

    /// <summary>What stands in that column of the rows to be read.</summary>
    public string? OnlyText { get; set; }

    /// <summary>The document of a recipe.</summary>
    /// <param name="recipe">The recipe.</param>
    public static RecipeDocument From(ReadingRecipe recipe)
    {
        ArgumentNullException.ThrowIfNull(recipe);
        return new RecipeDocument
        {
            Separator = recipe.Widths.Count > 0 ? "widths" : RecipeWords.Separator(recipe.Separator),
            Widths = recipe.Widths.Count > 0 ? string.Join(' ', recipe.Widths.Select(RecipeWords.Number)) : null,
            SkipRows = RecipeWords.Number(recipe.SkipRows),
            HeaderRows = RecipeWords.Number(recipe.HeaderRows),
            UnitsRows = recipe.UnitsRows > 0 ? RecipeWords.Number(recipe.UnitsRows) : null,
            DateColumn = string.Join("; ", recipe.DateColumns),
            DateOrder = recipe.DateOrder is { } order ? RecipeWords.Order(order) : null,
            TwoDigitYearsFrom = recipe.TwoDigitYearsFrom is { } year ? RecipeWords.Number(year) : null,
            TimeColumn = recipe.TimeColumn,
            DecimalSign = recipe.DecimalSign.ToString(),
            ThousandsSign = recipe.ThousandsSign is { } sign ? RecipeWords.Thousands(sign) : null,
            Missing = recipe.MissingMarks is { } marks ? [.. marks] : null,
            Unit = recipe.Unit?.Symbol,
            ValueColumn = recipe.ValueColumn,
            QualityColumn = recipe.QualityColumn,
            TimeZone = recipe.Clock.Zone?.Id ?? (recipe.Clock.OffsetMin is { } offset ? Reading.ClockOfRows.Utc(offset) : null),
            OnlyColumn = recipe.OnlyColumn,
            OnlyText = recipe.OnlyText,
        };
    }
}
