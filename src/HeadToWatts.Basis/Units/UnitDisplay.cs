using System.Globalization;

namespace HeadToWatts.Basis.Units;

/// <summary>
/// Shows held values in US customary or SI units: three significant digits, thousands apart by a narrow no-break space,
/// the same text on the screen, in the memo and on every machine.
/// </summary>
public sealed class UnitDisplay
{
    private UnitDisplay(UnitSystem system, UnitOfMeasure flow)
    {
        System = system;
        FlowUnit = flow;
        var us = system == UnitSystem.US;
        LengthUnit = us ? UnitTable.FootUnit : UnitTable.Metre;
        DiameterUnit = us ? UnitTable.Inch : UnitTable.Millimetre;
        PressureUnit = us ? UnitTable.PoundPerSquareInch : UnitTable.Kilopascal;
        VelocityUnit = us ? UnitTable.FootPerSecond : UnitTable.MetrePerSecond;
        VolumeUnit = us ? UnitTable.AcreFootUnit : UnitTable.CubicMetre;
        TemperatureUnit = us ? UnitTable.Fahrenheit : UnitTable.Celsius;
    }

    /// <summary>The family of units.</summary>
    public UnitSystem System { get; }

    /// <summary>Unit in which flows are shown; gpm or L/s when the flows of the study are small.</summary>
    public UnitOfMeasure FlowUnit { get; }

    /// <summary>Unit of heads, lengths and elevations.</summary>
    public UnitOfMeasure LengthUnit { get; }

    /// <summary>Unit of pipe diameters.</summary>
    public UnitOfMeasure DiameterUnit { get; }

    /// <summary>Unit of wall roughness; millimetres in both systems, as pipe makers print it.</summary>
    public UnitOfMeasure RoughnessUnit { get; } = UnitTable.Millimetre;

    /// <summary>Unit of pressures.</summary>
    public UnitOfMeasure PressureUnit { get; }

    /// <summary>Unit of velocities.</summary>
    public UnitOfMeasure VelocityUnit { get; }

    /// <summary>Unit of volumes of water.</summary>
    public UnitOfMeasure VolumeUnit { get; }

    /// <summary>Unit of temperatures.</summary>
    public UnitOfMeasure TemperatureUnit { get; }

    /// <summary>Makes a display for a study.</summary>
    /// <param name="system">The family of units.</param>
    /// <param name="typicalFlowM3PerS">The study's design flow, m3/s: below 2 cfs or 0.1 m3/s the small flow unit is used.</param>
    public static UnitDisplay For(UnitSystem system, double typicalFlowM3PerS = 1)
    {
        var flow = system == UnitSystem.US
            ? (typicalFlowM3PerS < UnitTable.CubicFootPerSecond.ToHeld(2) ? UnitTable.GallonPerMinute : UnitTable.CubicFootPerSecond)
            : (typicalFlowM3PerS < 0.1 ? UnitTable.LitrePerSecond : UnitTable.CubicMetrePerSecond);
        return new UnitDisplay(system, flow);
    }

    /// <summary>The unit in which a quantity of this dimension is shown.</summary>
    public UnitOfMeasure UnitOf(Dimension dimension) => dimension switch
    {
        Dimension.Flow => FlowUnit,
        Dimension.Length => LengthUnit,
        Dimension.Pressure => PressureUnit,
        Dimension.Power => UnitTable.Kilowatt,
        Dimension.Energy => UnitTable.KilowattHour,
        Dimension.Volume => VolumeUnit,
        Dimension.Velocity => VelocityUnit,
        Dimension.Temperature => TemperatureUnit,
        Dimension.Ratio => UnitTable.Percent,
        Dimension.Angle => UnitTable.Degree,
        Dimension.Duration => UnitTable.Hour,
        Dimension.Frequency => UnitTable.Hertz,
        Dimension.RotationalSpeed => UnitTable.RevolutionPerMinute,
        Dimension.Voltage => UnitTable.Kilovolt,
        Dimension.ApparentPower => UnitTable.KilovoltAmpere,
        Dimension.Area => System == UnitSystem.US ? UnitTable.SquareMile : UnitTable.SquareKilometre,
        _ => throw new ArgumentOutOfRangeException(nameof(dimension)),
    };

    /// <summary>A flow with its unit, from m3/s.</summary>
    public string Flow(double flowM3PerS) => With(flowM3PerS, FlowUnit);

    /// <summary>A head, length or elevation with its unit, from m.</summary>
    public string Length(double lengthM) => With(lengthM, LengthUnit);

    /// <summary>A pipe diameter with its unit, from m.</summary>
    public string Diameter(double diameterM) => With(diameterM, DiameterUnit);

