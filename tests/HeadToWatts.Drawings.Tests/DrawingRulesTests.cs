using System.Xml.Linq;
using HeadToWatts.Basis.Units;
using HeadToWatts.Drawings.Canvas;
using HeadToWatts.Drawings.Layout;

namespace HeadToWatts.Drawings.Tests;

/// <summary>What holds for every drawing, whatever the study, the size and the units.</summary>
public sealed class DrawingRulesTests
{
    public static TheoryData<string, string, UnitSystem> Cases => AllDrawings.Cases();

    [Theory]
    [MemberData(nameof(Cases))]
    public void Nothing_is_drawn_outside_the_view_box(string scenario, string size, UnitSystem units)
    {
        foreach (var (name, drawing) in AllDrawings.Of(scenario, size, units))
        {
            foreach (var operation in drawing.Operations)
            {
                foreach (var p in Extent.Of(operation))
                {
                    Assert.True(
                        p.X >= -0.01 && p.Y >= -0.01 && p.X <= drawing.Width + 0.01 && p.Y <= drawing.Height + 0.01,
                        $"{name}: {operation} reaches ({p.X:0.0}, {p.Y:0.0}) of {drawing.Width} x {drawing.Height}");
                }
            }
        }
    }

    [Theory]
    [MemberData(nameof(Cases))]
    public void No_two_texts_overlap(string scenario, string size, UnitSystem units)
    {
        foreach (var (name, drawing) in AllDrawings.Of(scenario, size, units))
        {
            var texts = drawing.Operations.OfType<TextOperation>().ToList();
            var boxes = texts.ConvertAll(t => LabelBox.Of(t.At, t.Content, t.Style));
            for (var i = 0; i < boxes.Count; i++)
            {
                for (var k = i + 1; k < boxes.Count; k++)
                    Assert.False(boxes[i].Touches(boxes[k], 0), $"{name}: '{texts[i].Content}' lies over '{texts[k].Content}'");
            }
        }
    }

    [Theory]
    [MemberData(nameof(Cases))]
    public void Text_on_a_screen_is_at_least_eleven_pixels_high(string scenario, string size, UnitSystem units)
    {
        var least = size == "memo" ? 7.5 : 11;
        foreach (var (name, drawing) in AllDrawings.Of(scenario, size, units))
            Assert.All(drawing.Operations.OfType<TextOperation>(), t => Assert.True(t.Style.Size >= least, $"{name}: '{t.Content}' is {t.Style.Size}"));
    }

    [Theory]
    [MemberData(nameof(Cases))]
    public void Every_drawing_is_well_formed_and_the_same_each_time(string scenario, string size, UnitSystem units)
    {
        var first = AllDrawings.Of(scenario, size, units);
        var second = AllDrawings.Draw(scenario, size, units);
        for (var i = 0; i < first.Count; i++)
        {
            var svg = SvgWriter.Write(first[i].Drawing, "d" + i);
            Assert.Equal(svg, SvgWriter.Write(second[i].Drawing, "d" + i));
            var root = XElement.Parse(svg);
            Assert.Equal("svg", root.Name.LocalName);
            Assert.DoesNotContain(root.DescendantsAndSelf().Attributes(), a => a.Name.LocalName is "style" or "fill" or "stroke" || a.Value.Contains('#', StringComparison.Ordinal));
        }
    }

    [Theory]
    [MemberData(nameof(Cases))]
    public void Every_drawing_tells_its_numbers_in_words_and_on_hover(string scenario, string size, UnitSystem units)
    {
        foreach (var (name, drawing) in AllDrawings.Of(scenario, size, units))
        {
            Assert.NotEmpty(drawing.Title);
            Assert.True(drawing.Description.Any(char.IsDigit), $"{name}: the description has no number");
            Assert.EndsWith(".", drawing.Description, StringComparison.Ordinal);
            var hovers = drawing.Operations.Select(o => o switch
            {
                BeginMarkOperation mark => mark.HoverText,
                HoverAreaOperation area => area.HoverText,
                _ => null,
            }).OfType<string>().ToList();
            Assert.True(hovers.Exists(h => h.Any(char.IsDigit)), $"{name}: no value on hover");
        }
    }

    [Theory]
    [MemberData(nameof(Cases))]
    public void Lines_are_finite_and_not_drawn_through_a_thousand_points(string scenario, string size, UnitSystem units)
    {
        foreach (var (name, drawing) in AllDrawings.Of(scenario, size, units))
        {
            Assert.True(drawing.Operations.OfType<PolylineOperation>().All(l => l.Points.Count <= 400), name);
            Assert.All(drawing.Operations.SelectMany(Extent.Of), p => Assert.True(double.IsFinite(p.X) && double.IsFinite(p.Y)));
            Assert.All(drawing.Operations.OfType<PolylineOperation>(), l => Assert.InRange(l.Points.Count, 2, 400));
        }
    }
}
