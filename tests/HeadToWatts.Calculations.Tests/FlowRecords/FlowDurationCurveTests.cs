using System.Globalization;
using CsCheck;
using HeadToWatts.FlowRecords;

namespace HeadToWatts.Calculations.Tests.FlowRecords;

public sealed class FlowDurationCurveTests
{
    private static readonly Gen<double[]> Flows = Gen.Frequency(
        (4, Gen.Double[0, 50]), (2, Gen.Int[0, 6].Select(i => (double)i)), (1, Gen.Const(double.NaN))).Array[1, 400]
        .Where(a => a.Any(q => !double.IsNaN(q)));

    [Fact]
    public void Means_under_a_cap_meet_the_closed_form()
    {
        foreach (var row in CheckValueFile.OfMethod("flow-duration-curve").SelectMany(f => f.Rows).Where(r => r.Has("cap")))
        {
            var curve = Curve(BeyondLastRow.Hold, (0, row["q0"]), (1, 0));
            row.Check(curve.MeanFlowUpToM3PerS(row["cap"]));
            Assert.Equal(row["q0"] / 2, curve.MeanFlowM3PerS, 1e-12);
        }
    }

    [Fact]
    public void The_mean_of_a_record_meets_the_textbook_example()
    {
        var row = Assert.Single(CheckValueFile.OfMethod("flow-duration-curve").SelectMany(f => f.Rows), r => r.Has("volumes_mm3"));
        var monthly = row.Text("volumes_mm3").Split(';').Select(v => double.Parse(v, CultureInfo.InvariantCulture) * 1e6 / (30 * 86_400));
        var record = new DailyRecord(new DateOnly(2001, 1, 1), [.. monthly.SelectMany(q => Enumerable.Repeat(q, 30))], "");
        row.Check(record.MeanM3PerS);
        // Hazen's curve keeps the mean of its record exactly.
        row.Check(FlowDurationCurve.FromRecord(record, PlottingPositions.Hazen, OperatingSeason.WholeYear).MeanFlowM3PerS);
    }

    [Fact]
    public void The_first_flow_holds_upwards_and_the_last_row_holds_or_goes_dry()
    {
        var hold = Curve(BeyondLastRow.Hold, (0.1, 8), (0.6, 2));
        Assert.Equal([new(0, 8), new(0.1, 8), new(0.6, 2), new(1, 2)], hold.Points);
        Assert.Equal(0.1 * 8 + 0.5 * 5 + 0.4 * 2, hold.MeanFlowM3PerS, 1e-12);

        var dry = Curve(BeyondLastRow.Dry, (0.1, 8), (0.6, 2));
        Assert.Equal([new(0, 8), new(0.1, 8), new(0.6, 2), new(0.6, 0), new(1, 0)], dry.Points);
        Assert.Equal(2, dry.FlowAt(0.6));
        Assert.Equal(0, dry.FlowAt(0.61));
        Assert.Equal(0.6, dry.ExceedanceOf(1), 1e-15);
        Assert.Equal(1, dry.ExceedanceOf(0));
        Assert.Equal(0.35, dry.ExceedanceOf(5), 1e-15);
        Assert.Equal(0.1, dry.ExceedanceOf(8), 1e-15);
        Assert.Equal(0, dry.ExceedanceOf(8.01));
    }

    [Fact]
    public void Rows_may_run_from_100_percent_down_and_may_be_repeated_alike()
    {
        var curve = Curve(BeyondLastRow.Hold, (1, 1), (0.5, 3), (0.5, 3), (0, 9));
        Assert.Equal([new(0, 9), new(0.5, 3), new(1, 1)], curve.Points);
        Assert.Equal(4, curve.Rows.Count);
    }

