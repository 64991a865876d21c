using CsCheck;
using HeadToWatts.FlowRecords;
using HeadToWatts.FlowRecords.Transfer;

namespace HeadToWatts.Calculations.Tests.FlowRecords.Transfer;

public sealed class TransferTests
{
    private static readonly DateOnly First = new(2001, 10, 1);

    private static readonly Gen<double[]> Flows = Gen.Double[0.05, 50].Array[20, 200];

    [Fact]
    public void Drainage_area_ratios_from_outside_are_met()
    {
        foreach (var row in CheckText.Rows("drainage-area-ratio"))
        {
            var gauge = new DailyRecord(First, [row["gaugeFlowM3PerS"]], "gauge");
            row.Check(DrainageAreaRatio.Transfer(gauge, row["gaugeAreaKm2"], row["siteAreaKm2"], row["exponent"]).Record.Flows[0]);
        }
    }

    [Fact]
    public void A_transfer_by_area_keeps_every_day_and_scales_their_mean() =>
        Gen.Select(Flows, Gen.Double[0.3, 3]).Sample((flows, ratio) =>
        {
            flows[3] = double.NaN;
            flows[5] = 0;
            var gauge = new DailyRecord(First, flows, "gauge");
            var site = DrainageAreaRatio.Transfer(gauge, 100, 100 * ratio).Record;
            Assert.Equal((gauge.DayCount, gauge.MissingCount, gauge.ZeroCount, gauge.FirstDay), (site.DayCount, site.MissingCount, site.ZeroCount, site.FirstDay));
            Assert.Equal(gauge.MeanM3PerS * ratio, site.MeanM3PerS, 1e-12 * site.MeanM3PerS);
        });

    // USGS SIR 2008-5126: not to be used outside ratios of 0.5 to 1.5.
    [Theory]
    [InlineData(0.49, false)]
    [InlineData(0.5, true)]
    [InlineData(1.5, true)]
    [InlineData(1.51, false)]
    public void A_ratio_outside_the_published_range_is_told(double ratio, bool isWithin)
    {
        var transferred = DrainageAreaRatio.Transfer(new DailyRecord(First, [1.0, 2], "gauge"), 100, 100 * ratio);
        Assert.Equal(isWithin, DrainageAreaRatio.IsWithinPublishedRange(ratio));
        Assert.Equal(isWithin, transferred.Notes.Count == 1);
        Assert.Equal(isWithin, transferred.Uses[0].OutOfRange().Count == 0);
        Assert.Equal(FlowConfidence.Low, transferred.Confidence);
    }

    [Fact]
    public void The_extension_line_equals_that_of_another_library()
    {
        double[] gauge = [.. Enumerable.Range(0, 60).Select(i => Math.Exp(1.2 + (0.8 * Math.Sin(0.21 * i)) + (0.3 * Math.Cos(1.7 * i))))];
        double[] site = [.. Enumerable.Range(0, 60).Select(i => Math.Exp(0.3 + (0.6 * Math.Sin((0.21 * i) + 0.15)) + (0.25 * Math.Cos(1.9 * i))))];
        var fit = MoveOne.Fit(new DailyRecord(First, site, "site"), new DailyRecord(First, gauge, "gauge"), "records").Value;
        foreach (var row in CheckText.Rows("move-1"))
        {
            row.Check(row.Text("quantity") switch
            {
                "slope" => fit.SlopeRatio,
                "correlation" => fit.CorrelationCoefficient,
                "flow" => fit.SiteFlowM3PerS(row["gaugeFlowM3PerS"]),
                var other => throw new InvalidOperationException(other),
            });
        }
    }

    // What the method is named for: on the days in common the estimates have the mean and the variance of the site's logarithms.
    [Fact]
    public void The_extension_maintains_mean_and_variance() =>
        Gen.Select(Flows, Gen.Double[0.2, 2], Gen.Int[0, 1000]).Sample((flows, power, seed) =>
        {
            var site = flows.Select((q, i) => Math.Pow(q, power) * Math.Exp(0.2 * Math.Sin(seed + (i * 2.1)))).ToArray();
            if (!MoveOne.Fit(new DailyRecord(First, site, "site"), new DailyRecord(First, flows, "gauge"), "records").TryGet(out var fit))
                return;
            double[] wanted = [.. site.Select(q => Math.Log(q))], estimated = [.. flows.Select(q => Math.Log(fit.SiteFlowM3PerS(q)))];
            Assert.Equal(wanted.Average(), estimated.Average(), 1e-9);
            Assert.Equal(Variance(wanted), Variance(estimated), 1e-9 * Math.Max(1, Variance(wanted)));
        });

