using HeadToWatts.FlowRecords.Transfer;

namespace HeadToWatts.Files.Tests.StudyFiles;

/// <summary>A flow measured once, from the study file to the flow of the study.</summary>
public class MeasurementTests
{
    private const string Curve = """
        "curve": [
                  { "exceeded": "10 %", "flow": "40 cfs" },
                  { "exceeded": "50 %", "flow": "20 cfs" },
                  { "exceeded": "95 %", "flow": "5 cfs" }
                ],
        """;

    [Fact]
    public void A_bucket_gives_the_mean_of_volume_over_time()
    {
        var flow = Flow("{ \"kind\": \"bucket\", \"volume\": \"20 L\", \"times\": [\"4 s\", \"5 s\", \"6 s\"] }");
        // 20 L in 4, 5 and 6 s: 5, 4 and 3.333 L/s, 4.111 L/s in the mean.
        Assert.Equal(0.037 / 9, flow.CurveOfYear().FlowAt(0.5), 1e-12);
        Assert.Equal(FlowConfidence.Plan, flow.Origin!.Confidence);
        Assert.Contains("bucket and stopwatch", flow.Origin.Reason, StringComparison.Ordinal);
    }

    [Fact]
    public void Floats_give_coefficient_times_area_times_velocity()
    {
        // 20 m in 40 s past 1.2 m2, coefficient 0.85: 0.85 x 1.2 x 0.5 = 0.51 m3/s.
        var flow = Flow("{ \"kind\": \"float\", \"reach\": \"20 m\", \"times\": [\"40 s\", \"40 s\", \"40 s\"], \"areas\": [\"1.2 m2\"], \"coefficient\": 0.85 }");
        Assert.Equal(0.51, flow.CurveOfYear().FlowAt(0.9), 1e-12);
    }

    [Fact]
    public void Verticals_give_the_sum_of_their_parts()
    {
        // Mid-section by hand: banks at 0 and 4 m, verticals at 1, 2 and 3 m of 0.5, 0.8, 0.5 m and 0.4, 0.6, 0.4 m/s, each 1 m wide: 0.2 + 0.48 + 0.2 = 0.88 m3/s.
        var rows = string.Join(", ", new[] { (0, 0.0, 0.0), (1, 0.5, 0.4), (2, 0.8, 0.6), (3, 0.5, 0.4), (4, 0.0, 0.0) }.Select(v => FormattableString.Invariant($"{{ \"distance\": \"{v.Item1} m\", \"depth\": \"{v.Item2} m\", \"velocity\": \"{v.Item3} m/s\" }}")));
        Assert.Equal(0.88, Flow($"{{ \"kind\": \"velocity-area\", \"verticals\": [{rows}] }}").CurveOfYear().FlowAt(0.1), 1e-12);
    }

    [Theory]
    [InlineData("{ }", "kind", "nothing is entered")]
    [InlineData("{ \"kind\": \"guess\" }", "kind", "not known")]
    [InlineData("{ \"kind\": \"bucket\", \"volume\": \"20 L\" }", "times", "nothing is entered")]
    [InlineData("{ \"kind\": \"bucket\", \"volume\": \"20 s\", \"times\": [\"4 s\"] }", "volume", "")]
    public void What_is_missing_is_named(string measurement, string field, string why)
    {
        var problems = Samples.Problems(Samples.With(Curve, $"\"measurement\": {measurement},"));
        Assert.Contains(problems, p => p.Where == "alternatives[0].flow.measurement." + field && p.Why.Contains(why, StringComparison.Ordinal));
    }

    private static HeadToWatts.Studies.Inputs.FlowInput Flow(string measurement) =>
        Samples.Input(Samples.With(Curve, $"\"measurement\": {measurement},").Replace("\"reservedFlow\": \"2 cfs\"", "\"reservedFlow\": \"none\"", StringComparison.Ordinal)).Alternatives[0].Flow;
}
