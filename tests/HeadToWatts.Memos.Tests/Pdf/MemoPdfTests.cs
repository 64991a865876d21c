using System.Globalization;
using HeadToWatts.Memos.Content;
using HeadToWatts.Memos.Pdf;
using UglyToad.PdfPig.Graphics.Operations.MarkedContent;
using UglyToad.PdfPig.Graphics.Operations.TextObjects;
using UglyToad.PdfPig.Tokens;

namespace HeadToWatts.Memos.Tests.Pdf;

public class MemoPdfTests
{
    private static readonly byte[] Written = MemoPdf.Write(Sample.Memo());

    [Fact]
    public void The_same_memo_is_the_same_bytes()
    {
        Assert.Equal(Written, MemoPdf.Write(Sample.Memo()));
    }

    [Theory]
    [InlineData("ar-SA")]
    [InlineData("th-TH")]
    [InlineData("de-DE")]
    [InlineData("tr-TR")]
    public void The_culture_of_the_machine_changes_nothing(string culture)
    {
        var before = CultureInfo.CurrentCulture;
        try
        {
            CultureInfo.CurrentCulture = CultureInfo.GetCultureInfo(culture);
            Assert.Equal(Written, MemoPdf.Write(Sample.Memo()));
        }
        finally
        {
            CultureInfo.CurrentCulture = before;
        }
    }

    [Fact]
    public async Task Memos_written_at_the_same_time_do_not_disturb_each_other()
    {
        var all = await Task.WhenAll(Enumerable.Range(0, 8).Select(i => Task.Run(() => MemoPdf.Write(Sample.Memo(rows: i % 2 == 0 ? 70 : 20)))));
        Assert.All(all.Where((_, i) => i % 2 == 0), pdf => Assert.Equal(Written, pdf));
    }

    [Fact]
    public void A_different_memo_has_a_different_id()
    {
        static string Id(byte[] pdf)
        {
            using var read = new ReadBack(pdf);
            return string.Join('|', read.Pdf.Structure.Trailer.Identifier!.Select(t => t.Data));
        }

        Assert.NotEqual(Id(Written), Id(MemoPdf.Write(Sample.Memo(title: "Another drop"))));
    }

    [Fact]
    public void Every_page_says_which_of_how_many_it_is()
    {
        using var read = new ReadBack(Written);
        Assert.True(read.Pages.Count > 4);
        for (var i = 0; i < read.Pages.Count; i++)
            Assert.Contains($"Page {i + 1} of {read.Pages.Count}", read.PageTexts[i], StringComparison.Ordinal);
    }

    [Theory]
    [InlineData(Paper.Letter, 612, 792)]
    [InlineData(Paper.A4, 595.276, 841.89)]
    public void The_page_has_the_size_of_the_paper_and_nothing_lies_outside_the_margins(Paper paper, double width, double height)
    {
        using var read = new ReadBack(MemoPdf.Write(Sample.Memo(paper)));
        foreach (var page in read.Pages)
        {
            Assert.Equal(width, page.Width, 0.01);
            Assert.Equal(height, page.Height, 0.01);
            Assert.All(page.Letters.Where(l => !string.IsNullOrWhiteSpace(l.Value)), l =>
            {
                Assert.InRange(l.BoundingBox.Left, 60, width - 60);
                Assert.InRange(l.BoundingBox.Right, 60, width - 60);
                Assert.InRange(l.BoundingBox.Bottom, 30, height - 30);
                Assert.InRange(l.BoundingBox.Top, 30, height - 30);
            });
        }
    }

    [Fact]
    public void The_words_can_be_read_back()
    {
        using var read = new ReadBack(Written);
        Assert.Contains("Screening. Not for construction.", read.Text, StringComparison.Ordinal);
        Assert.Contains("The kinematic viscosity is 1.31 × 10−6 m²/s, γ = 9 798 N/m³, η ≥ 0.85 − 0.02", read.Text, StringComparison.Ordinal);
        Assert.Contains("A note below the table.", read.Text, StringComparison.Ordinal);
    }

    [Fact]
    public void A_table_goes_on_with_its_head_on_the_next_page_and_loses_no_row()
    {
        using var read = new ReadBack(Written);
        var pages = read.PageTexts.Where(t => t.Contains("Table 1", StringComparison.Ordinal)).ToArray();
        Assert.True(pages.Length >= 3);
        Assert.Contains("Table 1. Flow classes", pages[0], StringComparison.Ordinal);
        Assert.All(pages.Skip(1), p => Assert.Contains("Table 1, continued", p, StringComparison.Ordinal));
        // Read out once: the repeated heads are decoration.
        var rows = read.Elements().Where(e => e.Type == "TR").ToArray();
        Assert.Equal(1 + 70 + 1, rows.Length);
        Assert.All(rows, r => Assert.Equal(4, read.KidsOf(r.Element).Count()));
    }

    [Fact]
    public void The_structure_names_headings_lists_tables_figures_contents_and_links()
    {
        using var read = new ReadBack(Written);
        var elements = read.Elements().ToArray();
        var types = elements.Select(e => e.Type).ToHashSet();
        Assert.Superset(new HashSet<string> { "Document", "H1", "H2", "H3", "P", "L", "LI", "Lbl", "LBody", "Table", "Caption", "THead", "TBody", "TR", "TH", "TD", "Figure", "TOC", "TOCI", "Link" }, types);
        Assert.Single(elements, e => e.Type == "H1");
        Assert.Equal("true", ((BooleanToken)read.Follow(((DictionaryToken)read.Follow(read.Catalog.Data["MarkInfo"])).Data["Marked"])).Data ? "true" : "false");
        Assert.Equal("en", read.Follow(read.Catalog.Data["Lang"]).ToString()!.Trim('(', ')'));
        foreach (var head in elements.Where(e => e.Type == "TH"))
        {
            var attributes = read.Follow(head.Element.Data["A"]);
            var table = attributes as DictionaryToken ?? (DictionaryToken)read.Follow(((ArrayToken)attributes).Data[0]);
            Assert.Contains(((NameToken)table.Data["Scope"]).Data, new[] { "Column", "Row" });
        }

        var figure = Assert.Single(elements, e => e.Type == "Figure");
        Assert.Contains("rises from 0 to 10 m", figure.Element.Data["Alt"].ToString(), StringComparison.Ordinal);
    }

