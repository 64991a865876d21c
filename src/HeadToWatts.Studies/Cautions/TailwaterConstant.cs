using HeadToWatts.Basis.Units;

namespace HeadToWatts.Studies.Cautions;

/// <summary>Levels that move are not in the result.</summary>
internal sealed class TailwaterConstant() : CautionRule("tailwater-constant", StudyStage.Head, Severity.Weigh, "Tailwater held constant", CautionSources.Corps1979)
{
    public override string? Say(StudyResult result, UnitDisplay show)
    {
        return result.Head.GrossHeadM > 10 || result.Input.Head.Moves
            ? null
            : $"Headwater and tailwater are held constant. At a low head such as {show.Length(result.Head.GrossHeadM)}, a tailwater that rises with the flow takes a large share of the head when water is plentiful: measure both levels at several flows.";
    }
}
