using HeadToWatts.Basis.Units;

namespace HeadToWatts.Studies.Cautions;

/// <summary>Above the Bureau of Reclamation limit.</summary>
internal sealed class VelocityOverLimit() : CautionRule("velocity-over-limit", StudyStage.Waterway, Severity.Weigh, "Above the penstock velocity limit", CautionSources.Usbr)
{
    public override string? Say(StudyResult result, UnitDisplay show)
    {
        return result.Waterway.HighestVelocityMPerS <= result.Waterway.VelocityLimitMPerS
            ? null
            : $"The highest velocity, {show.Velocity(result.Waterway.HighestVelocityMPerS)}, is above 0.125 √(2gH) = {show.Velocity(result.Waterway.VelocityLimitMPerS)} for {show.Length(result.Head.GrossHeadM)} of head.";
    }
}
