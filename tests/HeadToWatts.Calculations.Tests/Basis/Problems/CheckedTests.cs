using HeadToWatts.Basis.Problems;

namespace HeadToWatts.Calculations.Tests.Basis.Problems;

public class CheckedTests
{
    private static readonly Problem One = new("row 3", "abc", "it is not a number", "a number");
    private static readonly Problem Two = new("row 7", "", "nothing is entered");

    [Fact]
    public void A_good_value_has_no_problems_and_a_refusal_has_no_value()
    {
        var good = Checked.Of(5);
        Assert.True(good.IsGood);
        Assert.Empty(good.Problems);
        Assert.Equal(5, good.Value);
        var bad = Checked.Refused<int>([One, Two]);
        Assert.False(bad.IsGood);
        Assert.Equal([One, Two], bad.Problems);
        Assert.Contains("row 3", Assert.Throws<InvalidOperationException>(() => bad.Value).Message);
        Assert.False(bad.TryGet(out _));
    }

    [Fact]
    public void A_refusal_without_a_problem_cannot_be_made() =>
        Assert.Throws<ArgumentException>(() => Checked.Refused<int>(Array.Empty<Problem>()));

    [Fact]
    public void Problems_are_gathered_over_many_readings()
    {
        var problems = new List<Problem>();
        Assert.True(Checked.Of("x").TryGet(problems, out var value));
        Assert.Equal("x", value);
        Assert.False(Checked.Refused<string>(One).TryGet(problems, out _));
        Assert.False(Checked.Refused<string>(Two).TryGet(problems, out _));
        Assert.Equal([One, Two], problems);
    }

    [Fact]
    public void A_function_is_applied_to_a_value_and_passes_problems_on()
    {
        Assert.Equal(10, Checked.Of(5).Then(x => 2 * x).Value);
        Assert.Equal([One], Checked.Refused<int>(One).Then<int>(_ => throw new InvalidOperationException("not called")).Problems);
    }

    [Fact]
    public void A_problem_is_one_line_that_says_where_what_why_and_what_is_accepted()
    {
        Assert.Equal("row 3: abc: it is not a number (accepted: a number)", One.ToString());
        Assert.Equal("row 7: (nothing): nothing is entered", Two.ToString());
        Assert.Equal("a: b c: d", new Problem("a", "b\nc", "d").ToString());
    }
}
