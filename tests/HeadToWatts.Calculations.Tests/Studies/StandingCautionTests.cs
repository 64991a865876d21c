using HeadToWatts.Studies.Cautions;

namespace HeadToWatts.Calculations.Tests.Studies;

public class StandingCautionTests
{
    [Theory]
    [InlineData("29 CFR 1910.146")]
    [InlineData("29 CFR 1910.147")]
    [InlineData("29 CFR 1910.269")]
    [InlineData("NFPA 70")]
    [InlineData("IEEE 1547")]
    [InlineData("State dam safety")]
    [InlineData("fish agencies")]
    [InlineData("Licensed engineer")]
    [InlineData("local code")]
    public void Hazards_name_the_authority_for_each(string authority) =>
        Assert.Contains(StandingCautions.Hazards, h => h.Authority.Contains(authority, StringComparison.OrdinalIgnoreCase));

    [Theory]
    [InlineData("43 USC 485h(c)")]
    [InlineData("Pub. L. 113-24")]
    [InlineData("16 USC 823a")]
    [InlineData("Clean Water Act 404 and 401")]
    [InlineData("NHPA section 106")]
    [InlineData("State water-rights office")]
    [InlineData("IEEE 1547")]
    [InlineData("National and local law")]
    public void Permits_name_the_law(string authority) =>
        Assert.Contains(StandingCautions.Permits, p => p.Authority.Contains(authority, StringComparison.Ordinal));

    [Theory]
    [InlineData("Drowning")]
    [InlineData("Confined space")]
    [InlineData("Stored energy")]
    [InlineData("Electrocution")]
    [InlineData("Islanding")]
    [InlineData("trip")]
    [InlineData("surge")]
    [InlineData("Overspeed")]
    [InlineData("rack")]
    [InlineData("Ice")]
    [InlineData("Old drops")]
    [InlineData("Fish")]
    [InlineData("Trenching")]
    public void No_hazard_of_the_trade_is_left_out(string hazard) =>
        Assert.Contains(StandingCautions.Hazards, h => h.Title.Contains(hazard, StringComparison.OrdinalIgnoreCase));

    [Fact]
    public void The_period_and_the_limit_of_the_law_in_force_are_given_and_not_those_superseded()
    {
        // 16 USC 823a as amended in 2018: 15 days, then 30 to contest, up to 40 MW. The 45 days and 5 MW of 2013 are superseded.
        var law = Assert.Single(StandingCautions.Permits, p => p.Authority.Contains("823a", StringComparison.Ordinal)).Text;
        Assert.Contains("15 days", law);
        Assert.Contains("30 days", law);
        Assert.Contains("40 MW", law);
        Assert.DoesNotContain("45 days", law);
        Assert.DoesNotContain("5 MW", law);
    }

    [Fact]
    public void The_statement_says_what_the_result_is_and_is_not()
    {
        Assert.Equal("Screening, not for construction", StandingCautions.Status);
        Assert.All(["not a design", "not a feasibility study", "not legal advice", "no promise of energy or income", "Local codes govern", "licensed engineers"], words => Assert.Contains(words, StandingCautions.Statement));
        Assert.All(StandingCautions.Hazards.Concat(StandingCautions.Permits), c =>
        {
            Assert.True(c.Title.Length > 0 && c.Text.Length > 0 && c.Authority.Length > 0);
            Assert.DoesNotContain("permit-free", c.Text, StringComparison.OrdinalIgnoreCase);
            Assert.DoesNotContain("guarantee", c.Text, StringComparison.OrdinalIgnoreCase);
        });
    }
}
