using HeadToWatts.Basis.Sources;
using HeadToWatts.Economics;
using HeadToWatts.EnergyYield;
using HeadToWatts.FlowRecords;
using HeadToWatts.Hydraulics;
using HeadToWatts.Hydraulics.Surge;
using HeadToWatts.Hydraulics.Water;
using HeadToWatts.Hydraulics.Waterways;
using HeadToWatts.Pumping;
using HeadToWatts.Studies.Inputs;
using HeadToWatts.Studies.Results;
using HeadToWatts.Turbines;
using HeadToWatts.Turbines.Units;

namespace HeadToWatts.Studies;

/// <summary>The methods of a study in order of first use, and the catalogue of all methods of the project.</summary>
public static class StudyMethods
{
    /// <summary>Every method of every stage, for the methods page and the house rules.</summary>
    public static IReadOnlyList<Method> Catalogue { get; } =
    [
        .. FlowRecordMethods.All,
        .. HydraulicsMethods.All,
        .. TurbineMethods.All,
        .. EnergyMethods.All,
        .. PumpingMethods.All,
        .. EconomicsMethods.All,
    ];

    internal static IReadOnlyList<MethodUse> Uses(AlternativeInput input, SiteConditions site, Waterway waterway, SurgeResult? surge, StopResult? stop, PlantChoice choice, double lowestFlowM3PerS, HeadBehaviour? behaviour)
    {
        var uses = new List<MethodUse>(site.Uses);
        if (input.Flow.Record is { } record)
        {
            uses.Add(input.Flow.PlottingPosition.Method.Used(new InputSpan("n", record.ValidCount, record.ValidCount)));
        }

        uses.Add(FlowRecordMethods.DurationCurve.Used());
        uses.AddRange(input.Flow.Origin?.Uses ?? []);
        uses.AddRange(input.Flow.Rules?.Uses ?? []);
        uses.AddRange(waterway.UsesBetween(Math.Min(lowestFlowM3PerS, choice.DesignFlowM3PerS), choice.DesignFlowM3PerS, site));
        if (waterway.Elements.Count > 0)
            uses.Add(VelocityLimits.Method.Used(new InputSpan("H", input.Head.Gross.Metres, input.Head.Gross.Metres)));
        uses.Add(EnergyMethods.WaterPower.Used());
        uses.Add(EnergyMethods.AnnualEnergy.Used());
        uses.Add(EnergyMethods.PlantFactor.Used());
        uses.AddRange(ElectricalUses.Of(input.Train, choice));
        if (choice.Chosen.Speed is { } speed)
            uses.AddRange(speed.Uses);
        if (choice.StepUp is { } stepUp)
            uses.Add(stepUp.Use);
        if (behaviour is not null)
            uses.Add(behaviour.Use);
        uses.AddRange(MachineSheets.Uses(choice, input.Turbine, site));
        if (surge is not null)
            uses.AddRange(surge.Uses);
        uses.AddRange(stop?.Uses ?? []);
        return MethodUse.Union(uses);
    }
}
