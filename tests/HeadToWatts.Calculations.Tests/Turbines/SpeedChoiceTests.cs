using CsCheck;
using HeadToWatts.Turbines;
using HeadToWatts.Turbines.Screw;
using HeadToWatts.Turbines.WaterWheel;

namespace HeadToWatts.Calculations.Tests.Turbines;

public class SpeedChoiceTests
{
    [Fact]
    public void Synchronous_speeds_are_those_of_the_tables()
    {
        var rows = CheckValueFile.OfMethod(TurbineMethods.SynchronousSpeed.Id).SelectMany(f => f.Rows).ToList();
        Assert.NotEmpty(rows);
        foreach (var row in rows)
            row.Check(SynchronousSpeed.Rpm((int)row["poles"], row["frequency_hz"]));
    }

    [Fact]
    public void Odd_poles_and_senseless_frequencies_are_refused()
    {
        Assert.Throws<ArgumentOutOfRangeException>(() => SynchronousSpeed.Rpm(5, 50));
        Assert.Throws<ArgumentOutOfRangeException>(() => SynchronousSpeed.Rpm(0, 50));
        Assert.Throws<ArgumentOutOfRangeException>(() => SynchronousSpeed.Rpm(4, double.NaN));
    }

    [Fact]
    public void The_screw_turns_as_fast_as_published()
    {
        var files = CheckValueFile.OfMethod(ScrewSpeed.Speed.Id);
        Assert.Equal(3, files.Count);
        foreach (var row in files.SelectMany(f => f.Rows))
        {
            if (row.Has("expected_rad_per_s"))
                row.Check(ScrewSpeed.GreatestSpeedRpm(row["diameter_m"]) * Math.Tau / 60, "expected_rad_per_s");
            else if (row.Has("expected_diameter_in"))
                row.Check(new ScrewSpeed().At(row["flow_gpm"] * 231 * Math.Pow(0.0254, 3) / 60, 4).DiameterM / 0.0254, "expected_diameter_in");
            else
                row.Check(ScrewSpeed.GreatestSpeedRpm(row["diameter_m"]));
        }
    }

    [Fact]
    public void The_rim_of_a_water_wheel_moves_as_fast_as_published()
    {
        var rows = CheckValueFile.OfMethod(WaterWheelSpeed.Speed.Id).SelectMany(f => f.Rows).ToList();
        Assert.NotEmpty(rows);
        foreach (var row in rows)
            row.Check(WaterWheelSpeed.UsualSpeedRpm(row["diameter_m"]) / 60 * Math.PI * row["diameter_m"] / 0.3048, "expected_rim_ft_per_s");
    }

    [Theory]
    // Machines printed in the textbooks of the specific-speed checks (Nag, Subramanya, Daugherty and Franzini).
    [InlineData("kaplan", 166.7, 10000, 12)]
    [InlineData("francis", 135, 10000, 25)]
    [InlineData("propeller", 405.5, 15000, 30)]
    [InlineData("pelton", 300, 6057, 300)]
    [InlineData("pelton", 400, 1500, 270)]
    [InlineData("francis", 600, 7988, 106.68)]
    public void Machines_in_print_fall_in_the_band_of_their_type(string id, double speedRpm, double powerKw, double headM) =>
        Assert.True(TurbineTypes.Find(id)!.SpecificSpeed.Contains(SpecificSpeed.KwM(speedRpm, powerKw, headM)));

    [Fact]
    public void A_Kaplan_in_print_is_given_a_synchronous_speed_near_its_own()
    {
        // P. K. Nag, Power Plant Engineering, Ex. 10.11: 10 MW at 12 m turns at 166.7 rpm, 36 poles at 50 Hz.
        var choice = SpeedChoice.Choose(TurbineTypes.Find("kaplan")!, 94, 12, 10000, 50);
        Assert.True(choice.IsDirect);
        Assert.InRange(choice.RunnerSpeedRpm, 166.7 / 1.6, 166.7 * 1.6);
        Assert.Equal(SynchronousSpeed.Rpm(choice.Poles!.Value, 50), choice.SynchronousRpm!.Value);
        Assert.Equal(choice.RunnerSpeedRpm * 3.0, choice.RunawayRpm, 1e-9);
    }

    [Fact]
    public void Where_no_usual_number_of_poles_is_slow_enough_the_unit_is_geared()
    {
        // A canal fall of 4.2 m and 130 m3/s wants about 50 rpm; 48 poles turn at 125.
        var choice = SpeedChoice.Choose(TurbineTypes.Find("kaplan")!, 130, 4.2, 4600, 50);
        Assert.False(choice.IsDirect);
        Assert.Null(choice.Poles);
        Assert.Null(choice.SynchronousRpm);
        Assert.True(choice.HighestSpeedRpm < 125);
        Assert.InRange(choice.RunnerSpeedRpm, choice.LowestSpeedRpm, choice.HighestSpeedRpm);
        Assert.Equal(TurbineTypes.Find("kaplan")!.SpecificSpeed.MiddleKwM, choice.SpecificSpeedKwM, 1e-9);
    }

