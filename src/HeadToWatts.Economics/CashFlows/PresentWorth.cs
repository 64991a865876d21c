namespace HeadToWatts.Economics.CashFlows;

/// <summary>The factors of interest over whole years. Rates are ratios (0.06 for 6 %), payments fall at the end of each year.</summary>
public static class PresentWorth
{
    /// <summary>Worth today of 1 after some years: (1 + i)^-n.</summary>
    /// <param name="rate">Rate i, above -1.</param>
    /// <param name="years">Years n, 0 or more.</param>
    public static double OfOne(double rate, int years) => Math.Pow(1 + Checked(rate), -years);

    /// <summary>P/A, worth today of 1 at the end of each of n years: ((1 + i)^n - 1)/(i (1 + i)^n).</summary>
    /// <param name="rate">Rate i, above -1.</param>
    /// <param name="years">Years n, 0 or more.</param>
    public static double OfUniform(double rate, int years)
    {
        // expm1 and log1p keep every digit at small rates, where the printed form loses them.
        Checked(rate);
        return Math.Abs(rate) < 1e-300 ? years : -ExpM1(-years * Log1P(rate)) / rate;
    }

    /// <summary>A/P, yearly sum that pays back 1 with interest over n years; the inverse of P/A.</summary>
    /// <param name="rate">Rate i, above -1.</param>
    /// <param name="years">Years n, 1 or more.</param>
    public static double CapitalRecovery(double rate, int years) => 1 / OfUniform(rate, years);

    /// <summary>F/A, worth after n years of 1 put by at the end of each: ((1 + i)^n - 1)/i.</summary>
    /// <param name="rate">Rate i, above -1.</param>
    /// <param name="years">Years n, 0 or more.</param>
    public static double FutureOfUniform(double rate, int years) => OfUniform(rate, years) * Math.Pow(1 + rate, years);

    /// <summary>P/G, worth today of 0, 1, 2, ... n-1 at the ends of n years.</summary>
    /// <param name="rate">Rate i, above -1.</param>
    /// <param name="years">Years n, 0 or more.</param>
    public static double OfGradient(double rate, int years)
    {
        Checked(rate);
        var sum = 0.0;
        for (var n = years; n >= 1; n--)
            sum = (sum + n - 1) / (1 + rate);
        return sum;
    }

    /// <summary>Worth today of n payments of which the first is 1 and each next one grows by g: (1 - ((1 + g)/(1 + d))^n)/(d - g).</summary>
    /// <param name="growthRate">Growth g from year to year, above -1.</param>
    /// <param name="rate">Rate d, above -1.</param>
    /// <param name="years">Years n, 0 or more.</param>
    public static double OfGrowing(double growthRate, double rate, int years)
    {
        Checked(growthRate);
        Checked(rate);
        var step = Log1P(growthRate) - Log1P(rate);
        var gap = rate - growthRate;
        return Math.Abs(gap) < 1e-14 ? years / (1 + rate) : -ExpM1(years * step) / gap;
    }

    /// <summary>Worth today of a row of flows; the first falls today, each next one a year later.</summary>
    /// <param name="amounts">Flows, year 0 first.</param>
    /// <param name="rate">Rate, above -1.</param>
    public static double OfFlows(ReadOnlySpan<double> amounts, double rate)
    {
        var discount = 1 / (1 + Checked(rate));
        var sum = 0.0;
        for (var n = amounts.Length - 1; n >= 0; n--)
            sum = (sum * discount) + amounts[n];
        return sum;
    }

    /// <summary>The rate above inflation: (1 + nominal)/(1 + inflation) - 1.</summary>
    /// <param name="nominalRate">Nominal rate.</param>
    /// <param name="inflationRate">Inflation, above -1.</param>
    public static double RealRate(double nominalRate, double inflationRate) => ((1 + Checked(nominalRate)) / (1 + Checked(inflationRate))) - 1;

    private static double Checked(double rate) => rate > -1 && double.IsFinite(rate) ? rate : throw new ArgumentOutOfRangeException(nameof(rate), rate, "A rate lies above -100 %.");

    private static double Log1P(double x)
    {
        var u = 1 + x;
        return u == 1 ? x : Math.Log(u) * x / (u - 1);
    }

    private static double ExpM1(double x) => Math.Abs(x) < 1e-5 ? x + (x * x / 2) + (x * x * x / 6) : Math.Exp(x) - 1;
}
