using BenchmarkDotNet.Attributes;
using HeadToWatts.EnergyYield;
using HeadToWatts.Studies;
using HeadToWatts.Studies.Inputs;

namespace HeadToWatts.Benchmarks;

/// <summary>The year's integral, the run over every day, and a whole study of thirty years of daily flows.</summary>
[MemoryDiagnoser]
public class StudyBenchmarks
{
    private StudyInput _input = null!;
    private StudyResult _result = null!;

    [GlobalSetup]
    public void Setup()
    {
        _input = BenchmarkStudies.ThirtyYears();
        _result = Study.RunAll(_input)[0];
    }

    [Benchmark]
    public double EnergyIntegral() => YearIntegral.Over(_result.Energy.Plant, _result.Flow.Supply).MeterPowerKw;

    [Benchmark]
    public double EveryDay() => DailyRun.Over(_result.Energy.Plant, _input.Alternatives[0].Flow.Record!, _input.Alternatives[0].Flow.Season, _input.Alternatives[0].Flow.Allocation).SumOfMonthsKwh;

    [Benchmark]
    public double WholeStudy() => Study.RunAll(_input)[0].Energy.Annual.AnnualEnergyKwh;
}
