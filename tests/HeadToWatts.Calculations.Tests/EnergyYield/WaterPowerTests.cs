using HeadToWatts.EnergyYield;

namespace HeadToWatts.Calculations.Tests.EnergyYield;

public class WaterPowerTests
{
    [Fact]
    public void Power_meets_printed_chains()
    {
        var rows = CheckValueFile.OfMethod(EnergyMethods.WaterPower.Id).SelectMany(f => f.Rows).Where(r => r.Has("expectedKw")).ToList();
        Assert.True(rows.Count >= 10);
        foreach (var row in rows)
        {
            var plant = Plants.Flat(row["netHeadM"], row["flowM3PerS"], row["efficiency"], site: Plants.Site(row["densityKgPerM3"], row["gravityMPerS2"]));
            row.Check(plant.At(row["flowM3PerS"]).ShaftPowerKw, "expectedKw");
        }
    }

    [Fact]
    public void Canal_plants_in_service_imply_an_overall_efficiency_between_three_quarters_and_nine_tenths()
    {
        var rows = CheckValueFile.OfMethod(EnergyMethods.WaterPower.Id).SelectMany(f => f.Rows).Where(r => r.Has("ratedKw")).ToList();
        Assert.Equal(4, rows.Count);
        foreach (var row in rows)
        {
            // A plant of no loss at all gives the power of the water; what was built over that is its overall efficiency.
            var water = Plants.Flat(row["headM"], row["flowM3PerS"], 1).At(row["flowM3PerS"]).MeterPowerKw;
            Assert.InRange(row["ratedKw"] / water, row["leastOverall"], row["mostOverall"]);
        }
    }

    [Fact]
    public void The_chain_behind_the_shaft_is_worked_by_hand()
    {
        // 100 kW x 0.97 x 0.94 = 91.18 kW at the generator; less 1 % and 2 kW = 88.2682; x 0.985 x 0.99 = 86.0747 kW at the meter.
        var train = new PowerTrain(0.97, 0.94, 0.985, 0.99, 0.01, 2, 0.95);
        Assert.Equal(91.18, train.GeneratedPowerKw(100), 1e-12);
        Assert.Equal(86.07473523, train.MeterPowerKw(100), 1e-8);
    }

    [Fact]
    public void A_plant_that_would_use_more_than_it_makes_stands()
    {
        // 0.1 m3/s at 10 m makes 9.8 kW; its own use is 12 kW until the flow exceeds 12/98.07 m3/s.
        var train = Plants.Lossless with { OwnUseKw = 12 };
        var plant = Plants.Flat(10, 1, 1, train: train);
        Assert.False(plant.At(0.1).IsRunning);
        Assert.Equal(0, plant.At(0.1).MeterPowerKw);
        var starts = 12 / (Plants.Gravity * 10);
        Assert.False(plant.At(starts * 0.999).IsRunning);
        Assert.True(plant.At(starts * 1.001).IsRunning);
        Assert.Equal((Plants.Gravity * 10) - 12, plant.At(1).MeterPowerKw, 1e-9);
    }
}
