using System.Globalization;
using System.Text.RegularExpressions;
using HeadToWatts.Basis.Quantities;

namespace HeadToWatts.Files.StudyFiles;

/// <summary>Reads an amount of money: a number, alone or with the study's currency. Another currency is refused, never converted.</summary>
internal static partial class AmountText
{
    internal static double? Read(string? text, MoneyBasis basis, string where, double lowest, double highest, FieldReader read)
    {
        if (string.IsNullOrWhiteSpace(text))
            return null;
        var match = Pattern().Match(text.Trim().Replace('\u2212', '-').Replace('\u00a0', ' ').Replace('\u202f', ' '));
        if (!match.Success)
        {
            read.Refuse(where, text, text.Contains(',', StringComparison.Ordinal) ? "a comma may be a decimal sign or a thousands sign" : "it is not an amount", $"a number such as 125000 or 0.08, alone or with {basis.Currency}");
            return null;
        }

        var currency = match.Groups["before"].Success ? match.Groups["before"].Value : match.Groups["after"].Value;
        if (currency.Length > 0 && !currency.Equals(basis.Currency, StringComparison.OrdinalIgnoreCase))
        {
            read.Refuse(where, text, $"this study counts in {basis.Currency}, and one currency is never turned into another", $"an amount in {basis.Currency} of {basis.PriceYear.ToString(CultureInfo.InvariantCulture)}");
            return null;
        }

        var value = double.Parse(match.Groups["number"].Value.Replace(" ", "", StringComparison.Ordinal), CultureInfo.InvariantCulture);
        if (value >= lowest && value <= highest)
            return value;
        read.Refuse(where, text, "it lies outside what is possible here", string.Create(CultureInfo.InvariantCulture, $"{lowest:0.###} to {highest:0.###}"));
        return null;
    }

    [GeneratedRegex(@"^(?:(?<before>[A-Za-z]{3})\s*)?(?<number>[-+]?(?:\d{1,3}(?: \d{3})+(?:\.\d+)?|\d+(?:\.\d*)?|\.\d+)(?:[eE][-+]?\d{1,2})?)\s*(?:(?<after>[A-Za-z]{3})(?:\s*/\s*kWh)?)?$")]
    private static partial Regex Pattern();
}
