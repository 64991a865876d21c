using HeadToWatts.Memos.Content;
using HeadToWatts.Memos.Layout.Type;

namespace HeadToWatts.Memos.Layout.Setters;

/// <summary>Sets headings, paragraphs, formulas and lists.</summary>
internal static class TextSetters
{
    public static List<Strip> Heading(Setting setting, HeadingBlock block)
    {
        var section = block.Level == 1;
        var size = section ? 15.5 : 11.5;
        var leading = section ? 20 : 16;
        var indent = block.Number.Length == 0 ? 0 : section ? 30 : 34;
        var strips = setting.Lines(RichText.Bold(block.Text), size, leading, section ? Look.Accent : Look.Ink, indent);
        foreach (var strip in strips)
            strip.KeepWithNext = true;
        var first = strips[0];
        first.SpaceBeforePt = section ? 26 : 16;
        first.NewPage = block.OnNewPage;
        if (block.Number.Length > 0)
        {
            var number = block.Number + " ";
            first.Ops.Insert(0, new TextOp(setting.LeftPt, Setting.Baseline(leading, size), number, Face.SemiBold, size, Look.Accent, Typeface.WidthPt(block.Number, Face.SemiBold, size)));
        }

        first.Ops.Insert(0, new AnchorOp(block.Anchor, 0));
        if (block.InContents)
            first.Ops.Insert(0, new OutlineOp(block.Level, (block.Number + " " + block.Text).Trim(), 0));
        Setting.Tag(strips, section ? "H2" : "H3");
        strips[^1].HeightPt += section ? 5 : 3;
        return strips;
    }

    public static List<Strip> Paragraph(Setting setting, ParagraphBlock block)
    {
        var (size, leading, colour) = block.Kind switch
        {
            ParagraphKind.Lead => (Look.LeadPt, Look.LeadLeadingPt, Look.Ink),
            ParagraphKind.Note => (Look.NotePt, Look.NoteLeadingPt, Look.Soft),
            _ => (Look.BodyPt, Look.BodyLeadingPt, Look.Ink),
        };
        var strips = setting.Lines(block.Text, size, leading, colour);
        strips[0].SpaceBeforePt = block.Kind switch { ParagraphKind.Note => 5, ParagraphKind.Title => 13, _ => 7 };
        strips[^1].KeepWithNext = block.KeepWithNext;
        Setting.Tag(strips, "P");
        return strips;
    }

    public static List<Strip> Formula(Setting setting, FormulaBlock block)
    {
        const double size = 10.5;
        const double leading = 16;
        const double indent = 24;
        var remark = LineBreaker.Break(block.Remark, Look.NotePt, setting.WidthPt * 0.4)[0];
        var room = remark.WidthPt > 0 ? remark.WidthPt + 14 : 0;
        var strips = setting.Lines(block.Formula, size, leading, Look.Ink, indent, room);
        if (!block.Remark.IsEmpty)
            Setting.Put(strips[^1].Ops, remark, setting.LeftPt + setting.WidthPt - remark.WidthPt, Setting.Baseline(leading, size), Look.Soft);
        strips[0].SpaceBeforePt = block.ContinuesAbove ? 0 : 4;
        foreach (var strip in strips.SkipLast(1))
            strip.KeepWithNext = true;
        strips[^1].KeepWithNext = block.KeepWithNext;
        Setting.Tag(strips, "P");
        return strips;
    }

    public static List<Strip> List(Setting setting, ListBlock block)
    {
        const double size = Look.BodyPt;
        const double leading = Look.BodyLeadingPt;
        var labelled = block.Labels.Count > 0;
        var indent = labelled ? block.Labels.Max(l => Typeface.WidthPt(l, Face.Regular, size)) + 9 : 14;
        var all = new List<Strip>();
        for (var i = 0; i < block.Items.Count; i++)
        {
            var strips = setting.Lines(block.Items[i], size, leading, Look.Ink, indent);
            Setting.Tag(strips, "LBody");
            var label = labelled ? block.Labels[i] : "•";
            strips[0].Ops.InsertRange(0, [
                new OpenTag("LI", Grouping: true),
                new OpenTag("Lbl"),
                new TextOp(setting.LeftPt + (labelled ? 0 : 3), Setting.Baseline(leading, size), label + " ", Face.Regular, size, labelled ? Look.Ink : Look.Accent, Typeface.WidthPt(label, Face.Regular, size)),
                new CloseTag(),
            ]);
            if (block.Anchors.Count > 0)
                strips[0].Ops.Insert(0, new AnchorOp(block.Anchors[i], 0));
            strips[^1].Ops.Add(new CloseTag());
            strips[0].SpaceBeforePt = i == 0 ? 7 : 3.5;
            all.AddRange(strips);
        }

        Setting.Tag(all, "L", grouping: true);
        return all;
    }
}
