using HeadToWatts.Basis.Sources;

namespace HeadToWatts.Hydraulics.Friction;

/// <summary>
/// Laminar flow, and this project's rule for the gap between laminar and turbulent flow. No formula is right in the gap:
/// real pipes jump between both states. The rule keeps the loss continuous and rising with flow, and a caution is raised.
/// </summary>
public static class TransitionFlow
{
    /// <summary>Reynolds number below which the flow is laminar.</summary>
    public const double LaminarReynolds = 2000;

    /// <summary>Reynolds number above which the flow is turbulent.</summary>
    public const double TurbulentReynolds = 4000;

    private const double LaminarFactorAtLimit = 64 / LaminarReynolds;

    /// <summary>Laminar flow, f = 64/Re.</summary>
    public static readonly Method Laminar = new(
        "laminar-poiseuille", "Laminar flow in a pipe", "f = 64 / Re", FrictionSources.Poiseuille, "",
        [new InputRange("Re", "Reynolds number", "1", 0, LaminarReynolds)]);

    /// <summary>The rule between the two.</summary>
    public static readonly Method Transition = new(
        "transition-interpolation", "Transition between laminar and turbulent flow",
        "log f linear in log Re from 64/2000 at Re = 2000 to the turbulent f at Re = 4000",
        Source.Decision("0004", "Friction between laminar and turbulent flow"), "",
        [new InputRange("Re", "Reynolds number", "1", LaminarReynolds, TurbulentReynolds)]);

    /// <summary>The regime at a Reynolds number.</summary>
    /// <param name="reynolds">Reynolds number, not negative.</param>
    public static FlowRegime RegimeAt(double reynolds) => reynolds switch
    {
        <= 0 => FlowRegime.Still,
        < LaminarReynolds => FlowRegime.Laminar,
        <= TurbulentReynolds => FlowRegime.Transition,
        _ => FlowRegime.Turbulent,
    };

    /// <summary>Darcy friction factor of laminar flow.</summary>
    /// <param name="reynolds">Reynolds number, above 0.</param>
    internal static double LaminarFactor(double reynolds) => 64 / reynolds;

    /// <summary>Darcy friction factor between the limits.</summary>
    /// <param name="reynolds">Reynolds number, 2,000 to 4,000.</param>
    /// <param name="turbulentFactorAtLimit">Darcy friction factor of the turbulent formula at Re = 4,000.</param>
    internal static double TransitionFactor(double reynolds, double turbulentFactorAtLimit)
    {
        // Math.Log2 of (limit ratio = 2) is 1: the share of the way is log2(Re/2000).
        var share = Math.Log2(reynolds / LaminarReynolds);
        return LaminarFactorAtLimit * Math.Pow(turbulentFactorAtLimit / LaminarFactorAtLimit, share);
    }
}
