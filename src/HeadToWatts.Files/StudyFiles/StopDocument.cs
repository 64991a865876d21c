namespace HeadToWatts.Files.StudyFiles;

/// <summary>How the plant stops when the unit trips.</summary>
public sealed class StopDocument
{
    /// <summary>Time from full opening to closed.</summary>
    public string? ClosingTime { get; set; }

    /// <summary>What falls evenly: "opening" or "flow".</summary>
    public string? Law { get; set; }

    /// <summary>Flow passed at runaway over the flow at full load.</summary>
    public string? RunawayFlow { get; set; }

    /// <summary>Time from the trip to runaway speed.</summary>
    public string? RunawayTime { get; set; }

    /// <summary>How the pipes are held lengthwise: "anchored throughout", "anchored upstream" or "expansion joints".</summary>
    public string? Restraint { get; set; }

    /// <summary>Highest pressure allowed before the machine.</summary>
    public string? PressureLimit { get; set; }
}
