using CsCheck;
using HeadToWatts.FlowRecords;
using HeadToWatts.FlowRecords.Statistics;
using MathNet.Numerics.Distributions;

namespace HeadToWatts.Calculations.Tests.FlowRecords.Statistics;

public sealed class StatisticsTests
{
    // The invented record of the check-value files; its formula stands there.
    private static readonly DailyRecord Record = new(
        new DateOnly(1990, 4, 1),
        [.. Enumerable.Range(0, 5114).Select(i => Math.Exp((0.9 * Math.Sin(2 * Math.PI * i / 365.25)) + (0.5 * Math.Sin(0.0137 * i)) + (0.2 * Math.Sin(0.71 * i))))],
        "invented");

    [Fact]
    public void Frequency_factors_from_outside_are_met()
    {
        foreach (var row in CheckText.Rows("pearson-3-frequency-factor"))
            row.Check(PearsonThree.FrequencyFactor(row["skewCoefficient"], row["nonExceedance"]));
    }

    // Independent: the quantile of MathNet's gamma distribution, standardised; another root finder than ours.
    [Fact]
    public void Frequency_factors_equal_standardised_gamma_quantiles() =>
        Gen.Select(Gen.Double[0.05, 3], Gen.Double[0.01, 0.99]).Sample((skew, probability) =>
        {
            var shape = 4 / (skew * skew);
            var expected = (Gamma.InvCDF(shape, 1, probability) - shape) / Math.Sqrt(shape);
            Assert.Equal(expected, PearsonThree.FrequencyFactor(skew, probability), 1e-6);
            Assert.Equal(-PearsonThree.FrequencyFactor(skew, probability), PearsonThree.FrequencyFactor(-skew, 1 - probability), 1e-9);
        });

    [Fact]
    public void The_series_for_small_skews_joins_the_gamma_distribution()
    {
        foreach (var probability in new[] { 0.01, 0.1, 0.5, 0.9, 0.99 })
        {
            var (below, above) = (PearsonThree.FrequencyFactor(0.0199999999, probability), PearsonThree.FrequencyFactor(0.0200000001, probability));
            Assert.Equal(below, above, 1e-9);
        }
    }

    [Fact]
    public void Log_Pearson_flows_from_outside_are_met()
    {
        foreach (var row in CheckText.Rows("log-pearson-3"))
            row.Check(LogPearsonThree.Fit(row.Numbers("flows"))!.FlowM3PerS(row["nonExceedance"]));
    }

    [Fact]
    public void Equal_years_give_their_flow_and_too_few_give_none()
    {
        Assert.Equal(2.5, LogPearsonThree.Fit([.. Enumerable.Repeat(2.5, 12)])!.FlowM3PerS(0.1), 1e-9);
        Assert.Null(LogPearsonThree.Fit([1, 2, 0, 0]));
        Assert.Equal(0, LogPearsonThree.Fit([1, 2, 3, 0, 0])!.FlowM3PerS(0.4));
        Assert.Throws<ArgumentOutOfRangeException>(() => LogPearsonThree.Fit([1, 2, double.NaN]));
        Assert.Throws<ArgumentOutOfRangeException>(() => LogPearsonThree.Fit([1, 2, 3])!.FlowM3PerS(1));
    }

    [Fact]
    public void Yearly_minima_from_outside_are_met()
    {
        var years = RecordYears.Of(Record, YearKind.Climate);
        foreach (var row in CheckText.Rows("annual-minimum-mean"))
            row.Check(LowFlow.Minima(Record, (int)row["days"], years).Single(m => m.Year == (int)row["year"]).FlowM3PerS);
        Assert.Equal(14, years.Whole.Count);
    }