    [Fact]
    public void An_extended_record_keeps_what_was_measured_and_counts_the_zeros()
    {
        double[] gauge = [.. Enumerable.Range(0, 400).Select(i => 2 + Math.Sin(i * 0.1))];
        gauge[5] = 0;
        gauge[350] = 0;
        gauge[360] = double.NaN;
        double[] site = [.. Enumerable.Range(0, 100).Select(i => 1.3 + (0.5 * Math.Sin(i * 0.1)))];
        site[7] = double.NaN;
        var extended = MoveOne.Extend(new DailyRecord(First, site, "site"), new DailyRecord(First.AddDays(-50), gauge, "gauge"), "records").Value;
        Assert.Equal(First.AddDays(-50), extended.Record.FirstDay);
        Assert.Equal(400, extended.Record.DayCount);
        Assert.Equal(site[20], extended.Record.Flows[70]);
        Assert.False(double.IsNaN(extended.Record.Flows[57]));
        Assert.Equal(0, extended.Record.Flows[350]);
        Assert.True(double.IsNaN(extended.Record.Flows[360]));
        Assert.Contains(extended.Notes, n => n.StartsWith("99 days measured at the site, 300 estimated", StringComparison.Ordinal));
        Assert.Contains(extended.Notes, n => n.Contains("estimated as dry", StringComparison.Ordinal));
    }

    [Fact]
    public void Records_that_do_not_belong_together_are_refused_with_a_reason()
    {
        var ten = new DailyRecord(First, [.. Enumerable.Range(1, 20).Select(i => (double)i)], "a");
        Assert.Contains("days in common", MoveOne.Fit(ten, new DailyRecord(First.AddDays(15), [.. Enumerable.Range(1, 20).Select(i => (double)i)], "b"), "r").Problems[0].Why, StringComparison.Ordinal);
        Assert.Contains("does not change", MoveOne.Fit(ten, new DailyRecord(First, [.. Enumerable.Repeat(3.0, 20)], "b"), "r").Problems[0].Why, StringComparison.Ordinal);
        Assert.Contains("rise and fall", MoveOne.Fit(ten, new DailyRecord(First, [.. Enumerable.Range(1, 20).Select(i => 30.0 - i)], "b"), "r").Problems[0].Why, StringComparison.Ordinal);
    }

    [Fact]
    public void Monthly_means_come_back_as_they_were_given() =>
        Gen.Double[0, 20].Array[12, 12].Sample(means =>
        {
            var record = MonthlyMeans.OfTypicalYear(means, "plan", "means").Value.Record;
            Assert.Equal(365, record.DayCount);
            for (var month = 1; month <= 12; month++)
            {
                double[] days = [.. Enumerable.Range(0, 365).Where(i => record.MonthOf(i) == month).Select(i => record.Flows[i])];
                Assert.Equal(means[month - 1], days.Average(), 1e-12 * Math.Max(1, means[month - 1]));
            }
        });

    [Fact]
    public void Months_that_are_not_given_are_missing()
    {
        var made = MonthlyMeans.OfYears([new(2004, 2, 3), new(2004, 4, 5)], "agency", "means").Value;
        Assert.Equal(29 + 31 + 30, made.Record.DayCount);
        Assert.Equal(31, made.Record.MissingCount);
        Assert.Equal(FlowConfidence.Low, made.Confidence);
        Assert.Equal(3, MonthlyMeans.OfYears([new(2004, 2, 3), new(2004, 2, 4), new(2004, 13, 1), new(2004, 3, -1)], "agency", "means").Problems.Count);
        Assert.Single(MonthlyMeans.OfTypicalYear([1, 2], "plan", "means").Problems);
    }

    [Fact]
    public void A_delivery_schedule_runs_on_its_days_only()
    {
        var made = DeliverySchedule.ToRecord([new(new(4, 15), new(6, 30), 3), new(new(7, 1), new(9, 30), 5), new(new(12, 20), new(1, 5), 0.4)], "Company, 2024 plan", "schedule").Value;
        Assert.Equal(FlowConfidence.Plan, made.Confidence);
        double On(int month, int day) => made.Record.Flows[new DateOnly(2001, month, day).DayOfYear - 1];
        Assert.Equal([0, 3, 3, 5, 5, 0, 0.4, 0.4, 0], new[] { On(4, 14), On(4, 15), On(6, 30), On(7, 1), On(9, 30), On(10, 1), On(12, 31), On(1, 5), On(1, 6) });
        Assert.Equal(((77 * 3) + (92 * 5) + (17 * 0.4)) / 365, made.Record.MeanM3PerS, 1e-12);
        var clash = DeliverySchedule.ToRecord([new(new(4, 1), new(6, 30), 3), new(new(6, 30), new(7, 5), 5), new(new(2, 30), new(3, 1), 1), new(new(8, 1), new(8, 2), double.NaN)], "x", "schedule");
        Assert.Equal(3, clash.Problems.Count);
        Assert.Contains("also in line 1", clash.Problems[0].Why, StringComparison.Ordinal);
    }

    private static double Variance(double[] values)
    {
        var mean = values.Average();
        return values.Sum(v => (v - mean) * (v - mean)) / (values.Length - 1);
    }
}
