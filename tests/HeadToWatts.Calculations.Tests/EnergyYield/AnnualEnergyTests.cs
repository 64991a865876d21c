using HeadToWatts.EnergyYield;
using HeadToWatts.FlowRecords;
using MathNet.Numerics.Distributions;
using MathNet.Numerics.Integration;

namespace HeadToWatts.Calculations.Tests.EnergyYield;

/// <summary>Annual energy against closed forms and an independent quadrature of the same integrand on the curve itself.</summary>
public class AnnualEnergyTests
{
    private const double HeadM = 50;
    private const double Efficiency = 0.82;
    private const double Hours = 8760;

    private static readonly IReadOnlyList<CheckRow> Rows = [.. CheckValueFile.OfMethod(EnergyMethods.AnnualEnergy.Id).SelectMany(f => f.Rows)];

    public static TheoryData<double> CapsOverMean => [0.05, 0.2, 0.5, 0.9, 1, 1.3, 2, 3.5, 6];

    [Fact]
    public void The_mean_flow_through_the_turbine_meets_closed_forms()
    {
        var rows = Rows.Where(r => r.Has("curve")).ToList();
        Assert.Equal(4, rows.Count);
        foreach (var row in rows)
        {
            var curve = row.Text("curve") == "linear" ? Plants.Linear(row["scaleM3PerS"]) : Plants.Exponential(row["scaleM3PerS"]);
            row.Check(Energy(curve, row["designFlowM3PerS"]).Integral.TurbineFlowM3PerS);
        }
    }

    [Fact]
    public void The_mean_flow_through_the_turbine_meets_the_lognormal_oracle()
    {
        var rows = Rows.Where(r => r.Has("medianM3PerS") && r.Has("expected")).ToList();
        Assert.Equal(3, rows.Count);
        foreach (var row in rows)
            row.Check(Energy(Plants.Lognormal(row["medianM3PerS"], row["sigma"]), row["designFlowM3PerS"]).Integral.TurbineFlowM3PerS);
    }

    [Fact]
    public void Flow_duration_to_kilowatt_hours_meets_the_oracle_from_end_to_end()
    {
        var row = Assert.Single(Rows, r => r.Has("expectedKwh"));
        var design = row["designFlowM3PerS"];
        var plant = Plants.Flat(HeadM, design, Efficiency, leastFlowRatio: 0.2, waterway: Plants.Quadratic(0.4));
        var year = AnnualEnergy.Of(plant, Plants.Supply(Plants.Lognormal(row["medianM3PerS"], row["sigma"])));
        row.Check(year.Integral.MeterPowerKw, "expectedMeanKw");
        row.Check(year.AnnualEnergyKwh, "expectedKwh");
    }

    [Theory]
    [MemberData(nameof(CapsOverMean))]
    public void Energy_without_losses_meets_the_closed_form_of_each_curve(double capOverMean)
    {
        const double mean = 3;
        var cap = capOverMean * mean;

        // Straight from 2 x mean to 0; exponential; lognormal of the same mean.
        var largest = 2 * mean;
        var linear = cap >= largest ? mean : cap - (cap * cap / (2 * largest));
        Holds(Plants.Linear(largest), cap, linear, 1e-9);
        Holds(Plants.Exponential(mean), cap, mean * (1 - Math.Exp(-cap / mean)), 1e-6);
        const double sigma = 0.9;
        var median = mean / Math.Exp(sigma * sigma / 2);
        var d = Math.Log(cap / median) / sigma;
        Holds(Plants.Lognormal(median, sigma), cap, (mean * Normal.CDF(0, 1, d - sigma)) + (cap * Normal.CDF(0, 1, -d)), 1e-6);

        static void Holds(FlowDurationCurve curve, double cap, double meanTurbineFlow, double tolerance)
        {
            var expectedKwh = Plants.Gravity * HeadM * Efficiency * meanTurbineFlow * Hours;
            Assert.Equal(expectedKwh, Energy(curve, cap).AnnualEnergyKwh, tolerance * expectedKwh);
        }
    }

