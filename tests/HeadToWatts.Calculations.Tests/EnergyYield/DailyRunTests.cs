using CsCheck;
using HeadToWatts.EnergyYield;
using HeadToWatts.FlowRecords;
using MathNet.Numerics.Statistics;

namespace HeadToWatts.Calculations.Tests.EnergyYield;

public class DailyRunTests
{
    // 1 m3/s at 10 m without any loss is 98.0665 kW.
    private const double KwPerM3PerS = 98.0665;

    private static readonly PlantCurve Plant = Plants.Flat(10, 5, 1);

    [Fact]
    public void Months_and_years_are_worked_by_hand()
    {
        // 2000 is a leap year: 1 m3/s to 31 January, 2 m3/s in February, 3 m3/s after it.
        var run = Run(new DateOnly(2000, 1, 1), [.. Enumerable.Repeat(1.0, 31), .. Enumerable.Repeat(2.0, 29), .. Enumerable.Repeat(3.0, 306)]);
        Assert.Equal(KwPerM3PerS * 24 * 31, run.Months[0].MeanEnergyKwh, 1e-6);

        // The month of the mean year has 28 days; the leap year itself has its 29th.
        Assert.Equal(2 * KwPerM3PerS * 24 * 28, run.Months[1].MeanEnergyKwh, 1e-6);
        Assert.Equal(29, run.Months[1].Days);
        Assert.Equal(2, run.Months[1].MeanFlowM3PerS, 1e-12);
        var year = Assert.Single(run.Years);
        Assert.Equal((31 + (2 * 29) + (3 * 306)) * KwPerM3PerS * 24, year.EnergyKwh, 1e-6);
        Assert.True(year.IsWhole);
        Assert.Equal(366, year.Days);
    }

    [Fact]
    public void Missing_days_are_left_out_and_true_zeros_are_kept()
    {
        var flows = Enumerable.Repeat(2.0, 365).ToArray();
        for (var i = 0; i < 15; i++)
            flows[i] = double.NaN;
        var gaps = Run(new DateOnly(2001, 1, 1), flows);
        Assert.Equal(2 * KwPerM3PerS * 24 * 31, gaps.Months[0].MeanEnergyKwh, 1e-6);
        Assert.Equal(16, gaps.Months[0].Days);
        Assert.Equal(2 * KwPerM3PerS * 8760, gaps.SumOfMonthsKwh, 1e-6);
        Assert.True(gaps.Years[0].IsWhole);

        var zeros = Run(new DateOnly(2001, 1, 1), [.. flows.Select(q => double.IsNaN(q) ? 0 : q)]);
        Assert.Equal(2 * KwPerM3PerS * 24 * 16, zeros.Months[0].MeanEnergyKwh, 1e-6);
        Assert.Equal(31, zeros.Months[0].Days);
    }

    [Fact]
    public void A_year_with_more_than_one_day_in_twenty_missing_is_not_whole()
    {
        var flows = Enumerable.Repeat(2.0, 365).ToArray();
        for (var i = 0; i < 19; i++)
            flows[i] = double.NaN;
        Assert.False(Run(new DateOnly(2001, 1, 1), flows).Years[0].IsWhole);
        flows[0] = 2;
        Assert.True(Run(new DateOnly(2001, 1, 1), flows).Years[0].IsWhole);
    }

    [Fact]
    public void Outside_the_season_the_plant_stands_whatever_the_record_says()
    {
        // A canal log is often blank in winter: those days are known to be dry, so that a month cut by the season is not scaled up.
        var season = OperatingSeason.Span(new MonthDay(4, 1), new MonthDay(10, 15));
        var first = new DateOnly(2001, 1, 1);
        double[] wet = [.. Enumerable.Repeat(2.0, 365)];
        double[] blank = [.. wet.Select((q, i) => season.Runs(first.AddDays(i)) ? q : double.NaN)];
        var full = Run(first, wet, season);
        var log = Run(first, blank, season);
        Assert.Equal(2 * KwPerM3PerS * 24 * 15, full.Months[9].MeanEnergyKwh, 1e-6);
        Assert.Equal(0, full.Months[0].MeanEnergyKwh);
        Assert.Equal(2 * KwPerM3PerS * 24 * season.DaysPerYear, full.SumOfMonthsKwh, 1e-6);
        Assert.Equal(full.Months, log.Months);
        Assert.Equal(full.Years, log.Years);

        // The curve of the same record agrees: the season's share of the year at that power.
        var annual = AnnualEnergy.Of(Plant, Plants.Supply(FlowDurationCurve.OfDays(new DailyRecord(first, blank, ""), season)));
        Assert.Equal(full.SumOfMonthsKwh, annual.AnnualEnergyKwh, 1e-6);
        Assert.Equal(full.SumOfMonthsKwh, log.MeanOfDaysKwh, 1e-6);
    }

    [Fact]
    public void Computed_inflows_below_zero_count_as_no_flow()
    {
        var run = Run(new DateOnly(2001, 1, 1), [.. Enumerable.Range(0, 365).Select(i => i % 2 == 0 ? -3.0 : 2.0)]);
        Assert.Equal(182 * 2 * KwPerM3PerS * 24, run.Years[0].EnergyKwh, 1e-6);
    }

