using HeadToWatts.Basis.Units;
using HeadToWatts.Hydraulics.Levels;
using HeadToWatts.Memos.Content;
using HeadToWatts.Studies;
using HeadToWatts.Turbines.Units;

namespace HeadToWatts.Memos.Sections;

/// <summary>What was put in.</summary>
internal static class InputsAppendix
{
    private const int RowsShown = 60;

    public static void Write(MemoContext memo)
    {
        var body = memo.Body;
        var input = memo.Result.Input;
        var show = memo.Show;
        body.Appendix("Inputs as given", "inputs", onNewPage: true);
        var rows = new List<TableRow>
        {
            Row("Alternative", MemoContext.OrElse(input.Name, "not named")),
            Row("Latitude", UnitDisplay.Number(input.Site.LatitudeRad * 180 / Math.PI, 4) + "°"),
            Row("Elevation", show.Length(input.Site.ElevationM)),
            Row("Water temperature", show.Temperature(input.Site.WaterTemperatureDegC)),
            Row("Grid frequency", UnitDisplay.Number(input.Site.FrequencyHz) + " Hz"),
        };
        if (input.Head.IsFromLevels)
        {
            rows.Add(Row("Headwater level", Level(memo, input.Head.HeadwaterRule, input.Head.HeadwaterM)));
            rows.Add(Row("Tailwater level", Level(memo, input.Head.TailwaterRule, input.Head.TailwaterM)));
        }
        else
        {
            rows.Add(Row("Gross head", show.Length(input.Head.Gross.Metres)));
        }

        if (input.Head.Measurement.Length > 0)
            rows.Add(Row("How the head was measured", MemoContext.Sentence(input.Head.Measurement)));
        if (input.Head.ErrorM > 0)
            rows.Add(Row("Error of the head", show.Length(input.Head.ErrorM) + " either way"));

        var flow = input.Flow;
        rows.Add(Row("Flow", TitleSection.Period(memo)));
        if (flow.Origin is { } origin)
            rows.Add(Row("How the flow came about", MemoContext.Sentence($"{origin.Reason}; {string.Join("; ", origin.Notes)}")));
        if (flow.Record is not null)
            rows.Add(Row("Plotting position", flow.PlottingPosition.Name));
        rows.Add(Row("Season of operation", flow.Season.IsWholeYear ? "all year" : flow.Season.Describe()));
        if (flow.Rules is { } rules && rules.Seepage != FlowRecords.Reserved.ReachLoss.None)
            rows.Add(Row("Loss between gauge and site", WaterWords.Loss(rules.Seepage, show)));
        rows.Add(Row("Delivered first", WaterWords.Deliveries(flow, show) is { Count: > 0 } first ? string.Join("; ", first) : "none"));
        rows.Add(Row("Reserved flow", WaterWords.Reserved(flow, show)));
        rows.Add(Row("Water right", WaterWords.Right(flow, show)));
        rows.Add(Row("Design flow", flow.DesignFlowM3PerS is { } design ? show.Flow(design) : "to be suggested"));
        rows.Add(Row("Friction formula", input.Waterway.Formula.Name));
        rows.Add(Row("Kinetic energy coefficient α", UnitDisplay.Number(input.Waterway.KineticEnergyCoefficient)));
        if (input.Waterway.Stop is { } stop)
            rows.Add(Row("Stop", $"closes in {UnitDisplay.Number(stop.ClosureTimeS)} s, the {(stop.Law == Hydraulics.Transients.StopLaw.FlowFallsEvenly ? "flow" : "opening")} falling evenly; at runaway {(stop.RunawayFlowRatio is { } share ? MemoContext.Percent(share) + " of the full flow" : "the flow usual of the type")}{(stop.RunawayTimeS is { } time ? $" after {UnitDisplay.Number(time)} s" : "")}; pipes {StopWords.Restraint(stop.Restraint)}{(stop.PressureLimitPa is { } limit ? "; at most " + show.Pressure(limit) + " before the machine" : "")}"));
        rows.Add(Row("Turbine type", input.Turbine.Type?.Name ?? "to be suggested"));
        rows.Add(Row(input.Turbine.UnitSizes is null ? "Number of units" : "Units, one by one", UnitsPart.Given(memo)));
        if (input.Turbine.Split == LoadSplit.Best)
            rows.Add(Row("Sharing the flow", "for most power at each flow"));
        if (input.Turbine.FollowsHead)
            rows.Add(Row("Away from the rated head", "capacity and efficiency follow; shut off below " + (input.Turbine.LeastHeadM is { } leastM ? show.Length(leastM) : MemoContext.Percent(input.Turbine.LeastHeadRatio ?? HeldSpeed.UsualLeastHeadRatio) + " of the rated head")));
        if (input.Turbine.LeastFlowRatio is { } least)
            rows.Add(Row("Least flow of a unit", MemoContext.Percent(least) + " of its full flow"));
        if (input.Turbine.RunnerHeightM is { } runner)
            rows.Add(Row("Runner above the lowest tailwater", memo.Show.Length(runner)));
        if (input.Turbine.Pump is { } pump)
            rows.Add(Row("Pump to run as turbine", $"{show.Flow(pump.FlowM3PerS)}, {show.Length(pump.HeadM)}, {MemoContext.Percent(pump.Efficiency)}, {UnitDisplay.Number(pump.SpeedRpm, 4)} rpm"));
        rows.Add(Row("Efficiency", input.Turbine.HillChart is not null ? "manufacturer's chart, printed in the section on turbines" : input.Turbine.MakersCurve is null ? "typical of the type" : "manufacturer's table, printed in the section on turbines"));
        var train = input.Train;
        rows.Add(Row("Gear or belt; generator; transformer; line", ElectricalPart.Given(memo)));
        rows.Add(Row("Own use", $"{MemoContext.Percent(train.OwnUseRatio)} and {UnitDisplay.Power(train.OwnUseKw)}"));
        rows.Add(Row("Availability", MemoContext.Percent(train.Availability)));
        rows.AddRange(MoneySection.Given(memo).Select(g => Row(g.Name, g.Value)));
        body.Table("tab-inputs", "Inputs.", [new("Input", Share: 1), new("Value", Share: 2)], rows);
        if (input.Assumptions.Count > 0)
        {
            body.Say(RichText.Bold("Assumed where nothing was given"), keepWithNext: true);
            body.Add(ListBlock.Bullets([.. input.Assumptions.Select(a => RichText.Of(MemoContext.Sentence(a)))]));
        }

        Pipes(memo);
        Curve(memo);
    }

