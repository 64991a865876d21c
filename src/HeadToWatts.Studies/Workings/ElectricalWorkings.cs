using HeadToWatts.Basis.Units;
using HeadToWatts.EnergyYield;
using HeadToWatts.EnergyYield.Electrical;

namespace HeadToWatts.Studies.Workings;

/// <summary>From the shaft to the meter, where a machine there is given in detail.</summary>
internal static class ElectricalWorkings
{
    internal static IEnumerable<Working> Of(StudyResult result)
    {
        if (result.Energy.Electrical is not { } found)
            yield break;
        var train = found.Train;
        var at = found.AtBest;
        if (train.Rated is { Generator: { } generator } rated)
        {
            var loss = at.DrivenKw - at.GeneratedKw;
            var load = found.GeneratorLoadRatio ?? 0;
            yield return new Working(
                "generator-losses", StudyStage.Energy, "Losses of the generators", ElectricalMethods.GeneratorLosses.Formula,
                $"{UnitDisplay.Power(at.GeneratedKw / load)} × (1/{UnitDisplay.Number(generator.FullLoadEfficiency)} − 1) × ({GeneratorMachine.ConstantLossShare} + {UnitDisplay.Number(1 - GeneratorMachine.ConstantLossShare)} × {UnitDisplay.Number(load)}^(2))",
                UnitDisplay.Power(loss),
                $"{(rated.UnitCount > 1 ? $"{rated.UnitCount} generators of " : "Rated ")}{UnitDisplay.Power(generator.RatedPowerKw)}{(rated.UnitCount > 1 ? " each" : "")}{(train.Generator!.RatedPowerKw is null ? ", sized to the unit" : "")}. {(train.Generator.FullLoadEfficiency is null ? "The efficiency at rating is the usual one of that size." : "The efficiency at rating is as given.")} Every flow has its own losses: at half load the efficiency is {UnitDisplay.Percent(generator.EfficiencyAt(0.5))}.",
                train.Generator.FullLoadEfficiency is null ? [ElectricalMethods.GeneratorLosses, ElectricalMethods.GeneratorSize] : [ElectricalMethods.GeneratorLosses]);
        }

        if (train.Rated?.Transformer is { } transformer)
        {
            var load = at.TransformedKw / (train.PowerFactor * transformer.RatingKva);
            yield return new Working(
                "transformer-losses", StudyStage.Energy, "Losses of the transformer", ElectricalMethods.TransformerLosses.Formula,
                $"{UnitDisplay.Power(transformer.NoLoadLossKw)} + {UnitDisplay.Power(transformer.LoadLossKw)} × {UnitDisplay.Number(load)}^(2)",
                UnitDisplay.Power(at.SentKw - at.TransformedKw),
                $"{UnitDisplay.Power(at.TransformedKw)} at a power factor of {UnitDisplay.Number(train.PowerFactor)} on {UnitDisplay.Number(transformer.RatingKva)} kVA. "
                    + (train.Transformer!.StaysLive ? "It stays live while the plant stands and draws its no-load loss from the grid." : "It is switched off while the plant stands."),
                [ElectricalMethods.TransformerLosses]);
        }

        if (train.Line is { } line)
        {
            yield return new Working(
                "line-loss", StudyStage.Energy, "Loss of the line", line.Phases == 3 ? ElectricalMethods.LineLoss.Formula : "P_{loss} = 2 R P^2/(V^2 cos^2 φ)",
                $"{(line.Phases == 3 ? "" : "2 × ")}{UnitDisplay.Number(line.ResistanceOhm)} Ω × ({UnitDisplay.Power(at.MeterKw)})^(2) / (({UnitDisplay.Number(line.VoltageV)} V)^(2) × {UnitDisplay.Number(train.PowerFactor)}^(2))",
                UnitDisplay.Power(at.TransformedKw - at.MeterKw),
                $"{line.Size.Name} {line.Metal.Name}, {UnitDisplay.Number(line.Size.AreaMm2)} mm², at {UnitDisplay.Number(line.TemperatureDegC)} °C; {UnitDisplay.Number(found.LineCurrentA!.Value)} A in each conductor.",
                [ElectricalMethods.LineLoss, ElectricalMethods.ConductorResistance]);
        }

        yield return new Working(
            "shaft-to-meter", StudyStage.Energy, "From the shaft to the meter", "P_{shaft} → P_d → P_g → P_u → P_{tr} → P",
            $"{UnitDisplay.Power(at.DrivenKw)} after gear or belt; {UnitDisplay.Power(at.GeneratedKw)} at the generators; {UnitDisplay.Power(at.SentKw)} after own use; {UnitDisplay.Power(at.TransformedKw)} after the transformer",
            UnitDisplay.Power(at.MeterKw),
            "At full power. Each step's energy over the year is reckoned at every flow and adds up in the staircase.", [EnergyMethods.WaterPower]);
        yield return new Working(
            "power", StudyStage.Energy, "Power at the meter", "P = P_{shaft} − Σ P_{loss}",
            $"{UnitDisplay.Power(at.DrivenKw / train.DriveEfficiency)} − {UnitDisplay.Power((at.DrivenKw / train.DriveEfficiency) - at.MeterKw)}",
            UnitDisplay.Power(at.MeterKw),
            $"Installed power, at the generator: {UnitDisplay.Power(result.Energy.Annual.InstalledPowerKw)}.", [EnergyMethods.WaterPower]);
    }
}
