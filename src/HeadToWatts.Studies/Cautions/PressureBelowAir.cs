using HeadToWatts.Basis.Units;

namespace HeadToWatts.Studies.Cautions;

/// <summary>The pipe stands above the hydraulic grade line.</summary>
internal sealed class PressureBelowAir() : CautionRule("pressure-below-air", StudyStage.Waterway, Severity.SettleFirst, "Pressure below the air's", CautionSources.Practice)
{
    public override string? Say(StudyResult result, UnitDisplay show)
    {
        var pipe = result.Waterway.GradeLines.Where(s => s.VelocityHeadM > 0).ToList();
        if (pipe.Count == 0)
            return null;
        var lowest = pipe.MinBy(s => s.PressureHeadM)!;
        return lowest.PressureHeadM >= -0.05
            ? null
            : $"At the design flow the pressure falls to {show.Length(lowest.PressureHeadM)} of water at {lowest.Name}: the pipe lies above the hydraulic grade line there. Air gathers and the wall may collapse; lower the pipe or enlarge it above that place.";
    }
}
