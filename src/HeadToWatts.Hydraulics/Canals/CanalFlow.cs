using HeadToWatts.Basis.Sources;

namespace HeadToWatts.Hydraulics.Canals;

/// <summary>Which of two depths is the greater in uniform flow.</summary>
public enum CanalSlope
{
    /// <summary>The normal depth lies above the critical one: the flow is slow and is ruled from downstream.</summary>
    Mild,

    /// <summary>The normal depth lies below the critical one: the flow is fast and is ruled from upstream.</summary>
    Steep,

    /// <summary>The section is full before the flow is uniform.</summary>
    Full,
}

/// <summary>A canal section at one flow: its depths and energies.</summary>
/// <param name="FlowM3PerS">Flow Q, m3/s.</param>
/// <param name="NormalDepthM">Normal depth y_n, m; null when the section is full before it carries the flow.</param>
/// <param name="CriticalDepthM">Critical depth y_c, m; null when the section is full below it.</param>
/// <param name="VelocityMPerS">Mean velocity at normal depth, m/s; null without one.</param>
/// <param name="FroudeNumber">Froude number at normal depth; null without one.</param>
/// <param name="SpecificEnergyM">Specific energy at normal depth, m; null without one.</param>
/// <param name="CriticalEnergyM">Least specific energy, at the critical depth, m; null without one.</param>
/// <param name="Slope">Mild, steep or full.</param>
/// <param name="Uses">The methods used.</param>
public sealed record CanalFlowResult(
    double FlowM3PerS,
    double? NormalDepthM,
    double? CriticalDepthM,
    double? VelocityMPerS,
    double? FroudeNumber,
    double? SpecificEnergyM,
    double? CriticalEnergyM,
    CanalSlope Slope,
    IReadOnlyList<MethodUse> Uses);

/// <summary>A canal of one shape, roughness and slope.</summary>
/// <param name="Section">Shape.</param>
/// <param name="ManningCoefficient">Manning's n; above 0.</param>
/// <param name="BedSlopeRatio">Bed slope S, fall over length; above 0.</param>
/// <param name="KineticEnergyCoefficient">α; 1 or more.</param>
public sealed record CanalFlow(CanalSection Section, double ManningCoefficient, double BedSlopeRatio, double KineticEnergyCoefficient = 1)
{
    /// <summary>Depths and energies at a flow.</summary>
    /// <param name="flowM3PerS">Flow Q, m3/s; above 0.</param>
    /// <param name="gravityMPerS2">Gravity g, m/s2.</param>
    /// <exception cref="ArgumentOutOfRangeException">A figure is not above 0, or α is below 1.</exception>
    public CanalFlowResult At(double flowM3PerS, double gravityMPerS2)
    {
        var normalM = UniformFlow.NormalDepthM(Section, flowM3PerS, ManningCoefficient, BedSlopeRatio);
        var criticalM = SpecificEnergy.CriticalDepthM(Section, flowM3PerS, gravityMPerS2, KineticEnergyCoefficient);
        var slope = (normalM, criticalM) switch
        {
            (null, _) => CanalSlope.Full,
            ({ } n, { } c) when n < c => CanalSlope.Steep,
            ({ }, null) => CanalSlope.Steep,
            _ => CanalSlope.Mild,
        };
        return new CanalFlowResult(
            flowM3PerS,
            normalM,
            criticalM,
            normalM is { } y1 ? flowM3PerS / Section.At(y1).AreaM2 : null,
            normalM is { } y2 ? SpecificEnergy.FroudeNumber(Section, y2, flowM3PerS, gravityMPerS2, KineticEnergyCoefficient) : null,
            normalM is { } y3 ? SpecificEnergy.M(Section, y3, flowM3PerS, gravityMPerS2, KineticEnergyCoefficient) : null,
            criticalM is { } y4 ? SpecificEnergy.M(Section, y4, flowM3PerS, gravityMPerS2, KineticEnergyCoefficient) : null,
            slope,
            [
                UniformFlow.Method.Used(new InputSpan("n", ManningCoefficient, ManningCoefficient), new InputSpan("S", BedSlopeRatio, BedSlopeRatio)),
                SpecificEnergy.Method.Used(new InputSpan("α", KineticEnergyCoefficient, KineticEnergyCoefficient)),
                SpecificEnergy.Froude.Used(),
                SpecificEnergy.Critical.Used(),
            ]);
    }
}
