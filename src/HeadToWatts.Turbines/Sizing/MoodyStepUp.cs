using HeadToWatts.Basis.Sources;

namespace HeadToWatts.Turbines.Sizing;

/// <summary>A larger runner of the same shape is a little more efficient: (1 − η_p)/(1 − η_m) = (D_m/D_p)^{1/5}.</summary>
/// <param name="TestedDiameterM">Diameter of the runner on which the efficiencies were measured, m.</param>
/// <param name="RunnerDiameterM">Diameter of the runner here, m.</param>
/// <param name="PeakChange">What is added to every efficiency: the change at the peak.</param>
public sealed record MoodyStepUp(double TestedDiameterM, double RunnerDiameterM, double PeakChange)
{
    private static readonly Source Finnemore = new("finnemore-maurer-fluid", SourceKind.Published, "E. J. Finnemore and J. B. Franzini", "", "Fluid Mechanics with Engineering Applications", "tenth edition");

    /// <summary>The method.</summary>
    public static Method Method { get; } = new(
        "moody-step-up", "Efficiency of a runner of another size (Moody)", "(1 − η_p)/(1 − η_m) = (D_m/D_p)^{1/5}", Finnemore, "Eq. 16.15",
        [new InputRange("D_p/D_m", "diameter over the tested one", "1", 0.5, 20)]);

    /// <summary>Efficiency of a runner of the same shape and another size, 0 to 1.</summary>
    /// <param name="testedEfficiency">Efficiency measured, 0 to 1.</param>
    /// <param name="testedDiameterM">Diameter of the runner measured, m, above 0.</param>
    /// <param name="runnerDiameterM">Diameter of the other runner, m, above 0.</param>
    public static double EfficiencyAt(double testedEfficiency, double testedDiameterM, double runnerDiameterM) =>
        testedDiameterM > 0 && runnerDiameterM > 0
            ? 1 - ((1 - testedEfficiency) * Math.Pow(testedDiameterM / runnerDiameterM, 0.2))
            : throw new ArgumentOutOfRangeException(nameof(testedDiameterM), testedDiameterM, "Diameters are positive numbers.");

    /// <summary>The change for a curve: that of its peak, as is usual, for all of it.</summary>
    /// <param name="curve">The curve measured.</param>
    /// <param name="testedDiameterM">Diameter of the runner measured, m.</param>
    /// <param name="runnerDiameterM">Diameter of the runner here, m.</param>
    public static MoodyStepUp Of(EfficiencyCurve curve, double testedDiameterM, double runnerDiameterM)
    {
        ArgumentNullException.ThrowIfNull(curve);
        return new MoodyStepUp(testedDiameterM, runnerDiameterM, EfficiencyAt(curve.Peak, testedDiameterM, runnerDiameterM) - curve.Peak);
    }

    /// <summary>The use of the method.</summary>
    public MethodUse Use => Method.Used(new InputSpan("D_p/D_m", RunnerDiameterM / TestedDiameterM, RunnerDiameterM / TestedDiameterM));
}
