using HeadToWatts.Basis.Sources;

namespace HeadToWatts.Hydraulics.Friction;

/// <summary>Swamee and Jain: f = 0.25 / (log10(e/(3.7 D) + 5.74/Re^0.9))^2, within about 3 % of Colebrook-White in its range.</summary>
public sealed class SwameeJain : DarcyFormula
{
    /// <summary>Makes the formula.</summary>
    public SwameeJain()
        : base(new Method(
            "swamee-jain", "Swamee-Jain", "f = 0.25 / (log(e/(3.7 D) + 5.74/Re^{0.9}))^2", FrictionSources.SwameeJain, "",
            [new InputRange("Re", "Reynolds number", "1", 5000, 1e8), new InputRange("e/D", "relative roughness", "1", 1e-6, 1e-2)]))
    {
    }

    /// <inheritdoc/>
    protected override double TurbulentFactor(double reynolds, double relativeRoughness)
    {
        var log = Math.Log10((relativeRoughness / 3.7) + (5.74 / Math.Pow(reynolds, 0.9)));
        return 0.25 / (log * log);
    }
}
