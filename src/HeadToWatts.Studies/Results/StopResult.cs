using HeadToWatts.Basis.Sources;
using HeadToWatts.Hydraulics.Transients;
using HeadToWatts.Hydraulics.Waterways;
using HeadToWatts.Studies.Inputs;

namespace HeadToWatts.Studies.Results;

/// <summary>The extremes of one pipe while the plant stops.</summary>
/// <param name="Element">The pipe.</param>
/// <param name="WaveSpeedMPerS">Wave speed, m/s.</param>
/// <param name="StaticPressurePa">Highest pressure of standing water, Pa gauge.</param>
/// <param name="HighestPressurePa">Highest pressure, Pa gauge.</param>
/// <param name="LowestPressurePa">Lowest pressure, Pa gauge; negative below the air's.</param>
public sealed record StopInPipe(PipeElement Element, double WaveSpeedMPerS, double StaticPressurePa, double HighestPressurePa, double LowestPressurePa)
{
    /// <summary>Highest pressure over the pipe's rating; null when no rating was given.</summary>
    public double? RatingRatio => Element.PressureRatingPa is { } ratingPa ? HighestPressurePa / ratingPa : null;
}

/// <summary>A limit of the pressure before the machine, and the closing times that formulas give for it.</summary>
/// <param name="LimitPa">The limit, Pa gauge.</param>
/// <param name="IsGiven">True when it was given; else it is nine tenths of the last pipe's rating.</param>
/// <param name="LimitHeadM">The same as piezometric head, m above the zero of the levels.</param>
/// <param name="AllowedRiseM">Rise over standing water it allows, m; 0 or less when standing water alone reaches it.</param>
/// <param name="MichaudTimeS">Closing time when the flow falls evenly, s; null when there is no rise allowed.</param>
/// <param name="AllieviTimeS">Closing time when the opening falls evenly and slowly, s; null when there is no rise allowed.</param>
public sealed record StopLimit(double LimitPa, bool IsGiven, double LimitHeadM, double AllowedRiseM, double? MichaudTimeS, double? AllieviTimeS);

/// <summary>What happens in the pipes when the unit trips: a screening, not a transient study.</summary>
/// <param name="Input">The stop as given.</param>
/// <param name="Run">The transient.</param>
/// <param name="Pipes">The extremes of every pipe.</param>
/// <param name="Limit">Limit at the machine; null when none was given and the last pipe has no rating.</param>
/// <param name="RunawayIsAssumed">True when the flow at runaway is the type's usual one, from memory.</param>
/// <param name="Uses">The methods used.</param>
public sealed record StopResult(StopInput Input, TransientResult Run, IReadOnlyList<StopInPipe> Pipes, StopLimit? Limit, bool RunawayIsAssumed, IReadOnlyList<MethodUse> Uses)
{
    /// <summary>Time a wave needs to the intake and back, s.</summary>
    public double ReturnTimeS => 2 * Run.Case.TravelTimeS;
}
