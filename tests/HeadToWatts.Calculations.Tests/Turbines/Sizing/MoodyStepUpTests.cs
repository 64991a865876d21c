using HeadToWatts.Turbines;
using HeadToWatts.Turbines.Sizing;

namespace HeadToWatts.Calculations.Tests.Turbines.Sizing;

public class MoodyStepUpTests
{
    [Fact]
    public void A_larger_runner_has_the_efficiency_of_the_textbooks()
    {
        foreach (var row in CheckValueFile.OfMethod(MoodyStepUp.Method.Id).SelectMany(f => f.Rows))
            row.Check(MoodyStepUp.EfficiencyAt(row["tested"], row["tested_diameter"], row["diameter"]));
    }

    [Fact]
    public void A_curve_is_raised_by_the_change_of_its_peak_and_stays_below_one()
    {
        var curve = EfficiencyCurve.FromTable([(0.4, 0.7), (0.8, 0.893), (1, 0.88)], "maker").Value;
        var up = MoodyStepUp.Of(curve, 2, 6);
        Assert.Equal(0.0211, up.PeakChange, 1e-3);
        var raised = curve.Shifted(up.PeakChange);
        Assert.Equal(curve.At(0.4) + up.PeakChange, raised.At(0.4), 1e-12);
        Assert.True(curve.Shifted(0.5).Points.All(p => p.Efficiency <= 1));
        Assert.True(curve.Shifted(-0.9).Points.All(p => p.Efficiency >= 0));
        Assert.Equal(0, MoodyStepUp.Of(curve, 2, 2).PeakChange, 1e-12);
        Assert.Throws<ArgumentOutOfRangeException>(() => MoodyStepUp.EfficiencyAt(0.9, 0, 1));
    }
}
