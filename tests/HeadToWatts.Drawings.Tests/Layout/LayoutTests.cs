using HeadToWatts.Drawings.Canvas;
using HeadToWatts.Drawings.Layout;

namespace HeadToWatts.Drawings.Tests.Layout;

public sealed class LayoutTests
{
    private static readonly TextStyle Style = new(InkRole.Ink, 10);

    [Fact]
    public void Figures_all_have_the_width_of_six_tenths()
    {
        // IBM Plex Sans, table hmtx of the regular and the semi-bold: figures are tabular, 600 of 1000.
        foreach (var weight in Enum.GetValues<TextWeight>())
            Assert.Equal(60, TextMeasure.Width("0123456789", 10, weight), 9);
    }

    [Theory]
    [InlineData("A", 6.41)]
    [InlineData("m", 8.73)]
    [InlineData("i", 2.50)]
    [InlineData(" ", 2.36)]
    public void Letters_have_the_widths_of_the_font(string letter, double width)
    {
        // IBM Plex Sans Regular, table hmtx, at a size of 10.
        Assert.Equal(width, TextMeasure.Width(letter, 10), 9);
    }

    [Fact]
    public void A_turned_text_takes_up_height_instead_of_width()
    {
        var box = LabelBox.Of(new Point(50, 50), "0000000000", Style with { Anchor = TextAnchor.Middle, RotationDeg = -90 });
        Assert.Equal(60, box.Corners.Max(c => c.Y) - box.Corners.Min(c => c.Y), 9);
        Assert.Equal(9.5, box.Corners.Max(c => c.X) - box.Corners.Min(c => c.X), 9);
    }

    [Fact]
    public void Two_boxes_touch_only_when_they_share_area()
    {
        var box = LabelBox.Of(new Point(0, 0), 10, 10);
        Assert.True(box.Touches(LabelBox.Of(new Point(9, 9), 10, 10), 0));
        Assert.False(box.Touches(LabelBox.Of(new Point(10, 0), 10, 10), 0));
        Assert.True(box.Touches(LabelBox.Of(new Point(11, 0), 10, 10), 2));

        // A slanted text whose upright bounds overlap the box, but which itself passes it by.
        var slanted = LabelBox.Of(new Point(4, 30), "0000", Style with { RotationDeg = -45 });
        Assert.False(box.Touches(slanted, 0));
    }

    [Fact]
    public void The_length_of_a_line_inside_a_box_is_measured()
    {
        var box = LabelBox.Of(new Point(0, 0), 10, 10);
        Assert.Equal(10, box.LengthInside(new Point(-5, 5), new Point(25, 5)), 9);
        Assert.Equal(10 * Math.Sqrt(2), box.LengthInside(new Point(-5, -5), new Point(15, 15)), 9);
        Assert.Equal(0, box.LengthInside(new Point(-5, 11), new Point(25, 11)), 9);
    }

    [Fact]
    public void A_label_takes_the_first_spot_that_is_free_and_is_left_out_when_none_is()
    {
        var canvas = new DrawingRecorder();
        var placer = new LabelPlacer(0, 0, 100, 40);
        placer.Fix(canvas, new Point(0, 10), "000000", Style);
        Assert.True(placer.TryPlace(canvas, "111111", Style, [new(new Point(20, 12)), new(new Point(90, 12)), new(new Point(50, 12)), new(new Point(50, 30))]));
        Assert.Equal(new Point(50, 12), canvas.Finish("t", "d", 100, 40).Operations.OfType<TextOperation>().Last().At);
        Assert.False(placer.TryPlace(canvas, "222222", Style, [new(new Point(48, 12)), new(new Point(2, 8))]));
    }

    [Fact]
    public void A_label_keeps_off_a_line_when_another_spot_is_free()
    {
        var canvas = new DrawingRecorder();
        var placer = new LabelPlacer(0, 0, 100, 100);
        placer.AvoidLines([new(0, 46), new(100, 46)]);
        Assert.True(placer.TryPlace(canvas, "000", Style, [new(new Point(10, 50)), new(new Point(10, 70))]));
        Assert.Equal(70, canvas.Finish("t", "d", 100, 100).Operations.OfType<TextOperation>().Single().At.Y);
    }

    [Fact]
    public void A_simplified_curve_stays_within_its_tolerance_and_keeps_its_ends()
    {
        Point[] curve = [.. Enumerable.Range(0, 2001).Select(i => new Point(i / 10.0, 50 + (40 * Math.Sin(i / 200.0))))];
        var simple = Simplify.Curve(curve, 0.2);
        Assert.InRange(simple.Count, 10, 150);
        Assert.Equal(curve[0], simple[0]);
        Assert.Equal(curve[^1], simple[^1]);
        foreach (var p in curve)
        {
            var k = 1;
            while (simple[k].X < p.X)
                k++;
            var (a, b) = (simple[k - 1], simple[k]);
            var y = a.Y + ((p.X - a.X) / (b.X - a.X) * (b.Y - a.Y));
            // 0.2 from the chord is 0.45 upright where the curve rises by two in one, its steepest.
            Assert.Equal(y, p.Y, 0.45);
        }
    }
}
