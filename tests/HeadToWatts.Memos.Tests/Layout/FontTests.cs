using System.Text;
using HeadToWatts.Memos.Content;
using HeadToWatts.Memos.Layout.Type;
using HeadToWatts.Memos.Pdf;
using PdfSharp.Drawing;

namespace HeadToWatts.Memos.Tests.Layout;

public class FontTests
{
    public static TheoryData<int> Faces() => [(int)Face.Regular, (int)Face.Italic, (int)Face.SemiBold];

    [Theory]
    [MemberData(nameof(Faces))]
    public void Glyphs_are_not_nested_deeper_than_subsetting_keeps(int face)
    {
        Assert.InRange(Typeface.File((Face)face).MaxComponentDepth, 0, 1);
    }

    [Theory]
    [MemberData(nameof(Faces))]
    public void Every_sign_of_the_trade_has_a_glyph(int face)
    {
        const string signs = "−×·±÷=≈≠≤≥<>√∫∞°′″%‰½¼¾²³₀₁₂₃₄₅₆₇₈₉–—…‘’“”•→αβγδεζηθλμνξπρσςτφχψωΓΔΘΛΣΦΨΩ§¶©\u00a0\u202fÄÖÜäöüßéèêçñåøæłřšžğıİÅ";
        Assert.Empty(signs.EnumerateRunes().Where(r => !Typeface.File((Face)face).Has(r.Value)).Select(r => r.ToString()));
    }

    [Theory]
    [MemberData(nameof(Faces))]
    public void Digits_are_of_one_width_so_that_columns_align(int face)
    {
        Assert.Single("0123456789".Select(c => Typeface.WidthPt(c.ToString(), (Face)face, 10)).Distinct());
    }

    [Theory]
    [MemberData(nameof(Faces))]
    public void Widths_agree_with_those_of_the_PDF_library(int face)
    {
        MemoFonts.Register();
        using var measure = XGraphics.CreateMeasureContext(new XSize(1000, 1000), XGraphicsUnit.Point, XPageDirection.Downwards);
        foreach (var text in new[] { "Head and losses", "1 090.5 MWh − 12 %", "γ = ρ g, η ≥ 0.85", "WAVE Type" })
            Assert.Equal(measure.MeasureString(text, MemoFonts.Font((Face)face, 10)).Width, Typeface.WidthPt(text, (Face)face, 10), 0.02);
    }

    [Fact]
    public void The_licence_of_the_typeface_is_in_the_assembly()
    {
        using var stream = typeof(Memo).Assembly.GetManifestResourceStream("IBMPlexSans-OFL.txt");
        Assert.NotNull(stream);
        Assert.Contains("SIL OPEN FONT LICENSE", new StreamReader(stream).ReadToEnd(), StringComparison.OrdinalIgnoreCase);
    }

    [Fact]
    public void Exponents_without_small_glyphs_become_raised_text()
    {
        var runs = Letters.Fit(new TextRun("1.3 × 10⁻⁶ m²")).ToArray();
        Assert.Equal(["1.3 × 10", "−6", " m²"], runs.Select(r => r.Text));
        Assert.Equal(Standing.Above, runs[1].Standing);
    }

    [Theory]
    [InlineData("3.2 m3/s", "3.2\u00a0m³/s")]
    [InlineData("62.4 lbf/ft3", "62.4\u00a0lbf/ft³")]
    [InlineData("57 degF", "57\u00a0°F")]
    [InlineData("20 %", "20\u00a0%")]
    [InlineData("item3 and M3", "item3 and M3")]
    [InlineData("a degree of 5 units", "a degree of 5 units")]
    public void Units_written_on_keyboards_are_printed_properly(string written, string printed)
    {
        Assert.Equal(printed, Letters.FitPlain(written));
    }
}
