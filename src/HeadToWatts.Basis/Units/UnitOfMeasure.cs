namespace HeadToWatts.Basis.Units;

/// <summary>One unit that people here write, and how it turns into the unit held inside.</summary>
/// <param name="Symbol">The way the unit is printed.</param>
/// <param name="Dimension">What it measures.</param>
/// <param name="Factor">Multiplier from this unit to the held unit of its dimension.</param>
/// <param name="Offset">Added after multiplying; only temperatures have one.</param>
/// <param name="Aliases">Other spellings that are read.</param>
public sealed record UnitOfMeasure(string Symbol, Dimension Dimension, double Factor, double Offset, IReadOnlyList<string> Aliases)
{
    /// <summary>Turns a value in this unit into the held unit of its dimension.</summary>
    public double ToHeld(double valueInUnit) => (valueInUnit * Factor) + Offset;

    /// <summary>Turns a value in the held unit of its dimension into this unit.</summary>
    public double FromHeld(double heldValue) => (heldValue - Offset) / Factor;

    /// <inheritdoc/>
    public override string ToString() => Symbol;
}
