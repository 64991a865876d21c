using HeadToWatts.Basis.Units;
using HeadToWatts.FlowRecords;
using HeadToWatts.Studies;
using HeadToWatts.Studies.Cautions;

namespace HeadToWatts.Calculations.Tests.Studies;

/// <summary>The invented sites of sitedata, run from their files.</summary>
public class SiteTests
{
    private static readonly Dictionary<string, StudyResult> Results = TestStudies.Sites.ToDictionary(s => s, s => TestStudies.RunSite(s)[0]);

    public static TheoryData<string> Sites => new(TestStudies.Sites);

    [Theory]
    [MemberData(nameof(Sites))]
    public void Water_closes_energy_adds_up_and_the_plant_is_worth_a_look(string site)
    {
        var result = Results[site];
        var annual = result.Energy.Annual;
        Assert.Equal(0, annual.Water.ClosureError, 1e-9);
        Assert.Equal(annual.AnnualEnergyKwh, annual.Staircase.Steps[^1].LeftKwh, 1e-9 * annual.AnnualEnergyKwh);
        Assert.InRange(annual.PlantFactor, 0.25, 0.95);
        Assert.InRange(result.Waterway.LossShareOfGrossHead, 0.005, 0.15);
        Assert.True(result.Turbine.Chosen.Fit.IsInside);
        Assert.DoesNotContain(CautionRules.For(result, result.Show()), c => c.Severity == Severity.SettleFirst && c.Id != "no-reserved-flow");
    }

    [Theory]
    [MemberData(nameof(Sites))]
    public void Losses_agree_with_another_formula(string site)
    {
        // Swamee and Jain state 1 percent of Colebrook-White for the roughness and Reynolds numbers of pipes; 3 percent is kept for smooth ones.
        var result = Results[site];
        var sum = 0.0;
        foreach (var e in result.Waterway.AtDesign.Elements)
        {
            var f = 0.25 / Math.Pow(Math.Log10((e.RelativeRoughness / 3.7) + (5.74 / Math.Pow(e.Reynolds, 0.9))), 2);
            var velocity = result.Flow.DesignFlowM3PerS / (Math.PI / 4 * e.Element.InsideDiameterM * e.Element.InsideDiameterM);
            sum += f * e.Element.LengthM / e.Element.InsideDiameterM * velocity * velocity / (2 * result.Site.GravityMPerS2);
        }

        Assert.Equal(sum, result.Waterway.AtDesign.FrictionLossM, 0.03 * sum);
        Assert.Equal(result.Head.GrossHeadM - result.Waterway.AtDesign.TotalLossM, result.Head.NetHeadAtDesignM, 1e-9);
    }

    [Theory]
    [MemberData(nameof(Sites))]
    public void Energy_agrees_with_a_plain_sum_over_many_equal_shares_of_the_year(string site)
    {
        const int shares = 20_000;
        var result = Results[site];
        var (curve, allocation, train) = (result.Input.Flow.EnergyCurve(), result.Input.Flow.Allocation, result.Input.Train);
        var sum = 0.0;
        for (var i = 0; i < shares; i++)
        {
            var arriving = curve.FlowAt((i + 0.5) / shares);
            var reserved = allocation.Reserved.FlowM3PerS + (allocation.Reserved.Ratio * arriving);
            var usable = Math.Max(0, arriving - allocation.PriorDeliveriesM3PerS - reserved);
            var point = result.Energy.Plant.At(usable);
            var shaft = result.Site.SpecificWeightNPerM3 / 1000 * point.TurbineFlowM3PerS * (result.Head.GrossHeadM - result.Waterway.Waterway.LossM(point.TurbineFlowM3PerS, result.Site)) * point.TurbineEfficiency;
            if (point.IsRunning)
                sum += ((shaft * train.DriveEfficiency * train.GeneratorEfficiency * (1 - train.OwnUseRatio)) - train.OwnUseKw) * train.TransformerEfficiency * train.LineEfficiency;
        }

        var kwh = sum / shares * 8760 * train.Availability;
        Assert.Equal(kwh, result.Energy.Annual.AnnualEnergyKwh, 5e-4 * kwh);
    }

