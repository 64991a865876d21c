namespace HeadToWatts.Basis.Units;

/// <summary>The family of units in which results are shown. It never changes a stored value.</summary>
public enum UnitSystem
{
    /// <summary>International System: m3/s, m, mm, kPa.</summary>
    SI,

    /// <summary>United States customary: cfs, ft, in, psi.</summary>
    US,
}
