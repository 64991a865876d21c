using HeadToWatts.Basis.Quantities;
using HeadToWatts.Basis.Units;
using HeadToWatts.Economics.CashFlows;
using HeadToWatts.Economics.Costs;
using HeadToWatts.EnergyYield;
using HeadToWatts.FlowRecords;
using HeadToWatts.Hydraulics.Canals;
using HeadToWatts.Hydraulics.Canals.Sections;
using HeadToWatts.Hydraulics.Friction;
using HeadToWatts.Hydraulics.Levels;
using HeadToWatts.Hydraulics.LocalLosses;
using HeadToWatts.Hydraulics.Pipes;
using HeadToWatts.Hydraulics.Waterways;
using HeadToWatts.Studies;
using HeadToWatts.Studies.Inputs;
using HeadToWatts.Turbines;

namespace HeadToWatts.Drawings.Tests;

/// <summary>Invented studies of very different shape, on which every drawing has to hold.</summary>
public static class Scenarios
{
    private const double Foot = 0.3048;
    private const double Cfs = Foot * Foot * Foot;

    private static readonly Lazy<IReadOnlyDictionary<string, StudyResult>> Results = new(() => new Dictionary<string, StudyResult>
    {
        ["canal drop"] = CanalDrop(),
        ["farm creek"] = FarmCreek(),
        ["district pipeline"] = DistrictPipeline(),
        ["drop without pipe"] = DropWithoutPipe(),
        ["flashy stream"] = FlashyStream(),
        ["overloaded pipe"] = OverloadedPipe(),
        ["steep shaft"] = SteepShaft(),
        ["rising tailwater"] = RisingTailwater(),
    });

    public static IEnumerable<string> Names => Results.Value.Keys;

    /// <summary>The same study with a pump as turbine, for the drawing that only such a study has.</summary>
    public static StudyResult AsPump(StudyResult result) => Study.Run(result.Header, result.Input with { Turbine = new TurbineInput(TurbineTypes.Find("pump-as-turbine"), null, null, null) });

    /// <summary>The same study with costs of about twelve years' income, and a price.</summary>
    public static StudyResult WithMoney(StudyResult result)
    {
        var basis = MoneyBasis.Of("USD", 2026);
        var cost = Math.Max(result.Energy.Annual.AnnualEnergyKwh, 100) * 0.09 * 8;
        CostLine Line(CostClass kind, double share) => new(kind.Name, kind, 1, "", Money.Of(cost * share, basis), 0.2);
        return Study.Run(result.Header, result.Input with
        {
            Money = new MoneyInput(basis, PriceTerms.Real, 30, 0.06)
            {
                PriceAmountPerKwh = 0.09,
                CostLines = [Line(CostClasses.Permits, 0.05), Line(CostClasses.Civil, 0.25), Line(CostClasses.Pipe, 0.2), Line(CostClasses.Machine, 0.3), Line(CostClasses.Electrical, 0.12), Line(CostClasses.Grid, 0.08)],
                EngineeringRatio = 0.1, Construction = new Construction(1, 0.05),
                RunningCosts = [new RunningCost("O&M", cost * 0.02, 0.002, 0)], Replacements = [new Replacement("runner", cost * 0.06, 15, 0)],
            },
        });
    }

    /// <summary>The same study with a plant that stops in eight seconds.</summary>
    public static StudyResult WithStop(StudyResult result) => Study.Run(result.Header, result.Input with { Waterway = result.Input.Waterway with { Stop = new StopInput(8) } });

    /// <summary>The study with a canal laid to its levels: two depths below the headwater and the tailwater, and a basin.</summary>
    public static StudyResult WithCanal(StudyResult result)
    {
        var flow = result.Flow.Curve.FlowAt(0);
        var width = Math.Max(0.5, Math.Sqrt(flow));
        CanalSide Side(double levelM) => new(new CanalFlow(new TrapezoidalSection(width, 1.5), 0.025, 0.0006), levelM - (0.5 * width), levelM + 0.5);
        var below = Side(result.Head.TailwaterM);
        var canal = new CanalInput(Side(result.Head.HeadwaterM), below, new BasinMeasures(width, 4 * width, below.BedElevationM - (0.2 * width)), false, false, [], "");
        return Study.Run(result.Header, result.Input with { Head = result.Input.Head with { Canal = canal } });
    }

