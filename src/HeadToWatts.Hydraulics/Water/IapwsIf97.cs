using HeadToWatts.Basis;
using HeadToWatts.Basis.Sources;

namespace HeadToWatts.Hydraulics.Water;

/// <summary>
/// Liquid water after IAPWS-IF97: region 1 from the dimensionless Gibbs energy
/// γ(π,τ) = Σ n_i (7.1 - π)^I (τ - 1.222)^J with π = p / 16.53 MPa and τ = 1386 K / T, and the saturation line of region 4.
/// </summary>
public static class IapwsIf97
{
    private const double GasConstantJPerKgK = 461.526;
    private const double ReducingPressurePa = 16.53e6;
    private const double ReducingTemperatureK = 1386;
    private const double HighestPressurePa = 100e6;

    // R7-97(2012), Table 2: I, J, n.
    private static readonly (int I, int J, double N)[] Terms =
    [
        (0, -2, 0.14632971213167), (0, -1, -0.84548187169114), (0, 0, -0.37563603672040e1), (0, 1, 0.33855169168385e1),
        (0, 2, -0.95791963387872), (0, 3, 0.15772038513228), (0, 4, -0.16616417199501e-1), (0, 5, 0.81214629983568e-3),
        (1, -9, 0.28319080123804e-3), (1, -7, -0.60706301565874e-3), (1, -1, -0.18990068218419e-1), (1, 0, -0.32529748770505e-1),
        (1, 1, -0.21841717175414e-1), (1, 3, -0.52838357969930e-4), (2, -3, -0.47184321073267e-3), (2, 0, -0.30001780793026e-3),
        (2, 1, 0.47661393906987e-4), (2, 3, -0.44141845330846e-5), (2, 17, -0.72694996297594e-15), (3, -4, -0.31679644845054e-4),
        (3, 0, -0.28270797985312e-5), (3, 6, -0.85205128120103e-9), (4, -5, -0.22425281908000e-5), (4, -2, -0.65171222895601e-6),
        (4, 10, -0.14341729937924e-12), (5, -8, -0.40516996860117e-6), (8, -11, -0.12734301741641e-8), (8, -6, -0.17424871230634e-9),
        (21, -29, -0.68762131295531e-18), (23, -31, 0.14478307828521e-19), (29, -38, 0.26335781662795e-22),
        (30, -39, -0.11947622640071e-22), (31, -40, 0.18228094581404e-23), (32, -41, -0.93537087292458e-25),
    ];

    // R7-97(2012), Table 34.
    private static readonly double[] Saturation =
    [
        0.11670521452767e4, -0.72421316703206e6, -0.17073846940092e2, 0.12020824702470e5, -0.32325550322333e7,
        0.14915108613530e2, -0.48232657361591e4, 0.40511340542057e6, -0.23855557567849, 0.65017534844798e3,
    ];

    private static readonly InputRange Temperature = new("T", "water temperature", "degC", 0, 350);

    /// <summary>Density of liquid water.</summary>
    public static readonly Method Density = new(
        "iapws-if97-density", "Density of water, IAPWS-IF97 region 1", "ρ = p / (R T π γ_π)",
        WaterSources.IndustrialFormulation, "Eq. 7 and Table 3", [Temperature]);

    /// <summary>Speed of sound in liquid water.</summary>
    public static readonly Method SpeedOfSound = new(
        "iapws-if97-speed-of-sound", "Speed of sound in water, IAPWS-IF97 region 1",
        "w^2 = R T γ_π^2 / ((γ_π - τ γ_{πτ})^2 / (τ^2 γ_{ττ}) - γ_{ππ})",
        WaterSources.IndustrialFormulation, "Eq. 7 and Table 3", [Temperature]);

    /// <summary>Saturation (vapour) pressure of water.</summary>
    public static readonly Method SaturationPressure = new(
        "iapws-if97-saturation", "Vapour pressure of water, IAPWS-IF97", "p_v = (2 C / (-B + (B^2 - 4 A C)^{1/2}))^4 MPa",
        WaterSources.IndustrialFormulation, "Eq. 30", [new InputRange("T", "water temperature", "degC", 0, 373.946)]);