    [Fact]
    public void The_days_in_order_of_size_give_the_same_energy_as_the_days_in_order_of_time()
    {
        // Decision 0010: energy is a sum over days, and a sum does not depend on their order. Gaps, seasons, zeros and leap days included.
        Gen.Select(Plants.AnyDesign, Gen.Double[-0.1, 2].Array[40, 900], Gen.Int[1, 12], Gen.Int[1, 11], Gen.Int[2, 9]).Sample((design, ratios, from, length, gap) =>
        {
            var season = OperatingSeason.Months([.. Enumerable.Range(0, length).Select(i => ((from - 1 + i) % 12) + 1)]);
            var first = new DateOnly(2003, from, 1);
            var plant = new PlantCurve(design);
            var allocation = new WaterAllocation(ReservedFlow.PercentOfFlow(0.1), 0.05 * design.Units.DesignFlowM3PerS);
            var record = new DailyRecord(first, [.. ratios.Select((r, i) => i % gap == 1 ? double.NaN : r * design.Units.DesignFlowM3PerS)], "");
            var days = DailyRun.Over(plant, record, season, allocation);
            var curve = AnnualEnergy.Of(plant, new FlowSupply(FlowDurationCurve.OfDays(record, season), allocation));
            Assert.Equal(days.MeanOfDaysKwh, curve.AnnualEnergyKwh, 1e-9 * plant.BestPowerKw * 8760);
        }, iter: 60);
    }

    [Fact]
    public void The_longest_standstill_is_counted_inside_the_season()
    {
        // June: ten days dry, three of them without a measurement; then three dry days in September. The winter does not count.
        var first = new DateOnly(2001, 1, 1);
        var season = OperatingSeason.Months([4, 5, 6, 7, 8, 9, 10]);
        double Flow(DateOnly day) => day switch
        {
            { Month: 6, Day: 12 or 13 or 14 } => double.NaN,
            { Month: 6, Day: >= 10 and <= 19 } => 0,
            { Month: 9, Day: <= 3 } => 0,
            _ => 2,
        };
        var run = Run(first, [.. Enumerable.Range(0, 365).Select(i => Flow(first.AddDays(i)))], season);
        Assert.Equal(7, run.LongestStandstillDays);
        Assert.Equal(new DateOnly(2001, 6, 10), run.StandstillFrom);
        var never = Run(first, [.. Enumerable.Repeat(2.0, 365)], season);
        Assert.Equal(0, never.LongestStandstillDays);
        Assert.Null(never.StandstillFrom);
    }

    [Fact]
    public void Days_and_plotted_curve_differ_by_no_more_than_the_ends_of_the_plotting_position()
    {
        // With Weibull the n days fill n/(n+1) of the curve and the first and the last hold the ends. Power never falls as flow
        // rises, so each straight piece between two ranks gives a mean power between theirs, and the integral lies between
        // (n M + P_least)/(n+1) and (n M + P_most)/(n+1), M being the mean over the days.
        Gen.Select(Plants.AnyDesign, Gen.Double[0.3, 1.3], Gen.Double[0, 1].Array[3 * 365]).Sample((design, sigma, noise) =>
        {
            var plant = new PlantCurve(design);
            double[] flows = [.. noise.Select(u => 0.5 * design.Units.DesignFlowM3PerS * Math.Exp(sigma * MathNet.Numerics.Distributions.Normal.InvCDF(0, 1, Math.Clamp(u, 1e-6, 1 - 1e-6))))];
            var record = new DailyRecord(new DateOnly(2001, 1, 1), flows, "");
            var days = DailyRun.Over(plant, record, OperatingSeason.WholeYear, WaterAllocation.None).SumOfMonthsKwh;
            var curve = AnnualEnergy.Of(plant, Plants.Supply(FlowDurationCurve.FromRecord(record, PlottingPositions.Weibull, OperatingSeason.WholeYear))).AnnualEnergyKwh;
            var scale = 8760 * design.Train.Availability;
            var (n, mean) = (flows.Length, days / scale);
            var slack = 1e-8 * plant.BestPowerKw;
            Assert.InRange(curve / scale, (((n * mean) + plant.At(flows.Min()).MeterPowerKw) / (n + 1)) - slack, (((n * mean) + plant.At(flows.Max()).MeterPowerKw) / (n + 1)) + slack);
        }, iter: 40);
    }

    [Fact]
    public void The_dry_year_is_the_weibull_quantile_of_the_whole_years()
    {
        Gen.Double[0.1, 4].Array[10, 40].Sample(levels =>
        {
            double[] flows = [.. levels.SelectMany((q, i) => Enumerable.Repeat(q, DateTime.IsLeapYear(2001 + i) ? 366 : 365))];
            var run = Run(new DateOnly(2001, 1, 1), flows);
            Assert.Equal(levels.Length, run.WholeYearsKwh.Count);
            var independent = run.Years.Select(y => y.EnergyKwh).QuantileCustom(0.1, QuantileDefinition.Weibull);
            Assert.Equal(independent, run.DryYearKwh!.Value, 1e-9 * independent);
            Assert.Equal(run.Years.Select(y => y.EnergyKwh).Median(), run.MedianYearKwh!.Value, 1e-9 * independent);
        }, iter: 60);
    }

    [Fact]
    public void Fewer_than_ten_whole_years_have_no_dry_year()
    {
        Assert.Null(Run(new DateOnly(2001, 1, 1), [.. Enumerable.Repeat(2.0, (9 * 365) + 2)]).DryYearKwh);

        // A tenth year that is cut short does not count.
        Assert.Null(Run(new DateOnly(2001, 1, 1), [.. Enumerable.Repeat(2.0, (9 * 365) + 2 + 200)]).DryYearKwh);
    }

    private static DailyRun Run(DateOnly first, double[] flows, OperatingSeason? season = null) =>
        DailyRun.Over(Plant, new DailyRecord(first, flows, ""), season ?? OperatingSeason.WholeYear, WaterAllocation.None);
}
