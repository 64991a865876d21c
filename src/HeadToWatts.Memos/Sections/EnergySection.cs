using System.Globalization;
using HeadToWatts.Basis.Units;
using HeadToWatts.EnergyYield;
using HeadToWatts.Memos.Content;

namespace HeadToWatts.Memos.Sections;

/// <summary>Power and energy, where the energy is lost and where the water goes.</summary>
internal static class EnergySection
{
    public static void Write(MemoContext memo)
    {
        var body = memo.Body;
        var energy = memo.Result.Energy;
        var annual = energy.Annual;
        body.Section("Energy", "energy");
        if (!memo.GivesEnergy)
        {
            body.Say("With the figures given, the plant would make no energy.");
            Water(memo);
            return;
        }

        body.Say(RichText.Of($"The year's energy is the power at every flow, with that flow's own head, units and efficiency, summed over the whole duration curve ") + body.Cite(EnergyMethods.AnnualEnergy.Source) + $": {UnitDisplay.Energy(annual.AnnualEnergyKwh)} at the meter. Power at the mean flow times 8760 h would claim {UnitDisplay.Energy(energy.PowerAtMeanFlowKwh)}; that figure is not used. These are estimates from past flows and typical efficiencies, not a promise.");
        body.Figure("fig-power", Figures.Power(memo), "Power at the meter and net head against the flow through the turbines.");
        Totals(memo, annual);
        if (energy.Days is { } days)
            Months(memo, days);
        Staircase(memo, annual);
        ElectricalPart.Write(memo);
        Water(memo);
    }

    private static void Totals(MemoContext memo, AnnualEnergy annual)
    {
        var rows = new List<TableRow>
        {
            Row("Installed power, at the generator", UnitDisplay.Power(annual.InstalledPowerKw), "all units at their best flow"),
            Row("Power at the meter", UnitDisplay.Power(annual.MeterPowerKw), "at the same flow, after own use, transformer and line"),
            Row("Energy in a mean year", UnitDisplay.Energy(annual.AnnualEnergyKwh), $"with {MemoContext.Percent(memo.Result.Input.Train.Availability)} availability"),
        };
        if (memo.Result.Energy.Days is { } days)
        {
            var whole = days.WholeYearsKwh;
            if (days.DryYearKwh is { } dry)
                rows.Add(Row("Energy in a dry year", UnitDisplay.Energy(dry), "reached in nine years out of ten"));
            if (whole.Count > 0)
                rows.Add(Row("Lowest and highest whole year", $"{UnitDisplay.Energy(whole[0])}, {UnitDisplay.Energy(whole[^1])}", $"of {MemoContext.Count(whole.Count, "whole calendar year", "whole calendar years")}"));
        }

        if (memo.Result.Energy.WithHeadError is { } range)
            rows.Add(Row("With the head's error", $"{UnitDisplay.Energy(range.LowKwh)}, {UnitDisplay.Energy(range.HighKwh)}", $"mean year with the head {memo.Show.Length(memo.Result.Input.Head.ErrorM)} lower and higher"));
        rows.Add(Row("With the turbine three points less efficient", UnitDisplay.Energy(memo.Result.Energy.ThreePointsLowerKwh), "mean year, at every load"));
        if (memo.Result.Energy.Days is { } run)
            rows.Add(Row("Starts of units", "about " + UnitDisplay.Number(run.UnitStartsPerYear) + " a year", "all units, from day to day"));
        rows.Add(Row("Plant factor", UnitDisplay.Percent(annual.PlantFactor), "energy over installed power times 8760 h"));
        rows.Add(Row("Hours running", UnitDisplay.Number(annual.RunningHours) + " h a year", "some water through a turbine"));
        rows.Add(Row("Full-load hours", UnitDisplay.Number(annual.FullLoadHours) + " h a year", "energy over installed power"));
        memo.Body.Table("tab-energy", "Power and energy.", [new("What", Share: 1), new("Result", ColumnAlign.Right, 0), new("Remark", Share: 2)], rows);
    }

