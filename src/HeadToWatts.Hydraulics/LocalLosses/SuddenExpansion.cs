using HeadToWatts.Basis.Sources;

namespace HeadToWatts.Hydraulics.LocalLosses;

/// <summary>Sudden expansion after Borda and Carnot: h_L = (V_1 - V_2)^2/2g.</summary>
public static class SuddenExpansion
{
    /// <summary>The method.</summary>
    public static readonly Method Method = new(
        "borda-carnot", "Sudden expansion, Borda-Carnot", "h_L = (V_1 - V_2)^2/2g, K = (1 - A_1/A_2)^2 on V_1", LocalLossSources.Borda, "",
        [new InputRange("A_1/A_2", "area ratio", "1", 0, 1)]);

    /// <summary>K on the velocity head of the smaller, upstream pipe.</summary>
    /// <param name="areaRatio">Upstream over downstream area A_1/A_2; 0 to 1.</param>
    /// <exception cref="ArgumentOutOfRangeException">Outside 0 to 1 or not a number.</exception>
    public static double LossCoefficient(double areaRatio) =>
        areaRatio is >= 0 and <= 1
            ? (1 - areaRatio) * (1 - areaRatio)
            : throw new ArgumentOutOfRangeException(nameof(areaRatio), areaRatio, "The area ratio lies between 0 and 1.");
}
