using HeadToWatts.Basis.Units;
using HeadToWatts.Files.Demonstrations;
using HeadToWatts.Files.StudyFiles;
using HeadToWatts.FlowRecords;
using HeadToWatts.FlowRecords.Reserved;
using HeadToWatts.Studies;

namespace HeadToWatts.Files.Tests.StudyFiles;

/// <summary>What comes off the flow before the plant, from the study file to the energy.</summary>
public class WaterRulesTests
{
    private const double Cfs = 0.028316846592;
    private static readonly UnitDisplay Si = UnitDisplay.For(UnitSystem.SI, 1);

    [Theory]
    [InlineData("none", ReservedFlowKind.None, 0, 0)]
    [InlineData("2 cfs", ReservedFlowKind.Constant, 2, 0)]
    [InlineData("20 %", ReservedFlowKind.PercentOfFlow, 0, 0.2)]
    [InlineData("20 %, at least 2 cfs", ReservedFlowKind.PercentWithFloor, 2, 0.2)]
    [InlineData("20 % at least 2 cfs", ReservedFlowKind.PercentWithFloor, 2, 0.2)]
    [InlineData("Q95", ReservedFlowKind.Constant, 5, 0)]
    [InlineData("70 % of q95", ReservedFlowKind.Constant, 3.5, 0)]
    public void A_rule_in_words_becomes_that_rule(string text, ReservedFlowKind kind, double flowCfs, double ratio)
    {
        var reserved = Flow("\"reservedFlow\": \"2 cfs\"", $"\"reservedFlow\": \"{text}\"").Allocation.Reserved;
        Assert.Equal(kind, reserved.Kind);
        Assert.Equal(flowCfs * Cfs, reserved.FlowM3PerS, 1e-12);
        Assert.Equal(ratio, reserved.Ratio, 1e-12);
    }

    // Mean of the sample's curve by hand: 40 cfs to 10 %, straight to 20 at 50 % and 5 at 95 %, held to the end:
    // 4 + 12 + 5.625 + 0.25 = 21.875 cfs; Tennant's poor level is a tenth of it all year (Tennant 1976, table 1).
    [Fact]
    public void Tennants_poor_level_is_a_tenth_of_the_mean_annual_flow_all_year() =>
        Assert.Equal(2.1875 * Cfs, Flow("\"reservedFlow\": \"2 cfs\"", "\"reservedFlow\": \"Tennant poor\"").Allocation.Reserved.FlowM3PerS, 1e-9);

    [Theory]
    [InlineData("Tennant good", "know no months")]
    [InlineData("Tennant lavish", "level of Tennant's table")]
    [InlineData("7Q10", "needs a daily record")]
    [InlineData("half of it", "rule of reserved flow is not known")]
    [InlineData("20 %, at least some", "")]
    public void What_cannot_be_used_is_refused_with_what_is_accepted(string text, string why)
    {
        var problem = Assert.Single(Samples.Problems(Samples.With("\"reservedFlow\": \"2 cfs\"", $"\"reservedFlow\": \"{text}\"")));
        Assert.Equal("alternatives[0].flow.reservedFlow", problem.Where);
        Assert.Contains(why, problem.Why, StringComparison.Ordinal);
        Assert.NotEmpty(problem.Accepted);
    }

    [Fact]
    public void Every_problem_of_turnouts_right_and_loss_is_reported_together()
    {
        var problems = Samples.Problems(Samples.With(
            "\"reservedFlow\": \"2 cfs\"",
            "\"reservedFlow\": \"2\", \"lossToSite\": \"120 %\", \"turnouts\": [ { \"name\": \"Ames\" }, { \"flow\": \"3 cfs\", \"season\": \"sometimes\" } ], \"waterRight\": { }"));
        Assert.Equal(
            ["flow.lossToSite", "flow.reservedFlow", "flow.turnouts[0].flow", "flow.turnouts[1].season", "flow.waterRight"],
            problems.Select(p => p.Where["alternatives[0].".Length..]).Order(StringComparer.Ordinal));
    }

    [Fact]
    public void The_loss_on_the_way_comes_off_before_all_else()
    {
        var flow = Flow("\"reservedFlow\": \"2 cfs\"", "\"reservedFlow\": \"none\", \"lossToSite\": \"10 % and 1 cfs\"");
        // 20 cfs at the gauge: 20 x 0.9 - 1 = 17 cfs.
        Assert.Equal(17 * Cfs, flow.CurveOfYear().FlowAt(0.5), 1e-9);
        Assert.Equal("10.0 % of the flow and 0.0283 m3/s", WaterWords.Loss(flow.Rules!.Seepage, Si));
    }

