using System.Collections.Frozen;

namespace HeadToWatts.Basis.Units;

/// <summary>
/// The closed table of units that are read and written. Factors are the exact definitions of the international foot,
/// the US gallon of 231 in3, the international pound and g0 = 9.80665 m/s2.
/// </summary>
public static class UnitTable
{
    private const double Foot = 0.3048;
    private const double CubicFoot = Foot * Foot * Foot;
    private const double UsGallon = 231 * 0.0254 * 0.0254 * 0.0254;
    private const double AcreFoot = 43_560 * CubicFoot;
    private const double PoundForce = 0.45359237 * 9.80665;
    private const double Day = 86_400;

    /// <summary>Cubic metres per second.</summary>
    public static readonly UnitOfMeasure CubicMetrePerSecond = Unit("m3/s", Dimension.Flow, 1, "m³/s", "cms", "cumec", "cumecs", "m^3/s");

    /// <summary>Litres per second.</summary>
    public static readonly UnitOfMeasure LitrePerSecond = Unit("L/s", Dimension.Flow, 1e-3, "l/s", "lps");

    /// <summary>Cubic feet per second.</summary>
    public static readonly UnitOfMeasure CubicFootPerSecond = Unit("cfs", Dimension.Flow, CubicFoot, "ft3/s", "ft³/s", "ft^3/s", "cusec", "cusecs", "second-feet");

    /// <summary>US gallons per minute.</summary>
    public static readonly UnitOfMeasure GallonPerMinute = Unit("gpm", Dimension.Flow, UsGallon / 60, "gal/min", "US gpm");

    /// <summary>Metres.</summary>
    public static readonly UnitOfMeasure Metre = Unit("m", Dimension.Length, 1, "metre", "metres", "meter", "meters");

    /// <summary>Millimetres.</summary>
    public static readonly UnitOfMeasure Millimetre = Unit("mm", Dimension.Length, 1e-3);

    /// <summary>International feet.</summary>
    public static readonly UnitOfMeasure FootUnit = Unit("ft", Dimension.Length, Foot, "foot", "feet", "'", "′");

    /// <summary>Inches.</summary>
    public static readonly UnitOfMeasure Inch = Unit("in", Dimension.Length, 0.0254, "inch", "inches", "\"", "″");

    /// <summary>Kilopascals.</summary>
    public static readonly UnitOfMeasure Kilopascal = Unit("kPa", Dimension.Pressure, 1e3);

    /// <summary>Pounds-force per square inch.</summary>
    public static readonly UnitOfMeasure PoundPerSquareInch = Unit("psi", Dimension.Pressure, PoundForce / (0.0254 * 0.0254), "psig", "lbf/in2");

    /// <summary>Kilowatts.</summary>
    public static readonly UnitOfMeasure Kilowatt = Unit("kW", Dimension.Power, 1e3);

    /// <summary>Kilowatt-hours.</summary>
    public static readonly UnitOfMeasure KilowattHour = Unit("kWh", Dimension.Energy, 3.6e6);

    /// <summary>Megawatt-hours.</summary>
    public static readonly UnitOfMeasure MegawattHour = Unit("MWh", Dimension.Energy, 3.6e9);

    /// <summary>Cubic metres.</summary>
    public static readonly UnitOfMeasure CubicMetre = Unit("m3", Dimension.Volume, 1, "m³", "m^3");

    /// <summary>Acre-feet.</summary>
    public static readonly UnitOfMeasure AcreFootUnit = Unit("acre-ft", Dimension.Volume, AcreFoot, "ac-ft", "acre-feet", "acre-foot", "acre ft", "af");

    /// <summary>Metres per second.</summary>
    public static readonly UnitOfMeasure MetrePerSecond = Unit("m/s", Dimension.Velocity, 1);

    /// <summary>Feet per second.</summary>
    public static readonly UnitOfMeasure FootPerSecond = Unit("ft/s", Dimension.Velocity, Foot, "fps");

