using HeadToWatts.Basis.Sources;

namespace HeadToWatts.Hydraulics.Surge;

/// <summary>Speed of a pressure wave in a full elastic pipe: a = (K/ρ / (1 + c_1 K D/(E e)))^(1/2).</summary>
public static class WaveSpeed
{
    /// <summary>The method.</summary>
    public static readonly Method Method = new(
        "pressure-wave-speed", "Pressure-wave speed", "a = (K/ρ)^{1/2} / (1 + c_1 K D/(E e))^{1/2}", SurgeSources.Korteweg, "",
        [new InputRange("D/e", "diameter over wall thickness", "1", 8, 400)]);

    /// <summary>The factor c_1.</summary>
    /// <param name="restraint">How the pipe is held.</param>
    /// <param name="poissonRatio">Poisson's ratio of the wall; 0 to 0.5.</param>
    /// <exception cref="ArgumentOutOfRangeException">Poisson's ratio outside 0 to 0.5 or not a number, or an unknown restraint.</exception>
    public static double RestraintCoefficient(PipeRestraint restraint, double poissonRatio)
    {
        if (poissonRatio is not (>= 0 and <= 0.5))
            throw new ArgumentOutOfRangeException(nameof(poissonRatio), poissonRatio, "Poisson's ratio lies between 0 and 0.5.");
        return restraint switch
        {
            PipeRestraint.ExpansionJoints => 1,
            PipeRestraint.AnchoredUpstream => 1 - (poissonRatio / 2),
            PipeRestraint.AnchoredThroughout => 1 - (poissonRatio * poissonRatio),
            _ => throw new ArgumentOutOfRangeException(nameof(restraint), restraint, "Unknown restraint."),
        };
    }

    /// <summary>Wave speed a, m/s.</summary>
    /// <param name="bulkModulusPa">Bulk modulus of the water K, Pa.</param>
    /// <param name="densityKgPerM3">Density of the water ρ, kg/m3.</param>
    /// <param name="elasticModulusPa">Young's modulus of the wall E, Pa; positive infinity for a rigid pipe.</param>
    /// <param name="diameterThicknessRatio">Diameter over wall thickness D/e.</param>
    /// <param name="restraintCoefficient">c_1.</param>
    /// <exception cref="ArgumentOutOfRangeException">A figure is not above 0 or not a number.</exception>
    public static double MPerS(double bulkModulusPa, double densityKgPerM3, double elasticModulusPa, double diameterThicknessRatio, double restraintCoefficient)
    {
        RequirePositive(bulkModulusPa, nameof(bulkModulusPa));
        RequirePositive(densityKgPerM3, nameof(densityKgPerM3));
        RequirePositive(elasticModulusPa, nameof(elasticModulusPa));
        RequirePositive(diameterThicknessRatio, nameof(diameterThicknessRatio));
        RequirePositive(restraintCoefficient, nameof(restraintCoefficient));
        return Math.Sqrt(bulkModulusPa / densityKgPerM3 / (1 + (restraintCoefficient * bulkModulusPa * diameterThicknessRatio / elasticModulusPa)));
    }

    private static void RequirePositive(double figure, string name)
    {
        if (!(figure > 0))
            throw new ArgumentOutOfRangeException(name, figure, "The figure must be above 0.");
    }
}
