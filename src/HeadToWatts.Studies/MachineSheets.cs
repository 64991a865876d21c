using HeadToWatts.Basis.Sources;
using HeadToWatts.EnergyYield;
using HeadToWatts.Hydraulics.Water;
using HeadToWatts.Studies.Inputs;
using HeadToWatts.Studies.Results;
using HeadToWatts.Turbines;
using HeadToWatts.Turbines.Sizing;

namespace HeadToWatts.Studies;

/// <summary>Lays every candidate's size, speed and setting beside each other.</summary>
internal static class MachineSheets
{
    internal static IReadOnlyList<MachineSheet> Of(IReadOnlyList<TurbineCandidate> ranking, SiteConditions site) => [.. ranking.Select(c => Sheet(c, site))];

    internal static PumpBand? Pump(PlantChoice choice, TurbineInput turbine)
    {
        var candidate = choice.Ranking.First(c => c.Type.Id == "pump-as-turbine");
        if (candidate.NetHeadM <= 0)
            return null;
        return PumpBand.Of(turbine.Pump, candidate.UnitFlowM3PerS, candidate.NetHeadM);
    }

    internal static IEnumerable<MethodUse> Uses(PlantChoice choice, TurbineInput turbine, SiteConditions site)
    {
        var sheet = Sheet(choice.Chosen, site);
        if (sheet.Geometry is { } geometry)
            yield return geometry.Use;
        foreach (var use in sheet.Setting?.Uses ?? [])
            yield return use;
        if ((choice.Chosen.Type.Id == "pump-as-turbine" || turbine.Pump is not null) && Pump(choice, turbine) is { } pump)
            yield return pump.Use;
    }

    internal static MachineSheet Sheet(TurbineCandidate candidate, SiteConditions site)
    {
        var type = candidate.Type;
        if (candidate.Speed is not { } speed)
            return new MachineSheet(candidate, null, null, null, null, Against(candidate, null, null));
        var duty = new RunnerDuty(candidate.UnitFlowM3PerS, candidate.NetHeadM, speed.RunnerSpeedRpm, speed.Jets, site.GravityMPerS2);
        var geometry = type.Sizing?.At(duty);
        var setting = type.CavitationTable is { } table
            ? RunnerSetting.Of(table, speed.SpecificSpeedKwM, candidate.NetHeadM, site.AtmosphericPressurePa / site.SpecificWeightNPerM3, site.Water.VapourPressurePa / site.SpecificWeightNPerM3)
            : null;
        return new MachineSheet(candidate, geometry, setting, SpecificSpeed.UsHpFtFromKwM(speed.SpecificSpeedKwM), duty.SpecificSpeedDimensionless, Against(candidate, geometry, setting));
    }

    private static List<string> Against(TurbineCandidate candidate, RunnerGeometry? geometry, RunnerSetting? setting)
    {
        var against = new List<string>();
        if (!candidate.Fit.IsInside)
            against.Add("Outside its usual range of head and flow.");
        if (candidate.Speed is { IsDirect: false })
            against.Add("Needs a gear or belt.");
        if (setting is { HighestM: < 0 })
            against.Add("The runner must lie below the tailwater.");
        if (candidate.ShareOfYearBelowLeast >= 0.1)
            against.Add("Stands often for want of water.");
        if (geometry is not null)
            against.AddRange(geometry.Doubts);
        if (against.Count == 0)
            against.Add(candidate.Type.Limits.Split(". ")[0].TrimEnd('.') + ".");
        return against;
    }
}
