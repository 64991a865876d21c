namespace HeadToWatts.Economics.CashFlows;

/// <summary>How a sum is written off over the years: the share of each year. Which schedule the law allows is the user's entry.</summary>
public sealed record Depreciation
{
    private Depreciation(string name, IReadOnlyList<double> shares)
    {
        Name = name;
        Shares = shares;
    }

    /// <summary>What it is, in words.</summary>
    public string Name { get; }

    /// <summary>Share written off in year 1, 2, ...; together at most 1.</summary>
    public IReadOnlyList<double> Shares { get; }

    /// <summary>Share of a year; 0 after the last.</summary>
    /// <param name="year">1 for the first.</param>
    public double ShareOf(int year) => year >= 1 && year <= Shares.Count ? Shares[year - 1] : 0;

    /// <summary>Shares as given.</summary>
    /// <param name="shares">Shares of the years, each 0 to 1, together at most 1.</param>
    /// <exception cref="ArgumentException">A share is not a ratio, or they add up to more than 1.</exception>
    public static Depreciation Given(IEnumerable<double> shares)
    {
        var list = shares.ToList();
        if (list.Any(s => s is not (>= 0 and <= 1)) || list.Sum() > 1 + 1e-6)
            throw new ArgumentException("The shares of the years lie between 0 and 1 and add up to at most 1.", nameof(shares));
        return new Depreciation("shares as given", list);
    }

    /// <summary>The same share each year.</summary>
    /// <param name="years">1 or more.</param>
    public static Depreciation StraightLine(int years)
    {
        ArgumentOutOfRangeException.ThrowIfLessThan(years, 1);
        return new Depreciation(string.Create(System.Globalization.CultureInfo.InvariantCulture, $"straight line over {years} years"), [.. Enumerable.Repeat(1.0 / years, years)]);
    }

    /// <summary>
    /// Declining balance that turns to straight line once that writes off more, with half a year's share in the first and the
    /// last year.
    /// </summary>
    /// <param name="years">Years of the class, 2 or more.</param>
    /// <param name="factor">Multiple of the straight-line rate, as 2 or 1.5.</param>
    public static Depreciation DecliningBalance(int years, double factor)
    {
        ArgumentOutOfRangeException.ThrowIfLessThan(years, 2);
        ArgumentOutOfRangeException.ThrowIfLessThan(factor, 1);
        var shares = new List<double>();
        var left = 1.0;
        for (var year = 1; year <= years + 1; year++)
        {
            var yearsLeft = years - (year - 1.5);
            var portion = year == 1 ? 0.5 : year == years + 1 ? 1 : Math.Min(1, yearsLeft);
            var share = year == years + 1
                ? left
                : Math.Max(left * factor / years * portion, year == 1 ? portion / years : left / yearsLeft);
            shares.Add(share);
            left -= share;
        }

        return new Depreciation(string.Create(System.Globalization.CultureInfo.InvariantCulture, $"declining balance over {years} years at {factor} times the straight line, half a year in the first"), shares);
    }
}
