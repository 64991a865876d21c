using HeadToWatts.Basis.Sources;
using HeadToWatts.Hydraulics.Canals;
using HeadToWatts.Studies.Inputs;
using HeadToWatts.Studies.Results;

namespace HeadToWatts.Studies;

/// <summary>Works out the canal above and below a drop.</summary>
internal static class CanalStudy
{
    private const int ProfileSteps = 120;
    private const double NearNormal = 0.99;
    private static readonly double[] Shares = [0.25, 0.5, 0.75, 1];

    /// <summary>The canal of a study; null when none is given.</summary>
    /// <param name="canal">The canal as given.</param>
    /// <param name="designFlowM3PerS">Flow in the canal when the plant runs full, m3/s.</param>
    /// <param name="largestFlowM3PerS">Largest flow of the study, m3/s.</param>
    /// <param name="gravityMPerS2">Gravity, m/s2.</param>
    internal static CanalResult? Of(CanalInput? canal, double designFlowM3PerS, double largestFlowM3PerS, double gravityMPerS2)
    {
        if (canal is null || !(designFlowM3PerS > 0))
            return null;
        var fullFlow = Math.Max(largestFlowM3PerS, designFlowM3PerS);
        var design = At(canal, designFlowM3PerS, gravityMPerS2);
        var full = At(canal, fullFlow, gravityMPerS2);
        var (drawdown, lengthM) = Drawdown(canal.Upstream, full, gravityMPerS2);
        var basin = Basin(canal, full, gravityMPerS2);
        List<MethodUse> uses = [.. design.Upstream.Uses, .. design.Downstream.Uses, .. full.Upstream.Uses, .. full.Downstream.Uses];
        if (drawdown.Count > 0)
            uses.AddRange([CanalReach.Method.Used(), FreeOverfall.Method.Used()]);
        if (basin is not null)
            uses.AddRange(basin.Uses);
        return new CanalResult(
            [.. Shares.Select(s => s * designFlowM3PerS).Append(fullFlow).Distinct().Order().Select(q => At(canal, q, gravityMPerS2))],
            design,
            full,
            Terms(canal.Upstream, design.Upstream, gravityMPerS2),
            Terms(canal.Downstream, design.Downstream, gravityMPerS2),
            drawdown,
            lengthM,
            basin,
            MethodUse.Union(uses));
    }

    private static CanalAtFlow At(CanalInput canal, double flowM3PerS, double gravityMPerS2) =>
        new(flowM3PerS, canal.Upstream.Canal.At(flowM3PerS, gravityMPerS2), canal.Downstream.Canal.At(flowM3PerS, gravityMPerS2));

    private static CanalEnergyTerms? Terms(CanalSide side, CanalFlowResult at, double gravityMPerS2) => at.NormalDepthM is { } depth
        ? new CanalEnergyTerms(side.BedElevationM, depth, SpecificEnergy.VelocityHeadM(side.Canal.Section.At(depth), at.FlowM3PerS, gravityMPerS2, side.Canal.KineticEnergyCoefficient))
        : null;

    // Slow flow falls to its critical depth just above a free drop and is drawn down for some way upstream.
    private static (IReadOnlyList<CanalEnergy> Line, double LengthM) Drawdown(CanalSide side, CanalAtFlow full, double gravityMPerS2)
    {
        if (full.Upstream is not { Slope: CanalSlope.Mild, NormalDepthM: { } normal, CriticalDepthM: { } critical })
            return ([], 0);
        var end = new CanalStation(side.Canal.Section, 0, side.BedElevationM, side.Canal.ManningCoefficient, side.Canal.KineticEnergyCoefficient);
        var lengthM = Math.Clamp(4 * normal / side.Canal.BedSlopeRatio, 20 * normal, 20_000);
        var line = CanalReach.ProfileUpstream(end, critical, side.Canal.BedSlopeRatio, lengthM, ProfileSteps, full.FlowM3PerS, gravityMPerS2);
        var reached = line.FirstOrDefault(s => s.DepthM >= NearNormal * normal);
        return (line, reached is null ? lengthM : -reached.StationM);
    }

    private static BasinCheck? Basin(CanalInput canal, CanalAtFlow full, double gravityMPerS2)
    {
        if (canal.Basin is not { } basin || full.Downstream.NormalDepthM is not { } below || (full.Upstream.SpecificEnergyM ?? full.Upstream.CriticalEnergyM) is not { } above)
            return null;
        return StillingBasin.Check(basin, full.FlowM3PerS, canal.Upstream.BedElevationM + above, canal.Downstream.BedElevationM + below, gravityMPerS2);
    }
}
