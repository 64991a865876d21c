using System.Globalization;
using System.Text.RegularExpressions;
using CsvHelper;
using HeadToWatts.Basis.Units;
using HeadToWatts.Files.FlowFiles.Reading;

namespace HeadToWatts.Files.FlowFiles.Recipes;

/// <summary>
/// Proposes a recipe for a file that nobody described: looks at its opening lines for separator, names and units, and at all of
/// its rows for the order of dates, the signs in numbers and the marks of missing values. What the file does not decide is asked.
/// </summary>
public static partial class RecipeProposer
{
    private const int FirstYearOfTwoDigits = 1950;
    private static readonly char[] Separators = ['\t', ';', '|', ',', ReadingRecipe.Blanks];

    /// <summary>The proposal for a file.</summary>
    /// <param name="source">The bytes.</param>
    /// <param name="cancellation">Stops the looking.</param>
    public static RecipeProposal Propose(FlowFileSource source, CancellationToken cancellation = default)
    {
        ArgumentNullException.ThrowIfNull(source);
        var evidence = new List<RecipeEvidence>();
        var questions = new List<RecipeQuestion>();
        var content = FlowFileHead.Of(source).Content().ToList();
        if (Layout(content) is not { } layout)
        {
            questions.Add(new RecipeQuestion("dateColumn", "No column of dates was found. Which separator and which column?", RecipeWords.Separators));
            return new RecipeProposal(new ReadingRecipe(), evidence, questions);
        }

        var recipe = Top(content, layout, evidence);
        var names = Names(content, layout, recipe);
        var time = layout.TimeColumn;
        if (time >= 0)
            evidence.Add(new RecipeEvidence("timeColumn", $"column {Number(time + 1)} holds times of day, as '{layout.Cells[time]}'"));
        ColumnSurvey survey;
        try
        {
            survey = ColumnSurvey.Of(source, recipe, layout, FirstYearOfTwoDigits, cancellation);
        }
        catch (CsvFormatException)
        {
            questions.Add(new RecipeQuestion("separator", "A row is longer than 256 kB. Which separator?", RecipeWords.Separators));
            return new RecipeProposal(recipe, evidence, questions);
        }

        recipe = recipe with { DateColumns = [Number(layout.DateColumn + 1)], TimeColumn = time >= 0 ? Number(time + 1) : null };
        recipe = Dates(recipe, layout, survey, evidence, questions);
        var value = Value(layout, names, survey, evidence, questions);
        if (value < 0)
            return new RecipeProposal(recipe, evidence, questions);
        recipe = recipe with { ValueColumn = Number(value + 1) };
        recipe = Signs(recipe, survey.Columns[value], evidence, questions);
        recipe = Marks(recipe, survey.Columns[value], evidence);
        recipe = Unit(recipe, content, layout, names, value, evidence, questions);
        recipe = Quality(recipe, layout, names, value, survey, evidence);
        return new RecipeProposal(recipe, evidence, questions);
    }

    private static string Number(int number) => number.ToString(CultureInfo.InvariantCulture);

    // The separator that gives the most rows of equal length with a date in one and the same column.
    private static RecipeLayout? Layout(List<(int Row, string Text)> content)
    {
        RecipeLayout? best = null;
        foreach (var separator in Separators)
        {
            var rows = new List<(int At, string[] Cells, int Date)>();
            for (var at = 0; at < content.Count; at++)
            {
                if (separator != ReadingRecipe.Blanks && !content[at].Text.Contains(separator, StringComparison.Ordinal))
                    continue;
                var cells = DelimitedText.Split(content[at].Text, separator);
                if (cells.Length >= 2 && Array.FindIndex(cells, IsDate) is var date and >= 0)
                    rows.Add((at, cells, date));
            }

            if (rows.Count == 0)
                continue;
            var group = rows.GroupBy(r => (r.Cells.Length, r.Date)).OrderByDescending(g => g.Count()).First();
            if (best is not null && group.Count() <= best.Rows)
                continue;
            var first = group.First();
            best = new RecipeLayout(separator, first.At, first.Cells, first.Date, TableLayout.TimeColumn(first.Cells, first.Date), group.Count());
        }

        return best ?? CompactDates(content);
    }

