using CsCheck;
using HeadToWatts.Calculations.Tests.Hydraulics.Friction;
using HeadToWatts.Hydraulics.Friction;
using HeadToWatts.Hydraulics.LocalLosses;
using HeadToWatts.Hydraulics.Waterways;

namespace HeadToWatts.Calculations.Tests.Hydraulics.Waterways;

public class WaterwayTests
{
    private static readonly Gen<double> Flow = Gen.Double[0, 5];

    [Fact]
    public void The_shares_of_pipes_and_fittings_add_up_to_the_total() =>
        Gen.Select(TestWaterways.Any, Flow).Sample((waterway, flowM3PerS) =>
        {
            var losses = waterway.At(flowM3PerS, TestWaterways.Site);
            var shares = losses.Elements.Sum(e => e.FrictionLossM + e.Fittings.Sum(f => f.LossM));
            AssertSame(losses.TotalLossM, shares);
            AssertSame(losses.TotalLossM, losses.FrictionLossM + losses.LocalLossM);
            AssertSame(losses.TotalLossM, losses.Elements.Sum(e => e.TotalLossM));
            AssertSame(losses.TotalLossM, waterway.LossM(flowM3PerS, TestWaterways.Site));
        });

    [Fact]
    public void The_loss_never_falls_as_the_flow_rises() =>
        Gen.Select(TestWaterways.Any, Flow, Flow).Sample((waterway, oneM3PerS, otherM3PerS) =>
            Assert.True(waterway.LossM(Math.Min(oneM3PerS, otherM3PerS), TestWaterways.Site) <= waterway.LossM(Math.Max(oneM3PerS, otherM3PerS), TestWaterways.Site)));

    [Fact]
    public void Friction_factor_velocity_and_length_give_the_friction_loss() =>
        Gen.Select(TestWaterways.Any, Gen.Double[0.001, 5]).Sample((waterway, flowM3PerS) =>
            Assert.All(waterway.At(flowM3PerS, TestWaterways.Site).Elements, e =>
                AssertSame(e.FrictionLossM, e.DarcyFrictionFactor * e.Element.LengthM / e.Element.InsideDiameterM * e.VelocityHeadM)));

    [Fact]
    public void Still_water_loses_nothing_and_uses_no_method() =>
        TestWaterways.Any.Sample(waterway =>
        {
            var losses = waterway.At(0, TestWaterways.Site);
            Assert.Equal(0, losses.TotalLossM);
            Assert.Empty(losses.Uses);
            Assert.All(losses.Elements, e => Assert.Equal((0, 0, 0, FlowRegime.Still), (e.VelocityMPerS, e.Reynolds, e.DarcyFrictionFactor, e.Regime)));
            Assert.Equal(0, waterway.LossM(0, TestWaterways.Site));
        });

    [Fact]
    public void A_machine_at_the_drop_itself_loses_nothing()
    {
        var waterway = new Waterway([], FrictionFormulas.Default);
        Assert.Equal(0, waterway.LossM(3, TestWaterways.Site));
        Assert.Empty(waterway.At(3, TestWaterways.Site).Elements);
    }

    // Daugherty and Franzini, Ex. 8.8, p. 250 (companion solution): three pipes in series under 10 m carry 0.084 m3/s by the
    // equivalent pipe, f = 0.019, 0.021, 0.020. The waterway has one formula, so each pipe is taken alone and the losses added.
    [Fact]
    public void Three_pipes_in_series_carry_the_printed_flow_under_ten_metres()
    {
        (double LengthM, double DiameterM, double Factor)[] pipes = [(300, 0.3, 0.019), (150, 0.2, 0.021), (250, 0.25, 0.020)];
        double LossAt(double flowM3PerS) => pipes.Sum(p => new Waterway(
            [PipeElement.Of("Pipe", p.LengthM, p.DiameterM, TestWaterways.Steel)], new GivenFactor(p.Factor)).LossM(flowM3PerS, TestWaterways.Site with { GravityMPerS2 = 9.81 }));

        Assert.True(LossAt(0.084 - 0.0005) < 10);
        Assert.True(LossAt(0.084 + 0.0005) > 10);
    }

    // Subramanya, Ex. 11.4, p. 239 (companion solution): 1800 m of 0.5 m, 1200 m of 0.4 m, 600 m of 0.3 m equal 4318.2 m of 0.4 m.
    [Fact]
    public void Pipes_in_series_equal_their_printed_equivalent_length()
    {
        var formula = new GivenFactor(0.02);
        var series = new Waterway(
            [
                PipeElement.Of("A", 1800, 0.5, TestWaterways.Steel),
                PipeElement.Of("B", 1200, 0.4, TestWaterways.Steel),
                PipeElement.Of("C", 600, 0.3, TestWaterways.Steel),
            ],
            formula);
        var metreOfEquivalent = new Waterway([PipeElement.Of("D", 1, 0.4, TestWaterways.Steel)], formula);
        Assert.Equal(4318.2, series.LossM(0.2, TestWaterways.Site) / metreOfEquivalent.LossM(0.2, TestWaterways.Site), 0.2);
    }

