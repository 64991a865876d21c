using HeadToWatts.Files.FlowFiles.Reading;

namespace HeadToWatts.Files.FlowFiles.Recipes;

/// <summary>Reads the cells of a row as a recipe says.</summary>
internal sealed class RecipeCells(ReadingRecipe recipe)
{
    private readonly MissingMarkSet? _missing = recipe.MissingMarks is { } marks ? new MissingMarkSet(marks) : null;

    public bool Stamp(DelimitedText text, RecipeColumns columns, out WrittenDate date, out string why)
    {
        var good = columns.Dates.Length == 3
            ? RecipeStamp.TryRead(text.Cell(columns.Dates[0]), text.Cell(columns.Dates[1]), text.Cell(columns.Dates[2]), recipe.TwoDigitYearsFrom, out date, out why)
            : RecipeStamp.TryRead(text.Cell(columns.Dates[0]), recipe.DateOrder, recipe.TwoDigitYearsFrom, out date, out why);
        if (!good || columns.Time < 0)
            return good;
        if (!WrittenTime.TryRead(text.Cell(columns.Time), compact: true, out var time, out var offset))
        {
            why = "the time of day is not understood";
            return false;
        }

        date = date with { TimeMs = time, OffsetMin = offset };
        return true;
    }

    public CellKind Value(ReadOnlySpan<char> cell, out double value, out string note)
    {
        if (_missing is null)
            return WrittenValue.Read(Plain(cell), NumberSigns.Point, out value, out note);

        value = double.NaN;
        note = WrittenValue.Blank;
        if (cell.Length == 0)
            return CellKind.Missing;
        note = "";
        if (WrittenValue.TryNumber(Plain(cell), NumberSigns.Point, out var number))
        {
            if (_missing.HoldsNumber(number))
            {
                note = cell.ToString();
                return CellKind.Missing;
            }

            value = number;
            return CellKind.Value;
        }

        var word = cell.ToString();
        if (_missing.HoldsText(word))
        {
            note = word;
            return CellKind.Missing;
        }

        if (word.Equals(WrittenValue.Dry, StringComparison.OrdinalIgnoreCase))
        {
            note = WrittenValue.Dry;
            value = 0;
            return CellKind.Value;
        }

        note = WrittenValue.WhyNot(word, NumberSigns.Point);
        return CellKind.Wrong;
    }

    // Numbers with a point alone. A sign that stands where a thousands sign cannot is left in, so that the cell is refused.
    private ReadOnlySpan<char> Plain(ReadOnlySpan<char> cell)
    {
        if (recipe.ThousandsSign is null && recipe.DecimalSign == '.')
            return cell;
        if (recipe.DecimalSign == ',' && recipe.ThousandsSign != '.' && cell.Contains('.'))
            return cell.Contains(',') ? "(a point and a comma)" : cell.ToString().Replace('.', '?');
        var text = cell.ToString();
        if (recipe.ThousandsSign == ' ')
            text = text.Replace('\u00A0', ' ').Replace('\u202F', ' ');
        if (recipe.ThousandsSign is { } sign && WrittenValue.ThousandsFit(text, recipe.DecimalSign, sign))
            text = text.Replace(sign.ToString(), "", StringComparison.Ordinal);
        return recipe.DecimalSign == ',' ? text.Replace(',', '.') : text;
    }
}
