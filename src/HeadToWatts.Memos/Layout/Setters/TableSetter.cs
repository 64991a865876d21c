using HeadToWatts.Memos.Content;
using HeadToWatts.Memos.Layout.Type;

namespace HeadToWatts.Memos.Layout.Setters;

/// <summary>
/// Sets a table: caption, head between two rules, rows with every second one tinted, the head repeated on the next page.
/// </summary>
internal static class TableSetter
{
    private const double PadXPt = 6;
    private const double PadYPt = 3.2;
    private const int LinesInARow = 36;
    private const double ShortTextPt = 62;

    // A table up to this height is kept in one piece.
    private const double SmallTablePt = 330;

    public static List<Strip> Table(Setting setting, TableBlock block)
    {
        var widths = Widths(block, setting.WidthPt);
        var width = widths.Sum();
        var strips = Caption(setting, block);
        var head = Head(setting, block, widths, width, repeat: false);
        strips.Add(head);
        var rows = new List<Strip>();
        var tint = false;
        foreach (var row in block.Rows)
        {
            rows.AddRange(Row(setting, block.Columns, row, widths, width, tint));
            tint = !tint;
        }

        var repeat = Head(setting, block, widths, width, repeat: true);
        foreach (var row in rows)
            row.Repeat = repeat;
        if (rows.Count > 0)
        {
            rows[0].Ops.Insert(0, new OpenTag("TBody", Grouping: true));
            rows[^1].Ops.Add(new CloseTag());
            rows[^1].Ops.Add(new RuleOp(setting.LeftPt, rows[^1].HeightPt, width, 0.6, Look.Hairline));
            Keep(rows);
        }

        strips.AddRange(rows);
        strips[0].Ops.Insert(0, new OpenTag("Table", Grouping: true));
        strips[^1].Ops.Add(new CloseTag());
        strips[0].Ops.Insert(0, new AnchorOp(block.Anchor, 0));
        if (!block.Note.IsEmpty)
        {
            strips[^1].KeepWithNext = true;
            var note = setting.Lines(block.Note, Look.NotePt, Look.NoteLeadingPt, Look.Soft);
            note[0].SpaceBeforePt = 5;
            Setting.Tag(note, "P");
            strips.AddRange(note);
        }

        strips[^1].HeightPt += 6;
        return strips;
    }

    private static void Keep(List<Strip> rows)
    {
        if (rows.Sum(r => r.HeightPt) < SmallTablePt)
        {
            foreach (var row in rows.SkipLast(1))
                row.KeepWithNext = true;
            return;
        }

        // Two rows at least on either side of a break.
        rows[0].KeepWithNext = true;
        rows[^2].KeepWithNext = true;
    }

    private static List<Strip> Caption(Setting setting, TableBlock block)
    {
        var caption = setting.Lines(RichText.Bold(block.Label + ". ") + block.Caption, Look.CaptionPt, Look.CaptionLeadingPt, Look.Soft);
        foreach (var strip in caption)
            strip.KeepWithNext = true;
        caption[0].SpaceBeforePt = 13;
        caption[^1].HeightPt += 3;
        Setting.Tag(caption, "Caption");
        return caption;
    }

    private static Strip Head(Setting setting, TableBlock block, double[] widths, double width, bool repeat)
    {
        var cells = block.Columns.Select((c, i) => LineBreaker.Break(c.Head, Look.TablePt, widths[i] - 2 * PadXPt, bold: true)).ToArray();
        var top = 0.0;
        var strip = new Strip { KeepWithNext = true };
        if (repeat)
        {
            var again = LineBreaker.Break(RichText.Bold(block.Label) + ", continued", Look.CaptionPt, setting.WidthPt)[0];
            Setting.Put(strip.Ops, again, setting.LeftPt, Setting.Baseline(Look.CaptionLeadingPt, Look.CaptionPt), Look.Soft, decoration: true);
            top = Look.CaptionLeadingPt + 3;
        }

        var height = cells.Max(c => c.Count) * Look.TableLeadingPt + 2 * PadYPt + 1;
        strip.HeightPt = top + height;
        strip.Ops.Add(new FillOp(setting.LeftPt, top, width, height, Look.HeadTint));
        strip.Ops.Add(new RuleOp(setting.LeftPt, top, width, 0.9, Look.Accent));
        strip.Ops.Add(new RuleOp(setting.LeftPt, top + height, width, 0.9, Look.Accent));
        if (!repeat)
        {
            strip.Ops.Add(new OpenTag("THead", Grouping: true));
            strip.Ops.Add(new OpenTag("TR", Grouping: true));
        }

        var x = setting.LeftPt;
        for (var i = 0; i < cells.Length; i++)
        {
            if (!repeat)
                strip.Ops.Add(new OpenTag("TH", Scope: "Column"));
            // Heads stand on the lower edge, so that heads of one and two lines share it.
            var y = top + PadYPt + (cells.Max(c => c.Count) - cells[i].Count) * Look.TableLeadingPt;
            PutCell(strip.Ops, cells[i], block.Columns[i].Align, x, y, widths[i], Look.Ink, repeat);
            if (!repeat)
                strip.Ops.Add(new CloseTag());
            x += widths[i];
        }

        if (!repeat)
        {
            strip.Ops.Add(new CloseTag());
            strip.Ops.Add(new CloseTag());
        }

        return strip;
    }

