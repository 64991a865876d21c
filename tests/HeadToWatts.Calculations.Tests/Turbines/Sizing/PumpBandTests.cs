using HeadToWatts.Turbines.Sizing;

namespace HeadToWatts.Calculations.Tests.Turbines.Sizing;

public class PumpBandTests
{
    [Fact]
    public void Each_correlation_gives_what_its_formula_says()
    {
        foreach (var row in CheckValueFile.OfMethod(PumpCorrelations.Method.Id).SelectMany(f => f.Rows))
        {
            var correlation = PumpCorrelations.All.Single(c => c.Name == row.Text("by"));
            row.Check(correlation.FlowRatio(row["pump_efficiency"]), "expected_flow_ratio");
            row.Check(correlation.HeadRatio(row["pump_efficiency"]), "expected_head_ratio");
        }
    }

    [Fact]
    public void A_turbine_takes_more_flow_and_more_head_than_the_pump_whoever_is_asked()
    {
        // Widely accepted of pumps as turbines: both ratios lie above one, and the worse the pump the more.
        foreach (var c in PumpCorrelations.All)
        {
            double lastFlow = double.PositiveInfinity, lastHead = double.PositiveInfinity;
            for (var e = 0.61; e <= 0.85; e += 0.01)
            {
                Assert.InRange(c.FlowRatio(e), 1, lastFlow);
                Assert.InRange(c.HeadRatio(e), 1, lastHead);
                (lastFlow, lastHead) = (c.FlowRatio(e), c.HeadRatio(e));
            }
        }
    }

    [Fact]
    public void The_pump_to_look_for_gives_this_site_back()
    {
        var looked = PumpBand.Of(null, 0.2, 45);
        Assert.Null(looked.Pump);
        foreach (var e in looked.Estimates)
        {
            var back = PumpBand.Of(new PumpPoint(e.FlowM3PerS, e.HeadM, looked.PumpEfficiency, 1750), 0.2, 45);
            var same = back.Estimates.Single(b => b.Correlation == e.Correlation);
            Assert.Equal(0.2, same.FlowM3PerS, 1e-12);
            Assert.Equal(45, same.HeadM, 1e-9);
            Assert.True(back.HoldsSite);
        }

        Assert.False(PumpBand.Of(new PumpPoint(0.2, 45, 0.75, 1750), 0.1, 45).HoldsSite);
    }
}