    [Theory]
    [MemberData(nameof(CapsOverMean))]
    public void Energy_on_a_straight_curve_with_a_loss_of_the_flow_squared_meets_the_closed_form(double capOverMean)
    {
        // P = eta gamma (H Q - k Q^3), Q = Q0 (1 - p): the integral below the cap is (H Qd^2/2 - k Qd^4/4)/Q0, above it (1 - Qd/Q0)(H Qd - k Qd^3).
        const double largest = 6, k = 0.3;
        var best = Math.Sqrt(HeadM / (3 * k));
        var cap = Math.Min(capOverMean * largest / 2, largest);
        Assert.True(cap < best);
        var expected = Plants.Gravity * Efficiency * Hours
            * ((((HeadM * cap * cap / 2) - (k * Math.Pow(cap, 4) / 4)) / largest) + ((1 - (cap / largest)) * ((HeadM * cap) - (k * Math.Pow(cap, 3)))));
        var plant = Plants.Flat(HeadM, cap, Efficiency, waterway: Plants.Quadratic(k));
        Assert.Equal(expected, AnnualEnergy.Of(plant, Plants.Supply(Plants.Linear(largest))).AnnualEnergyKwh, 1e-9 * expected);
    }

    [Theory]
    [InlineData(1.0, 0.4, 0.0)]
    [InlineData(3.0, 0.4, 0.0)]
    [InlineData(3.0, 0.4, 0.3)]
    [InlineData(5.0, 0.25, 0.15)]
    [InlineData(6.4, 0.4, 0.2)]
    [InlineData(9.0, 0.4, 0.1)]
    [InlineData(25.0, 0.4, 0.1)]
    public void Energy_with_losses_meets_an_independent_quadrature_on_the_raw_curve(double cap, double k, double leastRatio)
    {
        var waterway = Plants.Quadratic(k);
        var plant = Plants.Flat(HeadM, cap, Efficiency, leastRatio, waterway);

        // The flow of highest power, beyond which the plant takes no more: d(H Q - k Q^3)/dQ = 0.
        var most = Math.Min(cap, Math.Sqrt(HeadM / (3 * k)));
        double Power(double flow)
        {
            if (flow < leastRatio * cap)
                return 0;
            var taken = Math.Min(flow, most);
            return Plants.Gravity * Efficiency * taken * (HeadM - (k * taken * taken));
        }

        // Exponential: over t = -ln p, Q = Qm t. Lognormal: over the normal variate.
        const double mean = 3, sigma = 0.9;
        var median = mean / Math.Exp(sigma * sigma / 2);
        var exponential = Pieces(t => Math.Exp(-t) * Power(mean * t), 0, leastRatio * cap / mean, most / mean, 36);
        var lognormal = Pieces(z => Normal.PDF(0, 1, z) * Power(median * Math.Exp(sigma * z)), -6, leastRatio > 0 ? Math.Log(leastRatio * cap / median) / sigma : -6, Math.Log(most / median) / sigma, 8.5);
        Assert.Equal(exponential * Hours, AnnualEnergy.Of(plant, Plants.Supply(Plants.Exponential(mean))).AnnualEnergyKwh, 1e-6 * exponential * Hours);
        Assert.Equal(lognormal * Hours, AnnualEnergy.Of(plant, Plants.Supply(Plants.Lognormal(median, sigma))).AnnualEnergyKwh, 1e-6 * lognormal * Hours);

        static double Pieces(Func<double, double> integrand, params double[] ends)
        {
            var sum = 0.0;
            for (var i = 0; i + 1 < ends.Length; i++)
            {
                // Open ends: the jump at the least flow belongs to one side only.
                if (ends[i + 1] > ends[i])
                    sum += GaussKronrodRule.Integrate(integrand, ends[i] + 1e-12, ends[i + 1] - 1e-12, out _, out _, 1e-10, 20, 15);
            }

            return sum;
        }
    }

