using HeadToWatts.Basis.Units;

namespace HeadToWatts.Studies.Cautions;

/// <summary>Gear or belt without a loss.</summary>
internal sealed class DriveLossForgotten() : CautionRule("drive-loss-forgotten", StudyStage.Energy, Severity.Note, "Gear or belt without a loss", CautionSources.Practice)
{
    public override string? Say(StudyResult result, UnitDisplay show)
    {
        return result.Turbine.Chosen.Speed is { IsDirect: false } speed && result.Input.Train.DriveEfficiency >= 0.9995
            ? $"The {result.Turbine.Chosen.Type.Name} turns at about {UnitDisplay.Number(speed.RunnerSpeedRpm)} rpm, too slow or too fast for a usual generator, so a gear or belt lies between; yet its efficiency stands at 100 %. Gears and belts lose 2 to 5 %."
            : null;
    }
}
