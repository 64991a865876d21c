using HeadToWatts.Basis.Sources;

namespace HeadToWatts.Hydraulics.Friction;

/// <summary>
/// Colebrook and White: 1/√f = -2 log10(e/(3.7 D) + 2.51/(Re √f)), solved to rounding. The unknown is x = 1/√f; Haaland's
/// explicit formula starts within 2 %, and each Halley step cubes the error, so two of them leave about 1e-15.
/// </summary>
public sealed class ColebrookWhite : DarcyFormula
{
    private const double TwoOverLn10 = 0.868588963806503655;

    /// <summary>Makes the formula.</summary>
    public ColebrookWhite()
        : base(new Method(
            "colebrook-white", "Colebrook-White", "1/f^{1/2} = -2 log(e/(3.7 D) + 2.51/(Re f^{1/2}))", FrictionSources.Colebrook, "",
            [new InputRange("Re", "Reynolds number", "1", 4000, 1e8), new InputRange("e/D", "relative roughness", "1", 0, 0.05)]))
    {
    }

    /// <summary>Darcy friction factor of turbulent flow, solved to about 1e-15 relative.</summary>
    /// <param name="reynolds">Reynolds number.</param>
    /// <param name="relativeRoughness">Relative roughness e/D.</param>
    internal static double Solve(double reynolds, double relativeRoughness)
    {
        var a = relativeRoughness / 3.7;
        var b = 2.51 / reynolds;
        var x = Haaland.InverseRoot(reynolds, relativeRoughness);
        for (var step = 0; step < 2; step++)
        {
            var inner = a + (b * x);
            var residual = x + (TwoOverLn10 * Math.Log(inner));
            var share = b / inner;
            var slope = 1 + (TwoOverLn10 * share);
            var bend = -TwoOverLn10 * share * share;
            x -= 2 * residual * slope / ((2 * slope * slope) - (residual * bend));
        }

        return 1 / (x * x);
    }

    /// <inheritdoc/>
    protected override double TurbulentFactor(double reynolds, double relativeRoughness) => Solve(reynolds, relativeRoughness);
}
