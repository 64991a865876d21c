using HeadToWatts.Basis.Sources;
using HeadToWatts.Hydraulics.Canals.Sections;

namespace HeadToWatts.Hydraulics.Canals;

/// <summary>An old basin below a canal drop, as measured.</summary>
/// <param name="WidthM">Width of its floor, m.</param>
/// <param name="LengthM">Length of its floor from the foot of the drop to the end sill, m.</param>
/// <param name="FloorElevationM">Elevation of its floor, m.</param>
public sealed record BasinMeasures(double WidthM, double LengthM, double FloorElevationM);

/// <summary>Whether a basin holds the jump of a flow.</summary>
/// <param name="EntryDepthM">Depth of the fast flow on the floor y_1, m.</param>
/// <param name="EntryFroudeNumber">Fr_1.</param>
/// <param name="NeededDepthM">Depth over the floor that the jump needs y_2, m.</param>
/// <param name="AvailableDepthM">Depth of the tailwater over the floor, m.</param>
/// <param name="NeededLengthM">Length the jump needs, m.</param>
/// <param name="AvailableLengthM">Length of the floor, m.</param>
/// <param name="Kind">Appearance of the jump.</param>
/// <param name="Uses">The methods used.</param>
public sealed record BasinCheck(
    double EntryDepthM,
    double EntryFroudeNumber,
    double NeededDepthM,
    double AvailableDepthM,
    double NeededLengthM,
    double AvailableLengthM,
    JumpKind Kind,
    IReadOnlyList<MethodUse> Uses)
{
    /// <summary>True when the tailwater is deep enough to keep the jump on the floor.</summary>
    public bool IsDeepEnough => AvailableDepthM >= NeededDepthM;

    /// <summary>True when the floor is as long as the jump.</summary>
    public bool IsLongEnough => AvailableLengthM >= NeededLengthM;

    /// <summary>True when the basin holds the jump in depth and in length.</summary>
    public bool HoldsTheJump => IsDeepEnough && IsLongEnough;
}

/// <summary>
/// Checks an old stilling basin: the fall of the energy line to the floor sets the fast flow, the tailwater must give the depth
/// conjugate to it and the floor the jump's length. A screening by a plain rectangular floor without blocks or sills; after a
/// trip of the machine the basin must take the full flow.
/// </summary>
public static class StillingBasin
{
    /// <summary>Energy of the fast flow over the floor.</summary>
    public static readonly Method Entry = new(
        "basin-entry-depth", "Fast depth at the foot of a drop", "E_0 - z = y_1 + q^2/(2 g y_1^2)", CanalSources.Chow, "ch. 15", []);

    /// <summary>Checks a basin; null when the energy line lies too low over the floor for a fast flow.</summary>
    /// <param name="basin">The basin.</param>
    /// <param name="flowM3PerS">Flow Q, m3/s; above 0.</param>
    /// <param name="energyElevationM">Elevation of the energy line above the drop, m.</param>
    /// <param name="tailwaterElevationM">Elevation of the water below the basin, m.</param>
    /// <param name="gravityMPerS2">Gravity g, m/s2.</param>
    /// <exception cref="ArgumentOutOfRangeException">A measure is not above 0, or an elevation is not a number.</exception>
    public static BasinCheck? Check(BasinMeasures basin, double flowM3PerS, double energyElevationM, double tailwaterElevationM, double gravityMPerS2)
    {
        ArgumentNullException.ThrowIfNull(basin);
        DepthSearch.RequireFlow(flowM3PerS);
        DepthSearch.RequirePositive(basin.LengthM, nameof(basin));
        RequireElevation(basin.FloorElevationM, nameof(basin));
        RequireElevation(energyElevationM, nameof(energyElevationM));
        RequireElevation(tailwaterElevationM, nameof(tailwaterElevationM));
        var floor = new RectangularSection(basin.WidthM);
        var energyM = energyElevationM - basin.FloorElevationM;
        if (energyM <= 0 || SpecificEnergy.Alternate(floor, energyM, flowM3PerS, gravityMPerS2) is not { } depths)
            return null;
        if (SpecificEnergy.FroudeNumber(floor, depths.FastM, flowM3PerS, gravityMPerS2) <= 1)
            return null;
        var jump = HydraulicJump.Of(floor, depths.FastM, flowM3PerS, gravityMPerS2)!;
        return new BasinCheck(
            jump.EntryDepthM, jump.EntryFroudeNumber, jump.ConjugateDepthM, tailwaterElevationM - basin.FloorElevationM, jump.LengthM, basin.LengthM, jump.Kind,
            [Entry.Used(), .. jump.Uses]);
    }

    private static void RequireElevation(double elevationM, string name)
    {
        if (!double.IsFinite(elevationM))
            throw new ArgumentOutOfRangeException(name, elevationM, "An elevation is a number.");
    }
}
