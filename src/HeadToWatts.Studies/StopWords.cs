using HeadToWatts.Basis.Units;
using HeadToWatts.Hydraulics.Surge;
using HeadToWatts.Hydraulics.Transients;
using HeadToWatts.Studies.Results;

namespace HeadToWatts.Studies;

/// <summary>The stop in words, the same on the screen and in the memo.</summary>
public static class StopWords
{
    /// <summary>How the plant stops.</summary>
    public static string Manoeuvre(StopResult stop)
    {
        ArgumentNullException.ThrowIfNull(stop);
        var m = stop.Run.Stop;
        var closing = m.ClosureTimeS > 0 ? $"closes in {UnitDisplay.Number(m.ClosureTimeS)} s, the {(m.Law == StopLaw.FlowFallsEvenly ? "flow" : "opening")} falling evenly" : "shuts at once";
        return m.RunawayFlowRatio == 1
            ? $"It {closing}; what it passes does not depend on its speed."
            : $"It {closing}; racing, it passes {UnitDisplay.Percent(m.RunawayFlowRatio)} of the flow at full load from {UnitDisplay.Number(m.RunawayTimeS)} s on{(stop.RunawayIsAssumed ? " (typical of the type, from memory)" : "")}.";
    }

    /// <summary>How it was reckoned: grid and friction.</summary>
    public static string Reckoning(StopResult stop)
    {
        ArgumentNullException.ThrowIfNull(stop);
        var grid = stop.Run.Grid;
        var change = grid.WaveSpeedChangeRatio > 1e-9 ? $"wave speeds changed by up to {UnitDisplay.Percent(grid.WaveSpeedChangeRatio)} so that a wave crosses a reach in just one step" : "a wave crosses a reach in just one step, at the true wave speed";
        return $"By characteristics on {grid.ReachCount} reaches with a step of {UnitDisplay.Number(grid.TimeStepS * 1000)} ms; {change}. Friction is that of the steady flow, going with Q|Q| and spread evenly over each pipe, fittings included; velocity heads are left out; the levels hold; the machine acts as an opening.";
    }

    /// <summary>What was found of the water column.</summary>
    public static string Column(StopResult stop, UnitDisplay show)
    {
        ArgumentNullException.ThrowIfNull(stop);
        ArgumentNullException.ThrowIfNull(show);
        return stop.Run.Separation is { } parted
            ? $"The pressure falls to that of vapour {UnitDisplay.Number(parted.TimeS)} s after the trip, {show.Length(parted.StationM)} from the intake: the water column parts. What follows is not reckoned with a cavity and does not hold."
            : "The pressure stays above that of vapour everywhere.";
    }

    /// <summary>How the pipes are held.</summary>
    public static string Restraint(PipeRestraint restraint) => restraint switch
    {
        PipeRestraint.ExpansionJoints => "expansion joints throughout",
        PipeRestraint.AnchoredUpstream => "anchored at the upper end",
        _ => "anchored throughout",
    };
}
