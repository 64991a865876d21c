namespace HeadToWatts.Studies.Results;

/// <summary>Several units: the split that gives most power beside simply one after another.</summary>
/// <param name="InTurnKwh">Annual energy with the units one after another, kWh.</param>
/// <param name="BestKwh">Annual energy with the best split, kWh.</param>
/// <param name="Rows">The split at shares of the design flow.</param>
public sealed record SplitResult(double InTurnKwh, double BestKwh, IReadOnlyList<SplitRow> Rows)
{
    /// <summary>What the best split brings, over the energy one after another.</summary>
    public double GainRatio => InTurnKwh > 0 ? (BestKwh / InTurnKwh) - 1 : 0;
}

/// <summary>The units at one flow.</summary>
/// <param name="ShareOfDesignFlow">Flow over design flow.</param>
/// <param name="FlowM3PerS">Flow, m3/s.</param>
/// <param name="InTurnM3PerS">Flow of each unit one after another, m3/s.</param>
/// <param name="InTurnEfficiency">Efficiency of the turbines together then.</param>
/// <param name="BestM3PerS">Flow of each unit with the best split, m3/s.</param>
/// <param name="BestEfficiency">Efficiency of the turbines together then.</param>
public sealed record SplitRow(double ShareOfDesignFlow, double FlowM3PerS, IReadOnlyList<double> InTurnM3PerS, double InTurnEfficiency, IReadOnlyList<double> BestM3PerS, double BestEfficiency);
