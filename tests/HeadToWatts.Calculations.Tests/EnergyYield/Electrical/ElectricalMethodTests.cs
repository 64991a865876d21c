using HeadToWatts.EnergyYield.Electrical;

namespace HeadToWatts.Calculations.Tests.EnergyYield.Electrical;

/// <summary>The methods between the shaft and the meter against values from outside.</summary>
public class ElectricalMethodTests
{
    [Fact]
    public void Generators_have_the_efficiency_of_their_size()
    {
        var induction = CheckValueFile.OfMethod("generator-efficiency").Single(f => f.Path.EndsWith("csa-motors.csv", StringComparison.Ordinal));
        foreach (var row in induction.Rows)
            row.Check(GeneratorMachine.UsualEfficiency(GeneratorKind.Induction, row["power_hp"] * 0.7457));

        // From memory; the table of the induction machines above stands beside it.
        var synchronous = CheckValueFile.OfMethod("generator-efficiency").Single(f => f.Path.EndsWith("esha-from-memory.csv", StringComparison.Ordinal));
        foreach (var row in synchronous.Rows)
            row.Check(GeneratorMachine.UsualEfficiency(GeneratorKind.Synchronous, row["power_kw"]));
    }

    [Theory]
    [InlineData(GeneratorKind.Synchronous)]
    [InlineData(GeneratorKind.Induction)]
    public void A_larger_generator_is_never_less_efficient(GeneratorKind kind)
    {
        var last = 0.0;
        for (var kw = 0.5; kw < 5000; kw *= 1.07)
        {
            var efficiency = GeneratorMachine.UsualEfficiency(kind, kw);
            Assert.InRange(efficiency, last, 0.98);
            last = efficiency;
        }
    }

    [Fact]
    public void Part_load_follows_tests_of_motors()
    {
        foreach (var row in CheckValueFile.OfMethod(ElectricalMethods.GeneratorLosses.Id).SelectMany(f => f.Rows))
        {
            var generator = new RatedGenerator(37.3, row["full_load_efficiency"]);
            row.Check(generator.EfficiencyAt(row["load"]) / generator.FullLoadEfficiency, "expected_relative");
        }
    }

    [Fact]
    public void Efficiency_is_highest_where_the_losses_with_the_load_equal_the_constant_ones()
    {
        // A fact of the trade (common practice, no source): d(loss/output)/d(output) = 0 there.
        const double s = GeneratorMachine.ConstantLossShare;
        var generator = new RatedGenerator(100, 0.95);
        var top = Math.Sqrt(s / (1 - s));
        Assert.True(generator.EfficiencyAt(top) >= generator.EfficiencyAt(top * 0.99));
        Assert.True(generator.EfficiencyAt(top) >= generator.EfficiencyAt(top * 1.01));
        Assert.Equal(0.95, generator.EfficiencyAt(1), 1e-12);
    }

    [Fact]
    public void A_transformer_has_the_efficiency_of_the_textbook()
    {
        foreach (var row in CheckValueFile.OfMethod(ElectricalMethods.TransformerLosses.Id).SelectMany(f => f.Rows))
        {
            var transformer = new RatedTransformer(row["rating_kva"], row["no_load_kw"], row["load_kw"]);
            row.Check(transformer.EfficiencyAt(row["load"] * row["rating_kva"] * row["power_factor"], row["power_factor"]));
        }
    }

    [Fact]
    public void A_line_loses_what_the_textbook_says()
    {
        foreach (var row in CheckValueFile.OfMethod(ElectricalMethods.LineLoss.Id).SelectMany(f => f.Rows))
        {
            // A conductor that has the printed resistance at 20 °C.
            var line = new LineRun(1000, row["voltage_v"], 3, new ConductorSize("any", 1000 * Conductors.Copper.ResistivityOhmMm2PerM / row["ohm"]), Conductors.Copper, 20);
            row.Check(line.LossKw(row["meter_kw"], row["power_factor"]), "expected_loss_kw");
            row.Check(line.CurrentA(row["meter_kw"], row["power_factor"]), "expected_current_a");
        }
    }

    [Fact]
    public void One_phase_over_the_same_conductor_loses_twice_as_much_at_the_same_voltage()
    {
        // Two wires carry √3 times the current of three: 2 (√3)² against 3.
        var three = new LineRun(500, 480, 3, Conductors.Find("4/0 AWG")!, Conductors.Aluminium, 50);
        Assert.Equal(2 * three.LossKw(40, 0.9), (three with { Phases = 1 }).LossKw(40, 0.9), 1e-12);
    }

    [Fact]
    public void Conductors_have_the_resistance_of_their_tables()
    {
        foreach (var file in CheckValueFile.OfMethod(ElectricalMethods.ConductorResistance.Id))
        {
            foreach (var row in file.Rows)
            {
                var metal = Conductors.FindMetal(row.Text("metal"))!;
                if (row.Has("expected_milliohm_per_ft"))
                    row.Check(Conductors.ResistanceOhm(metal, row["area_mm2"], 0.3048, 20) * 1000, "expected_milliohm_per_ft");
                else
                    row.Check(Conductors.ResistanceOhm(metal, row["area_mm2"], row["length_m"], row["temperature"]));
            }
        }
    }

    [Fact]
    public void Gauges_have_the_area_of_the_strands_that_make_them_up()
    {
        foreach (var row in CheckValueFile.OfMethod(ElectricalMethods.WireGauge.Id).SelectMany(f => f.Rows))
        {
            var inches = row["strand_in"];
            var expected = row["strands"] * Math.PI / 4 * inches * inches * 25.4 * 25.4;
            var diameterMm = Conductors.GaugeDiameterMm((int)row["gauge"]);
            Assert.Equal(expected, Math.PI / 4 * diameterMm * diameterMm, 3e-3 * expected);
            Assert.Equal(Math.PI / 4 * diameterMm * diameterMm, Conductors.Find($"{row.Text("gauge")} awg")!.AreaMm2, 1e-9);
        }

        // 4/0 is 0.46 in by the standard's definition, from memory.
        Assert.Equal(0.46 * 25.4, Conductors.GaugeDiameterMm(-3), 1e-3);
    }

    [Fact]
    public void Sizes_have_names_of_their_own_and_are_found_however_they_are_written()
    {
        Assert.Equal(Conductors.Sizes.Count, Conductors.Sizes.Select(s => s.Name).Distinct(StringComparer.OrdinalIgnoreCase).Count());
        Assert.Same(Conductors.Find("95 mm2"), Conductors.Find("95MM²"));
        Assert.Null(Conductors.Find("97 mm2"));
        Assert.Throws<ArgumentOutOfRangeException>(() => Conductors.ResistanceOhm(Conductors.Copper, double.NaN, 1, 20));
    }
}
