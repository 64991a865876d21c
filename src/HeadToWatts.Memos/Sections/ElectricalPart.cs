using HeadToWatts.Basis.Units;
using HeadToWatts.EnergyYield.Electrical;
using HeadToWatts.Memos.Content;

namespace HeadToWatts.Memos.Sections;

/// <summary>From the shaft to the meter, where a machine there is given in detail.</summary>
internal static class ElectricalPart
{
    public static void Write(MemoContext memo)
    {
        if (memo.Result.Energy.Electrical is not { } found)
            return;
        var body = memo.Body;
        var train = found.Train;
        body.Part("From the shaft to the meter", "electrical");
        body.Say(RichText.Of("Losses of the machines below follow the load, so each flow has its own ")
            + RichText.Join(" ", Sources(found.Train.Generator is not null, found.Train.Transformer is not null, found.Train.Line is not null).Select(s => body.Cite(s)))
            + ". The table shows them at full power; the year's energy of each step stands in " + RichText.See("tab-staircase") + ".");
        var rows = new List<TableRow>
        {
            Row("After gear or belt", UnitDisplay.Power(found.AtBest.DrivenKw), $"{MemoContext.Percent(train.DriveEfficiency)} at any load"),
            Row("At the generators", UnitDisplay.Power(found.AtBest.GeneratedKw), Generator(memo)),
            Row("After own use", UnitDisplay.Power(found.AtBest.SentKw), $"{MemoContext.Percent(train.OwnUseRatio)} and {UnitDisplay.Power(train.OwnUseKw)}"),
            Row("After the transformer", UnitDisplay.Power(found.AtBest.TransformedKw), train.Rated?.Transformer is { } t
                ? $"{UnitDisplay.Number(t.RatingKva)} kVA; no-load loss {UnitDisplay.Power(t.NoLoadLossKw)}, load loss {UnitDisplay.Power(t.LoadLossKw)}; {(train.Transformer!.StaysLive ? "live" : "off")} while the plant stands"
                : $"{MemoContext.Percent(train.TransformerEfficiency)} at any load"),
            Row("At the meter", UnitDisplay.Power(found.AtBest.MeterKw), train.Line is { } line
                ? $"{memo.Show.Length(line.LengthM)} of {line.Size.Name} {line.Metal.Name}, {(line.Phases == 3 ? "three phases" : "one phase")}, {UnitDisplay.Number(line.VoltageV, 4)} V, {UnitDisplay.Number(found.LineCurrentA!.Value)} A; voltage rise by resistance alone {UnitDisplay.Percent(found.VoltageRiseRatio!.Value)}"
                : $"{MemoContext.Percent(train.LineEfficiency)} at any load"),
        };
        body.Table("tab-electrical", "From the shaft to the meter at full power.", [new("Step", Share: 1), new("Power", ColumnAlign.Right, 0), new("By what", Share: 3)], rows,
            train.Transformer is null && train.Line is null ? null : RichText.Of($"Power factor {UnitDisplay.Number(train.PowerFactor)}."));
    }

    /// <summary>What was put in, in one line.</summary>
    public static string Given(MemoContext memo)
    {
        var train = memo.Result.Input.Train;
        var generator = train.Generator is { } g
            ? $"{Kind(g.Kind)} generators{(g.RatedPowerKw is { } kw ? $" of {UnitDisplay.Power(kw)}" : " to suit")}{(g.FullLoadEfficiency is { } e ? $", {MemoContext.Percent(e)} at rating" : ", usual efficiency of their size")}"
            : "generator " + MemoContext.Percent(train.GeneratorEfficiency);
        var transformer = train.Transformer is { } t
            ? $"transformer{(t.RatingKva is { } kva ? $" of {UnitDisplay.Number(kva)} kVA" : " to suit")}, no-load loss {Loss(t.NoLoadLoss)}, load loss {Loss(t.LoadLoss)}, {(t.StaysLive ? "live" : "off")} while the plant stands"
            : "transformer " + MemoContext.Percent(train.TransformerEfficiency);
        var line = train.Line is { } l
            ? $"line of {memo.Show.Length(l.LengthM)}, {UnitDisplay.Number(l.VoltageV, 4)} V, {(l.Phases == 3 ? "three phases" : "one phase")}, {l.Size.Name} {l.Metal.Name} at {memo.Show.Temperature(l.TemperatureDegC)}"
            : "line " + MemoContext.Percent(train.LineEfficiency);
        var factor = train.Transformer is null && train.Line is null ? "" : $"; power factor {UnitDisplay.Number(train.PowerFactor)}";
        return $"gear or belt {MemoContext.Percent(train.DriveEfficiency)}; {generator}; {transformer}; {line}{factor}";

        static string Loss(RatedLoss loss) => loss.LossKw is { } kw ? UnitDisplay.Power(kw) : MemoContext.Percent(loss.RatingShare) + " of the rating";
    }

    private static string Generator(MemoContext memo)
    {
        var train = memo.Result.Energy.Electrical!.Train;
        return train.Rated is { Generator: { } generator } rated
            ? $"{MemoContext.Count(rated.UnitCount)} × {UnitDisplay.Power(generator.RatedPowerKw)}, {Kind(train.Generator!.Kind)}; {MemoContext.Percent(generator.FullLoadEfficiency)} at rating, {MemoContext.Percent(generator.EfficiencyAt(0.5))} at half and {MemoContext.Percent(generator.EfficiencyAt(0.25))} at a quarter of it"
            : $"{MemoContext.Percent(train.GeneratorEfficiency)} at any load";
    }

    private static IEnumerable<Basis.Sources.Source> Sources(bool generator, bool transformer, bool line)
    {
        if (generator)
        {
            yield return ElectricalMethods.MachineLosses;
            yield return ElectricalMethods.GeneratorSizes;
        }

        if (transformer)
            yield return ElectricalMethods.Bird;
        if (line)
        {
            yield return ElectricalMethods.Chakrabarti;
            yield return ElectricalMethods.Wires;
        }
    }

    private static string Kind(GeneratorKind kind) => kind == GeneratorKind.Induction ? "induction" : "synchronous";

    private static TableRow Row(string what, string power, string by) => new([what, power, by]);
}
