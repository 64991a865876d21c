using HeadToWatts.Memos.Layout;

namespace HeadToWatts.Memos.Tests.Layout;

public class PaginatorTests
{
    private const double Top = 84;
    private const double Bottom = 700;

    [Fact]
    public void Strips_keep_their_order_stay_on_the_page_and_stay_together()
    {
        var random = new Random(7);
        for (var round = 0; round < 200; round++)
        {
            var strips = Enumerable.Range(0, random.Next(1, 120)).Select(i => Strip(i, 5 + random.NextDouble() * 60, keep: random.Next(4) == 0, space: random.NextDouble() * 20)).ToArray();
            var pages = Paginator.Paginate(strips, Top, Top, Bottom);
            var found = pages.SelectMany(p => p.Ops.OfType<AnchorOp>().Select(a => (Index: int.Parse(a.Name, System.Globalization.CultureInfo.InvariantCulture), a.YPt, p.Number))).ToArray();
            Assert.Equal(Enumerable.Range(0, strips.Length), found.Select(f => f.Index));
            Assert.All(found, f => Assert.InRange(f.YPt, Top - 1e-9, Bottom - strips[f.Index].HeightPt + 1e-5));
            for (var i = 0; i + 1 < found.Length; i++)
            {
                // Runs of strips kept together stay far below a page here.
                if (strips[i].KeepWithNext)
                    Assert.Equal(found[i].Number, found[i + 1].Number);
            }
        }
    }

    [Fact]
    public void A_figure_that_does_not_fit_waits_while_the_text_goes_on()
    {
        var strips = new[] { Strip(0, 500), Strip(1, 300, floats: true), Strip(2, 50), Strip(3, 100) };
        var pages = Paginator.Paginate(strips, Top, Top, Bottom);
        Assert.Equal(["0", "2"], pages[0].Ops.OfType<AnchorOp>().Select(a => a.Name));
        Assert.Equal(["1", "3"], pages[1].Ops.OfType<AnchorOp>().Select(a => a.Name));
    }

    [Fact]
    public void A_figure_never_falls_inside_a_table()
    {
        var open = Strip(2, 80);
        open.Ops.Insert(0, new OpenTag("Table"));
        var close = Strip(4, 80);
        close.Ops.Add(new CloseTag());
        var strips = new[] { Strip(0, 500), Strip(1, 300, floats: true), open, Strip(3, 80), close, Strip(5, 20) };
        var names = Paginator.Paginate(strips, Top, Top, Bottom).SelectMany(p => p.Ops.OfType<AnchorOp>()).Select(a => a.Name);
        Assert.Equal(["0", "2", "3", "4", "1", "5"], names);
    }

    [Fact]
    public void A_group_taller_than_a_page_is_still_placed_whole_in_pieces()
    {
        var strips = Enumerable.Range(0, 30).Select(i => Strip(i, 60, keep: true)).ToArray();
        var pages = Paginator.Paginate(strips, Top, Top, Bottom);
        Assert.Equal(30, pages.Sum(p => p.Ops.OfType<AnchorOp>().Count()));
        Assert.All(pages.SelectMany(p => p.Ops.OfType<AnchorOp>()), a => Assert.InRange(a.YPt, Top, Bottom - 60 + 1e-6));
    }

    private static Strip Strip(int index, double height, bool keep = false, double space = 0, bool floats = false)
    {
        var strip = new Strip { HeightPt = height, KeepWithNext = keep, SpaceBeforePt = space, Floats = floats };
        strip.Ops.Add(new AnchorOp(index.ToString(System.Globalization.CultureInfo.InvariantCulture), 0));
        return strip;
    }
}
