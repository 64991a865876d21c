using HeadToWatts.Hydraulics.Water;
using HeadToWatts.Turbines;
using HeadToWatts.Turbines.Sizing;

namespace HeadToWatts.Calculations.Tests.Turbines.Sizing;

public class RunnerSettingTests
{
    private const double PsiPerFoot = 62.4 / 144;

    [Fact]
    public void Critical_coefficients_are_those_of_the_handbook()
    {
        foreach (var row in CheckValueFile.OfMethod(RunnerSetting.CriticalSigma.Id).SelectMany(f => f.Rows))
            row.Check(RunnerSetting.CriticalThomaSigma(row.Text("kind") == "francis" ? RunnerFlow.Mixed : RunnerFlow.Axial, row["specific_speed_us"]));
    }

    [Fact]
    public void Between_the_rows_the_coefficient_never_falls_as_the_runner_gets_faster()
    {
        foreach (var flow in Enum.GetValues<RunnerFlow>())
        {
            var last = 0.0;
            for (var n = 10.0; n < 260; n *= 1.03)
            {
                var sigma = RunnerSetting.CriticalThomaSigma(flow, n);
                Assert.True(sigma > last);
                last = sigma;
            }
        }
    }

    [Fact]
    public void The_highest_setting_is_that_of_the_textbooks()
    {
        foreach (var row in CheckValueFile.OfMethod(RunnerSetting.Highest.Id).SelectMany(f => f.Rows))
            row.Check(RunnerSetting.HighestAboveTailwaterM(row["air_psi"] / PsiPerFoot, row["vapour_psi"] / PsiPerFoot, row["sigma"], row["head_ft"]), "expected_ft");
    }

    [Fact]
    public void Altitude_warmth_head_and_speed_each_lower_the_setting()
    {
        double Highest(double elevationM, double temperatureDegC, double headM, double specificSpeedKwM)
        {
            var site = SiteConditions.At(0.75, elevationM, temperatureDegC);
            return RunnerSetting.Of(RunnerFlow.Mixed, specificSpeedKwM, headM, site.AtmosphericPressurePa / site.SpecificWeightNPerM3, site.Water.VapourPressurePa / site.SpecificWeightNPerM3).HighestM;
        }

        var at = Highest(0, 10, 40, 200);
        Assert.True(Highest(2000, 10, 40, 200) < at - 1.5);
        Assert.True(Highest(0, 30, 40, 200) < at);
        Assert.True(Highest(0, 10, 50, 200) < at);
        Assert.True(Highest(0, 10, 40, 250) < at);
    }

    [Fact]
    public void The_use_says_when_the_table_was_left()
    {
        Assert.Single(RunnerSetting.Of(RunnerFlow.Mixed, 40, 100, 10, 0.1).Uses[0].OutOfRange());
        Assert.Empty(RunnerSetting.Of(RunnerFlow.Mixed, 200, 100, 10, 0.1).Uses[0].OutOfRange());
        Assert.Throws<ArgumentOutOfRangeException>(() => RunnerSetting.CriticalThomaSigma(RunnerFlow.Axial, double.NaN));
    }
}
