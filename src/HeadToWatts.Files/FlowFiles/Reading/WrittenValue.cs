using System.Globalization;

namespace HeadToWatts.Files.FlowFiles.Reading;

/// <summary>What a value cell held.</summary>
internal enum CellKind
{
    Value,
    Missing,
    Wrong,
}

/// <summary>How numbers are written in a column.</summary>
internal enum NumberSigns
{
    /// <summary>A decimal point and no other sign.</summary>
    Point,

    /// <summary>A decimal point, and commas between thousands.</summary>
    PointAndThousands,

    /// <summary>A decimal comma; points between thousands.</summary>
    Comma,
}

/// <summary>Reads value cells. Marks of agencies and loggers for "no value" are missing, never numbers.</summary>
internal static class WrittenValue
{
    public const string Blank = "(blank)";

    /// <summary>The word for a dry bed, which is no flow and not a missing value.</summary>
    public const string Dry = "Dry";

    private static readonly HashSet<string> Words = new(StringComparer.OrdinalIgnoreCase)
    {
        "-", "--", "---", "***", "*", "?", "NA", "N/A", "#N/A", "NaN", "null", "none", "nil", "missing", "M", "ND", "no data", "nodata",
        "ice", "eqp", "ssn", "rat", "dis", "bkw", "mnt", "fld", "tst", "pr", "rps",
    };

    // -99 is left out on purpose: computed inflows reach it.
    private static readonly HashSet<double> Numbers = [-999, -9999, -99999, -999.9, -999.99, -9999.99, 998877];

    /// <summary>Reads one cell.</summary>
    /// <param name="cell">The cell, trimmed.</param>
    /// <param name="signs">How numbers are written.</param>
    /// <param name="value">The value; NaN when missing or wrong.</param>
    /// <param name="note">The mark when missing, the reason when wrong, "Dry" for that word, otherwise empty.</param>
    public static CellKind Read(ReadOnlySpan<char> cell, NumberSigns signs, out double value, out string note)
    {
        value = double.NaN;
        note = Blank;
        if (cell.Length == 0)
            return CellKind.Missing;
        note = "";

        if (TryNumber(cell, signs, out var number))
        {
            if ((number < -998 || number == 998877) && Numbers.Contains(number))
            {
                note = cell.ToString();
                return CellKind.Missing;
            }

            value = number;
            return CellKind.Value;
        }

        var word = cell.ToString();
        if (Words.Contains(word))
        {
            note = word;
            return CellKind.Missing;
        }

        if (word.Equals(Dry, StringComparison.OrdinalIgnoreCase))
        {
            note = Dry;
            value = 0;
            return CellKind.Value;
        }

        note = WhyNot(word, signs);
        return CellKind.Wrong;
    }

    /// <summary>Reads a number as it is written in a column.</summary>
    public static bool TryNumber(ReadOnlySpan<char> cell, NumberSigns signs, out double value)
    {
        if (signs == NumberSigns.Point || cell.IndexOfAny('.', ',') < 0)
            return TryPlain(cell, out value);
        var (point, thousands) = signs == NumberSigns.PointAndThousands ? ('.', ',') : (',', '.');
        value = double.NaN;
        return ThousandsFit(cell, point, thousands)
            && TryPlain(cell.ToString().Replace(thousands.ToString(), "", StringComparison.Ordinal).Replace(point, '.'), out value);
    }

    /// <summary>Whether signs between thousands stand where they can: before the decimal sign, with three digits after each.</summary>
    public static bool ThousandsFit(ReadOnlySpan<char> cell, char point, char thousands)
    {
        var at = cell.IndexOf(point);
        var whole = (at >= 0 ? cell[..at] : cell).TrimStart("+-");
        if (at >= 0 && cell[at..].Contains(thousands))
            return false;
        var first = true;
        foreach (var range in whole.Split(thousands))
        {
            var length = whole[range].Length;
            var alone = first && length == whole.Length;
            if (!alone && (first ? length is < 1 or > 3 : length != 3))
                return false;
            first = false;
        }

        return true;
    }

    /// <summary>Why a cell is neither a number nor a mark.</summary>
    public static string WhyNot(string cell, NumberSigns signs) =>
        cell[0] is '<' or '>'
            ? "this is a limit, not a value"
            : signs == NumberSigns.Point && cell.Contains(',', StringComparison.Ordinal) ? "the comma may be a decimal sign or a thousands sign" : "this is neither a number nor a known mark for a missing value";

    private static bool TryPlain(ReadOnlySpan<char> text, out double value) =>
        double.TryParse(text, NumberStyles.AllowLeadingSign | NumberStyles.AllowDecimalPoint | NumberStyles.AllowExponent, CultureInfo.InvariantCulture, out value)
        && double.IsFinite(value);

    /// <summary>Settles how numbers are written from cells that hold a comma.</summary>
    public static NumberSigns Detect(IEnumerable<string> cells, out string evidence)
    {
        evidence = "";
        foreach (var cell in cells)
        {
            var comma = cell.LastIndexOf(',');
            if (comma < 0)
                continue;
            var point = cell.IndexOf('.', StringComparison.Ordinal);
            if (point > comma)
            {
                evidence = $"commas stand between thousands, as '{cell}' shows";
                return NumberSigns.PointAndThousands;
            }

            if ((point >= 0 && point < comma) || cell.Length - comma - 1 != 3 || cell.StartsWith("0,", StringComparison.Ordinal))
            {
                evidence = $"the comma is the decimal sign, as '{cell}' shows";
                return NumberSigns.Comma;
            }

            if (cell.IndexOf(',', StringComparison.Ordinal) != comma)
            {
                evidence = $"commas stand between thousands, as '{cell}' shows";
                return NumberSigns.PointAndThousands;
            }
        }

        return NumberSigns.Point;
    }
}
