using System.Globalization;
using System.Text.RegularExpressions;
using HeadToWatts.Basis.Problems;

namespace HeadToWatts.Basis.Units;

/// <summary>
/// Reads a quantity as people write it, "24 in", "3.2 m3/s", "18 ft 6 in", "85 %". Always invariant: the decimal sign is
/// a point. Text that is unknown or could mean two things is refused with what is accepted.
/// </summary>
public static partial class QuantityText
{
    /// <summary>Reads one quantity.</summary>
    /// <param name="text">The text as written.</param>
    /// <param name="dimension">What the field measures.</param>
    /// <param name="bareUnit">The unit a number without one is taken in; null when a unit must be written.</param>
    /// <param name="where">Where the text stands, for the problem.</param>
    /// <returns>The value in the held unit of the dimension, or the problem.</returns>
    public static Checked<double> Read(string? text, Dimension dimension, UnitOfMeasure? bareUnit, string where)
    {
        var shown = text ?? "";
        var rest = shown.Trim().Replace('\u00a0', ' ').Replace('\u202f', ' ').Replace('\u2212', '-');
        if (rest.Length == 0)
            return Refuse(where, shown, "nothing is entered", dimension);

        var total = 0.0;
        var parts = 0;
        while (rest.Length > 0)
        {
            var number = NumberPattern().Match(rest);
            if (!number.Success)
                return Refuse(where, shown, parts == 0 ? "it does not begin with a number" : $"'{rest}' is not understood", dimension);

            var digits = number.Groups[1].Value;
            if (AmbiguousComma().IsMatch(digits))
                return Refuse(where, shown, $"the comma in '{digits}' may be a decimal sign or a thousands sign; write a point for decimals and no comma", dimension);

            if (!double.TryParse(digits.Replace(",", "", StringComparison.Ordinal).Replace(" ", "", StringComparison.Ordinal), NumberStyles.Float, CultureInfo.InvariantCulture, out var value)
                || !double.IsFinite(value))
            {
                return Refuse(where, shown, $"'{digits}' is not a number that can be held", dimension);
            }

            rest = rest[number.Length..];
            var unitText = UnitUpToNextNumber(ref rest, dimension);
            parts++;

            UnitOfMeasure? unit;
            if (unitText.Length == 0)
            {
                if (bareUnit is null || parts > 1)
                    return Refuse(where, shown, "the unit is missing", dimension);
                unit = bareUnit;
            }
            else
            {
                unit = UnitTable.Find(dimension, unitText);
                if (unit is null)
                    return Refuse(where, shown, WhyUnknown(unitText, dimension), dimension);
            }

            if (parts > 1 && (value < 0 || dimension != Dimension.Length))
                return Refuse(where, shown, "only a length may be written in two parts", dimension);

            // "-3 ft 6 in" is minus three and a half feet.
            var held = unit.ToHeld(value);
            total = parts > 1 && IsNegative(shown) ? total - held : total + held;
            if (!double.IsFinite(total))
                return Refuse(where, shown, $"'{digits}' {unit.Symbol} is not a number that can be held", dimension);
        }

        return Checked.Of(total);

        static bool IsNegative(string s) => s.TrimStart().StartsWith('-') || s.TrimStart().StartsWith('\u2212');
    }

    /// <summary>The units a field of this dimension accepts, for messages and help.</summary>
    public static string Accepted(Dimension dimension)
    {
        var symbols = UnitTable.Of(dimension).Select(u => u.Symbol).Where(s => !s.StartsWith("miner", StringComparison.Ordinal)).ToList();
        var list = "a number and one of: " + string.Join(", ", symbols);
        return dimension == Dimension.Flow ? list + ", miner's inch (ID, KS, NE, NM, ND, SD, UT, WA, AZ, CA, MT, NV, OR, CO or BC in brackets)" : list;
    }

    private static string UnitUpToNextNumber(ref string rest, Dimension dimension)
    {
        // Two-part lengths: the unit ends where the next number starts ("18 ft 6 in", 18'6").
        if (dimension == Dimension.Length)
        {
            var next = LaterNumber().Match(rest);
            if (next.Success)
            {
                var unit = rest[..next.Index].Trim();
                rest = rest[next.Index..].TrimStart();
                return unit;
            }
        }

        var all = rest.Trim();
        rest = "";
        return all;
    }

    private static string WhyUnknown(string unitText, Dimension dimension)
    {
        if (dimension == Dimension.Flow && unitText.StartsWith("miner", StringComparison.OrdinalIgnoreCase))
            return "the miner's inch differs by state; name it, as in 'miner's inch (ID)'";
        var other = UnitTable.FindAny(unitText);
        return other is null
            ? $"the unit '{unitText}' is not known"
            : $"'{unitText}' measures {Name(other.Dimension)}, and this is {Name(dimension)}";
    }

    private static string Name(Dimension dimension) => dimension switch
    {
        Dimension.Ratio => "a ratio",
        Dimension.Angle => "an angle",
        Dimension.RotationalSpeed => "a shaft speed",
        Dimension.Energy => "an energy",
        _ => "a " + dimension.ToString().ToLowerInvariant(),
    };

    private static Checked<double> Refuse(string where, string read, string why, Dimension dimension) =>
        Checked.Refused<double>(new Problem(where, read, why, Accepted(dimension)));

    [GeneratedRegex(@"^\s*([-+]?(?:\d{1,3}(?: \d{3})+(?:\.\d*)?|[\d,]+\.?\d*|\.\d+)(?:[eE][-+]?\d+)?)\s*")]
    private static partial Regex NumberPattern();

    [GeneratedRegex(@"(?<=[A-Za-z'""′″])\s*\d")]
    private static partial Regex LaterNumber();

    // A comma is plain only beside other evidence: 1,234.5 or 1,234,567.
    [GeneratedRegex(@",(?!\d{3}(?:,\d{3})*(?:\.\d*)?(?:[eE]|$))|^[-+]?\d{1,3},\d{3}$|^[-+]?(?:\d{4,}|0*),|^[-+]?0,")]
    private static partial Regex AmbiguousComma();
}
