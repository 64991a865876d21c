using HeadToWatts.Basis.Sources;

namespace HeadToWatts.Hydraulics.Canals;

/// <summary>Depth at the brink of a free drop: 0.715 y_c, with the critical depth itself three to four y_c upstream.</summary>
public static class FreeOverfall
{
    /// <summary>Depth at the brink over the critical depth.</summary>
    public const double BrinkDepthRatio = 0.715;

    /// <summary>The method.</summary>
    public static readonly Method Method = new(
        "free-overfall-brink-depth", "Depth at the brink of a free drop", "y_b = 0.715 y_c", CanalSources.Rouse, "rectangular canal, slow approach, nappe free below", []);

    /// <summary>Depth at the brink y_b, m. Measured for rectangular canals whose approach is slow; for other shapes a rough guide.</summary>
    /// <param name="criticalDepthM">Critical depth y_c, m; above 0.</param>
    public static double BrinkDepthM(double criticalDepthM)
    {
        DepthSearch.RequirePositive(criticalDepthM, nameof(criticalDepthM));
        return BrinkDepthRatio * criticalDepthM;
    }
}
