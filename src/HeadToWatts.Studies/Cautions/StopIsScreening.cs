using HeadToWatts.Basis.Units;

namespace HeadToWatts.Studies.Cautions;

/// <summary>A transient was run: what it is, and what it is not.</summary>
internal sealed class StopIsScreening() : CautionRule("stop-is-screening", StudyStage.Waterway, Severity.Note, "The stop is a screening", CautionSources.Practice)
{
    public override string? Say(StudyResult result, UnitDisplay show) => result.Waterway.Stop is { } stop
        ? $"The pressures of the stop, up to {show.Pressure(stop.Pipes.Max(p => p.HighestPressurePa))}, are reckoned on a single line with the machine as an opening. Governor, inertia, relief and air valves, surge tank and several units closing at different times are not in it. An engineer's transient study decides closing times, pipe class and vents."
        : null;
}
