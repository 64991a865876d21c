using HeadToWatts.Basis.Units;

namespace HeadToWatts.Studies.Cautions;

/// <summary>A canal whose full flow has no stated way past a stopped plant.</summary>
internal sealed class BypassNotStated() : CautionRule("bypass-not-stated", StudyStage.Head, Severity.SettleFirst, "Nothing said of the bypass", CautionSources.Reclamation2012)
{
    public override string? Say(StudyResult result, UnitDisplay show) => result.Input.Head.Canal is { Bypass.Length: 0 } && result.Canal is { } canal
        ? $"When the plant stops, the canal's full flow of {show.Flow(canal.AtFull.FlowM3PerS)} must pass at once and by itself, or the canal overtops. State what passes it: the old drop, a side weir, a gate that opens without power."
        : null;
}
