using CsCheck;
using HeadToWatts.Hydraulics.Surge;
using HeadToWatts.Hydraulics.Transients;

namespace HeadToWatts.Calculations.Tests.Hydraulics.Transients;

/// <summary>The transient against closed forms, printed examples and Allievi's chain of equations.</summary>
public class TransientTests
{
    private const double Gravity = 9.81;

    [Fact]
    public void Rises_of_printed_examples_come_out()
    {
        foreach (var row in CheckRows.Of(Characteristics.Method.Id, "textbooks"))
        {
            var transient = Single(row["lengthM"], row["velocityMPerS"], row["waveSpeedMPerS"], 500, 0);
            row.Check(Run(transient, new StopManoeuvre(row["closureTimeS"], StopLaw.FlowFallsEvenly)).RiseOverStaticM);
        }
    }

    [Fact]
    public void The_total_head_of_a_partial_closing_comes_out()
    {
        foreach (var row in CheckRows.Of(Characteristics.Method.Id, "partial-closure"))
        {
            var transient = Single(row["lengthM"], row["velocityMPerS"], row["waveSpeedMPerS"], row["staticHeadM"], 0);
            row.Check(Run(transient, new StopManoeuvre(row["closureTimeS"], StopLaw.FlowFallsEvenly, row["finalOpeningRatio"])).HighestMachineHeadM);
        }
    }

    [Fact]
    public void The_length_of_pipe_that_sees_the_full_rise_comes_out()
    {
        foreach (var row in CheckRows.Of(Characteristics.Method.Id, "peak-length"))
        {
            var transient = Single(row["lengthM"], row["velocityMPerS"], row["waveSpeedMPerS"], 500, 0);
            var result = Run(transient, new StopManoeuvre(row["closureTimeS"], StopLaw.FlowFallsEvenly), 1000);
            var full = Joukowsky.RiseM(row["waveSpeedMPerS"], row["velocityMPerS"], Gravity);
            Assert.Equal(full, result.RiseOverStaticM, full * 1e-9);
            row.Check(row["lengthM"] - result.Nodes.First(n => n.HighestHeadM - 500 > full * (1 - 1e-6)).StationM);
        }
    }

    [Fact]
    public void Heads_at_the_ends_of_the_returns_follow_Allievis_chain()
    {
        foreach (var row in CheckRows.Of(Characteristics.Method.Id, "allievi-chain"))
        {
            const double headM = 80, speedMPerS = 1000, lengthM = 600;
            var velocityMPerS = row["allieviRatio"] * 2 * Gravity * headM / speedMPerS;
            var transient = Single(lengthM, velocityMPerS, speedMPerS, headM, 0);
            var grid = TransientGrid.For(transient.Pipes, 50);
            var returnS = 2 * lengthM / speedMPerS;
            var result = Characteristics.Run(transient, new StopManoeuvre(row["returnsToClose"] * returnS), grid, (row["returnsToClose"] + 3) * returnS);
            row.Check(result.MachineHeadsM[(int)row["returns"] * 100] / headM);
        }
    }

    [Fact]
    public void An_instant_stop_without_friction_swings_by_Joukowsky_with_the_period_of_four_travel_times()
    {
        var transient = Single(500, 2, 1000, 300, 0);
        var grid = TransientGrid.For(transient.Pipes, 40);
        Assert.Equal(0, grid.WaveSpeedChangeRatio, 1e-12);
        var result = Characteristics.Run(transient, new StopManoeuvre(0), grid, 12 * transient.TravelTimeS);
        var rise = Joukowsky.RiseM(1000, 2, Gravity);
        for (var i = 1; i < result.MachineHeadsM.Count - 1; i++)
        {
            // At the very ends of the half periods the step lies on the jump.
            if (i % 80 is 0 or 1 or 79)
                continue;
            var up = i / 80 % 2 == 0;
            Assert.Equal(300 + (up ? rise : -rise), result.MachineHeadsM[i], 1e-6);
        }

        Assert.All(result.MachineFlowsM3PerS.Skip(1), q => Assert.Equal(0, q));
    }

