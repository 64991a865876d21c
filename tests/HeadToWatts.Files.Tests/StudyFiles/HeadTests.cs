using HeadToWatts.Studies;

namespace HeadToWatts.Files.Tests.StudyFiles;

public class HeadTests
{
    private const string Gross = "\"gross\": \"60 ft\"";

    [Fact]
    public void A_gauge_reading_becomes_a_head_with_its_error()
    {
        var head = Samples.Input(Samples.With(Gross, "\"measured\": { \"gauge\": \"26 psi\", \"gaugeHeight\": \"2 ft\", \"error\": \"0.5 psi\" }")).Alternatives[0].Head;
        // 2.3077 ft of water a psi at 62.4 lbf/ft3 (144/62.4); the water here is at 50 degF and g at 44 degrees, 0.05 % apart.
        Assert.Equal(((26 * 2.3077) + 2) * 0.3048, head.Gross.Metres, 0.03);
        Assert.Equal(0.5 * 2.3077 * 0.3048, head.ErrorM, 0.001);
    }

    [Fact]
    public void Errors_of_steps_add_as_the_root_of_their_number()
    {
        var head = Samples.Input(Samples.With(Gross, "\"measured\": { \"steps\": [\"5 ft\", \"6 ft\", \"4 ft\", \"5 ft\"], \"error\": \"0.1 ft\" }")).Alternatives[0].Head;
        Assert.Equal(20 * 0.3048, head.Gross.Metres, 10);
        Assert.Equal(0.2 * 0.3048, head.ErrorM, 10);
    }

    [Fact]
    public void The_error_of_the_head_reaches_the_energy()
    {
        var input = Samples.Input(Samples.With(Gross, Gross + ", \"error\": \"3 ft\""));
        var result = Study.RunAll(input)[0];
        var range = result.Energy.WithHeadError!;
        // Energy goes nearly with net head: 3 ft of about 58 is some five percent.
        Assert.InRange(range.LowKwh / result.Energy.Annual.AnnualEnergyKwh, 0.93, 0.96);
        Assert.InRange(range.HighKwh / result.Energy.Annual.AnnualEnergyKwh, 1.04, 1.07);
        var higher = Study.RunAll(Samples.Input(Samples.With(Gross, "\"gross\": \"63 ft\"")))[0];
        Assert.Equal(1, range.HighKwh / higher.Energy.Annual.AnnualEnergyKwh, 9);
    }

    [Fact]
    public void On_a_pressure_pipe_the_machine_gets_what_may_be_taken()
    {
        var input = Samples.Input(Samples.With(Gross, """
            "upstreamPressure": { "gaugeElevation": "500 ft", "pressure": "100 psi" }, "downstreamPressure": { "gaugeElevation": "480 ft", "pressure": "40 psi" }
            """));
        // 20 ft of elevation and 60 psi at 2.3077 ft a psi.
        Assert.Equal((20 + (60 * 2.3077)) * 0.3048, input.Alternatives[0].Head.Gross.Metres, 0.1);
        Assert.True(Study.RunAll(input)[0].Energy.Annual.AnnualEnergyKwh > 0);
    }

    [Fact]
    public void A_tailwater_that_rises_with_the_flow_costs_energy()
    {
        var constant = Study.RunAll(Samples.Input(Samples.With(Gross, "\"headwater\": \"160 ft\", \"tailwater\": \"100 ft\"")))[0];
        var rising = Study.RunAll(Samples.Input(Samples.With(Gross, "\"headwater\": \"160 ft\", \"tailwaterRating\": [ { \"flow\": \"0 cfs\", \"level\": \"100 ft\" }, { \"flow\": \"40 cfs\", \"level\": \"108 ft\" } ]")))[0];
        Assert.True(rising.Energy.Annual.AnnualEnergyKwh < constant.Energy.Annual.AnnualEnergyKwh * 0.98);
        Assert.NotEmpty(rising.Head.Levels);
        Assert.Equal(0, rising.Energy.Annual.Water.ClosureError, 9);
        var steps = rising.Energy.Annual.Staircase;
        Assert.Equal(1, (steps.Steps.Sum(s => s.LossKwh) + rising.Energy.Annual.AnnualEnergyKwh) / steps.GrossKwh, 9);
    }

    [Theory]
    [InlineData("\"headwater\": \"160 ft\", \"tailwaterRating\": [ { \"flow\": \"0 cfs\", \"level\": \"100 ft\" }, { \"flow\": \"40 cfs\", \"level\": \"99 ft\" } ]", "tailwaterRating[1].level", "does not fall")]
    [InlineData("\"headwater\": \"160 ft\", \"tailwaterByMonth\": [\"100 ft\", \"101 ft\"]", "tailwaterByMonth", "twelve levels")]
    [InlineData("\"headwater\": \"160 ft\", \"headwaterCrest\": { \"elevation\": \"160 ft\", \"length\": \"10 ft\" }, \"tailwater\": \"100 ft\"", "headwater", "more than one way")]
    [InlineData("\"measured\": { \"error\": \"1 psi\" }", "measured", "by a gauge or by steps")]
    [InlineData("\"gross\": \"60 ft\", \"measured\": { \"gauge\": \"20 psi\" }", "head", "could disagree")]
    public void A_wrong_head_is_named(string replacement, string where, string why)
    {
        var problems = Samples.Problems(Samples.With(Gross, replacement));
        Assert.Contains(problems, p => p.Where.Contains(where, StringComparison.Ordinal) && p.Why.Contains(why, StringComparison.Ordinal));
    }

    [Fact]
    public void Months_without_a_record_are_said_aloud()
    {
        var months = string.Join(", ", Enumerable.Repeat("\"100 ft\"", 12));
        var input = Samples.Input(Samples.With(Gross, "\"headwater\": \"160 ft\", \"tailwaterByMonth\": [" + months + "]"));
        Assert.Contains(input.Alternatives[0].Assumptions, a => a.Contains("know no months", StringComparison.Ordinal));
    }
}
