using System.Text;

namespace HeadToWatts.Basis.Sources;

/// <summary>How a piece of a formula stands on the line.</summary>
public enum FormulaStyle
{
    /// <summary>Upright text: numbers, signs, units, function names.</summary>
    Upright,

    /// <summary>Italic: a variable.</summary>
    Italic,

    /// <summary>Below the line.</summary>
    Subscript,

    /// <summary>Above the line.</summary>
    Superscript,
}

/// <summary>A piece of a formula.</summary>
/// <param name="Text">The text.</param>
/// <param name="Style">How it stands.</param>
public readonly record struct FormulaRun(string Text, FormulaStyle Style);

/// <summary>
/// Formulas are written in plain text: "_x" or "_{net}" is a subscript, "^2" or "^{1/2}" a superscript. One or two Latin
/// or Greek letters standing alone are variables and set in italics; longer words (log, sqrt, if) stay upright.
/// Screen and memo draw the same runs.
/// </summary>
public static class FormulaText
{
    /// <summary>Splits a formula into runs.</summary>
    public static IReadOnlyList<FormulaRun> Parse(string formula)
    {
        ArgumentNullException.ThrowIfNull(formula);
        var runs = new List<FormulaRun>();
        var plain = new StringBuilder();
        var i = 0;
        while (i < formula.Length)
        {
            var c = formula[i];
            if (c is '_' or '^' && i + 1 < formula.Length)
            {
                Flush();
                var style = c == '_' ? FormulaStyle.Subscript : FormulaStyle.Superscript;
                if (formula[i + 1] == '{')
                {
                    var end = formula.IndexOf('}', i);
                    end = end < 0 ? formula.Length : end;
                    runs.Add(new FormulaRun(formula[(i + 2)..end], style));
                    i = end + 1;
                }
                else
                {
                    runs.Add(new FormulaRun(formula.Substring(i + 1, 1), style));
                    i += 2;
                }

                continue;
            }

            if (char.IsLetter(c))
            {
                var end = i;
                while (end < formula.Length && char.IsLetter(formula[end]))
                    end++;
                var word = formula[i..end];
                var variable = word.Length == 1 && word is not ("Σ" or "Δ" or "π");
                if (variable)
                {
                    Flush();
                    runs.Add(new FormulaRun(word, FormulaStyle.Italic));
                }
                else
                {
                    plain.Append(word);
                }

                i = end;
                continue;
            }

            plain.Append(c);
            i++;
        }

        Flush();
        return runs;

        void Flush()
        {
            if (plain.Length == 0)
                return;
            runs.Add(new FormulaRun(plain.ToString(), FormulaStyle.Upright));
            plain.Clear();
        }
    }

    /// <summary>The formula as one line of plain text, for file exports and screen readers.</summary>
    public static string Plain(string formula)
    {
        ArgumentNullException.ThrowIfNull(formula);
        return formula.Replace("_{", " ", StringComparison.Ordinal).Replace("^{", "^(", StringComparison.Ordinal).Replace("}", formula.Contains("^{", StringComparison.Ordinal) ? ")" : "", StringComparison.Ordinal);
    }
}
