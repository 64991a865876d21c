namespace HeadToWatts.Hydraulics.Transients;

/// <summary>What one place along the pipes went through.</summary>
/// <param name="PipeIndex">Which pipe.</param>
/// <param name="StationM">Length of pipe from the intake, m.</param>
/// <param name="CentreM">Elevation of the pipe's centre, m.</param>
/// <param name="SteadyHeadM">Piezometric head before the trip, m above the zero of the levels.</param>
/// <param name="HighestHeadM">Highest head, m.</param>
/// <param name="LowestHeadM">Lowest head, m.</param>
public readonly record struct TransientNode(int PipeIndex, double StationM, double CentreM, double SteadyHeadM, double HighestHeadM, double LowestHeadM)
{
    /// <summary>Highest pressure head, m gauge.</summary>
    public double HighestPressureHeadM => HighestHeadM - CentreM;

    /// <summary>Lowest pressure head, m gauge.</summary>
    public double LowestPressureHeadM => LowestHeadM - CentreM;
}

/// <summary>Where and when the water column parted first.</summary>
/// <param name="TimeS">Time since the trip, s.</param>
/// <param name="StationM">Length of pipe from the intake, m.</param>
public readonly record struct ColumnSeparation(double TimeS, double StationM);

/// <summary>What a stop does to the pipes.</summary>
/// <param name="Case">What was stopped.</param>
/// <param name="Stop">How.</param>
/// <param name="Grid">The grid it ran on.</param>
/// <param name="Nodes">The places along the pipes in the order of the flow; joints appear once for each pipe.</param>
/// <param name="MachineHeadsM">Piezometric head before the machine at every step, from the trip on, m.</param>
/// <param name="MachineFlowsM3PerS">Flow through the machine at every step, m3/s.</param>
/// <param name="Separation">First parting of the water column; null when the pressure stays above that of vapour. What comes after it is not reckoned with a cavity and does not hold.</param>
public sealed record TransientResult(
    TransientCase Case,
    StopManoeuvre Stop,
    TransientGrid Grid,
    IReadOnlyList<TransientNode> Nodes,
    IReadOnlyList<double> MachineHeadsM,
    IReadOnlyList<double> MachineFlowsM3PerS,
    ColumnSeparation? Separation)
{
    /// <summary>Highest head before the machine, m.</summary>
    public double HighestMachineHeadM => Nodes[^1].HighestHeadM;

    /// <summary>Rise of the head before the machine over standing water, m.</summary>
    public double RiseOverStaticM => HighestMachineHeadM - Case.HeadwaterM;

    /// <summary>Time of the highest head before the machine, s.</summary>
    public double HighestAtS => Grid.TimeStepS * IndexOfHighest();

    /// <summary>Length of time reckoned, s.</summary>
    public double DurationS => Grid.TimeStepS * (MachineHeadsM.Count - 1);

    /// <summary>The place of the lowest pressure.</summary>
    public TransientNode LowestPressure => Nodes.MinBy(n => n.LowestPressureHeadM);

    private int IndexOfHighest()
    {
        var best = 0;
        for (var i = 1; i < MachineHeadsM.Count; i++)
        {
            if (MachineHeadsM[i] > MachineHeadsM[best])
                best = i;
        }

        return best;
    }
}
