using HeadToWatts.Basis.Units;
using HeadToWatts.Turbines;

namespace HeadToWatts.Studies.Cautions;

/// <summary>Runaway beyond what usual generators stand.</summary>
internal sealed class HighRunaway() : CautionRule("high-runaway", StudyStage.Turbine, Severity.Weigh, "High runaway speed", TurbineReferences.TypicalRunaway)
{
    // Off-the-shelf generators are commonly built for about twice their speed (common practice, no source).
    private const double UsualGenerator = 2.25;

    public override string? Say(StudyResult result, UnitDisplay show)
    {
        var runaway = result.Turbine.Chosen.Type.Runaway;
        return runaway.Highest > UsualGenerator && result.Turbine.Chosen.Speed is { } speed
            ? $"Without load the {result.Turbine.Chosen.Type.Name} runs away to about {UnitDisplay.Number(speed.RunawayRpm)} rpm, up to {UnitDisplay.Number(runaway.Highest)} times its speed. Generator{(speed.IsDirect ? "" : ", gear")} and couplings must be ordered to survive that, and the water must be shut off by something that works without power."
            : null;
    }
}
