using HeadToWatts.Basis.Quantities;
using HeadToWatts.Basis.Units;
using HeadToWatts.Economics.CashFlows;
using HeadToWatts.Economics.Costs;
using HeadToWatts.EnergyYield.Electrical;
using HeadToWatts.FlowRecords;
using HeadToWatts.FlowRecords.Reserved;
using HeadToWatts.FlowRecords.Transfer;
using HeadToWatts.Hydraulics.Canals;
using HeadToWatts.Hydraulics.Friction;
using HeadToWatts.Studies;
using HeadToWatts.Studies.Cautions;
using HeadToWatts.Studies.Inputs;
using HeadToWatts.Turbines;
using HeadToWatts.Turbines.Sizing;
using HeadToWatts.Turbines.Units;

namespace HeadToWatts.Calculations.Tests.Studies;

/// <summary>Every caution rule: a study in which it bites, with its numbers in both families of units, and one in which it does not.</summary>
public class CautionRuleTests
{
    private static readonly AlternativeInput Quiet = TestStudies.Quiet;

    private static readonly CurvePoint[] Rows = [new(0, 2.8), new(0.5, 2), new(0.8, 1.3)];

    private static readonly OperatingSeason AprilToOctober = OperatingSeason.Months([4, 5, 6, 7, 8, 9, 10]);