    [Fact]
    public void Every_problem_is_reported_with_its_row()
    {
        var refused = FlowDurationCurve.FromRows(
            [new(-0.1, 5), new(0.2, 4), new(0.2, 3), new(0.5, 3.5), new(1.2, 1), new(0.7, -1), new(0.8, double.NaN), new(double.NaN, 1)],
            BeyondLastRow.Hold, "curve");
        Assert.Equal(
            ["curve row 1", "curve row 3", "curve row 4", "curve row 5", "curve row 6", "curve row 7", "curve row 8"],
            refused.Problems.Select(p => p.Where).Order(StringComparer.Ordinal));
        Assert.Contains("twice with different flows", refused.Problems.Single(p => p.Where == "curve row 3").Why, StringComparison.Ordinal);
        Assert.Contains("rises", refused.Problems.Single(p => p.Where == "curve row 4").Why, StringComparison.Ordinal);
        Assert.Contains("120 percent", refused.Problems.Single(p => p.Where == "curve row 5").Why, StringComparison.Ordinal);
    }

    [Fact]
    public void Fewer_than_two_rows_or_one_percent_only_is_refused()
    {
        Assert.False(FlowDurationCurve.FromRows([], BeyondLastRow.Hold, "curve").IsGood);
        Assert.False(FlowDurationCurve.FromRows([new(0.5, 1)], BeyondLastRow.Hold, "curve").IsGood);
        Assert.False(FlowDurationCurve.FromRows([new(0.5, 1), new(0.5, 1)], BeyondLastRow.Hold, "curve").IsGood);
    }

    [Fact]
    public void Rows_name_the_place_they_were_written_when_it_is_known()
    {
        var refused = FlowDurationCurve.FromRows([new(0, 1), new(1, 2)], BeyondLastRow.Hold, "curve", [new("a.csv row 2", "0,1"), new("a.csv row 9", "100,2")]);
        var problem = Assert.Single(refused.Problems);
        Assert.Equal(("a.csv row 9", "100,2"), (problem.Where, problem.Read));
        Assert.Contains("a.csv row 2", problem.Why, StringComparison.Ordinal);
    }

    [Fact]
    public void A_curve_of_a_record_never_rises_and_keeps_its_mean()
    {
        Gen.Select(Flows, Gen.Int[0, PlottingPositions.All.Count - 1].Select(i => PlottingPositions.All[i])).Sample((flows, position) =>
        {
            var record = new DailyRecord(new DateOnly(1999, 6, 1), flows, "");
            var curve = FlowDurationCurve.FromRecord(record, position, OperatingSeason.WholeYear);
            AssertShape(curve);

            // Straight lines between n equally spaced ranks, the ends held: what differs from the record's mean is known exactly.
            int n = record.ValidCount;
            double q1 = record.LargestM3PerS, qn = record.SmallestM3PerS;
            var step = n == 1 ? 0 : position.Exceedance(2, n) - position.Exceedance(1, n);
            var expected = (step * ((n * record.MeanM3PerS) - ((q1 + qn) / 2)))
                + (position.Exceedance(1, n) * q1) + ((1 - position.Exceedance(n, n)) * qn);
            if (n == 1)
                expected = q1;
            Assert.Equal(expected, curve.MeanFlowM3PerS, 1e-9 * Math.Max(1, q1));
        });
    }

    [Fact]
    public void Few_distinct_flows_make_few_points()
    {
        var record = new DailyRecord(new DateOnly(1999, 1, 1), [.. Enumerable.Range(0, 10_000).Select(i => (double)(i % 5))], "");
        var curve = FlowDurationCurve.FromRecord(record, PlottingPositions.Weibull, OperatingSeason.WholeYear);
        Assert.Equal(12, curve.Points.Count);
    }

    [Fact]
    public void Exceedance_and_flow_undo_each_other()
    {
        Gen.Select(Flows, Gen.Double[0, 1], Gen.Double[0, 60]).Sample((flows, p, q) =>
        {
            var curve = FlowDurationCurve.FromRecord(new DailyRecord(new DateOnly(2003, 3, 1), flows, ""), PlottingPositions.Weibull, OperatingSeason.WholeYear);
            Assert.True(curve.ExceedanceOf(curve.FlowAt(p)) >= p - 1e-12);
            var share = curve.ExceedanceOf(q);
            if (q <= curve.LargestFlowM3PerS)
                Assert.True(curve.FlowAt(share) >= q - 1e-9);
            if (share < 1)
                Assert.True(curve.FlowAt(Math.Min(1, share + 1e-9)) <= q + 1e-3);
        });
    }

