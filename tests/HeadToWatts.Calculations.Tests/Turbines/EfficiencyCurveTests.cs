using CsCheck;
using HeadToWatts.Turbines;

namespace HeadToWatts.Calculations.Tests.Turbines;

public class EfficiencyCurveTests
{
    /// <summary>Random curves that end at full flow.</summary>
    internal static readonly Gen<EfficiencyCurve> AnyCurve =
        Gen.Select(Gen.Int[1, 999].Array[1, 12], Gen.Double[0.01, 0.95].Array[13]).Select((ratios, efficiencies) =>
        {
            var points = ratios.Distinct().Select(r => r / 1000.0).Append(1.0).ToList();
            return EfficiencyCurve.FromTable(points.Select((r, i) => (r, efficiencies[i])), "random").Value;
        });

    [Fact]
    public void Between_points_the_curve_is_straight_and_at_them_exact()
    {
        AnyCurve.Sample(curve =>
        {
            foreach (var point in curve.Points)
                Assert.Equal(point.Efficiency, curve.At(point.FlowRatio), 1e-14);
            for (var i = 0; i + 1 < curve.Points.Count; i++)
            {
                var (a, b) = (curve.Points[i], curve.Points[i + 1]);
                foreach (var t in new[] { 0.1, 0.5, 0.9 })
                    Assert.Equal(a.Efficiency + (t * (b.Efficiency - a.Efficiency)), curve.At(a.FlowRatio + (t * (b.FlowRatio - a.FlowRatio))), 1e-12);
            }
        });
    }

    [Fact]
    public void An_efficiency_lies_between_nought_and_the_peak()
    {
        Gen.Select(AnyCurve, Gen.Double[-0.5, 2]).Sample((curve, ratio) => Assert.InRange(curve.At(ratio), 0, curve.Peak));
    }

    [Fact]
    public void The_peak_is_reached_where_it_is_said_to_be()
    {
        AnyCurve.Sample(curve => Assert.Equal(curve.Peak, curve.At(curve.PeakAtFlowRatio), 1e-14));
    }

    [Fact]
    public void Above_full_flow_it_stays_and_below_the_first_point_nothing_turns()
    {
        var curve = EfficiencyCurve.FromTable([(1.0, 0.8), (0.5, 0.7), (0.3, 0.5)], "maker").Value;
        Assert.Equal(0.8, curve.At(1.3));
        Assert.Equal(0.5, curve.At(0.3));
        Assert.Equal(0, curve.At(0.2999));
        Assert.Equal(0, curve.At(0));
        Assert.Equal(0, curve.At(double.NaN));
        Assert.Equal(0.3, curve.Points[0].FlowRatio);
    }

    [Fact]
    public void Looking_up_takes_no_memory()
    {
        var curve = TurbineTypes.Find("kaplan")!.Efficiency;
        var sum = curve.At(0.5);
        var before = GC.GetAllocatedBytesForCurrentThread();
        for (var i = 0; i <= 1000; i++)
            sum += curve.At(i / 1000.0);
        Assert.Equal(before, GC.GetAllocatedBytesForCurrentThread());
        Assert.True(sum > 0);
    }

    [Fact]
    public void Every_problem_of_a_table_is_listed()
    {
        var refused = EfficiencyCurve.FromTable([(0.2, 0.5), (0.2, 0.6), (-0.1, 0.5), (0.5, double.NaN), (80, 0.9), (0.9, 92)], "maker.csv");
        Assert.False(refused.IsGood);
        Assert.Equal(5, refused.Problems.Count);
        Assert.Contains(refused.Problems, p => p.Where == "maker.csv, row 2" && p.Why.Contains("row 1", StringComparison.Ordinal));
        Assert.Contains(refused.Problems, p => p.Where == "maker.csv, row 3" && p.Read == "-0.1");
        Assert.Contains(refused.Problems, p => p.Where == "maker.csv, row 4" && p.Read == "NaN");
        Assert.Contains(refused.Problems, p => p.Where == "maker.csv, row 5" && p.Why.Contains("percentage", StringComparison.Ordinal));
        Assert.Contains(refused.Problems, p => p.Where == "maker.csv, row 6" && p.Why.Contains("percentage", StringComparison.Ordinal));
    }

    [Fact]
    public void A_table_that_is_too_short_or_ends_early_is_refused()
    {
        Assert.Contains("two rows", EfficiencyCurve.FromTable([], "t").Problems[0].Why, StringComparison.Ordinal);
        Assert.Contains("two rows", EfficiencyCurve.FromTable([(1, 0.8)], "t").Problems[0].Why, StringComparison.Ordinal);
        Assert.Contains("full flow", EfficiencyCurve.FromTable([(0.3, 0.6), (0.9, 0.8)], "t").Problems[0].Why, StringComparison.Ordinal);
        Assert.Contains("zero", EfficiencyCurve.FromTable([(0.3, 0), (1, 0)], "t").Problems[0].Why, StringComparison.Ordinal);
    }

    [Theory]
    // Typical curves from memory (shape as Dixon Fig. 9.14, ESHA 2004): they support, within 0.05; no printed curve could be read.
    [InlineData("kaplan", 0.2, 0.70)]
    [InlineData("kaplan", 0.4, 0.87)]
    [InlineData("kaplan", 0.6, 0.91)]
    [InlineData("kaplan", 0.8, 0.93)]
    [InlineData("kaplan", 1.0, 0.91)]
    [InlineData("francis", 0.2, 0.40)]
    [InlineData("francis", 0.4, 0.70)]
    [InlineData("francis", 0.6, 0.86)]
    [InlineData("francis", 0.8, 0.93)]
    [InlineData("francis", 1.0, 0.91)]
    [InlineData("pelton", 0.1, 0.75)]
    [InlineData("pelton", 0.4, 0.90)]
    [InlineData("pelton", 1.0, 0.89)]
    [InlineData("crossflow", 0.1, 0.60)]
    [InlineData("crossflow", 0.4, 0.79)]
    [InlineData("crossflow", 1.0, 0.78)]
    [InlineData("propeller", 0.4, 0.35)]
    [InlineData("propeller", 0.6, 0.62)]
    [InlineData("propeller", 0.8, 0.82)]
    [InlineData("propeller", 1.0, 0.91)]
    [InlineData("screw", 0.2, 0.70)]
    [InlineData("screw", 0.6, 0.83)]
    [InlineData("screw", 1.0, 0.80)]
    public void Typical_curves_lie_near_those_remembered(string id, double ratio, double efficiency) =>
        Assert.Equal(efficiency, TurbineTypes.Find(id)!.Efficiency.At(ratio), 0.05);

    [Theory]
    // Cobb and Sharp 2013, Renewable Energy 50: a very small Turgo over 0.80.
    [InlineData("turgo", 0.80, 0.90)]
    // waterwheelfactory.com: overshot wheels 0.70 to 0.75.
    [InlineData("water-wheel", 0.70, 0.75)]
    // YoosefDoost and Lubitz 2020: screws 0.60 to 0.80 in practice.
    [InlineData("screw", 0.60, 0.80)]
    // Hong Kong EMSD, turbine types: Francis can be over 0.90; a small one is kept at or just below.
    [InlineData("francis", 0.87, 0.92)]
    public void Peaks_agree_with_what_is_published(string id, double lowest, double highest) =>
        Assert.InRange(TurbineTypes.Find(id)!.Efficiency.Peak, lowest, highest);
}
