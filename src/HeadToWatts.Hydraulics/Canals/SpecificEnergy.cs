using HeadToWatts.Basis.Sources;

namespace HeadToWatts.Hydraulics.Canals;

/// <summary>Specific energy, Froude number and critical depth of a canal section.</summary>
public static class SpecificEnergy
{
    /// <summary>Specific energy.</summary>
    public static readonly Method Method = new(
        "specific-energy", "Specific energy", "E = y + α V^2/2g", CanalSources.Bakhmeteff, "",
        [new InputRange("α", "kinetic energy coefficient of a canal", "1", 1, 2)]);

    /// <summary>Froude number.</summary>
    public static readonly Method Froude = new(
        "froude-number", "Froude number with the hydraulic depth", "Fr = V / (g D/α)^{1/2}, D = A/T", CanalSources.Chow, "ch. 3", []);

    /// <summary>Critical depth.</summary>
    public static readonly Method Critical = new(
        "critical-depth", "Critical depth", "α Q^2 T / (g A^3) = 1", CanalSources.Chow, "ch. 4", []);

    /// <summary>Velocity head α V^2/2g, m.</summary>
    /// <param name="wetted">The water in the section.</param>
    /// <param name="flowM3PerS">Flow Q, m3/s.</param>
    /// <param name="gravityMPerS2">Gravity g, m/s2.</param>
    /// <param name="kineticEnergyCoefficient">α; 1 or more.</param>
    public static double VelocityHeadM(in WettedSection wetted, double flowM3PerS, double gravityMPerS2, double kineticEnergyCoefficient = 1)
    {
        RequireCoefficient(kineticEnergyCoefficient);
        DepthSearch.RequirePositive(gravityMPerS2, nameof(gravityMPerS2));
        var velocityMPerS = flowM3PerS / wetted.AreaM2;
        return kineticEnergyCoefficient * velocityMPerS * velocityMPerS / (2 * gravityMPerS2);
    }

    /// <summary>Specific energy E above the bed, m.</summary>
    /// <param name="section">Shape of the canal.</param>
    /// <param name="depthM">Depth y, m; above 0.</param>
    /// <param name="flowM3PerS">Flow Q, m3/s.</param>
    /// <param name="gravityMPerS2">Gravity g, m/s2.</param>
    /// <param name="kineticEnergyCoefficient">α; 1 or more.</param>
    public static double M(CanalSection section, double depthM, double flowM3PerS, double gravityMPerS2, double kineticEnergyCoefficient = 1)
    {
        ArgumentNullException.ThrowIfNull(section);
        DepthSearch.RequirePositive(depthM, nameof(depthM));
        return depthM + VelocityHeadM(section.At(depthM), flowM3PerS, gravityMPerS2, kineticEnergyCoefficient);
    }

    /// <summary>Froude number Fr; below 1 the flow is slow (subcritical), above 1 fast.</summary>
    /// <param name="section">Shape of the canal.</param>
    /// <param name="depthM">Depth y, m; above 0.</param>
    /// <param name="flowM3PerS">Flow Q, m3/s.</param>
    /// <param name="gravityMPerS2">Gravity g, m/s2.</param>
    /// <param name="kineticEnergyCoefficient">α; 1 or more.</param>
    public static double FroudeNumber(CanalSection section, double depthM, double flowM3PerS, double gravityMPerS2, double kineticEnergyCoefficient = 1)
    {
        ArgumentNullException.ThrowIfNull(section);
        DepthSearch.RequirePositive(depthM, nameof(depthM));
        var wetted = section.At(depthM);
        return Math.Sqrt(2 * VelocityHeadM(wetted, flowM3PerS, gravityMPerS2, kineticEnergyCoefficient) / wetted.HydraulicDepthM);
    }

