namespace HeadToWatts.Basis.Quantities;

/// <summary>What an amount of money is counted in: a currency at the prices of one year. Amounts of two bases are never added.</summary>
public sealed record MoneyBasis
{
    private MoneyBasis(string currency, int priceYear)
    {
        Currency = currency;
        PriceYear = priceYear;
    }

    /// <summary>Currency, three capital letters as in ISO 4217.</summary>
    public string Currency { get; }

    /// <summary>Year of the prices.</summary>
    public int PriceYear { get; }

    /// <summary>Makes a basis.</summary>
    /// <param name="currency">Three letters.</param>
    /// <param name="priceYear">1900 to 2200.</param>
    /// <exception cref="ArgumentException">The currency is not three letters.</exception>
    /// <exception cref="ArgumentOutOfRangeException">The year lies outside 1900 to 2200.</exception>
    public static MoneyBasis Of(string currency, int priceYear)
    {
        ArgumentNullException.ThrowIfNull(currency);
        var code = currency.Trim().ToUpperInvariant();
        if (code.Length != 3 || !code.All(char.IsAsciiLetterUpper))
            throw new ArgumentException("A currency is three letters, as USD.", nameof(currency));
        if (priceYear is < 1900 or > 2200)
            throw new ArgumentOutOfRangeException(nameof(priceYear), priceYear, "A price year lies between 1900 and 2200.");
        return new MoneyBasis(code, priceYear);
    }

    /// <summary>The basis as the memo prints it: "USD of 2026".</summary>
    public override string ToString() => string.Create(System.Globalization.CultureInfo.InvariantCulture, $"{Currency} of {PriceYear}");
}