    // The figures in the texts are worked by hand: feet, cubic feet, inches and psi from the metric ones (1 ft = 0.3048 m,
    // 1 cfs = 0.0283168 m3/s, 1 psi = 6.894757 kPa), velocities from Q/(pi D^2/4).
    private static readonly IReadOnlyList<Case> Cases =
    [
        new("no-reserved-flow", Quiet.WithFlow(f => f with { ReservedFlowIsStated = false }), "even if it is zero", "even if it is zero"),
        new("assumed-inputs", Quiet with { Assumptions = ["The latitude is taken as 45 deg."] }, "The latitude is taken as 45 deg.", "The latitude is taken as 45 deg."),
        new("reserved-by-month", Quiet.WithFlow(f => f with { AllocationByMonth = [.. Enumerable.Range(1, 12).Select(m => new WaterAllocation(ReservedFlow.Constant(m == 5 ? 0.5 : 0.1), 0))] }), "up to 17.7 cfs", "up to 0.500 m3/s"),
        new("flow-not-measured", Quiet.WithFlow(f => f with { Origin = new FlowOrigin(FlowConfidence.Low, "made of monthly means", [], []) }), "The flow was made of monthly means (confidence: low)", "The flow was made of monthly means (confidence: low)"),
        new("stages-outside-rating", Quiet.WithFlow(f => f with { Findings = ["Found: Water levels outside the rating: 12 (row 4: 2020-01-03, 9.1 ft, above 8 ft); left out: no flow is given"] }), "outside the rating: 12 (row 4", "outside the rating: 12 (row 4")
            { Spares = Quiet.WithFlow(f => f with { Findings = ["Rows out of order: 2 (row 7); put in order"] }) },
        new("screening-reserve", Quiet.WithFlow(f => f with { Rules = WaterRules.None with { Reserved = new LowFlowReserved("Q95", 0.5, 0.7) } }), "70.0 % of Q95, 12.4 cfs", "70.0 % of Q95, 0.350 m3/s")
            { Spares = Quiet.WithFlow(f => f with { Rules = WaterRules.None with { Reserved = new ConstantReserved(0.1) } }) },
        new("right-below-design", Quiet.WithFlow(f => f with { Rules = WaterRules.None with { Right = new WaterRight(1.5, OperatingSeason.WholeYear) } }), "allows 53.0 cfs, less than the design flow of 63.6 cfs", "allows 1.50 m3/s, less than the design flow of 1.80 m3/s")
            { Spares = Quiet.WithFlow(f => f with { Rules = WaterRules.None with { Right = new WaterRight(1.8, OperatingSeason.WholeYear) } }) },
        new("record-under-ten-years", Quiet.WithFlow(f => f with { Record = TestStudies.Record(5) }), "5.00 years", "5.00 years"),
        new("missing-days", Quiet.WithFlow(f => f with { Record = TestStudies.Record(12, (day, flow) => day % 10 == 0 ? double.NaN : flow) }), "439 of 4383 days", "10.0 % of the record"),
        new("no-record", Quiet.WithCurve(BeyondLastRow.Hold, Rows), "entered as rows", "entered as rows"),
        new("curve-ends-early", Quiet.WithCurve(BeyondLastRow.Hold, Rows), "80.0 % exceeded with 45.9 cfs", "80.0 % exceeded with 1.30 m3/s")
            { Spares = Quiet.WithCurve(BeyondLastRow.Hold, [.. Rows, new(0.95, 1.2)]) },
        new("curve-ends-early", Quiet.WithCurve(BeyondLastRow.Dry, Rows), "counts as dry", "counts as dry"),
        new("dry-months", Quiet.WithFlow(f => f with { Season = AprilToOctober }), "41.4 % of the year (season Apr to Oct): about 7.0 months", "41.4 % of the year"),
        new("design-flow-seldom", Quiet.WithFlow(f => f with { DesignFlowM3PerS = 2.38 }), "84.0 cfs", "2.38 m3/s")
            { Spares = Quiet.WithFlow(f => f with { DesignFlowM3PerS = 2.3 }) },
        new("net-head-gone", Quiet.WithPipes(TestStudies.Pipe(0.3, 100)), "gross head of 164 ft", "gross head of 50.0 m"),
        new("low-head", Quiet.WithHead(1.2).WithPipes(), "gross head of 3.94 ft is below the 5.00 ft", "gross head of 1.20 m is below the 1.52 m")
            { Spares = Quiet.WithHead(1.53).WithPipes() },
        new("tailwater-constant", Quiet.WithHead(8).WithPipes(), "26.2 ft", "8.00 m") { Spares = Quiet.WithHead(10.5).WithPipes() },

        // The flow exceeded 2 % of the time passes with 2.499 m3/s and a tailwater of 19.98 m; at the design flow 1.9 m3/s pass and it stands at 8 m.
        // A rectangular canal 3 m wide on both sides, in which 2.5 m3/s is the most: q = 0.83 m2/s.
        new("bypass-not-stated", Quiet.WithCanal(""), "full flow of 88.3 cfs must pass", "full flow of 2.50 m3/s must pass") { Spares = Quiet.WithCanal("the old drop") },
        new("basin-too-small", Quiet.WithCanal("the old drop", new BasinMeasures(3, 1, 0)), "The bed below would be scoured", "The bed below would be scoured")
            { Spares = Quiet.WithCanal("the old drop", new BasinMeasures(3, 60, -30)) },
        new("canal-fast-or-full", Quiet.WithCanal("the old drop", null, 0.05), "runs faster than the critical flow", "At 2.50 m3/s the canal above the drop runs faster") { Spares = Quiet.WithCanal("the old drop") },

        new("high-water-takes-head", Quiet.WithTailwater(new(1.5, 0), new(2.5, 20)), "gross head is 98.5 ft against 138 ft at the design flow", "gross head is 30.0 m against 42.0 m at the design flow")
            { Spares = Quiet.WithTailwater(new(1.5, 0), new(2.5, 10)) },
        new("high-water-takes-head", Quiet.WithTailwater(new(1.5, 0), new(2.0, 5), new(2.5, 60)), "stands as high as the headwater", "stands as high as the headwater"),

        // Of the flows exceeded 2, 5, 10, 25, 50, 75 and 90 % and the design flow, only the middle one and the last lie within 1.8 to 2.2 m3/s.
        new("level-outside-rating", Quiet.WithTailwater(new(1.8, 0), new(2.2, 1)), "6 of 8 flows looked at, from 53.8 cfs", "6 of 8 flows looked at, from 1.52 m3/s")
            { Spares = Quiet.WithTailwater(new(0, 0), new(5, 1)) },
        new("pressure-below-air", Quiet.WithPipes(TestStudies.Pipe(1, 50) with { EndElevationM = 50.5 }, TestStudies.Pipe(1, 50)), "ft of water at", "m of water at"),
        new("pressure-near-rating", Quiet.WithPipes(TestStudies.Pipe(1, 100, 5e5)), "rating of 72.5 psi", "rating of 500 kPa"),
        new("surge-over-rating", Quiet.WithPipes(TestStudies.Pipe(1, 100, 20e5)), "rated 290 psi", "rated 2000 kPa"),
        new("stop-over-rating", Quiet with { Waterway = new WaterwayInput([TestStudies.Pipe(1, 100, 20e5)], FrictionFormulas.Default, 1) { Stop = new StopInput(0) } }, "rating of 290 psi", "rating of 2000 kPa"),
        new("column-separation", Quiet with { Waterway = new WaterwayInput([TestStudies.Pipe(1, 100, 20e5)], FrictionFormulas.Default, 1) { Stop = new StopInput(0) } }, "ft from the intake", "m from the intake"),
        new("stop-is-screening", Quiet with { Waterway = new WaterwayInput([TestStudies.Pipe(1, 100, 20e5)], FrictionFormulas.Default, 1) { Stop = new StopInput(0) } }, "on a single line", "on a single line"),
        new("velocity-high", Quiet.WithPipes(TestStudies.Pipe(0.66, 100)), "17.3 ft/s at the design flow, above the usual 16.4 ft/s", "5.26 m/s at the design flow, above the usual 5.00 m/s"),
        new("velocity-over-limit", Quiet.WithPipes(TestStudies.Pipe(0.75, 100)), "The highest velocity, 13.4 ft/s", "The highest velocity, 4.07 m/s"),
        new("velocity-low", Quiet.WithPipes(TestStudies.Pipe(1.4, 100)), "3.84 ft/s", "1.17 m/s"),
        new("loss-over-ten-percent", Quiet.WithPipes(TestStudies.Pipe(0.8, 700)), "% of the gross head", "% of the gross head") { Spares = Quiet.WithPipes(TestStudies.Pipe(0.8, 400)) },
        new("pipe-limits-flow", Quiet.WithPipes(TestStudies.Pipe(0.6, 600)), "design flow of 63.6 cfs", "design flow of 1.80 m3/s"),
        new("transition-flow", Quiet.WithFlow(f => f with { DesignFlowM3PerS = 0.004 }).WithPipes(TestStudies.Pipe(0.5, 100)), "Reynolds number falls to", "Between 2000 and 4000"),
        new("no-pressure-rating", Quiet.WithPipes(TestStudies.Pipe(1, 100, null)), "psi standing", "kPa standing") { Spares = Quiet.WithHead(9).WithPipes(TestStudies.Pipe(1, 100, null)) },
        new("method-out-of-range", Quiet.WithPipes(TestStudies.Pipe(0.75, 100)) with { Waterway = new WaterwayInput([TestStudies.Pipe(0.75, 100)], FrictionFormulas.Find("hazen-williams")!, 1) }, "Hazen-Williams is stated for velocity 0 to 3.00 m/s; here it ran", "4.07 m/s")
            { Spares = Quiet with { Waterway = Quiet.Waterway with { Formula = FrictionFormulas.Find("hazen-williams")! } } },
        new("outside-envelope", Quiet.WithHead(12).WithType("pelton"), "One Pelton unit at", "usual range of the type"),
        new("outside-envelope", Quiet with { Turbine = new TurbineInput(TurbineTypes.Find("francis"), null, null, null) { UnitSizes = [new(0.02, 0.4), new(0.98, 0.4)] } }, "number 1 with 1.27 cfs", "number 1 with 0.0360 m3/s"),
        new("much-below-least", Quiet.WithType("propeller", 1).WithFlow(f => f with { DesignFlowM3PerS = 2.2 }), "less than the 58.3 cfs", "less than the 1.65 m3/s"),
        new("better-type", Quiet.WithType("crossflow"), "with crossflow", "would make"),
        new("typical-efficiency", Quiet, "not a guarantee", "not a guarantee") { Spares = Quiet.WithMakersEfficiency(0.88) },
        new("makers-efficiency", Quiet.WithMakersEfficiency(0.88), "manufacturer's table", "manufacturer's table"),
        new("hill-chart-left", Quiet.WithType("francis", 1) with { Turbine = new TurbineInput(TurbineTypes.Find("francis"), 1, null, null) { HillChart = HillChart.From([new(20, [new(0.4, 0.8), new(1, 0.9)]), new(30, [new(0.4, 0.8), new(1, 0.9)])], "chart").Value } }, "covers net heads from 65.6 ft to 98.4 ft", "covers net heads from 20.0 m to 30.0 m"),
        new("head-moves-machine-held", Quiet.WithTailwater(new(1.5, 0), new(2.5, 20)), "are held at those of its rated head", "are held at those of its rated head")
            { Spares = Quiet.WithTailwater(new(1.5, 0), new(2.5, 20)) with { Turbine = Quiet.Turbine with { FollowsHead = true } } },
        new("runner-too-high", Quiet with { Turbine = Quiet.Turbine with { RunnerHeightM = 9 } }, "is to stand 29.5 ft above the lowest tailwater", "is to stand 9.00 m above the lowest tailwater")
            { Spares = Quiet with { Turbine = Quiet.Turbine with { RunnerHeightM = 0.5 } } },
        new("runner-below-tailwater", Quiet.WithHead(25).WithType("propeller", 1), "below the lowest tailwater", "below the lowest tailwater"),
        new("high-runaway", Quiet.WithHead(12).WithType("kaplan"), "up to 3.00 times its speed", "up to 3.00 times its speed"),
        new("pump-scatter", Quiet.WithType("pump-as-turbine"), "put the pump to look for at flow", "put the pump to look for at flow"),
        new("pump-scatter", Quiet.WithType("pump-as-turbine", 4) with { Turbine = new TurbineInput(TurbineTypes.Find("pump-as-turbine"), 4, null, null) { Pump = new PumpPoint(0.1, 30, 0.8, 1750) } }, "which lies outside the band even so", "put this pump's best point as turbine at flow"),
        new("drive-loss-forgotten", Quiet.WithHead(6).WithType("screw", 2).WithPipes(), "Gears and belts lose 2 to 5 %", "Gears and belts lose 2 to 5 %"),
        new("generator-overloaded", Quiet with { Train = Quiet.Train with { Generator = new GeneratorMachine(GeneratorKind.Synchronous, 300, null) } }, "on a generator of 300 kW", "on a generator of 300 kW")
            { Spares = Quiet with { Train = Quiet.Train with { Generator = new GeneratorMachine(GeneratorKind.Synchronous, null, null) } } },
        new("induction-needs-grid", Quiet with { Train = Quiet.Train with { Generator = new GeneratorMachine(GeneratorKind.Induction, null, null) } }, "excited by the grid", "excited by the grid"),
        new("line-loss-high", Quiet with { Train = Quiet.Train with { Line = new LineRun(400, 480, 3, Conductors.Find("4/0 AWG")!, Conductors.Aluminium, 50), PowerFactor = 0.95 } }, "over the 480 V at the meter", "over the 480 V at the meter")
            { Spares = Quiet with { Train = Quiet.Train with { Line = new LineRun(400, 12_470, 3, Conductors.Find("4/0 AWG")!, Conductors.Aluminium, 50), PowerFactor = 0.95 } } },
        new("no-energy", Quiet.WithFlow(f => f with { Allocation = new WaterAllocation(ReservedFlow.Constant(5), 0) }), "never runs", "never runs"),
        new("low-plant-factor", Quiet.WithFlow(f => f with { Season = OperatingSeason.Months([6, 7]) }), "The plant factor is 1", "The plant factor is 1"),
        new("small-plant", Quiet.WithFlow(f => f with { DesignFlowM3PerS = 0.05 }).WithPipes(TestStudies.Pipe(0.2, 100)), "below the 50 kW", "below the 50 kW"),
        new("high-efficiency", Quiet.WithMakersEfficiency(0.95) with { Train = Quiet.Train with { DriveEfficiency = 1, GeneratorEfficiency = 1, TransformerEfficiency = 1, LineEfficiency = 1 } }, "95.0 % at best", "95.0 % at best"),
        new("always-available", Quiet with { Train = Quiet.Train with { Availability = 1 } }, "100 %", "100 %") { Spares = Quiet with { Train = Quiet.Train with { Availability = 0.99 } } },
        // 0.1 m3/s against 40 m at 40 percent: 60 percent of the criterion of 66 percent.
        new("pump-below-criterion", Quiet.WithPump(0.4), "the well lifts 60.6 %", "the well lifts 60.6 %") { Spares = Quiet.WithPump(0.66) },
        new("suction-too-low", Quiet.WithPump(0.66, 9, 4), "where its maker requires 13.1 ft", "where its maker requires 4.00 m") { Spares = Quiet.WithPump(0.66, 2, 4) },
        new("pumping-on-another-meter", Quiet.WithPump(0.66), "a year of pumping stand beside", "a year of pumping stand beside"),
        new("mean-flow-trap", Quiet.WithCurve(BeyondLastRow.Dry, new(0, 4), new(0.5, 4)), "8760 h would claim", "over the whole curve it is"),
        // Whole money: 2 300 000 of works and contingency 25 %, a tenth of engineering; each case takes one thing away.
        new("no-cost-given", Paying(m => m with { CostLines = [] }), "is what they may cost at the most", "is what they may cost at the most") { Spares = Whole },
        new("no-price-given", Paying(m => m with { PriceAmountPerKwh = null }), "The price that breaks even is 0.0", "USD/kWh") { Spares = Whole },
        new("no-interconnection-cost", Paying(m => m with { CostLines = [.. m.CostLines.Where(l => l.Class != CostClasses.Grid)] }), "No line of the estimate is for the interconnection", "No line of the estimate is for the interconnection") { Spares = Whole },
        new("no-contingency", Paying(m => m with { CostLines = [.. m.CostLines.Select(l => l with { ContingencyRatio = 0.05 })] }), "Contingency is 5.00 % of the works", "Contingency is 5.00 % of the works") { Spares = Whole },
        new("no-running-costs", Paying(m => m with { RunningCosts = [] }), "nobody pays to run", "nobody pays to run") { Spares = Whole },
        new("no-replacements", Paying(m => m with { Replacements = [] }), "Over 30 years nothing is replaced", "Over 30 years nothing is replaced") { Spares = Whole },
        new("several-rates", Paying(m => m with { GrantAmount = 4e6 }), "no rate of return", "Judge by the net present value") { Spares = Whole },
        new("payback-beyond-life", Paying(m => m with { PriceAmountPerKwh = 0.012 }), "does not return USD\u00a03\u202f160\u202f000 of 2026", "income of 30 years") { Spares = Whole },
        new("long-life", Paying(m => m with { LifeYears = 60 }), "60 years of operation are counted", "60 years of operation are counted") { Spares = Whole },
        new("debt-cover-thin", Paying(m => m with { InflationRate = 0.02, PriceAmountPerKwh = 0.05, Loan = new LoanShare(1, 0.08, 12) }), "times the debt service", "times the debt service")
            { Spares = Paying(m => m with { InflationRate = 0.02, Loan = new LoanShare(0.3, 0.05, 20) }) },
        new("terms-doubtful", Paying(m => m with { PriceEscalationRate = 0.03 }), "rises by 3.00 % a year beyond inflation", "rises by 3.00 % a year beyond inflation") { Spares = Whole },
        new("price-year-old", Paying(m => m with { Basis = MoneyBasis.Of("USD", 2020), CostLines = [] }), "prices are of 2020, the memo is of 2026", "prices are of 2020, the memo is of 2026") { Spares = Whole },
        new("correlation-out-of-range", Whole, "at 164 ft lies outside the plants behind Hall and others 2003", "at 50.0 m lies outside the plants behind Hall and others 2003"),
        new("no-tax-counted", Whole, "No tax is counted", "No tax is counted") { Spares = Paying(m => m with { InflationRate = 0.02, Tax = new TaxEntry(0.2, 1, Depreciation.StraightLine(20)) }) },
    ];