    [Fact]
    public void A_fixed_pipe_gives_most_power_where_a_third_of_the_head_is_lost()
    {
        // Common practice, no source: h_f = H/3 at the highest power of a pipe whose loss grows with the flow squared.
        const double k = 0.5;
        var plant = Plants.Flat(HeadM, 100, Efficiency, waterway: Plants.Quadratic(k));
        Assert.Equal(Math.Sqrt(HeadM / (3 * k)), plant.BestFlowM3PerS, 1e-6);
        Assert.Equal(HeadM * 2 / 3, plant.At(100).NetHeadM, 1e-5);
        Assert.Equal(Plants.Gravity * Efficiency * Math.Sqrt(HeadM / (3 * k)) * HeadM * 2 / 3, plant.BestPowerKw, 1e-9 * plant.BestPowerKw);
    }

    [Fact]
    public void Reserved_flow_comes_off_before_the_turbine_limit()
    {
        // Exponential curve less a constant r: mean of min(max(Q - r, 0), Qd) = Qm exp(-r/Qm)(1 - exp(-Qd/Qm)).
        const double mean = 5, reserved = 2, cap = 4;
        var supply = Plants.Supply(Plants.Exponential(mean), new WaterAllocation(ReservedFlow.Constant(reserved), 0));
        var year = AnnualEnergy.Of(Plants.Flat(HeadM, cap, Efficiency), supply);
        var expected = mean * Math.Exp(-reserved / mean) * (1 - Math.Exp(-cap / mean));
        Assert.Equal(expected, year.Integral.TurbineFlowM3PerS, 1e-6 * expected);

        // Taken off after the limit it would be another, smaller figure: the integral of max(min(Q, Qd) - r, 0).
        var after = mean * (Math.Exp(-reserved / mean) - Math.Exp(-cap / mean));
        Assert.True(year.Integral.TurbineFlowM3PerS > after * 1.2);
    }

    [Fact]
    public void A_percentage_reserved_scales_the_curve()
    {
        // A quarter off a straight curve of 10 m3/s leaves a straight curve of 7.5 m3/s: 5 - 25/15 = 3.3333.
        var supply = Plants.Supply(Plants.Linear(10), new WaterAllocation(ReservedFlow.PercentOfFlow(0.25), 0));
        Assert.Equal(5 - (25 / 15.0), AnnualEnergy.Of(Plants.Flat(HeadM, 5, Efficiency), supply).Integral.TurbineFlowM3PerS, 1e-9);
    }

    [Fact]
    public void The_mean_power_of_the_season_is_not_the_mean_power_of_the_year()
    {
        // A real canal that runs 0.48 of the year: its season's mean power times 8760 h claims 2.08 times too much.
        const double share = 0.48;
        var season = Plants.Curve(new(0, 8), new(0.5, 6), new(1, 3));
        var plant = Plants.Flat(5, 7, Efficiency);
        var claimed = AnnualEnergy.Of(plant, Plants.Supply(season)).AnnualEnergyKwh;
        var year = AnnualEnergy.Of(plant, Plants.Supply(season.ForSeasonShare(share)));
        Assert.Equal(1 / share, claimed / year.AnnualEnergyKwh, 1e-9);
        Assert.Equal(share * Hours, year.RunningHours, 1e-6);
        Assert.True(year.PlantFactor <= share);
    }

    [Fact]
    public void Power_at_the_mean_flow_overstates_the_energy_of_a_flow_that_varies()
    {
        // Half the year 10 m3/s, half nothing, a machine of 5 m3/s: the mean flow of 5 would run it all year, in truth half of it.
        var supply = Plants.Supply(Plants.Constant(10, 0.5));
        var plant = Plants.Flat(HeadM, 5, Efficiency);
        Assert.Equal(5, supply.Curve.MeanFlowM3PerS, 1e-12);
        Assert.Equal(plant.At(5).MeterPowerKw * Hours / 2, AnnualEnergy.Of(plant, supply).AnnualEnergyKwh, 1e-6);
    }