    [Fact]
    public void A_slow_closing_of_the_opening_nears_Allievis_limit()
    {
        var transient = Single(500, 1.5, 1000, 40, 0);
        foreach (var (returns, within) in new[] { (40, 0.05), (160, 0.02) })
        {
            var timeS = returns * 2 * transient.TravelTimeS;
            var limit = AllieviClosure.RiseM(transient.MomentumM2PerS, 40, timeS, Gravity);
            Assert.Equal(limit, Run(transient, new StopManoeuvre(timeS)).RiseOverStaticM, limit * within);
        }
    }

    [Fact]
    public void Allievis_limit_equals_the_root_found_another_way_and_its_time_turns_it_round()
    {
        foreach (var row in CheckRows.Of(AllieviClosure.Method.Id, "double-precision"))
        {
            var rise = AllieviClosure.RiseM(row["momentumM2PerS"], row["headM"], row["closureTimeS"], row["gravityMPerS2"]);
            row.Check(rise);
            Assert.Equal(row["closureTimeS"], AllieviClosure.TimeS(row["momentumM2PerS"], row["headM"], rise, row["gravityMPerS2"]), row["closureTimeS"] * 1e-9);
        }
    }

    [Fact]
    public void A_wave_is_passed_on_at_a_joint_in_the_closed_form_share()
    {
        // Passed on: 2 Z_1/(Z_1 + Z_2) of what arrives, with Z = a/(g A).
        var transient = new TransientCase([new("upper", 400, 0.8, 1000, 0, 0, 0), new("lower", 400, 0.5, 1000, 0, 0, 0)], 1, 300, 0, Gravity, -10);
        var grid = TransientGrid.For(transient.Pipes, 80);
        var arriving = Joukowsky.RiseM(1000, 2, Gravity);
        var result = Characteristics.Run(transient, new StopManoeuvre(0), grid, 0.4 + (10 * grid.TimeStepS));
        double upper = 1000 / (Gravity * 0.8), lower = 1000 / (Gravity * 0.5);
        var joint = result.Nodes.First(n => n.PipeIndex == 1);
        Assert.Equal(300 + (arriving * 2 * upper / (upper + lower)), joint.HighestHeadM, 1e-9);
    }

    [Fact]
    public void A_machine_that_holds_back_flow_at_runaway_lifts_the_head_by_itself()
    {
        var transient = Single(800, 2, 900, 100, 4);
        var stays = Run(transient, new StopManoeuvre(60));
        var chokes = Run(transient, new StopManoeuvre(60, RunawayFlowRatio: 0.5, RunawayTimeS: 2));
        Assert.True(chokes.HighestMachineHeadM > stays.HighestMachineHeadM + 10);
        Assert.True(chokes.HighestAtS <= 2.0 + (2 * transient.TravelTimeS));
        Assert.Equal(0.5 * 0.5, new StopManoeuvre(60, RunawayFlowRatio: 0.5, RunawayTimeS: 2).PassageRatio(30));
    }

    [Fact]
    public void Without_a_stop_nothing_moves()
    {
        var result = Run(Series(9, 0.3), new StopManoeuvre(5, FinalOpeningRatio: 1));
        Assert.All(result.Nodes, n =>
        {
            Assert.Equal(n.SteadyHeadM, n.HighestHeadM, 1e-7);
            Assert.Equal(n.SteadyHeadM, n.LowestHeadM, 1e-7);
        });
        Assert.Null(result.Separation);
    }

    [Fact]
    public void Halving_the_step_moves_the_peak_by_less_than_one_percent_and_pressures_below_vapour_are_flagged()
    {
        Gen.Select(Gen.Double[50, 3000], Gen.Double[0.5, 4], Gen.Double[200, 1300], Gen.Double[10, 400], Gen.Double[0, 0.3], Gen.Double[0, 60], Gen.Double[0.4, 1.3]).Sample((length, velocity, speed, head, loss, closing, runaway) =>
        {
            var transient = Single(length, velocity, speed, head, head * loss);
            var result = TransientRun.Of(transient, new StopManoeuvre(closing, RunawayFlowRatio: runaway, RunawayTimeS: 2));
            var finer = TransientRun.Halved(result);
            Assert.Equal(finer.HighestMachineHeadM, result.HighestMachineHeadM, finer.HighestMachineHeadM * 0.01);
            Assert.Equal(result.LowestPressure.LowestPressureHeadM < transient.SeparationHeadM, result.Separation is not null);
            Assert.True(result.Nodes.All(n => double.IsFinite(n.HighestHeadM) && double.IsFinite(n.LowestHeadM)));
        }, iter: 60);
    }