    private static AlternativeInput Whole => Quiet with { Money = MoneyRunTests.Whole };

    private static AlternativeInput Paying(Func<MoneyInput, MoneyInput> change) => Quiet with { Money = change(MoneyRunTests.Whole) };

    public static TheoryData<string> RuleIds => new(CautionRules.All.Select(r => r.Id));

    [Fact]
    public void A_study_with_nothing_amiss_is_cautioned_for_its_typical_efficiency_only()
    {
        var result = Quiet.Run();
        Assert.Equal(["typical-efficiency"], CautionRules.For(result, result.Show()).Select(c => c.Id));
    }

    [Theory]
    [MemberData(nameof(RuleIds))]
    public void The_rule_bites_where_it_should_with_the_numbers_in_both_families_of_units(string id)
    {
        var cases = Cases.Where(c => c.Id == id).ToList();
        Assert.True(cases.Count > 0, $"the rule '{id}' has no study in which it bites: add one to the cases");
        foreach (var one in cases)
        {
            var result = one.Bites.Run();
            var us = Assert.Single(CautionRules.For(result, result.Show(UnitSystem.US)), c => c.Id == id);
            var si = Assert.Single(CautionRules.For(result, result.Show(UnitSystem.SI)), c => c.Id == id);
            Assert.Contains(one.Us, us.Text);
            Assert.Contains(one.Si, si.Text);
            Assert.Equal((us.Id, us.Stage, us.Severity, us.Title, us.Authority), (si.Id, si.Stage, si.Severity, si.Title, si.Authority));
        }
    }