    // Subramanya, Ex. 11.28, p. 259 (companion solution): the greatest power through 1000 m of 0.5 m pipe with f = 0.019 under
    // 100 m is 531.6 kW, where friction takes a third of the head; specific weight 9.79 kN/m3.
    [Fact]
    public void The_greatest_power_through_a_pipe_takes_a_third_of_the_head()
    {
        var waterway = new Waterway([PipeElement.Of("Penstock", 1000, 0.5, TestWaterways.Steel)], new GivenFactor(0.019));
        var site = TestWaterways.Site with { GravityMPerS2 = 9.81 };
        double PowerKw(double flowM3PerS) => 9.79 * flowM3PerS * (100 - waterway.LossM(flowM3PerS, site));
        var best = Enumerable.Range(1, 20_000).Select(i => i * 1e-4).MaxBy(PowerKw);
        Assert.Equal(531.6, PowerKw(best), 0.5);
        Assert.Equal(100.0 / 3, waterway.LossM(best, site), 0.02);
    }

    [Fact]
    public void Fittings_count_and_their_method_is_named()
    {
        var bare = new Waterway([PipeElement.Of("Penstock", 100, 1, TestWaterways.Steel)], FrictionFormulas.Default);
        var fitted = new Waterway(
            [PipeElement.Of("Penstock", 100, 1, TestWaterways.Steel, TestWaterways.KindOf("entrance-square"), TestWaterways.KindOf("bend-90", 2))],
            FrictionFormulas.Default);
        var losses = fitted.At(2, TestWaterways.Site);
        Assert.Equal(losses.Elements[0].VelocityHeadM, losses.TotalLossM - bare.LossM(2, TestWaterways.Site), 1e-12);
        Assert.Contains(losses.Uses, u => u.Method == LocalLoss.Method);
        Assert.DoesNotContain(bare.At(2, TestWaterways.Site).Uses, u => u.Method == LocalLoss.Method);
    }

    [Theory]
    [InlineData(-1e-9)]
    [InlineData(double.NaN)]
    [InlineData(double.PositiveInfinity)]
    public void Impossible_flows_are_refused(double flowM3PerS)
    {
        var waterway = new Waterway([], FrictionFormulas.Default);
        Assert.Throws<ArgumentOutOfRangeException>(() => waterway.LossM(flowM3PerS, TestWaterways.Site));
        Assert.Throws<ArgumentOutOfRangeException>(() => waterway.At(flowM3PerS, TestWaterways.Site));
        Assert.Throws<ArgumentOutOfRangeException>(() => waterway.UsesBetween(0, flowM3PerS, TestWaterways.Site));
    }

    [Fact]
    public void Impossible_pipes_are_refused()
    {
        var good = PipeElement.Of("Penstock", 100, 1, TestWaterways.Steel);
        PipeElement[] bad =
        [
            good with { LengthM = -1 },
            good with { LengthM = double.NaN },
            good with { InsideDiameterM = 0 },
            good with { InsideDiameterM = double.NaN },
            good with { RoughnessM = -1e-3 },
            good with { RoughnessM = 1 },
            good with { HazenWilliamsCoefficient = 0 },
            good with { ManningCoefficient = double.NaN },
            good with { Fittings = [new Fitting("K", -0.1, 1, null)] },
            good with { Fittings = [new Fitting("K", double.NaN, 1, null)] },
            good with { Fittings = [new Fitting("K", 0.1, -1, null)] },
        ];
        Assert.All(bad, e => Assert.Throws<ArgumentException>(() => new Waterway([e], FrictionFormulas.Default)));
        Assert.Throws<ArgumentOutOfRangeException>(() => new Waterway([good], FrictionFormulas.Default, 0.9));
        Assert.Throws<ArgumentOutOfRangeException>(() => new Waterway([good], FrictionFormulas.Default, double.NaN));
    }

    [Fact]
    public void Computing_a_loss_allocates_nothing()
    {
        var waterway = new Waterway([PipeElement.Of("Penstock", 100, 1, TestWaterways.Steel, TestWaterways.KindOf("bend-90"))], FrictionFormulas.Default);
        double sum = waterway.LossM(1, TestWaterways.Site);
        var before = GC.GetAllocatedBytesForCurrentThread();
        for (var i = 0; i < 1000; i++)
            sum += waterway.LossM(i * 1e-3, TestWaterways.Site);
        Assert.Equal(0, GC.GetAllocatedBytesForCurrentThread() - before);
        Assert.True(sum > 0);
    }

    [Fact]
    public void The_velocity_limit_equals_the_printed_value()
    {
        foreach (var row in CheckRows.With(VelocityLimits.Method.Id, "grossHeadM"))
            row.Check(VelocityLimits.UsbrLimitMPerS(row["grossHeadM"], row["gravityMPerS2"]));
        Assert.Throws<ArgumentOutOfRangeException>(() => VelocityLimits.UsbrLimitMPerS(0, 9.81));
        Assert.Throws<ArgumentOutOfRangeException>(() => VelocityLimits.UsbrLimitMPerS(10, double.NaN));
    }

    private static void AssertSame(double expected, double actual) =>
        Assert.True(Math.Abs(actual - expected) <= 1e-12 * Math.Abs(expected), $"{expected:R} against {actual:R}");
}
