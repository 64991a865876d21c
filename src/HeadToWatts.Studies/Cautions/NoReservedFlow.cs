using HeadToWatts.Basis.Units;

namespace HeadToWatts.Studies.Cautions;

/// <summary>No word on water that must stay.</summary>
internal sealed class NoReservedFlow() : CautionRule("no-reserved-flow", StudyStage.Flow, Severity.SettleFirst, "No reserved flow stated", CautionSources.Esha)
{
    public override string? Say(StudyResult result, UnitDisplay show)
    {
        return result.Input.Flow.ReservedFlowIsStated
            ? null
            : "No reserved (instream) flow or prior delivery is stated. If water must stay in the stream or go to others first, the energy here is too high. Ask the water-rights and fish agencies, then enter the figure, even if it is zero.";
    }
}
