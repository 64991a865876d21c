using HeadToWatts.Basis.Units;
using HeadToWatts.Memos.Content;
using HeadToWatts.Turbines.Units;

namespace HeadToWatts.Memos.Sections;

/// <summary>Several units and how they share the flow; the head away from the rated one; the size and chart of the maker.</summary>
internal static class UnitsPart
{
    public static void Write(MemoContext memo)
    {
        Split(memo);
        Head(memo);
    }

    /// <summary>The units as given, in one line.</summary>
    public static string Given(MemoContext memo) => memo.Result.Input.Turbine.UnitSizes is { } sizes
        ? string.Join("; ", sizes.Select(s => $"{MemoContext.Percent(s.ShareRatio)} of the flow, least {MemoContext.Percent(s.LeastFlowRatio)} of its own"))
        : memo.Result.Input.Turbine.UnitCount is { } units ? MemoContext.Count(units) : "to be suggested";

    private static void Split(MemoContext memo)
    {
        var turbine = memo.Result.Turbine;
        if (turbine.Split is not { } split || Figures.Split(memo) is not { } drawing || !memo.GivesEnergy)
            return;
        var body = memo.Body;
        var units = turbine.Units;
        body.Part("Sharing the flow among the units", "split");
        body.Say($"{MemoContext.Count(units.UnitCount)} units{(units.Sizes.Any(s => s != units.Sizes[0]) ? " of unequal size; speed and size above are those of a unit of their mean" : "")}. One after another, opened alike, they give about {UnitDisplay.Energy(split.InTurnKwh)} a year; split so that the turbines give most power at each flow, about {UnitDisplay.Energy(split.BestKwh)}, {(split.GainRatio < 5e-5 ? "no" : MemoContext.Percent(split.GainRatio))} more. This memo reckons with {(units.Split == LoadSplit.Best ? "the best split" : "one after another")}."
            + (memo.Result.Energy.Days is { } days ? $" Units start about {UnitDisplay.Number(days.UnitStartsPerYear)} times a year, counted from day to day." : ""));
        body.Figure("fig-split", drawing, "Efficiency of the turbines together, with the best split and one after another.");
        body.Table("tab-split", "Flow of each unit in percent of its own full flow.",
            [new(MemoContext.Head("Flow", memo.Show.FlowUnit), ColumnAlign.Right, 0), new("One after another", ColumnAlign.Right), new("Together, %", ColumnAlign.Right, 0.5), new("Best split", ColumnAlign.Right), new("Together, %", ColumnAlign.Right, 0.5)],
            [.. split.Rows.Select(r => new TableRow([memo.Flow(r.FlowM3PerS), Loads(r.InTurnM3PerS), Together(r.InTurnEfficiency), Loads(r.BestM3PerS), Together(r.BestEfficiency)]))]);

        string Loads(IReadOnlyList<double> flows) => string.Join(" + ", flows.Select((f, i) => f > 0 ? MemoContext.WholePercent(f / (units.Sizes[i].ShareRatio * units.DesignFlowM3PerS)) : "–"));

        static string Together(double efficiency) => efficiency > 0 ? MemoContext.PercentColumn(efficiency) : "stands";
    }

    private static void Head(MemoContext memo)
    {
        var body = memo.Body;
        var show = memo.Show;
        switch (memo.Result.Turbine.HeadBehaviour)
        {
            case HeldSpeed held:
                body.Say(RichText.Of($"Away from its rated head of {show.Length(held.RatedHeadM)} a unit's capacity goes with the root of the head and its efficiency falls with the square of how far its speed is off ") + body.Cite(HeldSpeed.Method.Source)
                    + $"; below {show.Length(held.LeastHeadM)} it is shut off. At 80 % of the rated head it passes {MemoContext.Percent(held.CapacityRatio(0.8 * held.RatedHeadM))} of its full flow with {MemoContext.Percent(held.EfficiencyFactor(0.8 * held.RatedHeadM))} of its efficiency, at 120 % of it with {MemoContext.Percent(held.EfficiencyFactor(1.2 * held.RatedHeadM))}.");
                break;
            case HillChart chart:
                body.Say(RichText.Of($"The manufacturer's chart gives efficiency over flow and head from {show.Length(chart.LowestHeadM)} to {show.Length(chart.HighestHeadM)} net; inside, straight lines run between its points ") + body.Cite(HillChart.Method.Source) + "; outside its heads the unit is taken to stand.");
                body.Table("tab-hill", "The manufacturer's chart.",
                    [new(MemoContext.Head("Net head", show.LengthUnit), ColumnAlign.Right, 0), new("Efficiency, % (at flow of full flow, %)")],
                    [.. chart.Heads.Select(h => new TableRow([memo.Length(h.HeadM), string.Join("; ", h.Points.Select(p => $"{MemoContext.PercentColumn(p.Efficiency)} ({MemoContext.WholePercent(p.FlowRatio)})"))]))]);
                break;
        }

        if (memo.Result.Turbine.StepUp is { } up)
            body.Say(RichText.Of($"The manufacturer's efficiencies were measured on a runner of {show.Diameter(up.TestedDiameterM)}; the one here has {show.Diameter(up.RunnerDiameterM)}, and {UnitDisplay.Number(up.PeakChange * 100, 2)} points are added to every efficiency ") + body.Cite(Turbines.Sizing.MoodyStepUp.Method.Source, Turbines.Sizing.MoodyStepUp.Method.Locator) + ".");
    }
}
