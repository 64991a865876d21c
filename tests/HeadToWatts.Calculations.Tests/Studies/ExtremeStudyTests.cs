using HeadToWatts.Basis.Quantities;
using HeadToWatts.Basis.Units;
using HeadToWatts.FlowRecords;
using HeadToWatts.Hydraulics.Friction;
using HeadToWatts.Hydraulics.Levels;
using HeadToWatts.Studies;
using HeadToWatts.Studies.Cautions;
using HeadToWatts.Studies.Inputs;
using HeadToWatts.Studies.Workings;
using HeadToWatts.Turbines;

namespace HeadToWatts.Calculations.Tests.Studies;

/// <summary>Inputs at the edge of what is accepted: no exception, finite results, texts that can be read.</summary>
public class ExtremeStudyTests
{
    private static readonly AlternativeInput Quiet = TestStudies.Quiet;

    private static readonly AlternativeInput Suggest = Quiet.WithFlow(f => f with { DesignFlowM3PerS = null });

    private static readonly Dictionary<string, AlternativeInput> Cases = new(StringComparer.Ordinal)
    {
        ["no flow at all"] = Suggest.WithCurve(BeyondLastRow.Hold, new(0, 0), new(1, 0)),
        ["no flow, size given"] = Quiet.WithCurve(BeyondLastRow.Hold, new(0, 0), new(1, 0)),
        ["one wet hundredth of the year"] = Suggest.WithCurve(BeyondLastRow.Dry, new(0, 3), new(0.01, 2)),
        ["everything reserved"] = Suggest.WithFlow(f => f with { Allocation = new WaterAllocation(ReservedFlow.PercentOfFlow(1), 0) }),
        ["more delivered than arrives"] = Suggest.WithFlow(f => f with { Allocation = new WaterAllocation(ReservedFlow.None, 100) }),
        ["design flow far beyond the pipe"] = Quiet.WithFlow(f => f with { DesignFlowM3PerS = 200 }).WithPipes(TestStudies.Pipe(0.4, 2000)),
        ["pipe of a centimetre"] = Suggest.WithPipes(TestStudies.Pipe(0.01, 5000)),
        ["pipe of no length"] = Suggest.WithPipes(TestStudies.Pipe(1, 0)),
        ["no pipe"] = Suggest.WithPipes(),
        ["least head"] = Suggest.WithHead(0.05),
        ["least head, no pipe"] = Suggest.WithHead(0.05).WithPipes(),
        ["greatest head"] = Suggest.WithHead(2500),
        ["a river"] = Suggest.WithCurve(BeyondLastRow.Hold, new(0, 20_000), new(1, 5000)).WithPipes(),
        ["a trickle"] = Suggest.WithCurve(BeyondLastRow.Hold, new(0, 2e-4), new(1, 1e-5)).WithPipes(TestStudies.Pipe(0.02, 100)).WithFlow(f => f with { Allocation = WaterAllocation.None }),
        ["own use above the output"] = Suggest with { Train = Suggest.Train with { OwnUseKw = 1e6 } },
        ["seldom fit to run"] = Suggest with { Train = Suggest.Train with { Availability = 0.1 } },
        ["twelve units"] = Suggest.WithType("francis", 12),
        ["ice water at the pole"] = Suggest with { Site = new SiteInput(Math.PI / 2, 5000, 0, 50) },
        ["warm water below the sea"] = Suggest with { Site = new SiteInput(-0.5, -430, 40, 50) },
        ["one day of record"] = Suggest.WithFlow(f => f with { Record = new DailyRecord(new DateOnly(2020, 2, 29), [2.0], "") }),
        ["a record of zeros"] = Suggest.WithFlow(f => f with { Record = new DailyRecord(new DateOnly(2020, 1, 1), new double[4000], "") }),
        ["computed inflows below zero"] = Suggest.WithFlow(f => f with { Record = TestStudies.Record(3, (day, flow) => flow - 2) }),
        ["a maker's table that falls to nothing"] = Suggest with { Turbine = Suggest.Turbine with { MakersCurve = EfficiencyCurve.FromTable([(0.4, 0), (0.7, 0.8), (1, 0)], "m").Value } },
        ["a fall drowned at every flow"] = Suggest.WithTailwater(new(0, 70), new(1, 80)),
        ["a fall drowned at most flows"] = Suggest.WithTailwater(new(0, 0), new(1.6, 1), new(1.7, 80)),
        ["a reservoir that falls below the tailwater in autumn"] = Suggest with
        {
            Head = new HeadInput(GrossHead.FromMetres(50), 50, 0, true) { HeadwaterRule = new MonthlyLevel([50, 50, 50, 49, 45, 40, 30, 20, 5, -1, 0, 40]) },
        },
        ["a weir that carries the flow"] = Suggest with
        {
            Head = new HeadInput(GrossHead.FromMetres(50), 50, 0, true) { HeadwaterRule = new WeirCrestLevel(49, 3, 1.7), TailwaterRule = new RatedLevel([new(1, 0), new(3, 2)]) },
        },
        ["friction by Manning in a rough culvert"] = Suggest with { Waterway = new WaterwayInput([TestStudies.Pipe(1, 500)], FrictionFormulas.Find("manning")!, 1.3) },
    };

