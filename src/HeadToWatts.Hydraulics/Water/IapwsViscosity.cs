using HeadToWatts.Basis.Sources;

namespace HeadToWatts.Hydraulics.Water;

/// <summary>
/// Viscosity of water after IAPWS R12-08, without the critical enhancement, which is 1 in cold water:
/// μ = μ_0(T) μ_1(T, ρ) 1e-6 Pa s.
/// </summary>
public static class IapwsViscosity
{
    private const double CriticalTemperatureK = 647.096;
    private const double CriticalDensityKgPerM3 = 322;

    // R12-08, Table 1.
    private static readonly double[] Dilute = [1.67752, 2.20462, 0.6366564, -0.241605];

    // R12-08, Table 2: i (of 1/T - 1), j (of rho - 1), H.
    private static readonly (int I, int J, double H)[] Terms =
    [
        (0, 0, 5.20094e-1), (1, 0, 8.50895e-2), (2, 0, -1.08374), (3, 0, -2.89555e-1),
        (0, 1, 2.22531e-1), (1, 1, 9.99115e-1), (2, 1, 1.88797), (3, 1, 1.26613), (5, 1, 1.20573e-1),
        (0, 2, -2.81378e-1), (1, 2, -9.06851e-1), (2, 2, -7.72479e-1), (3, 2, -4.89837e-1), (4, 2, -2.57040e-1),
        (0, 3, 1.61913e-1), (1, 3, 2.57399e-1), (0, 4, -3.25372e-2), (3, 4, 6.98452e-2),
        (4, 5, 8.72102e-3), (3, 6, -4.35673e-3), (5, 6, -5.93264e-4),
    ];

    /// <summary>Viscosity of water.</summary>
    public static readonly Method Method = new(
        "iapws-r12-08-viscosity", "Viscosity of water, IAPWS 2008", "μ = μ_0(T) μ_1(T, ρ), ν = μ / ρ",
        WaterSources.Viscosity, "Eqs. 10 to 12", [new InputRange("T", "water temperature", "degC", 0, 100)]);

    /// <summary>Dynamic viscosity of liquid water, Pa s.</summary>
    /// <param name="temperatureDegC">Temperature, degC; 0 to 100.</param>
    /// <param name="densityKgPerM3">Density at that temperature, kg/m3.</param>
    /// <exception cref="ArgumentOutOfRangeException">Temperature outside 0 to 100 degC, density not above 0, or not a number.</exception>
    public static double DynamicPaS(double temperatureDegC, double densityKgPerM3)
    {
        if (temperatureDegC is not (>= 0 and <= 100))
            throw new ArgumentOutOfRangeException(nameof(temperatureDegC), temperatureDegC, "The temperature of liquid water lies between 0 and 100 degC.");
        if (densityKgPerM3 is not (> 0 and < double.PositiveInfinity))
            throw new ArgumentOutOfRangeException(nameof(densityKgPerM3), densityKgPerM3, "A density is above 0.");

        var t = IapwsIf97.Kelvin(temperatureDegC) / CriticalTemperatureK;
        var d = (densityKgPerM3 / CriticalDensityKgPerM3) - 1;
        double dilute = 0;
        for (var i = 0; i < Dilute.Length; i++)
            dilute += Dilute[i] / Math.Pow(t, i);
        double sum = 0;
        foreach (var (i, j, h) in Terms)
            sum += h * Math.Pow((1 / t) - 1, i) * Math.Pow(d, j);
        return 100 * Math.Sqrt(t) / dilute * Math.Exp((d + 1) * sum) * 1e-6;
    }
}
