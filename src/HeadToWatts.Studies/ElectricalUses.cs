using HeadToWatts.Basis.Sources;
using HeadToWatts.EnergyYield;
using HeadToWatts.EnergyYield.Electrical;

namespace HeadToWatts.Studies;

/// <summary>The methods used between the shaft and the meter.</summary>
internal static class ElectricalUses
{
    internal static IEnumerable<MethodUse> Of(PowerTrain train, PlantChoice choice)
    {
        if (train.Generator is { } generator)
        {
            if (generator.FullLoadEfficiency is null)
            {
                // The rating follows the unit where none is given; the candidate's power at the meter is near enough to say which part of the table was read.
                var ratedKw = generator.RatedPowerKw ?? Math.Max(choice.Chosen.MeterPowerKw / choice.Chosen.UnitCount, 1e-3);
                yield return ElectricalMethods.GeneratorSize.Used(new InputSpan("P_r", ratedKw, ratedKw));
            }

            yield return ElectricalMethods.GeneratorLosses.Used();
        }

        if (train.Transformer is not null)
            yield return ElectricalMethods.TransformerLosses.Used();
        if (train.Line is { } line)
        {
            yield return ElectricalMethods.LineLoss.Used(new InputSpan("φ", train.PowerFactor, train.PowerFactor));
            yield return ElectricalMethods.ConductorResistance.Used(new InputSpan("T", line.TemperatureDegC, line.TemperatureDegC));
            if (line.Size.Name.EndsWith("AWG", StringComparison.Ordinal))
                yield return ElectricalMethods.WireGauge.Used();
        }
    }
}
