namespace HeadToWatts.Hydraulics.Transients;

/// <summary>What falls evenly with time while the machine or valve closes.</summary>
public enum StopLaw
{
    /// <summary>The opening falls evenly; the flow follows from opening and head as through an orifice.</summary>
    OpeningFallsEvenly,

    /// <summary>The flow itself falls evenly, as the formulas of slow closure suppose.</summary>
    FlowFallsEvenly,
}
