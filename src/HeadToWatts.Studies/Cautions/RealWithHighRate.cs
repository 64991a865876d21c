using HeadToWatts.Basis.Units;
using HeadToWatts.Economics.CashFlows;
using HeadToWatts.Studies.Worth;

namespace HeadToWatts.Studies.Cautions;

/// <summary>An escalation that looks nominal in a real plan.</summary>
internal sealed class RealWithHighRate() : CautionRule("terms-doubtful", StudyStage.Money, Severity.Weigh, "Real or nominal?", MoneySources.Practice)
{
    public override string? Say(StudyResult result, UnitDisplay show) =>
        result.Money is { } money
        && money.Input is { Terms: PriceTerms.Real, PriceEscalationRate: > 0.015 }
            ? $"The plan is in real terms and the price rises by {UnitDisplay.Percent(money.Input.PriceEscalationRate)} a year beyond inflation. If that figure includes inflation, the plan mixes real and nominal: choose nominal terms or leave inflation out."
            : null;
}
