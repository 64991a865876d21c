using HeadToWatts.Basis.Sources;

namespace HeadToWatts.Memos.Content;

/// <summary>How strongly a run of text is set.</summary>
public enum Emphasis
{
    /// <summary>Upright, regular.</summary>
    None,

    /// <summary>Italic: variables, titles.</summary>
    Italic,

    /// <summary>Semi-bold.</summary>
    Bold,
}

/// <summary>Where a run of text stands.</summary>
public enum Standing
{
    /// <summary>On the line.</summary>
    OnLine,

    /// <summary>Below it, smaller.</summary>
    Below,

    /// <summary>Above it, smaller.</summary>
    Above,
}

/// <summary>A run of text in one manner.</summary>
/// <param name="Text">The text; empty for a reference whose words are found when the memo is put together.</param>
/// <param name="Emphasis">How strongly it is set.</param>
/// <param name="Standing">Where it stands.</param>
/// <param name="Target">Anchor inside the memo that it leads to; empty for none.</param>
public sealed record TextRun(string Text, Emphasis Emphasis = Emphasis.None, Standing Standing = Standing.OnLine, string Target = "");

/// <summary>Text with emphasis, small figures and links, independent of how it is drawn.</summary>
public sealed class RichText
{
    private RichText(IReadOnlyList<TextRun> runs) => Runs = runs;

    /// <summary>No text.</summary>
    public static RichText Empty { get; } = new([]);

    /// <summary>The runs, in reading order.</summary>
    public IReadOnlyList<TextRun> Runs { get; }

    /// <summary>True when there is nothing to read.</summary>
    public bool IsEmpty => Runs.All(r => r.Text.Length == 0 && r.Target.Length == 0);

    /// <summary>The text alone.</summary>
    public string Plain => string.Concat(Runs.Select(r => r.Text));

    /// <summary>Plain text.</summary>
    public static RichText Of(string text) => new([new TextRun(text)]);

    /// <summary>Semi-bold text.</summary>
    public static RichText Bold(string text) => new([new TextRun(text, Emphasis.Bold)]);

    /// <summary>Italic text.</summary>
    public static RichText Italic(string text) => new([new TextRun(text, Emphasis.Italic)]);

    /// <summary>Text that leads to an anchor of the memo.</summary>
    public static RichText Link(string text, string target) => new([new TextRun(text, Target: target)]);

    /// <summary>A figure, table or section by its anchor; its number is found when the memo is put together.</summary>
    public static RichText See(string target) => new([new TextRun("", Target: target)]);

    /// <summary>A formula or text in the notation of <see cref="FormulaText"/>.</summary>
    /// <param name="formula">The formula.</param>
    /// <param name="bold">True to set it in semi-bold, as in the head of a table.</param>
    public static RichText Formula(string formula, bool bold = false) =>
        new([.. FormulaText.Parse(formula).Select(r => r.Style switch
        {
            FormulaStyle.Italic => new TextRun(r.Text, bold ? Emphasis.Bold : Emphasis.Italic),
            FormulaStyle.Subscript => new TextRun(r.Text, bold ? Emphasis.Bold : Emphasis.None, Standing.Below),
            FormulaStyle.Superscript => new TextRun(r.Text, bold ? Emphasis.Bold : Emphasis.None, Standing.Above),
            _ => new TextRun(r.Text, bold ? Emphasis.Bold : Emphasis.None),
        })]);

    /// <summary>Text from runs.</summary>
    public static RichText From(IEnumerable<TextRun> runs) => new([.. runs]);

    /// <summary>One text after another.</summary>
    public RichText Add(RichText next)
    {
        ArgumentNullException.ThrowIfNull(next);
        return new([.. Runs, .. next.Runs]);
    }

    /// <summary>Texts with a separator between them.</summary>
    public static RichText Join(string separator, IEnumerable<RichText> parts)
    {
        ArgumentNullException.ThrowIfNull(parts);
        var runs = new List<TextRun>();
        foreach (var part in parts)
        {
            if (runs.Count > 0)
                runs.Add(new TextRun(separator));
            runs.AddRange(part.Runs);
        }

        return new(runs);
    }

    /// <summary>The same text in semi-bold.</summary>
    public RichText AsBold() => new([.. Runs.Select(r => r with { Emphasis = Emphasis.Bold })]);

    /// <summary>One text after another.</summary>
    public static RichText operator +(RichText left, RichText right)
    {
        ArgumentNullException.ThrowIfNull(left);
        return left.Add(right);
    }

    /// <summary>Plain text.</summary>
    public static implicit operator RichText(string text) => Of(text);

    /// <inheritdoc/>
    public override string ToString() => Plain;
}