    /// <summary>Degrees Celsius.</summary>
    public static readonly UnitOfMeasure Celsius = Unit("degC", Dimension.Temperature, 1, "°C", "C", "deg C", "celsius");

    /// <summary>Degrees Fahrenheit.</summary>
    public static readonly UnitOfMeasure Fahrenheit = new("degF", Dimension.Temperature, 5.0 / 9.0, -160.0 / 9.0, ["°F", "F", "deg F", "fahrenheit"]);

    /// <summary>Percent.</summary>
    public static readonly UnitOfMeasure Percent = Unit("%", Dimension.Ratio, 0.01, "percent", "pct");

    /// <summary>Degrees of arc.</summary>
    public static readonly UnitOfMeasure Degree = Unit("deg", Dimension.Angle, Math.PI / 180, "°", "degree", "degrees");

    /// <summary>Hertz.</summary>
    public static readonly UnitOfMeasure Hertz = Unit("Hz", Dimension.Frequency, 1);

    /// <summary>Revolutions per minute.</summary>
    public static readonly UnitOfMeasure RevolutionPerMinute = Unit("rpm", Dimension.RotationalSpeed, 1, "r/min", "rev/min");

    /// <summary>Volts.</summary>
    public static readonly UnitOfMeasure Volt = Unit("V", Dimension.Voltage, 1, "volt", "volts");

    /// <summary>Kilovolts.</summary>
    public static readonly UnitOfMeasure Kilovolt = Unit("kV", Dimension.Voltage, 1e3);

    /// <summary>Kilovolt-amperes.</summary>
    public static readonly UnitOfMeasure KilovoltAmpere = Unit("kVA", Dimension.ApparentPower, 1e3);

    /// <summary>Square kilometres.</summary>
    public static readonly UnitOfMeasure SquareKilometre = Unit("km2", Dimension.Area, 1e6, "km²", "km^2", "sq km");

    /// <summary>Square miles.</summary>
    public static readonly UnitOfMeasure SquareMile = Unit("mi2", Dimension.Area, 1609.344 * 1609.344, "mi²", "mi^2", "sq mi");

    /// <summary>Hours.</summary>
    public static readonly UnitOfMeasure Hour = Unit("h", Dimension.Duration, 3600, "hour", "hours", "hr");

    /// <summary>Seconds.</summary>
    public static readonly UnitOfMeasure Second = Unit("s", Dimension.Duration, 1, "sec", "second", "seconds");

    /// <summary>Every unit, in the order in which a refusal lists them.</summary>
    public static IReadOnlyList<UnitOfMeasure> All { get; } =
    [
        CubicMetrePerSecond,
        LitrePerSecond,
        Unit("m3/h", Dimension.Flow, 1.0 / 3600, "m³/h"),
        Unit("m3/d", Dimension.Flow, 1 / Day, "m³/d", "m3/day"),
        Unit("ML/d", Dimension.Flow, 1e3 / Day, "ML/day"),
        CubicFootPerSecond,
        GallonPerMinute,
        Unit("mgd", Dimension.Flow, 1e6 * UsGallon / Day, "Mgal/d"),
        Unit("acre-ft/day", Dimension.Flow, AcreFoot / Day, "acre-ft/d", "ac-ft/d", "ac-ft/day", "af/d", "af/day"),
        .. MinersInches(),
        Metre,
        Millimetre,
        Unit("cm", Dimension.Length, 1e-2),
        Unit("km", Dimension.Length, 1e3),
        FootUnit,
        Inch,
        Unit("yd", Dimension.Length, 0.9144, "yard", "yards"),
        Unit("mi", Dimension.Length, 1609.344, "mile", "miles"),
        Kilopascal,
        Unit("Pa", Dimension.Pressure, 1),
        Unit("MPa", Dimension.Pressure, 1e6),
        Unit("bar", Dimension.Pressure, 1e5),
        PoundPerSquareInch,
        Kilowatt,
        Unit("W", Dimension.Power, 1),
        Unit("MW", Dimension.Power, 1e6),
        Unit("hp", Dimension.Power, 550 * Foot * PoundForce, "horsepower"),
        KilowattHour,
        MegawattHour,
        Unit("GWh", Dimension.Energy, 3.6e12),
        Unit("MJ", Dimension.Energy, 1e6),
        CubicMetre,
        Unit("L", Dimension.Volume, 1e-3, "litre", "litres", "liter", "liters"),
        AcreFootUnit,
        Unit("ft3", Dimension.Volume, CubicFoot, "ft³", "ft^3"),
        Unit("gal", Dimension.Volume, UsGallon, "gallon", "gallons"),
        MetrePerSecond,
        FootPerSecond,
        Celsius,
        Fahrenheit,
        Percent,
        Degree,
        Unit("rad", Dimension.Angle, 1),
        Hour,
        Unit("min", Dimension.Duration, 60, "minute", "minutes"),
        Second,
        Unit("days", Dimension.Duration, Day, "day"),
        Hertz,
        RevolutionPerMinute,
        Kilovolt,
        Volt,
        KilovoltAmpere,
        Unit("VA", Dimension.ApparentPower, 1),
        Unit("MVA", Dimension.ApparentPower, 1e6),
        SquareKilometre,
        Unit("m2", Dimension.Area, 1, "m²", "m^2"),
        SquareMile,
        Unit("ft2", Dimension.Area, Foot * Foot, "ft²", "ft^2", "sq ft"),
        Unit("ha", Dimension.Area, 1e4, "hectare", "hectares"),
        Unit("acre", Dimension.Area, 43_560 * Foot * Foot, "acres", "ac"),
    ];

