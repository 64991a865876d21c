using HeadToWatts.Basis.Units;
using HeadToWatts.Studies.Worth;

namespace HeadToWatts.Studies.Cautions;

/// <summary>A long life without replacements.</summary>
internal sealed class NoReplacements() : CautionRule("no-replacements", StudyStage.Money, Severity.Weigh, "Nothing is ever replaced", MoneySources.Practice)
{
    public override string? Say(StudyResult result, UnitDisplay show) =>
        result.Money is { } money
        && money.HasCosts && money.Input.LifeYears > 20 && money.Input.Replacements.Count == 0
            ? $"Over {money.Input.LifeYears} years nothing is replaced. Runner, bearings, controls and windings commonly are, once or twice."
            : null;
}
