using HeadToWatts.Basis.Units;

namespace HeadToWatts.Studies.Cautions;

/// <summary>Pressure down to that of vapour while the plant stops.</summary>
internal sealed class ColumnParts() : CautionRule("column-separation", StudyStage.Waterway, Severity.SettleFirst, "The water column may part", CautionSources.Practice)
{
    public override string? Say(StudyResult result, UnitDisplay show) => result.Waterway.Stop is { Run.Separation: { } parted }
        ? $"When the unit trips the pressure falls to that of vapour {UnitDisplay.Number(parted.TimeS)} s later, {show.Length(parted.StationM)} from the intake. Columns that part and meet again strike harder than any figure here, and a thin pipe may be crushed by the air outside. An engineer's transient study with cavities, air valves and the true profile must come first."
        : null;
}
