using HeadToWatts.EnergyYield.Electrical;

namespace HeadToWatts.EnergyYield;

/// <summary>
/// What lies between the turbine shaft and the meter, as constant ratios of 0 to 1, and how much of the time the plant is fit to run.
/// Where a machine is given in detail its ratio is not used; a plant then settles the ratings (<see cref="RatedFor"/>).
/// </summary>
/// <param name="DriveEfficiency">Gear or belt between turbine and generator; 1 when they share a shaft.</param>
/// <param name="GeneratorEfficiency">Generator.</param>
/// <param name="TransformerEfficiency">Transformer.</param>
/// <param name="LineEfficiency">Line from the transformer to the meter.</param>
/// <param name="OwnUseRatio">Share of the generator's output that the plant itself uses while it runs.</param>
/// <param name="OwnUseKw">Power that the plant itself draws while it runs, kW.</param>
/// <param name="Availability">Share of the time in which the plant can run when there is water.</param>
public sealed record PowerTrain(
    double DriveEfficiency,
    double GeneratorEfficiency,
    double TransformerEfficiency,
    double LineEfficiency,
    double OwnUseRatio,
    double OwnUseKw,
    double Availability)
{
    /// <summary>The generators in detail; null where <see cref="GeneratorEfficiency"/> holds at every load.</summary>
    public GeneratorMachine? Generator { get; init; }

    /// <summary>The transformer in detail; null where <see cref="TransformerEfficiency"/> holds at every load.</summary>
    public TransformerMachine? Transformer { get; init; }

    /// <summary>The line in detail; null where <see cref="LineEfficiency"/> holds at every load.</summary>
    public LineRun? Line { get; init; }

    /// <summary>Power factor in transformer and line, above 0 and up to 1.</summary>
    public double PowerFactor { get; init; } = 1;

    /// <summary>The ratings settled for a plant; null before <see cref="RatedFor"/>, and where nothing is given in detail.</summary>
    public RatedTrain? Rated { get; init; }

    /// <summary>True when every step keeps a constant ratio, so that power at the meter follows from the power at the shaft alone.</summary>
    public bool IsConstant => Generator is null && Transformer is null && Line is null;

    /// <summary>What the plant draws from the grid while it stands, kW.</summary>
    public double StandingDrawKw => Transformer is { StaysLive: true } ? Rated?.Transformer?.NoLoadLossKw ?? 0 : 0;

    /// <summary>Settles the ratings of machines given in detail for a plant; a train of constant ratios stays as it is.</summary>
    /// <param name="unitShaftKw">Power at the shaft of one unit at its best, kW.</param>
    /// <param name="unitCount">Number of units, each with a generator.</param>
    public PowerTrain RatedFor(double unitShaftKw, int unitCount)
    {
        if (IsConstant)
            return this;
        var drivenKw = Math.Max(unitShaftKw, 0) * DriveEfficiency;
        var generator = Generator?.Rate(drivenKw);
        var generatorsKw = (generator?.RatedPowerKw ?? (drivenKw * GeneratorEfficiency)) * unitCount;
        return this with { Rated = new RatedTrain(generator, Transformer?.Rate(generatorsKw / PowerFactor), unitCount) };
    }

    /// <summary>Power after each step when the plant runs.</summary>
    /// <param name="shaftPowerKw">Power at the shafts of all units together, kW.</param>
    /// <param name="runningShare">Full flow of the running units over that of all units, above 0 and up to 1.</param>
    /// <param name="loadSpread">Mean square of the units' loads over the square of their mean, weighted by size over all units; 1/runningShare when all that run share the load alike.</param>
    public TrainPower At(double shaftPowerKw, double runningShare, double loadSpread)
    {
        var drivenKw = shaftPowerKw * DriveEfficiency;
        var generatedKw = drivenKw * GeneratorEfficiency;
        if (Rated is { Generator: { } generator } rated)
        {
            const double s = GeneratorMachine.ConstantLossShare;
            var loss = rated.GeneratorsLossKw;
            var kw = generator.RatedPowerKw * rated.UnitCount;
            generatedKw = SquareLoss.OutputKw(drivenKw, loss * s * runningShare, loss * (1 - s) * loadSpread / (kw * kw));
        }

        // A generator that draws because it cannot cover its own losses has no output to take a share of.
        var sentKw = generatedKw - (Math.Max(0, generatedKw) * OwnUseRatio) - OwnUseKw;
        var transformedKw = Passed(sentKw, TransformerEfficiency);
        if (Rated?.Transformer is { } transformer)
        {
            var full = PowerFactor * transformer.RatingKva;
            transformedKw = SquareLoss.OutputKw(sentKw, transformer.NoLoadLossKw, transformer.LoadLossKw / (full * full));
        }

        var meterKw = Line is { } line ? SquareLoss.OutputKw(transformedKw, 0, line.PerKw(PowerFactor)) : Passed(transformedKw, LineEfficiency);
        return new TrainPower(drivenKw, generatedKw, sentKw, transformedKw, meterKw);
    }

    // What is drawn loses on its way in as what is sent does on its way out.
    private static double Passed(double powerKw, double efficiency) => powerKw >= 0 ? powerKw * efficiency : powerKw / efficiency;

    /// <summary>Power at the meter from power at the shaft with all units running alike, kW. Below zero where the plant would use more than it makes; <see cref="PlantCurve"/> then keeps it standing.</summary>
    /// <param name="shaftPowerKw">Power at the turbine shaft, kW.</param>
    public double MeterPowerKw(double shaftPowerKw)
    {
        if (!IsConstant)
            return At(shaftPowerKw, 1, 1).MeterKw;
        var generatedKw = shaftPowerKw * DriveEfficiency * GeneratorEfficiency;
        return ((generatedKw * (1 - OwnUseRatio)) - OwnUseKw) * TransformerEfficiency * LineEfficiency;
    }

    /// <summary>Power at the generator's terminals from power at the shaft with all units running alike, kW.</summary>
    /// <param name="shaftPowerKw">Power at the turbine shaft, kW.</param>
    public double GeneratedPowerKw(double shaftPowerKw) => IsConstant ? shaftPowerKw * DriveEfficiency * GeneratorEfficiency : At(shaftPowerKw, 1, 1).GeneratedKw;
}