    /// <summary>Critical depth y_c, m, the lowest where a surveyed section has several; null when the section is full below it.</summary>
    /// <param name="section">Shape of the canal.</param>
    /// <param name="flowM3PerS">Flow Q, m3/s; above 0.</param>
    /// <param name="gravityMPerS2">Gravity g, m/s2.</param>
    /// <param name="kineticEnergyCoefficient">α; 1 or more.</param>
    public static double? CriticalDepthM(CanalSection section, double flowM3PerS, double gravityMPerS2, double kineticEnergyCoefficient = 1)
    {
        ArgumentNullException.ThrowIfNull(section);
        DepthSearch.RequireFlow(flowM3PerS);
        DepthSearch.RequirePositive(gravityMPerS2, nameof(gravityMPerS2));
        RequireCoefficient(kineticEnergyCoefficient);
        var wanted = kineticEnergyCoefficient * flowM3PerS * flowM3PerS / gravityMPerS2;
        return DepthSearch.Lowest(section, y =>
        {
            var wetted = section.At(y);
            return (wetted.AreaM2 * wetted.AreaM2 * wetted.AreaM2) - (wanted * wetted.TopWidthM);
        });
    }

    /// <summary>Flow that is critical at a depth, m3/s.</summary>
    /// <param name="section">Shape of the canal.</param>
    /// <param name="depthM">Depth y_c, m; above 0.</param>
    /// <param name="gravityMPerS2">Gravity g, m/s2.</param>
    public static double CriticalFlowM3PerS(CanalSection section, double depthM, double gravityMPerS2)
    {
        ArgumentNullException.ThrowIfNull(section);
        DepthSearch.RequirePositive(depthM, nameof(depthM));
        DepthSearch.RequirePositive(gravityMPerS2, nameof(gravityMPerS2));
        var wetted = section.At(depthM);
        return wetted.AreaM2 * Math.Sqrt(gravityMPerS2 * wetted.HydraulicDepthM);
    }

    /// <summary>The two depths at which a flow has a specific energy: the fast one and the slow one, m; null when the energy is less than the critical one.</summary>
    /// <param name="section">Shape of the canal.</param>
    /// <param name="specificEnergyM">Specific energy E, m; above 0.</param>
    /// <param name="flowM3PerS">Flow Q, m3/s; above 0.</param>
    /// <param name="gravityMPerS2">Gravity g, m/s2.</param>
    /// <param name="kineticEnergyCoefficient">α; 1 or more.</param>
    public static AlternateDepths? Alternate(CanalSection section, double specificEnergyM, double flowM3PerS, double gravityMPerS2, double kineticEnergyCoefficient = 1)
    {
        DepthSearch.RequirePositive(specificEnergyM, nameof(specificEnergyM));
        if (CriticalDepthM(section, flowM3PerS, gravityMPerS2, kineticEnergyCoefficient) is not { } criticalM)
            return null;
        double Excess(double y) => M(section, y, flowM3PerS, gravityMPerS2, kineticEnergyCoefficient) - specificEnergyM;
        if (Excess(criticalM) > 0)
            return null;
        // As the depth goes to 0 the energy grows without end; above the critical depth it passes E before y = E.
        var fastM = DepthSearch.Between(0, criticalM, y => -Excess(y));
        var topM = Math.Min(section.FullDepthM, specificEnergyM);
        double? slowM = Excess(topM) >= 0 ? DepthSearch.Between(criticalM, topM, Excess) : null;
        return new AlternateDepths(fastM, slowM);
    }

    internal static void RequireCoefficient(double kineticEnergyCoefficient)
    {
        if (!(kineticEnergyCoefficient >= 1 && double.IsFinite(kineticEnergyCoefficient)))
            throw new ArgumentOutOfRangeException(nameof(kineticEnergyCoefficient), kineticEnergyCoefficient, "The kinetic energy coefficient is 1 or more.");
    }
}

/// <summary>The two depths of one specific energy.</summary>
/// <param name="FastM">The depth below the critical one, m.</param>
/// <param name="SlowM">The depth above the critical one, m; null when it lies above the section.</param>
public readonly record struct AlternateDepths(double FastM, double? SlowM);
