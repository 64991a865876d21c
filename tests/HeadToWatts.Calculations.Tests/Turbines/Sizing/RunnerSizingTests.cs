using HeadToWatts.Turbines;
using HeadToWatts.Turbines.Sizing;

namespace HeadToWatts.Calculations.Tests.Turbines.Sizing;

public class RunnerSizingTests
{
    private const double Gravity = 9.81;

    [Fact]
    public void Wheels_and_jets_have_the_size_of_the_textbooks()
    {
        foreach (var row in CheckValueFile.OfMethod(JetWheelSizing.Method.Id).SelectMany(f => f.Rows))
        {
            if (row.Has("expected_jet_m"))
            {
                var speed = SpecificSpeed.SpeedRpm(row["specific_speed_kw_m"], row["power_kw"], row["head_m"]);
                var flow = row["power_kw"] / (row["efficiency"] * Gravity * row["head_m"]);
                var geometry = new JetWheelSizing(0.451, 9).At(new RunnerDuty(flow, row["head_m"], speed, (int)row["jets"], Gravity));
                row.Check(geometry.DiameterM, "expected_wheel_m");
                row.Check(Assert.Single(geometry.Others).LengthM, "expected_jet_m");
                Assert.Empty(geometry.Doubts);
            }
            else
            {
                row.Check(RunnerSizing.DiameterM(row["rim_speed_ratio"], new RunnerDuty(1, row["head_m"], row["speed_rpm"], 1, Gravity)), "expected_wheel_m");
            }
        }
    }

    [Fact]
    public void Four_jets_are_half_as_thick_as_one_and_pass_the_same_flow()
    {
        var one = new RunnerDuty(0.5, 200, 600, 1, Gravity);
        var four = one with { Jets = 4 };
        Assert.Equal(JetWheelSizing.JetDiameterM(one) / 2, JetWheelSizing.JetDiameterM(four), 1e-12);
        Assert.Equal(0.5, 4 * Math.PI / 4 * Math.Pow(JetWheelSizing.JetDiameterM(four), 2) * 0.98 * four.SpoutingMPerS, 1e-12);
    }

    [Fact]
    public void A_wheel_too_small_for_its_jets_is_doubted()
    {
        var geometry = TurbineTypes.Find("pelton")!.Sizing!.At(new RunnerDuty(2, 50, 600, 1, Gravity));
        Assert.Contains(geometry.Doubts, d => d.Contains("jets across", StringComparison.Ordinal));
    }

    [Fact]
    public void The_drum_of_a_crossflow_runs_at_half_its_jet()
    {
        foreach (var row in CheckValueFile.OfMethod(CrossflowSizing.Method.Id).SelectMany(f => f.Rows))
            row.Check(new CrossflowSizing().At(new RunnerDuty(0.3, row["head_m"], row["speed_rpm"], 1, Gravity)).DiameterM, "expected_diameter_m");
    }

    [Fact]
    public void The_two_cells_of_a_crossflow_make_up_its_drum()
    {
        var geometry = new CrossflowSizing().At(new RunnerDuty(0.3, 20, 400, 1, Gravity));
        var lengths = geometry.Others.ToDictionary(o => o.Name, o => o.LengthM);
        Assert.Equal(lengths["length of the drum"], lengths["small cell, one third"] + lengths["large cell, two thirds"], 1e-12);
    }

    [Fact]
    public void Runners_under_pressure_have_the_size_of_built_ones()
    {
        foreach (var row in CheckValueFile.OfMethod(ReactionSizing.Method.Id).SelectMany(f => f.Rows))
        {
            var rule = row.Text("kind") == "francis" ? ReactionSizing.Francis : ReactionSizing.Kaplan;
            if (row.Has("expected_diameter_m"))
            {
                row.Check(rule.At(new RunnerDuty(row["flow_m3s"], row["head_m"], row["speed_rpm"], 1, Gravity)).DiameterM, "expected_diameter_m");
                continue;
            }

            // From memory, beside the built one: a duty of that specific speed, whose rim speed follows from the diameter. n_QE at an efficiency of 0.92.
            var specific = SpecificSpeed.KwMFromMetricHpM(row["specific_speed_metric"]) / SpecificSpeed.KwMFromDimensionless(1, 0.92, 1000, Gravity);
            var duty = new RunnerDuty(Math.Pow(specific * Math.Pow(Gravity * 20, 0.75), 2), 20, 60, 1, Gravity);
            Assert.Equal(specific, duty.SpecificSpeedDimensionless, 1e-9);
            row.Check(rule.At(duty).DiameterM * Math.PI * duty.SpeedRpm / (60 * duty.SpoutingMPerS), "expected_rim_speed_ratio");
        }
    }

    [Fact]
    public void A_screw_is_as_long_as_its_slope_makes_it()
    {
        foreach (var row in CheckValueFile.OfMethod(ScrewSizing.Method.Id).SelectMany(f => f.Rows))
        {
            var geometry = new ScrewSizing().At(new RunnerDuty(row["flow_m3s"], row.Has("head_m") ? row["head_m"] : 3, 30, 1, Gravity));
            var lengths = geometry.Others.ToDictionary(o => o.Name, o => o.LengthM);
            if (row.Has("expected_length_m"))
                row.Check(lengths["length along the axis"], "expected_length_m");
            else
                row.Check(lengths["core"] / geometry.DiameterM, "expected_core_ratio");
        }
    }

    [Fact]
    public void Every_size_grows_with_the_flow_or_the_jets_and_shrinks_with_the_speed()
    {
        foreach (var type in TurbineTypes.All.Where(t => t.Sizing is not null))
        {
            var duty = new RunnerDuty(1, 20, 300, 1, Gravity);
            var size = type.Sizing!.At(duty);
            var more = type.Sizing.At(duty with { FlowM3PerS = 2 });
            var faster = type.Sizing.At(duty with { SpeedRpm = 450 });
            Assert.True(more.DiameterM * more.Others.Append(new RunnerDimension("", 1)).Max(o => o.LengthM) > size.DiameterM * size.Others.Append(new RunnerDimension("", 1)).Max(o => o.LengthM) * 0.999, type.Id);
            Assert.True(faster.DiameterM <= size.DiameterM, type.Id);
            Assert.True(size.DiameterM > 0 && size.Others.All(o => o.LengthM > 0), type.Id);
        }
    }
}
