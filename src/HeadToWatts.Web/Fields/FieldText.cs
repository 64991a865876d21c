using System.Globalization;
using HeadToWatts.Basis.Units;

namespace HeadToWatts.Web.Fields;

/// <summary>What a quantity field shows for a stored text, and what it stores for a typed one.</summary>
internal static class FieldText
{
    /// <summary>The text to store: as typed, with the shown unit written out where only a number was typed.</summary>
    public static string ToStore(string typed, UnitOfMeasure shownUnit)
    {
        var text = typed.Trim();
        return HasUnit(text) ? text : text + " " + shownUnit.Symbol;
    }

    /// <summary>
    /// The number to show for a stored text: digits as written when it is written in the shown unit, otherwise converted to
    /// five significant digits. The stored text itself is not touched.
    /// </summary>
    public static string ToShow(string stored, double held, UnitOfMeasure shownUnit)
    {
        var text = stored.Trim();
        if (!HasUnit(text))
            return text;
        var digits = text.TrimEnd(text.Reverse().TakeWhile(c => !char.IsDigit(c) && c != '.').ToArray());
        var written = UnitTable.Find(shownUnit.Dimension, text[digits.Length..].Trim());
        return ReferenceEquals(written, shownUnit) && !HasUnit(digits) ? digits : Round(shownUnit.FromHeld(held));
    }

    /// <summary>The same quantity in other units, for the line under a field: at most three.</summary>
    public static string AlsoUnderstood(double held, Dimension dimension, UnitOfMeasure shownUnit) => string.Join(
        ", ",
        Familiar(dimension)
            .Where(unit => !ReferenceEquals(unit, shownUnit))
            .Select(unit => (unit, value: unit.FromHeld(held)))
            .Where(x => dimension is Dimension.Temperature || x.value == 0 || Math.Abs(x.value) is >= 0.01 and < 1e6)
            .Take(3)
            .Select(x => Round(x.value, 4) + " " + Shown(x.unit)));

    /// <summary>True when the text may still become a quantity: nothing yet, a sign, or the first letters of a unit.</summary>
    public static bool IsUnfinished(string typed, Dimension dimension)
    {
        var text = typed.Trim();
        if (text is "" or "-" or "+" or "." or "-." or "\u2212")
            return true;
        var lastDigit = text.LastIndexOfAny(['0', '1', '2', '3', '4', '5', '6', '7', '8', '9']);
        // A unit such as m3/s carries a digit of its own: look back from the last number that stands before a letter.
        var start = 0;
        while (start < text.Length && (char.IsDigit(text[start]) || text[start] is '.' or ',' or '-' or '+' or ' ' or '\u2212'))
            start++;
        if (start == 0 || lastDigit < 0)
            return false;
        var begun = text[start..].Trim();
        return begun.Length > 0 && UnitTable.Of(dimension).Any(unit =>
            unit.Symbol.StartsWith(begun, StringComparison.OrdinalIgnoreCase)
            || unit.Aliases.Any(alias => alias.StartsWith(begun, StringComparison.OrdinalIgnoreCase)));
    }

    /// <summary>A unit as it stands beside a number on the screen.</summary>
    public static string Shown(UnitOfMeasure unit) => unit.Symbol switch
    {
        "degC" => "°C",
        "degF" => "°F",
        "deg" => "°",
        "m3/s" => "m³/s",
        _ => unit.Symbol,
    };

    /// <summary>True when something other than a number is written.</summary>
    public static bool HasUnit(string text) => !double.TryParse(text.Replace(" ", "", StringComparison.Ordinal).Replace(",", "", StringComparison.Ordinal).Replace('\u2212', '-'), NumberStyles.Float, CultureInfo.InvariantCulture, out _);

    /// <summary>A number to so many significant digits without an exponent and without trailing zeros, so that it can be typed over.</summary>
    public static string Round(double value, int digits = 5)
    {
        if (value == 0 || !double.IsFinite(value))
            return "0";
        var decimals = Math.Clamp(digits - 1 - (int)Math.Floor(Math.Log10(Math.Abs(value))), 0, 12);
        return Math.Round(value, decimals, MidpointRounding.AwayFromZero).ToString("0." + new string('#', 12), CultureInfo.InvariantCulture);
    }

    private static UnitOfMeasure[] Familiar(Dimension dimension) => dimension switch
    {
        Dimension.Flow => [UnitTable.CubicFootPerSecond, UnitTable.CubicMetrePerSecond, UnitTable.LitrePerSecond, UnitTable.GallonPerMinute],
        Dimension.Length => [UnitTable.Metre, UnitTable.Millimetre, UnitTable.FootUnit, UnitTable.Inch],
        Dimension.Pressure => [UnitTable.PoundPerSquareInch, UnitTable.Kilopascal],
        Dimension.Temperature => [UnitTable.Celsius, UnitTable.Fahrenheit],
        Dimension.Velocity => [UnitTable.FootPerSecond, UnitTable.MetrePerSecond],
        Dimension.Power => [UnitTable.Kilowatt],
        _ => [],
    };
}
