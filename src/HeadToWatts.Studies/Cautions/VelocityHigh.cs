using HeadToWatts.Basis.Units;

namespace HeadToWatts.Studies.Cautions;

/// <summary>Faster than usual for the material.</summary>
internal sealed class VelocityHigh() : CautionRule("velocity-high", StudyStage.Waterway, Severity.Weigh, "High velocity", CautionSources.Practice)
{
    public override string? Say(StudyResult result, UnitDisplay show)
    {
        var over = result.Waterway.AtDesign.Elements.Where(e => e.VelocityMPerS > e.Element.Material.UsualVelocityHighMPerS).ToList();
        if (over.Count == 0)
            return null;
        var worst = over.MaxBy(e => e.VelocityMPerS / e.Element.Material.UsualVelocityHighMPerS)!;
        return $"{worst.Element.Name}: {show.Velocity(worst.VelocityMPerS)} at the design flow, above the usual {show.Velocity(worst.Element.Material.UsualVelocityHighMPerS)} for {worst.Element.Material.Name}. Losses, wear and pressure surges grow with it.";
    }
}
