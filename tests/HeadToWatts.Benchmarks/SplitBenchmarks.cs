using BenchmarkDotNet.Attributes;
using HeadToWatts.EnergyYield;
using HeadToWatts.Studies;
using HeadToWatts.Studies.Inputs;
using HeadToWatts.Turbines.Units;

namespace HeadToWatts.Benchmarks;

/// <summary>Three units of unequal size that share the flow for most power, over thirty years of daily flows.</summary>
[MemoryDiagnoser]
public class SplitBenchmarks
{
    private StudyInput _input = null!;
    private StudyResult _result = null!;

    [GlobalSetup]
    public void Setup()
    {
        var input = BenchmarkStudies.ThirtyYears();
        var alternative = input.Alternatives[0];
        var type = Study.RunAll(input)[0].Turbine.Chosen.Type;
        var least = type.LeastFlowRatio;
        _input = input with
        {
            Alternatives = [alternative with { Turbine = alternative.Turbine with { Type = type, UnitCount = null, UnitSizes = [new(0.2, least), new(0.3, least), new(0.5, least)], Split = LoadSplit.Best } }],
        };
        _result = Study.RunAll(_input)[0];
    }

    [Benchmark]
    public UnitSet Search() => _result.Turbine.Units.With(LoadSplit.InTurn).With(LoadSplit.Best);

    [Benchmark]
    public double EveryDay() => DailyRun.Over(_result.Energy.Plant, _input.Alternatives[0].Flow.Record!, _input.Alternatives[0].Flow.Season, _input.Alternatives[0].Flow.Allocation).SumOfMonthsKwh;

    [Benchmark]
    public double WholeStudy() => Study.RunAll(_input)[0].Energy.Annual.AnnualEnergyKwh;
}
