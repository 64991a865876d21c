namespace HeadToWatts.Basis.Units;

/// <summary>What a quantity measures. A unit belongs to one dimension, and a field accepts one dimension.</summary>
public enum Dimension
{
    /// <summary>Volume of water per unit time; SI unit m3/s.</summary>
    Flow,

    /// <summary>Length, head, elevation, diameter, roughness; SI unit m.</summary>
    Length,

    /// <summary>Gauge pressure; SI unit Pa.</summary>
    Pressure,

    /// <summary>Power; SI unit W.</summary>
    Power,

    /// <summary>Energy; SI unit J.</summary>
    Energy,

    /// <summary>Volume; SI unit m3.</summary>
    Volume,

    /// <summary>Velocity; SI unit m/s.</summary>
    Velocity,

    /// <summary>Temperature; held in degrees Celsius.</summary>
    Temperature,

    /// <summary>Ratio, held as 0 to 1 and written in percent.</summary>
    Ratio,

    /// <summary>Plane angle; SI unit rad.</summary>
    Angle,

    /// <summary>Time span; SI unit s.</summary>
    Duration,

    /// <summary>Electrical frequency; SI unit Hz.</summary>
    Frequency,

    /// <summary>Shaft speed; held in revolutions per minute.</summary>
    RotationalSpeed,

    /// <summary>Electrical voltage; SI unit V.</summary>
    Voltage,

    /// <summary>Electrical apparent power; SI unit VA.</summary>
    ApparentPower,

    /// <summary>Area; SI unit m2.</summary>
    Area,
}