    [Fact]
    public void Seven_Q_ten_rests_on_the_minima_and_names_what_it_used()
    {
        var result = LowFlow.SevenQTen(Record)!;
        Assert.Equal(14, result.Minima.Count);
        Assert.Equal(LogPearsonThree.Fit([.. result.Minima.Select(m => m.FlowM3PerS)])!.FlowM3PerS(0.1), result.FlowM3PerS);
        Assert.InRange(result.FlowM3PerS, result.Minima.Min(m => m.FlowM3PerS) * 0.8, result.Minima.Max(m => m.FlowM3PerS));
        Assert.Equal(["annual-minimum-mean", "log-pearson-3", "pearson-3-frequency-factor"], result.Uses.Select(u => u.Method.Id));
        Assert.True(result.FlowM3PerS < LowFlow.Of(Record, 30, 10, RecordYears.Of(Record, YearKind.Climate))!.FlowM3PerS);
    }

    [Fact]
    public void The_median_year_and_the_band_between_years_from_outside_are_met()
    {
        var years = RecordYears.Of(Record, YearKind.Calendar);
        CheckRow[] rows = [.. CheckText.Rows("median-annual-curve")];
        var band = BetweenYears.ByExceedance(Record, PlottingPositions.Weibull, years, [.. rows.Select(r => r["exceedance"])]);
        var median = DurationCurves.OfMedianYear(Record, PlottingPositions.Weibull, years)!;
        for (var i = 0; i < rows.Length; i++)
        {
            rows[i].Check(band[i].LowFlowM3PerS, "low");
            rows[i].Check(band[i].MedianFlowM3PerS);
            rows[i].Check(band[i].HighFlowM3PerS, "high");
            // Between the 365 points of the annual curve lines are drawn.
            Assert.Equal(rows[i]["expected"], median.FlowAt(rows[i]["exceedance"]), 0.002 * rows[i]["expected"]);
        }
    }

    [Fact]
    public void Curves_of_months_together_hold_every_day_and_each_its_own_mean()
    {
        var months = DurationCurves.OfMonths(Record, PlottingPositions.Weibull);
        Assert.Equal(12, months.Count);
        Assert.Equal(Record.ValidCount, months.Sum(m => m.Days));
        var july = months[6].Curve;
        double[] days = [.. Enumerable.Range(0, Record.DayCount).Where(i => Record.MonthOf(i) == 7).Select(i => Record.Flows[i])];
        Assert.Equal(days.Max(), july.LargestFlowM3PerS);
        Assert.Equal(days.Average(), july.MeanFlowM3PerS, 0.002 * days.Average());
        Assert.Null(DurationCurves.OfSeason(new DailyRecord(new DateOnly(2000, 1, 1), [1.0], "x"), PlottingPositions.Weibull, OperatingSeason.Months([7])));
    }

    [Fact]
    public void Q95_of_all_days_is_the_curve_of_the_record()
    {
        var q95 = LowFlow.Q95M3PerS(Record, PlottingPositions.Weibull)!.Value;
        Assert.Equal(FlowDurationCurve.FromRecord(Record, PlottingPositions.Weibull, OperatingSeason.WholeYear).FlowAt(0.95), q95);
        Assert.InRange(Record.Flows.ToArray().Count(q => q >= q95) / 5114.0, 0.9499, 0.9503);
    }

    [Theory]
    [InlineData(2019, 9, 30, 2019, 2019, 2019)]
    [InlineData(2019, 10, 1, 2019, 2020, 2019)]
    [InlineData(2020, 3, 31, 2020, 2020, 2019)]
    [InlineData(2020, 4, 1, 2020, 2020, 2020)]
    public void Years_begin_where_their_kind_says(int year, int month, int day, int calendar, int water, int climate)
    {
        var date = new DateOnly(year, month, day);
        Assert.Equal((calendar, water, climate), (Years.Of(date, YearKind.Calendar), Years.Of(date, YearKind.Water), Years.Of(date, YearKind.Climate)));
        Assert.All(Enum.GetValues<YearKind>(), k => Assert.Equal(Years.Of(date, k), Years.Of(Years.FirstDayOf(Years.Of(date, k), k), k)));
        Assert.Equal((366, 366, 365), (Years.DaysOf(2020, YearKind.Calendar), Years.DaysOf(2020, YearKind.Water), Years.DaysOf(2020, YearKind.Climate)));
    }

