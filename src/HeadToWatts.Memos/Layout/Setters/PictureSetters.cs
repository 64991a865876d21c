using HeadToWatts.Memos.Content;
using HeadToWatts.Memos.Layout.Type;

namespace HeadToWatts.Memos.Layout.Setters;

/// <summary>Sets figures, callouts and headline numbers.</summary>
internal static class PictureSetters
{
    public static List<Strip> Figure(Setting setting, FigureBlock block)
    {
        var scale = Math.Min(1, setting.WidthPt / block.Drawing.Width);
        var height = block.Drawing.Height * scale;
        var caption = LineBreaker.Break(RichText.Bold(block.Label + ". ") + block.Caption, Look.CaptionPt, setting.WidthPt);
        var strip = new Strip { SpaceBeforePt = 12, Floats = true };
        strip.Ops.Add(new AnchorOp(block.Anchor, 0));
        strip.Ops.Add(new OpenFigure(setting.LeftPt, 0, block.Drawing.Width * scale, height, block.AltText));
        strip.Ops.Add(new DrawingOp(setting.LeftPt, 0, scale, block.Drawing));
        strip.Ops.Add(new OpenTag("Caption"));
        var y = height + 6;
        foreach (var line in caption)
        {
            Setting.Put(strip.Ops, line, setting.LeftPt, y + Setting.Baseline(Look.CaptionLeadingPt, Look.CaptionPt), Look.Soft);
            y += Look.CaptionLeadingPt;
        }

        strip.Ops.Add(new CloseTag());
        strip.Ops.Add(new CloseTag());
        strip.HeightPt = y + 8;
        return [strip];
    }

    public static List<Strip> Callout(Setting setting, CalloutBlock block)
    {
        const double pad = 8;
        const double bar = 3;
        const double inset = 14;
        var amber = block.Kind != CalloutKind.Note;
        var strips = new List<Strip>();
        if (!block.Heading.IsEmpty)
            Add(setting.Lines(block.Heading.AsBold(), Look.BodyPt, Look.BodyLeadingPt, amber ? Look.Amber : Look.Accent, inset, pad), "P");
        Add(setting.Lines(block.Text, Look.BodyPt - 0.5, Look.BodyLeadingPt - 0.8, Look.Ink, inset, pad), "P");
        if (!block.Remark.IsEmpty)
            Add(setting.Lines(block.Remark, Look.NotePt, Look.NoteLeadingPt, Look.Soft, inset, pad), "P");
        Shift(strips[0], pad - 2);
        strips[^1].HeightPt += pad - 2;
        var height = strips.Sum(s => s.HeightPt);
        foreach (var strip in strips)
        {
            // A hair over the edge, or viewers show a seam between the strips.
            strip.Ops.Insert(0, new FillOp(setting.LeftPt, 0, setting.WidthPt, strip.HeightPt + (strip == strips[^1] ? 0 : 0.3), amber ? Look.AmberTint : Look.Zebra));
            strip.Ops.Insert(1, new FillOp(setting.LeftPt, 0, block.Kind == CalloutKind.Serious ? bar + 2 : bar, strip.HeightPt + (strip == strips[^1] ? 0 : 0.3), amber ? Look.Amber : Look.Accent));
            strip.KeepWithNext = strip != strips[^1] && (height < 220 || strip.KeepWithNext);
        }

        strips[0].SpaceBeforePt = 9;
        return strips;

        void Add(List<Strip> lines, string tag)
        {
            Setting.Tag(lines, tag);
            strips.AddRange(lines);
        }
    }

    public static List<Strip> KeyFigures(Setting setting, KeyFiguresBlock block)
    {
        const double gap = 16;
        const double valuePt = 22;
        var all = new List<Strip>();
        foreach (var row in block.Figures.Chunk(block.Figures.Count is 5 or 6 or 9 ? 3 : 4))
        {
            var width = (setting.WidthPt - gap * (row.Length - 1)) / row.Length;
            var strip = new Strip { SpaceBeforePt = 12 };
            var bottom = 0.0;
            for (var i = 0; i < row.Length; i++)
            {
                var figure = row[i];
                var x = setting.LeftPt + i * (width + gap);
                strip.Ops.Add(new RuleOp(x, 0, width, 0.9, Look.Accent));
                strip.Ops.Add(new OpenTag("P"));
                var y = 5.0;
                y = Lines(strip, RichText.Of(figure.Name), Look.NotePt, Look.NoteLeadingPt, x, y, width, Look.Soft);
                var value = figure.Value;
                // A long number is set smaller rather than over its neighbour.
                var size = valuePt;
                while (size > 10 && Typeface.WidthPt(value, Face.SemiBold, size) + Typeface.WidthPt("\u202f" + figure.Unit, Face.Regular, 10.5) > width)
                    size -= 0.5;
                var baseline = y + 22;
                var valueWidth = Typeface.WidthPt(value, Face.SemiBold, size);
                strip.Ops.Add(new TextOp(x, baseline, Letters.FitPlain(value) + " ", Face.SemiBold, size, Look.Accent, valueWidth));
                strip.Ops.Add(new TextOp(x + valueWidth + 4, baseline, Letters.FitPlain(figure.Unit) + " ", Face.Regular, 10.5, Look.Soft, Typeface.WidthPt(figure.Unit, Face.Regular, 10.5)));
                y = Lines(strip, figure.Note, Look.SmallPt, 11, x, baseline + 5, width, Look.Soft);
                strip.Ops.Add(new CloseTag());
                bottom = Math.Max(bottom, y);
            }

            strip.HeightPt = bottom + 4;
            all.Add(strip);
        }

        return all;
    }

    private static double Lines(Strip strip, RichText text, double size, double leading, double x, double y, double width, Drawings.Canvas.Rgb colour)
    {
        foreach (var line in LineBreaker.Break(text, size, width))
        {
            Setting.Put(strip.Ops, line, x, y + Setting.Baseline(leading, size), colour);
            y += leading;
        }

        if (strip.Ops[^1] is TextOp last && !last.Text.EndsWith(' '))
            strip.Ops[^1] = last with { Text = last.Text + " " };
        return y;
    }

    private static void Shift(Strip strip, double dyPt)
    {
        for (var i = 0; i < strip.Ops.Count; i++)
            strip.Ops[i] = strip.Ops[i].Down(dyPt);
        strip.HeightPt += dyPt;
    }
}
