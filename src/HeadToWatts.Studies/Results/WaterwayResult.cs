using HeadToWatts.Hydraulics.Surge;
using HeadToWatts.Hydraulics.Waterways;

namespace HeadToWatts.Studies.Results;

/// <summary>What the study found of the waterway at the design flow.</summary>
/// <param name="Waterway">The waterway, for other flows.</param>
/// <param name="AtDesign">Losses by element and fitting.</param>
/// <param name="LossShareOfGrossHead">Head lost over gross head.</param>
/// <param name="HighestVelocityMPerS">Highest velocity of any element, m/s; zero without elements.</param>
/// <param name="VelocityLimitMPerS">The Bureau of Reclamation's limit for this head, m/s.</param>
/// <param name="GradeLines">Energy along the waterway.</param>
/// <param name="Surge">Screening of pressures with a sudden stop; null without elements.</param>
public sealed record WaterwayResult(
    Waterway Waterway,
    WaterwayLosses AtDesign,
    double LossShareOfGrossHead,
    double HighestVelocityMPerS,
    double VelocityLimitMPerS,
    IReadOnlyList<EnergySection> GradeLines,
    SurgeResult? Surge)
{
    /// <summary>What happens in the pipes when the unit trips; null when no stop is given or nothing flows.</summary>
    public StopResult? Stop { get; init; }
}
