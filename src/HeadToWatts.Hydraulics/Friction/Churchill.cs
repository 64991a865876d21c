using HeadToWatts.Basis.Sources;

namespace HeadToWatts.Hydraulics.Friction;

/// <summary>Churchill: one formula for laminar, transition and turbulent flow.</summary>
public sealed class Churchill : DarcyFormula
{
    /// <summary>Makes the formula.</summary>
    public Churchill()
        : base(new Method(
            "churchill", "Churchill",
            "f = 8 ((8/Re)^{12} + (A + B)^{-1.5})^{1/12}, A = (2.457 ln(1/((7/Re)^{0.9} + 0.27 e/D)))^{16}, B = (37530/Re)^{16}",
            FrictionSources.Churchill, "",
            [new InputRange("Re", "Reynolds number", "1", 0, 1e8), new InputRange("e/D", "relative roughness", "1", 0, 0.05)]))
    {
    }

    /// <inheritdoc/>
    protected override bool CoversAllFlow => true;

    /// <inheritdoc/>
    protected override double TurbulentFactor(double reynolds, double relativeRoughness)
    {
        var a = Math.Pow(2.457 * Math.Log(1 / (Math.Pow(7 / reynolds, 0.9) + (0.27 * relativeRoughness))), 16);
        var b = Math.Pow(37_530 / reynolds, 16);
        return 8 * Math.Pow(Math.Pow(8 / reynolds, 12) + Math.Pow(a + b, -1.5), 1.0 / 12);
    }
}
