namespace HeadToWatts.Drawings.Scheme;

/// <summary>A pipe of the section.</summary>
/// <param name="Name">Name.</param>
/// <param name="LengthM">Length along the pipe.</param>
/// <param name="InsideDiameterM">Inside diameter.</param>
/// <param name="VelocityMPerS">Mean velocity at the flow shown.</param>
public sealed record SectionPipe(string Name, double LengthM, double InsideDiameterM, double VelocityMPerS);

/// <summary>Energy at one place of the waterway.</summary>
/// <param name="StationM">Distance along the pipe from the intake.</param>
/// <param name="CentreLevelM">Level of the pipe's centre.</param>
/// <param name="HydraulicGradeM">Level of the hydraulic grade line.</param>
/// <param name="EnergyGradeM">Level of the energy grade line.</param>
public readonly record struct GradePoint(double StationM, double CentreLevelM, double HydraulicGradeM, double EnergyGradeM);

/// <summary>What the section through the scheme shows.</summary>
/// <param name="FlowM3PerS">Flow through the waterway.</param>
/// <param name="HeadwaterM">Headwater level.</param>
/// <param name="TailwaterM">Tailwater level.</param>
/// <param name="LevelsAreKnown">False when only the head is known; levels then count from the tailwater.</param>
/// <param name="NetHeadM">Net head at the flow.</param>
/// <param name="Pipes">The pipes in the order of the flow; none when the machine stands at the drop.</param>
/// <param name="Grades">Start and end of every pipe in turn: two points for each pipe.</param>
/// <param name="Machine">The machine, as "Kaplan × 1".</param>
/// <param name="MeterPowerKw">Power at the flow; zero while the plant stands.</param>
public sealed record SchemeSectionInput(
    double FlowM3PerS,
    double HeadwaterM,
    double TailwaterM,
    bool LevelsAreKnown,
    double NetHeadM,
    IReadOnlyList<SectionPipe> Pipes,
    IReadOnlyList<GradePoint> Grades,
    string Machine,
    double MeterPowerKw)
{
    /// <summary>Highest headwater the picture has to hold, where the levels move with the flow; null where they stay.</summary>
    public double? HighestHeadwaterM { get; init; }

    /// <summary>Lowest tailwater the picture has to hold, where the levels move with the flow; null where they stay.</summary>
    public double? LowestTailwaterM { get; init; }

    /// <summary>Highest level of the picture's scale.</summary>
    public double TopM => HighestHeadwaterM ?? HeadwaterM;

    /// <summary>Lowest water level of the picture's scale.</summary>
    public double FootM => LowestTailwaterM ?? TailwaterM;

    /// <summary>Gross head.</summary>
    public double GrossHeadM => HeadwaterM - TailwaterM;

    /// <summary>Head lost on the way and behind the machine.</summary>
    public double LossM => GrossHeadM - NetHeadM;

    /// <summary>Level of the energy grade line in front of the machine.</summary>
    public double EnergyAtMachineM => Grades.Count > 0 ? Grades[^1].EnergyGradeM : TailwaterM + NetHeadM;

    /// <summary>Head lost behind the machine.</summary>
    public double LossBehindMachineM => Math.Max(0, EnergyAtMachineM - NetHeadM - TailwaterM);
}
