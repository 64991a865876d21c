using HeadToWatts.Basis.Sources;
using HeadToWatts.Hydraulics.Canals.Sections;

namespace HeadToWatts.Hydraulics.Canals;

/// <summary>The depth on the other side of a hydraulic jump on a level bed.</summary>
public static class ConjugateDepth
{
    /// <summary>Closed form for a rectangular canal.</summary>
    public static readonly Method Rectangular = new(
        "conjugate-depth-rectangular", "Conjugate depth, rectangular canal", "y_2/y_1 = ((1 + 8 Fr_1^2)^{1/2} - 1)/2", CanalSources.Belanger, "", []);

    /// <summary>Equal momentum in any section.</summary>
    public static readonly Method Momentum = new(
        "conjugate-depth-momentum", "Conjugate depth by equal momentum", "Q^2/(g A) + A y_{cg} = constant", CanalSources.Chow, "ch. 3", []);

    /// <summary>Momentum of the flow over its specific weight, m3: Q^2/(g A) + A y_cg.</summary>
    /// <param name="section">Shape of the canal.</param>
    /// <param name="depthM">Depth y, m; above 0.</param>
    /// <param name="flowM3PerS">Flow Q, m3/s.</param>
    /// <param name="gravityMPerS2">Gravity g, m/s2.</param>
    public static double MomentumM3(CanalSection section, double depthM, double flowM3PerS, double gravityMPerS2)
    {
        ArgumentNullException.ThrowIfNull(section);
        DepthSearch.RequirePositive(depthM, nameof(depthM));
        DepthSearch.RequirePositive(gravityMPerS2, nameof(gravityMPerS2));
        var wetted = section.At(depthM);
        return (flowM3PerS * flowM3PerS / (gravityMPerS2 * wetted.AreaM2)) + wetted.FirstMomentM3;
    }

    /// <summary>
    /// The conjugate depth, m: the slow one of a fast depth or the fast one of a slow depth. Null when the section is full below
    /// it, or when it has no critical depth at this flow. A critical depth is its own conjugate.
    /// </summary>
    /// <param name="section">Shape of the canal.</param>
    /// <param name="depthM">Depth on one side, m; above 0.</param>
    /// <param name="flowM3PerS">Flow Q, m3/s; above 0.</param>
    /// <param name="gravityMPerS2">Gravity g, m/s2.</param>
    /// <exception cref="ArgumentOutOfRangeException">A figure is not above 0, or the depth does not fit the section.</exception>
    public static double? M(CanalSection section, double depthM, double flowM3PerS, double gravityMPerS2)
    {
        ArgumentNullException.ThrowIfNull(section);
        DepthSearch.RequireFlow(flowM3PerS);
        if (section is RectangularSection rectangular)
            return RectangularM(depthM, flowM3PerS / rectangular.WidthM, gravityMPerS2);
        var momentumM3 = MomentumM3(section, depthM, flowM3PerS, gravityMPerS2);
        if (SpecificEnergy.CriticalDepthM(section, flowM3PerS, gravityMPerS2) is not { } criticalM)
            return null;
        double Excess(double y) => MomentumM3(section, y, flowM3PerS, gravityMPerS2) - momentumM3;
        if (depthM > criticalM)
            return DepthSearch.Between(0, criticalM, y => -Excess(y));
        if (depthM == criticalM)
            return criticalM;

        var aboveM = criticalM;
        while (Excess(aboveM) < 0)
        {
            if (aboveM >= section.FullDepthM)
                return null;
            aboveM = Math.Min(section.FullDepthM, aboveM * 2);
        }

        return DepthSearch.Between(criticalM, aboveM, Excess);
    }

    /// <summary>The conjugate depth in a rectangular canal, m.</summary>
    /// <param name="depthM">Depth on one side, m; above 0.</param>
    /// <param name="unitFlowM2PerS">Flow per metre of width q, m2/s; above 0.</param>
    /// <param name="gravityMPerS2">Gravity g, m/s2.</param>
    public static double RectangularM(double depthM, double unitFlowM2PerS, double gravityMPerS2)
    {
        DepthSearch.RequirePositive(depthM, nameof(depthM));
        DepthSearch.RequirePositive(unitFlowM2PerS, nameof(unitFlowM2PerS));
        DepthSearch.RequirePositive(gravityMPerS2, nameof(gravityMPerS2));
        var froudeSquared = unitFlowM2PerS * unitFlowM2PerS / (gravityMPerS2 * depthM * depthM * depthM);
        // (sqrt(1 + x) - 1)/2 written so that a deep slow flow loses no digits.
        return depthM * 4 * froudeSquared / (Math.Sqrt(1 + (8 * froudeSquared)) + 1);
    }
}
