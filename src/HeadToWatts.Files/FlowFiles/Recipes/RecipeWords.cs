using System.Globalization;

namespace HeadToWatts.Files.FlowFiles.Recipes;

/// <summary>The words by which a recipe's choices are written.</summary>
public static class RecipeWords
{
    private static readonly (string Word, char Sign)[] SeparatorSigns = [("comma", ','), ("semicolon", ';'), ("tab", '\t'), ("bar", '|'), ("blanks", ReadingRecipe.Blanks)];

    private static readonly (string Word, RecipeDateOrder Order)[] OrderNames =
    [
        ("year-month-day", RecipeDateOrder.YearMonthDay), ("month-day-year", RecipeDateOrder.MonthDayYear),
        ("day-month-year", RecipeDateOrder.DayMonthYear), ("spreadsheet-day", RecipeDateOrder.SpreadsheetDay),
    ];

    /// <summary>The separators that can be chosen.</summary>
    public static IReadOnlyList<string> Separators { get; } = [.. SeparatorSigns.Select(s => s.Word), "widths"];

    /// <summary>The orders of dates that can be chosen.</summary>
    public static IReadOnlyList<string> Orders { get; } = [.. OrderNames.Select(o => o.Word)];

    /// <summary>The thousands signs that can be chosen.</summary>
    public static IReadOnlyList<string> ThousandsSigns { get; } = ["none", ",", ".", "'", "blank"];

    internal static string Number(int number) => number.ToString(CultureInfo.InvariantCulture);

    internal static string Separator(char sign) => SeparatorSigns.FirstOrDefault(s => s.Sign == sign).Word ?? sign.ToString();

    internal static char? Separator(string word) => SeparatorSigns.Where(s => s.Word.Equals(word, StringComparison.OrdinalIgnoreCase)).Select(s => (char?)s.Sign).FirstOrDefault();

    internal static string Order(RecipeDateOrder order) => OrderNames.First(o => o.Order == order).Word;

    internal static RecipeDateOrder? Order(string word) => OrderNames.Where(o => o.Word.Equals(word, StringComparison.OrdinalIgnoreCase)).Select(o => (RecipeDateOrder?)o.Order).FirstOrDefault();

    internal static string Thousands(char sign) => sign == ' ' ? "blank" : sign.ToString();
}