    private static IEnumerable<Strip> Row(Setting setting, IReadOnlyList<TableColumn> columns, TableRow row, double[] widths, double width, bool tint)
    {
        var bold = row.Kind is RowKind.Total or RowKind.Chosen;
        var cells = row.Cells.Select((c, i) => LineBreaker.Break(c, Look.TablePt, widths[i] - 2 * PadXPt, bold)).ToArray();
        var most = cells.Max(c => c.Count);
        // A row taller than a page goes on in a row below it.
        for (var from = 0; from < most; from += LinesInARow)
        {
            var lines = Math.Min(LinesInARow, most - from);
            var height = lines * Look.TableLeadingPt + 2 * PadYPt;
            var strip = new Strip { HeightPt = height };
            if (row.Kind == RowKind.Chosen || tint)
                strip.Ops.Add(new FillOp(setting.LeftPt, 0, width, height, row.Kind == RowKind.Chosen ? Look.ChosenTint : Look.Zebra));
            if (row.Kind == RowKind.Total && from == 0)
                strip.Ops.Add(new RuleOp(setting.LeftPt, 0, width, 0.6, Look.Ink));
            strip.Ops.Add(new OpenTag("TR", Grouping: true));
            var x = setting.LeftPt;
            for (var i = 0; i < cells.Length; i++)
            {
                strip.Ops.Add(i == 0 ? new OpenTag("TH", Scope: "Row") : new OpenTag("TD"));
                PutCell(strip.Ops, [.. cells[i].Skip(from).Take(lines)], columns[i].Align, x, PadYPt, widths[i], Look.Ink, decoration: false);
                strip.Ops.Add(new CloseTag());
                x += widths[i];
            }

            strip.Ops.Add(new CloseTag());
            yield return strip;
        }
    }

    private static void PutCell(List<Op> ops, IReadOnlyList<TextLine> lines, ColumnAlign align, double xPt, double topPt, double widthPt, Drawings.Canvas.Rgb colour, bool decoration)
    {
        for (var l = 0; l < lines.Count; l++)
        {
            var free = widthPt - 2 * PadXPt - lines[l].WidthPt;
            var x = xPt + PadXPt + (align == ColumnAlign.Right ? free : align == ColumnAlign.Middle ? free / 2 : 0);
            Setting.Put(ops, lines[l], x, topPt + l * Look.TableLeadingPt + Setting.Baseline(Look.TableLeadingPt, Look.TablePt), colour, decoration);
        }
    }

    private static double[] Between(double[] narrow, double[] wide, double available)
    {
        var from = narrow.Sum();
        var to = wide.Sum();
        var ratio = to > from ? (available - from) / (to - from) : 0;
        return [.. narrow.Select((w, i) => w + (wide[i] - w) * ratio)];
    }

    private static double[] Widths(TableBlock block, double available)
    {
        var count = block.Columns.Count;
        var natural = new double[count];
        var least = new double[count];
        var wanted = new double[count];
        for (var i = 0; i < count; i++)
        {
            natural[i] = LineBreaker.NaturalWidthPt(block.Columns[i].Head, Look.TablePt, bold: true);
            least[i] = LineBreaker.WidestWordPt(block.Columns[i].Head, Look.TablePt, bold: true);
            // Long heads may wrap: they should not decide how wide a column of numbers is.
            natural[i] = Math.Max(least[i], Math.Min(natural[i], 90));
            foreach (var row in block.Rows)
            {
                var bold = row.Kind is RowKind.Total or RowKind.Chosen;
                natural[i] = Math.Max(natural[i], LineBreaker.NaturalWidthPt(row.Cells[i], Look.TablePt, bold));
                least[i] = Math.Max(least[i], LineBreaker.WidestWordPt(row.Cells[i], Look.TablePt, bold));
            }

            wanted[i] = Math.Max(least[i], Math.Min(natural[i], ShortTextPt)) + 2 * PadXPt + 0.01;
            natural[i] += 2 * PadXPt + 0.01;
            least[i] += 2 * PadXPt + 0.01;
        }

        var total = natural.Sum();
        if (total <= available)
        {
            var shares = block.Columns.Sum(c => c.Share);
            return shares <= 0 ? natural : [.. natural.Select((w, i) => w + (available - total) * block.Columns[i].Share / shares)];
        }

        // Short texts are broken to make room for long ones only when there is no other way, and words only after that.
        if (wanted.Sum() <= available)
            return Between(wanted, natural, available);
        return least.Sum() <= available ? Between(least, wanted, available) : [.. least.Select(w => w * available / least.Sum())];
    }
}
