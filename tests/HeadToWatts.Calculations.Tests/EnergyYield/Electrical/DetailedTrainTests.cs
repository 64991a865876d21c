using CsCheck;
using HeadToWatts.EnergyYield;
using HeadToWatts.EnergyYield.Electrical;

namespace HeadToWatts.Calculations.Tests.EnergyYield.Electrical;

/// <summary>Plants whose machines behind the shaft are given in detail.</summary>
public class DetailedTrainTests
{
    private static readonly Gen<PowerTrain> AnyDetail = Gen.Select(
        Gen.Int[1, 7], Gen.Bool, Gen.Double[0.9, 1], Gen.Double[0.001, 0.006], Gen.Double[0.005, 0.02], Gen.Bool, Gen.Double[10, 2000], Gen.Double[0.6, 1],
        (which, induction, drive, noLoad, load, live, length, availability) => new PowerTrain(drive, 0.93, 0.99, 0.98, 0.01, 0, availability)
        {
            Generator = (which & 1) == 0 ? null : new GeneratorMachine(induction ? GeneratorKind.Induction : GeneratorKind.Synchronous, null, null),
            Transformer = (which & 2) == 0 ? null : new TransformerMachine(null, new RatedLoss(null, noLoad), new RatedLoss(null, load), live),
            Line = (which & 4) == 0 ? null : new LineRun(length, 11_000, 3, Conductors.Find("240 mm2")!, Conductors.Aluminium, 40),
            PowerFactor = 0.92,
        });

    [Fact]
    public void The_staircase_adds_up_to_the_meter_whatever_is_given_in_detail()
    {
        Gen.Select(Plants.AnyCase, AnyDetail).Sample((c, train) =>
        {
            var design = c.Design with { Train = train };
            var plant = new PlantCurve(design);
            var year = AnnualEnergy.Of(plant, new FlowSupply(c.Curve, c.Allocation));
            var stairs = year.Staircase;
            var left = stairs.GrossKwh;
            foreach (var step in stairs.Steps)
            {
                // "out of service" takes from what is left, which is below zero where a live transformer outweighs a plant that hardly runs.
                if (step.Name != "out of service")
                    Assert.True(step.LossKwh >= -1e-9 * Math.Max(stairs.GrossKwh, 1), step.Name);
                Assert.Equal(left - step.LossKwh, step.LeftKwh, 1e-9 * Math.Max(stairs.GrossKwh, 1));
                left = step.LeftKwh;
            }

            Assert.Equal(year.AnnualEnergyKwh, left, 1e-9 * Math.Max(stairs.GrossKwh, 1));
            Assert.Equal(year.Integral.MeterPowerKw, (year.Integral.Train!.DeliveredKw) - year.Integral.Train.StandingKw, 1e-9 * Math.Max(plant.BestPowerKw, 1));
            Assert.Equal(0, year.Water.ClosureError, 1e-9);
        }, iter: 200);
    }

    [Fact]
    public void Each_step_passes_on_what_the_one_before_put_out_less_its_own_loss()
    {
        Gen.Select(Plants.AnyDesign, AnyDetail, Gen.Double[0.05, 1]).Sample((design, train, share) =>
        {
            var settled = new PlantCurve(design with { Train = train }).Design.Train;
            var running = Math.Ceiling(share * design.Units.UnitCount) / design.Units.UnitCount;
            var power = settled.At(1000 * share, running, 1 / running);
            Assert.Equal(1000 * share * train.DriveEfficiency, power.DrivenKw, 1e-9);
            Assert.True(power.DrivenKw >= power.GeneratedKw && power.GeneratedKw >= power.SentKw && power.SentKw >= power.TransformedKw && power.TransformedKw >= power.MeterKw);
            if (settled.Rated!.Transformer is { } transformer && power.TransformedKw > 0)
                Assert.Equal(power.SentKw, power.TransformedKw / transformer.EfficiencyAt(power.TransformedKw, train.PowerFactor), 1e-9 * 1000);
            if (train.Line is { } line)
                Assert.Equal(power.TransformedKw, power.MeterKw + line.LossKw(power.MeterKw, train.PowerFactor), 1e-9 * 1000);
        });
    }

    [Fact]
    public void A_generator_without_losses_leaves_the_plant_as_it_was()
    {
        // Full-load efficiency 1 means no losses at any load.
        var plain = Plants.FlatDesign(40, 2, 0.85, 0.1, units: 3);
        var detailed = new PlantCurve(plain with { Train = Plants.Lossless with { Generator = new GeneratorMachine(GeneratorKind.Synchronous, null, 1) } });
        var simple = new PlantCurve(plain);
        for (var q = 0.05; q < 2.5; q += 0.05)
            Assert.Equal(simple.At(q).MeterPowerKw, detailed.At(q).MeterPowerKw, 1e-9 * simple.BestPowerKw);
    }

    [Fact]
    public void A_standing_plant_draws_what_its_live_transformer_needs()
    {
        // 2 kW no-load loss, a plant that never runs: 2 kW × 8760 h × availability are drawn.
        var design = Plants.FlatDesign(40, 2, 0.85, 0.5, train: Plants.Lossless with { Transformer = new TransformerMachine(500, new RatedLoss(2, 0), new RatedLoss(0, 0), true) });
        var year = AnnualEnergy.Of(new PlantCurve(design), Plants.Supply(Plants.Constant(0.2)));
        Assert.Equal(-2 * 8760, year.AnnualEnergyKwh, 1e-6);
        var off = design with { Train = design.Train with { Transformer = design.Train.Transformer! with { StaysLive = false } } };
        Assert.Equal(0, AnnualEnergy.Of(new PlantCurve(off), Plants.Supply(Plants.Constant(0.2))).AnnualEnergyKwh, 1e-9);
    }

    [Fact]
    public void One_of_three_generators_running_has_one_third_of_the_constant_losses()
    {
        // Worked by hand: rated 100 kW each at 0.95 loses 5.263 kW at full load, 45 % of it constant; at full load of one unit the loss is 5.263 kW, not three times that.
        var train = new PowerTrain(1, 1, 1, 1, 0, 0, 1) { Generator = new GeneratorMachine(GeneratorKind.Synchronous, 100, 0.95) }.RatedFor(110, 3);
        var loss = 100 * ((1 / 0.95) - 1);
        Assert.Equal(100, train.At(100 + loss, 1.0 / 3, 3).GeneratedKw, 1e-9);
        Assert.Equal(300, train.At(300 + (3 * loss), 1, 1).GeneratedKw, 1e-9);
    }

    [Fact]
    public void Power_never_falls_as_the_usable_flow_rises()
    {
        Gen.Select(Plants.AnyDesign, AnyDetail).Sample((design, train) =>
        {
            var plant = new PlantCurve(design with { Train = train });
            var last = double.NegativeInfinity;
            for (var i = 1; i <= 300; i++)
            {
                var power = plant.At(design.Units.DesignFlowM3PerS * 1.1 * i / 300).MeterPowerKw;
                Assert.True(power >= last - (1e-9 * Math.Max(plant.BestPowerKw, 1e-9)));
                last = power;
            }
        }, iter: 150);
    }
}
