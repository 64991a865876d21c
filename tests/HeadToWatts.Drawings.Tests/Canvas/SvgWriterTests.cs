using System.Xml.Linq;
using HeadToWatts.Drawings.Canvas;

namespace HeadToWatts.Drawings.Tests.Canvas;

public sealed class SvgWriterTests
{
    private static readonly XNamespace Svg = "http://www.w3.org/2000/svg";

    [Fact]
    public void Title_and_description_name_the_picture_for_screen_readers()
    {
        var root = XElement.Parse(SvgWriter.Write(new DrawingRecorder().Finish("A & B", "1 < 2 and \"3\"", 100, 50), "x1"));
        Assert.Equal("img", root.Attribute("role")!.Value);
        Assert.Equal("x1-t x1-d", root.Attribute("aria-labelledby")!.Value);
        Assert.Equal("A & B", root.Element(Svg + "title")!.Value);
        Assert.Equal("1 < 2 and \"3\"", root.Element(Svg + "desc")!.Value);
        Assert.Equal("x1-t", root.Element(Svg + "title")!.Attribute("id")!.Value);
        Assert.Equal("0 0 100 50", root.Attribute("viewBox")!.Value);
    }

    [Fact]
    public void Numbers_have_at_most_two_decimals_and_a_point_whatever_the_culture()
    {
        var before = Thread.CurrentThread.CurrentCulture;
        try
        {
            Thread.CurrentThread.CurrentCulture = new System.Globalization.CultureInfo("de-DE");
            var canvas = new DrawingRecorder();
            canvas.Line(new Point(1.23456, -0.001), new Point(1e-7, 1234567.891), new Stroke(InkRole.Water, 1.5));
            var line = XElement.Parse(SvgWriter.Write(canvas.Finish("t", "d", 10, 10), "a")).Element(Svg + "line")!;
            Assert.Equal(["1.23", "0", "0", "1234567.89"], new[] { "x1", "y1", "x2", "y2" }.Select(n => line.Attribute(n)!.Value));
            Assert.Equal("1.5", line.Attribute("stroke-width")!.Value);
            Assert.Contains("ink-water", line.Attribute("class")!.Value, StringComparison.Ordinal);
        }
        finally
        {
            Thread.CurrentThread.CurrentCulture = before;
        }
    }

    [Fact]
    public void A_number_that_is_not_finite_is_refused()
    {
        var canvas = new DrawingRecorder();
        canvas.Circle(new Point(double.NaN, 0), 1, Paint.Filled(InkRole.Ink));
        var drawing = canvas.Finish("t", "d", 10, 10);
        Assert.Throws<ArgumentOutOfRangeException>(() => SvgWriter.Write(drawing, "a"));
    }

    [Fact]
    public void An_id_that_could_break_out_of_the_attribute_is_refused()
    {
        var drawing = new DrawingRecorder().Finish("t", "d", 10, 10);
        Assert.Throws<ArgumentException>(() => SvgWriter.Write(drawing, "a\"b"));
    }

    [Fact]
    public void Text_from_a_study_cannot_become_markup()
    {
        var canvas = new DrawingRecorder();
        canvas.BeginMark("</title><script>");
        canvas.Text(new Point(1, 1), "<b>&\u0001", new TextStyle(InkRole.Ink, 12));
        canvas.EndMark();
        var root = XElement.Parse(SvgWriter.Write(canvas.Finish("t", "d", 10, 10), "a"));
        Assert.Empty(root.Descendants(Svg + "script"));
        Assert.Equal("<b>&", root.Descendants(Svg + "text").Single().Value);
        Assert.Equal("</title><script>", root.Element(Svg + "g")!.Element(Svg + "title")!.Value);
    }

    [Fact]
    public void Every_mark_is_closed_before_a_drawing_is_finished()
    {
        var canvas = new DrawingRecorder();
        Assert.Throws<InvalidOperationException>(canvas.EndMark);
        canvas.BeginMark("one");
        Assert.Throws<InvalidOperationException>(() => canvas.BeginMark("two"));
        Assert.Throws<InvalidOperationException>(() => canvas.Finish("t", "d", 1, 1));
    }

    [Fact]
    public void A_replayed_drawing_records_the_same_steps()
    {
        var drawing = AllDrawings.Of("canal drop", "half", Basis.Units.UnitSystem.US)[0].Drawing;
        var again = new DrawingRecorder();
        drawing.DrawOn(again);
        var copy = again.Finish(drawing.Title, drawing.Description, drawing.Width, drawing.Height);
        Assert.Equal(SvgWriter.Write(drawing, "a"), SvgWriter.Write(copy, "a"));
    }

    [Fact]
    public void The_style_sheet_gives_every_role_a_colour()
    {
        foreach (var role in Enum.GetValues<InkRole>())
        {
            Assert.Contains($".{DrawingStyles.InkClass(role)}{{stroke:var(--{DrawingStyles.Variable(role)})}}", DrawingStyles.Css, StringComparison.Ordinal);
            Assert.Contains($".{DrawingStyles.FillClass(role)}{{fill:var(--{DrawingStyles.Variable(role)})}}", DrawingStyles.Css, StringComparison.Ordinal);
        }
    }
}