    [Fact]
    public void The_right_caps_what_the_plant_may_use()
    {
        var flow = Flow("\"reservedFlow\": \"2 cfs\"", "\"reservedFlow\": \"2 cfs\", \"waterRight\": { \"rate\": \"12 cfs\" }");
        var split = flow.Allocation.Split(40 * Cfs);
        Assert.Equal(12 * Cfs, split.UsableM3PerS, 1e-12);
        Assert.Equal(28 * Cfs, split.ReservedM3PerS, 1e-12);
    }

    [Fact]
    public void Turnouts_by_month_take_energy_in_their_months_only_and_curve_and_days_agree()
    {
        var site = DemoSites.All.Select(s => s.Load()).First(d => d.Alternatives[0].Flow.Record is not null);
        site.Alternatives[0].Flow.Turnouts = null;
        var free = Run(site);
        site.Alternatives[0].Flow.Turnouts = [new TurnoutDocument { Name = "Ames ditch", Flow = "15 cfs", Season = "Jul 1 to Aug 31" }];
        var taken = Run(site);
        for (var m = 0; m < 12; m++)
            Assert.Equal(m is 6 or 7, taken.Energy.Days!.Months[m].MeanEnergyKwh < free.Energy.Days!.Months[m].MeanEnergyKwh * 0.9999);
        Assert.Contains("Ames ditch", WaterWords.Deliveries(taken.Input.Flow, Si)[^1], StringComparison.Ordinal);
        Assert.Contains("in Jul to Aug", WaterWords.Deliveries(taken.Input.Flow, Si)[^1], StringComparison.Ordinal);
    }

    [Fact]
    public void A_month_taken_in_part_counts_whole_and_the_study_says_so()
    {
        var site = DemoSites.All.Select(s => s.Load()).First(d => d.Alternatives[0].Flow.Record is not null);
        site.Alternatives[0].Flow.Turnouts = [new TurnoutDocument { Name = "Ames ditch", Flow = "15 cfs", Season = "Jul 10 to Aug 31" }];
        var input = StudyBuilder.Build(site, NoFlowFiles.Instance).Value.Alternatives[0];
        Assert.Contains(input.Assumptions, a => a.Contains("Ames ditch is taken for part of July", StringComparison.Ordinal));
        Assert.Equal(15 * Cfs, input.Flow.Rules!.Deliveries[^1].FlowsM3PerS[6], 1e-9);
    }

    [Fact]
    public void Tennants_good_level_of_a_record_changes_by_season()
    {
        var site = DemoSites.All.Select(s => s.Load()).First(d => d.Alternatives[0].Flow.Record is not null);
        (site.Alternatives[0].Flow.ReservedFlow, site.Alternatives[0].Flow.ReservedByMonth) = ("Tennant good", null);
        var flow = StudyBuilder.Build(site, NoFlowFiles.Instance).Value.Alternatives[0].Flow;
        var rule = Assert.IsType<TennantReserved>(flow.Rules!.Reserved);
        // Tennant 1976, table 1: good is 20 % from October to March and 40 % from April to September.
        Assert.Equal(0.2 * rule.MeanAnnualFlowM3PerS, flow.AllocationIn(1).Reserved.FlowM3PerS, 1e-12);
        Assert.Equal(0.4 * rule.MeanAnnualFlowM3PerS, flow.AllocationIn(7).Reserved.FlowM3PerS, 1e-12);
    }

    [Fact]
    public void A_right_outside_the_season_is_refused()
    {
        var site = DemoSites.All.Select(s => s.Load()).First(d => d.Alternatives[0].Flow.Record is not null);
        site.Alternatives[0].Flow.Season = "Apr 15 to Oct 15";
        site.Alternatives[0].Flow.WaterRight = new WaterRightDocument { Season = "Dec 1 to Feb 28" };
        var problem = Assert.Single(StudyBuilder.Build(site, NoFlowFiles.Instance).Problems);
        Assert.EndsWith("flow.waterRight.season", problem.Where, StringComparison.Ordinal);
    }

    private static HeadToWatts.Studies.Inputs.FlowInput Flow(string old, string replacement) => Samples.Input(Samples.With(old, replacement)).Alternatives[0].Flow;

    private static StudyResult Run(StudyDocument site) => Study.RunAll(StudyBuilder.Build(site, NoFlowFiles.Instance).Value)[0];
}
