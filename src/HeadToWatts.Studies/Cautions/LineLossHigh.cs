using HeadToWatts.Basis.Units;

namespace HeadToWatts.Studies.Cautions;

/// <summary>The line loses much, and lifts the voltage at the plant.</summary>
internal sealed class LineLossHigh() : CautionRule("line-loss-high", StudyStage.Energy, Severity.Weigh, "The line loses much", CautionSources.Practice)
{
    public override string? Say(StudyResult result, UnitDisplay show)
    {
        return result.Energy.Electrical is { LineLossShare: > 0.05 and var share, VoltageRiseRatio: { } rise, LineCurrentA: { } current, Train.Line: { } line }
            ? $"At full power the line loses {UnitDisplay.Percent(share)} at {UnitDisplay.Number(current)} A, and its resistance alone lifts the voltage at the plant by {UnitDisplay.Percent(rise)} over the {UnitDisplay.Number(line.VoltageV)} V at the meter. A larger conductor or a higher voltage is usual beyond 5 %; the utility sets the limit of the voltage."
            : null;
    }
}
