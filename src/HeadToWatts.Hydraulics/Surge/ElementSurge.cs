using HeadToWatts.Basis.Sources;
using HeadToWatts.Hydraulics.Waterways;

namespace HeadToWatts.Hydraulics.Surge;

/// <summary>The screening figures of one pipe when its flow is stopped.</summary>
/// <param name="Element">The pipe.</param>
/// <param name="VelocityMPerS">Velocity stopped, m/s.</param>
/// <param name="WaveSpeedMPerS">Wave speed a, m/s.</param>
/// <param name="DiameterThicknessRatio">Diameter over wall thickness D/e used.</param>
/// <param name="ThicknessAssumed">True when D/e is the material's typical one, because no wall thickness was given.</param>
/// <param name="RapidRiseM">Head rise of an instant stop, m.</param>
/// <param name="RiseM">Head rise at the stated closure time at the pipe's downstream end, m; the same as the rapid rise when none is stated.</param>
/// <param name="StaticHeadM">Highest head of standing water in the pipe, m: headwater less the lower of its two ends.</param>
/// <param name="StaticPressurePa">The same as pressure, Pa gauge.</param>
/// <param name="TotalPressurePa">Standing water and head rise together, Pa gauge.</param>
public sealed record ElementSurge(
    PipeElement Element,
    double VelocityMPerS,
    double WaveSpeedMPerS,
    double DiameterThicknessRatio,
    bool ThicknessAssumed,
    double RapidRiseM,
    double RiseM,
    double StaticHeadM,
    double StaticPressurePa,
    double TotalPressurePa)
{
    /// <summary>Standing water and head rise together, m.</summary>
    public double TotalHeadM => StaticHeadM + RiseM;

    /// <summary>Total pressure over the pipe's rating; null when no rating was given.</summary>
    public double? RatingRatio => Element.PressureRatingPa is { } ratingPa ? TotalPressurePa / ratingPa : null;
}

/// <summary>Surge screening of a waterway: figures to compare with the pipe's rating, not a transient study.</summary>
/// <param name="FlowM3PerS">Flow stopped, m3/s.</param>
/// <param name="ClosureTimeS">Closure time, s; null when the stop is taken as instant.</param>
/// <param name="CriticalTimeS">Time a pressure wave needs to the intake and back, s: Σ 2 L/a.</param>
/// <param name="Elements">The pipes in the order of the flow.</param>
/// <param name="Uses">The methods used.</param>
public sealed record SurgeResult(double FlowM3PerS, double? ClosureTimeS, double CriticalTimeS, IReadOnlyList<ElementSurge> Elements, IReadOnlyList<MethodUse> Uses);
