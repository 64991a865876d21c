using HeadToWatts.FlowRecords.OneOff;

namespace HeadToWatts.Calculations.Tests.FlowRecords.OneOff;

public sealed class OneOffTests
{
    [Fact]
    public void Values_from_outside_are_met()
    {
        foreach (var row in CheckText.Rows("float-method"))
            row.Check(FloatMethod.Measure(row["lengthM"], [row["timeS"]], [row["areaM2"]], FloatMethod.UsualCoefficient, "float").Value.FlowM3PerS);
        foreach (var row in CheckText.Rows("bucket-and-stopwatch"))
            row.Check(BucketAndStopwatch.Measure(row["volumeM3"], [row["timeS"]], "bucket").Value.FlowM3PerS);
        foreach (var row in CheckText.Rows("mid-section"))
        {
            var (x, d, v) = (row.Numbers("stations"), row.Numbers("depths"), row.Numbers("velocities"));
            row.Check(VelocityArea.Measure([.. x.Select((s, i) => new Vertical(s, d[i], v[i]))], "verticals").Value.Measurement.FlowM3PerS);
        }
    }

    [Fact]
    public void The_band_holds_the_flow_and_narrows_with_more_readings()
    {
        var once = FloatMethod.Measure(20, [30], [1.2], 0.85, "float").Value;
        var often = FloatMethod.Measure(20, [29, 30, 31, 30, 30, 29.5], [1.2, 1.25, 1.15, 1.2], 0.85, "float").Value;
        Assert.True(once.LowM3PerS < once.FlowM3PerS && once.FlowM3PerS < once.HighM3PerS);
        Assert.True(often.UncertaintyRatio < once.UncertaintyRatio);
        Assert.InRange(often.UncertaintyRatio, 0.14, 0.2);
        Assert.Contains("fewer than three floats", once.Notes);
        Assert.Empty(often.Notes);
        Assert.Equal(often.UncertaintyRatio * often.UncertaintyRatio, often.Parts.Sum(p => p.Ratio * p.Ratio), 1e-12);
    }

    // Student's t of 97.5 percent with two degrees of freedom is 4.303 in any table; three fillings of 10, 11 and 12 s.
    [Fact]
    public void Scatter_of_three_fillings_is_widened_by_Students_t()
    {
        double[] flows = [0.01 / 10, 0.01 / 11, 0.01 / 12];
        var mean = flows.Average();
        var deviation = Math.Sqrt(flows.Sum(q => (q - mean) * (q - mean)) / 2);
        var measured = BucketAndStopwatch.Measure(0.01, [10, 11, 12], "bucket").Value;
        Assert.Equal(4.303 * deviation / Math.Sqrt(3) / mean, measured.Parts.Single(p => p.Name == "fillings").Ratio, 1e-4);
        Assert.Equal(0.5 / 11, measured.Parts.Single(p => p.Name == "stopwatch").Ratio, 1e-12);
    }

    // Water Measurement Manual, table of float coefficients (from memory): 1 ft 0.66, 4 ft 0.72, 20 ft 0.80.
    [Fact]
    public void The_coefficient_by_depth_follows_the_table_and_never_falls()
    {
        Assert.Equal(0.66, FloatMethod.CoefficientAtDepth(0.3048), 1e-9);
        Assert.Equal(0.72, FloatMethod.CoefficientAtDepth(4 * 0.3048), 1e-9);
        Assert.Equal(0.80, FloatMethod.CoefficientAtDepth(20 * 0.3048), 1e-9);
        double[] all = [.. Enumerable.Range(1, 80).Select(i => FloatMethod.CoefficientAtDepth(i * 0.1))];
        Assert.Equal(all.Order(), all);
    }

    [Fact]
    public void Parts_of_a_velocity_area_measurement_add_up_and_a_crowded_vertical_is_named()
    {
        var result = VelocityArea.Measure([new(0, 0, 0), new(1, 0.8, 0.5), new(2, 1, 0.6), new(3, 0.7, 0.4), new(4, 0, 0)], "verticals").Value;
        Assert.Equal(result.Measurement.FlowM3PerS, result.Parts.Sum(p => p.FlowM3PerS), 1e-12);
        Assert.Equal(1, result.Parts.Sum(p => p.FlowShare), 1e-12);
        Assert.Equal(result.Measurement.FlowM3PerS / result.AreaM2, result.MeanVelocityMPerS, 1e-12);
        Assert.Contains(result.Measurement.Notes, n => n.Contains("one vertical carries", StringComparison.Ordinal));
        Assert.NotEmpty(result.Measurement.Uses[0].OutOfRange());
    }

    [Fact]
    public void Every_fault_of_the_readings_is_named()
    {
        Assert.Equal(4, FloatMethod.Measure(0, [10, -1], [], 1.2, "float").Problems.Count);
        Assert.Equal(2, BucketAndStopwatch.Measure(double.NaN, [0], "bucket").Problems.Count);
        Assert.Equal(2, VelocityArea.Measure([new(0, 0, 0), new(1, -1, 0.5), new(1, 1, 0.5)], "verticals").Problems.Count);
        Assert.Single(VelocityArea.Measure([new(0, 0, 0), new(1, 0, 0.5), new(2, 0, 0)], "verticals").Problems);
        Assert.Single(VelocityArea.Measure([new(0, 0, 0), new(1, 1, -0.5), new(2, 0, 0)], "verticals").Problems);
    }

    [Fact]
    public void The_list_names_each_way_once() => Assert.Equal(OneOffMethods.All.Count, OneOffMethods.All.Select(m => m.Id).Distinct().Count());
}
