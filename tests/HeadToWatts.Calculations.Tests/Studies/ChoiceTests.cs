using HeadToWatts.FlowRecords;
using HeadToWatts.Studies;

namespace HeadToWatts.Calculations.Tests.Studies;

public class ChoiceTests
{
    [Fact]
    public void What_the_author_gives_is_kept_and_what_is_left_open_is_suggested()
    {
        var given = TestStudies.Quiet.WithType("crossflow", 3).Run();
        Assert.Equal(("crossflow", 3, 1.8), (given.Turbine.Chosen.Type.Id, given.Turbine.Units.UnitCount, given.Flow.DesignFlowM3PerS));
        Assert.False(given.Turbine.TypeIsSuggested);
        Assert.False(given.Turbine.UnitCountIsSuggested);
        Assert.False(given.Flow.DesignFlowIsSuggested);

        var open = TestStudies.Quiet.WithFlow(f => f with { DesignFlowM3PerS = null }).Run();
        Assert.True(open.Turbine.TypeIsSuggested);
        Assert.True(open.Flow.DesignFlowIsSuggested);
        Assert.Equal(open.Turbine.Ranking[0], open.Turbine.Chosen);
        Assert.Equal(open.Flow.Scan.SuggestedM3PerS, open.Flow.DesignFlowM3PerS);

        // The suggestion is settled: the type ranked first at the suggested flow is the one the flow was suggested for.
        var again = TestStudies.Quiet.WithFlow(f => f with { DesignFlowM3PerS = open.Flow.DesignFlowM3PerS }).Run();
        Assert.Equal(open.Turbine.Chosen.Type.Id, again.Turbine.Chosen.Type.Id);
    }

    [Fact]
    public void A_manufacturers_table_and_least_flow_take_the_place_of_the_typical_ones()
    {
        var input = TestStudies.Quiet.WithMakersEfficiency(0.5);
        var half = (input with { Turbine = input.Turbine with { LeastFlowRatio = 0.6 } }).Run();
        Assert.True(half.Turbine.EfficiencyIsMakers);
        Assert.Equal(0.5, half.Energy.Plant.At(1.8).TurbineEfficiency, 1e-12);
        Assert.Equal(0.6, half.Turbine.Units.LeastFlowRatio);
        Assert.False(half.Energy.Plant.At(0.59 * 1.8 / half.Turbine.Units.UnitCount).IsRunning);
    }

    [Fact]
    public void Rows_typed_for_the_season_are_dry_for_the_rest_of_the_year()
    {
        var season = OperatingSeason.Months([4, 5, 6, 7, 8, 9, 10]);
        var forSeason = TestStudies.Quiet.WithCurve(BeyondLastRow.Hold, new(0, 2.8), new(1, 1.2)).WithFlow(f => f with { RowsAreForSeason = true, Season = season }).Run();
        var forYear = TestStudies.Quiet.WithCurve(BeyondLastRow.Hold, new(0, 2.8), new(1, 1.2)).Run();
        Assert.Equal(214 / 365.0, forSeason.Energy.Annual.AnnualEnergyKwh / forYear.Energy.Annual.AnnualEnergyKwh, 1e-6);
    }

    [Fact]
    public void A_study_needs_a_curve_or_a_record() =>
        Assert.Throws<InvalidOperationException>(() => TestStudies.Quiet.WithFlow(f => f with { Record = null }).Run());

    [Fact]
    public void Every_alternative_is_run()
    {
        var results = Study.RunAll(new(TestStudies.Header, [TestStudies.Quiet, TestStudies.Quiet.WithHead(40) with { Name = "lower" }]));
        Assert.Equal(["quiet", "lower"], results.Select(r => r.Input.Name));
        Assert.True(results[1].Energy.Annual.AnnualEnergyKwh < results[0].Energy.Annual.AnnualEnergyKwh);
    }
}