    [Fact]
    public void A_year_with_too_many_gaps_is_not_whole_and_no_day_is_lost()
    {
        var flows = Enumerable.Repeat(2.0, 1096).ToArray();
        Array.Fill(flows, double.NaN, 400, 19);
        var years = RecordYears.Of(new DailyRecord(new DateOnly(2001, 1, 1), flows, "x"), YearKind.Calendar);
        Assert.Equal([true, false, true], years.All.Select(y => y.IsWhole).Take(3));
        Assert.Equal(1096, years.All.Sum(y => y.Days));
        Assert.Equal(1077, years.All.Sum(y => y.ValidDays));
        Assert.Equal(2 * 365 * 86_400.0, years.All[0].VolumeM3);
        Assert.Equal(2, LowFlow.MeanAnnualM3PerS(new DailyRecord(new DateOnly(2001, 1, 1), flows, "x"), years));
    }

    [Fact]
    public void Dry_median_and_wet_years_stand_in_the_order_of_their_volume()
    {
        var classes = YearClasses.Of(RecordYears.Of(Record, YearKind.Climate))!;
        Assert.True(classes.Dry.VolumeM3 < classes.Median.VolumeM3 && classes.Median.VolumeM3 < classes.Wet.VolumeM3);
        // Nine years of 1 to 9: Weibull places 1, 5 and 9 at 10, 50 and 90 percent exactly.
        var flows = Enumerable.Range(0, 9).SelectMany(y => Enumerable.Repeat((double)((y * 4 % 9) + 1), Years.DaysOf(2001 + y, YearKind.Calendar))).ToArray();
        var nine = YearClasses.Of(RecordYears.Of(new DailyRecord(new DateOnly(2001, 1, 1), flows, "x"), YearKind.Calendar))!;
        Assert.Equal((1, 5, 9), (nine.Dry.MeanFlowM3PerS, nine.Median.MeanFlowM3PerS, nine.Wet.MeanFlowM3PerS));
    }

    [Fact]
    public void The_band_by_day_holds_the_quantiles_of_its_years()
    {
        // On every day the years 2001 to 2009 have 1 to 9.
        var flows = Enumerable.Range(0, 9).SelectMany(y => Enumerable.Repeat(y + 1.0, Years.DaysOf(2001 + y, YearKind.Calendar))).ToArray();
        var band = BetweenYears.ByDayOfYear(new DailyRecord(new DateOnly(2001, 1, 1), flows, "x"));
        Assert.Equal(365, band.Count);
        Assert.All(band, b => Assert.Equal((9, 1, 5, 9), (b.Years, b.LowFlowM3PerS, b.MedianFlowM3PerS, b.HighFlowM3PerS)));
    }

    [Fact]
    public void The_longest_standstill_tells_known_days_from_gaps()
    {
        var record = new DailyRecord(new DateOnly(2020, 6, 1), [5, 1, 1, double.NaN, 1, 1, 1, 5, 1, 5], "x");
        var still = Standstill.Of(record, 2, OperatingSeason.WholeYear);
        Assert.Equal(new FlowSpell(new DateOnly(2020, 6, 5), new DateOnly(2020, 6, 7), 3), still.Longest);
        Assert.Equal(new FlowSpell(new DateOnly(2020, 6, 2), new DateOnly(2020, 6, 7), 6), still.LongestWithGaps);
        Assert.Equal((6, 3, 1), (still.StillDays, still.RunningDays, still.MissingDays));
        Assert.Equal(10, Standstill.Of(record, 2, OperatingSeason.Months([1])).Longest!.Days);
        Assert.Null(Standstill.Of(new DailyRecord(new DateOnly(2020, 6, 1), [5.0], "x"), 2, OperatingSeason.WholeYear).Longest);
    }
}