    [Fact]
    public void More_jets_are_taken_only_where_one_is_too_slow()
    {
        var pelton = TurbineTypes.Find("pelton")!;
        var creek = SpeedChoice.Choose(pelton, 0.01, 60, 5, 60);
        Assert.True(creek.IsDirect);
        Assert.Equal(1, creek.Jets);
        // 1500 kW at 60 m: one jet may turn at 26 x 60^1.25 / 1500^0.5 = 112 rpm at most, and 48 poles at 60 Hz turn at 150.
        var wide = SpeedChoice.Choose(pelton, 3, 60, 1500, 60);
        Assert.True(wide.IsDirect);
        Assert.True(wide.Jets > 1);
        Assert.Equal(wide.SpecificSpeedKwM / Math.Sqrt(wide.Jets), wide.SpecificSpeedPerJetKwM, 1e-9);
        Assert.False(pelton.SpecificSpeed.Contains(SpecificSpeed.KwM(SynchronousSpeed.Rpm(48, 60), 1500, 60)));
    }

    [Theory]
    [InlineData("screw")]
    [InlineData("water-wheel")]
    public void Slow_machines_are_geared_at_their_own_speed(string id)
    {
        var choice = SpeedChoice.Choose(TurbineTypes.Find(id)!, 2, 3, 45, 50);
        Assert.False(choice.IsDirect);
        Assert.NotNull(choice.RunnerDiameterM);
        Assert.Equal(TurbineTypes.Find(id)!.OwnSpeedRule!.At(2, 3).SpeedRpm, choice.RunnerSpeedRpm);
        Assert.Contains(choice.Uses, u => u.Method.Id == TurbineTypes.Find(id)!.OwnSpeedRule!.Method.Id);
    }

    [Theory]
    [InlineData("screw")]
    [InlineData("water-wheel")]
    public void The_band_of_slow_machines_is_what_their_speed_rule_gives_within_the_envelope(string id)
    {
        var type = TurbineTypes.Find(id)!;
        foreach (var corner in type.Envelope.Vertices)
        {
            var powerKw = 9.81 * corner.FlowM3PerS * corner.HeadM * type.Efficiency.At(1);
            var choice = SpeedChoice.Choose(type, corner.FlowM3PerS, corner.HeadM, powerKw, 50);
            Assert.True(type.SpecificSpeed.Contains(choice.SpecificSpeedKwM), $"{corner}: {choice.SpecificSpeedKwM}");
        }
    }

    [Fact]
    public void A_direct_choice_lies_in_the_band_and_no_usual_speed_lies_nearer_its_middle()
    {
        var fast = TurbineTypes.All.Where(t => t.OwnSpeedRule is null).ToArray();
        Gen.Select(Gen.Int[0, fast.Length - 1], Gen.Double[-2, 2], Gen.Double[0.2, 2.8], Gen.Bool).Sample((i, logFlow, logHead, sixty) =>
        {
            var (flow, head, hertz) = (Math.Pow(10, logFlow), Math.Pow(10, logHead), sixty ? 60.0 : 50.0);
            var power = 9.81 * flow * head * 0.85;
            var choice = SpeedChoice.Choose(fast[i], flow, head, power, hertz);
            var band = fast[i].SpecificSpeed;
            Assert.Equal(SpecificSpeed.KwM(choice.RunnerSpeedRpm, power, head), choice.SpecificSpeedKwM, 1e-9 * choice.SpecificSpeedKwM);
            Assert.Equal(choice.RunnerSpeedRpm * fast[i].Runaway.Highest, choice.RunawayRpm, 1e-9 * choice.RunawayRpm);
            Assert.InRange(choice.Jets, 1, band.MostJets);
            var usual = Enumerable.Range(2, 23).Select(pairs => SynchronousSpeed.Rpm(2 * pairs, hertz)).ToList();
            double PerJet(double rpm, int jets) => SpecificSpeed.KwM(rpm, power, head) / Math.Sqrt(jets);
            if (choice.IsDirect)
            {
                Assert.True(band.Contains(choice.SpecificSpeedPerJetKwM));
                var off = Math.Abs(Math.Log(choice.SpecificSpeedPerJetKwM / band.MiddleKwM));
                Assert.All(usual, rpm => Assert.True(Math.Abs(Math.Log(PerJet(rpm, choice.Jets) / band.MiddleKwM)) >= off - 1e-12));
            }
            else
            {
                Assert.All(usual, rpm => Assert.All(Enumerable.Range(1, band.MostJets), jets => Assert.False(band.Contains(PerJet(rpm, jets)))));
            }
        });
    }

    [Fact]
    public void A_choice_names_the_methods_it_used()
    {
        var direct = SpeedChoice.Choose(TurbineTypes.Find("francis")!, 0.3, 40, 100, 50);
        Assert.True(direct.IsDirect);
        Assert.Equal([TurbineMethods.SpecificSpeedKwM.Id, TurbineMethods.SynchronousSpeed.Id], direct.Uses.Select(u => u.Method.Id));
        Assert.All(direct.Uses, u => Assert.Empty(u.OutOfRange()));
    }
}