    [Theory]
    [MemberData(nameof(Sites))]
    public void From_net_head_to_the_meter_the_plant_lies_where_plants_in_service_lie(string site)
    {
        // Canal plants in service show 0.75 to 0.90; a farm machine of a few kilowatts may lie lower.
        var result = Results[site];
        var annual = result.Energy.Annual;
        var point = result.Energy.Plant.At(result.Energy.Plant.BestFlowM3PerS);
        var overall = annual.MeterPowerKw / (result.Site.SpecificWeightNPerM3 / 1000 * point.TurbineFlowM3PerS * point.NetHeadM);
        Assert.InRange(overall, site == "sorrel-creek" ? 0.55 : 0.72, 0.90);
    }

    [Fact]
    public void The_canal_runs_from_april_to_october_and_its_months_agree_with_its_curve()
    {
        var result = Results["larkspur-drop"];
        var days = result.Energy.Days!;
        Assert.All(days.Months.Where(m => m.Month is < 4 or > 10), m => Assert.Equal(0, m.MeanEnergyKwh));
        Assert.All(days.Months.Where(m => m.Month is >= 5 and <= 9), m => Assert.True(m.MeanEnergyKwh > 0));
        var annual = result.Energy.Annual;
        Assert.Equal(annual.AnnualEnergyKwh, days.MeanOfDaysKwh, 1e-9 * annual.AnnualEnergyKwh);
        Assert.Equal(annual.AnnualEnergyKwh, days.SumOfMonthsKwh, 0.01 * annual.AnnualEnergyKwh);

        // 214 of 365 days at most; the season's mean power times 8760 h would claim 1.7 times too much.
        Assert.True(annual.PlantFactor < 214 / 365.0);
        Assert.True(annual.RunningHours <= 214 * 24);

        // Twelve years: the dry one lies below the mean and not below the driest.
        Assert.Equal(12, days.Years.Count);
        Assert.InRange(days.DryYearKwh!.Value, days.WholeYearsKwh[0], days.SumOfMonthsKwh);
    }

    [Fact]
    public void Results_are_the_same_when_run_again_and_in_either_family_of_units()
    {
        var again = TestStudies.RunSite("larkspur-drop")[0];
        var first = Results["larkspur-drop"];
        Assert.Equal(first.Energy.Annual.AnnualEnergyKwh, again.Energy.Annual.AnnualEnergyKwh);
        Assert.Equal(first.Energy.Annual.Water, again.Energy.Annual.Water);
        Assert.Equal(
            CautionRules.For(first, first.Show(UnitSystem.US)).Select(c => c.Id),
            CautionRules.For(again, again.Show(UnitSystem.SI)).Select(c => c.Id));
    }

    [Theory]
    [MemberData(nameof(Sites))]
    public void More_reserved_flow_brings_less_energy_and_a_wider_pipe_more_head(string site)
    {
        var input = Results[site].Input;
        var reserved = Study.Run(TestStudies.Header, input.WithFlow(f => f with
        {
            DesignFlowM3PerS = Results[site].Flow.DesignFlowM3PerS,
            Allocation = new(ReservedFlow.Constant(0.3 * Results[site].Flow.MeanFlowM3PerS + f.Allocation.Reserved.FlowM3PerS), f.Allocation.PriorDeliveriesM3PerS),
        }));
        Assert.True(reserved.Energy.Annual.AnnualEnergyKwh < Results[site].Energy.Annual.AnnualEnergyKwh);
        var wider = Study.Run(TestStudies.Header, input.WithFlow(f => f with { DesignFlowM3PerS = Results[site].Flow.DesignFlowM3PerS }) with
        {
            Waterway = input.Waterway with { Elements = [.. input.Waterway.Elements.Select(e => e with { InsideDiameterM = e.InsideDiameterM * 1.2 })] },
        });
        Assert.True(wider.Head.NetHeadAtDesignM > Results[site].Head.NetHeadAtDesignM);
    }
}
