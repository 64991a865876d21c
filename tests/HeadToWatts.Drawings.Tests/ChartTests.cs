using HeadToWatts.Basis.Units;
using HeadToWatts.Drawings.Canvas;
using HeadToWatts.Studies;

namespace HeadToWatts.Drawings.Tests;

public sealed class ChartTests
{
    private static IEnumerable<StudyResult> Studies => Scenarios.Names.Select(Scenarios.Get);

    [Fact]
    public void The_parts_of_the_flow_add_up_to_the_flow_at_every_point()
    {
        foreach (var result in Studies)
        {
            foreach (var share in FlowDurationChart.InputOf(result).Shares)
            {
                Assert.True(share is { TurbineFlowM3PerS: >= 0, SpilledFlowM3PerS: >= -1e-12, BelowMinimumFlowM3PerS: >= 0, ReservedFlowM3PerS: >= 0 });
                var arriving = result.Flow.Curve.FlowAt(share.Exceedance);
                if (share.Exceedance is > 0 and < 1 && result.Flow.Curve.Points.All(p => Math.Abs(p.Exceedance - share.Exceedance) > 1e-9))
                    Assert.Equal(arriving, share.TotalFlowM3PerS, arriving * 0.02);
            }
        }
    }

    [Fact]
    public void The_area_through_the_turbines_is_the_water_that_the_study_turbines()
    {
        // The integral over the drawn points against the study's own, which is refined until it is exact.
        foreach (var result in Studies)
        {
            var shares = FlowDurationChart.InputOf(result).Shares;
            var mean = 0.0;
            for (var i = 1; i < shares.Count; i++)
                mean += (shares[i].Exceedance - shares[i - 1].Exceedance) * (shares[i].TurbineFlowM3PerS + shares[i - 1].TurbineFlowM3PerS) / 2;
            Assert.Equal(result.Energy.Annual.Integral.TurbineFlowM3PerS, mean, result.Energy.Annual.Integral.TurbineFlowM3PerS * 0.005);
        }
    }

    [Fact]
    public void Exceedance_never_falls_from_point_to_point()
    {
        foreach (var result in Studies)
        {
            var shares = FlowDurationChart.InputOf(result).Shares;
            for (var i = 1; i < shares.Count; i++)
                Assert.True(shares[i].Exceedance >= shares[i - 1].Exceedance);
        }
    }

    [Fact]
    public void A_canal_that_is_dry_in_winter_says_so()
    {
        var drawing = FlowDurationChart.Draw(Scenarios.Get("canal drop"), Scenarios.Get("canal drop").Show(), DrawingSize.Half);
        Assert.Contains(drawing.Operations.OfType<TextOperation>(), t => t.Content.Contains("1 Apr to 15 Oct", StringComparison.Ordinal));
    }

    [Fact]
    public void A_flood_is_cut_off_and_its_height_stated()
    {
        var drawing = FlowDurationChart.Draw(Scenarios.Get("flashy stream"), Scenarios.Get("flashy stream").Show(), DrawingSize.Half);
        Assert.Contains(drawing.Operations.OfType<TextOperation>(), t => t.Content == "up to 90 m3/s");
    }

    [Fact]
    public void The_design_flow_line_names_flow_and_exceedance()
    {
        // Canal drop: 140 cfs is a row of the curve at 25 %.
        var drawing = FlowDurationChart.Draw(Scenarios.Get("canal drop"), Scenarios.Get("canal drop").Show(), DrawingSize.Half);
        Assert.Contains(drawing.Operations.OfType<TextOperation>(), t => t.Content == "design flow 140 cfs, exceeded 25 %");
    }

    [Fact]
    public void The_chosen_type_is_the_only_one_in_water_blue()
    {
        foreach (var result in Studies)
        {
            var drawing = EnvelopeChart.Draw(result, result.Show(), DrawingSize.Half);
            var labels = drawing.Operations.OfType<TextOperation>().Where(t => t.Style.Role == InkRole.Water).Select(t => t.Content);
            Assert.Equal([result.Turbine.Chosen.Type.Name], labels);
            Assert.Contains(result.Turbine.Chosen.Type.Name, drawing.Description, StringComparison.Ordinal);
        }
    }

