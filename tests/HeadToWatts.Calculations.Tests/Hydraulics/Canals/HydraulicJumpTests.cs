using CsCheck;
using HeadToWatts.Hydraulics.Canals;
using HeadToWatts.Hydraulics.Canals.Sections;

namespace HeadToWatts.Calculations.Tests.Hydraulics.Canals;

public class HydraulicJumpTests
{
    [Fact]
    public void Conjugate_depths_from_outside_are_met()
    {
        foreach (var row in CheckRows.With(ConjugateDepth.Rectangular.Id, "shape").Concat(CheckRows.With(ConjugateDepth.Momentum.Id, "shape")))
            row.Check(ConjugateDepth.M(TestCanals.Section(row), row["depthM"], row["flowM3PerS"], row["gravityMPerS2"])!.Value);
    }

    [Fact]
    public void Energy_losses_from_outside_are_met()
    {
        foreach (var row in CheckRows.With(HydraulicJump.EnergyLoss.Id, "shape"))
            row.Check(HydraulicJump.Of(TestCanals.Section(row), row["depthM"], row["flowM3PerS"], row["gravityMPerS2"])!.EnergyLossM);
    }

    [Fact]
    public void The_length_lies_within_the_published_ratios()
    {
        foreach (var row in CheckRows.With(HydraulicJump.Length.Id, "conjugateDepthM"))
        {
            var section = new RectangularSection(2);
            var entryM = ConjugateDepth.RectangularM(row["conjugateDepthM"], 1.5, 9.81);
            row.Check(HydraulicJump.Of(section, entryM, 3, 9.81)!.LengthM);
        }
    }

    [Fact]
    public void Momentum_is_equal_on_both_sides_and_the_way_back_leads_to_the_start() =>
        Gen.Select(TestCanals.Open, Gen.Double[0.05, 20], Gen.Double[0.1, 0.95]).Sample((section, flow, share) =>
        {
            var fastM = share * SpecificEnergy.CriticalDepthM(section, flow, TestCanals.GravityMPerS2)!.Value;
            var slowM = ConjugateDepth.M(section, fastM, flow, TestCanals.GravityMPerS2)!.Value;
            var (before, after) = (ConjugateDepth.MomentumM3(section, fastM, flow, TestCanals.GravityMPerS2), ConjugateDepth.MomentumM3(section, slowM, flow, TestCanals.GravityMPerS2));
            Assert.Equal(before, after, 1e-10 * before);
            Assert.Equal(fastM, ConjugateDepth.M(section, slowM, flow, TestCanals.GravityMPerS2)!.Value, 1e-9 * fastM);
            Assert.True(HydraulicJump.Of(section, fastM, flow, TestCanals.GravityMPerS2)!.EnergyLossM > 0);
        });

    [Fact]
    public void The_closed_form_equals_the_root_of_the_momentum() =>
        Gen.Select(Gen.Double[0.3, 20], Gen.Double[0.05, 20], Gen.Double[0.1, 0.95]).Sample((widthM, flow, share) =>
        {
            var rectangular = new RectangularSection(widthM);
            var upright = new TrapezoidalSection(widthM, 0);
            var fastM = share * SpecificEnergy.CriticalDepthM(rectangular, flow, 9.81)!.Value;
            var closedM = ConjugateDepth.M(rectangular, fastM, flow, 9.81)!.Value;
            Assert.Equal(closedM, ConjugateDepth.M(upright, fastM, flow, 9.81)!.Value, 1e-10 * closedM);
            var loss = HydraulicJump.Of(rectangular, fastM, flow, 9.81)!.EnergyLossM;
            Assert.Equal(loss, SpecificEnergy.M(rectangular, fastM, flow, 9.81) - SpecificEnergy.M(rectangular, closedM, flow, 9.81), 1e-8 * SpecificEnergy.M(rectangular, fastM, flow, 9.81));
        });

    // The five names and their limits as printed in Civil Engineering Formulas (McGraw-Hill), p. 323, after the Bureau of Reclamation.
    [Theory]
    [InlineData(1.3, JumpKind.Undular)]
    [InlineData(2.0, JumpKind.Weak)]
    [InlineData(3.5, JumpKind.Oscillating)]
    [InlineData(6.0, JumpKind.Steady)]
    [InlineData(9.5, JumpKind.Strong)]
    public void The_appearance_follows_the_Froude_number(double froude, JumpKind kind) => Assert.Equal(kind, HydraulicJump.KindOf(froude));

    [Fact]
    public void A_slow_flow_makes_no_jump_and_a_pipe_too_small_for_it_says_so()
    {
        Assert.Throws<ArgumentOutOfRangeException>(() => HydraulicJump.Of(new RectangularSection(2), 2, 1, 9.81));
        Assert.Null(HydraulicJump.Of(new CircularSection(0.6), 0.2, 0.4, 9.81));
    }

    [Fact]
    public void The_depth_at_the_foot_of_a_drop_has_the_energy_of_the_fall()
    {
        foreach (var row in CheckRows.With(StillingBasin.Entry.Id, "energyM"))
        {
            var check = StillingBasin.Check(new BasinMeasures(2, 10, 100), 2 * row["unitFlowM2PerS"], 100 + row["energyM"], 101, row["gravityMPerS2"])!;
            row.Check(check.EntryDepthM);
        }
    }

    [Fact]
    public void An_old_basin_holds_the_jump_when_it_is_deep_and_long_enough()
    {
        BasinCheck Of(double lengthM, double tailwaterM) => StillingBasin.Check(new BasinMeasures(3, lengthM, 100), 6, 103, tailwaterM, 9.81)!;
        var needed = Of(1, 101);
        Assert.True(Of(needed.NeededLengthM + 0.01, 100 + needed.NeededDepthM + 0.01).HoldsTheJump);
        var shallow = Of(needed.NeededLengthM + 0.01, 100 + needed.NeededDepthM - 0.01);
        Assert.True(shallow.IsLongEnough && !shallow.IsDeepEnough && !shallow.HoldsTheJump);
        var brief = Of(needed.NeededLengthM - 0.01, 100 + needed.NeededDepthM + 0.01);
        Assert.True(!brief.IsLongEnough && brief.IsDeepEnough && !brief.HoldsTheJump);
        Assert.Null(StillingBasin.Check(new BasinMeasures(3, 5, 100), 6, 100.5, 101, 9.81));
        Assert.Contains(needed.Uses, u => u.Method == HydraulicJump.Length);
    }

    [Fact]
    public void The_jump_needs_more_depth_as_the_flow_rises()
    {
        var needs = Enumerable.Range(1, 20).Select(i => StillingBasin.Check(new BasinMeasures(3, 5, 100), 0.3 * i, 103, 101, 9.81)!.NeededDepthM).ToArray();
        Assert.Equal(needs.Order(), needs);
    }

    [Fact]
    public void The_brink_depth_is_the_published_share_of_the_critical_depth()
    {
        foreach (var row in CheckRows.With(FreeOverfall.Method.Id, "criticalDepthM"))
            row.Check(FreeOverfall.BrinkDepthM(row["criticalDepthM"]));
    }
}
