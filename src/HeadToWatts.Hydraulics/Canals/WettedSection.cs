namespace HeadToWatts.Hydraulics.Canals;

/// <summary>The water in a canal section at one depth.</summary>
/// <param name="DepthM">Depth above the lowest point y, m.</param>
/// <param name="AreaM2">Area A, m2.</param>
/// <param name="WettedPerimeterM">Wetted perimeter P, m.</param>
/// <param name="TopWidthM">Width of the surface T, m.</param>
/// <param name="FirstMomentM3">First moment of the area about the surface, A times the depth of its centroid, m3.</param>
public readonly record struct WettedSection(double DepthM, double AreaM2, double WettedPerimeterM, double TopWidthM, double FirstMomentM3)
{
    /// <summary>Hydraulic radius R = A/P, m; 0 when dry.</summary>
    public double HydraulicRadiusM => WettedPerimeterM > 0 ? AreaM2 / WettedPerimeterM : 0;

    /// <summary>Hydraulic depth D = A/T, m: the depth of the Froude number; 0 when dry, infinite in a full pipe.</summary>
    public double HydraulicDepthM => AreaM2 > 0 ? AreaM2 / TopWidthM : 0;
}
