using HeadToWatts.Basis.Problems;
using HeadToWatts.Basis.Units;
using HeadToWatts.Files.FlowFiles.Reading;
using HeadToWatts.FlowRecords.Quality;

namespace HeadToWatts.Files.FlowFiles.Recipes;

/// <summary>Reads a file as a recipe says.</summary>
public static class RecipeReader
{
    /// <summary>Key under which a file read by a recipe is reported.</summary>
    public const string Id = "recipe";

    /// <summary>Reads the file, or lists every problem.</summary>
    /// <param name="source">The bytes.</param>
    /// <param name="options">What is known; its recipe must be there.</param>
    /// <param name="cancellation">Stops the reading.</param>
    /// <exception cref="ArgumentException">There is no recipe.</exception>
    internal static Checked<FlowFile> Read(FlowFileSource source, FlowFileOptions options, CancellationToken cancellation)
    {
        var recipe = options.Recipe ?? throw new ArgumentException("There is no recipe.", nameof(options));
        var problems = new ProblemList(source.Name);
        var told = options with
        {
            Order = recipe.DateOrder switch
            {
                RecipeDateOrder.MonthDayYear => DateOrder.MonthFirst,
                RecipeDateOrder.DayMonthYear => DateOrder.DayFirst,
                _ => options.Order,
            },
        };
        var rows = new RecordRows(source, told, problems);
        using var text = Open(source, recipe);
        var table = new RecipeTable(recipe);
        RecipeColumns? columns = null;
        var cells = new RecipeCells(recipe);
        var chosen = 0;
        while (text.Read())
        {
            cancellation.ThrowIfCancellationRequested();
            if (!table.IsData(text))
                continue;
            columns ??= RecipeColumns.Find(recipe, table.Names, name => problems.File(name, "the header has no column of this name", string.Join(", ", table.Names)));
            if (columns is null)
                return problems.Refuse();
            if (columns.Only >= 0 && !text.Cell(columns.Only).Equals(recipe.OnlyText, StringComparison.OrdinalIgnoreCase))
                continue;
            chosen++;
            Take(text, table, columns, cells, rows);
        }

        if (columns is null || chosen == 0)
        {
            problems.File(columns is null ? "no rows" : $"no row with '{recipe.OnlyText}'", columns is null ? "no row is left below the rows at the top" : "no row is chosen", "fewer rows to skip, or another choice of rows");
            return problems.Refuse();
        }

        var name = columns.Value < table.Names.Count && table.Names[columns.Value].Length > 0 ? table.Names[columns.Value] : "column " + RecipeWords.Number(columns.Value + 1);
        if ((options.Stage is null ? Unit(recipe, options.Unit, table, columns.Value, name, problems) : FlowColumn.LevelUnit(name, options.Unit ?? recipe.Unit, problems)) is not { } unit)
            return problems.Refuse();
        rows.Assume("the file is read by a recipe");
        return rows.Build(new RecordAbout(Id, "as a reading recipe says", null, unit, name, recipe.OnlyText ?? ""));
    }

    internal static DelimitedText Open(FlowFileSource source, ReadingRecipe recipe) =>
        recipe.Widths.Count > 0 ? new DelimitedText(source, recipe.Widths) : new DelimitedText(source, recipe.Separator, quotes: true);

    private static void Take(DelimitedText text, RecipeTable table, RecipeColumns columns, RecipeCells cells, RecordRows rows)
    {
        if (text.Count < columns.Needed)
        {
            var first = text.Cell(columns.Dates[0]);
            if (RecordRows.IsTotal(first))
                rows.Total(text.Row, first, text.Cell(columns.Value));
            else
                rows.Wrong(text.Row, text.RowText(), "the row has too few cells", $"{RecipeWords.Number(columns.Needed)} cells or more");
            return;
        }

        if (table.IsTooLong(text))
        {
            if (table.Names.Count > 0)
            {
                rows.Wrong(text.Row, text.RowText(), "the row has more cells than the header", "a cell for each name");
                return;
            }

            rows.Findings.Add(QualityKind.LongRow, text.Row, text.RowText(), "read by the columns that the recipe names");
        }

        if (!cells.Stamp(text, columns, out var date, out var why))
        {
            var first = text.Cell(columns.Dates[0]);
            if (RecordRows.IsTotal(first))
                rows.Total(text.Row, first, text.Cell(columns.Value));
            else
                rows.Wrong(text.Row, string.Join(' ', columns.Dates.Append(columns.Time).Where(c => c >= 0).Select(c => text.Cell(c).ToString())), why, "dates as the recipe says");
            return;
        }

        var code = text.Cell(columns.Quality);
        var marks = QualityCodes.Common(code);
        switch (cells.Value(text.Cell(columns.Value), out var value, out var note))
        {
            case CellKind.Wrong:
                rows.Wrong(text.Row, text.Cell(columns.Value).ToString(), note, "a number as the recipe says, or a mark for a missing value");
                return;
            case CellKind.Missing:
                rows.Missing.Add(note);
                if (note.Equals("ice", StringComparison.OrdinalIgnoreCase))
                    marks |= DayMarks.Ice;
                break;
            case CellKind.Value when note.Length > 0:
                rows.Dry();
                break;
        }

        if (code.Length is > 0 and < 40)
            rows.Codes.Add(code);
        rows.Keep(new RecordRow(date, text.Row, value, marks));
        rows.LastRowIsProven = text.Count > columns.Value + 1;
    }

    private static UnitOfMeasure? Unit(ReadingRecipe recipe, UnitOfMeasure? told, RecipeTable table, int column, string name, ProblemList problems)
    {
        if (recipe.Unit is { } unit)
            return FlowColumn.Agreed(unit, told, name, problems);
        var written = column < table.Units.Count ? HeaderUnit.FindFlow(table.Units[column].Trim('(', ')', '[', ']', ' ')) : null;
        return FlowColumn.Agreed(written ?? HeaderUnit.Find(name, out _), told, name, problems);
    }
}
