using System.Globalization;
using HeadToWatts.Basis.Sources;

namespace HeadToWatts.FlowRecords.Ratings;

/// <summary>Q = C (h - h_0)^n, fitted to measurements between two stages.</summary>
public sealed class RatingEquation : StageRating
{
    private readonly double _lowestStageM;

    /// <summary>A rating equation.</summary>
    /// <param name="coefficient">C: the flow in m3/s at one metre above the stage of no flow; above 0.</param>
    /// <param name="zeroFlowStageM">Stage of no flow h_0, m.</param>
    /// <param name="exponent">n, above 0; usually 1.3 to 3.</param>
    /// <param name="lowestStageM">Lowest stage measured, m; null for the stage of no flow.</param>
    /// <param name="highestStageM">Highest stage measured, m; null when it is not known.</param>
    /// <exception cref="ArgumentOutOfRangeException">A figure is not above 0 or not a number, or the stages are out of order.</exception>
    public RatingEquation(double coefficient, double zeroFlowStageM, double exponent, double? lowestStageM = null, double? highestStageM = null)
    {
        if (!(coefficient > 0 && double.IsFinite(coefficient)))
            throw new ArgumentOutOfRangeException(nameof(coefficient), coefficient, "The coefficient is above 0.");
        if (!double.IsFinite(zeroFlowStageM))
            throw new ArgumentOutOfRangeException(nameof(zeroFlowStageM), zeroFlowStageM, "The stage of no flow is a number.");
        if (!(exponent > 0 && double.IsFinite(exponent)))
            throw new ArgumentOutOfRangeException(nameof(exponent), exponent, "The exponent is above 0.");
        if (lowestStageM is { } lowest && !(lowest >= zeroFlowStageM))
            throw new ArgumentOutOfRangeException(nameof(lowestStageM), lowestStageM, "The lowest stage measured is not below the stage of no flow.");
        if (highestStageM is { } highest && !(highest > (lowestStageM ?? zeroFlowStageM)))
            throw new ArgumentOutOfRangeException(nameof(highestStageM), highestStageM, "The highest stage measured lies above the lowest.");
        Coefficient = coefficient;
        ZeroFlowStageM = zeroFlowStageM;
        Exponent = exponent;
        _lowestStageM = lowestStageM ?? zeroFlowStageM;
        HighestStageM = highestStageM ?? double.PositiveInfinity;
    }

    /// <inheritdoc/>
    public override Method Method => RatingMethods.Equation;

    /// <summary>C: flow in m3/s at one metre above the stage of no flow.</summary>
    public double Coefficient { get; }

    /// <summary>Stage of no flow h_0, m.</summary>
    public double ZeroFlowStageM { get; }

    /// <summary>n.</summary>
    public double Exponent { get; }

    /// <inheritdoc/>
    public override double LowestStageM => _lowestStageM;

    /// <inheritdoc/>
    public override double HighestStageM { get; }

    /// <inheritdoc/>
    public override string Describe() =>
        $"Q = {Text(Coefficient)} (h - {Text(ZeroFlowStageM)} m)^{Text(Exponent)} in m3/s" + (double.IsInfinity(HighestStageM) ? ", highest measured stage not stated" : $", {Text(LowestStageM)} to {Text(HighestStageM)} m");

    /// <inheritdoc/>
    protected override double FlowAt(double stageM) => stageM <= ZeroFlowStageM ? 0 : Coefficient * Math.Pow(stageM - ZeroFlowStageM, Exponent);

    private static string Text(double value) => value.ToString("0.######", CultureInfo.InvariantCulture);
}
