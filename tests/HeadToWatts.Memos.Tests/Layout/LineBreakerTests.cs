using HeadToWatts.Memos.Content;
using HeadToWatts.Memos.Layout.Type;

namespace HeadToWatts.Memos.Tests.Layout;

public class LineBreakerTests
{
    [Fact]
    public void No_line_is_wider_than_its_place_and_no_letter_is_lost()
    {
        var random = new Random(20261201);
        const string letters = "abcdefghiABC.,-γη²0123456789      ";
        for (var round = 0; round < 300; round++)
        {
            var text = new string([.. Enumerable.Range(0, random.Next(1, 400)).Select(_ => letters[random.Next(letters.Length)])]);
            var width = 20 + random.NextDouble() * 400;
            var lines = LineBreaker.Break(RichText.Of(text) + RichText.Formula("h_{net}") + RichText.Bold(text), 10, width);
            Assert.All(lines, l => Assert.InRange(l.WidthPt, 0, width + 1e-6));
            var kept = string.Concat(lines.SelectMany(l => l.Fragments).Select(f => f.Text)).Replace(" ", "", StringComparison.Ordinal).Replace("\u00a0", "", StringComparison.Ordinal);
            Assert.Equal((text + "hnet" + text).Replace(" ", "", StringComparison.Ordinal), kept);
        }
    }

    [Fact]
    public void Every_line_but_the_last_ends_with_a_space_for_screen_readers()
    {
        var lines = LineBreaker.Break("one two three four five six seven eight nine ten", 10, 60);
        Assert.True(lines.Count > 2);
        Assert.All(lines.SkipLast(1), l => Assert.EndsWith(" ", l.Fragments[^1].Text, StringComparison.Ordinal));
        Assert.False(lines[^1].Fragments[^1].Text.EndsWith(' '));
    }

    [Fact]
    public void A_number_stays_with_its_unit()
    {
        var text = "xxxx 12 kW";
        var lines = LineBreaker.Break(text, 10, Typeface.WidthPt("xxxx 12", Face.Regular, 10) + 1);
        Assert.Equal(["xxxx ", "12\u00a0kW"], lines.Select(l => string.Concat(l.Fragments.Select(f => f.Text))));
    }

    [Fact]
    public void Small_figures_stand_above_and_below_the_line()
    {
        var line = LineBreaker.Break(RichText.Formula("V^2 h_{net}"), 10, 500)[0];
        Assert.Contains(line.Fragments, f => f.Text.Trim() == "2" && f.RisePt > 0 && f.SizePt < 10);
        Assert.Contains(line.Fragments, f => f.Text == "net" && f.RisePt < 0 && f.SizePt < 10);
    }
}