    /// <summary>Density of liquid water, kg/m3.</summary>
    /// <param name="temperatureDegC">Temperature, degC; 0 to 100.</param>
    /// <param name="pressurePa">Absolute pressure, Pa; above the vapour pressure, at most 100 MPa. One atmosphere unless given.</param>
    /// <exception cref="ArgumentOutOfRangeException">Outside these limits or not a number.</exception>
    public static double DensityKgPerM3(double temperatureDegC, double pressurePa = PhysicalConstants.StandardAtmospherePa)
    {
        var g = Derivatives(temperatureDegC, pressurePa);
        return pressurePa / (GasConstantJPerKgK * Kelvin(temperatureDegC) * (pressurePa / ReducingPressurePa) * g.Pi);
    }

    /// <summary>Speed of sound in liquid water, m/s.</summary>
    /// <param name="temperatureDegC">Temperature, degC; 0 to 100.</param>
    /// <param name="pressurePa">Absolute pressure, Pa; above the vapour pressure, at most 100 MPa. One atmosphere unless given.</param>
    /// <exception cref="ArgumentOutOfRangeException">Outside these limits or not a number.</exception>
    public static double SpeedOfSoundMPerS(double temperatureDegC, double pressurePa = PhysicalConstants.StandardAtmospherePa)
    {
        var g = Derivatives(temperatureDegC, pressurePa);
        var tau = ReducingTemperatureK / Kelvin(temperatureDegC);
        var mixed = g.Pi - (tau * g.PiTau);
        return Math.Sqrt(GasConstantJPerKgK * Kelvin(temperatureDegC) * g.Pi * g.Pi / ((mixed * mixed / (tau * tau * g.TauTau)) - g.PiPi));
    }

    /// <summary>Vapour (saturation) pressure of water, Pa absolute.</summary>
    /// <param name="temperatureDegC">Temperature, degC; 0 to 100.</param>
    /// <exception cref="ArgumentOutOfRangeException">Outside 0 to 100 degC or not a number.</exception>
    public static double VapourPressurePa(double temperatureDegC)
    {
        CheckTemperature(temperatureDegC);
        var n = Saturation;
        var kelvin = Kelvin(temperatureDegC);
        var theta = kelvin + (n[8] / (kelvin - n[9]));
        var a = (theta * theta) + (n[0] * theta) + n[1];
        var b = (n[2] * theta * theta) + (n[3] * theta) + n[4];
        var c = (n[5] * theta * theta) + (n[6] * theta) + n[7];
        return Math.Pow(2 * c / (-b + Math.Sqrt((b * b) - (4 * a * c))), 4) * 1e6;
    }

    internal static double Kelvin(double temperatureDegC) => temperatureDegC + 273.15;

    private static (double Pi, double PiPi, double TauTau, double PiTau) Derivatives(double temperatureDegC, double pressurePa)
    {
        CheckTemperature(temperatureDegC);
        if (!(pressurePa >= VapourPressurePa(temperatureDegC) && pressurePa <= HighestPressurePa))
            throw new ArgumentOutOfRangeException(nameof(pressurePa), pressurePa, "The pressure of liquid water lies above its vapour pressure and at most at 100 MPa.");

        var pi = 7.1 - (pressurePa / ReducingPressurePa);
        var tau = (ReducingTemperatureK / Kelvin(temperatureDegC)) - 1.222;
        double gPi = 0, gPiPi = 0, gTauTau = 0, gPiTau = 0;
        foreach (var (i, j, n) in Terms)
        {
            gPi -= n * i * Math.Pow(pi, i - 1) * Math.Pow(tau, j);
            gPiPi += n * i * (i - 1) * Math.Pow(pi, i - 2) * Math.Pow(tau, j);
            gTauTau += n * Math.Pow(pi, i) * j * (j - 1) * Math.Pow(tau, j - 2);
            gPiTau -= n * i * Math.Pow(pi, i - 1) * j * Math.Pow(tau, j - 1);
        }

        return (gPi, gPiPi, gTauTau, gPiTau);
    }

    private static void CheckTemperature(double temperatureDegC)
    {
        if (temperatureDegC is not (>= 0 and <= 100))
            throw new ArgumentOutOfRangeException(nameof(temperatureDegC), temperatureDegC, "The temperature of liquid water lies between 0 and 100 degC.");
    }
}
