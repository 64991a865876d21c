namespace HeadToWatts.Hydraulics.Transients;

/// <summary>The closing time that keeps the head before the machine below a limit, found by running the transient again and again.</summary>
public static class ClosingTime
{
    private const double LongestS = 3600;
    private const double Within = 0.005;

    /// <summary>Shortest closing time, s, to half a percent; null when the limit is passed however slowly it closes (by running away, or standing still).</summary>
    /// <param name="transient">What is stopped.</param>
    /// <param name="stop">How; its closure time is the one looked for.</param>
    /// <param name="limitHeadM">Highest head allowed before the machine, m above the zero of the levels.</param>
    /// <param name="leastReaches">Reaches of the grid.</param>
    /// <param name="cancellation">Ends the search early.</param>
    /// <exception cref="OperationCanceledException">The search was ended early.</exception>
    public static double? ShortestS(TransientCase transient, StopManoeuvre stop, double limitHeadM, int leastReaches, CancellationToken cancellation = default)
    {
        ArgumentNullException.ThrowIfNull(transient);
        ArgumentNullException.ThrowIfNull(stop);
        var returnS = 2 * transient.TravelTimeS;
        double low = 0, high = returnS;
        if (Keeps(0))
            return 0;
        while (!Keeps(high))
        {
            low = high;
            high *= 2;
            if (high > LongestS)
                return null;
        }

        while (high - low > Within * high)
        {
            var middle = 0.5 * (low + high);
            if (Keeps(middle))
                high = middle;
            else
                low = middle;
        }

        return high;

        bool Keeps(double timeS) => TransientRun.Of(transient, stop with { ClosureTimeS = timeS }, leastReaches, cancellation).HighestMachineHeadM <= limitHeadM;
    }
}