    // Rows apart by blanks in which one column holds six or eight digits that are dates throughout.
    private static RecipeLayout? CompactDates(List<(int Row, string Text)> content)
    {
        foreach (var separator in Separators)
        {
            var rows = content.Select((c, at) => (At: at, Cells: DelimitedText.Split(c.Text, separator))).Where(r => r.Cells.Length >= 2).ToList();
            if (rows.Count < 2)
                continue;
            var width = rows.GroupBy(r => r.Cells.Length).OrderByDescending(g => g.Count()).First();
            for (var c = 0; c < width.Key; c++)
            {
                var good = width.Where(r => r.Cells[c].Length == 6 && RecipeStamp.TryRead(r.Cells[c], RecipeDateOrder.YearMonthDay, FirstYearOfTwoDigits, out _, out _)).ToList();
                if (good.Count < 2 || good.Count < width.Count())
                    continue;
                var time = c + 1 < width.Key && good.All(r => r.Cells[c + 1].Length == 4 && WrittenTime.TryRead(r.Cells[c + 1], compact: true, out _, out _)) ? c + 1 : -1;
                return new RecipeLayout(separator, good[0].At, good[0].Cells, c, time, good.Count) { IsCompact = true };
            }
        }

        return null;
    }

    private static bool IsDate(string cell) => WrittenDate.TryRead(cell, out _, out _, FirstYearOfTwoDigits);

    private static ReadingRecipe Top(List<(int Row, string Text)> content, RecipeLayout layout, List<RecipeEvidence> evidence)
    {
        evidence.Add(new RecipeEvidence("separator", $"{RecipeWords.Separator(layout.Separator)}: it splits {Number(layout.Rows)} of the first {Number(content.Count)} rows into {Number(layout.Cells.Length)} cells with a date in column {Number(layout.DateColumn + 1)}"));
        var at = layout.At - 1;
        int header = 0, units = 0;
        if (at >= 0 && DelimitedText.Split(content[at].Text, layout.Separator) is { Length: >= 2 } above && !Array.Exists(above, TableLayout.BeginsWithNumber))
        {
            header = 1;
            var isUnits = Array.Exists(above, c => HeaderUnit.FindFlow(c.Trim('(', ')', '[', ']')) is not null) && at > 0
                && DelimitedText.Split(content[at - 1].Text, layout.Separator) is { Length: >= 2 };
            if (isUnits)
                (units, at) = (1, at - 1);
        }
        else
        {
            at = layout.At;
        }

        var skip = at >= 0 && at < content.Count ? content[at].Row - 1 : 0;
        if (header > 0)
            evidence.Add(new RecipeEvidence("headerRows", $"row {Number(content[at].Row)} holds names{(units > 0 ? $", row {Number(content[at + 1].Row)} units" : "")}; the first date stands in row {Number(content[layout.At].Row)}"));
        else
            evidence.Add(new RecipeEvidence("headerRows", $"no row of names stands above the first date, in row {Number(content[layout.At].Row)}"));
        return new ReadingRecipe { Separator = layout.Separator, SkipRows = skip, HeaderRows = header, UnitsRows = units };
    }

    private static string[] Names(List<(int Row, string Text)> content, RecipeLayout layout, ReadingRecipe recipe)
    {
        if (recipe.HeaderRows == 0)
            return [];
        var at = content.FindIndex(c => c.Row > recipe.SkipRows);
        return DelimitedText.Split(content[at].Text, layout.Separator);
    }

