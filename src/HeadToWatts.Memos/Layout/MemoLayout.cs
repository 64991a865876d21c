using System.Globalization;
using HeadToWatts.Memos.Content;
using HeadToWatts.Memos.Layout.Setters;
using HeadToWatts.Memos.Layout.Type;

namespace HeadToWatts.Memos.Layout;

/// <summary>A place in the laid-out memo.</summary>
internal readonly record struct Place(int Page, double YPt);

/// <summary>
/// A memo on its pages. Two passes: the first finds the page of every heading, the second sets the contents with them. Every
/// page also gets its head and foot here, "page n of N".
/// </summary>
internal sealed record MemoLayout(MemoDocument Document, double WidthPt, double HeightPt, IReadOnlyList<PageLayout> Pages, IReadOnlyDictionary<string, Place> Anchors)
{
    public static MemoLayout Of(MemoDocument document)
    {
        var (width, height) = Look.Size(document.Paper);
        IReadOnlyDictionary<string, Place> anchors = new Dictionary<string, Place>(StringComparer.Ordinal);
        IReadOnlyList<PageLayout> pages = [];
        var set = new Dictionary<Block, List<Strip>>(ReferenceEqualityComparer.Instance);
        for (var pass = 0; pass < 2; pass++)
        {
            var known = anchors;
            var setting = new Setting(Look.MarginXPt, width - 2 * Look.MarginXPt, a => known.TryGetValue(a, out var place) ? place.Page : 0);
            // Only the contents depend on the pages; the rest is set once.
            foreach (var block in document.Blocks)
            {
                if (pass == 0 || block is ContentsBlock)
                    set[block] = Set(setting, document, block);
            }

            var strips = document.Blocks.SelectMany(b => set[b]).ToList();
            pages = Paginator.Paginate(strips, Look.FirstBodyTopPt, Look.BodyTopPt, height - Look.BodyBottomFromBottomPt);
            anchors = Find(pages);
        }

        return new MemoLayout(document, width, height, [.. pages.Select(p => WithHeadAndFoot(document, p, pages.Count, width, height))], anchors);
    }

    private static List<Strip> Set(Setting setting, MemoDocument document, Block block) => block switch
    {
        TitleBlock b => FrontSetters.Title(setting, b),
        ContentsBlock => FrontSetters.Contents(setting, [.. document.Blocks.OfType<HeadingBlock>().Where(h => h.InContents)]),
        HeadingBlock b => TextSetters.Heading(setting, b),
        ParagraphBlock b => TextSetters.Paragraph(setting, b),
        FormulaBlock b => TextSetters.Formula(setting, b),
        ListBlock { Items.Count: > 0 } b => TextSetters.List(setting, b),
        ListBlock => [],
        TableBlock b => TableSetter.Table(setting, b),
        FigureBlock b => PictureSetters.Figure(setting, b),
        CalloutBlock b => PictureSetters.Callout(setting, b),
        KeyFiguresBlock b => PictureSetters.KeyFigures(setting, b),
        _ => throw new ArgumentException($"There is no setter for {block.GetType().Name}.", nameof(block)),
    };

    private static Dictionary<string, Place> Find(IReadOnlyList<PageLayout> pages)
    {
        var anchors = new Dictionary<string, Place>(StringComparer.Ordinal);
        foreach (var page in pages)
        {
            foreach (var anchor in page.Ops.OfType<AnchorOp>())
                anchors[anchor.Name] = new Place(page.Number, anchor.YPt);
        }

        return anchors;
    }

    // The foot comes last on a page: all of the page's marked text is closed by then.
    private static PageLayout WithHeadAndFoot(MemoDocument document, PageLayout page, int count, double width, double height)
    {
        var left = Look.MarginXPt;
        var inner = width - 2 * Look.MarginXPt;
        var ops = new List<Op>();
        if (page.Number > 1)
        {
            var revision = Letters.Cut(document.HeaderRight, Face.Regular, Look.NotePt, inner / 3);
            var right = Typeface.WidthPt(revision, Face.Regular, Look.NotePt);
            Decorate(ops, Letters.Cut(document.HeaderLeft, Face.Regular, Look.NotePt, inner - right - 20), left, Look.HeaderBaselinePt);
            Decorate(ops, revision, left + inner - right, Look.HeaderBaselinePt);
            ops.Add(new RuleOp(left, Look.HeaderRulePt, inner, 0.6, Look.Hairline));
        }

        ops.AddRange(page.Ops);
        var number = string.Create(CultureInfo.InvariantCulture, $"Page {page.Number} of {count}");
        var numberWidth = Typeface.WidthPt(number, Face.Regular, Look.NotePt);
        ops.Add(new RuleOp(left, height - Look.FooterRuleFromBottomPt, inner, 0.6, Look.Hairline));
        Decorate(ops, Letters.Cut(document.FooterLeft, Face.Regular, Look.NotePt, inner - numberWidth - 20), left, height - Look.FooterBaselineFromBottomPt);
        Decorate(ops, number, left + inner - numberWidth, height - Look.FooterBaselineFromBottomPt);
        return page with { Ops = ops };
    }

    private static void Decorate(List<Op> ops, string text, double x, double y)
    {
        if (text.Length > 0)
            ops.Add(new TextOp(x, y, Letters.FitPlain(text), Face.Regular, Look.NotePt, Look.Soft, Typeface.WidthPt(Letters.FitPlain(text), Face.Regular, Look.NotePt), Decoration: true));
    }
}
