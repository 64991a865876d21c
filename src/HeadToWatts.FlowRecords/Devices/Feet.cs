namespace HeadToWatts.FlowRecords.Devices;

/// <summary>The foot, for formulas printed in feet and cubic feet per second.</summary>
internal static class Feet
{
    /// <summary>One foot, m.</summary>
    public const double FootM = 0.3048;

    /// <summary>One cubic foot, m3.</summary>
    public const double CubicFootM3 = FootM * FootM * FootM;

    /// <summary>Root of a foot in root metres: turns a weir's coefficient in ft^(1/2)/s to m^(1/2)/s.</summary>
    public static readonly double RootFoot = Math.Sqrt(FootM);
}
