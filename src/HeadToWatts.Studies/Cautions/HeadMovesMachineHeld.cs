using HeadToWatts.Basis.Units;
using HeadToWatts.Turbines.Units;

namespace HeadToWatts.Studies.Cautions;

/// <summary>The head moves, but the machine does not follow.</summary>
internal sealed class HeadMovesMachineHeld() : CautionRule("head-moves-machine-held", StudyStage.Turbine, Severity.Note, "Machine held while the head moves", HeldSpeed.Method.Source)
{
    // A tenth of head moves the capacity by a twentieth and the efficiency by little.
    private const double Matters = 0.1;

    public override string? Say(StudyResult result, UnitDisplay show)
    {
        var levels = result.Head.Levels;
        if (levels.Count == 0 || result.Turbine.HeadBehaviour is not null || result.Turbine.Chosen.Type.OwnSpeedRule is not null)
            return null;
        var (low, high) = (levels.Min(l => l.GrossHeadM), levels.Max(l => l.GrossHeadM));
        return high - low <= Matters * result.Head.GrossHeadM
            ? null
            : $"The gross head runs from {show.Length(low)} to {show.Length(high)}, yet capacity and efficiency of the machine are held at those of its rated head. Let them follow the head on the turbine page, or enter a maker's chart.";
    }
}
