using HeadToWatts.Basis.Units;
using HeadToWatts.Memos.Content;
using HeadToWatts.Studies;
using HeadToWatts.Turbines.Sizing;

namespace HeadToWatts.Memos.Sections;

/// <summary>Size, speed and setting of the machines weighed, and the pump as turbine.</summary>
internal static class MachinesPart
{
    public static void Write(MemoContext memo)
    {
        var body = memo.Body;
        var turbine = memo.Result.Turbine;
        var show = memo.Show;
        if (turbine.Sheets.All(s => s.Candidate.Speed is null))
            return;
        body.Part("Size, speed and setting", "machines");
        body.Say(RichText.Of("Sizes are by published rules, to see whether such a machine is built, not to build it. The highest setting of a runner under pressure follows from Thoma's coefficient, the air pressure at this altitude and the vapour pressure of the water ")
            + body.Cite(RunnerSetting.Highest.Source) + " " + body.Cite(RunnerSetting.CriticalSigma.Source, "table 4") + ". Makers' figures decide.");
        body.Table("tab-machines", "Machines side by side, in the order of the ranking.",
            [
                new("Type", Share: 1), new("Meter, kW", ColumnAlign.Right, 0), new("Speed, rpm", ColumnAlign.Right, 0), new("Drive", Share: 0),
                new("Runaway, rpm", ColumnAlign.Right, 0), new(MemoContext.Head("Runner", show.DiameterUnit), ColumnAlign.Right, 0), new("Highest setting", ColumnAlign.Right, 0), new("Against it here", Share: 3),
            ],
            [.. turbine.Sheets.Select(s => new TableRow(
            [
                MemoContext.Capital(s.Candidate.Type.Name) + (s.Candidate.UnitCount > 1 ? $" × {s.Candidate.UnitCount}" : ""),
                UnitDisplay.Number(s.Candidate.MeterPowerKw),
                s.Candidate.Speed is { } speed ? UnitDisplay.Number(speed.RunnerSpeedRpm) : "–",
                s.Candidate.Speed is { } drive ? drive.IsDirect ? "direct" : "geared" : "–",
                s.Candidate.Speed is { } away ? UnitDisplay.Number(away.RunawayRpm) : "–",
                (s.Geometry?.DiameterM ?? s.Candidate.Speed?.RunnerDiameterM) is { } diameter ? UnitDisplay.In(diameter, show.DiameterUnit) : "–",
                MachineWords.Setting(s, show),
                string.Join(" ", s.Against),
            ], s.Candidate.Type.Id == turbine.Chosen.Type.Id ? RowKind.Chosen : RowKind.Plain))]);
        if (turbine.ChosenSheet is not { } sheet)
            return;
        var size = MachineWords.Size(sheet, show);
        var cite = sheet.Geometry is { } geometry ? RichText.Of(" ") + body.Cite(geometry.Use.Method.Source) : RichText.Empty;
        body.Say(RichText.Bold(MemoContext.Capital(turbine.Chosen.Type.Name) + ". ")
            + (size.Length > 0 ? RichText.Of(MemoContext.Capital(size)) + cite + ". " : RichText.Empty)
            + (sheet.SpecificSpeedUsHpFt is { } us ? $"Specific speed {UnitDisplay.Number(turbine.Chosen.Speed!.SpecificSpeedKwM)} (rpm, kW, m), {UnitDisplay.Number(us)} (rpm, hp, ft), {UnitDisplay.Number(sheet.SpecificSpeedDimensionless!.Value)} without dimension. " : "")
            + MachineWords.SettingSentence(sheet, show)
            + (memo.Result.Input.Turbine.RunnerHeightM is { } height ? $" It is planned {show.Length(Math.Abs(height))} {(height < 0 ? "below" : "above")} it." : ""));
        Pump(memo);
    }

    private static void Pump(MemoContext memo)
    {
        var turbine = memo.Result.Turbine;
        if (Figures.PumpBand(memo) is not { } drawing || turbine.Pump is not { } band)
            return;
        var body = memo.Body;
        var show = memo.Show;
        body.Part("Pump as turbine", "pump-as-turbine");
        body.Say(RichText.Of(band.Pump is { } pump
            ? $"The pump named gives {show.Flow(pump.FlowM3PerS)} against {show.Length(pump.HeadM)} with {MemoContext.Percent(pump.Efficiency)} at {UnitDisplay.Number(pump.SpeedRpm, 4)} rpm. As a turbine at the same speed its best point lies, by the correlations below, "
            : $"No pump is named. For a pump of {MemoContext.Percent(band.PumpEfficiency)} at its best, the one to look for has its best point, by the correlations below, ")
            + $"between {show.Flow(band.LowestFlowM3PerS)} and {show.Flow(band.HighestFlowM3PerS)}, and {show.Length(band.LowestHeadM)} and {show.Length(band.HighestHeadM)} " + body.Cite(PumpCorrelations.Method.Source)
            + $". Measured machines lie up to {MemoContext.Percent(PumpCorrelations.ScatterRatio)} from any of them; a turbine test of the pump itself comes before buying it.");
        body.Figure("fig-pump", drawing, "Flow and head by several correlations, and the field in which measured machines lie.");
        body.Table("tab-pump", band.Pump is null ? "The pump to look for." : "The pump as a turbine, at its best point.",
            [new("By"), new(MemoContext.Head("Flow", show.FlowUnit), ColumnAlign.Right, 0.5), new(MemoContext.Head("Head", show.LengthUnit), ColumnAlign.Right, 0.5)],
            [
                .. band.Estimates.Select(e => new TableRow([e.Correlation.Name, memo.Flow(e.FlowM3PerS), memo.Length(e.HeadM)])),
                new TableRow(["This site, one unit", memo.Flow(band.SiteFlowM3PerS), memo.Length(band.SiteHeadM)], RowKind.Total),
            ]);
    }
}
