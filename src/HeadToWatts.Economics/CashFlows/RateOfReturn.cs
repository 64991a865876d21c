using System.Globalization;

namespace HeadToWatts.Economics.CashFlows;

/// <summary>
/// The internal rates of return of a row of flows: every rate from -99 % to 1000 % a year at which its worth is zero. There may
/// be none, one or several; which it is, is said.
/// </summary>
public sealed record RateOfReturn
{
    private const double LowestDiscount = 1 / 11.0;
    private const double HighestDiscount = 100;

    private RateOfReturn(IReadOnlyList<double> rates, int signChanges)
    {
        Rates = rates;
        SignChanges = signChanges;
    }

    /// <summary>Every rate found, lowest first, as ratios.</summary>
    public IReadOnlyList<double> Rates { get; }

    /// <summary>How often the flows change their sign: no more rates than that can exist.</summary>
    public int SignChanges { get; }

    /// <summary>The rate, where there is exactly one; null otherwise.</summary>
    public double? Rate => Rates.Count == 1 ? Rates[0] : null;

    /// <summary>What was found, in words.</summary>
    public string Statement => Rates.Count switch
    {
        1 => "one rate of return",
        0 when SignChanges == 0 => "no rate of return: the flows are all of one sign",
        0 => "no rate of return between −99 % and 1000 % a year",
        _ => string.Create(CultureInfo.InvariantCulture, $"{Rates.Count} rates of return, so that none of them says whether the plan pays"),
    };

    /// <summary>Finds every rate.</summary>
    /// <param name="amounts">Flows, year 0 first.</param>
    public static RateOfReturn Of(ReadOnlySpan<double> amounts)
    {
        var first = 0;
        var end = amounts.Length;
        while (first < end && amounts[first] == 0)
            first++;
        while (end > first && amounts[end - 1] == 0)
            end--;
        var flows = amounts[first..end].ToArray();
        var rates = Roots(flows).Select(v => (1 / v) - 1).Order().ToList();
        return new RateOfReturn(rates, Changes(flows));
    }

    /// <summary>
    /// The modified rate: what is paid out is financed at one rate, what comes in is put by at another until the end,
    /// (F/P)^(1/n) - 1. Null when nothing is paid out or nothing comes in.
    /// </summary>
    /// <param name="amounts">Flows, year 0 first.</param>
    /// <param name="financeRate">Rate at which payments are financed, above -1.</param>
    /// <param name="reinvestmentRate">Rate at which income is put by, above -1.</param>
    public static double? Modified(ReadOnlySpan<double> amounts, double financeRate, double reinvestmentRate)
    {
        var paid = 0.0;
        var received = 0.0;
        for (var n = 0; n < amounts.Length; n++)
        {
            if (amounts[n] < 0)
                paid -= amounts[n] * PresentWorth.OfOne(financeRate, n);
            else
                received += amounts[n] * Math.Pow(1 + reinvestmentRate, amounts.Length - 1 - n);
        }

        return paid > 0 && received > 0 && amounts.Length > 1 ? Math.Pow(received / paid, 1.0 / (amounts.Length - 1)) - 1 : null;
    }

    // The worth is a polynomial in v = 1/(1 + i). Between two places where its slope is zero it crosses zero at most once, and
    // those places are found the same way, one degree lower: no root can slip through a grid.
    private static List<double> Roots(double[] coefficients)
    {
        switch (Changes(coefficients))
        {
            case 0:
                return [];
            case 1:
                return Crossing(coefficients, LowestDiscount, HighestDiscount) is { } only ? [only] : [];
        }

        var roots = new List<double>();
        var from = LowestDiscount;
        foreach (var turn in Roots(Slope(coefficients)).Order().Append(HighestDiscount))
        {
            if (turn < HighestDiscount && Touches(coefficients, turn))
                roots.Add(turn);
            else if (!Touches(coefficients, from) && Crossing(coefficients, from, turn) is { } root)
                roots.Add(root);
            from = turn;
        }

        return roots;
    }

    private static int Changes(ReadOnlySpan<double> values)
    {
        var last = 0;
        var changes = 0;
        foreach (var value in values)
        {
            var sign = Math.Sign(value);
            if (sign == 0)
                continue;
            if (last != 0 && sign != last)
                changes++;
            last = sign;
        }

        return changes;
    }

    private static double[] Slope(double[] coefficients)
    {
        var slope = new double[coefficients.Length - 1];
        for (var k = 1; k < coefficients.Length; k++)
            slope[k - 1] = coefficients[k] * k;

        // Derivatives of a long life grow past what a double holds; only their signs matter.
        var largest = slope.Max(Math.Abs);
        for (var k = 0; k < slope.Length; k++)
            slope[k] /= largest;
        return slope;
    }

    private static double Worth(double[] coefficients, double v)
    {
        var sum = 0.0;
        for (var k = coefficients.Length - 1; k >= 0; k--)
            sum = (sum * v) + coefficients[k];
        return sum;
    }

    private static bool Touches(double[] coefficients, double v)
    {
        var size = 0.0;
        for (var k = coefficients.Length - 1; k >= 0; k--)
            size = (size * v) + Math.Abs(coefficients[k]);
        return Math.Abs(Worth(coefficients, v)) <= 1e-13 * size;
    }

    private static double? Crossing(double[] coefficients, double low, double high)
    {
        var sign = Math.Sign(Worth(coefficients, low));
        if (sign == 0)
            return low;
        if (sign == Math.Sign(Worth(coefficients, high)))
            return null;
        for (var i = 0; i < 200; i++)
        {
            var middle = (low + high) / 2;
            if (middle <= low || middle >= high)
                break;
            if (Math.Sign(Worth(coefficients, middle)) == sign)
                low = middle;
            else
                high = middle;
        }

        return (low + high) / 2;
    }
}
