using HeadToWatts.Basis.Sources;

namespace HeadToWatts.Hydraulics.LocalLosses;

/// <summary>Sudden contraction: K = 0.5 (1 - A_2/A_1) on the velocity head of the smaller pipe.</summary>
public static class SuddenContraction
{
    /// <summary>The method.</summary>
    public static readonly Method Method = new(
        "sudden-contraction", "Sudden contraction", "K = 0.5 (1 - A_2/A_1) on V_2", LocalLossSources.Weisbach, "",
        [new InputRange("A_2/A_1", "area ratio", "1", 0, 1)]);

    /// <summary>K on the velocity head of the smaller, downstream pipe.</summary>
    /// <param name="areaRatio">Downstream over upstream area A_2/A_1; 0 to 1.</param>
    /// <exception cref="ArgumentOutOfRangeException">Outside 0 to 1 or not a number.</exception>
    public static double LossCoefficient(double areaRatio) =>
        areaRatio is >= 0 and <= 1
            ? 0.5 * (1 - areaRatio)
            : throw new ArgumentOutOfRangeException(nameof(areaRatio), areaRatio, "The area ratio lies between 0 and 1.");
}