    [Fact]
    public void A_dry_site_has_envelopes_all_the_same()
    {
        // Nothing flows and nothing falls: logarithmic axes must not be asked for zero.
        var input = EnvelopeChart.InputOf(Scenarios.Get("canal drop")) with { Site = new HeadAndFlow(0, 0), Range = [new HeadAndFlow(0, 5)] };
        var drawing = EnvelopeChart.Draw(input, UnitDisplay.For(UnitSystem.SI), DrawingSize.Half);
        Assert.NotEmpty(SvgWriter.Write(drawing, "a"));
    }

    [Fact]
    public void Power_and_design_flow_are_named_with_the_numbers_of_the_study()
    {
        foreach (var result in Studies)
        {
            var show = result.Show();
            var atDesign = result.Energy.Plant.At(result.Flow.DesignFlowM3PerS);
            var power = PowerChart.Draw(result, show, DrawingSize.Half);
            Assert.Contains(UnitDisplay.Power(atDesign.MeterPowerKw), power.Description, StringComparison.Ordinal);
            Assert.Contains(show.Length(atDesign.NetHeadM), power.Description, StringComparison.Ordinal);
            var design = DesignFlowChart.Draw(result, show, DrawingSize.Half);
            Assert.NotNull(design);
            Assert.Contains(UnitDisplay.Energy(result.Energy.Annual.AnnualEnergyKwh), design.Description, StringComparison.Ordinal);
        }
    }

    [Fact]
    public void Bars_of_the_months_are_as_high_as_their_energy()
    {
        var result = Scenarios.Get("farm creek");
        var drawing = MonthsChart.Draw(result, DrawingSize.Half);
        Assert.NotNull(drawing);
        var bars = drawing.Operations.OfType<RectangleOperation>().ToList();
        var months = result.Energy.Days!.Months;
        Assert.Equal(12, bars.Count);
        var perKwh = bars[0].Height / months[0].MeanEnergyKwh;
        for (var i = 0; i < 12; i++)
            Assert.Equal(months[i].MeanEnergyKwh * perKwh, bars[i].Height, 0.001);
    }

    [Fact]
    public void Without_a_record_there_are_no_months_and_without_a_pipe_no_losses()
    {
        Assert.Null(MonthsChart.Draw(Scenarios.Get("canal drop"), DrawingSize.Half));
        var drop = Scenarios.Get("drop without pipe");
        Assert.Null(LossShareChart.Draw(drop, drop.Show(), DrawingSize.Half));
    }

    [Fact]
    public void Months_without_energy_are_said_to_have_none()
    {
        var months = Enumerable.Range(1, 12).Select(m => new MonthEnergy(m, m is >= 5 and <= 9 ? 40_000 : 0, m is >= 5 and <= 9 ? 30_000 : null, m is >= 5 and <= 9 ? 47_000 : null));
        var drawing = MonthsChart.Draw(new MonthsInput([.. months], "dry to wet year"), DrawingSize.Half);
        Assert.Equal(2, drawing.Operations.OfType<TextOperation>().Count(t => t.Content == "none"));
        Assert.Equal(5, drawing.Operations.OfType<RectangleOperation>().Count());
        Assert.Contains("200 MWh", drawing.Description, StringComparison.Ordinal);
    }

    [Fact]
    public void Many_fittings_are_gathered_and_nothing_is_left_out_of_the_sum()
    {
        var shares = Enumerable.Range(1, 20).Select(i => new LossShare("fitting " + i, 0.1 * i, i == 20)).ToList();
        var drawing = LossShareChart.Draw(new LossShareInput(shares, 100, 1), UnitDisplay.For(UnitSystem.SI), DrawingSize.Half);
        Assert.Equal(12, drawing.Operations.OfType<RectangleOperation>().Count());
        Assert.Contains("9 others", drawing.Description, StringComparison.Ordinal);
        Assert.Contains("together 21.0 m, 21 % of the gross head", drawing.Description, StringComparison.Ordinal);
    }

    [Fact]
    public void What_goes_through_the_turbines_is_named_inside_its_area()
    {
        foreach (var result in Studies)
        {
            foreach (var size in AllDrawings.Sizes.Values)
            {
                var drawing = FlowDurationChart.Draw(result, result.Show(), size);
                var label = Assert.Single(drawing.Operations.OfType<TextOperation>(), t => t.Content == "through the turbine");
                Assert.Equal(TextAnchor.Middle, label.Style.Anchor);
            }
        }
    }
}