    private static void Months(MemoContext memo, DailyRun days)
    {
        var sum = days.SumOfMonthsKwh;
        var body = memo.Body;
        body.Part("By month", "months");
        body.Say($"The record was also run day by day. The twelve months add up to {UnitDisplay.Energy(sum)}; the duration curve gives {UnitDisplay.Energy(memo.Result.Energy.Annual.AnnualEnergyKwh)}. The two differ a little where months have different numbers of missing days.");
        if (Figures.Months(memo) is { } drawing)
            body.Figure("fig-months", drawing, "Energy by month, mean of the record.");
        var names = CultureInfo.InvariantCulture.DateTimeFormat;
        var step = RoundToSum.StepFor(sum / 1000, 4);
        var energies = RoundToSum.Of([.. days.Months.Select(m => m.MeanEnergyKwh / 1000)], step);
        body.Table("tab-months", "Energy and flow by month, mean of the record.",
            [new("Month"), new(MemoContext.Head("Mean flow arriving", memo.Show.FlowUnit), ColumnAlign.Right), new("Energy, MWh", ColumnAlign.Right), new("Of the year, %", ColumnAlign.Right)],
            [
                .. days.Months.Select((m, i) => new TableRow([names.GetMonthName(m.Month), m.Days == 0 ? "no data" : memo.Flow(m.MeanFlowM3PerS), Stepped(energies[i], step), MemoContext.PercentColumn(sum > 0 ? m.MeanEnergyKwh / sum : 0)])),
                new TableRow(["Year", "", Stepped(energies.Sum(), step), "100.0"], RowKind.Total),
            ]);
    }

    private static void Staircase(MemoContext memo, AnnualEnergy annual)
    {
        var stairs = annual.Staircase;
        memo.Body.Part("Where the energy is lost", "losses-energy");
        if (Figures.Staircase(memo) is { } drawing)
            memo.Body.Figure("fig-staircase", drawing, "From the falling water to the meter, in a mean year.");
        var step = RoundToSum.StepFor(stairs.GrossKwh / 1000, 4);
        var shown = stairs.Steps.Where(s => Math.Abs(s.LossKwh) > stairs.GrossKwh * 1e-9).ToArray();
        var parts = RoundToSum.Of([.. shown.Select(s => s.LossKwh / 1000), annual.AnnualEnergyKwh / 1000], step);
        var gross = parts.Sum();
        var left = gross;
        var rows = new List<TableRow> { new(["Water through the turbines, at gross head", "", Stepped(gross, step), "100.0"]) };
        for (var i = 0; i < shown.Length; i++)
        {
            left -= parts[i];
            rows.Add(new TableRow(["less " + shown[i].Name, Stepped(parts[i], step), Stepped(left, step), MemoContext.PercentColumn(shown[i].LeftKwh / stairs.GrossKwh)]));
        }

        rows.Add(new TableRow(["Energy at the meter", "", Stepped(parts[^1], step), MemoContext.PercentColumn(annual.AnnualEnergyKwh / stairs.GrossKwh)], RowKind.Total));
        memo.Body.Table("tab-staircase", "From the falling water to the meter, in a mean year.",
            [new("Step", Share: 2), new("Lost, MWh", ColumnAlign.Right), new("Left, MWh", ColumnAlign.Right), new("Left, %", ColumnAlign.Right)], rows);
    }

    private static void Water(MemoContext memo)
    {
        var water = memo.Result.Energy.Annual.Water;
        var unit = memo.Show.VolumeUnit;
        memo.Body.Part("Where the water goes", "water-balance");
        (string Name, double M3)[] all =
        [
            ("Prior deliveries", water.PriorM3), ("Reserved, left in the stream", water.ReservedM3), ("Through the turbines", water.TurbinedM3),
            ("Too little to run on", water.BelowLeastM3), ("Passed by while out of service", water.OutOfServiceM3), ("Spilled: more than the plant takes", water.SpilledM3),
        ];
        var volumes = all.Select(p => unit.FromHeld(p.M3)).ToArray();
        var step = RoundToSum.StepFor(volumes.Sum(), 5);
        var parts = RoundToSum.Of(volumes, step);
        var shares = RoundToSum.Of([.. all.Select(p => water.ArrivingM3 > 0 ? p.M3 / water.ArrivingM3 * 100 : 0)], 0.1);
        memo.Body.Table("tab-water", "Water balance of a mean year.",
            [new("Where", Share: 2), new(MemoContext.Head("Volume", unit) + RichText.Of(" a year"), ColumnAlign.Right), new("Of what arrives, %", ColumnAlign.Right)],
            [
                .. all.Select((p, i) => new TableRow([p.Name, Stepped(parts[i], step), shares[i].ToString("0.0", CultureInfo.InvariantCulture)])),
                new TableRow(["Arriving", Stepped(parts.Sum(), step), water.ArrivingM3 > 0 ? "100.0" : "–"], RowKind.Total),
            ]);
    }

    private static TableRow Row(string what, string result, string remark) => new([what, result, remark]);

    // A number in multiples of its step: as many decimals as the step has.
    private static string Stepped(double value, double step)
    {
        var decimals = step >= 1 ? 0 : (int)Math.Round(-Math.Log10(step));
        var text = value.ToString("#,##0" + (decimals > 0 ? "." + new string('0', decimals) : ""), CultureInfo.InvariantCulture).Replace(',', '\u202f');
        return text.StartsWith('-') ? "−" + text[1..] : text;
    }
}