    [Fact]
    public void A_mean_under_a_cap_rises_with_the_cap_up_to_the_mean()
    {
        Gen.Select(Flows, Gen.Double[0, 60], Gen.Double[0, 10]).Sample((flows, cap, more) =>
        {
            var curve = FlowDurationCurve.FromRecord(new DailyRecord(new DateOnly(2003, 3, 1), flows, ""), PlottingPositions.Hazen, OperatingSeason.WholeYear);
            var low = curve.MeanFlowUpToM3PerS(cap);
            Assert.True(low <= cap + 1e-12);
            Assert.True(low <= curve.MeanFlowUpToM3PerS(cap + more) + 1e-9);
            Assert.Equal(curve.MeanFlowM3PerS, curve.MeanFlowUpToM3PerS(1000), 1e-9);
        });
    }

    // A real canal's mean power was overstated 2.08 times by taking the season's mean for the year's.
    [Fact]
    public void A_season_fills_its_share_of_the_year_and_the_rest_is_dry()
    {
        var season = OperatingSeason.Parse("15 Apr to 15 Oct", "").Value;
        var start = new DateOnly(2010, 1, 1);
        var flows = Enumerable.Range(0, 3 * 365).Select(i => season.Runs(start.AddDays(i)) ? 4.0 : double.NaN);
        var curve = FlowDurationCurve.FromRecord(new DailyRecord(start, [.. flows], ""), PlottingPositions.Weibull, season);
        Assert.Equal(4 * 184 / 365.0, curve.MeanFlowM3PerS, 1e-12);
        Assert.Equal(184 / 365.0, curve.ExceedanceOf(4), 1e-15);
        Assert.Equal(0, curve.FlowAt(0.51));

        var typed = Curve(BeyondLastRow.Hold, (0, 4), (1, 2)).ForSeasonShare(0.5);
        Assert.Equal(1.5, typed.MeanFlowM3PerS, 1e-12);
        Assert.Equal([new(0, 4), new(0.5, 2), new(0.5, 0), new(1, 0)], typed.Points);
        Assert.Throws<ArgumentOutOfRangeException>(() => typed.ForSeasonShare(0));
    }

    [Fact]
    public void Negative_days_count_as_no_flow_and_a_season_without_days_is_refused()
    {
        var record = new DailyRecord(new DateOnly(2010, 6, 1), [3, -2, 0, double.NaN], "");
        Assert.Equal((1, 1, 1, 3), (record.NegativeCount, record.ZeroCount, record.MissingCount, record.ValidCount));
        Assert.Equal(0, FlowDurationCurve.FromRecord(record, PlottingPositions.Weibull, OperatingSeason.WholeYear).SmallestFlowM3PerS);
        Assert.Throws<ArgumentException>(() => FlowDurationCurve.FromRecord(record, PlottingPositions.Weibull, OperatingSeason.Months([1])));
        Assert.Equal(0, record.ValidDaysIn(OperatingSeason.Months([1])));
        Assert.Equal(3, record.ValidDaysIn(OperatingSeason.Months([6])));
    }

    private static FlowDurationCurve Curve(BeyondLastRow beyond, params (double P, double Q)[] rows) =>
        FlowDurationCurve.FromRows([.. rows.Select(r => new CurvePoint(r.P, r.Q))], beyond, "curve").Value;

    private static void AssertShape(FlowDurationCurve curve)
    {
        Assert.Equal(0, curve.ExceedanceSpan[0]);
        Assert.Equal(1, curve.ExceedanceSpan[^1]);
        for (var i = 1; i < curve.Points.Count; i++)
        {
            Assert.True(curve.ExceedanceSpan[i] >= curve.ExceedanceSpan[i - 1]);
            Assert.True(curve.FlowSpan[i] <= curve.FlowSpan[i - 1]);
        }
    }
}
