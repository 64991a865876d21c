using BenchmarkDotNet.Attributes;
using HeadToWatts.Hydraulics.Transients;

namespace HeadToWatts.Benchmarks;

/// <summary>A transient of 500 reaches and 10,000 steps, and one as a study runs it.</summary>
[MemoryDiagnoser]
public class TransientBenchmarks
{
    private readonly TransientCase _line = new([new("pipe", 2000, 0.5, 1000, 6, 100, 0)], 1, 110, 0, 9.80665, -10);

    [Benchmark]
    public double FiveHundredReachesTenThousandSteps()
    {
        var grid = TransientGrid.For(_line.Pipes, 500);
        return Characteristics.Run(_line, new StopManoeuvre(10), grid, 10_000 * grid.TimeStepS).HighestMachineHeadM;
    }

    [Benchmark]
    public double AsAStudyRunsIt() => TransientRun.Of(_line, new StopManoeuvre(10, RunawayFlowRatio: 0.6, RunawayTimeS: 2)).HighestMachineHeadM;
}
