using HeadToWatts.Basis.Quantities;
using HeadToWatts.Basis.Units;
using HeadToWatts.EnergyYield;
using HeadToWatts.Files.StudyFiles;
using HeadToWatts.FlowRecords;
using HeadToWatts.Hydraulics.Canals;
using HeadToWatts.Hydraulics.Canals.Sections;
using HeadToWatts.Hydraulics.Friction;
using HeadToWatts.Hydraulics.Levels;
using HeadToWatts.Hydraulics.LocalLosses;
using HeadToWatts.Hydraulics.Pipes;
using HeadToWatts.Hydraulics.Waterways;
using HeadToWatts.Pumping;
using HeadToWatts.Studies;
using HeadToWatts.Studies.Inputs;
using HeadToWatts.Turbines;

namespace HeadToWatts.Calculations.Tests.Studies;

/// <summary>Studies to be varied, and the invented sites of sitedata.</summary>
internal static class TestStudies
{
    public static readonly StudyHeader Header = new("Test", "Nowhere", "", "", "2026-01-01", "A", "", UnitSystem.SI);

    /// <summary>The days of twelve years: 2.0 m3/s and 0.5 m3/s more or less with the time of the year.</summary>
    public static readonly DailyRecord TwelveYears = Record(12);

    /// <summary>Fifty metres of head, a short steel pipe, twelve years of flows: nothing about it is amiss.</summary>
    public static readonly AlternativeInput Quiet = new(
        "quiet",
        new SiteInput(0.75, 400, 10, 60),
        new FlowInput(null, false, TwelveYears, PlottingPositions.Weibull, OperatingSeason.WholeYear, new WaterAllocation(ReservedFlow.Constant(0.1), 0), true, 1.8, "invented"),
        new HeadInput(GrossHead.FromMetres(50), 50, 0, false),
        new WaterwayInput([Pipe(1.0, 100)], FrictionFormulas.Default, 1.0),
        new TurbineInput(null, null, null, null),
        new PowerTrain(1, 0.95, 0.985, 0.99, 0.01, 0, 0.95),
        []);

    public static IReadOnlyList<string> Sites { get; } = ["larkspur-drop", "sorrel-creek", "tamarack-pipeline"];

    public static DailyRecord Record(int years, Func<int, double, double>? change = null)
    {
        var first = new DateOnly(2001, 1, 1);
        var days = first.AddYears(years).DayNumber - first.DayNumber;
        return new DailyRecord(first, [.. Enumerable.Range(0, days).Select(i => change is null ? Flow(i) : change(i, Flow(i)))], "invented");

        static double Flow(int day) => 2 + (0.5 * Math.Sin(2 * Math.PI * day / 365.25));
    }

    public static PipeElement Pipe(double diameterM, double lengthM, double? ratingPa = 40e5) =>
        PipeElement.Of("penstock", lengthM, diameterM, PipeMaterials.Find("steel-new")!, new Fitting("entrance and bends", 0.5, 1, null)) with { PressureRatingPa = ratingPa };

    public static FlowDurationCurve Curve(BeyondLastRow beyond, params CurvePoint[] rows) => FlowDurationCurve.FromRows(rows, beyond, "rows").Value;

    public static AlternativeInput WithFlow(this AlternativeInput input, Func<FlowInput, FlowInput> change) => input with { Flow = change(input.Flow) };

    public static AlternativeInput WithCurve(this AlternativeInput input, BeyondLastRow beyond, params CurvePoint[] rows) =>
        input.WithFlow(f => f with { Record = null, TypedCurve = Curve(beyond, rows) });

    public static AlternativeInput WithHead(this AlternativeInput input, double grossHeadM) =>
        input with { Head = new HeadInput(GrossHead.FromMetres(grossHeadM), grossHeadM, 0, false) };

    /// <summary>A headwater held at 50 m and a tailwater measured at some flows.</summary>
    public static AlternativeInput WithTailwater(this AlternativeInput input, params LevelPoint[] points) =>
        input with { Head = new HeadInput(GrossHead.FromMetres(50), 50, 0, true) { TailwaterRule = new RatedLevel(points) } };

    /// <summary>A rectangular canal, 3 m wide and with a bed slope of 0.0005, above and below the fall.</summary>
    public static AlternativeInput WithCanal(this AlternativeInput input, string bypass, BasinMeasures? basin = null, double bedSlopeRatio = 0.0005)
    {
        CanalSide Side(double bedM) => new(new CanalFlow(new RectangularSection(3), 0.015, bedSlopeRatio), bedM, null);
        return input with { Head = input.Head with { Canal = new CanalInput(Side(49), Side(-1), basin, false, false, [], bypass) } };
    }

    /// <summary>A well of 0.1 m3/s against 40 m that lifts 100 000 m3 in July.</summary>
    public static AlternativeInput WithPump(this AlternativeInput input, double efficiency, double? suctionLiftM = null, double? requiredM = null) => input with
    {
        Pumping = new PumpingInput([new PumpingPlantInput(new PumpingPlant("the well", EnergySources.All[0], 0.1, [.. Enumerable.Range(1, 12).Select(m => m == 7 ? 1e5 : 0)], new PumpingHead(40, 0, 0, 0), efficiency, null), suctionLiftM, 0, requiredM)]),
    };

    public static AlternativeInput WithPipes(this AlternativeInput input, params PipeElement[] pipes) =>
        input with { Waterway = input.Waterway with { Elements = pipes } };

    public static AlternativeInput WithType(this AlternativeInput input, string type, int? units = null) =>
        input with { Turbine = input.Turbine with { Type = TurbineTypes.Find(type), UnitCount = units } };

    public static AlternativeInput WithMakersEfficiency(this AlternativeInput input, double efficiency) =>
        input with { Turbine = input.Turbine with { MakersCurve = EfficiencyCurve.FromTable([(0.1, efficiency), (1, efficiency)], "maker").Value } };

    public static StudyResult Run(this AlternativeInput input) => Study.Run(Header, input);

    /// <summary>An invented site of sitedata, run.</summary>
    public static IReadOnlyList<StudyResult> RunSite(string site)
    {
        var folder = Path.Combine(CheckValueFile.Root(), "sitedata", site);
        using var file = File.OpenRead(Path.Combine(folder, "study.json"));
        var document = StudyFileReader.Read("study.json", file).Value;
        return Study.RunAll(StudyBuilder.Build(document, new FolderFlowFiles(name => File.Exists(Path.Combine(folder, name)) ? File.OpenRead(Path.Combine(folder, name)) : null)).Value);
    }
}
