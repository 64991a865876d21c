using HeadToWatts.Turbines;

namespace HeadToWatts.Calculations.Tests.Turbines;

public class SpecificSpeedTests
{
    private const double FootM = 0.3048;
    private const double UsGallonM3 = 231 * 0.0254 * 0.0254 * 0.0254;

    [Fact]
    public void In_kilowatts_and_metres_it_gives_the_printed_values()
    {
        foreach (var row in Rows(TurbineMethods.SpecificSpeedKwM.Id))
            row.Check(SpecificSpeed.KwM(row["speed_rpm"], row["power_kw"], row["net_head_m"]));
    }

    [Fact]
    public void In_horsepower_and_feet_it_gives_the_printed_values()
    {
        foreach (var row in Rows(TurbineMethods.SpecificSpeedUsHpFt.Id))
        {
            if (row.Has("power_mw"))
            {
                row.Check(SpecificSpeed.UsHpFt(row["speed_rpm"], row["power_mw"] * 1000 / SpecificSpeed.UsHorsepowerKw, row["net_head_m"] / FootM));
                continue;
            }

            // 62.4 lbf/ft3 and 550 ft lbf/s a horsepower: common practice, no source.
            var powerHp = 62.4 * row["flow_cfs"] * row["net_head_ft"] * row["efficiency"] / 550 / row["units"];
            row.Check(SpecificSpeed.UsHpFt(row["speed_rpm"], powerHp, row["net_head_ft"]));
        }
    }

    [Fact]
    public void Without_dimension_it_gives_the_printed_ratio_to_other_forms()
    {
        foreach (var row in Rows(TurbineMethods.SpecificSpeedDimensionless.Id))
        {
            if (row.Has("efficiency"))
            {
                row.Check(SpecificSpeed.KwMFromDimensionless(1, row["efficiency"], row["density_kg_per_m3"], row["gravity_m_per_s2"]));
                continue;
            }

            var flowM3PerS = row["flow_gpm"] * UsGallonM3 / 60;
            var energyJPerKg = 9.80665 * row["head_ft"] * FootM;
            row.Check(Math.Tau * SpecificSpeed.Dimensionless(row["speed_rpm"], flowM3PerS, energyJPerKg) / row["us_specific_speed"]);
        }
    }

    [Fact]
    public void By_power_in_radians_it_gives_the_printed_value()
    {
        foreach (var row in Rows(TurbineMethods.PowerSpecificSpeed.Id))
            row.Check(SpecificSpeed.PowerRad(row["speed_rpm"], row["power_w"], row["density_kg_per_m3"], row["gravity_m_per_s2"] * row["head_m"]));
    }

    [Fact]
    public void Conversions_have_the_factors_of_unit_algebra()
    {
        foreach (var row in Rows(TurbineMethods.SpecificSpeedConversions.Id))
        {
            row.Check(row.Text("conversion") switch
            {
                "us-to-metric-hp" => SpecificSpeed.MetricHpMFromUsHpFt(1),
                "us-to-kw" => SpecificSpeed.KwMFromUsHpFt(1),
                "kw-to-metric-hp" => SpecificSpeed.MetricHpMFromKwM(1),
                "kw-to-us" => SpecificSpeed.UsHpFtFromKwM(1),
                var other => throw new InvalidOperationException(other),
            });
        }
    }

    [Fact]
    public void All_forms_describe_the_same_machine()
    {
        // One machine put into each form by its own units; the forms must convert into one another.
        const double rpm = 375, powerKw = 850, headM = 18, flowM3PerS = 5.3, density = 999.7, gravity = 9.80;
        var kw = SpecificSpeed.KwM(rpm, powerKw, headM);
        Assert.Equal(kw, SpecificSpeed.KwMFromMetricHpM(SpecificSpeed.MetricHpM(rpm, powerKw / SpecificSpeed.MetricHorsepowerKw, headM)), 1e-9);
        Assert.Equal(kw, SpecificSpeed.KwMFromUsHpFt(SpecificSpeed.UsHpFt(rpm, powerKw / SpecificSpeed.UsHorsepowerKw, headM / FootM)), 1e-9);
        var efficiency = powerKw * 1000 / (density * gravity * flowM3PerS * headM);
        Assert.Equal(kw, SpecificSpeed.KwMFromDimensionless(SpecificSpeed.Dimensionless(rpm, flowM3PerS, gravity * headM), efficiency, density, gravity), 1e-9);
        Assert.Equal(rpm, SpecificSpeed.SpeedRpm(kw, powerKw, headM), 1e-9);
    }

    [Fact]
    public void The_horsepowers_are_those_of_their_definitions()
    {
        // Common practice, no source: 745.7 W and 735.5 W.
        Assert.Equal(0.7457, SpecificSpeed.UsHorsepowerKw, 5e-5);
        Assert.Equal(0.7355, SpecificSpeed.MetricHorsepowerKw, 5e-5);
    }

    [Fact]
    public void A_speed_follows_from_a_specific_speed_as_printed()
    {
        // P. K. Nag, Power Plant Engineering, Ex. 10.14 p. 722: N_s 210, 0.6 m3/s, 4.5 m, efficiency 0.88 give 285 rpm.
        Assert.Equal(285, SpecificSpeed.SpeedRpm(210, 9.81 * 0.6 * 4.5 * 0.88, 4.5), 1.0);
    }

    [Fact]
    public void Jets_share_the_power()
    {
        // With four jets each has a quarter of the power, so half the specific speed.
        var whole = SpecificSpeed.KwM(600, 400, 150);
        Assert.Equal(SpecificSpeed.KwM(600, 100, 150), SpecificSpeed.PerJetKwM(whole, 4), 1e-12);
    }

    [Theory]
    [InlineData(double.NaN)]
    [InlineData(0)]
    [InlineData(-1)]
    [InlineData(double.PositiveInfinity)]
    public void What_is_not_a_positive_number_is_refused(double value)
    {
        Assert.Throws<ArgumentOutOfRangeException>(() => SpecificSpeed.KwM(value, 1, 1));
        Assert.Throws<ArgumentOutOfRangeException>(() => SpecificSpeed.KwM(1, value, 1));
        Assert.Throws<ArgumentOutOfRangeException>(() => SpecificSpeed.KwM(1, 1, value));
        Assert.Throws<ArgumentOutOfRangeException>(() => SpecificSpeed.Dimensionless(1, value, 1));
        Assert.Throws<ArgumentOutOfRangeException>(() => SpecificSpeed.PowerRad(1, 1, value, 1));
    }

    private static List<CheckRow> Rows(string methodId)
    {
        var rows = CheckValueFile.OfMethod(methodId).SelectMany(f => f.Rows).ToList();
        Assert.NotEmpty(rows);
        return rows;
    }
}
