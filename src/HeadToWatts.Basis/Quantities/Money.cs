namespace HeadToWatts.Basis.Quantities;

/// <summary>An amount of money with its currency and price year. Two amounts add only when both agree; nothing is converted.</summary>
public readonly record struct Money
{
    private readonly MoneyBasis? _basis;

    private Money(double amount, MoneyBasis basis)
    {
        Amount = amount;
        _basis = basis;
    }

    /// <summary>Amount in the currency and at the prices of the basis.</summary>
    public double Amount { get; }

    /// <summary>Currency and price year.</summary>
    /// <exception cref="InvalidOperationException">The value was never made.</exception>
    public MoneyBasis Basis => _basis ?? throw new InvalidOperationException("An amount needs a currency and a price year.");

    /// <summary>Makes an amount.</summary>
    /// <param name="moneyAmount">Amount; finite.</param>
    /// <param name="basis">Currency and price year.</param>
    /// <exception cref="ArgumentOutOfRangeException">Not a finite number.</exception>
    public static Money Of(double moneyAmount, MoneyBasis basis)
    {
        ArgumentNullException.ThrowIfNull(basis);
        return double.IsFinite(moneyAmount) ? new Money(moneyAmount, basis) : throw new ArgumentOutOfRangeException(nameof(moneyAmount), moneyAmount, "An amount is a finite number.");
    }

    /// <summary>The sum of two amounts of one basis.</summary>
    /// <exception cref="ArgumentException">Currency or price year differ.</exception>
    public Money Plus(Money other) =>
        other.Basis == Basis ? new Money(Amount + other.Amount, Basis) : throw new ArgumentException($"{other.Basis} cannot be added to {Basis}.", nameof(other));

    /// <summary>The amount so many times.</summary>
    /// <param name="factor">Finite factor.</param>
    public Money Times(double factor) => Of(Amount * factor, Basis);

    /// <summary>The amount at the prices of another year, by the ratio of a named index.</summary>
    /// <param name="priceYear">The other year.</param>
    /// <param name="indexRatio">Index of that year over index of this amount's year; above 0.</param>
    /// <exception cref="ArgumentOutOfRangeException">The ratio is not above 0.</exception>
    public Money AtPricesOf(int priceYear, double indexRatio) =>
        indexRatio is > 0 and < double.PositiveInfinity
            ? new Money(Amount * indexRatio, MoneyBasis.Of(Basis.Currency, priceYear))
            : throw new ArgumentOutOfRangeException(nameof(indexRatio), indexRatio, "The ratio of an index is above 0.");
}
