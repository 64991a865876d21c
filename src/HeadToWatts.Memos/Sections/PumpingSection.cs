using System.Globalization;
using HeadToWatts.Basis.Units;
using HeadToWatts.Memos.Content;
using HeadToWatts.Pumping;
using HeadToWatts.Studies.Results;

namespace HeadToWatts.Memos.Sections;

/// <summary>Pumping beside generation. Nothing where none is given.</summary>
internal static class PumpingSection
{
    public static void Write(MemoContext memo)
    {
        if (memo.Result.Pumping is not { } side)
            return;
        var body = memo.Body;
        var show = memo.Show;
        body.Section("Pumping against generation", "pumping");
        body.Say(RichText.Of($"{MemoContext.Count(side.Pumping.Plants.Count, "pumping plant takes", "pumping plants take")} {UnitDisplay.Energy(side.Pumping.ElectricKwh)} of electricity a year beside {UnitDisplay.Energy(side.GeneratedKwh)} generated. A good plant is one that meets the Nebraska criteria ") + body.Cite(PumpingMethods.Performance.Source) + ".");
        body.Table("tab-pumps", "The pumping plants.",
            [
                new("Plant"), new(MemoContext.Head("Lifted a year", show.UnitOf(Dimension.Volume)), ColumnAlign.Right), new(MemoContext.Head("Head", show.LengthUnit), ColumnAlign.Right), new("Efficiency or rating, %", ColumnAlign.Right),
                new("Taken a year", ColumnAlign.Right), new("A good plant", ColumnAlign.Right), new("Cost a year", ColumnAlign.Right),
            ],
            [.. side.Pumping.Plants.Select(p => new TableRow(
            [
                p.Plant.Name, UnitDisplay.In(p.Plant.AnnualVolumeM3, show.UnitOf(Dimension.Volume)), memo.Length(p.Plant.Head.TotalM), MemoContext.WholePercent(p.Plant.PlantEfficiency),
                $"{UnitDisplay.Number(p.AnnualUnits, 4)} {p.Plant.Source.Unit}", $"{UnitDisplay.Number(p.AchievableUnits, 4)} {p.Plant.Source.Unit}", p.AnnualCostAmount is { } cost ? UnitDisplay.Number(cost, 4) : "–",
            ]))],
            "Costs are in the currency of the prices entered. The head is lift, drawdown, pressure and what the pipe loses at the plant's flow.");
        if (side.GeneratedByMonthKwh is null)
        {
            body.Say("The flow is a duration curve, which knows no months: pumping cannot be set against generation month by month here. A daily record would show it.");
            return;
        }

        if (Figures.Pumping(memo) is { } drawing)
            body.Figure("fig-pumping", drawing, "Generation upwards and pumping downwards by month, with the net.");
        Months(memo, side);
    }

    private static void Months(MemoContext memo, PumpingSide side)
    {
        var names = CultureInfo.InvariantCulture.DateTimeFormat;
        var rows = Enumerable.Range(1, 12).Select(m => new TableRow([names.GetMonthName(m), Mwh(side.GeneratedByMonthKwh![m - 1]), Mwh(side.Pumping.ElectricByMonthKwh[m - 1]), Mwh(side.NetKwh(m)!.Value)])).ToList();
        rows.Add(new TableRow(["Year", Mwh(side.GeneratedByMonthKwh!.Sum()), Mwh(side.Pumping.ElectricKwh), Mwh(side.GeneratedByMonthKwh!.Sum() - side.Pumping.ElectricKwh)], RowKind.Total));
        memo.Body.Table("tab-pumping-months", "Pumping and generation by month.", [new("Month"), new("Generated, MWh", ColumnAlign.Right), new("Pumped, MWh", ColumnAlign.Right), new("Net, MWh", ColumnAlign.Right)], rows);
        memo.Body.Say($"Generation of the same month covers {UnitDisplay.Energy(side.CoveredInTheMonthKwh ?? 0)} of the pumping. Whether the utility counts it so is a matter of meters and tariff; no demand charge is taken as saved.", ParagraphKind.Note);
    }

    private static string Mwh(double kwh) => (kwh / 1000).ToString("0.0", CultureInfo.InvariantCulture).Replace('-', '−');
}
