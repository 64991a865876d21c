using HeadToWatts.Basis.Units;

namespace HeadToWatts.Studies.Cautions;

/// <summary>More power than the generator is rated for.</summary>
internal sealed class GeneratorOverloaded() : CautionRule("generator-overloaded", StudyStage.Energy, Severity.SettleFirst, "Generator too small", CautionSources.Practice)
{
    public override string? Say(StudyResult result, UnitDisplay show)
    {
        return result.Energy.Electrical is { GeneratorLoadRatio: > 1.005 and var ratio, Train.Rated.Generator: { } generator }
            ? $"At its best the plant puts {UnitDisplay.Percent(ratio)} of its rating on a generator of {UnitDisplay.Power(generator.RatedPowerKw)}. The energy is reckoned as if it could carry that; choose a larger generator, or less design flow."
            : null;
    }
}
