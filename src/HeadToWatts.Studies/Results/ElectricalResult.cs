using HeadToWatts.EnergyYield;
using HeadToWatts.EnergyYield.Electrical;

namespace HeadToWatts.Studies.Results;

/// <summary>What the study found between the shaft and the meter, where a machine there is given in detail.</summary>
/// <param name="Train">The train with its ratings settled.</param>
/// <param name="AtBest">Power after each step with the plant at its best.</param>
/// <param name="LineCurrentA">Current in each conductor of the line at that power, A; null without a line in detail.</param>
/// <param name="LineLossShare">Loss of the line over what enters it at that power; null without a line in detail.</param>
/// <param name="VoltageRiseRatio">Rise of voltage from the meter to the plant by resistance alone, over the voltage; null without a line in detail.</param>
/// <param name="GeneratorLoadRatio">Output over the rating of the generators running at that power; null without a generator in detail.</param>
public sealed record ElectricalResult(PowerTrain Train, TrainPower AtBest, double? LineCurrentA, double? LineLossShare, double? VoltageRiseRatio, double? GeneratorLoadRatio)
{
    /// <summary>Looks at a plant; null where every step keeps a constant ratio or the plant never runs.</summary>
    /// <param name="plant">The plant.</param>
    public static ElectricalResult? Of(PlantCurve plant)
    {
        ArgumentNullException.ThrowIfNull(plant);
        var train = plant.Design.Train;
        var point = plant.At(plant.BestUsableFlowM3PerS);
        if (train.IsConstant || !point.IsRunning)
            return null;
        var power = train.At(point.ShaftPowerKw, point.RunningShare, point.LoadSpread);
        var line = train.Line;
        var current = line?.CurrentA(power.MeterKw, train.PowerFactor);

        // Resistance alone, with the current in phase: R I cos φ over the voltage to neutral, or over that of both wires.
        var rise = line is null ? (double?)null : (line.Phases == 3 ? Math.Sqrt(3) : 2) * current!.Value * train.PowerFactor * line.ResistanceOhm / line.VoltageV;
        var running = (train.Rated?.GeneratorsKw ?? 0) * point.RunningShare;
        return new ElectricalResult(
            train,
            power,
            current,
            line is null ? null : (power.TransformedKw - power.MeterKw) / power.TransformedKw,
            rise,
            train.Rated?.Generator is null ? null : power.GeneratedKw / running);
    }
}
