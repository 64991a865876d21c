using HeadToWatts.Basis.Units;
using HeadToWatts.Hydraulics.Canals;
using HeadToWatts.Memos.Content;
using HeadToWatts.Studies.Results;

namespace HeadToWatts.Memos.Sections;

/// <summary>The canal above and below its drop. Nothing where none is given.</summary>
internal static class CanalSection
{
    public static void Write(MemoContext memo)
    {
        if (memo.Result.Canal is not { } canal || memo.Result.Input.Head.Canal is not { } given)
            return;
        var body = memo.Body;
        var show = memo.Show;
        body.Section("The canal and its drop", "canal");
        body.Say(RichText.Of("Normal depths are Manning's ") + body.Cite(UniformFlow.Method.Source) + ", critical depths those of least energy. " + RichText.See("tab-canal") + " gives both sides of the drop over the flow" + (Figures.CanalDrop(memo) is null ? "." : ", " + RichText.See("fig-canal") + " the canal with the plant stopped."));
        body.Table("tab-canal", "The canal over the flow.",
            [
                new("Side"), new(MemoContext.Head("Flow", show.FlowUnit), ColumnAlign.Right), new(MemoContext.Head("Normal depth", show.LengthUnit), ColumnAlign.Right), new(MemoContext.Head("Critical depth", show.LengthUnit), ColumnAlign.Right),
                new(MemoContext.Head("Velocity", show.VelocityUnit), ColumnAlign.Right), new("Froude number", ColumnAlign.Right), new(MemoContext.Head("Specific energy", show.LengthUnit), ColumnAlign.Right),
            ],
            [.. canal.AtFlows.SelectMany(a => new[] { Row(memo, "above", a.Upstream), Row(memo, "below", a.Downstream) })]);
        if (Figures.CanalDrop(memo) is { } drawing)
            body.Figure("fig-canal", drawing, $"The canal through its drop with the plant stopped and {show.Flow(canal.AtFull.FlowM3PerS)} going over it.");
        Energy(memo, canal);
        if (canal.DrawdownLengthM > 0)
            body.Say($"Where the flow goes over the drop freely, the water is drawn down from its normal depth over {show.Length(canal.DrawdownLengthM)} upstream, to the critical depth just above the brink; a plant that holds the headwater up removes this.");
        Basin(memo, canal);
        if (given.Others.Count > 0)
            body.Say($"Other drops used on this canal: {string.Join("; ", given.Others.Select(o => $"{o.Name}, {memo.Level(o.HeadwaterElevationM)} to {memo.Level(o.TailwaterElevationM)}"))}. They share the flow; no metre of fall is counted twice, which was checked.");
        body.Say(given.Bypass.Length > 0 ? RichText.Of("When the plant stops, the full flow passes, in the author's words: ") + RichText.Italic(given.Bypass) + ". That it does so at once and without power must be shown." : RichText.Of("What passes the full flow when the plant stops is not stated; it must be settled before anything else."));
    }

    private static TableRow Row(MemoContext memo, string side, CanalFlowResult at) => new(
    [
        side, memo.Flow(at.FlowM3PerS), at.NormalDepthM is { } n ? memo.Length(n) : "full", at.CriticalDepthM is { } c ? memo.Length(c) : "–",
        at.VelocityMPerS is { } v ? memo.Velocity(v) : "–", at.FroudeNumber is { } f ? UnitDisplay.Number(f) : "–", at.SpecificEnergyM is { } e ? memo.Length(e) : "–",
    ]);

    private static void Energy(MemoContext memo, CanalResult canal)
    {
        if (canal is not { EnergyAbove: { } above, EnergyBelow: { } below, FallOfEnergyM: { } fall })
            return;
        memo.Body.Table("tab-canal-energy", $"The energy equation from section to section at {memo.Show.Flow(canal.AtDesign.FlowM3PerS)}.",
            [new("Term"), new(MemoContext.Head("Above the drop", memo.Show.LengthUnit), ColumnAlign.Right), new(MemoContext.Head("Below it", memo.Show.LengthUnit), ColumnAlign.Right)],
            [
                new TableRow(["Bed z", memo.LevelNumber(above.BedM), memo.LevelNumber(below.BedM)]),
                new TableRow(["Depth y", memo.LevelNumber(above.DepthM), memo.LevelNumber(below.DepthM)]),
                new TableRow([RichText.Formula("α V^2/2g"), memo.LevelNumber(above.VelocityHeadM), memo.LevelNumber(below.VelocityHeadM)]),
                new TableRow(["Energy line", memo.LevelNumber(above.EnergyM), memo.LevelNumber(below.EnergyM)], RowKind.Total),
            ],
            $"The energy line falls {memo.Show.Length(fall)}: the machine, its waterway and what goes over the drop share it.");
    }

    private static void Basin(MemoContext memo, CanalResult canal)
    {
        if (canal.Basin is not { } basin)
            return;
        var show = memo.Show;
        memo.Body.Say(RichText.Of($"With the plant stopped the flow reaches the floor of the basin {show.Length(basin.EntryDepthM)} deep at a Froude number of {UnitDisplay.Number(basin.EntryFroudeNumber)}. The jump needs {show.Length(basin.NeededDepthM)} of water and {show.Length(basin.NeededLengthM)} of floor; there are {show.Length(basin.AvailableDepthM)} and {show.Length(basin.AvailableLengthM)}. ")
            + RichText.Bold(basin.HoldsTheJump ? "The basin holds the jump." : "The basin does not hold the jump.") + " A plain level floor is taken " + memo.Body.Cite(HydraulicJump.Length.Source) + "; an engineer decides on blocks, sills and scour.");
    }
}
