using HeadToWatts.Basis.Sources;

namespace HeadToWatts.Hydraulics.Friction;

/// <summary>Haaland: 1/√f = -1.8 log10((e/(3.7 D))^1.11 + 6.9/Re), within 2 % of Colebrook-White.</summary>
public sealed class Haaland : DarcyFormula
{
    /// <summary>Makes the formula.</summary>
    public Haaland()
        : base(new Method(
            "haaland", "Haaland", "1/f^{1/2} = -1.8 log((e/(3.7 D))^{1.11} + 6.9/Re)", FrictionSources.Haaland, "",
            [new InputRange("Re", "Reynolds number", "1", 4000, 1e8), new InputRange("e/D", "relative roughness", "1", 0, 0.05)]))
    {
    }

    internal static double InverseRoot(double reynolds, double relativeRoughness)
    {
        var rough = relativeRoughness > 0 ? Math.Pow(relativeRoughness / 3.7, 1.11) : 0;
        return -1.8 * Math.Log10(rough + (6.9 / reynolds));
    }

    /// <inheritdoc/>
    protected override double TurbulentFactor(double reynolds, double relativeRoughness)
    {
        var x = InverseRoot(reynolds, relativeRoughness);
        return 1 / (x * x);
    }
}