    [Theory]
    [MemberData(nameof(RuleIds))]
    public void The_rule_keeps_silent_where_nothing_is_amiss(string id)
    {
        var spares = Cases.Where(c => c.Id == id).Select(c => c.Spares).ToList();
        Assert.NotEmpty(spares);
        foreach (var input in spares)
        {
            var result = input.Run();
            Assert.DoesNotContain(CautionRules.For(result, result.Show()), c => c.Id == id);
        }
    }

    [Fact]
    public void Every_rule_has_an_id_of_its_own_a_title_and_an_authority()
    {
        Assert.Equal(CautionRules.All.Count, CautionRules.All.Select(r => r.Id).Distinct(StringComparer.Ordinal).Count());
        Assert.All(CautionRules.All, r =>
        {
            Assert.Matches("^[a-z]+(-[a-z]+)*$", r.Id);
            Assert.True(r.Title.Length is > 3 and < 60, r.Id);
            Assert.True(r.Authority.Title.Length > 0, r.Id);
            Assert.True(Enum.IsDefined(r.Severity) && Enum.IsDefined(r.Stage), r.Id);
        });
        Assert.All(Cases, c => Assert.Contains(CautionRules.All, r => r.Id == c.Id));
    }

    [Fact]
    public void What_must_be_settled_first_stands_first()
    {
        var result = Quiet.WithFlow(f => f with { ReservedFlowIsStated = false }).WithHead(12).WithType("pelton").Run();
        var cautions = CautionRules.For(result, result.Show());
        Assert.True(cautions.Count > 3);
        Assert.Equal(Severity.SettleFirst, cautions[0].Severity);
        Assert.Equal(cautions.OrderBy(c => c.Severity).Select(c => c.Id), cautions.Select(c => c.Id));
    }

    private sealed record Case(string Id, AlternativeInput Bites, string Us, string Si)
    {
        public AlternativeInput Spares { get; init; } = Id == "typical-efficiency" ? Bites : TestStudies.Quiet;
    }
}
