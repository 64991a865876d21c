namespace HeadToWatts.Hydraulics.Transients;

/// <summary>
/// The grid: one time step for all pipes, and in each so many whole reaches that a wave crosses a reach in just one step
/// (Courant number 1). Where the pipes' travel times are not whole multiples of one another, their wave speeds are adjusted a little;
/// by how much is told.
/// </summary>
/// <param name="TimeStepS">Time step, s.</param>
/// <param name="Reaches">Reaches of every pipe.</param>
/// <param name="WaveSpeedsMPerS">Wave speeds as run, m/s.</param>
/// <param name="WaveSpeedChangeRatio">Largest change of a wave speed over the speed itself.</param>
public sealed record TransientGrid(double TimeStepS, IReadOnlyList<int> Reaches, IReadOnlyList<double> WaveSpeedsMPerS, double WaveSpeedChangeRatio)
{
    private const double GoodEnough = 0.002;

    /// <summary>Reaches of all pipes together.</summary>
    public int ReachCount => Reaches.Sum();

    /// <summary>The grid of at least so many reaches, up to half as many again, that changes the wave speeds least.</summary>
    /// <param name="pipes">The pipes.</param>
    /// <param name="leastReaches">Reaches wanted at least; each pipe gets one or more.</param>
    public static TransientGrid For(IReadOnlyList<TransientPipe> pipes, int leastReaches)
    {
        ArgumentNullException.ThrowIfNull(pipes);
        if (pipes.Count == 0)
            throw new ArgumentException("A grid needs a pipe.", nameof(pipes));
        if (leastReaches < 1)
            throw new ArgumentOutOfRangeException(nameof(leastReaches), leastReaches, "A grid needs a reach.");
        var travelS = pipes.Sum(p => p.TravelTimeS);
        TransientGrid? best = null;
        for (var n = leastReaches; n <= leastReaches + (leastReaches / 2); n++)
        {
            var grid = With(pipes, travelS / n);
            if (best is null || grid.WaveSpeedChangeRatio < best.WaveSpeedChangeRatio)
                best = grid;
            if (best.WaveSpeedChangeRatio <= GoodEnough)
                break;
        }

        return best!;
    }

    /// <summary>The same grid with half the step and twice the reaches; wave speeds stay.</summary>
    public TransientGrid Halved() => this with { TimeStepS = TimeStepS / 2, Reaches = [.. Reaches.Select(r => 2 * r)] };

    private static TransientGrid With(IReadOnlyList<TransientPipe> pipes, double stepS)
    {
        int[] reaches = [.. pipes.Select(p => Math.Max(1, (int)Math.Round(p.TravelTimeS / stepS)))];
        double[] speeds = [.. pipes.Select((p, i) => p.LengthM / (reaches[i] * stepS))];
        return new TransientGrid(stepS, reaches, speeds, pipes.Select((p, i) => Math.Abs((speeds[i] / p.WaveSpeedMPerS) - 1)).Max());
    }
}