    private static ReadingRecipe Dates(ReadingRecipe recipe, RecipeLayout layout, ColumnSurvey survey, List<RecipeEvidence> evidence, List<RecipeQuestion> questions)
    {
        if (survey.TwoDigitYears || layout.IsCompact)
        {
            recipe = recipe with { TwoDigitYearsFrom = FirstYearOfTwoDigits };
            evidence.Add(new RecipeEvidence("twoDigitYearsFrom", $"years have two digits; {Number(FirstYearOfTwoDigits)} to {Number(FirstYearOfTwoDigits + 99)} is assumed"));
        }

        if (layout.IsCompact)
        {
            evidence.Add(new RecipeEvidence("dateOrder", $"'{layout.Cells[layout.DateColumn]}' and all others in column {Number(layout.DateColumn + 1)} are dates as year, month, day"));
            return recipe with { DateOrder = RecipeDateOrder.YearMonthDay };
        }

        if (survey.OpenDate is null)
        {
            evidence.Add(new RecipeEvidence("dateOrder", $"'{layout.Cells[layout.DateColumn]}': the year, or the name of the month, shows the order"));
            return recipe with { DateOrder = Parts(layout.Cells[layout.DateColumn]) };
        }

        if (survey.DayFirst is { } d && survey.MonthFirst is { } m)
        {
            questions.Add(new RecipeQuestion("dateOrder", $"'{d.Text}' in row {Number(d.Row)} has the day first, '{m.Text}' in row {Number(m.Row)} the month. Which rows are right?", ["day-month-year", "month-day-year"]));
            return recipe;
        }

        if ((survey.DayFirst ?? survey.MonthFirst) is { } seen)
        {
            evidence.Add(new RecipeEvidence("dateOrder", $"'{seen.Text}' occurs in row {Number(seen.Row)}, so {(survey.DayFirst is not null ? "the day" : "the month")} comes first"));
            return recipe with { DateOrder = survey.DayFirst is not null ? RecipeDateOrder.DayMonthYear : RecipeDateOrder.MonthDayYear };
        }

        questions.Add(new RecipeQuestion("dateOrder", $"Does the day or the month come first in dates such as '{survey.OpenDate}'? No number above 12 decides it.{survey.StepHint()}", ["day-month-year", "month-day-year"]));
        return recipe;
    }

    // The order of a date that shows it: the year first, or the name of a month in the middle.
    private static RecipeDateOrder Parts(string cell) => FourDigits().IsMatch(cell) ? RecipeDateOrder.YearMonthDay : RecipeDateOrder.DayMonthYear;

    private static int Value(RecipeLayout layout, string[] names, ColumnSurvey survey, List<RecipeEvidence> evidence, List<RecipeQuestion> questions)
    {
        var numeric = Enumerable.Range(0, layout.Cells.Length).Where(i => i != layout.DateColumn && i != layout.TimeColumn && survey.Columns[i].IsNumeric).ToList();
        var named = numeric.Where(i => i < names.Length && (FlowName().IsMatch(names[i]) || HeaderUnit.Find(names[i], out _) is not null)).ToList();
        if (named.Count == 1)
        {
            evidence.Add(new RecipeEvidence("valueColumn", $"column {Number(named[0] + 1)}, '{names[named[0]]}', is the only one named as a flow"));
            return named[0];
        }

        if (numeric.Count == 1)
        {
            evidence.Add(new RecipeEvidence("valueColumn", $"column {Number(numeric[0] + 1)} is the only one of numbers"));
            return numeric[0];
        }

        var choices = numeric.Select(i => i < names.Length ? $"{Number(i + 1)}: {names[i]}" : Number(i + 1)).ToList();
        questions.Add(new RecipeQuestion("valueColumn", numeric.Count == 0 ? "No column holds numbers. Which one holds the flows?" : "Which column holds the flows?", choices));
        return named.Count > 0 ? named[0] : numeric.Count > 0 ? numeric[^1] : -1;
    }

