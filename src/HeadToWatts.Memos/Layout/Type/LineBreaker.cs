using System.Text;
using HeadToWatts.Memos.Content;

namespace HeadToWatts.Memos.Layout.Type;

/// <summary>Text in one manner at its place on a line.</summary>
/// <param name="XPt">From the beginning of the line.</param>
/// <param name="Text">The text.</param>
/// <param name="Face">Its face.</param>
/// <param name="SizePt">Its size.</param>
/// <param name="RisePt">How far above the baseline it stands.</param>
/// <param name="Target">Anchor it leads to; empty for none.</param>
/// <param name="WidthPt">Its width, without a space at its end.</param>
internal sealed record Fragment(double XPt, string Text, Face Face, double SizePt, double RisePt, string Target, double WidthPt);

/// <summary>A line of text.</summary>
/// <param name="Fragments">Its fragments, left to right.</param>
/// <param name="WidthPt">Its width.</param>
internal sealed record TextLine(IReadOnlyList<Fragment> Fragments, double WidthPt);

/// <summary>Breaks text into lines at spaces and hyphens; a word wider than the line is broken where it must be, never clipped.</summary>
internal static class LineBreaker
{
    private const double SmallRatio = 0.70;
    private const double RaiseRatio = 0.33;
    private const double LowerRatio = 0.16;

    public static IReadOnlyList<TextLine> Break(RichText text, double sizePt, double widthPt, bool bold = false)
    {
        var words = Words(text, sizePt, bold);
        var lines = new List<TextLine>();
        var line = new List<Piece>();
        var used = 0.0;
        var space = false;
        foreach (var word in words)
        {
            foreach (var part in word.WidthPt > widthPt ? Chop(word, widthPt) : [word])
            {
                var gap = space && line.Count > 0 ? SpaceOf(line[^1]) : 0;
                if (line.Count > 0 && used + gap + part.WidthPt > widthPt + 1e-6)
                {
                    lines.Add(Close(line, used, more: true));
                    line = [];
                    used = 0;
                    gap = 0;
                }

                if (gap > 0)
                    line[^1] = line[^1] with { Text = line[^1].Text + " ", WidthPt = line[^1].WidthPt + gap };
                line.AddRange(part.Pieces);
                used += gap + part.WidthPt;
                space = part.SpaceAfter;
            }
        }

        if (line.Count > 0 || lines.Count == 0)
            lines.Add(Close(line, used, more: false));
        return lines;
    }

    /// <summary>Width of the text on one line.</summary>
    public static double NaturalWidthPt(RichText text, double sizePt, bool bold = false) => Break(text, sizePt, double.MaxValue / 4, bold)[0].WidthPt;

    /// <summary>Width of the widest word.</summary>
    public static double WidestWordPt(RichText text, double sizePt, bool bold = false) =>
        Words(text, sizePt, bold).Select(w => w.WidthPt).DefaultIfEmpty(0).Max();

    private static double SpaceOf(Piece piece) => Typeface.File(piece.Face).AdvancePerEm(' ') * piece.SizePt;

    private static TextLine Close(List<Piece> pieces, double width, bool more)
    {
        var fragments = new List<Fragment>();
        var x = 0.0;
        foreach (var piece in pieces)
        {
            var last = fragments.Count - 1;
            if (last >= 0 && fragments[last].Face == piece.Face && fragments[last].SizePt == piece.SizePt && fragments[last].RisePt == piece.RisePt && fragments[last].Target == piece.Target)
                fragments[last] = fragments[last] with { Text = fragments[last].Text + piece.Text, WidthPt = fragments[last].WidthPt + piece.WidthPt };
            else
                fragments.Add(new Fragment(x, piece.Text, piece.Face, piece.SizePt, piece.RisePt, piece.Target, piece.WidthPt));
            x += piece.WidthPt;
        }

        // Without the space a screen reader joins the last word to the first of the next line.
        if (more && fragments.Count > 0 && !fragments[^1].Text.EndsWith('-'))
            fragments[^1] = fragments[^1] with { Text = fragments[^1].Text + " " };
        return new TextLine(fragments, width);
    }

    private static List<Word> Words(RichText text, double size, bool bold)
    {
        var words = new List<Word>();
        var pieces = new List<Piece>();
        var now = new StringBuilder();
        foreach (var run in text.Runs.SelectMany(Letters.Fit))
        {
            var face = bold || run.Emphasis == Emphasis.Bold ? Face.SemiBold : run.Emphasis == Emphasis.Italic ? Face.Italic : Face.Regular;
            var small = run.Standing != Standing.OnLine;
            var sizePt = small ? size * SmallRatio : size;
            var rise = run.Standing switch { Standing.Above => size * RaiseRatio, Standing.Below => -size * LowerRatio, _ => 0 };
            for (var i = 0; i < run.Text.Length; i++)
            {
                var c = run.Text[i];
                if (c == ' ')
                {
                    Flush();
                    End(true);
                    continue;
                }

                now.Append(c);
                // A hyphen between letters may end a line; one before a digit is a sign or a range.
                if (c == '-' && i > 0 && i + 1 < run.Text.Length && char.IsLetter(run.Text[i - 1]) && char.IsLetter(run.Text[i + 1]))
                {
                    Flush();
                    End(false);
                }
            }

            Flush();

            void Flush()
            {
                if (now.Length == 0)
                    return;
                var s = now.ToString();
                pieces.Add(new Piece(s, face, sizePt, rise, run.Target, Typeface.WidthPt(s, face, sizePt)));
                now.Clear();
            }
        }

        End(false);
        return words;

        void End(bool spaceAfter)
        {
            if (pieces.Count > 0)
            {
                words.Add(new Word([.. pieces], pieces.Sum(p => p.WidthPt), spaceAfter));
                pieces.Clear();
            }
            else if (spaceAfter && words.Count > 0)
            {
                words[^1] = words[^1] with { SpaceAfter = true };
            }
        }
    }

    private static IEnumerable<Word> Chop(Word word, double widthPt)
    {
        var part = new List<Piece>();
        var used = 0.0;
        foreach (var piece in word.Pieces)
        {
            var now = new StringBuilder();
            var nowPt = 0.0;
            foreach (var rune in piece.Text.EnumerateRunes())
            {
                var advance = Typeface.File(piece.Face).AdvancePerEm(rune.Value) * piece.SizePt;
                if (used + nowPt + advance > widthPt && used + nowPt > 0)
                {
                    if (now.Length > 0)
                        part.Add(piece with { Text = now.ToString(), WidthPt = nowPt });
                    yield return new Word([.. part], used + nowPt, false);
                    part.Clear();
                    now.Clear();
                    used = 0;
                    nowPt = 0;
                }

                now.Append(rune.ToString());
                nowPt += advance;
            }

            if (now.Length > 0)
                part.Add(piece with { Text = now.ToString(), WidthPt = nowPt });
            used += nowPt;
        }

        yield return new Word([.. part], used, word.SpaceAfter);
    }

    private sealed record Piece(string Text, Face Face, double SizePt, double RisePt, string Target, double WidthPt);

    private sealed record Word(IReadOnlyList<Piece> Pieces, double WidthPt, bool SpaceAfter);
}
