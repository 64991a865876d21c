using HeadToWatts.Basis.Units;
using HeadToWatts.Studies.Worth;

namespace HeadToWatts.Studies.Cautions;

/// <summary>A cost correlation is looked at outside what it was drawn from.</summary>
internal sealed class CorrelationOutOfRange() : CautionRule("correlation-out-of-range", StudyStage.Money, Severity.Note, "Cost correlations outside their range", CautionSources.MethodRange)
{
    public override string? Say(StudyResult result, UnitDisplay show) =>
        result.Money is { HasCosts: true } money && money.CostBands.Where(b => !b.IsInside).Select(b => b.Correlation.Name).Distinct().ToList() is { Count: > 0 } outside
            ? $"{UnitDisplay.Power(result.Energy.Annual.InstalledPowerKw)} at {show.Length(result.Head.GrossHeadM)} lies outside the plants behind {string.Join(", ", outside)}. The correlations are a band to look at, written down from memory, and no estimate."
            : null;
}
