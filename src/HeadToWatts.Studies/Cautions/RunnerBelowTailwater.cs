using HeadToWatts.Basis.Units;

namespace HeadToWatts.Studies.Cautions;

/// <summary>The runner has to lie under water.</summary>
internal sealed class RunnerBelowTailwater() : CautionRule("runner-below-tailwater", StudyStage.Turbine, Severity.Weigh, "Runner below the tailwater", Turbines.Sizing.RunnerSetting.Highest.Source)
{
    public override string? Say(StudyResult result, UnitDisplay show)
    {
        return result.Turbine.ChosenSheet?.Setting is { HighestM: < 0 } setting
            ? $"At {UnitDisplay.Number(result.Turbine.Chosen.Speed!.RunnerSpeedRpm)} rpm the runner of a {result.Turbine.Chosen.Type.Name} must lie at least {show.Length(-setting.HighestM)} below the lowest tailwater, or it cavitates: a deep pit, or a slower and larger runner."
            : null;
    }
}