    [Fact]
    public void Halving_the_step_holds_in_pipes_in_series_too_and_the_change_of_wave_speed_is_told()
    {
        var transient = Series(20, 1);
        var result = TransientRun.Of(transient, new StopManoeuvre(6));
        var finer = TransientRun.Halved(result);
        Assert.Equal(finer.HighestMachineHeadM, result.HighestMachineHeadM, finer.HighestMachineHeadM * 0.01);
        Assert.InRange(result.Grid.WaveSpeedChangeRatio, 1e-9, 0.03);
        Assert.Equal(result.Grid.Reaches.Select(r => 2 * r), finer.Grid.Reaches);
        Assert.Equal(transient.TravelTimeS, result.Grid.Reaches.Sum() * result.Grid.TimeStepS, transient.TravelTimeS * 0.02);
    }

    [Fact]
    public void The_closing_time_found_keeps_the_limit_and_little_less_would_not()
    {
        var transient = Single(700, 2.2, 1000, 90, 3);
        var timeS = ClosingTime.ShortestS(transient, new StopManoeuvre(1), 120, 60)!.Value;
        Assert.True(TransientRun.Of(transient, new StopManoeuvre(timeS), 60).HighestMachineHeadM <= 120);
        Assert.True(TransientRun.Of(transient, new StopManoeuvre(timeS * 0.97), 60).HighestMachineHeadM > 120);
        Assert.Null(ClosingTime.ShortestS(transient, new StopManoeuvre(1), 80, 60));
    }

    [Fact]
    public void A_run_can_be_stopped()
    {
        using var stop = new CancellationTokenSource();
        stop.Cancel();
        Assert.Throws<OperationCanceledException>(() => Characteristics.Run(Single(500, 2, 1000, 300, 0), new StopManoeuvre(0), TransientGrid.For(Single(500, 2, 1000, 300, 0).Pipes, 100), 30, stop.Token));
    }

    [Fact]
    public void What_is_not_sound_is_refused()
    {
        var sound = Single(500, 2, 1000, 300, 0);
        var grid = TransientGrid.For(sound.Pipes, 10);
        Assert.Throws<ArgumentException>(() => Characteristics.Run(sound with { FlowM3PerS = double.NaN }, new StopManoeuvre(0), grid, 1));
        Assert.Throws<ArgumentException>(() => Characteristics.Run(sound with { TailwaterM = 301 }, new StopManoeuvre(0), grid, 1));
        Assert.Throws<ArgumentOutOfRangeException>(() => Characteristics.Run(sound, new StopManoeuvre(double.NaN), grid, 1));
        Assert.Throws<ArgumentOutOfRangeException>(() => Characteristics.Run(sound, new StopManoeuvre(1, RunawayFlowRatio: 0), grid, 1));
        Assert.Throws<ArgumentOutOfRangeException>(() => Characteristics.Run(sound, new StopManoeuvre(1), grid, 0));
        Assert.Throws<ArgumentOutOfRangeException>(() => AllieviClosure.RiseM(100, 0, 1, Gravity));
        Assert.Throws<ArgumentOutOfRangeException>(() => AllieviClosure.TimeS(100, 10, double.NaN, Gravity));
    }

    private static TransientCase Single(double lengthM, double velocityMPerS, double speedMPerS, double headM, double lossM) =>
        new([new("pipe", lengthM, 0.5, speedMPerS, lossM, 0, 0)], velocityMPerS * 0.5, headM, 0, Gravity, -10);

    private static TransientCase Series(double lossM, double lowerLossM) => new(
        [new("upper", 523, 0.8, 470, lossM, 60, 30), new("middle", 311, 0.6, 930, lossM / 2, 30, 10), new("lower", 97, 0.5, 1080, lowerLossM, 10, 0)],
        1.2, 90, 0, Gravity, -10);

    private static TransientResult Run(TransientCase transient, StopManoeuvre stop, int reaches = 100) =>
        Characteristics.Run(transient, stop, TransientGrid.For(transient.Pipes, reaches), stop.EndS + (8 * transient.TravelTimeS));
}