    [Fact]
    public void A_peak_efficiency_at_all_hours_overstates_a_machine_with_a_least_flow()
    {
        var curve = Plants.Supply(Plants.Linear(10));
        var whole = AnnualEnergy.Of(Plants.Flat(HeadM, 8, Efficiency), curve);
        var cut = AnnualEnergy.Of(Plants.Flat(HeadM, 8, Efficiency, leastFlowRatio: 0.4), curve);

        // Below 3.2 of 10 m3/s the machine stands: 0.32 of the year, and the water of that time, 3.2^2/20 m3/s, passes by.
        Assert.Equal(0.68 * Hours, cut.RunningHours, 1e-6);
        Assert.Equal(3.2 * 3.2 / 20, whole.Integral.TurbineFlowM3PerS - cut.Integral.TurbineFlowM3PerS, 1e-9);
        Assert.Equal(3.2 * 3.2 / 20, cut.Integral.BelowLeastM3PerS, 1e-9);
    }

    [Fact]
    public void Plant_factors_meet_printed_ones()
    {
        var files = CheckValueFile.OfMethod(EnergyMethods.PlantFactor.Id);
        foreach (var row in files.SelectMany(f => f.Rows).Where(r => r.Has("meanFlowM3PerS")))
        {
            // A steady flow in a machine large enough for the peak.
            var site = Plants.Site(1000, row.Has("gravityMPerS2") ? row["gravityMPerS2"] : 9.81);
            var peakFlow = row["peakKw"] / (site.SpecificWeightNPerM3 / 1000 * row["headM"] * row["efficiency"]);
            var year = AnnualEnergy.Of(Plants.Flat(row["headM"], peakFlow, row["efficiency"], site: site), Plants.Supply(Plants.Constant(row["meanFlowM3PerS"])));
            Assert.Equal(row["peakKw"], year.InstalledPowerKw, 1e-9 * row["peakKw"]);
            row.Check(year.PlantFactor);
        }

        var plants = files.SelectMany(f => f.Rows).Where(r => r.Has("annualEnergyMwh")).ToList();
        Assert.Equal(4, plants.Count);
        foreach (var row in plants)
        {
            // Full power for as many hours as give the printed energy.
            var share = row["annualEnergyMwh"] * 1000 / (row["ratedKw"] * Hours);
            var flow = row["ratedKw"] / (Plants.Gravity * 5);
            var year = AnnualEnergy.Of(Plants.Flat(5, flow, 1), Plants.Supply(Plants.Constant(flow, share)));
            Assert.Equal(row["annualEnergyMwh"] * 1000, year.AnnualEnergyKwh, 1e-9 * year.AnnualEnergyKwh);
            Assert.Equal(year.FullLoadHours, year.RunningHours, 1e-6);
            row.Check(year.PlantFactor);
        }
    }

    [Fact]
    public void A_dry_year_and_a_year_of_drops_give_nothing()
    {
        foreach (var flow in new[] { 0, 1e-9, 0.1 })
        {
            var year = AnnualEnergy.Of(Plants.Flat(HeadM, 1, Efficiency, leastFlowRatio: 0.2), Plants.Supply(Plants.Constant(flow)));
            Assert.Equal(0, year.AnnualEnergyKwh);
            Assert.Equal(0, year.PlantFactor);
            Assert.Equal(0, year.RunningHours);
            Assert.Equal(0, year.Water.ClosureError, 1e-12);
        }
    }

    private static AnnualEnergy Energy(FlowDurationCurve curve, double designFlowM3PerS) =>
        AnnualEnergy.Of(Plants.Flat(HeadM, designFlowM3PerS, Efficiency), Plants.Supply(curve));
}
