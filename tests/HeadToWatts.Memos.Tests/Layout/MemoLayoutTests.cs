using HeadToWatts.Memos.Content;
using HeadToWatts.Memos.Layout;

namespace HeadToWatts.Memos.Tests.Layout;

public class MemoLayoutTests
{
    [Fact]
    public void No_page_ends_with_a_heading_or_a_caption()
    {
        for (var paragraphs = 0; paragraphs < 40; paragraphs++)
        {
            var layout = MemoLayout.Of(Sample.Memo(paragraphs: paragraphs));
            foreach (var page in layout.Pages)
            {
                var last = page.Ops.OfType<OpenTag>().LastOrDefault(t => t.Tag is "H2" or "H3" or "Caption" or "P" or "LBody" or "TD" or "TH");
                Assert.False(last?.Tag is "H2" or "H3" || (last?.Tag == "Caption" && !page.Ops.OfType<OpenFigure>().Any()), $"page {page.Number} with {paragraphs} paragraphs ends with {last?.Tag}");
            }
        }
    }

    [Fact]
    public void Tags_open_and_close_in_pairs_over_all_pages()
    {
        var layout = MemoLayout.Of(Sample.Memo());
        var depth = 0;
        foreach (var op in layout.Pages.SelectMany(p => p.Ops))
        {
            depth += op switch { OpenTag or OpenFigure => 1, CloseTag => -1, _ => 0 };
            Assert.True(depth >= 0);
        }

        Assert.Equal(0, depth);
    }

    [Fact]
    public void A_cell_longer_than_a_page_is_printed_to_its_end()
    {
        var words = string.Join(' ', Enumerable.Range(1, 1500).Select(i => "word" + i));
        var table = new TableBlock("t", "Table 1", "Long.", [new("A"), new("B")], [new TableRow(["x", words])], "");
        var layout = MemoLayout.Of(Sample.Memo() with { Blocks = [table] });
        Assert.True(layout.Pages.Count > 1);
        var text = string.Join(' ', layout.Pages.SelectMany(p => p.Ops).OfType<TextOp>().Where(t => !t.Decoration).Select(t => t.Text.Trim()));
        Assert.Contains("word1500", text, StringComparison.Ordinal);
        Assert.All(layout.Pages.SelectMany(p => p.Ops).OfType<TextOp>(), t => Assert.InRange(t.YPt, 0, layout.HeightPt));
    }

    [Fact]
    public void A_word_wider_than_the_page_and_a_very_long_title_stay_inside()
    {
        var layout = MemoLayout.Of(Sample.Memo(title: new string('W', 300)));
        Assert.All(layout.Pages.SelectMany(p => p.Ops).OfType<TextOp>(), t =>
        {
            Assert.True(t.XPt >= Look.MarginXPt - 1e-6);
            Assert.True(t.XPt + t.WidthPt <= layout.WidthPt - Look.MarginXPt + 0.5, t.Text);
        });
    }

    [Fact]
    public void Long_numbers_of_the_headline_do_not_run_into_each_other()
    {
        var figures = new KeyFiguresBlock([new("Energy", "123 456 789", "MWh a year", "a"), new("Energy", "123 456 789", "MWh a year", "b"), new("C", "1", "kW", "c"), new("D", "1", "kW", "d")]);
        var layout = MemoLayout.Of(Sample.Memo() with { Blocks = [figures] });
        var texts = layout.Pages[0].Ops.OfType<TextOp>().Where(t => !t.Decoration).GroupBy(t => t.YPt);
        foreach (var line in texts)
        {
            var ordered = line.OrderBy(t => t.XPt).ToArray();
            for (var i = 1; i < ordered.Length; i++)
                Assert.True(ordered[i].XPt >= ordered[i - 1].XPt + ordered[i - 1].WidthPt - 0.01);
        }
    }
}
