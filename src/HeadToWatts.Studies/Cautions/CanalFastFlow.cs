using HeadToWatts.Basis.Units;
using HeadToWatts.Hydraulics.Canals;
using HeadToWatts.Studies.Results;

namespace HeadToWatts.Studies.Cautions;

/// <summary>A canal near or above the critical flow, or full.</summary>
internal sealed class CanalFastFlow() : CautionRule("canal-fast-or-full", StudyStage.Head, Severity.Weigh, "The canal runs fast or full", CautionSources.Practice)
{
    private const double NearCriticalFroude = 0.8;

    public override string? Say(StudyResult result, UnitDisplay show)
    {
        if (result.Canal is not { } canal || result.Input.Head.Canal is not { } given)
            return null;
        string?[] says = [Side(canal.AtFull.Upstream, given.Upstream, "above the drop", show), Side(canal.AtFull.Downstream, given.Downstream, "below the drop", show)];
        var found = says.Where(t => t is not null).ToList();
        return found.Count == 0 ? null : $"At {show.Flow(canal.AtFull.FlowM3PerS)} the canal {string.Join(", and the canal ", found)}. Levels and heads there cannot be relied on; survey the canal at high flow.";
    }

    private static string? Side(CanalFlowResult at, HeadToWatts.Studies.Inputs.CanalSide side, string where, UnitDisplay show) => at switch
    {
        { NormalDepthM: null } => $"{where} is full before it carries the flow",
        { NormalDepthM: { } depth } when side.BankElevationM is { } bank && side.BedElevationM + depth > bank => $"{where} stands {show.Length(side.BedElevationM + depth - bank)} over its bank",
        { Slope: CanalSlope.Steep } => $"{where} runs faster than the critical flow (Froude number {UnitDisplay.Number(at.FroudeNumber ?? 1)})",
        { FroudeNumber: > NearCriticalFroude } => $"{where} runs near the critical flow (Froude number {UnitDisplay.Number(at.FroudeNumber.Value)}), where the surface is wavy",
        _ => null,
    };
}
