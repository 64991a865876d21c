using HeadToWatts.Hydraulics.Friction;

namespace HeadToWatts.Calculations.Tests.Hydraulics.Friction;

internal static class TestPipes
{
    /// <summary>A pipe of 1 m at unit viscosity and gravity of the equator, in which Re is 4 Q/π times 1e6.</summary>
    public static PipeFlow AtReynolds(double reynolds, double relativeRoughness) =>
        new(reynolds * 1e-6 * Math.PI / 4, 1, relativeRoughness, 140, 0.012, 1e-6, 9.81);

    public static FrictionFormula Formula(string id) => FrictionFormulas.Find(id) ?? throw new ArgumentException(id);

    public static double Factor(string id, double reynolds, double relativeRoughness) =>
        ((DarcyFormula)Formula(id)).Factor(reynolds, relativeRoughness);
}
