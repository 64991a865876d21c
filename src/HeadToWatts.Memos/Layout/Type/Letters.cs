using System.Text;
using System.Text.RegularExpressions;
using HeadToWatts.Memos.Content;

namespace HeadToWatts.Memos.Layout.Type;

/// <summary>
/// Fits text to the typeface. A character it lacks would be drawn as nothing and nobody would notice: known ones get a stand-in,
/// the others become a question mark and are reported.
/// </summary>
internal static partial class Letters
{
    private const string Raised = "⁰¹²³⁴⁵⁶⁷⁸⁹⁺⁻ⁿ";
    private const string RaisedPlain = "0123456789+−n";
    private const string Lowered = "₀₁₂₃₄₅₆₇₈₉₊₋";
    private const string LoweredPlain = "0123456789+−";

    private static readonly Dictionary<int, string> StandIns = new()
    {
        ['⇒'] = "→",
        ['⟶'] = "→",
        ['●'] = "•",
        ['■'] = "•",
        ['▪'] = "•",
        ['∑'] = "Σ",
        ['∆'] = "Δ",
        ['µ'] = "μ",
        ['Ω'] = "Ω",
        ['\t'] = " ",
        ['\u200b'] = "",
        ['\u2060'] = "",
        ['\ufeff'] = "",
        ['\u00ad'] = "",
        ['\u2002'] = " ",
        ['\u2003'] = " ",
        ['\u2008'] = " ",
        ['\u2009'] = "\u202f",
        ['\u2011'] = "-",
        ['\u2212'] = "−",
    };

    /// <summary>The run as the typeface can draw it. Exponents whose sign has no small glyph become raised text.</summary>
    public static IEnumerable<TextRun> Fit(TextRun run)
    {
        var text = new StringBuilder();
        var runes = Typographic(run.Text).EnumerateRunes().ToArray();
        for (var i = 0; i < runes.Length;)
        {
            var raised = SmallLength(runes, i, Raised);
            var lowered = raised > 0 ? 0 : SmallLength(runes, i, Lowered);
            var length = Math.Max(raised, lowered);
            if (length > 0 && run.Standing == Standing.OnLine && runes.Skip(i).Take(length).Any(r => !Typeface.Has(r)))
            {
                if (text.Length > 0)
                {
                    yield return run with { Text = text.ToString() };
                    text.Clear();
                }

                var (from, to) = raised > 0 ? (Raised, RaisedPlain) : (Lowered, LoweredPlain);
                yield return run with
                {
                    Text = string.Concat(runes.Skip(i).Take(length).Select(r => to[from.IndexOf((char)r.Value, StringComparison.Ordinal)])),
                    Standing = raised > 0 ? Standing.Above : Standing.Below,
                };
                i += length;
                continue;
            }

            text.Append(Drawable(runes[i]));
            i++;
        }

        if (text.Length > 0 || run.Text.Length == 0)
            yield return run with { Text = text.ToString() };
    }

    /// <summary>The text as the typeface can draw it, on one line and at one height.</summary>
    public static string FitPlain(string text) => string.Concat(Typographic(text).EnumerateRunes().Select(Drawable));

    /// <summary>The text on one line of a width, its end cut off where it does not fit.</summary>
    public static string Cut(string text, Face face, double sizePt, double widthPt)
    {
        text = FitPlain(text);
        if (Typeface.WidthPt(text, face, sizePt) <= widthPt)
            return text;
        while (text.Length > 1 && Typeface.WidthPt(text + "…", face, sizePt) > widthPt)
            text = text[..^1];
        return text.TrimEnd() + "…";
    }

    /// <summary>The characters of a text for which there is neither a glyph nor a stand-in.</summary>
    public static IEnumerable<Rune> Missing(string text) =>
        text.EnumerateRunes().Where(r => !Typeface.Has(r) && !StandIns.ContainsKey(r.Value) && !IsSmall(r) && !Rune.IsControl(r)).Distinct();

    // Units are written "m3/s" and "degC" on keyboards and in files; print has the proper marks.
    private static string Typographic(string text)
    {
        if (!text.Any(char.IsAsciiDigit) && !text.Contains("deg", StringComparison.Ordinal))
            return text;
        text = PlainPower().Replace(text, m => m.Value[..^1] + (m.Value[^1] == '2' ? '²' : '³'));
        text = PlainDegree().Replace(text, "°$1");
        // A number is not parted from its unit at the end of a line.
        return BeforeUnit().Replace(text, "\u00a0");
    }

    [GeneratedRegex(@"(?<![\p{L}\p{N}_])(?:mm|cm|km|m|ft|in|s)[23](?![\p{L}\p{N}])")]
    private static partial Regex PlainPower();

    [GeneratedRegex(@"(?<=\d) (?=(?:%|kW|W|MWh|kWh|cfs|gpm|ft|in|mm|m[²³]?|psi|kPa|Hz|rpm|h|s|acre-ft|L|°[CF]|lbf|kN|N|kg|MW|km|mi|days?|years?)(?![\p{L}\p{N}]))")]
    private static partial Regex BeforeUnit();

    [GeneratedRegex(@"(?<!\p{L})deg([CF])(?!\p{L})")]
    private static partial Regex PlainDegree();

    private static string Drawable(Rune rune)
    {
        if (Rune.IsControl(rune) && rune.Value != '\t')
            return rune.Value is '\n' or '\r' ? " " : "";
        if (Typeface.Has(rune))
            return rune.ToString();
        if (StandIns.TryGetValue(rune.Value, out var standIn))
            return standIn;
        var at = rune.IsBmp ? Raised.IndexOf((char)rune.Value, StringComparison.Ordinal) : -1;
        return at >= 0 ? RaisedPlain[at].ToString() : "?";
    }

    private static bool IsSmall(Rune rune) => rune.IsBmp && (Raised.Contains((char)rune.Value, StringComparison.Ordinal) || Lowered.Contains((char)rune.Value, StringComparison.Ordinal));

    private static int SmallLength(Rune[] runes, int from, string set)
    {
        var i = from;
        while (i < runes.Length && runes[i].IsBmp && set.Contains((char)runes[i].Value, StringComparison.Ordinal))
            i++;
        return i - from;
    }
}