    private static readonly FrozenDictionary<Dimension, UnitOfMeasure[]> ByDimension =
        All.GroupBy(u => u.Dimension).ToFrozenDictionary(g => g.Key, g => g.ToArray());

    /// <summary>The units of one dimension, in the order of the table.</summary>
    public static IReadOnlyList<UnitOfMeasure> Of(Dimension dimension) => ByDimension[dimension];

    /// <summary>Finds a unit by symbol or alias: exact spelling first, then without regard to case if that is unique.</summary>
    /// <returns>The unit, or null when none or more than one fits.</returns>
    public static UnitOfMeasure? Find(Dimension dimension, string text)
    {
        ArgumentNullException.ThrowIfNull(text);
        UnitOfMeasure? loose = null;
        var looseCount = 0;
        foreach (var unit in ByDimension[dimension])
        {
            if (unit.Symbol == text || unit.Aliases.Contains(text))
                return unit;
            if (string.Equals(unit.Symbol, text, StringComparison.OrdinalIgnoreCase)
                || unit.Aliases.Contains(text, StringComparer.OrdinalIgnoreCase))
            {
                loose = unit;
                looseCount++;
            }
        }

        return looseCount == 1 ? loose : null;
    }

    /// <summary>Finds a unit of any dimension, for telling "3 psi" apart from nonsense where a length was wanted.</summary>
    public static UnitOfMeasure? FindAny(string text) =>
        ByDimension.Keys.Select(d => Find(d, text)).FirstOrDefault(u => u is not null);

    private static UnitOfMeasure Unit(string symbol, Dimension dimension, double factor, params string[] aliases) =>
        new(symbol, dimension, factor, 0, aliases);

    // The miner's inch is set by statute or custom, state by state; a decree may override it.
    private static IEnumerable<UnitOfMeasure> MinersInches()
    {
        foreach (var (place, perCfs) in new (string, double)[]
        {
            ("ID", 50), ("KS", 50), ("NE", 50), ("NM", 50), ("ND", 50), ("SD", 50), ("UT", 50), ("WA", 50),
            ("AZ", 40), ("CA", 40), ("MT", 40), ("NV", 40), ("OR", 40), ("CO", 38.4), ("BC", 1 / 0.028),
        })
        {
            yield return Unit($"miner's inch ({place})", Dimension.Flow, CubicFoot / perCfs, $"miner's inches ({place})", $"miners inch ({place})", $"miners inches ({place})");
        }
    }
}
