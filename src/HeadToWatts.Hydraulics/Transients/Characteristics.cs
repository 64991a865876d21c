using HeadToWatts.Basis.Sources;

namespace HeadToWatts.Hydraulics.Transients;

/// <summary>
/// The method of characteristics for a reservoir, pipes in series and a machine or valve at the end. Friction is quasi-steady: the loss
/// of the steady flow, fittings included, spread evenly over each pipe and going with Q|Q|. Velocity heads are neglected. The water column
/// may be pulled below vapour pressure; that is flagged, not modelled.
/// </summary>
public static class Characteristics
{
    /// <summary>The method.</summary>
    public static readonly Method Method = new(
        "method-of-characteristics", "Transient by characteristics",
        "H_P = H_A + B (Q_A - Q_P) - R Q_A |Q_A|, H_P = H_B - B (Q_B - Q_P) + R Q_B |Q_B|, B = a/(g A), Δx = a Δt",
        TransientSources.WylieStreeter, "single pipeline, Courant number 1", []);

    /// <summary>Steps between two looks at whether to stop.</summary>
    private const int StepsBetweenLooks = 256;

    /// <summary>Runs a stop.</summary>
    /// <param name="transient">What is stopped.</param>
    /// <param name="stop">How.</param>
    /// <param name="grid">The grid.</param>
    /// <param name="durationS">Length of time to reckon, s; above 0.</param>
    /// <param name="cancellation">Ends the run early.</param>
    /// <exception cref="ArgumentException">The case is not sound.</exception>
    /// <exception cref="ArgumentOutOfRangeException">A time or ratio of the stop, or the duration, is out of range.</exception>
    /// <exception cref="OperationCanceledException">The run was ended early.</exception>
    public static TransientResult Run(TransientCase transient, StopManoeuvre stop, TransientGrid grid, double durationS, CancellationToken cancellation = default)
    {
        ArgumentNullException.ThrowIfNull(transient);
        ArgumentNullException.ThrowIfNull(stop);
        ArgumentNullException.ThrowIfNull(grid);
        if (!transient.IsSound || grid.Reaches.Count != transient.Pipes.Count)
            throw new ArgumentException("The case needs a pipe, a flow, a head before the machine and a grid of its own.", nameof(transient));
        stop.Check();
        if (durationS is not (> 0 and < double.PositiveInfinity))
            throw new ArgumentOutOfRangeException(nameof(durationS), durationS, "The duration must be above 0.");

        var steps = (int)Math.Ceiling((durationS / grid.TimeStepS) - 1e-9);
        var line = new PipeLine(transient, grid);
        var machineHeads = new double[steps + 1];
        var machineFlows = new double[steps + 1];
        (machineHeads[0], machineFlows[0]) = line.AtMachine;
        var valve = transient.FlowM3PerS / Math.Sqrt(transient.NetHeadM);
        for (var step = 1; step <= steps; step++)
        {
            if (step % StepsBetweenLooks == 0)
                cancellation.ThrowIfCancellationRequested();
            var timeS = step * grid.TimeStepS;
            var passage = stop.PassageRatio(timeS);
            line.Advance(timeS, stop.Law == StopLaw.FlowFallsEvenly ? passage * transient.FlowM3PerS : null, passage * valve);
            (machineHeads[step], machineFlows[step]) = line.AtMachine;
        }

        return new TransientResult(transient, stop, grid, line.Nodes(), machineHeads, machineFlows, line.Separation);
    }
}
