using CsCheck;
using HeadToWatts.FlowRecords;

namespace HeadToWatts.Calculations.Tests.FlowRecords;

public sealed class OperatingSeasonTests
{
    [Theory]
    [InlineData("all year", 365, "all year")]
    [InlineData("Year-round", 365, "all year")]
    [InlineData("Apr 15 to Oct 15", 184, "15 Apr to 15 Oct")]
    [InlineData("15 Apr - 15 Oct", 184, "15 Apr to 15 Oct")]
    [InlineData("April 15 – October 15", 184, "15 Apr to 15 Oct")]
    [InlineData("04-15..10-15", 184, "15 Apr to 15 Oct")]
    [InlineData("from 15 apr. until 15 oct.", 184, "15 Apr to 15 Oct")]
    [InlineData("Apr, May, Jun", 91, "Apr to Jun")]
    [InlineData("Apr to Oct", 214, "Apr to Oct")]
    [InlineData("Apr-Oct", 214, "Apr to Oct")]
    [InlineData("Nov to Feb", 120, "Nov to Feb")]
    [InlineData("15 Oct to 15 Apr", 183, "15 Oct to 15 Apr")]
    [InlineData("1 Apr to 10 Apr, 20 Sept to 30 Sept", 21, "1 Apr to 10 Apr, 20 Sep to 30 Sep")]
    [InlineData("Feb", 28, "Feb")]
    [InlineData("1 Mar to 28 Feb", 365, "all year")]
    public void Texts_are_read(string text, int days, string described)
    {
        var season = OperatingSeason.Parse(text, "season").Value;
        Assert.Equal(days, season.DaysPerYear);
        Assert.Equal(days / 365.0, season.ShareOfYear);
        Assert.Equal(described, season.Describe());
        Assert.Equal(days, Enumerable.Range(1, 12).Sum(season.DaysInMonth));
    }

    [Theory]
    [InlineData("")]
    [InlineData("4/5 to 10/5")]
    [InlineData("Apr 31 to Oct 15")]
    [InlineData("15-04..15-10")]
    [InlineData("Apr 15")]
    [InlineData("Apr 15 to Oct")]
    [InlineData("Ma to Oct")]
    [InlineData("15 Apr to 15 Oct,")]
    [InlineData("summer")]
    [InlineData("Apr 15 to 30")]
    public void Texts_that_are_wrong_or_mean_two_things_are_refused(string text)
    {
        var problem = Assert.Single(OperatingSeason.Parse(text, "season").Problems);
        Assert.Equal("season", problem.Where);
        Assert.Equal(text, problem.Read);
        Assert.NotEmpty(problem.Accepted);
    }

    [Fact]
    public void A_leap_day_runs_with_its_february_and_adds_nothing_to_the_share()
    {
        var season = OperatingSeason.Months([2]);
        Assert.True(season.Runs(new DateOnly(2024, 2, 29)));
        Assert.False(season.Runs(new DateOnly(2024, 3, 1)));
        Assert.Equal(28, season.DaysPerYear);
        Assert.True(season.RunsInMonth(2));
        Assert.False(season.RunsInMonth(3));
    }

    [Fact]
    public void What_is_described_is_read_back()
    {
        var days = Gen.Int[0, 365].Select(i => new DateOnly(2000, 1, 1).AddDays(i)).Select(d => new MonthDay(d.Month, d.Day));
        Gen.Select(days, days).Array[1, 4].Where(s => s.Any(x => x.Item1 != x.Item2)).Sample(spans =>
        {
            var season = OperatingSeason.Spans(spans);
            Assert.Equal(season, OperatingSeason.Parse(season.Describe(), "").Value);
            for (var day = new DateOnly(2024, 1, 1); day.Year == 2024; day = day.AddDays(1))
                Assert.Equal(spans.Any(s => Within(s.Item1, s.Item2, day)) || season.IsWholeYear, season.Runs(day));
        });

        // A second way to say it: by month and day, around the new year when the end comes first.
        static bool Within(MonthDay from, MonthDay to, DateOnly day)
        {
            int Key(int month, int d) => (month * 100) + d;
            var (f, t, x) = (Key(from.Month, from.Day), Key(to.Month, to.Day), Key(day.Month, day.Day));
            return f <= t ? x >= f && x <= t : x >= f || x <= t;
        }
    }
}
