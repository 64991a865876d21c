using CsCheck;
using HeadToWatts.Basis.Sources;

namespace HeadToWatts.Calculations.Tests.Basis.Sources;

public class FormulaTextTests
{
    [Fact]
    public void Variables_are_italic_and_indices_stand_below_and_above_the_line()
    {
        Assert.Equal(
            [
                new FormulaRun("h", FormulaStyle.Italic), new FormulaRun("f", FormulaStyle.Subscript), new FormulaRun(" = ", FormulaStyle.Upright),
                new FormulaRun("f", FormulaStyle.Italic), new FormulaRun(" (", FormulaStyle.Upright), new FormulaRun("L", FormulaStyle.Italic),
                new FormulaRun("/", FormulaStyle.Upright), new FormulaRun("D", FormulaStyle.Italic), new FormulaRun(") ", FormulaStyle.Upright),
                new FormulaRun("V", FormulaStyle.Italic), new FormulaRun("2", FormulaStyle.Superscript), new FormulaRun("/2", FormulaStyle.Upright),
                new FormulaRun("g", FormulaStyle.Italic),
            ],
            FormulaText.Parse("h_f = f (L/D) V^2/2g"));
    }

    [Fact]
    public void Braces_hold_longer_indices_and_words_stay_upright()
    {
        Assert.Equal([new FormulaRun("H", FormulaStyle.Italic), new FormulaRun("net", FormulaStyle.Subscript)], FormulaText.Parse("H_{net}"));
        Assert.Equal([new FormulaRun("P", FormulaStyle.Italic), new FormulaRun("1/2", FormulaStyle.Superscript)], FormulaText.Parse("P^{1/2}"));
        Assert.Equal([new FormulaRun("log ", FormulaStyle.Upright), new FormulaRun("x", FormulaStyle.Italic)], FormulaText.Parse("log x"));
        Assert.Equal(FormulaStyle.Upright, Assert.Single(FormulaText.Parse("π")).Style);
    }

    [Fact]
    public void A_mark_left_open_loses_no_text()
    {
        Assert.Equal("x_", string.Concat(FormulaText.Parse("x_").Select(r => r.Text)));
        Assert.Equal("Hnet", string.Concat(FormulaText.Parse("H_{net").Select(r => r.Text)));
        Assert.Empty(FormulaText.Parse(""));
    }

    [Fact]
    public void Plain_text_keeps_every_letter_and_no_marks()
    {
        Assert.Equal("H net", FormulaText.Plain("H_{net}"));
        Assert.Equal("P^(1/2)", FormulaText.Plain("P^{1/2}"));
    }

    [Fact]
    public void Any_text_is_split_without_losing_a_letter_or_a_figure()
    {
        Gen.String[Gen.Char["hfHnet_^{}12/()=γη πΣ"], 0, 20].Sample(text =>
        {
            var before = text.Where(char.IsLetterOrDigit);
            var after = FormulaText.Parse(text).SelectMany(r => r.Text).Where(char.IsLetterOrDigit);
            Assert.Equal(before, after);
        });
    }
}
