using System.Globalization;
using HeadToWatts.Memos.Content;
using HeadToWatts.Memos.Layout.Type;

namespace HeadToWatts.Memos.Layout.Setters;

/// <summary>Sets the head of the first page and the contents.</summary>
internal static class FrontSetters
{
    public static List<Strip> Title(Setting setting, TitleBlock block)
    {
        var strips = new List<Strip>();
        Add(setting.Lines(RichText.Bold(block.Kicker), 9.5, 14, Look.Accent), "P", 0);
        Add(setting.Lines(RichText.Bold(block.Title), 25, 30, Look.Ink), "H1", 6);
        if (block.Subtitle.Length > 0)
            Add(setting.Lines(RichText.Of(block.Subtitle), 12, 17, Look.Soft), "P", 3);
        strips.Add(Status(setting, block.Status));
        strips.AddRange(Facts(setting, block.Facts));
        foreach (var strip in strips.SkipLast(1))
            strip.KeepWithNext = true;
        strips[^1].HeightPt += 6;
        return strips;

        void Add(List<Strip> lines, string tag, double space)
        {
            Setting.Tag(lines, tag);
            lines[0].SpaceBeforePt = space;
            strips.AddRange(lines);
        }
    }

    public static List<Strip> Contents(Setting setting, IReadOnlyList<HeadingBlock> headings)
    {
        const double size = Look.BodyPt;
        const double leading = 16.5;
        const double indent = 24;
        const double gap = 28;
        var strips = setting.Lines(RichText.Bold("Contents"), 11.5, 16, Look.Ink);
        strips[0].SpaceBeforePt = 20;
        strips[0].HeightPt += 3;
        strips[0].KeepWithNext = true;
        Setting.Tag(strips, "P");
        if (headings.Count == 0)
            return strips;

        // Two columns read one after the other, so they are one strip.
        var rows = (headings.Count + 1) / 2;
        var width = (setting.WidthPt - gap) / 2;
        var strip = new Strip { HeightPt = rows * leading + 6 };
        strip.Ops.Add(new OpenTag("TOC", Grouping: true));
        for (var i = 0; i < headings.Count; i++)
        {
            var left = setting.LeftPt + (i < rows ? 0 : width + gap);
            var baseline = i % rows * leading + Setting.Baseline(leading, size);
            Entry(strip.Ops, headings[i], setting.PageOf(headings[i].Anchor), left, width, baseline);
        }

        strip.Ops.Add(new CloseTag());
        strips.Add(strip);
        return strips;

        static void Entry(List<Op> ops, HeadingBlock heading, int page, double left, double width, double baseline)
        {
            var number = page.ToString(CultureInfo.InvariantCulture);
            var numberWidth = Typeface.WidthPt(number, Face.Regular, size);
            var text = Letters.Cut(heading.Text, Face.Regular, size, width - indent - 34);
            var textWidth = Typeface.WidthPt(text, Face.Regular, size);
            ops.Add(new OpenTag("TOCI", Grouping: true));
            ops.Add(new OpenTag("P"));
            ops.Add(new TextOp(left, baseline, heading.Number + " ", Face.SemiBold, size, Look.Accent, Typeface.WidthPt(heading.Number, Face.SemiBold, size)));
            ops.Add(new TextOp(left + indent, baseline, text + " ", Face.Regular, size, Look.Ink, textWidth, heading.Anchor));
            ops.Add(new TextOp(left + width - numberWidth, baseline, number, Face.Regular, size, Look.Ink, numberWidth));
            ops.Add(new CloseTag());
            ops.Add(new CloseTag());
            var from = left + indent + textWidth + 6;
            ops.Add(new RuleOp(from, baseline, Math.Max(0, left + width - 20 - from), 0.4, Look.Hairline));
        }
    }

    private static Strip Status(Setting setting, string status)
    {
        const double size = 9;
        const double pad = 7;
        var width = Typeface.WidthPt(status, Face.SemiBold, size);
        var strip = new Strip { SpaceBeforePt = 10, HeightPt = 20 };
        strip.Ops.Add(new FillOp(setting.LeftPt, 0, Math.Min(setting.WidthPt, width + 2 * pad), 18, Look.AmberTint));
        strip.Ops.Add(new OpenTag("P"));
        strip.Ops.Add(new TextOp(setting.LeftPt + pad, 12.2, status, Face.SemiBold, size, Look.Amber, width));
        strip.Ops.Add(new CloseTag());
        return strip;
    }

    private static IEnumerable<Strip> Facts(Setting setting, IReadOnlyList<(string Name, string Value)> facts)
    {
        const double gap = 20;
        const double nameWidth = 74;
        var width = (setting.WidthPt - gap) / 2;
        for (var i = 0; i < facts.Count; i += 2)
        {
            var strip = new Strip { SpaceBeforePt = i == 0 ? 14 : 0 };
            strip.Ops.Add(new RuleOp(setting.LeftPt, 0, setting.WidthPt, 0.5, Look.Hairline));
            var height = 0.0;
            for (var j = i; j < Math.Min(i + 2, facts.Count); j++)
            {
                var x = setting.LeftPt + (j - i) * (width + gap);
                strip.Ops.Add(new OpenTag("P"));
                var name = LineBreaker.Break(RichText.Of(facts[j].Name), Look.NotePt, nameWidth)[0];
                Setting.Put(strip.Ops, name, x, 4 + Setting.Baseline(12, 9), Look.Soft);
                strip.Ops[^1] = (TextOp)strip.Ops[^1] with { Text = ((TextOp)strip.Ops[^1]).Text + " " };
                var y = 4.0;
                foreach (var line in LineBreaker.Break(RichText.Of(facts[j].Value), 9, width - nameWidth))
                {
                    Setting.Put(strip.Ops, line, x + nameWidth, y + Setting.Baseline(12, 9), Look.Ink);
                    y += 12;
                }

                strip.Ops.Add(new CloseTag());
                height = Math.Max(height, y + 4);
            }

            strip.HeightPt = height;
            if (i + 2 >= facts.Count)
                strip.Ops.Add(new RuleOp(setting.LeftPt, height, setting.WidthPt, 0.5, Look.Hairline));
            yield return strip;
        }
    }
}
