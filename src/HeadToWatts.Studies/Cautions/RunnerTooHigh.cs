using HeadToWatts.Basis.Units;

namespace HeadToWatts.Studies.Cautions;

/// <summary>The runner is planned above its highest setting.</summary>
internal sealed class RunnerTooHigh() : CautionRule("runner-too-high", StudyStage.Turbine, Severity.SettleFirst, "Runner above its highest setting", Turbines.Sizing.RunnerSetting.Highest.Source)
{
    public override string? Say(StudyResult result, UnitDisplay show)
    {
        return result.Turbine.ChosenSheet?.Setting is { } setting && result.Input.Turbine.RunnerHeightM is { } height && height > setting.HighestM
            ? $"The runner is to stand {show.Length(height)} above the lowest tailwater; a {result.Turbine.Chosen.Type.Name} of this specific speed cavitates above about {show.Length(setting.HighestM)} (Thoma's coefficient {UnitDisplay.Number(setting.ThomaSigma)}, air pressure {show.Length(setting.AirHeadM)}). Set it lower, or choose a slower runner; the maker's own coefficient decides."
            : null;
    }
}
