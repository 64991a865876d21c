using HeadToWatts.Basis.Units;

namespace HeadToWatts.Studies.Cautions;

/// <summary>Friction is uncertain at small flows.</summary>
internal sealed class TransitionFlowRule() : CautionRule("transition-flow", StudyStage.Waterway, Severity.Note, "Flow between laminar and turbulent", CautionSources.Transition)
{
    public override string? Say(StudyResult result, UnitDisplay show)
    {
        var lowest = result.Energy.Curve.Where(p => p.IsRunning).Select(p => p.TurbineFlowM3PerS).DefaultIfEmpty(0).Min();
        if (lowest <= 0 || result.Waterway.AtDesign.Elements.Count == 0)
            return null;
        var reynolds = result.Waterway.AtDesign.Elements.Min(e => e.Reynolds) * lowest / result.Flow.DesignFlowM3PerS;
        return reynolds >= 4000
            ? null
            : $"At the least flow the Reynolds number falls to {UnitDisplay.Number(reynolds)}. Between 2000 and 4000 friction is not well defined; a continuous rule of this project bridges it. The head lost there is small.";
    }
}
