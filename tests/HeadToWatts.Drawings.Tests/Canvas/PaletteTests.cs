using HeadToWatts.Drawings.Canvas;

namespace HeadToWatts.Drawings.Tests.Canvas;

public sealed class PaletteTests
{
    // Roles in which text is set.
    private static readonly InkRole[] TextRoles = [InkRole.Ink, InkRole.Soft, InkRole.Water, InkRole.Ochre, InkRole.Green, InkRole.Plum];

    // Pairs of curves that stand in one drawing.
    private static readonly (InkRole A, InkRole B)[] Together = [(InkRole.Ochre, InkRole.Water), (InkRole.Ochre, InkRole.Green), (InkRole.Water, InkRole.Green), (InkRole.Plum, InkRole.Green), (InkRole.Plum, InkRole.Ochre)];

    // Machado, Oliveira and Fernandes (2009), A physiologically-based model for simulation of color vision deficiency, IEEE
    // Trans. Visualization and Computer Graphics 15(6): severity 1.0, on linear RGB. The figures are from memory.
    private static readonly double[][] Protanopia = [[0.152286, 1.052583, -0.204868], [0.114503, 0.786281, 0.099216], [-0.003882, -0.048116, 1.051998]];
    private static readonly double[][] Deuteranopia = [[0.367322, 0.860646, -0.227968], [0.280085, 0.672501, 0.047413], [-0.011820, 0.042940, 0.968881]];

    public static TheoryData<string> Palettes => new() { "print", "light", "dark" };

    [Theory]
    [MemberData(nameof(Palettes))]
    public void Text_has_the_contrast_that_wcag_asks_for(string name)
    {
        // W3C, Web Content Accessibility Guidelines 2.1, success criterion 1.4.3: 4.5 to 1 for text.
        var palette = Of(name);
        foreach (var role in TextRoles)
        {
            Assert.True(Contrast(palette[role], palette[InkRole.Card]) >= 4.5, $"{role} on card in {name}");
            Assert.True(Contrast(palette[role], palette[InkRole.Paper]) >= 4.5, $"{role} on paper in {name}");
        }

        // Labels that stand in the ground, in the water and on a caution.
        Assert.True(Contrast(palette[InkRole.Soft], palette[InkRole.Ground]) >= 4.5);
        Assert.True(Contrast(palette[InkRole.Soft], palette[InkRole.WaterFill]) >= 4.5);
        Assert.True(Contrast(palette[InkRole.Water], palette[InkRole.WaterFill]) >= 4.5);
        Assert.True(Contrast(palette[InkRole.Amber], palette[InkRole.AmberFill]) >= 4.5);
    }

    [Theory]
    [MemberData(nameof(Palettes))]
    public void Curves_stand_out_from_the_card(string name)
    {
        // WCAG 2.1, success criterion 1.4.11: 3 to 1 for graphics.
        var palette = Of(name);
        foreach (var role in TextRoles)
            Assert.True(Contrast(palette[role], palette[InkRole.Card]) >= 3);
    }

    [Theory]
    [MemberData(nameof(Palettes))]
    public void Curves_of_one_drawing_are_told_apart_without_red_or_green_sight(string name)
    {
        // A difference of 10 in CIELAB (1976) is seen at a glance; common practice, no source. The just noticeable one is about 2.3.
        var palette = Of(name);
        foreach (var (a, b) in Together)
        {
            foreach (var sight in new[] { Protanopia, Deuteranopia })
                Assert.True(Difference(Seen(palette[a], sight), Seen(palette[b], sight)) >= 10, $"{a} and {b} in {name}: {Difference(Seen(palette[a], sight), Seen(palette[b], sight)):0.0}");
        }
    }

    [Fact]
    public void White_on_black_has_the_contrast_of_twenty_one()
    {
        // WCAG 2.1, definition of contrast ratio: the range is 1 to 21.
        Assert.Equal(21, Contrast(new Rgb(255, 255, 255), new Rgb(0, 0, 0)), 9);
        Assert.Equal(1, Contrast(new Rgb(90, 90, 90), new Rgb(90, 90, 90)), 9);
    }

    [Fact]
    public void Grey_looks_grey_to_everybody()
    {
        foreach (var sight in new[] { Protanopia, Deuteranopia })
        {
            foreach (var row in sight)
                Assert.Equal(1, row.Sum(), 3);
        }
    }

    private static Palette Of(string name) => name switch { "print" => Palette.Print, "light" => Palette.Light, _ => Palette.Dark };

    private static double Linear(byte channel)
    {
        // IEC 61966-2-1 (sRGB), as WCAG prints it.
        var c = channel / 255.0;
        return c <= 0.04045 ? c / 12.92 : Math.Pow((c + 0.055) / 1.055, 2.4);
    }

    private static double[] Linear(Rgb c) => [Linear(c.Red), Linear(c.Green), Linear(c.Blue)];

    private static double Contrast(Rgb a, Rgb b)
    {
        var (la, lb) = (Luminance(a), Luminance(b));
        return (Math.Max(la, lb) + 0.05) / (Math.Min(la, lb) + 0.05);

        static double Luminance(Rgb c) => (0.2126 * Linear(c.Red)) + (0.7152 * Linear(c.Green)) + (0.0722 * Linear(c.Blue));
    }

    private static double[] Seen(Rgb colour, double[][] sight)
    {
        var rgb = Linear(colour);
        return [.. sight.Select(row => Math.Clamp((row[0] * rgb[0]) + (row[1] * rgb[1]) + (row[2] * rgb[2]), 0, 1))];
    }

    private static double Difference(double[] a, double[] b)
    {
        var (p, q) = (Lab(a), Lab(b));
        return Math.Sqrt(p.Zip(q, (x, y) => (x - y) * (x - y)).Sum());
    }

    // CIE 1976 L*a*b* with the white of sRGB (D65).
    private static double[] Lab(double[] rgb)
    {
        var x = F(((0.4124 * rgb[0]) + (0.3576 * rgb[1]) + (0.1805 * rgb[2])) / 0.9505);
        var y = F((0.2126 * rgb[0]) + (0.7152 * rgb[1]) + (0.0722 * rgb[2]));
        var z = F(((0.0193 * rgb[0]) + (0.1192 * rgb[1]) + (0.9505 * rgb[2])) / 1.089);
        return [(116 * y) - 16, 500 * (x - y), 200 * (y - z)];

        static double F(double t) => t > 216.0 / 24389 ? Math.Cbrt(t) : ((24389.0 / 27 * t) + 16) / 116;
    }
}
