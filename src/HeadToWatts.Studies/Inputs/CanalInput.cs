using HeadToWatts.Hydraulics.Canals;
using HeadToWatts.Hydraulics.Levels;

namespace HeadToWatts.Studies.Inputs;

/// <summary>The canal on one side of a drop.</summary>
/// <param name="Canal">Shape, roughness, slope and α.</param>
/// <param name="BedElevationM">Elevation of the bed at the drop, m.</param>
/// <param name="BankElevationM">Elevation of the lower bank there, m; null when not given.</param>
public sealed record CanalSide(CanalFlow Canal, double BedElevationM, double? BankElevationM)
{
    private const int Points = 60;
    private const double DeepestM = 8;

    /// <summary>Depth up to which the side is looked at, m: to the bank, or to where the section is full.</summary>
    public double FullDepthM => Math.Min(BankElevationM is { } bank ? bank - BedElevationM : DeepestM, double.IsInfinity(Canal.Section.FullDepthM) ? DeepestM : 0.93 * Canal.Section.FullDepthM);

    /// <summary>Flow of the side when it is full, m3/s.</summary>
    public double FullFlowM3PerS => UniformFlow.FlowM3PerS(Canal.Section, FullDepthM, Canal.ManningCoefficient, Canal.BedSlopeRatio);

    /// <summary>Water level at normal depth as a rating: sixty depths from the bed to the full one, straight between them.</summary>
    public RatedLevel NormalLevels() => new([.. Enumerable.Range(0, Points + 1).Select(i =>
    {
        var depthM = FullDepthM * i / Points;
        return new LevelPoint(i == 0 ? 0 : UniformFlow.FlowM3PerS(Canal.Section, depthM, Canal.ManningCoefficient, Canal.BedSlopeRatio), BedElevationM + depthM);
    })]);
}

/// <summary>A canal with a drop: the sections above and below it, the basin, and who else uses its fall.</summary>
/// <param name="Upstream">Above the drop.</param>
/// <param name="Downstream">Below it.</param>
/// <param name="Basin">The stilling basin; null when none is given.</param>
/// <param name="SetsHeadwater">True when the headwater follows from the canal's normal depth.</param>
/// <param name="SetsTailwater">True when the tailwater follows from the canal's normal depth.</param>
/// <param name="Others">Other drops used on the same canal.</param>
/// <param name="Bypass">What passes the full flow when the plant stops, in the author's words; empty when nothing is said.</param>
public sealed record CanalInput(CanalSide Upstream, CanalSide Downstream, BasinMeasures? Basin, bool SetsHeadwater, bool SetsTailwater, IReadOnlyList<CanalDrop> Others, string Bypass);
