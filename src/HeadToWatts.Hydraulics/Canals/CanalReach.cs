using HeadToWatts.Basis.Sources;

namespace HeadToWatts.Hydraulics.Canals;

/// <summary>A station of a canal.</summary>
/// <param name="Section">Shape of the canal.</param>
/// <param name="StationM">Distance along the flow, m.</param>
/// <param name="BedElevationM">Elevation of the lowest point, m.</param>
/// <param name="ManningCoefficient">Manning's n.</param>
/// <param name="KineticEnergyCoefficient">α; 1 or more.</param>
public sealed record CanalStation(CanalSection Section, double StationM, double BedElevationM, double ManningCoefficient, double KineticEnergyCoefficient = 1);

/// <summary>The energy at a station.</summary>
/// <param name="StationM">Distance along the flow, m.</param>
/// <param name="DepthM">Depth y, m.</param>
/// <param name="SurfaceElevationM">Elevation of the water, m.</param>
/// <param name="VelocityMPerS">Mean velocity V, m/s.</param>
/// <param name="VelocityHeadM">α V^2/2g, m.</param>
/// <param name="EnergyElevationM">Elevation of the energy line, m.</param>
/// <param name="FroudeNumber">Fr.</param>
public sealed record CanalEnergy(
    double StationM, double DepthM, double SurfaceElevationM, double VelocityMPerS, double VelocityHeadM, double EnergyElevationM, double FroudeNumber);

/// <summary>
/// The energy equation from section to section of a canal: z_1 + y_1 + α_1 V_1^2/2g = z_2 + y_2 + α_2 V_2^2/2g + h, where h is
/// friction by the mean of the two friction slopes and K times the change of velocity head where the section changes.
/// </summary>
public static class CanalReach
{
    /// <summary>The method.</summary>
    public static readonly Method Method = new(
        "canal-energy-equation", "Energy equation between canal sections (standard step)",
        "z_1 + y_1 + α_1 V_1^2/2g = z_2 + y_2 + α_2 V_2^2/2g + L (S_1 + S_2)/2 + K |Δ α V^2/2g|", CanalSources.Chow, "ch. 10",
        [new InputRange("α", "kinetic energy coefficient of a canal", "1", 1, 2)]);

    /// <summary>The energy at one station.</summary>
    /// <param name="station">The station.</param>
    /// <param name="depthM">Depth y, m; above 0.</param>
    /// <param name="flowM3PerS">Flow Q, m3/s; above 0.</param>
    /// <param name="gravityMPerS2">Gravity g, m/s2.</param>
    public static CanalEnergy EnergyAt(CanalStation station, double depthM, double flowM3PerS, double gravityMPerS2)
    {
        ArgumentNullException.ThrowIfNull(station);
        var wetted = station.Section.At(depthM);
        var headM = SpecificEnergy.VelocityHeadM(wetted, flowM3PerS, gravityMPerS2, station.KineticEnergyCoefficient);
        return new CanalEnergy(
            station.StationM, depthM, station.BedElevationM + depthM, flowM3PerS / wetted.AreaM2, headM, station.BedElevationM + depthM + headM,
            SpecificEnergy.FroudeNumber(station.Section, depthM, flowM3PerS, gravityMPerS2, station.KineticEnergyCoefficient));
    }

    /// <summary>Energy lost between two stations at known depths, m: friction, and K times the change of velocity head.</summary>
    /// <param name="upstream">Upstream station.</param>
    /// <param name="upstreamDepthM">Its depth, m.</param>
    /// <param name="downstream">Downstream station.</param>
    /// <param name="downstreamDepthM">Its depth, m.</param>
    /// <param name="flowM3PerS">Flow Q, m3/s; above 0.</param>
    /// <param name="gravityMPerS2">Gravity g, m/s2.</param>
    /// <param name="changeCoefficient">K of the change of section; usually 0.1 where it narrows, 0.3 where it widens; 0 for one shape.</param>
    public static double LossM(
        CanalStation upstream, double upstreamDepthM, CanalStation downstream, double downstreamDepthM, double flowM3PerS, double gravityMPerS2, double changeCoefficient = 0)
    {
        ArgumentNullException.ThrowIfNull(upstream);
        ArgumentNullException.ThrowIfNull(downstream);
        if (!(changeCoefficient >= 0 && double.IsFinite(changeCoefficient)))
            throw new ArgumentOutOfRangeException(nameof(changeCoefficient), changeCoefficient, "The coefficient is 0 or more.");
        if (!(upstream.StationM <= downstream.StationM))
            throw new ArgumentOutOfRangeException(nameof(upstream), upstream.StationM, "The upstream station comes first along the flow.");
        var slope = (UniformFlow.FrictionSlopeRatio(upstream.Section, upstreamDepthM, flowM3PerS, upstream.ManningCoefficient)
            + UniformFlow.FrictionSlopeRatio(downstream.Section, downstreamDepthM, flowM3PerS, downstream.ManningCoefficient)) / 2;
        var changeM = SpecificEnergy.VelocityHeadM(downstream.Section.At(downstreamDepthM), flowM3PerS, gravityMPerS2, downstream.KineticEnergyCoefficient)
            - SpecificEnergy.VelocityHeadM(upstream.Section.At(upstreamDepthM), flowM3PerS, gravityMPerS2, upstream.KineticEnergyCoefficient);
        return (slope * (downstream.StationM - upstream.StationM)) + (changeCoefficient * Math.Abs(changeM));
    }

