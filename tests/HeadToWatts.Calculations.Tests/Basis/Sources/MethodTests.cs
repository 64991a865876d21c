using HeadToWatts.Basis.Sources;

namespace HeadToWatts.Calculations.Tests.Basis.Sources;

public class MethodTests
{
    private static readonly Method Friction = new(
        "friction", "Friction", "f = 64/Re", Source.CommonPractice("practice", "Practice"), "",
        [new InputRange("Re", "Reynolds number", "1", 4000, 1e8), new InputRange("e/D", "relative roughness", "1", double.NegativeInfinity, 0.05)]);

    private static readonly Method Other = Friction with { Id = "other", Ranges = [] };

    [Fact]
    public void Leaving_a_stated_range_at_either_end_is_reported_with_its_numbers()
    {
        Assert.Empty(Friction.Used(new InputSpan("Re", 4000, 1e8), new InputSpan("e/D", 0, 0.05)).OutOfRange());
        Assert.Empty(Friction.Used().OutOfRange());
        Assert.Empty(Friction.Used(new InputSpan("V", -1, 1e9)).OutOfRange());
        var low = Assert.Single(Friction.Used(new InputSpan("Re", 3999, 5000)).OutOfRange());
        Assert.Equal(("Re", 3999.0), (low.Range.Symbol, low.Span.Lowest));
        Assert.Single(Friction.Used(new InputSpan("Re", 5000, 1.1e8)).OutOfRange());
        Assert.Equal(2, Friction.Used(new InputSpan("Re", 100, 2e8), new InputSpan("e/D", 0.06, 0.07)).OutOfRange().Count);
    }

    [Fact]
    public void Uses_of_one_method_are_joined_in_the_order_of_first_use()
    {
        var union = MethodUse.Union(
        [
            Other.Used(),
            Friction.Used(new InputSpan("Re", 5000, 6000)),
            Other.Used(new InputSpan("x", 1, 1)),
            Friction.Used(new InputSpan("Re", 4500, 5500), new InputSpan("e/D", 0.01, 0.02)),
        ]);
        Assert.Equal(["other", "friction"], union.Select(u => u.Method.Id));
        Assert.Equal([new InputSpan("x", 1, 1)], union[0].Spans);
        Assert.Equal([new InputSpan("Re", 4500, 6000), new InputSpan("e/D", 0.01, 0.02)], union[1].Spans);
        Assert.Empty(MethodUse.Union([]));
    }

    [Fact]
    public void A_source_tells_published_from_assumed()
    {
        Assert.Equal("US Bureau. 1986. Penstocks. Monograph 3.", new Source("usbr", SourceKind.Published, "US Bureau", "1986", "Penstocks", "Monograph 3").ToString());
        Assert.Equal("Bier, P. J. 1961. Penstocks.", new Source("bier", SourceKind.Published, "Bier, P. J.", "1961", "Penstocks", "").ToString());
        Assert.EndsWith("(Common practice, no source.)", Source.CommonPractice("a", "A").ToString());
        Assert.EndsWith("(Typical, from memory.)", Source.Memory("a", "A").ToString());
        Assert.Equal("This project. Ranking. decision 0005.", Source.Decision("0005", "Ranking").ToString());
    }
}
