namespace HeadToWatts.Hydraulics.Transients;

/// <summary>Runs a transient on a grid and over a time that suit it, within a bounded amount of work.</summary>
public static class TransientRun
{
    /// <summary>Reaches of the grid as a rule.</summary>
    public const int UsualReaches = 80;

    private const int FewestReaches = 12;
    private const double MostPoints = 400_000;
    private const double ReturnsAfterwards = 4;

    /// <summary>
    /// Runs it until the wave has gone to the intake and back four times after nothing changes any more. A stop that is very slow beside the
    /// wave takes a coarser grid, which it bears; the number of points reckoned stays bounded.
    /// </summary>
    /// <param name="transient">What is stopped.</param>
    /// <param name="stop">How.</param>
    /// <param name="reaches">Reaches wanted.</param>
    /// <param name="cancellation">Ends the run early.</param>
    /// <exception cref="OperationCanceledException">The run was ended early.</exception>
    public static TransientResult Of(TransientCase transient, StopManoeuvre stop, int reaches = UsualReaches, CancellationToken cancellation = default)
    {
        ArgumentNullException.ThrowIfNull(transient);
        ArgumentNullException.ThrowIfNull(stop);
        var durationS = DurationS(transient, stop);
        var affordable = Math.Sqrt(MostPoints * transient.TravelTimeS / durationS);
        var grid = TransientGrid.For(transient.Pipes, (int)Math.Max(Math.Min(reaches, affordable), FewestReaches));
        return Characteristics.Run(transient, stop, grid, durationS, cancellation);
    }

    /// <summary>The same with half the step, for telling how far the peak still depends on it.</summary>
    /// <param name="result">The run to repeat.</param>
    /// <param name="cancellation">Ends the run early.</param>
    /// <exception cref="OperationCanceledException">The run was ended early.</exception>
    public static TransientResult Halved(TransientResult result, CancellationToken cancellation = default)
    {
        ArgumentNullException.ThrowIfNull(result);
        return Characteristics.Run(result.Case, result.Stop, result.Grid.Halved(), result.DurationS, cancellation);
    }

    private static double DurationS(TransientCase transient, StopManoeuvre stop) => stop.EndS + (2 * ReturnsAfterwards * transient.TravelTimeS);
}
