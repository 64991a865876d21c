using HeadToWatts.Basis.Units;
using HeadToWatts.Hydraulics.Surge;
using HeadToWatts.Hydraulics.Transients;
using HeadToWatts.Memos.Content;
using HeadToWatts.Studies;
using HeadToWatts.Studies.Results;

namespace HeadToWatts.Memos.Sections;

/// <summary>What happens in the pipes when the unit trips.</summary>
internal static class StopPart
{
    public static void Write(MemoContext memo)
    {
        if (memo.Result.Waterway.Stop is not { } stop)
            return;
        var body = memo.Body;
        var show = memo.Show;
        var run = stop.Run;
        body.Part("When the unit trips", "stop");
        body.Say(RichText.Of($"The plant runs at its design flow when the load is lost. {StopWords.Manoeuvre(stop)} Before the machine the pressure rises to {show.Pressure(memo.Result.Site.SpecificWeightNPerM3 * (run.HighestMachineHeadM - run.Nodes[^1].CentreM))}, {UnitDisplay.Number(run.HighestAtS)} s after the trip; that is {show.Length(run.RiseOverStaticM)} of head over standing water. {StopWords.Column(stop, show)} The method is that of characteristics ")
            + body.Cite(Characteristics.Method.Source) + ".");
        if (Figures.StopHeads(memo) is { } along)
            body.Figure("fig-stop-heads", along, "Highest and lowest head along the pipe while the plant stops.");
        if (Figures.StopTime(memo) is { } time)
            body.Figure("fig-stop-time", time, "Pressure before the machine and flow through it from the trip on.");
        body.Table("tab-stop", "Pressures while the plant stops: a screening, gauge.",
            [
                new("Element"), new(MemoContext.Head("Wave speed", show.VelocityUnit), ColumnAlign.Right), new(MemoContext.Head("Standing", show.PressureUnit), ColumnAlign.Right),
                new(MemoContext.Head("Highest", show.PressureUnit), ColumnAlign.Right), new(MemoContext.Head("Lowest", show.PressureUnit), ColumnAlign.Right),
                new(MemoContext.Head("Pipe's rating", show.PressureUnit), ColumnAlign.Right), new("Highest of rating, %", ColumnAlign.Right),
            ],
            [.. stop.Pipes.Select(p => new TableRow([
                p.Element.Name, memo.Velocity(p.WaveSpeedMPerS), Pressure(p.StaticPressurePa), Pressure(p.HighestPressurePa), Pressure(p.LowestPressurePa),
                p.Element.PressureRatingPa is { } rating ? Pressure(rating) : "not given", p.RatingRatio is { } ratio ? MemoContext.WholePercent(ratio) : "–",
            ]))],
            $"Pipes {StopWords.Restraint(stop.Input.Restraint)}. A wave needs {UnitDisplay.Number(stop.ReturnTimeS)} s to the intake and back.");
        var halved = TransientRun.Halved(run);
        body.Say($"{StopWords.Reckoning(stop)} With half the step the highest head changes by {UnitDisplay.Percent(Math.Abs((halved.HighestMachineHeadM - run.HighestMachineHeadM) / (run.HighestMachineHeadM - run.Nodes[^1].CentreM)))}.");
        Closing(memo, stop);
        body.Say(RichText.Bold("This is a screening. ") + "Governor and inertia, relief and air valves, surge tanks and units that close at different times are not in it. An engineer's transient study decides closing times, pipe class and vents, by the codes that apply.");

        string Pressure(double pressurePa) => UnitDisplay.In(pressurePa, show.PressureUnit);
    }

    private static void Closing(MemoContext memo, StopResult stop)
    {
        if (stop.Limit is not { } limit)
            return;
        var show = memo.Show;
        var what = $"{show.Pressure(limit.LimitPa)} before the machine{(limit.IsGiven ? "" : ", nine tenths of the last pipe's rating,")}";
        if (limit is not { MichaudTimeS: { } michaud, AllieviTimeS: { } allievi })
        {
            memo.Body.Say($"The limit of {what} is reached by standing water alone.");
            return;
        }

        var found = ClosingTime.ShortestS(stop.Run.Case, stop.Run.Stop, limit.LimitHeadM, stop.Run.Grid.ReachCount);
        memo.Body.Say(RichText.Of($"To keep the limit of {what} a flow that falls evenly takes {UnitDisplay.Number(michaud)} s ") + memo.Body.Cite(Michaud.Method.Source)
            + $", an opening that falls evenly and slowly {UnitDisplay.Number(allievi)} s " + memo.Body.Cite(AllieviClosure.Method.Source)
            + (found is { } seconds
                ? $". By the transient, with what the machine itself holds back, {(seconds > 0 ? $"it takes {UnitDisplay.Number(seconds)} s" : "even an instant stop keeps it")}."
                : ". By the transient no closing time keeps it, since the machine itself holds back too much as it races."));
    }
}
