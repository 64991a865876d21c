using HeadToWatts.Basis.Quantities;
using HeadToWatts.EnergyYield;
using HeadToWatts.FlowRecords;
using HeadToWatts.Hydraulics.Waterways;
using HeadToWatts.Turbines;
using HeadToWatts.Turbines.Units;

namespace HeadToWatts.Calculations.Tests.EnergyYield;

public class DesignFlowScanTests
{
    [Fact]
    public void On_an_exponential_curve_the_last_kilowatt_works_as_long_as_its_flow_is_exceeded()
    {
        // Without losses and at one efficiency the last kilowatt works p(Qd) of the year; 30 % of it at Qd = Qm ln(1/0.3).
        const double mean = 2;
        var scan = Scan(Plants.Exponential(mean));
        Assert.Equal(DesignFlowReason.LastKwWorksEnough, scan.Reason);
        var step = scan.Points[0].DesignFlowM3PerS;
        Assert.Equal(mean * Math.Log(1 / 0.02) / 40, step, 1e-3 * step);
        Assert.InRange(scan.SuggestedM3PerS, (mean * Math.Log(1 / 0.3)) - (0.5 * step), (mean * Math.Log(1 / 0.3)) + (1.5 * step));
        for (var i = 1; i < scan.Points.Count; i++)
        {
            // More machine brings more energy but a smaller plant factor, and each added kilowatt works less than the one before.
            Assert.True(scan.Points[i].AnnualEnergyKwh > scan.Points[i - 1].AnnualEnergyKwh);
            Assert.True(scan.Points[i].PlantFactor < scan.Points[i - 1].PlantFactor);
            Assert.True(scan.Points[i].HoursOfLastKw < scan.Points[i - 1].HoursOfLastKw * (1 + 1e-3));
            var middle = scan.Points[i].DesignFlowM3PerS - (step / 2);
            Assert.Equal(Math.Exp(-middle / mean), scan.Points[i].HoursOfLastKw / 8760, 0.004);
            Assert.Equal(Math.Exp(-scan.Points[i].DesignFlowM3PerS / mean), scan.Points[i].Exceedance, 1e-4);
        }
    }

    [Fact]
    public void A_steady_flow_is_taken_whole()
    {
        var scan = Scan(Plants.Constant(3));
        Assert.Equal(DesignFlowReason.LargestScanned, scan.Reason);
        Assert.Equal(3, scan.SuggestedM3PerS, 1e-12);
    }

    [Fact]
    public void A_pipe_too_small_for_the_flow_sets_the_size()
    {
        // H Q - k Q^3 is highest at sqrt(10/(3 x 0.4)) = 2.887 m3/s.
        var scan = Scan(Plants.Constant(12), Plants.Quadratic(0.4));
        Assert.Equal(DesignFlowReason.PipeLimits, scan.Reason);
        Assert.InRange(scan.SuggestedM3PerS, Math.Sqrt(10 / 1.2) - 0.3, Math.Sqrt(10 / 1.2) + 0.3);
    }

    [Fact]
    public void Where_water_runs_less_than_three_tenths_of_the_year_the_most_energy_is_taken()
    {
        var scan = Scan(Plants.Constant(3, 0.2));
        Assert.Equal(DesignFlowReason.MostEnergy, scan.Reason);
        Assert.Equal(3, scan.SuggestedM3PerS, 1e-9);
    }

    [Fact]
    public void Without_usable_water_nothing_is_suggested()
    {
        var scan = Scan(Plants.Constant(0));
        Assert.Equal(DesignFlowReason.NoUsableFlow, scan.Reason);
        Assert.Equal(0, scan.SuggestedM3PerS);
        Assert.Empty(scan.Points);
    }

    private static DesignFlowScan Scan(FlowDurationCurve curve, Waterway? waterway = null) => DesignFlowScan.Over(
        Plants.Site(), GrossHead.FromMetres(10), waterway ?? Plants.NoPipe, Plants.Lossless, Plants.Supply(curve),
        flow => new UnitSet(Plants.AnyType, Plants.FlatEfficiency(0.85), 0, 1, flow));
}
