using CsCheck;
using HeadToWatts.EnergyYield;
using HeadToWatts.FlowRecords;

namespace HeadToWatts.Calculations.Tests.EnergyYield;

/// <summary>What must hold for any plant on any water.</summary>
public class RandomPlantTests
{
    [Fact]
    public void The_water_balance_closes_and_the_energy_staircase_adds_up()
    {
        Plants.AnyCase.Sample(c =>
        {
            var year = AnnualEnergy.Of(new PlantCurve(c.Design), new FlowSupply(c.Curve, c.Allocation));
            Assert.Equal(0, year.Water.ClosureError, 1e-9);
            var water = year.Water;
            Assert.All([water.ArrivingM3, water.PriorM3, water.ReservedM3, water.TurbinedM3, water.BelowLeastM3, water.OutOfServiceM3, water.SpilledM3], part => Assert.True(part >= -1e-9 * Math.Max(water.ArrivingM3, 1)));
            Assert.Equal(c.Curve.MeanFlowM3PerS * 31_536_000, water.ArrivingM3, 1e-9 * Math.Max(water.ArrivingM3, 1));

            var stairs = year.Staircase;
            var left = stairs.GrossKwh;
            foreach (var step in stairs.Steps)
            {
                Assert.True(step.LossKwh >= -1e-9 * Math.Max(stairs.GrossKwh, 1), step.Name);
                Assert.Equal(left - step.LossKwh, step.LeftKwh, 1e-9 * Math.Max(stairs.GrossKwh, 1));
                left = step.LeftKwh;
            }

            Assert.Equal(year.AnnualEnergyKwh, left, 1e-9 * Math.Max(stairs.GrossKwh, 1));
            Assert.InRange(year.PlantFactor, 0, 1 + 1e-9);
            Assert.InRange(year.RunningHours, 0, 8760 * (1 + 1e-9));
            Assert.True(year.FullLoadHours <= 8760 * (1 + 1e-9));
        }, iter: 300);
    }

    [Fact]
    public void Energy_never_rises_when_reserved_flow_rises()
    {
        Gen.Select(Plants.AnyCase, Gen.Double[0, 0.5], Gen.Double[0, 0.5], Gen.Bool).Sample((c, first, more, percent) =>
        {
            var plant = new PlantCurve(c.Design);
            var scale = c.Design.Units.DesignFlowM3PerS;
            double Energy(double share) => AnnualEnergy.Of(plant, new FlowSupply(c.Curve, new WaterAllocation(
                percent ? ReservedFlow.PercentOfFlow(share) : ReservedFlow.Constant(share * scale), c.Allocation.PriorDeliveriesM3PerS))).AnnualEnergyKwh;
            Assert.True(Energy(first + more) <= Energy(first) + (1e-8 * plant.BestPowerKw * 8760));
        }, iter: 150);
    }

    [Fact]
    public void Net_head_falls_as_flow_rises()
    {
        Gen.Select(Plants.AnyDesign, Gen.Double[0, 1.5], Gen.Double[0.001, 1]).Sample((design, low, more) =>
        {
            var flow = design.Units.DesignFlowM3PerS;
            Assert.True(design.NetHeadM((low + more) * flow) < design.NetHeadM(low * flow));
            Assert.Equal(design.GrossHead.Metres, design.NetHeadM(0));
        }, iter: 500);
    }

    [Fact]
    public void Power_never_falls_as_the_usable_flow_rises_and_no_more_is_taken_than_there_is()
    {
        Plants.AnyDesign.Sample(design =>
        {
            var plant = new PlantCurve(design);
            var flow = design.Units.DesignFlowM3PerS;
            var flows = Enumerable.Range(0, 261).Select(i => i * flow / 200)
                .Concat(plant.BreakpointsM3PerS.SelectMany(b => new[] { b * (1 - 1e-9), b, b * (1 + 1e-9) })).Order();
            var last = 0.0;
            foreach (var usable in flows)
            {
                var point = plant.At(usable);
                Assert.True(point.MeterPowerKw >= last - (1e-9 * plant.BestPowerKw), $"{point.MeterPowerKw} after {last} at {usable}: {design.Units.UnitCount} x {design.Units.Type.Name}, design {flow}, best {plant.BestFlowM3PerS} {plant.BestPowerKw}, {design.Waterway.Formula}, D {design.Waterway.Elements[0].InsideDiameterM} L {design.Waterway.LengthM}, edges {string.Join(' ', plant.BreakpointsM3PerS.Select(e => $"{e:R}={plant.FlowTakenM3PerS(e):R}:{plant.At(e).MeterPowerKw:R}"))}");
                Assert.True(point.MeterPowerKw <= plant.BestPowerKw * (1 + 1e-9));
                Assert.True(point.TurbineFlowM3PerS <= usable * (1 + 1e-12));
                Assert.InRange(point.UnitsRunning, point.IsRunning ? 1 : 0, design.Units.UnitCount);
                last = Math.Max(last, point.MeterPowerKw);
            }

            Assert.Equal(plant.BestPowerKw, plant.At(10 * flow).MeterPowerKw, 1e-9 * plant.BestPowerKw);
        }, iter: 400);
    }

    [Fact]
    public void Quick_comparisons_stay_close_to_the_full_integral()
    {
        // Curves of many years of days are smooth against a share of 1/800; a random smooth one stands for them.
        Gen.Select(Plants.AnyDesign, Gen.Double[0.2, 1.2], Gen.Double[0.3, 2]).Sample((design, sigma, medianRatio) =>
        {
            var plant = new PlantCurve(design);
            var median = medianRatio * design.Units.DesignFlowM3PerS;
            var curve = Plants.Curve([.. Enumerable.Range(0, 601).Select(i => 4 - (i / 75.0)).Select(z => new CurvePoint(MathNet.Numerics.Distributions.Normal.CDF(0, 1, -z), median * Math.Exp(sigma * z)))]);
            var supply = Plants.Supply(curve);
            var full = AnnualEnergy.Of(plant, supply).AnnualEnergyKwh;
            var table = new LossTable(design.Waterway, design.Site, design.Units.DesignFlowM3PerS);
            var quick = TurbineRanking.QuickEnergyKwh(new PlantCurve(design with { QuickLosses = table }), supply.MiddlesM3PerS(TurbineRanking.ComparisonShares));

            // Where the plant starts with a jump, the start may fall anywhere within one share: half a share of full power either way.
            Assert.Equal(full, quick, (0.002 * full) + (0.5 / TurbineRanking.ComparisonShares * plant.BestPowerKw * 8760 * design.Train.Availability) + 1e-9);
        }, iter: 150);
    }

    [Fact]
    public void Tabulated_losses_stay_close_to_the_waterway_itself()
    {
        Gen.Select(Plants.AnyDesign, Gen.Double[0.01, 1]).Sample((design, share) =>
        {
            var flow = design.Units.DesignFlowM3PerS;
            var exact = design.Waterway.LossM(share * flow, design.Site);
            var quick = new LossTable(design.Waterway, design.Site, flow).LossM(share * flow);

            // Where friction bends between laminar and turbulent flow the table is coarser, but there the loss is next to nothing.
            Assert.Equal(exact, quick, (2e-4 * exact) + (1e-5 * design.Waterway.LossM(flow, design.Site)));
        }, iter: 200);
    }
}
