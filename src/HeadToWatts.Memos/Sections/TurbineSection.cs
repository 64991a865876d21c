using HeadToWatts.Basis.Units;
using HeadToWatts.Memos.Content;
using HeadToWatts.Studies;
using HeadToWatts.Turbines;

namespace HeadToWatts.Memos.Sections;

/// <summary>The turbine types weighed and why they stand in this order.</summary>
internal static class TurbineSection
{
    private const int Explained = 3;

    public static void Write(MemoContext memo)
    {
        var body = memo.Body;
        var turbine = memo.Result.Turbine;
        var chosen = turbine.Chosen;
        var show = memo.Show;
        body.Section("Turbine options", "turbine");
        var who = turbine.TypeIsSuggested ? "is suggested" : "was chosen by the author";
        body.Say($"{MemoContext.Capital(chosen.Type.Name)} with {MemoContext.Count(turbine.Units.UnitCount, "unit", "units")} {who}. Types whose usual range of head and flow holds the design point come first, by the energy they would give on this curve; the others follow by how far outside they lie. Cost is not weighed.");
        body.Table("tab-turbines", "Turbine types in order, each with the number of units that suits it best.",
            [
                new("Type", Share: 2), new("Units", ColumnAlign.Right, 0), new("Range", Share: 1), new("Energy, MWh a year", ColumnAlign.Right, 0.5),
                new("Peak efficiency, %", ColumnAlign.Right, 0.5), new("At half flow, %", ColumnAlign.Right, 0.5),
                new(MemoContext.Head("Runs from", show.FlowUnit), ColumnAlign.Right, 0.5), new("Too little, % of year", ColumnAlign.Right, 0.5),
            ],
            [.. turbine.Ranking.Select(c => new TableRow(
            [
                MemoContext.Capital(c.Type.Name), MemoContext.Count(c.UnitCount), c.Fit.IsInside ? "inside" : "outside",
                UnitDisplay.Number(c.AnnualEnergyKwh / 1000), MemoContext.PercentColumn(c.PeakEfficiency), c.EfficiencyAtHalfLoad > 0 ? MemoContext.PercentColumn(c.EfficiencyAtHalfLoad) : "stands",
                memo.Flow(c.LeastFlowM3PerS), MemoContext.PercentColumn(c.ShareOfYearBelowLeast),
            ], c.Type.Id == chosen.Type.Id ? RowKind.Chosen : RowKind.Plain))],
            "Energy compared on 800 equal shares of the year; the energy reported for the plant uses the full integral.");
        body.Figure("fig-envelopes", Figures.Envelopes(memo), "Usual ranges of head and flow of one unit, with this site's point and its range through the year.");
        var explained = turbine.Ranking.Take(Explained).ToList();
        if (explained.All(c => c.Type.Id != chosen.Type.Id))
            explained.Add(chosen);
        foreach (var candidate in explained)
            body.Say(RichText.Bold(MemoContext.Capital(candidate.Type.Name) + ". ") + string.Join(" ", TurbineWords.Reasons(candidate, show)) + " " + RichText.Italic("Against it: ") + candidate.Type.Limits);
        MachinesPart.Write(memo);
        Efficiency(memo, chosen.Type);
        UnitsPart.Write(memo);
    }

    private static void Efficiency(MemoContext memo, TurbineType type)
    {
        var turbine = memo.Result.Turbine;
        var points = turbine.Efficiency.Points;
        RichText from = turbine.EfficiencyIsMakers
            ? "The efficiencies are the manufacturer's as given by the author; a maker's figure is not the site's."
            : RichText.Of("The efficiencies are typical of small machines of this type ") + Cite(memo, type, TurbineFigure.Efficiency) + ", not those of a machine on offer.";
        memo.Body.Say(from + $" A unit is taken to run from {MemoContext.Percent(turbine.Units.LeastFlowRatio)} of its full flow " + Cite(memo, type, TurbineFigure.LeastFlow) + "; the range of head and flow is from " + Cite(memo, type, TurbineFigure.Envelope) + ".");
        memo.Body.Figure("fig-efficiency", Figures.Efficiency(memo), $"Efficiency of one {type.Name} unit; three points lower at every load the year would give {UnitDisplay.Energy(memo.Result.Energy.ThreePointsLowerKwh)}.");
        memo.Body.Table("tab-efficiency", $"Efficiency of one {type.Name} unit over its flow.",
            [new("Flow of full flow, %", ColumnAlign.Right, 0), .. points.Select(p => new TableColumn(MemoContext.WholePercent(p.FlowRatio), ColumnAlign.Right))],
            [new TableRow(["Turbine efficiency, %", .. points.Select(p => RichText.Of(MemoContext.PercentColumn(p.Efficiency)))])]);
    }

    private static RichText Cite(MemoContext memo, TurbineType type, TurbineFigure figure) =>
        RichText.Join(" ", type.Sources.Where(s => s.Figure == figure).Select(s => s.Source).DistinctBy(s => s.Id).Select(s => memo.Body.Cite(s)));
}
