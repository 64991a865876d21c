using System.Globalization;
using HeadToWatts.Basis.Problems;
using HeadToWatts.Basis.Units;
using HeadToWatts.Files.FlowFiles.Reading;

namespace HeadToWatts.Files.FlowFiles.Recipes;

/// <summary>Turns a recipe document into a recipe, or lists every problem by field.</summary>
public static class RecipeBuilder
{
    private const int MostTopRows = 100_000;
    private const int LongestText = 200;

    /// <summary>Builds the recipe.</summary>
    /// <param name="document">The document.</param>
    /// <param name="where">Field that holds it, for problems; may be empty.</param>
    public static Checked<ReadingRecipe> Build(RecipeDocument document, string where)
    {
        ArgumentNullException.ThrowIfNull(document);
        var problems = new List<Problem>();
        var separator = ',';
        List<int> widths = [];
        if (Is(document.Separator, "widths") || (Empty(document.Separator) && !Empty(document.Widths)))
            widths = Widths(document.Widths, At("widths"), problems);
        else if (RecipeWords.Separator(document.Separator?.Trim() ?? "comma") is { } sign)
            separator = sign;
        else
            problems.Add(new Problem(At("separator"), document.Separator!, "this separator is not known", string.Join(", ", RecipeWords.Separators)));

        RecipeDateOrder? order = null;
        if (!Empty(document.DateOrder))
        {
            order = RecipeWords.Order(document.DateOrder!.Trim());
            if (order is null)
                problems.Add(new Problem(At("dateOrder"), document.DateOrder, "this order is not known", string.Join(", ", RecipeWords.Orders)));
        }

        var dates = (Empty(document.DateColumn) ? "1" : document.DateColumn!).Split(';', StringSplitOptions.TrimEntries | StringSplitOptions.RemoveEmptyEntries);
        if (dates.Length is not (1 or 3))
            problems.Add(new Problem(At("dateColumn"), document.DateColumn ?? "", "dates stand in one column, or in three", "a number or name; or three apart by semicolons: year; month; day"));
        var point = One(document.DecimalSign, ".", [".", ","], At("decimalSign"), "this is no decimal sign", problems);
        var thousands = One(document.ThousandsSign, "none", RecipeWords.ThousandsSigns, At("thousandsSign"), "this is no thousands sign", problems);
        if (thousands == point)
            problems.Add(new Problem(At("thousandsSign"), thousands, "it is the decimal sign already", "another sign, or none"));
        UnitOfMeasure? unit = null;
        if (!Empty(document.Unit))
        {
            unit = UnitTable.Find(Dimension.Flow, document.Unit!.Trim()) ?? UnitTable.Find(Dimension.Length, document.Unit.Trim());
            if (unit is null)
                problems.Add(new Problem(At("unit"), document.Unit, "this unit of flow (or of a water level, with a rating) is not known", QuantityText.Accepted(Dimension.Flow)));
        }

        if (Empty(document.OnlyColumn) != Empty(document.OnlyText))
            problems.Add(new Problem(At("onlyColumn"), document.OnlyColumn ?? "", "a column and what stands in it go together", "onlyColumn and onlyText, or neither"));
        foreach (var mark in document.Missing ?? [])
        {
            if (!MissingMarkSet.IsGood(mark))
                problems.Add(new Problem(At("missing"), mark, "this is no mark for a missing value", "a text as it stands in the file, or a limit such as <= -999"));
        }

        foreach (var text in new[] { document.DateColumn, document.TimeColumn, document.ValueColumn, document.QualityColumn, document.OnlyColumn, document.OnlyText })
        {
            if (text?.Length > LongestText)
                problems.Add(new Problem(At("columns"), text[..60] + "...", "this is too long for the name of a column"));
        }

        var recipe = new ReadingRecipe
        {
            Separator = separator,
            Widths = widths,
            SkipRows = Whole(document.SkipRows, 0, 0, MostTopRows, At("skipRows"), problems) ?? 0,
            HeaderRows = Whole(document.HeaderRows, 0, 0, 20, At("headerRows"), problems) ?? 0,
            UnitsRows = Whole(document.UnitsRows, 0, 0, 5, At("unitsRows"), problems) ?? 0,
            DateColumns = dates,
            DateOrder = order,
            TwoDigitYearsFrom = Whole(document.TwoDigitYearsFrom, null, 1700, 2101, At("twoDigitYearsFrom"), problems),
            TimeColumn = Empty(document.TimeColumn) ? null : document.TimeColumn!.Trim(),
            DecimalSign = point[0],
            ThousandsSign = thousands == "none" ? null : thousands == "blank" ? ' ' : thousands[0],
            MissingMarks = document.Missing is { } marks ? [.. marks] : null,
            Unit = unit,
            ValueColumn = Empty(document.ValueColumn) ? "2" : document.ValueColumn!.Trim(),
            QualityColumn = Empty(document.QualityColumn) ? null : document.QualityColumn!.Trim(),
            Clock = Clock(document.TimeZone, At("timeZone"), problems),
            OnlyColumn = Empty(document.OnlyColumn) ? null : document.OnlyColumn!.Trim(),
            OnlyText = Empty(document.OnlyText) ? null : document.OnlyText!.Trim(),
        };
        return problems.Count > 0 ? Checked.Refused<ReadingRecipe>(problems) : Checked.Of(recipe);

        string At(string field) => where.Length == 0 ? field : where + "." + field;
    }

