using HeadToWatts.Basis.Units;

namespace HeadToWatts.Studies.Cautions;

/// <summary>Generation set against pumping is not yet money.</summary>
internal sealed class PumpingOnAnotherMeter() : CautionRule("pumping-on-another-meter", StudyStage.Pumping, Severity.Weigh, "Generation and pumping on different meters", CautionSources.Practice)
{
    public override string? Say(StudyResult result, UnitDisplay show) => result.Pumping is { Pumping.ElectricKwh: > 0 } side
        ? $"{UnitDisplay.Energy(side.Pumping.ElectricKwh)} a year of pumping stand beside {UnitDisplay.Energy(side.GeneratedKwh)} of generation. Only where the utility nets the meters against each other is a kilowatt-hour of the one worth one of the other; demand charges stay unless the plant is firm. Ask for the tariff in writing."
        : null;
}
