using HeadToWatts.Basis.Units;

namespace HeadToWatts.Studies.Cautions;

/// <summary>Slower than usual.</summary>
internal sealed class VelocityLow() : CautionRule("velocity-low", StudyStage.Waterway, Severity.Note, "Low velocity", CautionSources.Practice)
{
    public override string? Say(StudyResult result, UnitDisplay show)
    {
        var under = result.Waterway.AtDesign.Elements.Where(e => e.VelocityMPerS > 0 && e.VelocityMPerS < e.Element.Material.UsualVelocityLowMPerS).ToList();
        if (under.Count == 0)
            return null;
        var worst = under.MinBy(e => e.VelocityMPerS)!;
        return $"{worst.Element.Name}: {show.Velocity(worst.VelocityMPerS)} at the design flow, below the usual {show.Velocity(worst.Element.Material.UsualVelocityLowMPerS)}. Sediment may settle, and a smaller pipe may cost less and lose little.";
    }
}