    private static ReadingRecipe Signs(ReadingRecipe recipe, ColumnFacts facts, List<RecipeEvidence> evidence, List<RecipeQuestion> questions)
    {
        if (facts.DecimalComma is { } comma)
        {
            evidence.Add(new RecipeEvidence("decimalSign", $"'{comma}' occurs, so the comma is the decimal sign"));
            return recipe with { DecimalSign = ',', ThousandsSign = facts.HasPointAndComma ? '.' : null };
        }

        if (facts.ThousandsComma is { } thousands)
        {
            evidence.Add(new RecipeEvidence("thousandsSign", $"'{thousands}' occurs, so commas stand between thousands"));
            return recipe with { ThousandsSign = ',' };
        }

        if (facts.OpenComma is { } open)
            questions.Add(new RecipeQuestion("decimalSign", $"Is the comma in '{open}' a decimal sign or does it stand between thousands?", [".", ","]));
        return recipe;
    }

    private static ReadingRecipe Marks(ReadingRecipe recipe, ColumnFacts facts, List<RecipeEvidence> evidence)
    {
        if (facts.Marks.Count == 0)
            return recipe;
        foreach (var (mark, count) in facts.Marks)
            evidence.Add(new RecipeEvidence("missing", $"'{mark}' stands {Number(count)} times and is a usual mark for a missing value"));
        return recipe with { MissingMarks = [.. facts.Marks.Select(m => m.Mark)] };
    }

    private static ReadingRecipe Unit(ReadingRecipe recipe, List<(int Row, string Text)> content, RecipeLayout layout, string[] names, int value, List<RecipeEvidence> evidence, List<RecipeQuestion> questions)
    {
        var name = value < names.Length ? names[value] : "";
        var unit = HeaderUnit.Find(name, out _);
        if (recipe.UnitsRows > 0)
        {
            var row = DelimitedText.Split(content[layout.At - 1].Text, layout.Separator);
            if (value < row.Length && HeaderUnit.FindFlow(row[value].Trim('(', ')', '[', ']')) is { } written)
                (unit, name) = (written, row[value]);
        }

        if (unit is not null)
        {
            evidence.Add(new RecipeEvidence("unit", $"'{name}' says {unit.Symbol}"));
            return recipe with { Unit = unit };
        }

        questions.Add(new RecipeQuestion("unit", "In which unit are the flows? The file does not say it.", [.. UnitTable.Of(Dimension.Flow).Select(u => u.Symbol)]));
        return recipe;
    }

    private static ReadingRecipe Quality(ReadingRecipe recipe, RecipeLayout layout, string[] names, int value, ColumnSurvey survey, List<RecipeEvidence> evidence)
    {
        for (var i = 0; i < layout.Cells.Length; i++)
        {
            if (i == layout.DateColumn || i == layout.TimeColumn || i == value || survey.Columns[i].IsNumeric)
                continue;
            var named = i < names.Length && QualityName().IsMatch(names[i]);
            if (!named && !(i > value && survey.Columns[i].IsCodes))
                continue;
            evidence.Add(new RecipeEvidence("qualityColumn", named ? $"column {Number(i + 1)} is named '{names[i]}'" : $"column {Number(i + 1)} holds a few short codes: {string.Join(", ", survey.Columns[i].Texts.Take(5))}"));
            return recipe with { QualityColumn = Number(i + 1) };
        }

        return recipe;
    }

    [GeneratedRegex(@"flow|discharge|^q$|^q[\s_\(\[]|inflow|streamflow|[\s_]q[a-z]$", RegexOptions.IgnoreCase)]
    private static partial Regex FlowName();

    [GeneratedRegex(@"^(flag|code|quality|qual|qualifier|grade|sym|symbol|status|qa|qc)s?\b|_(cd|flag|code)$", RegexOptions.IgnoreCase)]
    private static partial Regex QualityName();

    [GeneratedRegex(@"^\W?\d{4}(\D|\d{4})")]
    private static partial Regex FourDigits();
}
