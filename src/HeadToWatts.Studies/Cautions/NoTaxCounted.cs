using HeadToWatts.Basis.Units;
using HeadToWatts.Studies.Worth;

namespace HeadToWatts.Studies.Cautions;

/// <summary>Taxes are left out.</summary>
internal sealed class NoTaxCounted() : CautionRule("no-tax-counted", StudyStage.Money, Severity.Note, "Before tax", MoneySources.Practice)
{
    public override string? Say(StudyResult result, UnitDisplay show) =>
        result.Money is { } money
        && money is { HasCosts: true, HasPrice: true, Input.Tax: null }
            ? "No tax is counted. Income tax, property tax and what the law allows for depreciation and credits differ by owner and change by year: ask an accountant."
            : null;
}