    private static bool Empty(string? text) => string.IsNullOrWhiteSpace(text);

    private static bool Is(string? text, string word) => string.Equals(text?.Trim(), word, StringComparison.OrdinalIgnoreCase);

    private static string One(string? text, string usual, IReadOnlyList<string> choices, string where, string why, List<Problem> problems)
    {
        if (string.IsNullOrEmpty(text))
            return usual;
        if (choices.Contains(text))
            return text;
        problems.Add(new Problem(where, text, why, string.Join("  ", choices)));
        return usual;
    }

    private static int? Whole(string? text, int? usual, int lowest, int highest, string where, List<Problem> problems)
    {
        if (Empty(text))
            return usual;
        if (int.TryParse(text, NumberStyles.None, CultureInfo.InvariantCulture, out var value) && value >= lowest && value <= highest)
            return value;
        problems.Add(new Problem(where, text!, "a whole number is wanted here", $"{RecipeWords.Number(lowest)} to {RecipeWords.Number(highest)}"));
        return usual;
    }

    private static List<int> Widths(string? text, string where, List<Problem> problems)
    {
        var widths = new List<int>();
        foreach (var word in (text ?? "").Split([' ', ','], StringSplitOptions.RemoveEmptyEntries))
        {
            if (int.TryParse(word, NumberStyles.None, CultureInfo.InvariantCulture, out var width) && width is >= 1 and <= 1000 && widths.Count < 200)
                widths.Add(width);
            else
                problems.Add(new Problem(where, word, "this is no width of a column", "whole numbers of characters apart by blanks, as in 10 6 8"));
        }

        if (widths.Count < 2 && problems.Count == 0)
            problems.Add(new Problem(where, text ?? "", "a file of fixed widths has at least two columns", "whole numbers of characters apart by blanks, as in 10 6 8"));
        return widths;
    }

    private static RecipeClock Clock(string? text, string where, List<Problem> problems)
    {
        if (Empty(text) || Is(text, "as written"))
            return RecipeClock.AsWritten;
        var word = text!.Trim();
        if (word.Equals("UTC", StringComparison.OrdinalIgnoreCase))
            return new RecipeClock(OffsetMin: 0);
        if (word.StartsWith("UTC", StringComparison.OrdinalIgnoreCase) && WrittenTime.Offset(word.AsSpan(3).Trim(), out var offset))
            return new RecipeClock(OffsetMin: offset);
        if (word.Contains('/', StringComparison.Ordinal) && word.Length < 60 && TimeZoneInfo.TryFindSystemTimeZoneById(word, out var zone))
            return new RecipeClock(Zone: zone);
        problems.Add(new Problem(where, word, "this time zone is not known", "as written, UTC, an offset such as UTC-07:00, or a place such as America/Denver"));
        return RecipeClock.AsWritten;
    }
}
