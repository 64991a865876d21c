using HeadToWatts.Basis.Sources;
using MathNet.Numerics;
using MathNet.Numerics.Distributions;

namespace HeadToWatts.FlowRecords.Statistics;

/// <summary>Frequency factor K of the Pearson type III distribution: the standardised value not exceeded with a probability.</summary>
public static class PearsonThree
{
    // Below this skew the gamma distribution's shape passes 10,000; the Cornish-Fisher series is then exact to 1e-13.
    private const double SmallSkew = 0.02;

    /// <summary>The method.</summary>
    internal static readonly Method Method = new(
        "pearson-3-frequency-factor", "Pearson type III frequency factor", "F = P(α, α + K α^{1/2}), α = 4/G^2", FlowRecordSources.Bulletin17B, "appendix 3",
        [new InputRange("G", "skew coefficient", "1", -9, 9)]);

    /// <summary>K for a skew and a probability of not being exceeded.</summary>
    /// <param name="skewCoefficient">G; any finite number.</param>
    /// <param name="nonExceedance">F; above 0 and below 1.</param>
    /// <exception cref="ArgumentOutOfRangeException">F is not within 0 and 1, or a figure is not a number.</exception>
    public static double FrequencyFactor(double skewCoefficient, double nonExceedance)
    {
        if (!(nonExceedance is > 0 and < 1))
            throw new ArgumentOutOfRangeException(nameof(nonExceedance), nonExceedance, "A probability lies between 0 and 1.");
        if (!double.IsFinite(skewCoefficient))
            throw new ArgumentOutOfRangeException(nameof(skewCoefficient), skewCoefficient, "A skew is a number.");
        if (Math.Abs(skewCoefficient) < SmallSkew)
            return Series(skewCoefficient, Normal.InvCDF(0, 1, nonExceedance));
        // A negative skew is the mirror image.
        return skewCoefficient > 0 ? Gamma(skewCoefficient, nonExceedance) : -Gamma(-skewCoefficient, 1 - nonExceedance);
    }

    private static double Gamma(double skew, double nonExceedance)
    {
        var shape = 4 / (skew * skew);
        var deviation = Math.Sqrt(shape);
        // The standardised value runs from -sqrt(shape) upwards; probabilities beyond 40 deviations do not occur.
        double low = Math.Max(-deviation, -40), high = 40;
        while (true)
        {
            var middle = low + ((high - low) / 2);
            if (middle <= low || middle >= high)
                return middle;
            if (SpecialFunctions.GammaLowerRegularized(shape, shape + (deviation * middle)) < nonExceedance)
                low = middle;
            else
                high = middle;
        }
    }

    // Cornish-Fisher expansion of the gamma distribution in powers of the skew g, z the normal value.
    private static double Series(double g, double z)
    {
        var z2 = z * z;
        return z
            + ((z2 - 1) * g / 6)
            + (z * (z2 - 7) * g * g / 144)
            - (((6 * z2 * z2) + (14 * z2) - 32) * g * g * g / 12_960)
            + (z * ((9 * z2 * z2) + (256 * z2) - 433) * g * g * g * g / 622_080);
    }
}
