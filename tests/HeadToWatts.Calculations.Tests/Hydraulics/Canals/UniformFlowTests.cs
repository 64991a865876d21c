using CsCheck;
using HeadToWatts.Hydraulics.Canals;
using HeadToWatts.Hydraulics.Canals.Sections;

namespace HeadToWatts.Calculations.Tests.Hydraulics.Canals;

public class UniformFlowTests
{
    [Fact]
    public void Values_from_outside_are_met()
    {
        foreach (var row in CheckRows.With(UniformFlow.Method.Id, "shape"))
        {
            var section = TestCanals.Section(row);
            double FlowM3PerS() => UniformFlow.FlowM3PerS(section, row["depthM"], row["manningCoefficient"], row["bedSlopeRatio"]);
            row.Check(row.Text("quantity") switch
            {
                "flow" => FlowM3PerS(),
                "velocity" => FlowM3PerS() / section.At(row["depthM"]).AreaM2,
                "normal depth" => UniformFlow.NormalDepthM(section, row["flowM3PerS"], row["manningCoefficient"], row["bedSlopeRatio"])!.Value,
                "friction slope" => UniformFlow.FrictionSlopeRatio(section, row["depthM"], row["flowM3PerS"], row["manningCoefficient"]),
                var other => throw new InvalidOperationException(other),
            });
        }
    }

    [Fact]
    public void Normal_depth_is_the_inverse_of_the_flow() =>
        Gen.Select(TestCanals.Any, Gen.Double[0.001, 0.75], Gen.Double[0.01, 0.05], Gen.Double[1e-5, 0.02]).Sample((section, share, n, slope) =>
        {
            var depthM = share * Math.Min(section.FullDepthM, 6);
            var flowM3PerS = UniformFlow.FlowM3PerS(section, depthM, n, slope);
            var foundM = UniformFlow.NormalDepthM(section, flowM3PerS, n, slope)!.Value;
            Assert.Equal(depthM, foundM, 1e-12 * depthM);
        });

    // Chow: the greatest flow of a pipe is at y/D = 0.938; above y/D = 0.82 a flow has two depths.
    [Fact]
    public void A_pipe_has_two_normal_depths_above_four_fifths_and_the_lower_is_given()
    {
        var pipe = new CircularSection(1);
        const double n = 0.013, slope = 0.002;
        Assert.Equal(0.938, UniformFlow.DepthOfGreatestFlowM(pipe), 5e-4);
        var full = UniformFlow.FlowM3PerS(pipe, 1, n, slope);
        var lower = UniformFlow.NormalDepthM(pipe, full, n, slope)!.Value;
        Assert.Equal(0.82, lower, 1e-3);
        Assert.Equal(1, UniformFlow.UpperNormalDepthM(pipe, full, n, slope)!.Value, 1e-9);
        var between = full * 1.04;
        Assert.InRange(UniformFlow.NormalDepthM(pipe, between, n, slope)!.Value, 0.82, 0.938);
        var upperM = UniformFlow.UpperNormalDepthM(pipe, between, n, slope)!.Value;
        Assert.InRange(upperM, 0.938, 1);
        Assert.Equal(between, UniformFlow.FlowM3PerS(pipe, upperM, n, slope), 1e-9);
        Assert.Null(UniformFlow.UpperNormalDepthM(pipe, full * 0.99, n, slope));
        Assert.Null(UniformFlow.NormalDepthM(pipe, full * 1.09, n, slope));
        Assert.Null(UniformFlow.UpperNormalDepthM(pipe, full * 1.09, n, slope));
    }

    [Fact]
    public void A_surveyed_section_that_is_full_says_so()
    {
        var most = UniformFlow.FlowM3PerS(TestCanals.Surveyed, TestCanals.Surveyed.FullDepthM, 0.03, 0.001);
        Assert.NotNull(UniformFlow.NormalDepthM(TestCanals.Surveyed, most * 0.999, 0.03, 0.001));
        Assert.Null(UniformFlow.NormalDepthM(TestCanals.Surveyed, most * 1.001, 0.03, 0.001));
        Assert.Equal(CanalSlope.Full, new CanalFlow(TestCanals.Surveyed, 0.03, 0.001).At(most * 1.001, 9.81).Slope);
    }

    // Vennard, Ex. 10.4, p. 367 (companion solution): 12.5 ft2/s on n = 0.017 is critical on a slope of 0.0035.
    [Fact]
    public void The_printed_critical_slope_parts_mild_from_steep()
    {
        const double ft = 0.3048;
        var wide = new RectangularSection(1000);
        CanalSlope On(double slope) => new CanalFlow(wide, 0.017, slope).At(12.5 * ft * ft * 1000, 32.2 * ft).Slope;
        Assert.Equal(CanalSlope.Mild, On(0.0034));
        Assert.Equal(CanalSlope.Steep, On(0.0037));
    }

    [Theory]
    [InlineData(0)]
    [InlineData(-1)]
    [InlineData(double.NaN)]
    [InlineData(double.PositiveInfinity)]
    public void Impossible_figures_are_refused(double figure)
    {
        var section = new RectangularSection(1);
        Assert.Throws<ArgumentOutOfRangeException>(() => UniformFlow.NormalDepthM(section, figure, 0.02, 0.001));
        Assert.Throws<ArgumentOutOfRangeException>(() => UniformFlow.NormalDepthM(section, 1, figure, 0.001));
        Assert.Throws<ArgumentOutOfRangeException>(() => UniformFlow.NormalDepthM(section, 1, 0.02, figure));
        Assert.Throws<ArgumentOutOfRangeException>(() => SpecificEnergy.CriticalDepthM(section, figure, 9.81));
        Assert.Throws<ArgumentOutOfRangeException>(() => ConjugateDepth.M(section, 0.2, figure, 9.81));
        Assert.Throws<ArgumentOutOfRangeException>(() => FreeOverfall.BrinkDepthM(figure));
    }
}