    public static TheoryData<string> Names => new(Cases.Keys);

    [Theory]
    [MemberData(nameof(Names))]
    public void The_study_runs_and_every_figure_and_text_can_be_read(string name)
    {
        var result = Cases[name].Run();
        var annual = result.Energy.Annual;
        double[] figures =
        [
            annual.AnnualEnergyKwh, annual.InstalledPowerKw, annual.MeterPowerKw, annual.PlantFactor, annual.RunningHours, annual.FullLoadHours,
            annual.Water.ArrivingM3, annual.Water.TurbinedM3, annual.Water.SpilledM3, annual.Water.ClosureError,
            result.Flow.DesignFlowM3PerS, result.Flow.MeanFlowM3PerS, result.Flow.DesignFlowExceedance, result.Flow.WetShareOfYear,
            result.Head.NetHeadAtDesignM, result.Waterway.LossShareOfGrossHead, result.Waterway.HighestVelocityMPerS, result.Energy.PowerAtMeanFlowKwh,
            .. annual.Staircase.Steps.Select(s => s.LeftKwh),
            .. result.Waterway.GradeLines.SelectMany(s => new[] { s.PressureHeadM, s.EnergyGradeM, s.HydraulicGradeM }),
            .. result.Turbine.Ranking.SelectMany(c => new[] { c.AnnualEnergyKwh, c.LeastFlowM3PerS, c.NetHeadM, c.ShareOfYearBelowLeast }),
            .. result.Energy.Curve.SelectMany(p => new[] { p.MeterPowerKw, p.NetHeadM, p.TurbineFlowM3PerS }),
            .. result.Flow.Scan.Points.SelectMany(p => new[] { p.AnnualEnergyKwh, p.PlantFactor, p.InstalledPowerKw }),
            .. result.Energy.Days?.Months.Select(m => m.MeanEnergyKwh) ?? [],
        ];
        Assert.All(figures, f => Assert.True(double.IsFinite(f)));
        Assert.True(annual.AnnualEnergyKwh >= 0);
        Assert.True(annual.InstalledPowerKw >= 0);
        Assert.InRange(annual.PlantFactor, 0, 1 + 1e-9);
        Assert.Equal(0, annual.Water.ClosureError, 1e-9);
        foreach (var system in new[] { UnitSystem.US, UnitSystem.SI })
        {
            var show = result.Show(system);
            string[] texts =
            [
                .. CautionRules.For(result, show).Select(c => c.Text),
                .. WorkingsList.For(result, show).SelectMany(w => new[] { w.Numbers, w.Result, w.Note }),
                .. result.Turbine.Ranking.SelectMany(c => TurbineWords.Reasons(c, show)),
                DesignFlowWords.Reason(result, show),
            ];
            Assert.All(texts, t =>
            {
                Assert.DoesNotContain("NaN", t);
                Assert.DoesNotContain("∞", t);
                Assert.DoesNotContain("–", t);
            });
        }
    }

    [Theory]
    [InlineData("no flow at all")]
    [InlineData("everything reserved")]
    [InlineData("more delivered than arrives")]
    [InlineData("own use above the output")]
    [InlineData("a record of zeros")]
    [InlineData("a fall drowned at every flow")]
    public void A_plant_that_never_runs_says_so(string name)
    {
        var result = Cases[name].Run();
        Assert.Equal(0, result.Energy.Annual.AnnualEnergyKwh);
        Assert.Contains(CautionRules.For(result, result.Show()), c => c.Id == "no-energy");
    }
}
