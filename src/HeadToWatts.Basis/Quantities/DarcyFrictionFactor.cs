namespace HeadToWatts.Basis.Quantities;

/// <summary>Darcy friction factor f in h_f = f (L/D) V^2/2g: four times Fanning's.</summary>
public readonly record struct DarcyFrictionFactor
{
    private DarcyFrictionFactor(double value) => Value = value;

    /// <summary>The Darcy friction factor, 1.</summary>
    public double Value { get; }

    /// <summary>The same friction as Fanning's factor, a quarter of Darcy's.</summary>
    public double Fanning => Value / 4;

    /// <summary>Makes a Darcy friction factor.</summary>
    /// <param name="value">Darcy friction factor, 1; not negative.</param>
    public static DarcyFrictionFactor FromDarcy(double value) =>
        value >= 0 ? new DarcyFrictionFactor(value) : throw new ArgumentOutOfRangeException(nameof(value), value, "A friction factor is not negative.");
}
