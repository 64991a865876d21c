namespace HeadToWatts.Hydraulics.Transients;

/// <summary>How the flow is stopped: the closing, and what the machine itself holds back while it runs away.</summary>
/// <param name="ClosureTimeS">Time from full opening to closed, s; 0 for an instant stop.</param>
/// <param name="Law">What falls evenly.</param>
/// <param name="FinalOpeningRatio">Opening that remains, over full opening; 0 when it closes wholly.</param>
/// <param name="RunawayFlowRatio">Flow the machine passes at runaway over its flow at full load, at the same head and opening; 1 where the speed does not matter.</param>
/// <param name="RunawayTimeS">Time from the trip to runaway speed, s.</param>
public sealed record StopManoeuvre(
    double ClosureTimeS, StopLaw Law = StopLaw.OpeningFallsEvenly, double FinalOpeningRatio = 0, double RunawayFlowRatio = 1, double RunawayTimeS = 0)
{
    /// <summary>Time until nothing changes at the machine any more, s.</summary>
    public double EndS => RunawayFlowRatio == 1 ? ClosureTimeS : Math.Max(ClosureTimeS, RunawayTimeS);

    /// <summary>Passage at a time over that of full load: opening times what runaway lets pass.</summary>
    /// <param name="timeS">Time since the trip, s.</param>
    public double PassageRatio(double timeS)
    {
        if (timeS <= 0)
            return 1;
        var opening = timeS >= ClosureTimeS ? FinalOpeningRatio : 1 - ((1 - FinalOpeningRatio) * timeS / ClosureTimeS);
        var runaway = timeS >= RunawayTimeS ? RunawayFlowRatio : 1 + ((RunawayFlowRatio - 1) * timeS / RunawayTimeS);
        return opening * runaway;
    }

    internal void Check()
    {
        if (ClosureTimeS is not (>= 0 and < double.PositiveInfinity) || RunawayTimeS is not (>= 0 and < double.PositiveInfinity))
            throw new ArgumentOutOfRangeException(nameof(ClosureTimeS), "Times must be 0 or more.");
        if (FinalOpeningRatio is not (>= 0 and <= 1))
            throw new ArgumentOutOfRangeException(nameof(FinalOpeningRatio), FinalOpeningRatio, "The opening that remains lies between 0 and 1.");
        if (RunawayFlowRatio is not (> 0 and <= 3))
            throw new ArgumentOutOfRangeException(nameof(RunawayFlowRatio), RunawayFlowRatio, "The flow at runaway lies between 0 and 3 times the flow at full load.");
    }
}
