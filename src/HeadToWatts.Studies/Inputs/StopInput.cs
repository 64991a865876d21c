using HeadToWatts.Hydraulics.Surge;
using HeadToWatts.Hydraulics.Transients;

namespace HeadToWatts.Studies.Inputs;

/// <summary>How the plant stops when the unit trips.</summary>
/// <param name="ClosureTimeS">Time from full opening to closed, s; 0 for an instant stop.</param>
/// <param name="Law">What falls evenly while it closes.</param>
/// <param name="RunawayFlowRatio">Flow passed at runaway over the flow at full load; null for what is usual of the type.</param>
/// <param name="RunawayTimeS">Time from the trip to runaway speed, s; null for the usual.</param>
/// <param name="Restraint">How the pipes are held lengthwise.</param>
/// <param name="PressureLimitPa">Highest pressure allowed before the machine, Pa gauge; null for nine tenths of the last pipe's rating.</param>
public sealed record StopInput(
    double ClosureTimeS,
    StopLaw Law = StopLaw.OpeningFallsEvenly,
    double? RunawayFlowRatio = null,
    double? RunawayTimeS = null,
    PipeRestraint Restraint = PipeRestraint.AnchoredThroughout,
    double? PressureLimitPa = null);
