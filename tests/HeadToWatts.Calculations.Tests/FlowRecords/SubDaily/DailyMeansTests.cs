using CsCheck;
using HeadToWatts.FlowRecords.SubDaily;

namespace HeadToWatts.Calculations.Tests.FlowRecords.SubDaily;

public sealed class DailyMeansTests
{
    private const long HourMs = 3_600_000;
    private static readonly long Start = new DateOnly(2020, 3, 1).DayNumber * DailyMeans.DayMs;

    // By hand: hourly values equal to the hour of a straight rise have their mean at noon.
    [Fact]
    public void A_straight_rise_has_its_mean_at_noon_and_an_unfinished_day_the_mean_of_its_known_part()
    {
        var times = Enumerable.Range(0, 48).Select(i => Start + (i * HourMs)).ToArray();
        var means = DailyMeans.Of(times, [.. Enumerable.Range(0, 48).Select(i => (double)i)], SubDailySettings.Default);
        Assert.Equal(new DateOnly(2020, 3, 1), means.FirstDay);
        Assert.Equal([12.0, 35.5], means.Flows.ToArray());
        Assert.Equal([1.0, 23.0 / 24], means.CoveredShares.ToArray());
        Assert.Equal(TimeSpan.FromHours(1), means.UsualStep);
        Assert.Equal(TimeSpan.FromHours(3), means.LongestStep);
        Assert.Equal(47 * 47 / 2.0 * 3600, means.VolumeM3, 1e-6);
    }

    [Fact]
    public void Uneven_steps_weigh_by_their_length()
    {
        // Ten for 23 hours, then a line down to zero at midnight: 23 * 10 + 5 over 24.
        var means = DailyMeans.Of([Start, Start + (23 * HourMs), Start + (24 * HourMs)], [10, 10, 0], new SubDailySettings(LongestStep: TimeSpan.FromHours(24)));
        Assert.Equal(235.0 / 24, means.Flows[0], 1e-12);
    }

    [Fact]
    public void A_pause_above_the_limit_breaks_the_line_and_a_day_known_in_part_has_no_mean()
    {
        var times = new List<long>();
        for (var h = 0; h <= 72; h++)
        {
            if (h is <= 24 or >= 30)
                times.Add(Start + (h * HourMs));
        }

        double[] flows = [.. times.Select(_ => 7.0)];
        var strict = DailyMeans.Of([.. times], flows, new SubDailySettings(0.9, TimeSpan.FromHours(2)));
        Assert.Equal([7.0, double.NaN, 7.0, double.NaN], strict.Flows.ToArray());
        Assert.Equal((1, 0.75), (strict.Breaks, strict.CoveredShares[1]));
        Assert.Equal(2, strict.PartialDays);

        var lenient = DailyMeans.Of([.. times], flows, new SubDailySettings(0.75, TimeSpan.FromHours(2)));
        Assert.Equal(7.0, lenient.Flows[1], 1e-12);
        Assert.Equal(0, DailyMeans.Of([.. times], flows, new SubDailySettings(0.9, TimeSpan.FromHours(6))).Breaks);
    }

    [Fact]
    public void A_missing_value_is_bridged_like_one_that_is_not_there()
    {
        var times = Enumerable.Range(0, 25).Select(i => Start + (i * HourMs)).ToArray();
        double[] flows = [.. Enumerable.Range(0, 25).Select(i => i == 5 ? double.NaN : i)];
        Assert.Equal(12, DailyMeans.Of(times, flows, SubDailySettings.Default).Flows[0], 1e-12);
    }

    // Invariant: the trapezoids of the line, summed here without days, are the volume of the days.
    [Fact]
    public void Daily_means_conserve_volume()
    {
        var steps = Gen.Select(Gen.Long[1, 6 * HourMs], Gen.Frequency((9, Gen.Double[0, 500]), (1, Gen.Const(double.NaN))));
        Gen.Select(Gen.Long[0, DailyMeans.DayMs - 1], steps.Array[1, 200], Gen.Int[1, 8]).Sample((offset, rows, limitH) =>
        {
            var times = new long[rows.Length];
            var flows = new double[rows.Length];
            var at = Start + offset;
            for (var i = 0; i < rows.Length; i++)
            {
                at += rows[i].Item1;
                (times[i], flows[i]) = (at, rows[i].Item2);
            }

            var means = DailyMeans.Of(times, flows, new SubDailySettings(1e-12, TimeSpan.FromHours(limitH)));
            var expected = 0.0;
            var before = -1;
            for (var i = 0; i < rows.Length; i++)
            {
                if (double.IsNaN(flows[i]))
                    continue;
                if (before >= 0 && times[i] - times[before] <= limitH * HourMs)
                    expected += (flows[before] + flows[i]) / 2 * (times[i] - times[before]) / 1000.0;
                before = i;
            }

            var actual = 0.0;
            for (var d = 0; d < means.Flows.Length; d++)
            {
                if (!double.IsNaN(means.Flows[d]))
                    actual += means.Flows[d] * means.CoveredShares[d] * 86_400;
            }

            Assert.Equal(expected, actual, 1e-9 * Math.Max(1, expected));
            Assert.Equal(expected, means.VolumeM3, 1e-9 * Math.Max(1, expected));
        }, iter: 1000);
    }

    [Fact]
    public void A_mean_lies_between_the_smallest_and_the_largest_value()
    {
        Gen.Double[0, 100].Array[25, 100].Sample(flows =>
        {
            var times = flows.Select((_, i) => Start + (i * HourMs)).ToArray();
            foreach (var mean in DailyMeans.Of(times, flows, SubDailySettings.Default).Flows)
                Assert.True(double.IsNaN(mean) || (mean >= flows.Min() - 1e-9 && mean <= flows.Max() + 1e-9));
        }, iter: 200);
    }

    [Fact]
    public void Instants_that_do_not_rise_and_settings_outside_their_range_are_refused()
    {
        Assert.Throws<ArgumentException>(() => DailyMeans.Of([Start, Start], [1, 2], SubDailySettings.Default));
        Assert.Throws<ArgumentException>(() => DailyMeans.Of([], [], SubDailySettings.Default));
        Assert.Throws<ArgumentException>(() => DailyMeans.Of([Start], [1], new SubDailySettings(0)));
        Assert.Throws<ArgumentException>(() => DailyMeans.Of([Start], [1], new SubDailySettings(double.NaN)));
        Assert.Throws<ArgumentException>(() => DailyMeans.Of([Start], [1], new SubDailySettings(0.9, TimeSpan.Zero)));
    }
}