    public static StudyResult Get(string name) => Results.Value[name];

    private static StudyResult CanalDrop() => Run(
        "Alder Bench canal, drop 7",
        UnitSystem.US,
        Typed([(0, 196), (0.02, 184), (0.05, 172), (0.10, 161), (0.20, 146), (0.25, 140), (0.30, 133), (0.40, 112), (0.45, 96), (0.50, 74), (0.53, 52), (0.56, 22), (0.58, 0)], Cfs,
            OperatingSeason.Span(new MonthDay(4, 1), new MonthDay(10, 15)), WaterAllocation.None, 140 * Cfs),
        Levels(100 * Foot, 81.5 * Foot),
        [Pipe("steel pipe", 120 * Foot, 66 * 0.0254, "steel-lined", "trash-rack", "entrance-rounded", "bend-22", "bend-22", "valve-butterfly", "draft-tube-exit")],
        "kaplan");

    private static StudyResult FarmCreek() => Run(
        "Quail Creek farm",
        UnitSystem.SI,
        Recorded(0.018, 0.9, 0.35, Reserve(0.005, 0), null),
        Direct(60),
        [Pipe("penstock", 600, 0.2, "hdpe", "trash-rack", "entrance-square", "bend-45", "bend-45", "valve-gate")],
        null);

    private static StudyResult DistrictPipeline() => Run(
        "Sage Flat pressure pipeline",
        UnitSystem.US,
        Recorded(0.55, 0.6, 0.2, Reserve(0.05, 0.08), 0.6),
        Levels(1432.6, 1387.1),
        [
            Pipe("upper main", 900, 0.9, "concrete-smooth", "trash-rack", "entrance-bell-mouth", "bend-30"),
            Pipe("middle main", 450, 0.8, "ductile-iron", "contraction-gradual", "bend-22"),
            Pipe("lower main", 220, 0.7, "steel-new", "contraction-gradual", "valve-butterfly", "meter-magnetic") with { EndElevationM = 1389 },
        ],
        null);

    private static StudyResult DropWithoutPipe() => Run(
        "Mill weir",
        UnitSystem.SI,
        Typed([(0.0, 3.4), (0.1, 2.6), (0.3, 2.0), (0.6, 1.2), (0.9, 0.5), (1, 0.3)], 1, OperatingSeason.WholeYear, Reserve(0.3, 0), 2.0),
        Levels(52.2, 50.0),
        [],
        "archimedes-screw");

    private static StudyResult FlashyStream() => Run(
        "Gully Fork",
        UnitSystem.SI,
        Typed([(0, 90), (0.01, 30), (0.05, 8), (0.2, 2.4), (0.5, 0.9), (0.8, 0.35), (0.95, 0.12), (1, 0.05)], 1, OperatingSeason.WholeYear, Percent(0.1), 1.6),
        Direct(118),
        [Pipe("penstock", 340, 0.75, "steel-new", "trash-rack", "entrance-bell-mouth", "bend-30", "valve-ball")],
        null,
        2);

    // The pipe loses a third of the head at design flow.
    private static StudyResult OverloadedPipe() => Run(
        "Old ditch line",
        UnitSystem.US,
        Typed([(0, 9), (0.5, 7), (1, 2)], Cfs, OperatingSeason.WholeYear, WaterAllocation.None, 7 * Cfs),
        Levels(1250 * Foot, 1190 * Foot),
        [Pipe("riveted pipe", 480 * Foot, 12 * 0.0254, "steel-riveted", "trash-rack", "entrance-re-entrant", "elbow-90-flanged", "valve-gate", "exit")],
        null);

