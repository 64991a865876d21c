using HeadToWatts.EnergyYield;
using HeadToWatts.FlowRecords;
using HeadToWatts.Hydraulics.LocalLosses;
using HeadToWatts.Hydraulics.Pipes;
using HeadToWatts.Hydraulics.Waterways;
using HeadToWatts.Studies;

namespace HeadToWatts.Calculations.Tests.Studies;

/// <summary>
/// One study worked number by number, from figures printed elsewhere: 0.4 m3/s for half the year, 60 m of gross head, 1000 m
/// of new steel pipe of 500 mm, water at 10 degC at sea level and 45 degrees of latitude, a flat efficiency of 0.85.
/// </summary>
public class HandWorkedStudyTests
{
    // WELMEC: g = 9.780318 (1 + 0.0053024 sin^2 45 - 0.0000058 sin^2 90) = 9.780318 x 1.0026454.
    private const double GravityMPerS2 = 9.780318 * 1.0026454;

    // IAPWS-IF97 at 10 degC and one atmosphere: 999.70154 kg/m3.
    private const double GammaKnPerM3 = 999.70154 * GravityMPerS2 / 1000;

    // 0.4/(pi x 0.5^2/4) = 2.0371833 m/s.
    private const double VelocityMPerS = 2.0371833;

    // fluids 1.0.22: 5.77422314725 m under g = 9.80665 (tests/CheckValues/darcy-weisbach/fluids.csv); the loss goes with 1/g.
    private const double FrictionM = 5.77422314725 * 9.80665 / GravityMPerS2;

    private const double LocalM = 0.5 * VelocityMPerS * VelocityMPerS / (2 * GravityMPerS2);
    private const double NetM = 60 - FrictionM - LocalM;
    private const double ShaftKw = 0.85 * GammaKnPerM3 * 0.4 * NetM;
    private const double GeneratorKw = ShaftKw * 0.97 * 0.94;
    private const double MeterKw = ((GeneratorKw * 0.99) - 0.5) * 0.985 * 0.99;
    private const double Kwh = MeterKw * 8760 * 0.5 * 0.95;

    private static readonly StudyResult Result = (TestStudies.Quiet with
    {
        Site = new(Math.PI / 4, 0, 10, 60),
        Train = new PowerTrain(0.97, 0.94, 0.985, 0.99, 0.01, 0.5, 0.95),
    })
        .WithCurve(BeyondLastRow.Dry, new(0, 0.4), new(0.5, 0.4))
        .WithFlow(f => f with { DesignFlowM3PerS = 0.4, Allocation = WaterAllocation.None })
        .WithHead(60)
        .WithPipes(PipeElement.Of("penstock", 1000, 0.5, PipeMaterials.Find("steel-new")!, new Fitting("K", 0.5, 1, null)))
        .WithType("francis", 1)
        .WithMakersEfficiency(0.85)
        .Run();

    [Fact]
    public void The_numbers_themselves_are_as_a_pocket_calculator_gives_them()
    {
        // Rounded by hand from the constants above, so that a slip in them shows.
        Assert.Equal(9.80619, GravityMPerS2, 5e-6);
        Assert.Equal(9.80326, GammaKnPerM3, 5e-6);
        Assert.Equal(5.77449, FrictionM, 2e-5);
        Assert.Equal(0.10580, LocalM, 5e-6);
        Assert.Equal(54.1197, NetM, 5e-5);
        Assert.Equal(180.387, ShaftKw, 5e-3);
        Assert.Equal(164.477, GeneratorKw, 5e-3);
        Assert.Equal(158.300, MeterKw, 5e-3);
        Assert.Equal(658_687, Kwh, 30.0);
    }

    [Fact]
    public void Velocity_losses_and_net_head()
    {
        Assert.Equal(GravityMPerS2, Result.Site.GravityMPerS2, 1e-6);
        Assert.Equal(GammaKnPerM3 * 1000, Result.Site.SpecificWeightNPerM3, 1e-3);
        Assert.Equal(VelocityMPerS, Result.Waterway.HighestVelocityMPerS, 1e-7);
        Assert.Equal(FrictionM, Result.Waterway.AtDesign.FrictionLossM, 1e-6);
        Assert.Equal(LocalM, Result.Waterway.AtDesign.LocalLossM, 1e-7);
        Assert.Equal(NetM, Result.Head.NetHeadAtDesignM, 1e-6);
        Assert.Equal((FrictionM + LocalM) / 60, Result.Waterway.LossShareOfGrossHead, 1e-8);

        // USBR: 0.125 (2 g H)^(1/2) = 4.288 m/s.
        Assert.Equal(4.288, Result.Waterway.VelocityLimitMPerS, 5e-4);
    }

    [Fact]
    public void Net_head_at_half_the_flow_loses_a_quarter_or_a_little_more()
    {
        // Local losses go with the square; friction with a power between 1.75 (smooth) and 2 (rough).
        var half = Result.Head.AtShares.Single(s => s.ShareOfDesignFlow == 0.5);
        Assert.InRange(half.LossM, (FrictionM + LocalM) / 4, (FrictionM / Math.Pow(2, 1.75)) + (LocalM / 4));
        Assert.Equal(60, half.NetHeadM + half.LossM, 1e-9);
    }

    [Fact]
    public void Power_energy_and_plant_factor()
    {
        var annual = Result.Energy.Annual;
        Assert.Equal(ShaftKw, Result.Energy.Plant.At(0.4).ShaftPowerKw, 1e-4);
        Assert.Equal(GeneratorKw, annual.InstalledPowerKw, 1e-4);
        Assert.Equal(MeterKw, annual.MeterPowerKw, 1e-4);
        Assert.Equal(Kwh, annual.AnnualEnergyKwh, 0.5);
        Assert.Equal(Kwh / GeneratorKw / 8760, annual.PlantFactor, 1e-7);
        Assert.Equal(0.5 * 0.95 * 8760, annual.RunningHours, 1e-6);
    }

    [Fact]
    public void Water()
    {
        var water = Result.Energy.Annual.Water;
        const double half = 0.4 * 0.5 * 31_536_000;
        Assert.Equal(half, water.ArrivingM3, 1e-3);
        Assert.Equal(half * 0.95, water.TurbinedM3, 1e-3);
        Assert.Equal(half * 0.05, water.OutOfServiceM3, 1e-3);
        Assert.Equal(0, water.SpilledM3, 1e-3);
    }

    [Fact]
    public void The_shortcut_over_the_mean_flow_is_shown_as_what_it_is()
    {
        // The mean flow of 0.2 m3/s, always there, against half a year of 0.4: less loss, so even more than twice a half.
        Assert.Equal(0.2, Result.Flow.MeanFlowM3PerS, 1e-12);
        var netAtHalf = Result.Head.AtShares.Single(s => s.ShareOfDesignFlow == 0.5).NetHeadM;
        var shaft = 0.85 * GammaKnPerM3 * 0.2 * netAtHalf;
        Assert.Equal(((shaft * 0.97 * 0.94 * 0.99) - 0.5) * 0.985 * 0.99 * 8760 * 0.95, Result.Energy.PowerAtMeanFlowKwh, 1.0);
    }
}