    [Fact]
    public void Marks_and_text_objects_do_not_cross_and_every_mark_belongs_to_the_structure()
    {
        foreach (var paper in new[] { Paper.Letter, Paper.A4 })
        {
            using var read = new ReadBack(MemoPdf.Write(Sample.Memo(paper, paragraphs: 12)));
            foreach (var page in read.Pages)
            {
                var open = new Stack<string>();
                foreach (var operation in page.Operations)
                {
                    switch (operation)
                    {
                        case BeginText: open.Push("text"); break;
                        case EndText: Assert.Equal("text", open.Pop()); break;
                        case BeginMarkedContent or BeginMarkedContentWithProperties: open.Push("mark"); break;
                        case EndMarkedContent: Assert.Equal("mark", open.Pop()); break;
                    }
                }

                Assert.Empty(open);
                Assert.All(page.GetMarkedContents(), m => Assert.True(m.IsArtifact || m.MarkedContentIdentifier >= 0));
            }

            var marks = read.Pages.Sum(p => p.Operations.OfType<BeginMarkedContentWithProperties>().Count());
            var kids = read.Elements().Sum(e => read.KidsOf(e.Element).Count(k => k is NumericToken || (k is DictionaryToken d && d.Data.ContainsKey("MCID"))));
            Assert.Equal(marks, kids);
        }
    }

    [Fact]
    public void A_page_that_begins_with_a_figure_is_well_formed()
    {
        var blocks = new List<Block>();
        for (var i = 0; i < 4; i++)
            blocks.Add(new FigureBlock("fig-" + i, "Figure " + (i + 1), Sample.Line(), "A line.", "A line that rises."));
        var memo = Sample.Memo() with { Blocks = blocks };
        using var read = new ReadBack(MemoPdf.Write(memo));
        Assert.Equal(2, read.Pages.Count);
        foreach (var page in read.Pages)
        {
            var inside = new Stack<bool>();
            foreach (var operation in page.Operations)
            {
                if (operation is BeginText or BeginMarkedContent or BeginMarkedContentWithProperties)
                    inside.Push(operation is BeginText);
                else if (operation is EndText or EndMarkedContent)
                    Assert.Equal(operation is EndText, inside.Pop());
            }

            Assert.Empty(inside);
        }
    }

    [Fact]
    public void The_outline_lists_the_sections()
    {
        using var read = new ReadBack(Written);
        Assert.True(read.Pdf.TryGetBookmarks(out var bookmarks));
        Assert.Equal(["1 The answer", "2 Text", "3 A long table", "4 After the table", "A Sources"], bookmarks.Roots.Select(r => r.Title));
    }

    [Fact]
    public void The_contents_name_the_page_on_which_a_section_begins()
    {
        using var read = new ReadBack(Written);
        Assert.True(read.Pdf.TryGetBookmarks(out var bookmarks));
        foreach (var node in bookmarks.Roots.Cast<UglyToad.PdfPig.Outline.DocumentBookmarkNode>())
            Assert.Contains($"{node.Title} {node.PageNumber}", read.PageTexts[0], StringComparison.Ordinal);
    }

    [Fact]
    public void A_link_that_leads_nowhere_is_refused()
    {
        var memo = Sample.Memo() with { Blocks = [new ParagraphBlock(RichText.Link("there", "nowhere"))] };
        Assert.Throws<InvalidOperationException>(() => MemoPdf.Write(memo));
    }

    [Fact]
    public void Title_author_and_description_survive_marks_that_XML_would_trip_over()
    {
        var memo = Sample.Memo(title: "Ditch <No. 5> & \"Sons\"") with { Author = "Ä & Ö <x>" };
        using var read = new ReadBack(MemoPdf.Write(memo));
        Assert.Equal("Ditch <No. 5> & \"Sons\"", read.Pdf.Information.Title);
        Assert.True(read.Pdf.TryGetXmpMetadata(out var metadata));
        var xml = metadata.GetXDocument();
        Assert.Contains("Ditch <No. 5> & \"Sons\"", xml.ToString(System.Xml.Linq.SaveOptions.DisableFormatting).Replace("&lt;", "<", StringComparison.Ordinal).Replace("&gt;", ">", StringComparison.Ordinal).Replace("&amp;", "&", StringComparison.Ordinal), StringComparison.Ordinal);
    }

    [Fact]
    public void Characters_without_a_glyph_are_printed_as_question_marks_and_reported()
    {
        var memo = Sample.Memo() with { Blocks = [new ParagraphBlock("水 at the 5 ⇒ drop ●")] };
        Assert.Equal(["水"], MemoPdf.MissingCharacters(memo));
        using var read = new ReadBack(MemoPdf.Write(memo));
        Assert.Contains("? at the 5 → drop •", read.Text, StringComparison.Ordinal);
    }

    [Fact]
    public void A_memo_without_a_date_carries_none_of_today()
    {
        var memo = Sample.Memo() with { Date = null };
        using var read = new ReadBack(MemoPdf.Write(memo));
        Assert.StartsWith("D:20000101", read.Pdf.Information.CreationDate, StringComparison.Ordinal);
    }
}
