namespace HeadToWatts.Hydraulics.Friction;

/// <summary>How the water flows in the pipe.</summary>
public enum FlowRegime
{
    /// <summary>No flow.</summary>
    Still,

    /// <summary>Laminar: Reynolds number below 2,000.</summary>
    Laminar,

    /// <summary>Transition: Reynolds number from 2,000 to 4,000, where no formula is sure.</summary>
    Transition,

    /// <summary>Turbulent: Reynolds number above 4,000.</summary>
    Turbulent,
}
