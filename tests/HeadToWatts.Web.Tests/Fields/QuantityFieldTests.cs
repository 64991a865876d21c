using Bunit;
using HeadToWatts.Basis.Problems;
using HeadToWatts.Basis.Units;
using HeadToWatts.Web.Fields;

namespace HeadToWatts.Web.Tests.Fields;

public sealed class QuantityFieldTests : BunitContext
{
    private readonly List<string?> _stored = [];

    [Theory]
    [InlineData("54", "54 in")]
    [InlineData(" 54 ", "54 in")]
    [InlineData("24 in", "24 in")]
    [InlineData("0.6 m", "0.6 m")]
    [InlineData("4 ft 6 in", "4 ft 6 in")]
    [InlineData("1,234.5", "1,234.5 in")]
    public void The_stored_text_is_the_text_typed_with_its_unit(string typed, string stored)
    {
        var field = Diameter("66 in");
        field.Find("input").Input(typed);
        Assert.Equal([stored], _stored);
    }

    [Theory]
    [InlineData("12,5")]
    [InlineData("abc")]
    [InlineData("24 psi")]
    [InlineData("1e999")]
    [InlineData("5 in in")]
    public void What_cannot_be_read_is_told_beside_the_field_and_the_last_good_value_stays(string typed)
    {
        var field = Diameter("66 in");
        field.Find("input").Input(typed);
        field.Find("input").Blur();

        Assert.Empty(_stored);
        var input = field.Find("input");
        Assert.Equal("true", input.GetAttribute("aria-invalid"));
        var message = field.Find(".says.wrong");
        Assert.Contains(message.Id!, input.GetAttribute("aria-describedby")!.Split(' '));
        Assert.NotEmpty(message.TextContent);
        Assert.Equal(typed, input.GetAttribute("value"));
    }

    [Fact]
    public void An_emptied_field_is_refused_when_left_unless_it_may_be_empty()
    {
        var needed = Diameter("66 in");
        needed.Find("input").Input("");
        Assert.Null(needed.Find("input").GetAttribute("aria-invalid"));
        needed.Find("input").Blur();
        Assert.Equal("true", needed.Find("input").GetAttribute("aria-invalid"));
        Assert.Empty(_stored);

        var optional = Diameter("66 in", optional: true);
        optional.Find("input").Input("");
        optional.Find("input").Blur();
        Assert.Null(optional.Find("input").GetAttribute("aria-invalid"));
        Assert.Equal([null], _stored);
    }

    [Fact]
    public void A_unit_on_its_way_raises_no_alarm_until_the_field_is_left()
    {
        var field = Diameter("66 in");
        field.Find("input").Focus();
        field.Find("input").Input("5.5 f");
        Assert.Null(field.Find("input").GetAttribute("aria-invalid"));
        field.Find("input").Input("5.5 ft");
        Assert.Null(field.Find("input").GetAttribute("aria-invalid"));
        field.Find("input").Input("5.5 f");
        field.Find("input").Blur();
        Assert.Equal("true", field.Find("input").GetAttribute("aria-invalid"));
        Assert.Equal(["5.5 ft"], _stored);
    }

    [Theory]
    // 1 in = 25.4 mm exactly (international inch, 1959 agreement); 66 x 25.4 = 1676.4.
    [InlineData("66 in", "mm", "1676.4")]
    [InlineData("66 in", "in", "66")]
    [InlineData("66.0 in", "in", "66.0")]
    [InlineData("5.5 ft", "in", "66")]
    [InlineData("120 ft", "m", "36.576")]
    public void The_unit_switch_changes_what_is_shown_and_not_what_is_stored(string stored, string unit, string shown)
    {
        var field = Diameter(stored, unit: unit);
        Assert.Equal(shown, field.Find("input").GetAttribute("value"));
        Assert.Equal(unit, field.Find(".unit").TextContent);
        field.Find("input").Focus();
        field.Find("input").Blur();
        Assert.Empty(_stored);
    }

    [Fact]
    public void Under_focus_stands_what_else_was_understood()
    {
        var field = Diameter("66 in");
        Assert.Empty(field.FindAll(".also"));
        field.Find("input").Focus();
        // 66 in = 1.6764 m = 1676.4 mm = 5.5 ft, by the exact inch.
        Assert.Equal("also understood: 1.676 m, 1676 mm, 5.5 ft", field.Find(".also").TextContent);
        field.Find("input").Blur();
        Assert.Empty(field.FindAll(".also"));
    }

    [Fact]
    public void A_refusal_by_the_study_stands_beside_the_field_in_words()
    {
        var field = Render<QuantityField>(p => p.Add(f => f.Label, "Length").Add(f => f.Id, "length").Add(f => f.Text, "-5 ft")
            .Add(f => f.Unit, UnitTable.FootUnit).Add(f => f.Problem, new Problem("Length", "-5 ft", "a length is above 0", "")));
        Assert.Equal("A length is above 0.", field.Find(".says.wrong").TextContent);
        Assert.Equal("true", field.FindByLabel("Length").GetAttribute("aria-invalid"));
    }

    private IRenderedComponent<QuantityField> Diameter(string text, bool optional = false, string unit = "in") => Render<QuantityField>(p => p
        .Add(f => f.Label, "Inside diameter").Add(f => f.Id, "diameter").Add(f => f.Text, text).Add(f => f.Optional, optional)
        .Add(f => f.Unit, UnitTable.Find(Dimension.Length, unit)!)
        .Add(f => f.TextChanged, _stored.Add));
}
