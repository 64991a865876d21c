using HeadToWatts.Drawings.Canvas;
using HeadToWatts.Memos.Content;
using HeadToWatts.Memos.Layout.Type;

namespace HeadToWatts.Memos.Layout.Setters;

/// <summary>What the setters share: the measure of the body and the ways to put text into strips.</summary>
/// <param name="LeftPt">Left edge of the body.</param>
/// <param name="WidthPt">Width of the body.</param>
/// <param name="PageOf">Page of an anchor in the pass before; 0 in the first pass.</param>
internal sealed record Setting(double LeftPt, double WidthPt, Func<string, int> PageOf)
{
    /// <summary>Puts the fragments of a line on a baseline.</summary>
    public static void Put(List<Op> ops, TextLine line, double xPt, double baselinePt, Rgb colour, bool decoration = false)
    {
        foreach (var f in line.Fragments)
            ops.Add(new TextOp(xPt + f.XPt, baselinePt - f.RisePt, f.Text, f.Face, f.SizePt, f.Target.Length > 0 ? Look.Accent : colour, f.WidthPt, f.Target, decoration));
    }

    /// <summary>The baseline of a line inside its leading.</summary>
    public static double Baseline(double leadingPt, double sizePt) => leadingPt / 2 + sizePt * 0.35;

    /// <summary>Lines of text, one strip each, kept so that no single line stands alone.</summary>
    public List<Strip> Lines(RichText text, double sizePt, double leadingPt, Rgb colour, double indentPt = 0, double lessPt = 0, bool bold = false)
    {
        var lines = LineBreaker.Break(text, sizePt, WidthPt - indentPt - lessPt, bold);
        var strips = new List<Strip>();
        for (var i = 0; i < lines.Count; i++)
        {
            var strip = new Strip { HeightPt = leadingPt, KeepWithNext = lines.Count > 1 && (i == 0 || i == lines.Count - 2) };
            Put(strip.Ops, lines[i], LeftPt + indentPt, Baseline(leadingPt, sizePt), colour);
            strips.Add(strip);
        }

        return strips;
    }

    /// <summary>Wraps the strips in an element.</summary>
    public static void Tag(List<Strip> strips, string tag, bool grouping = false)
    {
        strips[0].Ops.Insert(0, new OpenTag(tag, grouping));
        strips[^1].Ops.Add(new CloseTag());
    }
}