    private static void Pipes(MemoContext memo)
    {
        var pipes = memo.Result.Input.Waterway.Elements;
        if (pipes.Count == 0)
            return;
        var show = memo.Show;
        memo.Body.Table("tab-pipes", "Pipe elements.",
            [
                new("Element"), new(MemoContext.Head("Length", show.LengthUnit), ColumnAlign.Right, 0.3), new(MemoContext.Head("Inside diameter", show.DiameterUnit), ColumnAlign.Right, 0.3),
                new("Material"), new("Roughness", ColumnAlign.Right, 0.3), new("Fittings", Share: 2),
            ],
            [.. pipes.Select(p => new TableRow([
                p.Name, memo.Length(p.LengthM), UnitDisplay.In(p.InsideDiameterM, show.DiameterUnit), p.Material.Name, show.Roughness(p.RoughnessM),
                p.Fittings.Count == 0 ? "none" : string.Join(", ", p.Fittings.Select(f => $"{(f.Count > 1 ? f.Count + " × " : "")}{f.Name} (K = {UnitDisplay.Number(f.LossCoefficient)})")),
            ]))]);
    }

    private static void Curve(MemoContext memo)
    {
        if (memo.Result.Input.Flow.TypedCurve is not { } curve)
            return;
        var rows = curve.Rows.Take(RowsShown).Select(r => new TableRow([(r.Exceedance * 100).ToString("0.###", System.Globalization.CultureInfo.InvariantCulture), memo.Flow(r.FlowM3PerS)]));
        memo.Body.Table("tab-curve", "Rows of the flow-duration curve.",
            [new("Exceeded, %", ColumnAlign.Right, 0), new(MemoContext.Head("Flow", memo.Show.FlowUnit), ColumnAlign.Right, 0)], [.. rows],
            curve.Rows.Count > RowsShown ? $"The first {RowsShown} of {curve.Rows.Count} rows." : "");
    }

    private static string Level(MemoContext memo, LevelRule? rule, double levelM) => rule switch
    {
        null => memo.Level(levelM),
        RatedLevel rated => "by a rating: " + string.Join("; ", rated.Points.Select(p => $"{memo.Level(p.LevelM)} at {memo.Show.Flow(p.FlowM3PerS)}")),
        { FollowsMonth: true } => "by month, January first: " + string.Join("; ", Enumerable.Range(1, 12).Select(month => memo.Level(rule.LevelM(0, month)))),
        { FollowsFlow: true } => $"over a weir crest at {memo.Level(rule.LevelM(0, 1))}",
        _ => memo.Level(levelM),
    };

    private static TableRow Row(string name, string value) => new([name, value]);
}
