using HeadToWatts.Turbines;

namespace HeadToWatts.Studies;

/// <summary>
/// What the types pass at runaway over their flow at full load, at the same head and opening. Typical figures from memory, for screening:
/// a jet does not know the runner's speed; radial runners hold water back as they race, low specific speeds the more; axial runners draw more.
/// The maker's figure takes their place.
/// </summary>
public static class RunawayFlows
{
    /// <summary>Time to runaway speed assumed when none is given, s. From memory: 1 to 3 s is usual of small sets.</summary>
    public const double UsualTimeS = 2;

    private static readonly Dictionary<string, double> ByType = new(StringComparer.Ordinal)
    {
        ["pelton"] = 1, ["turgo"] = 1, ["crossflow"] = 0.8, ["francis"] = 0.6, ["pump-as-turbine"] = 0.6, ["kaplan"] = 1.2, ["propeller"] = 1.2,
    };

    /// <summary>The usual ratio of a type; 1 where this project has none.</summary>
    /// <param name="type">The type.</param>
    public static double UsualRatio(TurbineType type)
    {
        ArgumentNullException.ThrowIfNull(type);
        return ByType.GetValueOrDefault(type.Id, 1);
    }
}