    /// <summary>
    /// Depth at the upstream station of a slow flow whose depth downstream is known, m; null when the upstream section is full
    /// below it, or when the flow passes through the critical depth between the two.
    /// </summary>
    /// <param name="upstream">Upstream station.</param>
    /// <param name="downstream">Downstream station.</param>
    /// <param name="downstreamDepthM">Depth downstream, m; critical or more.</param>
    /// <param name="flowM3PerS">Flow Q, m3/s; above 0.</param>
    /// <param name="gravityMPerS2">Gravity g, m/s2.</param>
    /// <param name="changeCoefficient">K of the change of section.</param>
    public static double? UpstreamDepthM(
        CanalStation upstream, CanalStation downstream, double downstreamDepthM, double flowM3PerS, double gravityMPerS2, double changeCoefficient = 0)
    {
        ArgumentNullException.ThrowIfNull(upstream);
        ArgumentNullException.ThrowIfNull(downstream);
        var belowM = EnergyAt(downstream, downstreamDepthM, flowM3PerS, gravityMPerS2).EnergyElevationM;
        if (SpecificEnergy.CriticalDepthM(upstream.Section, flowM3PerS, gravityMPerS2, upstream.KineticEnergyCoefficient) is not { } criticalM)
            return null;

        double Excess(double y) => EnergyAt(upstream, y, flowM3PerS, gravityMPerS2).EnergyElevationM - belowM
            - LossM(upstream, y, downstream, downstreamDepthM, flowM3PerS, gravityMPerS2, changeCoefficient);

        var lowM = criticalM;
        if (Excess(lowM) >= 0)
            return null;
        var highM = lowM;
        while (Excess(highM) < 0)
        {
            if (highM >= upstream.Section.FullDepthM)
                return null;
            lowM = highM;
            highM = Math.Min(upstream.Section.FullDepthM, highM * 1.25);
        }

        return DepthSearch.Between(lowM, highM, Excess);
    }

    /// <summary>
    /// The water line of a slow flow upstream from a depth at the end of a canal of one shape and slope: the drawdown above a
    /// free drop when it starts at the critical depth, the backwater of a check when it starts deeper.
    /// </summary>
    /// <param name="end">Station at the downstream end.</param>
    /// <param name="endDepthM">Depth there, m; critical or more.</param>
    /// <param name="bedSlopeRatio">Bed slope, fall over length; 0 or more.</param>
    /// <param name="lengthM">Length to follow upstream, m; above 0.</param>
    /// <param name="steps">Number of equal steps; 1 or more.</param>
    /// <param name="flowM3PerS">Flow Q, m3/s; above 0.</param>
    /// <param name="gravityMPerS2">Gravity g, m/s2.</param>
    /// <returns>The stations from the end upstream; it stops early where the section is full.</returns>
    public static IReadOnlyList<CanalEnergy> ProfileUpstream(
        CanalStation end, double endDepthM, double bedSlopeRatio, double lengthM, int steps, double flowM3PerS, double gravityMPerS2)
    {
        ArgumentNullException.ThrowIfNull(end);
        DepthSearch.RequirePositive(lengthM, nameof(lengthM));
        ArgumentOutOfRangeException.ThrowIfLessThan(steps, 1);
        if (!(bedSlopeRatio >= 0 && double.IsFinite(bedSlopeRatio)))
            throw new ArgumentOutOfRangeException(nameof(bedSlopeRatio), bedSlopeRatio, "The bed slope is 0 or more.");
        var line = new List<CanalEnergy>(steps + 1) { EnergyAt(end, endDepthM, flowM3PerS, gravityMPerS2) };
        var (at, depthM) = (end, endDepthM);
        for (var i = 1; i <= steps; i++)
        {
            var backM = lengthM * i / steps;
            var next = end with { StationM = end.StationM - backM, BedElevationM = end.BedElevationM + (bedSlopeRatio * backM) };
            if (UpstreamDepthM(next, at, depthM, flowM3PerS, gravityMPerS2) is not { } nextM)
                break;
            line.Add(EnergyAt(next, nextM, flowM3PerS, gravityMPerS2));
            (at, depthM) = (next, nextM);
        }

        return line;
    }
}