    /// <summary>A roughness with its unit, from m.</summary>
    public string Roughness(double roughnessM) => With(roughnessM, RoughnessUnit);

    /// <summary>A pressure with its unit, from Pa.</summary>
    public string Pressure(double pressurePa) => With(pressurePa, PressureUnit);

    /// <summary>A velocity with its unit, from m/s.</summary>
    public string Velocity(double velocityMPerS) => With(velocityMPerS, VelocityUnit);

    /// <summary>A volume of water with its unit, from m3.</summary>
    public string Volume(double volumeM3) => With(volumeM3, VolumeUnit);

    /// <summary>A temperature with its unit, from degrees Celsius.</summary>
    public string Temperature(double temperatureDegC) => With(temperatureDegC, TemperatureUnit);

    /// <summary>A power with its unit, from kW.</summary>
    public static string Power(double powerKw) => powerKw is not 0 && Math.Abs(powerKw) < 1 ? Number(powerKw * 1000) + " W" : Number(powerKw) + " kW";

    /// <summary>An energy from kWh, in kWh below 100 000 and MWh above.</summary>
    public static string Energy(double energyKwh)
    {
        var (value, unit) = EnergyParts(energyKwh);
        return value + " " + unit;
    }

    /// <summary>An energy from kWh as number and unit: kWh below 100 000, MWh above.</summary>
    public static (string Value, string Unit) EnergyParts(double energyKwh) =>
        Math.Abs(energyKwh) < 100_000 ? (Number(energyKwh), "kWh") : (Number(energyKwh / 1000), "MWh");

    /// <summary>A ratio in percent, from 0..1.</summary>
    public static string Percent(double ratio) => Number(ratio * 100) + " %";

    /// <summary>A value held in its dimension's unit, shown in the given unit with the unit's symbol.</summary>
    public static string With(double heldValue, UnitOfMeasure unit)
    {
        ArgumentNullException.ThrowIfNull(unit);
        return Number(unit.FromHeld(heldValue)) + " " + unit.Symbol;
    }

    /// <summary>The number alone, in the given unit.</summary>
    public static string In(double heldValue, UnitOfMeasure unit, int digits = 3)
    {
        ArgumentNullException.ThrowIfNull(unit);
        return Number(unit.FromHeld(heldValue), digits);
    }

    /// <summary>
    /// A number to so many significant digits, with thousands apart from five digits up: 0.0118, 17.1, 4060, 12 300. Only values
    /// below 1e-4 use a power of ten.
    /// </summary>
    public static string Number(double value, int digits = 3)
    {
        if (double.IsNaN(value))
            return "–";
        if (double.IsInfinity(value))
            return value > 0 ? "∞" : "−∞";
        if (value == 0)
            return "0";
        var size = Math.Abs(value);
        if (size < 1e-4)
        {
            // The exponent form rounds first, so that 9.999e-5 becomes 1 x 10^-4 and not 10 x 10^-5.
            var parts = size.ToString("E" + (digits - 1).ToString(CultureInfo.InvariantCulture), CultureInfo.InvariantCulture).Split('E');
            var mantissa = parts[0].Contains('.', StringComparison.Ordinal) ? parts[0].TrimEnd('0').TrimEnd('.') : parts[0];
            return (value < 0 ? "−" : "") + mantissa + " × 10" + Superscript(int.Parse(parts[1], CultureInfo.InvariantCulture));
        }

        var whole = (int)Math.Floor(Math.Log10(size)) + 1;
        // 9.996 to three digits is 10.0, not 10.00.
        var decimals = Math.Max(0, digits - Math.Max(whole, size < 1 ? whole : 1));
        var rounded = Math.Round(size, Math.Min(decimals, 15), MidpointRounding.AwayFromZero);
        if (rounded > 0 && (int)Math.Floor(Math.Log10(rounded)) + 1 > whole)
            decimals = Math.Max(0, decimals - 1);
        if (whole > digits)
        {
            var scale = Math.Pow(10, whole - digits);
            rounded = Math.Round(size / scale, MidpointRounding.AwayFromZero) * scale;
        }

        var text = rounded.ToString("#,##0" + (decimals > 0 ? "." + new string('0', decimals) : ""), CultureInfo.InvariantCulture)
            .Replace(',', '\u202f');
        // Four digits stay together, as tables print them.
        if (rounded < 10_000)
            text = text.Replace("\u202f", "", StringComparison.Ordinal);
        return value < 0 ? "−" + text : text;
    }

    private static string Superscript(int exponent)
    {
        const string digits = "⁰¹²³⁴⁵⁶⁷⁸⁹";
        var text = Math.Abs(exponent).ToString(CultureInfo.InvariantCulture);
        return (exponent < 0 ? "⁻" : "") + string.Concat(text.Select(c => digits[c - '0']));
    }
}
