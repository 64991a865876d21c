using HeadToWatts.Basis.Units;
using HeadToWatts.Studies.Worth;

namespace HeadToWatts.Studies.Cautions;

/// <summary>Prices older than the memo.</summary>
internal sealed class PriceYearOld() : CautionRule("price-year-old", StudyStage.Money, Severity.Weigh, "Prices of another year", MoneySources.Practice)
{
    public override string? Say(StudyResult result, UnitDisplay show) =>
        result.Money is { } money
        && YearOf(result.Header.Date) is { } year && year - money.Basis.PriceYear > 2
            ? $"The prices are of {money.Basis.PriceYear}, the memo is of {year}. Bring them up by an index that is named, or ask anew."
            : null;

    private static int? YearOf(string date) =>
        date.Length >= 4 && int.TryParse(date.AsSpan(0, 4), System.Globalization.NumberStyles.None, System.Globalization.CultureInfo.InvariantCulture, out var year) ? year : null;
}
