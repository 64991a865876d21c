using HeadToWatts.Basis.Units;
using HeadToWatts.EnergyYield;

namespace HeadToWatts.Studies;

/// <summary>Says in words and numbers why a turbine type stands where it stands.</summary>
public static class TurbineWords
{
    /// <summary>The reasons, one sentence each.</summary>
    /// <param name="candidate">The type weighed.</param>
    /// <param name="show">Units in which numbers are shown.</param>
    public static IReadOnlyList<string> Reasons(TurbineCandidate candidate, UnitDisplay show)
    {
        ArgumentNullException.ThrowIfNull(candidate);
        ArgumentNullException.ThrowIfNull(show);
        var reasons = new List<string>
        {
            candidate.Fit.IsInside ? "Inside its envelope." : "Outside its envelope: " + Outside(candidate, show) + ".",
            EnergyByUnits(candidate),
            candidate.Type.AtLowFlow.TrimEnd('.') + $"; here it needs {show.Flow(candidate.LeastFlowM3PerS)}"
                + (candidate.ShareOfYearBelowLeast >= 0.005 ? $", and {UnitDisplay.Percent(candidate.ShareOfYearBelowLeast)} of the year has less." : "."),
        };
        if (candidate.Speed is { } speed)
            reasons.Add(SpeedWords(speed));
        return reasons;
    }

    /// <summary>How far outside the envelope, in words.</summary>
    /// <param name="candidate">The type weighed.</param>
    /// <param name="show">Units in which numbers are shown.</param>
    public static string Outside(TurbineCandidate candidate, UnitDisplay show)
    {
        ArgumentNullException.ThrowIfNull(candidate);
        ArgumentNullException.ThrowIfNull(show);
        var fit = candidate.Fit;
        var words = new List<string>();
        if (fit.LowestHeadAtFlowM is { } low && candidate.NetHeadM < low)
            words.Add($"the head of {show.Length(candidate.NetHeadM)} is {UnitDisplay.Number(candidate.NetHeadM / low, 2)} times the least, {show.Length(low)}, at this flow");
        else if (fit.HighestHeadAtFlowM is { } high && candidate.NetHeadM > high)
            words.Add($"the head of {show.Length(candidate.NetHeadM)} is {UnitDisplay.Number(candidate.NetHeadM / high, 2)} times the most, {show.Length(high)}, at this flow");
        if (fit.LowestFlowAtHeadM3PerS is { } little && candidate.UnitFlowM3PerS < little)
            words.Add($"the flow of {show.Flow(candidate.UnitFlowM3PerS)} is {UnitDisplay.Number(candidate.UnitFlowM3PerS / little, 2)} times the least, {show.Flow(little)}, at this head");
        else if (fit.HighestFlowAtHeadM3PerS is { } much && candidate.UnitFlowM3PerS > much)
            words.Add($"the flow of {show.Flow(candidate.UnitFlowM3PerS)} is {UnitDisplay.Number(candidate.UnitFlowM3PerS / much, 2)} times the most, {show.Flow(much)}, at this head");
        if (words.Count == 0)
            words.Add($"the nearest point of its range is {UnitDisplay.Number(Math.Pow(10, fit.DecadesOutside), 2)} times away in flow and head together");
        return string.Join(", and ", words);
    }

    private static string EnergyByUnits(TurbineCandidate candidate)
    {
        if (candidate.AnnualEnergyKwh <= 0)
            return "It would make no energy here.";
        var others = candidate.EnergyKwhByUnits
            .Select((kwh, i) => (Units: i + 1, Kwh: kwh))
            .Where(x => x.Units != candidate.UnitCount)
            .Select(x => $"{UnitDisplay.Energy(x.Kwh)} with {x.Units}");
        return $"{UnitDisplay.Energy(candidate.AnnualEnergyKwh)} a year with {candidate.UnitCount} {(candidate.UnitCount == 1 ? "unit" : "units")} ({string.Join(", ", others)}).";
    }

    private static string SpeedWords(Turbines.SpeedChoice speed) =>
        speed.IsDirect
            ? $"Specific speed {UnitDisplay.Number(speed.SpecificSpeedKwM)} (kW, m) at {UnitDisplay.Number(speed.RunnerSpeedRpm)} rpm, {speed.Poles} poles, direct; runaway about {UnitDisplay.Number(speed.RunawayRpm)} rpm."
            : $"Wants about {UnitDisplay.Number(speed.RunnerSpeedRpm)} rpm (specific speed {UnitDisplay.Number(speed.SpecificSpeedKwM)}, kW and m), so a gear or belt; runaway about {UnitDisplay.Number(speed.RunawayRpm)} rpm.";
}
