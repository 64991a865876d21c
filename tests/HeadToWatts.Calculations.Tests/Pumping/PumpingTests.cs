using CsCheck;
using HeadToWatts.Hydraulics.Water;
using HeadToWatts.Pumping;

namespace HeadToWatts.Calculations.Tests.Pumping;

/// <summary>Pumping plants against printed examples and criteria, and what must hold of any plant.</summary>
public class PumpingTests
{
    private const double Foot = 0.3048;
    private const double Gpm = 231 * 0.0254 * 0.0254 * 0.0254 / 60;
    private const double Psi = 6894.757293168;

    // Elevation 0 and 10 degrees: about 9.8 kN/m3, as the printed examples take.
    private static readonly SiteConditions Site = SiteConditions.At(0.7854, 0, 10);

    [Fact]
    public void The_power_of_a_pump_is_that_of_the_printed_example()
    {
        foreach (var file in CheckValueFile.OfMethod(PumpingMethods.PumpPower.Id))
        {
            foreach (var row in file.Rows)
            {
                var plant = new PumpingPlant("p", EnergySources.All[0], row["flowM3PerS"], Months(1), new PumpingHead(row["headM"], 0, 0, 0), row["efficiency"], null);
                Assert.Equal(row["expectedKw"], PumpingRun.Of([plant], Site).Plants[0].DemandKw, 1.0);
            }
        }
    }

    [Fact]
    public void The_criteria_are_three_quarters_of_the_brake_output()
    {
        var rows = CheckValueFile.OfMethod(PumpingMethods.Performance.Id).SelectMany(f => f.Rows).Where(r => r.Has("brakeHpHoursPerUnit")).ToList();
        Assert.Equal(EnergySources.All.Select(s => s.Id).Order(), rows.Select(r => r.Text("source")).Order());
        foreach (var row in rows)
        {
            var ours = EnergySources.Find(row.Text("source"))!.WaterKwhPerUnit / EnergySources.KwPerHorsepower;
            Assert.Equal(1, ours / row["expectedWhpHoursPerUnit"], 0.008);
            Assert.Equal(0.75, ours / row["brakeHpHoursPerUnit"], 0.008);
        }
    }

    [Fact]
    public void The_printed_diesel_plant_reaches_63_percent_of_the_criterion()
    {
        var row = CheckValueFile.OfMethod(PumpingMethods.Performance.Id).SelectMany(f => f.Rows).Single(r => r.Has("fuelGalPerHour"));
        var flow = row["flowGpm"] * Gpm;
        var head = (row["liftFt"] * Foot) + (row["pressurePsi"] * Psi / Site.SpecificWeightNPerM3);
        var waterHp = Site.SpecificWeightNPerM3 * flow * head / 1000 / EnergySources.KwPerHorsepower;
        Assert.Equal(row["expectedWhpHoursPerGal"], waterHp / row["fuelGalPerHour"], 0.05);
        var diesel = EnergySources.Find("diesel")!;
        var rating = waterHp * EnergySources.KwPerHorsepower / row["fuelGalPerHour"] / diesel.WaterKwhPerUnit;
        var result = PumpingRun.Of([new PumpingPlant("p", diesel, flow, Months(flow * 3600), new PumpingHead(head, 0, 0, 0), rating, 3)], Site).Plants[0];
        // One hour a month takes four gallons.
        Assert.Equal(4, result.UnitsByMonth[0], 1e-9);
        Assert.Equal(0.63, result.RatingRatio, 0.005);
        Assert.Equal(144, result.AnnualCostAmount!.Value, 1e-6);
    }

    [Fact]
    public void The_suction_head_is_that_of_the_printed_example()
    {
        var row = CheckValueFile.OfMethod(PumpingMethods.SuctionHead.Id).SelectMany(f => f.Rows).Single();
        var site = SiteConditions.At(0.7854, 0, (row["temperatureDegF"] - 32) / 1.8);
        var area = Math.PI / 4 * Math.Pow(row["diameterIn"] * 0.0254, 2);
        var velocity = row["flowCfs"] * Foot * Foot * Foot / area;
        var loss = row["lossCoefficient"] * velocity * velocity / (2 * site.GravityMPerS2);
        Assert.Equal(row["requiredFt"], SuctionHead.AvailableM(site, row["expectedLiftFt"] * Foot, loss) / Foot, 0.05);
    }

    [Fact]
    public void A_plant_that_meets_the_criterion_saves_nothing_and_energy_grows_with_head_and_volume() =>
        Gen.Select(Gen.Int[0, 4], Gen.Double[0.001, 3], Gen.Double[1, 200], Gen.Double[0.2, 1], Gen.Double[10, 1e6]).Sample((source, flow, head, efficiency, volume) =>
        {
            var of = EnergySources.All[source];
            PumpingPlantResult Run(double headM, double eta, double volumeM3) => PumpingRun.Of([new PumpingPlant("p", of, flow, Months(volumeM3), new PumpingHead(headM, 0, 0, 0), eta, null)], Site).Plants[0];
            var plant = Run(head, efficiency, volume);
            Assert.Equal(2, Run(2 * head, efficiency, volume).AnnualUnits / plant.AnnualUnits, 1e-9);
            Assert.Equal(3, Run(head, efficiency, 3 * volume).AnnualUnits / plant.AnnualUnits, 1e-9);
            // Units are conserved: what the water gets is what is bought times the efficiency.
            var kwhPerUnit = of.IsElectric ? 1 : of.WaterKwhPerUnit;
            Assert.Equal(1, plant.AnnualUnits * kwhPerUnit * efficiency / plant.Plant.WaterEnergyKwh(Site), 1e-9);
            var good = Run(head, of.IsElectric ? of.WaterKwhPerUnit : 1, volume);
            Assert.Equal(1, good.RatingRatio, 1e-9);
            Assert.Equal(0, good.SavedUnits / good.AnnualUnits, 1e-9);
            Assert.Equal(volume / flow / 3600, plant.HoursByMonth[0], 1e-6 * volume / flow);
        });

    private static double[] Months(double volumeM3) => [.. Enumerable.Repeat(volumeM3, 12)];
}