    // Falls nearly as far as it is long.
    private static StudyResult SteepShaft() => Run(
        "Bluff shaft",
        UnitSystem.SI,
        Typed([(0, 1.4), (0.5, 1), (1, 0.4)], 1, OperatingSeason.WholeYear, WaterAllocation.None, 1),
        Levels(140, 98),
        [Pipe("shaft", 46, 0.8, "steel-new", "trash-rack", "entrance-bell-mouth", "bend-90", "valve-butterfly")],
        null);

    // Below a river in flood the fall is nearly drowned.
    private static StudyResult RisingTailwater() => Run(
        "Cutbank weir",
        UnitSystem.SI,
        Typed([(0, 60), (0.05, 30), (0.3, 14), (0.6, 8), (1, 3)], 1, OperatingSeason.WholeYear, Reserve(0.5, 0), 12),
        Levels(24.0, 20.5) with { TailwaterRule = new RatedLevel([new(0, 20), new(12, 20.5), new(30, 22.4), new(60, 23.7)]) },
        [Pipe("box culvert", 18, 2.2, "concrete-smooth", "trash-rack", "entrance-rounded")],
        "kaplan");

    private static StudyResult Run(string name, UnitSystem units, FlowInput flow, HeadInput head, IReadOnlyList<PipeElement> pipes, string? type, int? unitCount = null) =>
        Study.Run(
            new StudyHeader(name, "invented", "", "", "", "", "", units),
            new AlternativeInput(
                "as proposed",
                new SiteInput(0.75, 800, 12, 60),
                flow,
                head,
                new WaterwayInput(pipes, FrictionFormulas.Default, 1.05),
                new TurbineInput(type is null ? null : TurbineTypes.Find(type), unitCount, null, null),
                new PowerTrain(1, 0.94, 0.985, 0.99, 0.01, 0, 0.96),
                []));

    private static HeadInput Levels(double headwaterM, double tailwaterM) => new(GrossHead.FromMetres(headwaterM - tailwaterM), headwaterM, tailwaterM, true);

    private static HeadInput Direct(double grossM) => new(GrossHead.FromMetres(grossM), grossM, 0, false);

    private static PipeElement Pipe(string name, double lengthM, double diameterM, string material, params string[] fittings) =>
        PipeElement.Of(name, lengthM, diameterM, PipeMaterials.Find(material)!, [.. fittings.Select(f => Fitting.Of(FittingKinds.Find(f)!))]);

    private static WaterAllocation Reserve(double reservedM3PerS, double priorM3PerS) => new(ReservedFlow.Constant(reservedM3PerS), priorM3PerS);

    private static WaterAllocation Percent(double ratio) => new(ReservedFlow.PercentOfFlow(ratio), 0);

    private static FlowInput Typed((double P, double Q)[] rows, double unitM3PerS, OperatingSeason season, WaterAllocation allocation, double designFlowM3PerS) =>
        new(
            FlowDurationCurve.FromRows([.. rows.Select(r => new CurvePoint(r.P, r.Q * unitM3PerS))], BeyondLastRow.Dry, "rows").Value,
            false, null, PlottingPositions.Default, season, allocation, true, designFlowM3PerS, "invented");

    // Twelve years of a flow that swells in spring, with a wobble from day to day and from year to year.
    private static FlowInput Recorded(double middleM3PerS, double swing, double wobble, WaterAllocation allocation, double? designFlowM3PerS)
    {
        var first = new DateOnly(2001, 1, 1);
        var flows = new double[4383];
        for (var i = 0; i < flows.Length; i++)
        {
            var day = first.AddDays(i);
            var season = Math.Sin((day.DayOfYear - 40) / 365.0 * Math.Tau);
            var weather = Math.Sin(i * 0.37) + (0.6 * Math.Sin(i * 0.083)) + (0.5 * Math.Cos(day.Year * 2.1));
            flows[i] = Math.Round(middleM3PerS * Math.Exp((swing * season) + (wobble * weather)), 5);
        }

        return new FlowInput(null, false, new DailyRecord(first, flows, "invented"), PlottingPositions.Default, OperatingSeason.WholeYear, allocation, true, designFlowM3PerS, "invented");
    }
}
