using System.Globalization;

namespace HeadToWatts.EnergyYield.Electrical;

/// <summary>A size of conductor.</summary>
/// <param name="Name">Name in the trade.</param>
/// <param name="AreaMm2">Area of the metal, mm2.</param>
public sealed record ConductorSize(string Name, double AreaMm2);

/// <summary>The metal of a conductor.</summary>
/// <param name="Name">Name.</param>
/// <param name="ResistivityOhmMm2PerM">Resistivity at 20 °C, ohm mm2/m.</param>
/// <param name="TemperatureCoefficientPerDegC">Change of resistance with temperature, 1/°C.</param>
public sealed record ConductorMetal(string Name, double ResistivityOhmMm2PerM, double TemperatureCoefficientPerDegC);

/// <summary>Conductors that are bought.</summary>
public static class Conductors
{
    private const double CircularMilMm2 = Math.PI / 4 * 0.0254 * 0.0254;

    /// <summary>Annealed copper.</summary>
    public static ConductorMetal Copper { get; } = new("copper", 0.017241, 0.00393);

    /// <summary>Hard-drawn aluminium; the steel core of a strengthened conductor counts as carrying nothing.</summary>
    public static ConductorMetal Aluminium { get; } = new("aluminium", 0.028264, 0.00403);

    /// <summary>The metals.</summary>
    public static IReadOnlyList<ConductorMetal> Metals { get; } = [Aluminium, Copper];

    /// <summary>The sizes, US first.</summary>
    public static IReadOnlyList<ConductorSize> Sizes { get; } =
    [
        .. new[] { 10, 8, 6, 4, 2, 1 }.Select(n => new ConductorSize(string.Create(CultureInfo.InvariantCulture, $"{n} AWG"), GaugeAreaMm2(n))),
        .. new[] { 1, 2, 3, 4 }.Select(n => new ConductorSize(string.Create(CultureInfo.InvariantCulture, $"{n}/0 AWG"), GaugeAreaMm2(1 - n))),
        .. new[] { 266.8, 336.4, 397.5, 477, 556.5, 795 }.Select(k => new ConductorSize(string.Create(CultureInfo.InvariantCulture, $"{k} kcmil"), k * 1000 * CircularMilMm2)),
        .. new double[] { 6, 10, 16, 25, 35, 50, 70, 95, 120, 150, 185, 240, 300, 400 }.Select(a => new ConductorSize(string.Create(CultureInfo.InvariantCulture, $"{a} mm2"), a)),
    ];

    /// <summary>A size by its name, in any case and with or without blanks; null when it is not known.</summary>
    /// <param name="name">Name, as in "4/0 AWG" or "95 mm2".</param>
    public static ConductorSize? Find(string name)
    {
        ArgumentNullException.ThrowIfNull(name);
        var wanted = Plain(name);
        return Sizes.FirstOrDefault(s => Plain(s.Name) == wanted);

        static string Plain(string text) => text.Replace(" ", "", StringComparison.Ordinal).Replace('²', '2').ToUpperInvariant();
    }

    /// <summary>A metal by its name; null when it is not known.</summary>
    /// <param name="name">Name, in British or American spelling.</param>
    public static ConductorMetal? FindMetal(string name)
    {
        ArgumentNullException.ThrowIfNull(name);
        return name.Trim().ToUpperInvariant() switch { "COPPER" => Copper, "ALUMINIUM" or "ALUMINUM" => Aluminium, _ => null };
    }

    /// <summary>Diameter of a solid wire by American wire gauge, mm: 0.127 × 92^{(36−n)/39}.</summary>
    /// <param name="gauge">n: 36 to 1, 0 for 1/0, −1 for 2/0, −2 for 3/0, −3 for 4/0.</param>
    public static double GaugeDiameterMm(int gauge) => 0.127 * Math.Pow(92, (36 - gauge) / 39.0);

    /// <summary>Resistance of a conductor at a temperature, ohm: ρ_{20} (1 + α(T − 20)) L/A.</summary>
    /// <param name="metal">Metal.</param>
    /// <param name="areaMm2">Area, mm2, above 0.</param>
    /// <param name="lengthM">Length, m.</param>
    /// <param name="temperatureDegC">Temperature of the conductor, °C.</param>
    public static double ResistanceOhm(ConductorMetal metal, double areaMm2, double lengthM, double temperatureDegC)
    {
        ArgumentNullException.ThrowIfNull(metal);
        if (!(areaMm2 > 0) || double.IsInfinity(areaMm2))
            throw new ArgumentOutOfRangeException(nameof(areaMm2), areaMm2, "An area is a positive number.");
        return metal.ResistivityOhmMm2PerM * (1 + (metal.TemperatureCoefficientPerDegC * (temperatureDegC - 20))) * lengthM / areaMm2;
    }

    private static double GaugeAreaMm2(int gauge) => Math.PI / 4 * GaugeDiameterMm(gauge) * GaugeDiameterMm(gauge);
}
