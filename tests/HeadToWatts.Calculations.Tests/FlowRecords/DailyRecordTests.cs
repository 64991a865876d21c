using CsCheck;
using HeadToWatts.FlowRecords;

namespace HeadToWatts.Calculations.Tests.FlowRecords;

public sealed class DailyRecordTests
{
    // Independent: the calendar of the base class library.
    [Fact]
    public void Months_and_days_follow_the_calendar_through_leap_years()
    {
        var record = new DailyRecord(new DateOnly(1895, 12, 30), new double[80_000], "");
        for (var i = 0; i < record.DayCount; i++)
        {
            var day = record.DateOf(i);
            if (day.Month != record.MonthOf(i) || day.Day != record.DayOfMonthOf(i))
                Assert.Fail($"{day:O} is month {record.MonthOf(i)} day {record.DayOfMonthOf(i)}");
        }

        Assert.Equal(record.DateOf(record.DayCount - 1), record.LastDay);
    }

    [Fact]
    public void Missing_days_are_left_out_of_the_mean_and_zeros_are_not()
    {
        var record = new DailyRecord(new DateOnly(2020, 2, 28), [4, double.NaN, 0, 2], "x");
        Assert.Equal(2, record.MeanM3PerS);
        Assert.Equal(new DateOnly(2020, 3, 2), record.LastDay);
        Assert.Equal((4, 3, 1, 1), (record.DayCount, record.ValidCount, record.MissingCount, record.ZeroCount));
        Assert.Equal(3 / 365.25, record.YearsSpanned);
        Assert.Equal((0.0, 4.0), (record.SmallestM3PerS, record.LargestM3PerS));
    }

    [Fact]
    public void Counts_add_up()
    {
        Gen.OneOf(Gen.Double[-5, 5], Gen.Const(0.0), Gen.Const(double.NaN)).Array[1, 200].Sample(flows =>
        {
            var record = new DailyRecord(new DateOnly(2020, 1, 1), flows, "");
            Assert.Equal(record.DayCount, record.ValidCount + record.MissingCount);
            Assert.Equal(flows.Count(q => q == 0), record.ZeroCount);
            Assert.Equal(flows.Count(q => q < 0), record.NegativeCount);
        });
    }

    [Fact]
    public void Nothing_and_the_infinite_are_refused()
    {
        Assert.Throws<ArgumentException>(() => new DailyRecord(new DateOnly(2020, 1, 1), [], ""));
        Assert.Throws<ArgumentException>(() => new DailyRecord(new DateOnly(2020, 1, 1), [double.PositiveInfinity], ""));
        Assert.Equal(1, new DailyRecord(DateOnly.MaxValue, [1], "").DayCount);
    }
}
