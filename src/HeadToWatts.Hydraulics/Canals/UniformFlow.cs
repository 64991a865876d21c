using HeadToWatts.Basis.Sources;
using HeadToWatts.Hydraulics.Canals.Sections;

namespace HeadToWatts.Hydraulics.Canals;

/// <summary>Uniform flow by Manning: Q = (1/n) A R^(2/3) S^(1/2).</summary>
public static class UniformFlow
{
    /// <summary>The method.</summary>
    public static readonly Method Method = new(
        "manning-open-channel", "Manning, open channel", "Q = (1/n) A R^{2/3} S^{1/2}", CanalSources.Manning, "",
        [
            new InputRange("n", "Manning coefficient of a canal", "1", 0.009, 0.15),
            new InputRange("S", "bed slope", "1", 1e-6, 0.1),
        ]);

    /// <summary>Flow at a depth, m3/s.</summary>
    /// <param name="section">Shape of the canal.</param>
    /// <param name="depthM">Depth y, m.</param>
    /// <param name="manningCoefficient">Manning's n; above 0.</param>
    /// <param name="bedSlopeRatio">Bed slope S, fall over length; above 0.</param>
    /// <exception cref="ArgumentOutOfRangeException">The depth does not fit the section, or a figure is not above 0.</exception>
    public static double FlowM3PerS(CanalSection section, double depthM, double manningCoefficient, double bedSlopeRatio)
    {
        ArgumentNullException.ThrowIfNull(section);
        DepthSearch.RequirePositive(manningCoefficient, nameof(manningCoefficient));
        DepthSearch.RequirePositive(bedSlopeRatio, nameof(bedSlopeRatio));
        return ConveyanceFactor(section.At(depthM)) / manningCoefficient * Math.Sqrt(bedSlopeRatio);
    }

    /// <summary>Slope of the energy line S_f that friction needs at a depth and flow, fall over length.</summary>
    /// <param name="section">Shape of the canal.</param>
    /// <param name="depthM">Depth y, m; above 0.</param>
    /// <param name="flowM3PerS">Flow Q, m3/s; 0 or more.</param>
    /// <param name="manningCoefficient">Manning's n; above 0.</param>
    public static double FrictionSlopeRatio(CanalSection section, double depthM, double flowM3PerS, double manningCoefficient)
    {
        ArgumentNullException.ThrowIfNull(section);
        DepthSearch.RequirePositive(depthM, nameof(depthM));
        DepthSearch.RequirePositive(manningCoefficient, nameof(manningCoefficient));
        if (!(flowM3PerS >= 0 && double.IsFinite(flowM3PerS)))
            throw new ArgumentOutOfRangeException(nameof(flowM3PerS), flowM3PerS, "A flow is 0 or more.");
        var root = flowM3PerS * manningCoefficient / ConveyanceFactor(section.At(depthM));
        return root * root;
    }

    /// <summary>
    /// Normal depth y_n, m. In a pipe the lower of the two depths that carry a flow near the pipe's greatest, in a surveyed
    /// section the lowest. Null when the section is full before it carries the flow.
    /// </summary>
    /// <param name="section">Shape of the canal.</param>
    /// <param name="flowM3PerS">Flow Q, m3/s; above 0.</param>
    /// <param name="manningCoefficient">Manning's n; above 0.</param>
    /// <param name="bedSlopeRatio">Bed slope S, fall over length; above 0.</param>
    /// <exception cref="ArgumentOutOfRangeException">A figure is not above 0.</exception>
    public static double? NormalDepthM(CanalSection section, double flowM3PerS, double manningCoefficient, double bedSlopeRatio)
    {
        ArgumentNullException.ThrowIfNull(section);
        var wanted = FactorOf(flowM3PerS, manningCoefficient, bedSlopeRatio);
        return DepthSearch.Lowest(section, y => ConveyanceFactor(section.At(y)) - wanted);
    }

    /// <summary>
    /// The upper of the two depths at which a pipe carries a flow, m; null below the flow of the full pipe, where there is one
    /// depth only, and above the pipe's greatest flow. Flow at this depth is not steady: the pipe fills at a small cause.
    /// </summary>
    /// <param name="section">The pipe.</param>
    /// <param name="flowM3PerS">Flow Q, m3/s; above 0.</param>
    /// <param name="manningCoefficient">Manning's n; above 0.</param>
    /// <param name="bedSlopeRatio">Bed slope S, fall over length; above 0.</param>
    public static double? UpperNormalDepthM(CircularSection section, double flowM3PerS, double manningCoefficient, double bedSlopeRatio)
    {
        ArgumentNullException.ThrowIfNull(section);
        var wanted = FactorOf(flowM3PerS, manningCoefficient, bedSlopeRatio);
        var fullM = section.DiameterM;
        var greatestM = DepthOfGreatestFlowM(section);
        return wanted >= ConveyanceFactor(section.At(fullM)) && wanted <= ConveyanceFactor(section.At(greatestM))
            ? DepthSearch.Between(greatestM, fullM, y => wanted - ConveyanceFactor(section.At(y)))
            : null;
    }

    /// <summary>Depth at which a part-full pipe carries most, m; 0.938 of the diameter.</summary>
    /// <param name="section">The pipe.</param>
    public static double DepthOfGreatestFlowM(CircularSection section)
    {
        ArgumentNullException.ThrowIfNull(section);
        // The factor rises and then falls between these; a golden-section search is exact to half the digits, ample for a flat top.
        var (lowM, highM) = (0.9 * section.DiameterM, 0.98 * section.DiameterM);
        var golden = (Math.Sqrt(5) - 1) / 2;
        for (var i = 0; i < 60; i++)
        {
            var aM = highM - (golden * (highM - lowM));
            var bM = lowM + (golden * (highM - lowM));
            if (ConveyanceFactor(section.At(aM)) < ConveyanceFactor(section.At(bM)))
                lowM = aM;
            else
                highM = bM;
        }

        return (lowM + highM) / 2;
    }

    // A R^(2/3): what the section gives; the rest of the formula does not depend on depth.
    private static double ConveyanceFactor(in WettedSection wetted) => wetted.AreaM2 * Math.Pow(wetted.HydraulicRadiusM, 2.0 / 3);

    private static double FactorOf(double flowM3PerS, double manningCoefficient, double bedSlopeRatio)
    {
        DepthSearch.RequireFlow(flowM3PerS);
        DepthSearch.RequirePositive(manningCoefficient, nameof(manningCoefficient));
        DepthSearch.RequirePositive(bedSlopeRatio, nameof(bedSlopeRatio));
        return flowM3PerS * manningCoefficient / Math.Sqrt(bedSlopeRatio);
    }
}
